using FsCheck.Xunit;
using TwoPhase.Passes;
using TwoPhase.Stability;
using TwoPhase.Tests.Passes;
using UnitsNet;

namespace TwoPhase.Tests.Stability;

public class HeaderSplitTests
{
    // A restrictor that makes the characteristic rise throughout, as on a pass that is meant to share a header.
    private static readonly Pass Throttled = new Pass("1", [ExamplePass.Tubes("inlet", 1).AsUnheated().WithLossCoefficient(700), ExamplePass.Tubes("bank", 335.5).AsConvective(), ExamplePass.Tubes("coil", 335.5)]).WithConvectiveShare(Ratio.FromPercent(41));

    [Fact]
    public void Solve_EqualPasses_SplitsEqually()
    {
        HeaderSplit split = HeaderSplit.Solve([Throttled, Throttled, Throttled], [At(4.8, 8.2), At(4.8, 8.2), At(4.8, 8.2)]);
        Assert.All(split.Points, point => Assert.Equal(4.8, point.Flow.KilogramsPerSecond, 1e-12));
        Assert.True(split.IsStable);
    }

    [Property(MaxTest = 10)]
    public bool Solve_EqualPassesFromAnyStart_SplitsEqually(byte first, byte second)
    {
        double a = 4 + (first / 200.0), b = 4 + (second / 200.0), total = a + b + 4.8;
        HeaderSplit split = HeaderSplit.Solve([Throttled, Throttled, Throttled], [At(a, 8.2), At(b, 8.2), At(4.8, 8.2)]);
        return split.Points.All(point => Math.Abs((point.Flow.KilogramsPerSecond * 3 / total) - 1) < 1e-5);
    }

    [Fact]
    public void Solve_UnequalHeat_GivesTheHotPassLess()
    {
        HeaderSplit split = HeaderSplit.Solve([Throttled, Throttled, Throttled, Throttled], [At(4.8, 8.6), At(4.8, 8.2), At(4.8, 8.2), At(4.8, 7.8)]);
        double[] flows = [.. split.Points.Select(point => point.Flow.KilogramsPerSecond)];
        Assert.True(flows[0] < flows[1] && flows[2] < flows[3]);
        Approx.Relative(flows[1], flows[2], 1e-9);
        Approx.Relative(19.2, flows.Sum(), 1e-12);
        Assert.All(split.Profiles, profile => Approx.Relative(split.PressureDrop.Pascals, profile.PressureDrop.Total.Pascals, 3e-6));

        // The hot pass is hit twice: more heat, less flow.
        Assert.True(split.Profiles[0].OutletQuality.DecimalFractions > SteadyState.Solve(Throttled, At(4.8, 8.6)).OutletQuality.DecimalFractions);
        Assert.True(split.IsStable);
    }

    [Fact]
    public void Solve_PassWithMoreScale_TakesLess()
    {
        HeaderSplit split = HeaderSplit.Solve([Throttled, Throttled.WithAddedScale(Length.FromMillimeters(1))], [At(4.8, 8.2), At(4.8, 8.2)]);
        Assert.True(split.Points[1].Flow < split.Points[0].Flow);
    }

    [Fact]
    public void IsStable_TwoPassesOnTheFallingPart_IsFalse()
    {
        // Cold feed and strong heat put the bare pass on the falling part of its characteristic: equal flows balance, and do not hold.
        PassConditions steep = ExamplePass.Conditions.WithFeedTemperature(Temperature.FromDegreesCelsius(20)).WithOutletPressure(Pressure.FromMegapascals(4));
        FlowCharacteristic curve = FlowCharacteristic.Of(ExamplePass.Pass, steep.WithAbsorbedHeat(Power.FromMegawatts(8)), MassFlow.FromKilogramsPerSecond(2.6), MassFlow.FromKilogramsPerSecond(12), 31);
        FlowExcursion falling = Assert.Single(curve.Excursions);
        double middle = Math.Sqrt(falling.From.KilogramsPerSecond * falling.To.KilogramsPerSecond);
        PassConditions at = steep.WithAbsorbedHeat(Power.FromMegawatts(8)).WithFeedFlow(MassFlow.FromKilogramsPerSecond(middle));
        HeaderSplit split = HeaderSplit.Solve([ExamplePass.Pass, ExamplePass.Pass], [at, at]);
        Assert.All(split.Points, point => Assert.True(point.RelativeSlope < 0));
        Assert.False(split.IsStable);
    }

    [Fact]
    public void Solve_MeaninglessInput_Throws()
    {
        Assert.Contains("at least one pass", Assert.Throws<ArgumentException>(() => HeaderSplit.Solve([], [])).Message, StringComparison.Ordinal);
        Assert.Contains("2 passes need as many conditions; there are 1", Assert.Throws<ArgumentException>(() => HeaderSplit.Solve([Throttled, Throttled], [At(4.8, 8.2)])).Message, StringComparison.Ordinal);
        Assert.Contains("Outlet pressure = 9 MPa must be that of the common header, 9.6 MPa", Assert.Throws<ArgumentOutOfRangeException>(() => HeaderSplit.Solve([Throttled, Throttled], [At(4.8, 8.2), At(4.8, 8.2).WithOutletPressure(Pressure.FromMegapascals(9))])).Message, StringComparison.Ordinal);
        Assert.Throws<ArgumentNullException>(() => HeaderSplit.Solve(null!, []));
    }

    private static PassConditions At(double flow, double megawatts) => ExamplePass.Conditions.WithFeedFlow(MassFlow.FromKilogramsPerSecond(flow)).WithAbsorbedHeat(Power.FromMegawatts(megawatts));
}
