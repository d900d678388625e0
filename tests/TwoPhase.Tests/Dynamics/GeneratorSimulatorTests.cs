using TwoPhase.Dynamics;
using TwoPhase.Passes;
using TwoPhase.Tests.Passes;
using TwoPhase.Tests.Support;
using UnitsNet;
using static TwoPhase.Tests.Dynamics.Simulations;

namespace TwoPhase.Tests.Dynamics;

public class GeneratorSimulatorTests
{
    private static readonly double[] Lengths = [335.5, 320, 350];

    // Three passes of an invented generator, the second with the least heat.
    private static readonly SteamGenerator Generator = new("G", Lengths.Select((length, i) =>
        new Pass(Name(i), [ExamplePass.Tubes("bank", length).AsConvective(), ExamplePass.Tubes("coil", length)], Power.FromMegawatts(8.2 - (i == 1 ? 0.3 : 0))).WithMeter(Venturi)));

    private static readonly SimulatorOptions Coarse = SimulatorOptions.Default.WithCells(20);

    private static readonly GeneratorSchedule Rest = GeneratorSchedule.AtFiring(Generator, Ratio.FromPercent(100), MassFlow.FromKilogramsPerSecond(4.8), Temperature.FromDegreesCelsius(171.85), Pressure.FromMegapascals(9.6));

    private static readonly Ratio Half = Ratio.FromPercent(50);

    private static FeedSupply Kept => FeedSupply.AtPressure(Pressure.FromMegapascals(12)).WithValve("P1", ValveCharacteristic.EqualPercentage(), Half);

    [Fact]
    public void Run_WithoutAHeader_EachPassGoesItsOwnWay()
    {
        GeneratorSchedule schedule = Rest.ForAll((_, pass) => pass.StepFiring(Seconds(10), Ratio.FromPercent(104))).ForPass("P2", pass => pass.StepFeedFlow(Seconds(20), MassFlow.FromKilogramsPerSecond(4.6)));
        GeneratorHistory history = new GeneratorSimulator(Coarse).Run(schedule, Seconds(130));
        Assert.True(history.IsComplete);
        Assert.Equal(131, history.Count);
        for (int i = 0; i < Lengths.Length; i++)
        {
            OperatingSchedule own = schedule.Of(Name(i));
            Assert.Equal(new PassSimulator(Generator.Passes[i], own.Start, Coarse).Run(own, Seconds(130)).ToList(), history.Of(Name(i)).ToList());
        }

        Assert.Equal(4.8, history.Of("P1")[^1].FeedFlow.KilogramsPerSecond, 1e-12);
        Assert.Equal(4.6, history.Of("P2")[^1].FeedFlow.KilogramsPerSecond, 1e-12);
    }

    [Theory]
    [InlineData(false), InlineData(true)]
    public void Run_AnyNumberOfThreads_GivesTheSameBits(bool header)
    {
        GeneratorSchedule schedule = Rest.ForAll((_, pass) => pass.StepFiring(Seconds(5), Ratio.FromPercent(104)));
        if (header) schedule = schedule.WithSupply(Total().RampFreeShare("P1", Seconds(10), Seconds(5), Half));
        GeneratorHistory one = new GeneratorSimulator(Coarse, 1).Run(schedule, Seconds(40)), many = new GeneratorSimulator(Coarse, 3).Run(schedule, Seconds(40));
        Assert.Equal(one.ToList(), many.ToList());
        for (int i = 0; i < Lengths.Length; i++) Assert.Equal(one.Passes[i].ToList(), many.Passes[i].ToList());
    }

