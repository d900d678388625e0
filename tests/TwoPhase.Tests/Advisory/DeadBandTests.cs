using MathNet.Numerics.Statistics;
using TwoPhase.Advisory;
using TwoPhase.Metering;
using TwoPhase.Tests.Support;
using UnitsNet;
using static TwoPhase.Tests.Advisory.Plants;

namespace TwoPhase.Tests.Advisory;

/// <summary>The scenarios as a historian keeps them that reports by exception: dead band 1 % of span, 600 s of silence at the longest. Spans are invented.</summary>
public class DeadBandTests
{
    private static readonly string[] Columns = ["feed_flow_kg_s", "feed_temperature_C", "firing_percent", "outlet_pressure_MPa_abs", "venturi_dp_kPa"];
    private static readonly double[] DeadBands = [0.06, 2, 1, 0.14, 0.6];

    private static readonly Duration Silence = Duration.FromSeconds(600);

    private static readonly EstimatorOptions ByException = EstimatorOptions.Default
        .WithReporting(PassSignal.FeedFlow, TagReporting.ByException(MassFlow.FromKilogramsPerSecond(DeadBands[0]), Silence))
        .WithReporting(PassSignal.FeedTemperature, TagReporting.ByException(TemperatureDelta.FromKelvins(DeadBands[1]), Silence))
        .WithReporting(PassSignal.Firing, TagReporting.ByException(Ratio.FromPercent(DeadBands[2]), Silence))
        .WithReporting(PassSignal.OutletPressure, TagReporting.ByException(Pressure.FromMegapascals(DeadBands[3]), Silence))
        .WithReporting(PassSignal.Differential, TagReporting.ByException(Pressure.FromKilopascals(DeadBands[4]), Silence));

    // Whether the historian repeats the last value at each sample or leaves it out makes no difference.
    [Theory]
    [InlineData("firing-step-up", true), InlineData("firing-step-up", false), InlineData("meter-drift", true), InlineData("heat-drift", false)]
    public void Update_ReportedByException_IsNeverFrozenAndNearlyAsGood(string name, bool held)
    {
        (double raw, _, _) = Replay(name, deadBand: false, held);
        (double rms, int faults, double covered) = Replay(name, deadBand: true, held);
        Assert.Equal(0, faults);
        Assert.True(rms <= 1.5 * raw, $"{rms:F5} against {raw:F5}");
        Assert.True(covered > 0.85, $"covered {covered:P0}");
    }

    // A flow that stands still is reported once in ten minutes, each time good to 0.3 % only: 2 W·0.3 % = 0.0052 in quality, W = 0.87; a feed temperature within 2 K adds 0.0033 a kelvin, 2 K/√3.
    [Theory]
    [InlineData("steady", 0.0052), InlineData("feed-warms", 0.0064)]
    public void Update_ReportedByException_IsAsGoodAsTheReportsAre(string name, double reports)
    {
        (double rms, int faults, _) = Replay(name, deadBand: true, held: true);
        Assert.Equal(0, faults);
        Assert.True(rms <= reports, $"{rms:F5}");
    }

    // After the longest silence and half as much again it is called frozen, by either way of handing on.
    [Theory]
    [InlineData(true), InlineData(false)]
    public void Update_NoReportAfterTheLongestSilence_IsAFault(bool held)
    {
        var estimator = new QualityEstimator(KnownPass, Meter, ByException);
        PassReading[] readings = [.. Readings(Still, 1300, 1).Select(row => row.Reading)];
        PassReading last = readings[300];
        Trust[] trust = [.. readings.Select((reading, t) => estimator.Update(t <= 300 ? reading : held ? reading.With(PassSignal.Differential, last.Differential!.Value.Pascals) : reading.Without(PassSignal.Differential, SignalStatus.Missing)).Trust)];
        Assert.DoesNotContain(Trust.InputFault, trust[..1200]);
        Assert.Equal(Trust.InputFault, trust[1210]);
    }

    [Fact]
    public void WithReporting_DeadBandOfAnother_ThrowsSayingSo()
    {
        Assert.Contains("FeedFlow", Assert.Throws<ArgumentException>(() => EstimatorOptions.Default.WithReporting(PassSignal.FeedFlow, TagReporting.ByException(Ratio.FromPercent(1), Silence))).Message, StringComparison.Ordinal);
        Assert.Throws<ArgumentOutOfRangeException>(() => TagReporting.ByException(Ratio.Zero, Silence));
        Assert.Throws<ArgumentOutOfRangeException>(() => TagReporting.ByException(Ratio.FromPercent(1), Duration.Zero));
        Assert.False(EstimatorOptions.Default.Reporting(PassSignal.FeedFlow).IsByException);
        Assert.Equal(Pressure.FromKilopascals(0.6).Pascals, ((Pressure)ByException.Reporting(PassSignal.Differential).DeadBand!).Pascals, 9);
    }

    private static (double Rms, int Faults, double Covered) Replay(string name, bool deadBand, bool held)
    {
        var estimator = new QualityEstimator(KnownPass, Meter, deadBand ? ByException : EstimatorOptions.Default);
        ReferenceTable table = ReferenceTable.Load($"Advisory/Data/{name}.csv");
        double[] last = new double[Columns.Length], at = new double[Columns.Length];
        List<double> errors = [];
        int faults = 0, covered = 0;
        bool first = true;
        foreach (var row in table.Rows)
        {
            double time = row["time_s"];
            double[] values = new double[Columns.Length];
            for (int i = 0; i < Columns.Length; i++)
            {
                double value = row[Columns[i]];
                bool reported = first || !deadBand || Math.Abs(value - last[i]) > DeadBands[i] || time - at[i] >= Silence.Seconds;
                if (reported) (last[i], at[i]) = (value, time);
                values[i] = reported || held ? last[i] : double.NaN;
            }

            first = false;
            QualityEstimate estimate = estimator.Update(Format.Read(Midnight.AddSeconds(time), values[0], values[1], values[2], values[3], values[4]));
            if (estimate.Trust == Trust.InputFault) faults++;
            if (time < 300) continue;
            errors.Add(estimate.RawQuality - row["quality_true"]);
            if (Math.Abs(errors[^1]) <= 2 * estimate.RawMotion) covered++;
        }

        return (errors.RootMeanSquare(), faults, covered / (double)errors.Count);
    }
}
