using FsCheck.Xunit;
using TwoPhase.Passes;
using TwoPhase.Slip;
using TwoPhase.Stability;
using TwoPhase.Tests.Passes;
using UnitsNet;

namespace TwoPhase.Tests.Stability;

public class DensityWaveTests
{
    private static readonly PassProfile Profile = SteadyState.FindHeat(ExamplePass.Pass, ExamplePass.Conditions, MassFraction.FromPercent(78));

    // Two of the borders as an independent script had them (Python, printed to two decimals): the solution in this folder must be the same.
    [Theory]
    [InlineData(4, 10, 5, 0, 10.04)]
    [InlineData(6, 10, 5, 0, 10.59)]
    [InlineData(9, 10, 5, 0, 11.46)]
    [InlineData(4, 50, 26, 2.5, 10.70)]
    [InlineData(6, 50, 26, 2.5, 11.31)]
    [InlineData(9, 50, 26, 2.5, 12.27)]
    public void Channel_LinearisedEquations_AgreeWithAnIndependentScript(double subcooling, double inlet, double friction, double exit, double expected) =>
        Approx.Absolute(expected, new HomogeneousChannel(subcooling, inlet, friction, exit).Threshold().Excess, 0.006);

    [Theory]
    [InlineData(10, 5, 0, 8.571)]
    [InlineData(30, 10, 0, 13.333)]
    [InlineData(50, 26, 2.5, 9.515)]
    public void Threshold_SimplifiedCriterion_LiesBelowTheExactOne(double inlet, double friction, double exit, double expected)
    {
        DensityWave wave = Channel(5.84098, inlet, friction, exit);
        Approx.Absolute(expected, wave.Threshold, 1e-3);
        foreach (double subcooling in new[] { 4.0, 6, 9 })
        {
            (double exact, double period) = new HomogeneousChannel(subcooling, inlet, friction, exit).Threshold();
            Assert.InRange(wave.Threshold / exact, 0.7, 0.95);
            Assert.InRange(period, 1.5, 3);
        }
    }

    [Fact]
    public void Of_UniformChannel_HasTheNumbersOfTheBaseCase()
    {
        // ρ 688/55.5, hfg 1.317e6, Δh 6.75e5, D 0.0779, L 671, G 1007, q′ 12180: by hand.
        StabilityNumbers numbers = StabilityNumbers.Of(Base(6.75e5))!.Value;
        Approx.Absolute(5.84098, numbers.Subcooling, 5e-6);
        Approx.Absolute(14.73524, numbers.PhaseChange, 5e-6);
        Approx.Absolute(0.780445, numbers.Excess * 55.5 / (688 - 55.5), 5e-7);
        Assert.False(numbers.AllowsExcursion);

        // Transit τ + θ = 181.72293 + 71.30670 s.
        Approx.Relative(253.02963, DensityWave.Of(Base(6.75e5)).TransitTime.Seconds, 1e-7);
    }

    [Fact]
    public void Of_BarePass_IsBeyondTheThreshold_AndTheRestrictionItNeedsHoldsIt()
    {
        DensityWave bare = DensityWave.Of(Profile);
        Assert.Equal(StabilityStatus.Unstable, bare.Status);
        Assert.InRange(bare.Threshold, 3.5, 4);
        Assert.InRange(bare.Numbers!.Value.Excess, 8.5, 9.5);

        double needed = bare.RestrictionNeeded!.Value.Pascals;
        Assert.Equal(StabilityStatus.Stable, DensityWave.Of(Profile, Pressure.FromPascals(needed * 1.001)).Status);
        Assert.Equal(StabilityStatus.Unstable, DensityWave.Of(Profile, Pressure.FromPascals(needed * 0.999)).Status);
        Approx.Relative(needed, DensityWave.Of(Profile, Pressure.FromPascals(needed)).RestrictionNeeded!.Value.Pascals, 1e-9);
        Approx.Relative(needed / (needed + Profile.PressureDrop.Total.Pascals), bare.AuthorityNeeded!.Value.DecimalFractions, 1e-9);
        Assert.True(bare.ShortestPeriod < bare.LongestPeriod);
    }

