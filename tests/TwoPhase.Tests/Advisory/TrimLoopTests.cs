using TwoPhase.Advisory;
using TwoPhase.Dynamics;
using TwoPhase.Passes;
using TwoPhase.Tests.Dynamics;
using TwoPhase.Tests.Passes;
using TwoPhase.Tests.Support;
using UnitsNet;
using Xunit;
using static TwoPhase.Tests.Dynamics.Simulations;

namespace TwoPhase.Tests.Advisory;

public sealed class TrimLoopTests
{
    private static readonly TrimSource[] All = [TrimSource.None, TrimSource.Raw, TrimSource.Corrected, TrimSource.Blended];

    private static double StartFlow => Start.FeedFlow.KilogramsPerSecond;

    public static TheoryData<TrimSource> Sources => [.. All];

    [Theory, MemberData(nameof(Sources))]
    public void Run_NothingHappens_StaysAtRest(TrimSource source)
    {
        // What moves is the round-off of the simulator, and with an estimator what it still learns.
        double allowed = source == TrimSource.None ? 0 : source == TrimSource.Raw ? 1e-11 : 1e-6;
        TrimHistory run = new TrimLoop(MeteredPass, Start, source).Run(Still, Seconds(600));
        Assert.Equal(SimulationEnd.Completed, run.End);
        Assert.All(run, row => Approx.Absolute(StartFlow, row.Pass.FeedFlow.KilogramsPerSecond, allowed * StartFlow));
    }

    // Heat and flow raised together scale time alone: the quality does not move but for heat that the metal takes up (common practice, no source).
    [Fact]
    public void Run_FiringStepByFeedForwardAlone_EndsAtTheSameQuality()
    {
        TrimHistory run = new TrimLoop(MeteredPass, Start, TrimSource.None).Run(Still.StepFiring(Seconds(60), Ratio.FromPercent(106)), Seconds(2400));
        Approx.Relative(1.06 * StartFlow, run[^1].Pass.FeedFlow.KilogramsPerSecond, 1e-9);
        Approx.Absolute(0, run.LastDeviation.DecimalFractions, 0.002);
        Assert.True(Math.Abs(run.PeakDeviation.DecimalFractions) < 0.02);
    }

    [Fact]
    public void Run_FeedTemperatureStepByFeedForwardAlone_EndsAtTheSameQuality()
    {
        TrimHistory run = new TrimLoop(MeteredPass, Start, TrimSource.None).Run(Still.StepFeedTemperature(Seconds(60), Temperature.FromDegreesCelsius(161.85)), Seconds(2400));
        Approx.Absolute(0, run.LastDeviation.DecimalFractions, 0.002);
    }

    [Theory]
    [InlineData(TrimSource.Raw)]
    [InlineData(TrimSource.Corrected)]
    [InlineData(TrimSource.Blended)]
    public void Run_FiringStepWithoutFeedForward_IsTrimmedBack(TrimSource source)
    {
        TrimSettings settings = TrimSettings.Default.WithFeedForward(Ratio.Zero, Ratio.Zero, Duration.Zero);
        TrimHistory run = new TrimLoop(MeteredPass, Start, source, settings).Run(Still.StepFiring(Seconds(60), Ratio.FromPercent(103)), Seconds(7200));
        Assert.True(run.PeakDeviation.DecimalFractions > 0.005);
        Approx.Absolute(0, run.LastDeviation.DecimalFractions, 0.001);

        // In the end it is the energy balance that says what the flow must be.
        PassConditions end = Start.WithAbsorbedHeat(Start.AbsorbedHeat * 1.03m);
        Approx.Relative(SteadyState.FindFlow(MeteredPass, end, run[0].Pass.TrueQuality).Conditions.FeedFlow.KilogramsPerSecond, run[^1].Pass.FeedFlow.KilogramsPerSecond, 2e-3);
    }

    // Heat moves to the convection bank at constant total: the truth dips while the raw reading stays calm, so a trim by it has little to go by.
    [Fact]
    public void Run_ConvectiveShareRises_RawSeesLittleOfIt()
    {
        TrimHistory run = new TrimLoop(MeteredPass, Start, TrimSource.Raw).Run(Still.RampConvectiveShare(Seconds(60), Seconds(300), Ratio.FromPercent(43)), Seconds(1200));
        Assert.True(run.PeakDeviation.DecimalFractions < -0.01);
        Assert.All(run, row => Approx.Absolute(run[0].Value!.Value.DecimalFractions, row.Value!.Value.DecimalFractions, 0.015));
    }