    [Fact]
    public void Run_Totals_AreThoseOfThePasses()
    {
        GeneratorHistory history = new GeneratorSimulator(Coarse).Run(Rest.ForAll((_, pass) => pass.StepFiring(Seconds(5), Ratio.FromPercent(104))), Seconds(60));
        GeneratorInstant last = history[^1];
        PassInstant[] rows = [.. history.Passes.Select(pass => pass[^1])];
        double steam = rows.Sum(row => row.OutletFlow.KilogramsPerSecond * row.TrueQuality.DecimalFractions), outlet = rows.Sum(row => row.OutletFlow.KilogramsPerSecond);
        Assert.Equal(60, last.Time.Seconds);
        Approx.Relative(outlet, last.OutletFlow.KilogramsPerSecond, 1e-12);
        Approx.Relative(3 * 4.8, last.FeedFlow.KilogramsPerSecond, 1e-12);
        Approx.Relative(steam / outlet, last.TrueQuality.DecimalFractions, 1e-12);
        Approx.Relative(steam, last.SteamFlow.KilogramsPerSecond, 1e-12);
        Approx.Relative(rows.Average(row => row.IndicatedQuality!.Value.DecimalFractions), last.IndicatedQuality!.Value.DecimalFractions, 1e-12);
        Approx.Relative(rows.Sum(row => row.Holdup.Kilograms), last.Holdup.Kilograms, 1e-12);
        Assert.Equal(rows.Min(row => row.TrueQuality.DecimalFractions), last.PassQuality.Lowest.DecimalFractions);
        Assert.Equal(rows.Max(row => row.TrueQuality.DecimalFractions), last.PassQuality.Highest.DecimalFractions);
        Assert.Null(last.FeedPressure);
    }

    [Theory]
    [InlineData(false), InlineData(true)]
    public void Run_WithValvesThatNobodyMoves_StaysAtRest(bool total)
    {
        GeneratorHistory history = new GeneratorSimulator(Coarse).Run(Rest.WithSupply(total ? Total() : Kept), Seconds(60));
        Approx.Relative(3 * 4.8, history[^1].OutletFlow.KilogramsPerSecond, 1e-7);
        Approx.Relative(12, history[^1].FeedPressure!.Value.Megapascals, 1e-7);
    }

    // Flow of a liquid through a valve goes with its coefficient and the root of Δp/ρ by volume (IEC 60534-2-1, turbulent, not choked).
    [Fact]
    public void Run_StuckValve_LosesFeedAsItsPassPushesBack()
    {
        GeneratorHistory history = new GeneratorSimulator(Coarse).Run(Rest.ForAll((_, pass) => pass.StepFiring(Seconds(10), Ratio.FromPercent(106))).WithSupply(Kept), Seconds(1800));
        PassHistory stuck = history.Of("P1");
        PassInstant first = stuck[0], last = stuck[^1];
        Assert.True(last.InletPressure > first.InletPressure);
        Approx.Relative(Math.Sqrt((12 - last.InletPressure.Megapascals) / (12 - first.InletPressure.Megapascals)), last.FeedFlow / first.FeedFlow, 1e-6);
        Assert.Equal(4.8, history.Of("P2")[^1].FeedFlow.KilogramsPerSecond, 1e-12);

        // It comes to rest, after a slow swing of flow against holdup, where the steady solver would have it at that flow.
        PassConditions end = history.Generator.Passes[0].HeatAtFullFiring is { } heat ? Rest.Of("P1").Start.WithFeedFlow(last.FeedFlow).WithAbsorbedHeat(heat * 1.06m) : default;
        Approx.Absolute(SteadyState.Solve(Generator.Passes[0], end).OutletQuality.DecimalFractions, last.TrueQuality.DecimalFractions, 1e-4);
    }

