using FsCheck.Xunit;
using TwoPhase.Flow;
using TwoPhase.Friction;
using UnitsNet;

namespace TwoPhase.Tests.Friction;

[Properties(Arbitrary = [typeof(AnyFlow)])]
public class LocalLossTests
{
    [Fact]
    public void BendCoefficient_ReferenceRows_MatchesToPrintedDigits()
    {
        foreach (ReferenceTable.Row row in ReferenceTable.Load("Friction/Data/bend-loss.csv").Rows)
            Approx.Relative(row["k"], LocalLoss.BendCoefficient(Angle.FromDegrees(row["angle_deg"]), row["bend_ratio"], row["f"]), 1e-9, row.ToString());
    }

    [Fact]
    public void OrificeCoefficient_ReferenceRows_MatchesToPrintedDigits()
    {
        foreach (ReferenceTable.Row row in ReferenceTable.Load("Friction/Data/orifice-loss.csv").Rows)
            Approx.Relative(row["k"], LocalLoss.OrificeCoefficient(Length.FromMeters(row["bore_m"]), Length.FromMeters(row["pipe_m"]), row["c"]), 1e-9, row.ToString());
    }

    // By hand, K = 0.3: B = 1 + 2.2 / (0.3 (2 + R/D)).
    [Theory]
    [InlineData(1, 3.44444)]
    [InlineData(1.5, 3.09524)]
    [InlineData(2, 2.83333)]
    [InlineData(5, 2.04762)]
    public void BendB_ByHand_MatchesPrintedDigits(double bendRatio, double expected) => Approx.Absolute(expected, LocalLoss.BendB(0.3, bendRatio), 5e-6);

    [Property]
    public void Of_OnePhaseAlone_IsTheLossOfThatPhase(FlowState flow)
    {
        MassFlux flux = MassFlux.FromKilogramsPerSecondPerSquareMeter(flow.MassFlux);
        Pressure liquid = LocalLoss.Of(flux, Density.FromKilogramsPerCubicMeter(flow.LiquidDensity), 0.3), vapour = LocalLoss.Of(flux, Density.FromKilogramsPerCubicMeter(flow.VapourDensity), 0.3);
        Approx.Relative(liquid.Pascals, LocalLoss.Of(new TwoPhaseFlow(flow with { Quality = 0 }), 0.3, 2.8).Pascals, 1e-13);
        Approx.Relative(vapour.Pascals, LocalLoss.Of(new TwoPhaseFlow(flow with { Quality = 1 }), 0.3, 2.8).Pascals, 1e-13);
    }

    [Property]
    public void Of_BOfOne_IsHomogeneousFlow(FlowState flow)
    {
        double volume = (flow.Quality / flow.VapourDensity) + ((1 - flow.Quality) / flow.LiquidDensity);
        Approx.Relative(0.3 * flow.MassFlux * flow.MassFlux * volume / 2, LocalLoss.Of(new TwoPhaseFlow(flow), 0.3).Pascals, 1e-12);
        Assert.True(LocalLoss.Multiplier(new TwoPhaseFlow(flow), 2.8) >= LocalLoss.Multiplier(new TwoPhaseFlow(flow), 1));
    }

    [Fact]
    public void Coefficients_BadArgument_ThrowNamingTheValue()
    {
        var flow = new TwoPhaseFlow(ReferencePoint.At(0.5));
        Throws("Angle = 181 °", () => LocalLoss.BendCoefficient(Angle.FromDegrees(181), 1.5, 0.02));
        Throws("Angle = 0 °", () => LocalLoss.BendCoefficient(Angle.Zero, 1.5, 0.02));
        Throws("Bend ratio R/D = 0.4", () => LocalLoss.BendCoefficient(Angle.FromDegrees(90), 0.4, 0.02));
        Throws("Friction factor = 0", () => LocalLoss.BendCoefficient(Angle.FromDegrees(90), 1.5, 0));
        Throws("Loss coefficient = 0", () => LocalLoss.BendB(0, 1.5));
        Throws("Loss coefficient = -1", () => LocalLoss.Of(flow, -1));
        Throws("Chisholm's B = -1", () => LocalLoss.Multiplier(flow, -1));
        Throws("Bore of the orifice = 80 mm must be below 80 mm", () => LocalLoss.OrificeCoefficient(Length.FromMillimeters(80), Length.FromMillimeters(80), 0.6));
        Throws("Discharge coefficient = 1.2", () => LocalLoss.OrificeCoefficient(Length.FromMillimeters(40), Length.FromMillimeters(80), 1.2));

        static void Throws(string message, Action action) =>
            Assert.StartsWith(message, Assert.Throws<ArgumentOutOfRangeException>(action).Message, StringComparison.Ordinal);
    }

    [Fact]
    public void StaticHead_RiseAndFall_IsTheWeightOfTheMixture()
    {
        FlowState up = FlowStates.At(10e6, 0.78, 1000, 0.08, Math.PI / 2);
        double weight = 9.80665 * ((0.9 * up.VapourDensity) + (0.1 * up.LiquidDensity));
        Approx.Relative(weight, StaticHead.Gradient(new TwoPhaseFlow(up), Ratio.FromPercent(90)).PascalsPerMetre, 1e-12);
        Approx.Relative(-weight, StaticHead.Gradient(new TwoPhaseFlow(up with { Inclination = -Math.PI / 2 }), Ratio.FromPercent(90)).PascalsPerMetre, 1e-12);
        Assert.Equal(0, StaticHead.Gradient(new TwoPhaseFlow(up with { Inclination = 0 }), Ratio.FromPercent(90)).PascalsPerMetre);
        Assert.Throws<ArgumentOutOfRangeException>(() => StaticHead.Gradient(new TwoPhaseFlow(up), Ratio.FromPercent(101)));
    }

    [Fact]
    public void AccelerationLoss_BadArgument_ThrowsNamingTheValue()
    {
        var wet = new TwoPhaseFlow(ReferencePoint.At(0.2));
        var liquid = new TwoPhaseFlow(ReferencePoint.At(0));
        var other = new TwoPhaseFlow(ReferencePoint.At(0.2) with { MassFlux = 900 });
        Ratio half = Ratio.FromDecimalFractions(0.5), none = Ratio.FromDecimalFractions(0), all = Ratio.FromDecimalFractions(1);
        Assert.True(AccelerationLoss.Difference(liquid, none, wet, half).Pascals > 0);
        Assert.Equal(-AccelerationLoss.Difference(liquid, none, wet, half).Pascals, AccelerationLoss.Difference(wet, half, liquid, none).Pascals, 1e-9);
        Assert.Contains("Mass flux at the outlet = 900", Assert.Throws<ArgumentOutOfRangeException>(() => AccelerationLoss.Difference(wet, half, other, half)).Message, StringComparison.Ordinal);
        Assert.Contains("must be above 0 where there is vapour", Assert.Throws<ArgumentOutOfRangeException>(() => AccelerationLoss.Difference(wet, none, wet, half)).Message, StringComparison.Ordinal);
        Assert.Contains("must be below 1 where there is liquid", Assert.Throws<ArgumentOutOfRangeException>(() => AccelerationLoss.Difference(wet, half, wet, all)).Message, StringComparison.Ordinal);
    }
}