    [Fact]
    public void Run_AtTheLimitOfTheFlow_StaysThereAndLeavesAtOnce()
    {
        TrimSettings settings = TrimSettings.Default.WithFeedForward(Ratio.Zero, Ratio.Zero, Duration.Zero).WithFlowLimits(Ratio.FromPercent(95), Ratio.FromPercent(101)).WithTuning(0.3, Seconds(100));
        OperatingSchedule pulse = Still.StepFiring(Seconds(60), Ratio.FromPercent(106)).StepFiring(Seconds(1800), Ratio.FromPercent(92));
        TrimHistory run = new TrimLoop(MeteredPass, Start, TrimSource.Raw, settings).Run(pulse, Seconds(2400));
        Assert.All(run, row => Assert.InRange(row.Pass.FeedFlow.KilogramsPerSecond, 0.95 * StartFlow * (1 - 1e-12), 1.01 * StartFlow * (1 + 1e-12)));
        Assert.Contains(run, row => row.Status == TrimStatus.AtLimit);
        Approx.Relative(1.01 * StartFlow, run.Last(row => row.Pass.Time.Seconds < 1800).Pass.FeedFlow.KilogramsPerSecond, 1e-12);

        // Half an hour of a reading above the set point would have wound a plain integral far up.
        TrimInstant first = run.First(row => row.Value < row.SetPoint && row.Pass.Time.Seconds > 1800), after = run.First(row => row.Pass.Time > first.Pass.Time);
        Assert.True(after.Pass.FeedFlow.KilogramsPerSecond < 1.01 * StartFlow * (1 - 1e-6));
    }

    [Fact]
    public void Next_ByHand_IsThePositionalPi()
    {
        // u = K [e + (Δt/Ti) Σ e], the textbook's PI (Åström and Hägglund, 2nd ed. (1995), chapter 3), from a value at its set point.
        TrimSettings settings = TrimSettings.Default.WithTuning(0.4, Seconds(100)).WithInterval(Seconds(10)).WithSetPoint(MassFraction.FromDecimalFractions(0.78));
        var trim = new FlowTrim(settings, 5);
        double sum = 0, flow = trim.Next(0.78, 5, out _);
        Assert.Equal(5, flow);
        foreach (double value in new[] { 0.79, 0.80, 0.77, 0.785, 0.78 })
        {
            sum += value - 0.78;
            Approx.Relative(5 * (1 + (0.4 * (value - 0.78 + (0.1 * sum)))), trim.Next(value, 5, out TrimStatus status), 1e-12);
            Assert.Equal(TrimStatus.Trimming, status);
        }
    }

    // Between limits a trim may go to either and no further; what the feed-forward pushed beyond comes back with it.
    [Fact]
    public void Next_AtALimit_GoesNoFurtherAndTurnsAtOnce()
    {
        TrimSettings settings = TrimSettings.Default.WithTuning(0.4, Seconds(100)).WithInterval(Seconds(10)).WithSetPoint(MassFraction.FromDecimalFractions(0.78)).WithFlowLimits(Ratio.FromPercent(90), Ratio.FromPercent(102));
        var trim = new FlowTrim(settings, 5);
        trim.Next(0.78, 5, out _);
        for (int i = 0; i < 50; i++)
        {
            Approx.Relative(5.1, trim.Next(0.88, 5, out TrimStatus status), i == 0 ? 1e-12 : 1e-15);
            Assert.Equal(TrimStatus.AtLimit, status);
        }

        Approx.Relative(5.1 + (5 * 0.4 * (-0.11 - (0.1 * 0.01))), trim.Next(0.77, 5, out _), 1e-12);
        double settled = trim.Next(0.78, 5, out _);
        Assert.Equal(5.1, trim.Next(0.78, 6, out TrimStatus pushed), 12);
        Assert.Equal(TrimStatus.AtLimit, pushed);
        Approx.Relative(settled, trim.Next(0.78, 5, out _), 1e-12);
    }

    [Fact]
    public void Next_FirstValueAwayFromTheSetPoint_MovesByTheIntegralAlone()
    {
        var trim = new FlowTrim(TrimSettings.Default.WithTuning(0.4, Seconds(100)).WithInterval(Seconds(10)).WithSetPoint(MassFraction.FromDecimalFractions(0.75)), 5);
        Approx.Relative(5 * (1 + (0.4 * 0.1 * 0.03)), trim.Next(0.78, 5, out _), 1e-12);
    }

