using TwoPhase.Passes;
using TwoPhase.Stability;
using TwoPhase.Tests.Passes;
using UnitsNet;

namespace TwoPhase.Tests.Stability;

/// <summary>
/// Uniform heat, homogeneous flow, friction only, one friction factor, constant saturation: with s = λ/L, λ boiling length, Δp = c ṁ0² (s² + (Nsub/2) s (1 − s)²), where
/// s is proportional to flow. Its slope 2 s + (Nsub/2)(1 − s)(1 − 3 s) has no negative value up to Nsub = 4 + 2√3, and touches zero there at s = 1/√3.
/// </summary>
public class FlowCharacteristicTests
{
    // Flow at which the whole channel is just heated to saturation, s = 1 [kg/s]; it sets the heat.
    private const double Full = 8;

    [Theory]
    [InlineData(1)]
    [InlineData(4)]
    [InlineData(8)]
    [InlineData(12)]
    public void Of_UniformChannel_FollowsTheClosedForm(double subcooling)
    {
        FlowCharacteristic curve = Curve(subcooling, 0.25, 0.95, 15);
        Assert.Empty(curve.Unsolved);
        foreach (CharacteristicPoint point in curve)
        {
            double s = point.Flow.KilogramsPerSecond / Full;
            double scale = ChannelFluid.FrictionFactor * 671 / (2 * ChannelFluid.Bore * 688) * Math.Pow(Full / ChannelFluid.Area, 2);
            double drop = (s * s) + (subcooling / 2 * s * (1 - s) * (1 - s)), slope = (2 * s) + (subcooling / 2 * (1 - s) * (1 - (3 * s)));
            Approx.Relative(scale * drop, point.PressureDrop.Pascals, 1e-7);

            // The central difference over h = 1e-3 of flow: truncation h² s³ y‴/6 with y‴ = 3 N; and both pressures of the march stand to 1e-10 of 10 MPa, a pascal in the slope.
            double truncation = 1e-6 * s * s * s * subcooling / (2 * drop);
            Approx.Absolute(slope * s / drop, point.RelativeSlope, (1.01 * truncation) + (1.05 / point.PressureDrop.Pascals));
        }
    }

    [Fact]
    public void Of_SubcoolingNumberAtTheLimit_HasOneLevelPointAtItsPlace()
    {
        double limit = StabilityNumbers.ExcursionSubcooling, s = 1 / Math.Sqrt(3);
        Approx.Absolute(7.464102, limit, 5e-7);
        FlowCharacteristic curve = Curve(limit, s / 1.3, s * 1.3, 41);
        Approx.Absolute(s * Full, curve[20].Flow.KilogramsPerSecond, 1e-12);
        Approx.Absolute(0, curve[20].RelativeSlope, 3e-6);
        Assert.Equal(curve[20], curve.MinBy(point => point.RelativeSlope));

        // A ten-thousandth less, and the drop rises throughout; as much more, and it falls about that place.
        Assert.True(Curve(limit * (1 - 1e-4), s / 1.001, s * 1.001, 3)[1].RelativeSlope > 1e-5);
        Assert.True(Curve(limit * (1 + 1e-4), s / 1.001, s * 1.001, 3)[1].RelativeSlope < -1e-5);
        FlowExcursion just = Assert.Single(Curve(limit * 1.001, s / 1.3, s * 1.3, 41).Excursions);
        Assert.False(just.IsOpen);
        Approx.Relative(s * Full, Math.Sqrt(just.From.KilogramsPerSecond * just.To.KilogramsPerSecond), 1e-3);
        Assert.Empty(Curve(limit * 0.999, s / 1.3, s * 1.3, 41).Excursions);
    }

    [Theory]
    [InlineData(8)]
    [InlineData(9)]
    [InlineData(14)]
    public void Excursions_BeyondTheLimit_StandAtTheRootsOfTheSlope(double subcooling)
    {
        // 2 s + (N/2)(1 − 4 s + 3 s²) = 0: s = [(4 − 4/N) ± √((4 − 4/N)² − 12)]/6.
        double b = 4 - (4 / subcooling), root = Math.Sqrt((b * b) - 12);
        FlowExcursion excursion = Assert.Single(Curve(subcooling, 0.3, 0.99, 31).Excursions);
        Approx.Relative((b - root) / 6 * Full, excursion.From.KilogramsPerSecond, 1e-5);
        Approx.Relative((b + root) / 6 * Full, excursion.To.KilogramsPerSecond, 1e-5);
    }

