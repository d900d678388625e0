using TwoPhase.Dynamics;
using TwoPhase.Passes;
using TwoPhase.Tests.Passes;
using TwoPhase.Tests.Support;
using TwoPhase.Units;
using UnitsNet;
using UnitsNet.Units;
using static TwoPhase.Tests.Dynamics.Simulations;

namespace TwoPhase.Tests.Dynamics;

/// <summary>Heat that moves between convection bank and coil.</summary>
public class HeatSplitTests
{
    private static readonly double Own = MeteredPass.Ducts[0].HeatShare;

    private static readonly Pass Three = new Pass("1", [ExamplePass.Tubes("bank", 300).AsConvective(), ExamplePass.Tubes("coil", 200), ExamplePass.Tubes("last", 171)]);

    // Two points more in the bank within five minutes: boiling begins earlier, water leaves, and what leaves with it hides the loss of quality.
    [Fact]
    public void Run_ConvectiveShareUp_IsCalmAndWrong()
    {
        PassHistory history = Run(Still.RampConvectiveShare(Seconds(10), Seconds(300), Share(Own + 0.02)), 1500);
        double start = history[0].TrueQuality.DecimalFractions;
        Assert.InRange(start - history.Min(row => row.TrueQuality.DecimalFractions), 0.02, 0.035);
        Assert.All(history, row => Approx.Absolute(start, row.IndicatedQuality!.Value.DecimalFractions, 0.015));
        Approx.Absolute(start, history[^1].TrueQuality.DecimalFractions, 1e-4);
        Approx.Absolute(0, history[^1].EnergyResidual, 1e-12);
    }

    [Fact]
    public void Run_AfterTheShareHasMoved_RestsWhereAPassWithThatShareRests()
    {
        PassHistory history = Run(Still.StepConvectiveShare(Seconds(10), Share(Own + 0.03)), 1500);
        PassInstant rest = new PassSimulator(MeteredPass.WithConvectiveShare(Share(Own + 0.03)), Start).Now;
        Approx.Relative(rest.Holdup.Kilograms, history[^1].Holdup.Kilograms, 1e-6);
        Approx.Relative(rest.BoilingOnset!.Value.Meters, history[^1].BoilingOnset!.Value.Meters, 1e-6);
    }

    // The bank named as a section is the bank.
    [Fact]
    public void Run_ShareOfTheBankByName_IsTheConvectiveShare()
    {
        PassHistory zone = Run(Still.RampConvectiveShare(Seconds(10), Seconds(60), Share(0.45)), 200), section = Run(Still.RampHeatShare("bank", Seconds(10), Seconds(60), Share(0.45)), 200);
        Assert.Equal(zone.ToList(), section.ToList());
    }

    [Fact]
    public void Run_SharesFromColumns_AreFollowed()
    {
        Column<DurationUnit> time = Column.Of<DurationUnit>([0, 10, 310], DurationUnit.Second);
        PassHistory ramp = Run(Still.RampConvectiveShare(Seconds(10), Seconds(300), Share(0.43)), 200);
        PassHistory column = Run(Still.WithConvectiveShare(time, Column.Of<RatioUnit>([100 * Own, 100 * Own, 43], RatioUnit.Percent)), 200);
        Approx.Relative(ramp[^1].Holdup.Kilograms, column[^1].Holdup.Kilograms, 1e-9);
        PassHistory section = Run(Still.WithHeatShare("bank", time, Column.Of<RatioUnit>([100 * Own, 100 * Own, 43], RatioUnit.Percent)), 200);
        Assert.Equal(column.ToList(), section.ToList());
    }

    // Scheduled shares are met; sections that are not named keep their proportions and take the rest, and the sum stays 1.
    [Fact]
    public void Over_TwoOfThreeSections_LeaveTheRestToTheThird()
    {
        HeatSplit split = new OperatingSchedule(Start).StepHeatShare("bank", Seconds(5), Share(0.5)).StepHeatShare("last", Seconds(5), Share(0.2)).Split;
        double[] factors = split.For(Three, "schedule").Over(5, 6).ToArray(), own = [.. Three.Ducts.Select(duct => duct.HeatShare)];
        Approx.Relative(0.5, factors[0] * own[0], 1e-12);
        Approx.Relative(0.3, factors[1] * own[1], 1e-12);
        Approx.Relative(0.2, factors[2] * own[2], 1e-12);
        Assert.All(split.For(Three, "schedule").Over(0, 5).ToArray(), factor => Approx.Relative(1, factor, 1e-12));
    }

    [Fact]
    public void Over_ConvectiveShare_KeepsTheOthersInProportion()
    {
        double[] factors = new OperatingSchedule(Start).StepConvectiveShare(Seconds(0), Share(0.6)).Split.For(Three, "schedule").Over(0, 1).ToArray();
        Approx.Relative(0.6, factors[0] * Three.Ducts[0].HeatShare, 1e-12);
        Approx.Relative(factors[1], factors[2], 1e-12);
        Approx.Relative(1, factors.Zip(Three.Ducts, (factor, duct) => factor * duct.HeatShare).Sum(), 1e-12);
    }

    [Fact]
    public void Run_SplitThatMoves_AllocatesNothingPerStep()
    {
        HeatSplit.Factors factors = Still.RampConvectiveShare(Seconds(0), Seconds(300), Share(0.43)).Split.For(MeteredPass, "schedule");
        double time = 0;
        Assert.Equal(0, AllocationProbe.Bytes(() => factors.Over(time, time += 1)));
    }

    [Fact]
    public void Schedule_SharesThatMakeNoSense_ThrowSayingWhy()
    {
        Assert.Contains("convective share = 1.2", Assert.Throws<ArgumentOutOfRangeException>(() => Still.StepConvectiveShare(Seconds(0), Share(1.2))).Message, StringComparison.Ordinal);
        Assert.Contains("both", Assert.Throws<ArgumentException>(() => Still.StepConvectiveShare(Seconds(0), Share(0.4)).StepHeatShare("coil", Seconds(0), Share(0.4))).Message, StringComparison.Ordinal);
        Assert.Contains("'roof'", Fault(Still.StepHeatShare("roof", Seconds(0), Share(0.4))), StringComparison.Ordinal);
        Assert.Contains("take the rest", Fault(Still.StepHeatShare("bank", Seconds(0), Share(0.4)).StepHeatShare("coil", Seconds(0), Share(0.6))), StringComparison.Ordinal);
        Assert.Contains("convection bank", Assert.Throws<ArgumentException>(() => Run(Still.StepConvectiveShare(Seconds(0), Share(0.4)), 5, pass: new Pass("1", [ExamplePass.Tubes("coil", 671)]))).Message, StringComparison.Ordinal);
        Assert.Contains("1.1", Assert.Throws<ArgumentOutOfRangeException>(() => Run(Still.StepHeatShare("bank", Seconds(1), Share(0.6)).StepHeatShare("last", Seconds(1), Share(0.5)), 5, pass: Three)).Message, StringComparison.Ordinal);
        Assert.Throws<ArgumentOutOfRangeException>(() => Still.WithConvectiveShare(Column.Of<DurationUnit>([0], DurationUnit.Second), Column.Of<RatioUnit>([120], RatioUnit.Percent)));
        Assert.Equal(310, Still.RampConvectiveShare(Seconds(10), Seconds(300), Share(0.43)).LastChange.Seconds);
    }

    private static string Fault(OperatingSchedule schedule) => Assert.Throws<ArgumentException>(() => Run(schedule, 5)).Message;

    private static Ratio Share(double share) => Ratio.FromDecimalFractions(share);
}
