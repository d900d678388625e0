using TwoPhase.Advisory;
using TwoPhase.Dynamics;
using TwoPhase.Metering;
using TwoPhase.Passes;
using UnitsNet;
using static TwoPhase.Tests.Advisory.Plants;

namespace TwoPhase.Tests.Advisory;

public class ShiftDiagnosisTests
{
    private const int Quiet = 700, Begin = 700, Drift = 500, End = 2100;

    // One pass of three goes wrong in four ways that look the same from its own meter. Without a witness none is named; with all of them the right one is.
    [Theory]
    [InlineData(ShiftCause.Heat), InlineData(ShiftCause.Meter), InlineData(ShiftCause.FeedFlow), InlineData(ShiftCause.Leak)]
    public void Of_OnePassGoneWrong_IsNamedByTheWitnesses(ShiftCause cause)
    {
        Story story = new(cause);
        ShiftDiagnosis alone = ShiftDiagnosis.Of(story.Estimator, 0)!;
        Assert.Equal(ShiftOrigin.ThisPass, story.Estimator.Shifts[0].Origin);
        Assert.Equal(ShiftCause.None, alone.Named);
        Assert.Equal(4, alone.Candidates.Count);
        Assert.Empty(alone.Witnesses);

        // The truth is among the candidates, and a leak means more steam than the reading says.
        ShiftCandidate true_ = alone.Candidates.Single(candidate => candidate.Cause == cause);
        Approx.Absolute(story.Quality, true_.Quality.DecimalFractions, 0.012, $"{alone}");
        Approx.Relative(story.Flow, true_.OutletFlow.KilogramsPerSecond, 0.01);
        double reading = story.Estimator.Estimates[0].RawIndicated;
        Assert.True(alone.Candidates.Single(candidate => candidate.Cause == ShiftCause.Leak).Quality.DecimalFractions > reading + 0.08);
        Assert.True(alone.HighestQuality.DecimalFractions >= story.Quality - 0.012);

        ShiftDiagnosis known = ShiftDiagnosis.Of(story.Estimator, 0, story.Witnesses)!;
        Assert.Equal(cause, known.Named);
        Assert.Equal([ShiftWitness.PressureDrop, ShiftWitness.MetalTemperature, ShiftWitness.SeparatorQuality, ShiftWitness.SeparatorFlow, ShiftWitness.TotalFeed, ShiftWitness.OutletTemperature], known.Witnesses);
        Assert.False(known.IsOutletPressureDoubtful);
        Assert.True(ShiftDiagnosis.Of(story.Estimator, 0, ShiftWitnesses.None.WithOutletTemperature(Temperature.FromDegreesCelsius(300)))!.IsOutletPressureDoubtful);
        Assert.Throws<ArgumentOutOfRangeException>(() => ShiftDiagnosis.Of(story.Estimator, 3));
    }

    // The two differentials, or the two flows, are exchanged at the marshalling cabinet.
    [Theory]
    [InlineData(PassSignal.Differential), InlineData(PassSignal.FeedFlow)]
    public void FindSwaps_TagsExchanged_NamesThePair(PassSignal signal)
    {
        double[] flows = [1, 0.9, 0.95, 0.97], heats = signal == PassSignal.Differential ? [1.02, 0.92, 0.95, 0.97] : [1.02, 0.96, 0.95, 0.97];
        var estimator = new GeneratorEstimator(new SteamGenerator("four", flows.Select((_, i) => Named($"{i + 1}"))), EstimatorOptions.Default.WithCells(30));
        PassReading[][] readings = [.. flows.Select((flow, i) => Readings(new OperatingSchedule(Start with { RawFeedFlow = flow * Start.RawFeedFlow, RawAbsorbedHeat = heats[i] * Start.RawAbsorbedHeat }), 3000, 20 + i).Select(row => row.Reading).ToArray())];
        for (int t = 0; t < 3000; t++)
        {
            PassReading[] now = [.. readings.Select(pass => pass[t])];
            if (t >= Begin)
            {
                double one = now[0][signal].Si, other = now[1][signal].Si;
                (now[0], now[1]) = (now[0].With(signal, other), now[1].With(signal, one));
            }

            estimator.Update(new GeneratorReading(Midnight.AddSeconds(t), now));
            if (t == Begin - 1) Assert.Empty(estimator.FindSwaps());
        }

        Assert.Equal([new SwapSuspect(0, 1, signal)], estimator.FindSwaps());
    }