    [Fact]
    public void Of_LossesBeforeAndBehindTheHeat_AreInletAndExit()
    {
        // K counts half: Δp = (K/2) ρ u². A restrictor in an unheated section before, an outlet line behind.
        Pass plain = new("1", [ExamplePass.Tubes("coil", 671)]);
        Pass dressed = new Pass("1", [ExamplePass.Tubes("inlet", 0.01).AsUnheated().WithLossCoefficient(40), ExamplePass.Tubes("coil", 671)]).WithOutletLine(new OutletLine(Length.FromMillimeters(77.9), 6, Volume.FromLiters(5)));
        PassConditions conditions = Profile.Conditions;
        DensityWave before = DensityWave.Of(SteadyState.Solve(plain, conditions)), after = DensityWave.Of(SteadyState.Solve(dressed, conditions));
        Assert.Equal(0, before.InletCoefficient);
        Assert.Equal(0, before.ExitCoefficient);
        Approx.Relative(20, after.InletCoefficient, 1e-3);
        Approx.Relative(3, after.ExitCoefficient, 0.01);
        Approx.Relative(before.FrictionCoefficient, after.FrictionCoefficient, 0.02);
    }

    [Fact]
    public void Of_LittleSubcooling_SaysThatTheCriterionEnds()
    {
        DensityWave wave = DensityWave.Of(Base(3e5, 8000));
        Assert.Equal(StabilityStatus.NotApplicable, wave.Status);
        Assert.Contains("not above π", wave.Reason, StringComparison.Ordinal);
        Assert.Null(wave.RestrictionNeeded);
        Assert.Null(wave.AuthorityNeeded);
        Assert.StartsWith("not applicable", wave.ToString(), StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(0)]
    [InlineData(12)]
    public void Of_OutletNotWet_SaysSo(double megawatts)
    {
        DensityWave wave = DensityWave.Of(SteadyState.Solve(ExamplePass.Pass, ExamplePass.Conditions.WithAbsorbedHeat(Power.FromMegawatts(megawatts))));
        Assert.Equal(StabilityStatus.NotApplicable, wave.Status);
        Assert.Contains("not wet steam", wave.Reason, StringComparison.Ordinal);
        Assert.Null(wave.Numbers);
        Assert.True(wave.TransitTime.Seconds > 0);
    }

    [Fact]
    public void Of_MeaninglessInput_Throws()
    {
        Assert.Throws<ArgumentNullException>(() => DensityWave.Of(null!));
        Assert.Throws<ArgumentNullException>(() => StabilityNumbers.Of(null!));
        Assert.Contains("Inlet restriction = -1 kPa", Assert.Throws<ArgumentOutOfRangeException>(() => DensityWave.Of(Profile, Pressure.FromKilopascals(-1))).Message, StringComparison.Ordinal);
    }

    [Property(MaxTest = 20)]
    public bool Threshold_MoreInletRestriction_IsHigher(ushort pascals)
    {
        double restriction = pascals * 10.0;
        return DensityWave.Of(Profile, Pressure.FromPascals(restriction + 1000)).Threshold > DensityWave.Of(Profile, Pressure.FromPascals(restriction)).Threshold;
    }

    private static PassProfile Base(double lacking, double linearHeat = 12180) => ChannelFluid.Solve(new Pass("1", [ChannelFluid.Tube(671)]), lacking, linearHeat);

    // A channel whose coefficients are given: length for F, losses K = 2 k before and behind.
    private static DensityWave Channel(double subcooling, double inlet, double friction, double exit)
    {
        double length = friction * 2 * ChannelFluid.Bore / ChannelFluid.FrictionFactor, lacking = subcooling * 1.317e6 * 55.5 / (688 - 55.5);
        Pass pass = new Pass("1", [new TubeSection("inlet", Length.FromMeters(ChannelFluid.Bore), Length.FromMillimeters(88.9), Length.FromMeters(1e-6)).AsUnheated().WithLossCoefficient(2 * inlet), ChannelFluid.Tube(length)])
            .WithOutletLine(new OutletLine(Length.FromMeters(ChannelFluid.Bore), 2 * exit, Volume.FromLiters(1e-3)));
        return DensityWave.Of(ChannelFluid.Solve(pass, lacking, 12180 * 671 / length));
    }
}