    [Fact]
    public void Run_BlockedValveOnAKeptTotal_SendsItsFeedToTheOthers()
    {
        GeneratorHistory history = new GeneratorSimulator(Coarse).Run(Rest.WithSupply(Total().RampFreeShare("P1", Seconds(10), Seconds(30), Ratio.FromPercent(80))), Seconds(600));
        Assert.All(history, row => Approx.Relative(3 * 4.8, row.FeedFlow.KilogramsPerSecond, 1e-8));
        PassInstant blocked = history.Of("P1")[^1];
        Assert.True(blocked.FeedFlow.KilogramsPerSecond < 4.5);
        Assert.True(history.Of("P2")[^1].FeedFlow.KilogramsPerSecond > 4.9);
        Assert.True(history[^1].FeedPressure!.Value.Megapascals > 12);
        Assert.True(blocked.TrueQuality - history.Of("P1")[0].TrueQuality > MassFraction.FromPercent(5));
        Approx.Relative(
            0.8 * Math.Sqrt((history[^1].FeedPressure!.Value.Megapascals - blocked.InletPressure.Megapascals) / (12 - history.Of("P1")[0].InletPressure.Megapascals)),
            blocked.FeedFlow.KilogramsPerSecond / 4.8,
            1e-4);
    }

    [Fact]
    public void Run_HeaderAndOpeningMove_FlowFollows()
    {
        FeedSupply supply = Kept.RampOpening("P1", Seconds(5), Seconds(10), Ratio.FromPercent(55)).RampPressure(Seconds(30), Seconds(10), Pressure.FromMegapascals(11.8));
        GeneratorHistory history = new GeneratorSimulator(Coarse).Run(Rest.WithSupply(supply), Seconds(60));

        // Equal percentage: 5 % of travel times ln 50 is 20 % more, less what the pass pushes back.
        Assert.InRange(history.Of("P1")[28].FeedFlow.KilogramsPerSecond, 5, 4.8 * Math.Exp(0.05 * Math.Log(50)));
        Assert.True(history.Of("P1")[60].FeedFlow < history.Of("P1")[28].FeedFlow);
        Assert.Equal(11.8, history[^1].FeedPressure!.Value.Megapascals, 1e-9);

        GeneratorHistory more = new GeneratorSimulator(Coarse).Run(Rest.WithSupply(Total().RampTotal(Seconds(5), Seconds(10), Ratio.FromPercent(103))), Seconds(20));
        Approx.Relative(1.03 * 3 * 4.8, more[^1].FeedFlow.KilogramsPerSecond, 1e-8);
    }

    [Theory]
    [InlineData(false), InlineData(true)]
    public void Run_ValveThatShuts_EndsItsPassAlone(bool total)
    {
        FeedSupply supply = (total ? Total() : Kept).RampFreeShare("P1", Seconds(5), Seconds(5), Ratio.Zero);
        GeneratorHistory history = new GeneratorSimulator(Coarse).Run(Rest.WithSupply(supply), Seconds(30));
        Assert.Equal(SimulationEnd.FlowStagnated, history.Of("P1").End);
        Assert.NotEqual("", history.Of("P1").EndReason);
        Assert.Equal(SimulationEnd.Completed, history.Of("P2").End);
        Assert.Equal(31, history.Of("P2").Count);
        Assert.False(history.IsComplete);
        Assert.Equal(history.Of("P1").Count, history.Count);
    }

    [Fact]
    public void Run_Progress_RisesToTheEnd()
    {
        var seen = new Heard();
        new GeneratorSimulator(Coarse).Run(Rest, Seconds(150), seen);
        Assert.Equal([40.0, 80, 100], seen.Percents.Select(percent => Math.Round(percent, 9)));
    }

    [Fact]
    public void Run_Cancelled_Throws()
    {
        using CancellationTokenSource source = new();
        var canceller = new Heard { Then = source.Cancel };
        Assert.ThrowsAny<OperationCanceledException>(() => new GeneratorSimulator(Coarse).Run(Rest, Seconds(3600), canceller, source.Token));
        Assert.Single(canceller.Percents);
    }

