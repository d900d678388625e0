using TwoPhase.Advisory;
using TwoPhase.Metering;
using TwoPhase.Passes;
using UnitsNet;
using static TwoPhase.Tests.Advisory.Plants;

namespace TwoPhase.Tests.Advisory;

public class QualityBackfillTests
{
    private static readonly SteamGenerator Three = new("three", [Named("a"), Named("b"), Named("c")]);
    private static readonly EstimatorOptions Coarse = EstimatorOptions.Default.WithCells(20);
    private static readonly PassReading[][] Live = [.. Enumerable.Range(0, 3).Select(seed => Readings(Still, 2500 - (100 * seed), seed).Select(row => row.Reading).ToArray())];

    // Column by column, in one go or in two, it is what the live estimator says sample by sample.
    [Fact]
    public void Run_History_IsWhatTheLiveEstimatorSays()
    {
        List<double> shares = [];
        IReadOnlyList<EstimateColumns> whole = QualityBackfill.Run(Three, [.. Live.Select(pass => Columns(pass))], Coarse, progress: new Told(shares));
        IReadOnlyList<EstimateColumns> first = QualityBackfill.Run(Three, [.. Live.Select(pass => Columns(pass[..1500]))], Coarse);
        IReadOnlyList<EstimateColumns> second = QualityBackfill.Run(Three, [.. Live.Select(pass => Columns(pass[1500..]))], Coarse, [.. first.Select(columns => EstimatorState.Parse(columns.EndState.ToString()))]);
        for (int i = 0; i < 3; i++)
        {
            var estimator = new QualityEstimator(Three.Passes[i], Three.Passes[i].Meter!, Coarse);
            PassColumns columns = Columns(Live[i]);
            QualityEstimate[] estimates = [.. Enumerable.Range(0, columns.Count).Select(t => estimator.Update(columns[t]))];
            Assert.Equal(estimates.Select(estimate => (double)estimate.RawQuality), whole[i].Quality.ToArray());
            Assert.Equal(estimates.Select(estimate => (double)estimate.RawIndicated), whole[i].Indicated.ToArray());
            Assert.Equal(estimates.Select(estimate => (double)estimate.RawMotion), whole[i].Motion.ToArray());
            Assert.Equal(estimates.Select(estimate => (double)estimate.RawAbsolute), whole[i].Absolute.ToArray());
            Assert.Equal(estimates.Select(estimate => estimate.Trust), whole[i].Trust.ToArray());
            Assert.Equal(whole[i].Quality.ToArray()[1500..], second[i].Quality.ToArray());
            Assert.Equal(whole[i].EndState.ToString(), second[i].EndState.ToString());
        }

        lock (shares)
        {
            Approx.Absolute(1, shares.Max(), 1e-12);
            Assert.True(shares.Count >= 9);
        }
    }

    [Fact]
    public void Run_Stopped_Stops()
    {
        using CancellationTokenSource stop = new();
        Assert.Throws<OperationCanceledException>(() => QualityBackfill.Run(Three, [.. Live.Select(pass => Columns(pass))], Coarse, progress: new Stopping(stop), cancellation: stop.Token));
    }

    [Fact]
    public void Run_ColumnsThatDoNotFit_ThrowSayingSo()
    {
        Assert.Contains("1 passes", Assert.Throws<ArgumentException>(() => QualityBackfill.Run(Three, [Columns(Live[0])])).Message, StringComparison.Ordinal);
        Assert.Contains("2 times", Assert.Throws<ArgumentException>(() => new PassColumns(Format, new DateTimeOffset[2], new double[2], new double[2], new double[3], new double[2], new double[2])).Message, StringComparison.Ordinal);
        Assert.Throws<ArgumentException>(() => QualityBackfill.Run(Three, [.. Live.Select(pass => Columns(pass))], Coarse, []));
        Assert.Equal(0, QualityBackfill.Run(new SteamGenerator("one", [Named("a")]), [Columns([])]).Single().Quality.Length);
    }

    private static PassColumns Columns(PassReading[] readings)
    {
        double[] Of(Func<PassReading, double> value) => [.. readings.Select(value)];
        return new(
            Format,
            readings.Select(reading => reading.Time).ToArray(),
            Of(reading => reading.FeedFlow!.Value.KilogramsPerSecond),
            Of(reading => reading.FeedTemperature!.Value.DegreesCelsius),
            Of(reading => reading.Firing!.Value.Percent),
            Of(reading => reading.OutletPressure!.Value.Megapascals),
            Of(reading => reading.Differential!.Value.Kilopascals));
    }

    private sealed class Told(List<double> shares) : IProgress<Ratio>
    {
        public void Report(Ratio value)
        {
            lock (shares) shares.Add(value.DecimalFractions);
        }
    }

    private sealed class Stopping(CancellationTokenSource stop) : IProgress<Ratio>
    {
        public void Report(Ratio value)
        {
            if (value.DecimalFractions > 0.2) stop.Cancel();
        }
    }
}