    [Fact]
    public void Next_ValueLostAndFound_HoldsAndComesBackWithoutABump()
    {
        var trim = new FlowTrim(TrimSettings.Default, 5);
        trim.Next(0.78, 5, out _);
        double before = trim.Next(0.80, 5, out _);
        Assert.Equal(before, trim.Next(double.NaN, 5, out TrimStatus lost));
        Assert.Equal(TrimStatus.Holding, lost);
        Approx.Relative(before + 0.1, trim.Next(double.NaN, 5.1, out _), 1e-12);   // the feed-forward goes on
        double back = trim.Next(0.70, 5, out TrimStatus found);
        Assert.Equal(TrimStatus.Trimming, found);
        Approx.Relative(before + (5 * 0.2 * 5 / 300 * (0.70 - 0.78)), back, 1e-12);
    }

    // Refractory holds most of a rise of the firing back for hours: the estimator sees less heat than the firing says, and cannot tell that from a meter gone wrong.
    [Fact]
    public void Run_PlantAndModelDisagree_HoldsWithTheFeedForwardGoingOn()
    {
        SimulatorOptions slow = SimulatorOptions.Default.WithHeatLags(new(Duration.Zero, Ratio.FromPercent(60), Duration.FromHours(10)));
        var loop = new TrimLoop(MeteredPass, Start, TrimSource.Corrected, TrimSettings.Default.WithFeedForward(Ratio.FromPercent(50), Ratio.Zero, Duration.Zero), slow);
        Assert.Equal(Trust.Believable, loop.Now.Trust);
        TrimHistory run = loop.Run(Still.StepFiring(Seconds(60), Ratio.FromPercent(106)).StepFiring(Seconds(7000), Ratio.FromPercent(104)), Seconds(7200));
        Assert.Contains(run, row => row.Trust == Trust.Disagreement && row.Value is null);
        TrimInstant before = run.Last(row => row.Pass.Time.Seconds <= 7000), after = run[^1];
        Assert.Equal(TrimStatus.Holding, before.Status);
        Assert.Equal(TrimStatus.Holding, after.Status);
        Approx.Relative(before.Pass.FeedFlow.KilogramsPerSecond - (0.5 * 0.02 * StartFlow), after.Pass.FeedFlow.KilogramsPerSecond, 1e-9);
        Assert.True(run.Held.Seconds > 600);
    }

    [Fact]
    public void Constructor_WhatCannotBeTrimmed_SaysSo()
    {
        Assert.Contains("no meter", Assert.Throws<ArgumentException>(() => new TrimLoop(ExamplePass.Pass, Start, TrimSource.Raw)).Message);
        Assert.Throws<ArgumentException>(() => new TrimLoop(MeteredPass, Start.WithFeedEnthalpy(SpecificEnergy.FromKilojoulesPerKilogram(700)), TrimSource.Raw));
        Assert.Contains("0 MW", Assert.Throws<ArgumentOutOfRangeException>(() => new TrimLoop(MeteredPass, Start.WithAbsorbedHeat(Power.Zero), TrimSource.Raw)).Message);
        Assert.Contains("feed flow", Assert.Throws<ArgumentException>(() => new TrimLoop(MeteredPass, Start, TrimSource.Raw).Run(Still.StepFeedFlow(Seconds(5), Start.FeedFlow * 1.1), Seconds(10))).Message);
    }

    [Fact]
    public void Settings_OutsideTheirLimits_NameTheValue()
    {
        Assert.Contains("-1", Assert.Throws<ArgumentOutOfRangeException>(() => TrimSettings.Default.WithTuning(-1, Seconds(10))).Message);
        Assert.Contains("0 s", Assert.Throws<ArgumentOutOfRangeException>(() => TrimSettings.Default.WithTuning(1, Seconds(0))).Message);
        Assert.Throws<ArgumentOutOfRangeException>(() => TrimSettings.Default.WithInterval(Seconds(0)));
        Assert.Throws<ArgumentOutOfRangeException>(() => TrimSettings.Default.WithFlowLimits(Ratio.FromPercent(101), Ratio.FromPercent(120)));
        Assert.Throws<ArgumentOutOfRangeException>(() => TrimSettings.Default.WithFlowLimits(Ratio.FromPercent(80), Ratio.FromPercent(99)));
        Assert.Throws<ArgumentOutOfRangeException>(() => TrimSettings.Default.WithFeedForward(Ratio.FromPercent(110), Ratio.Zero, Duration.Zero));
        Assert.Throws<ArgumentOutOfRangeException>(() => TrimSettings.Default.WithRawShare(Ratio.FromPercent(-1)));
        Assert.Throws<ArgumentOutOfRangeException>(() => TrimSettings.Default.WithSetPoint(MassFraction.FromDecimalFractions(1.1)));
    }
}