    /// <summary>Three passes, the first of which goes wrong while the others stay.</summary>
    private sealed class Story
    {
        public Story(ShiftCause cause)
        {
            Estimator = new(new SteamGenerator("three", [Named("a"), Named("b"), Named("c")]), EstimatorOptions.Default.WithCells(30));
            PassSimulator[] plants = [.. Enumerable.Range(0, 3).Select(_ => new PassSimulator(KnownPass, Start, SimulatorOptions.Default.WithMeter(Meter)))];
            var noise = new MathNet.Numerics.Distributions.Normal(0, 1, new Random(3));
            HealthFigures? before = null;
            PassReading last = default;
            for (int t = 0; t < End; t++)
            {
                double part = Math.Min(1, Math.Max(0, (t - Begin) / (double)Drift));
                double heat = cause == ShiftCause.Heat ? 1 - (0.06 * part) : 1, meter = cause == ShiftCause.Meter ? 1 - (0.09 * part) : 1, flow = cause is ShiftCause.FeedFlow or ShiftCause.Leak ? 1 - (0.14 * part) : 1;
                PassConditions first = Start with { RawFeedFlow = flow * Start.RawFeedFlow, RawAbsorbedHeat = heat * Start.RawAbsorbedHeat };
                PassReading[] readings = [.. plants.Select((plant, i) =>
                {
                    PassInstant now = plant.Advance(i == 0 ? first : Start, Duration.FromSeconds(1));
                    return Format.Read(
                        Midnight.AddSeconds(t), Start.RawFeedFlow * (1 + (0.003 * noise.Sample())), Start.RawFeedTemperature - 273.15, 100, Start.RawOutletPressure * 1e-6,
                        now.Differential!.Value.Kilopascals * (i == 0 ? meter : 1) * (1 + (0.005 * noise.Sample())));
                })];
                Estimator.Update(new GeneratorReading(Midnight.AddSeconds(t), readings));
                last = readings[0];
                if (t == Quiet - 1) before = HealthFigures.Of(Estimator.Estimators[0], WithWalls(last, Start));
                if (t < End - 1) continue;
                Quality = plants[0].Now.TrueQuality.DecimalFractions;
                Flow = first.RawFeedFlow;
                last = WithWalls(last, first);
            }

            double total = 3 * Start.RawFeedFlow, separator = (2 * Start.RawFeedFlow) + Flow, other = plants[1].Now.TrueQuality.DecimalFractions, feed = cause == ShiftCause.FeedFlow ? separator : total;
            Witnesses = ShiftWitnesses.None.WithHealth(before!, HealthFigures.Of(Estimator.Estimators[0], last)!)
                .WithSeparatorQuality(MassFraction.FromDecimalFractions(((2 * Start.RawFeedFlow * other) + (Flow * Quality)) / separator), MassFraction.FromDecimalFractions(0.006))
                .WithSeparatorFlow(MassFlow.FromKilogramsPerSecond(separator), MassFlow.FromKilogramsPerSecond(0.01 * total))
                .WithTotalFeed(MassFlow.FromKilogramsPerSecond(feed), MassFlow.FromKilogramsPerSecond(0.005 * total))
                .WithOutletTemperature(TwoPhase.Steam.Saturation.FromPressure(Start.OutletPressure).Temperature);
        }

        public GeneratorEstimator Estimator { get; }

        public ShiftWitnesses Witnesses { get; }

        public double Quality { get; }

        public double Flow { get; }

        // Inlet pressure and metal of a plant that loses a tenth more than its model, from the steady state at the true conditions.
        private static PassReading WithWalls(in PassReading reading, PassConditions truth)
        {
            PassProfile profile = SteadyState.Solve(KnownPass, truth);
            return reading.WithInletPressure(truth.OutletPressure + (profile.PressureDrop.Total * 1.1)).WithMetalTemperatures([profile.WallAt(profile.Count / 2).Temperatures.OutsideMetal, profile.WallAt(profile.Count * 3 / 4).Temperatures.OutsideMetal]);
        }
    }
}