    [Fact]
    public void WriteCsv_Totals_ReadBack() => Culture.Run("de-DE", () =>
    {
        using var writer = new StringWriter();
        GeneratorHistory history = new GeneratorSimulator(Coarse).Run(Rest, Seconds(2));
        history.WriteCsv(writer);
        string[] lines = writer.ToString().ReplaceLineEndings("\n").TrimEnd().Split('\n');
        Assert.Equal(4, lines.Length);
        Assert.StartsWith("time_s,feed_flow_kg_s,outlet_flow_kg_s,steam_flow_kg_s,true_quality", lines[0], StringComparison.Ordinal);
        Assert.StartsWith("2,14.4,", lines[3], StringComparison.Ordinal);
        Assert.EndsWith(",", lines[3], StringComparison.Ordinal);
        Assert.StartsWith("2 s: 14.400 kg/s in", history[^1].ToString(), StringComparison.Ordinal);
    });

    [Fact]
    public void New_WhatMakesNoSense_ThrowsSayingWhy()
    {
        Assert.Contains("'P9'", Assert.Throws<ArgumentException>(() => Rest.ForPass("P9", pass => pass)).Message, StringComparison.Ordinal);
        Assert.Contains("'P9'", Assert.Throws<ArgumentException>(() => Rest.WithSupply(Kept.WithValve("P9", ValveCharacteristic.Linear, Half))).Message, StringComparison.Ordinal);
        Assert.Contains("no valve", Assert.Throws<ArgumentException>(() => Rest.WithSupply(FeedSupply.AtPressure(Pressure.FromMegapascals(12)))).Message, StringComparison.Ordinal);
        Assert.Contains("leave it alone", Assert.Throws<ArgumentException>(() => Rest.WithSupply(Kept).ForPass("P1", pass => pass.StepFeedFlow(Seconds(1), MassFlow.FromKilogramsPerSecond(5)))).Message, StringComparison.Ordinal);
        Assert.Contains("'P2' has no valve", Assert.Throws<ArgumentException>(() => Kept.RampOpening("P2", Seconds(0), Seconds(1), Half)).Message, StringComparison.Ordinal);
        Assert.Throws<InvalidOperationException>(() => Kept.RampTotal(Seconds(0), Seconds(1), Half));
        Assert.Throws<InvalidOperationException>(() => Total().RampPressure(Seconds(0), Seconds(1), Pressure.FromMegapascals(12)));
        Assert.Throws<ArgumentOutOfRangeException>(() => Kept.WithValve("P2", ValveCharacteristic.Linear, Ratio.Zero));
        Assert.Throws<ArgumentOutOfRangeException>(() => FeedSupply.AtPressure(Pressure.Zero));
        Assert.Throws<ArgumentOutOfRangeException>(() => new GeneratorSimulator(threads: 0));
        Assert.Contains("9 MPa", Assert.Throws<ArgumentOutOfRangeException>(() => new GeneratorSimulator(Coarse).Run(Rest.WithSupply(FeedSupply.AtPressure(Pressure.FromMegapascals(9)).WithValve("P1", ValveCharacteristic.Linear, Half)), Seconds(1))).Message, StringComparison.Ordinal);
        Assert.Contains("Pressure lag", Assert.Throws<ArgumentOutOfRangeException>(() => new GeneratorSimulator(Coarse.WithPressureLag(Seconds(1))).Run(Rest.WithSupply(Kept), Seconds(1))).Message, StringComparison.Ordinal);
        Assert.Contains("heat at full firing", Assert.Throws<ArgumentException>(() => GeneratorSchedule.AtFiring(new("H", [ExamplePass.Pass]), Half, MassFlow.FromKilogramsPerSecond(4.8), Temperature.FromDegreesCelsius(170), Pressure.FromMegapascals(9.6))).Message, StringComparison.Ordinal);
    }

    private static FeedSupply Total() => Lengths.Select((_, i) => Name(i)).Aggregate(FeedSupply.AtTotal(Pressure.FromMegapascals(12)), (supply, name) => supply.WithValve(name, ValveCharacteristic.EqualPercentage(), Half));

    private static string Name(int i) => $"P{i + 1}";

    private sealed class Heard : IProgress<Ratio>
    {
        public List<double> Percents { get; } = [];

        public Action? Then { get; init; }

        public void Report(Ratio value)
        {
            Percents.Add(value.Percent);
            Then?.Invoke();
        }
    }
}
