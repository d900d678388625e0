using FsCheck.Xunit;
using TwoPhase.Flow;
using TwoPhase.Slip;
using UnitsNet;

namespace TwoPhase.Tests.Slip;

[Properties(Arbitrary = [typeof(AnyFlow)])]
public class PhaseSplitTests
{
    [Property]
    public void Split_AnyFlow_CarriesTheMassAndTheMomentum(FlowState flow)
    {
        foreach (VoidFractionModel model in VoidFractionModel.All)
        {
            PhaseSplit split = model.Split(new TwoPhaseFlow(flow));
            double alpha = split.VoidFraction.DecimalFractions, ug = split.VapourVelocity.MetersPerSecond, ul = split.LiquidVelocity.MetersPerSecond;
            double vapour = alpha * flow.VapourDensity * ug, liquid = (1 - alpha) * flow.LiquidDensity * ul;
            Approx.Relative(flow.MassFlux, vapour + liquid, 1e-7, $"mass, {model} in {flow}");
            Approx.Relative(flow.MassFlux * flow.MassFlux / split.MomentumDensity.KilogramsPerCubicMeter, (vapour * ug) + (liquid * ul), 1e-6, $"momentum, {model} in {flow}");
        }
    }

    [Property]
    public void Split_SlipAboveOne_HoldsMoreThanTheHomogeneousMixture(FlowState flow)
    {
        PhaseSplit split = VoidFractionModel.Steiner.Split(new TwoPhaseFlow(flow));
        Assert.True(split.StaticDensity.KilogramsPerCubicMeter >= split.HomogeneousDensity.KilogramsPerCubicMeter * (1 - 1e-12));
    }

    [Fact]
    public void Split_Homogeneous_HasOneDensityAndOneVelocity()
    {
        FlowState flow = FlowStates.At(10e6, 0.78, 1000, 0.08, 0);
        PhaseSplit split = VoidFractionModel.Homogeneous.Split(new TwoPhaseFlow(flow));
        double density = 1 / ((0.78 / flow.VapourDensity) + (0.22 / flow.LiquidDensity));
        Approx.Relative(density, split.StaticDensity.KilogramsPerCubicMeter, 1e-14);
        Approx.Relative(density, split.MomentumDensity.KilogramsPerCubicMeter, 1e-14);
        Approx.Relative(density, split.HomogeneousDensity.KilogramsPerCubicMeter, 1e-14);
        Approx.Relative(1000 / density, split.VapourVelocity.MetersPerSecond, 1e-14);
        Approx.Relative(1000 / density, split.LiquidVelocity.MetersPerSecond, 1e-14);
    }

    [Theory]
    [InlineData(0)]
    [InlineData(1)]
    public void Split_OnePhaseAlone_HasItsDensityAndVelocity(double quality)
    {
        FlowState flow = FlowStates.At(8e6, quality, 900, 0.07, 0);
        PhaseSplit split = VoidFractionModel.Smith.Split(new TwoPhaseFlow(flow));
        double density = quality == 0 ? flow.LiquidDensity : flow.VapourDensity;
        Approx.Relative(density, split.StaticDensity.KilogramsPerCubicMeter, 1e-14);
        Approx.Relative(density, split.MomentumDensity.KilogramsPerCubicMeter, 1e-14);
        Approx.Relative(900 / density, (quality == 0 ? split.LiquidVelocity : split.VapourVelocity).MetersPerSecond, 1e-14);
    }

    [Fact]
    public void Equals_SameFlow_IsEqualAndReadsWithUnits()
    {
        var flow = new TwoPhaseFlow(FlowStates.At(10e6, 0.78, 1000, 0.08, 0));
        Assert.Equal(VoidFractionModel.Zivi.Split(flow), VoidFractionModel.Zivi.Split(flow));
        Assert.NotEqual(VoidFractionModel.Zivi.Split(flow), VoidFractionModel.Smith.Split(flow));
        Assert.Matches(@"^α = 0\.\d{4}, S = \d\.\d{3}, ug = [\d.]+ m/s, ul = [\d.]+ m/s, ρ = [\d.]+ kg/m³$", VoidFractionModel.Zivi.Split(flow).ToString());
    }

    [Fact]
    public void Quality_OfAVoidFraction_GoesThroughThePublicDoor()
    {
        var flow = new TwoPhaseFlow(FlowStates.At(10e6, 0.78, 1000, 0.08, 0));
        Approx.Relative(0.78, VoidFractionModel.Steiner.Quality(flow, VoidFractionModel.Steiner.VoidFraction(flow)).DecimalFractions, 1e-11);
    }

    [Theory]
    [InlineData(1.1, "Void fraction = 1.1 must lie between 0 and 1")]
    [InlineData(-0.1, "Void fraction = -0.1 must lie between 0 and 1")]
    [InlineData(0.95, "Void fraction = 0.95 must not exceed 0.87")]
    public void Quality_UnreachableVoidFraction_ThrowsNamingTheLimit(double alpha, string message)
    {
        var flow = new TwoPhaseFlow(FlowStates.At(10e6, 0.78, 1000, 0.08, Math.PI / 2));
        var error = Assert.Throws<ArgumentOutOfRangeException>(() => VoidFractionModel.ZuberFindlay.Quality(flow, Ratio.FromDecimalFractions(alpha)));
        Assert.StartsWith(message, error.Message, StringComparison.Ordinal);
    }
}