    [Fact]
    public void RestrictionNeeded_AddedAtTheInlet_MakesTheDropRiseThroughout()
    {
        // Inlet throttling k adds 2 k s to the slope; the restrictor is a loss of its own flow, K = 2 ρ Δp/G².
        FlowCharacteristic bare = Curve(10, 0.3, 0.99, 61);
        double needed = bare.RestrictionNeeded.Pascals, flux = ChannelFluid.MassFlux;
        Assert.True(needed > 0);
        double coefficient = 2 * 688 * needed / (flux * flux);
        Assert.Empty(Restricted(coefficient * 1.02).Excursions);
        Assert.Single(Restricted(coefficient * 0.9).Excursions);
        Assert.Equal(0, Curve(5, 0.3, 0.99, 21).RestrictionNeeded.Pascals);

        static FlowCharacteristic Restricted(double coefficient) => Curve(10, 0.3, 0.99, 61, new Pass("1",
            [new TubeSection("inlet", Length.FromMeters(ChannelFluid.Bore), Length.FromMillimeters(88.9), Length.FromMeters(1e-6)).AsUnheated().WithLossCoefficient(coefficient), ChannelFluid.Tube(671)]));
    }

    [Fact]
    public void Of_RealPass_RisesAtItsOperatingPoint()
    {
        FlowCharacteristic curve = FlowCharacteristic.Of(ExamplePass.Pass, ExamplePass.Conditions, MassFlow.FromKilogramsPerSecond(3.5), MassFlow.FromKilogramsPerSecond(12), 15);
        CharacteristicPoint at = curve.OperatingPoint!.Value;
        Assert.InRange(at.RelativeSlope, -2, 2);
        PassProfile profile = SteadyState.Solve(ExamplePass.Pass, ExamplePass.Conditions);
        Approx.Relative(profile.PressureDrop.Total.Pascals, at.PressureDrop.Pascals, 1e-7);
        Approx.Absolute(profile.OutletQuality.DecimalFractions, at.OutletQuality.DecimalFractions, 1e-9);
        Assert.Equal(15, curve.Count);
        Assert.Contains("relative slope", at.ToString(), StringComparison.Ordinal);
    }

    [Fact]
    public void Of_ColdPass_HasTheSlopeOfTurbulentLiquid()
    {
        FlowCharacteristic cold = FlowCharacteristic.Of(ExamplePass.Pass, ExamplePass.Conditions.WithAbsorbedHeat(Power.Zero), MassFlow.FromKilogramsPerSecond(2), MassFlow.FromKilogramsPerSecond(8), 5);
        Assert.All(cold, point => Assert.InRange(point.RelativeSlope, 1.8, 2));
        Assert.Empty(cold.Excursions);
    }

    [Fact]
    public void Of_FlowsWithoutASteadyState_AreListedWithTheirReason()
    {
        FlowCharacteristic curve = FlowCharacteristic.Of(ExamplePass.Pass, ExamplePass.Conditions, MassFlow.FromKilogramsPerSecond(0.5), MassFlow.FromKilogramsPerSecond(6), 9);
        Assert.NotEmpty(curve.Unsolved);
        Assert.All(curve.Unsolved, flow => Assert.Contains("outside the steam formulation", flow.Reason, StringComparison.Ordinal));
        Assert.Equal(9, curve.Count + curve.Unsolved.Count);
    }

    [Fact]
    public void Of_MeaninglessRange_ThrowsNamingIt()
    {
        Assert.Contains("Highest flow = 2 kg/s must be above the lowest, 3 kg/s", Fails(3, 2, 9).Message, StringComparison.Ordinal);
        Assert.Contains("Lowest flow = 0 kg/s", Fails(0, 2, 9).Message, StringComparison.Ordinal);
        Assert.Contains("Number of points = 2", Fails(1, 2, 2).Message, StringComparison.Ordinal);

        static ArgumentOutOfRangeException Fails(double low, double high, int points) => Assert.Throws<ArgumentOutOfRangeException>(() =>
            FlowCharacteristic.Of(ExamplePass.Pass, ExamplePass.Conditions, MassFlow.FromKilogramsPerSecond(low), MassFlow.FromKilogramsPerSecond(high), points));
    }

    private static double Lacking(double subcooling) => subcooling * 1.317e6 * 55.5 / (688 - 55.5);

    // Flows from s = low to s = high: s = λ/L = ṁ Δh/Q.
    private static FlowCharacteristic Curve(double subcooling, double low, double high, int points, Pass? pass = null) =>
        FlowCharacteristic.Of(default(ChannelFluid), pass ?? new Pass("1", [ChannelFluid.Tube(671)]), ChannelFluid.Conditions(Lacking(subcooling), Full * Lacking(subcooling)),
            MassFlow.FromKilogramsPerSecond(low * Full), MassFlow.FromKilogramsPerSecond(high * Full), points, ChannelFluid.Models, ChannelFluid.FrictionOnly.WithTolerance(1e-11));
}
