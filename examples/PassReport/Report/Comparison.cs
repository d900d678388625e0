namespace PassReport.Report;

/// <summary>The passes against each other: which reads apart, and which wanders.</summary>
internal static class Comparison
{
    // Inputs that changed less than this between the ends of the history are taken as unchanged.
    private const double SameFlow = 0.01, SameFiring = 0.01, SameTemperature = 1.5, SamePressure = 60e3;

    public static IReadOnlyList<PassSummary> Of(IEnumerable<PassSeries> series)
    {
        PassSummary[] passes = [.. series.Select(one => new PassSummary(one))];
        double[] read = [.. passes.Select(pass => pass.Quality).Where(double.IsFinite).Order()];
        foreach (PassSummary pass in passes)
        {
            pass.Apart = read.Length > 1 && double.IsFinite(pass.Quality) ? pass.Quality - Median(read) : 0;
            pass.Wander = passes.Length > 1 ? AgainstOthers(pass, passes) : Alone(pass);
        }

        return [.. passes.OrderByDescending(pass => pass.Attention)];
    }

    private static double AgainstOthers(PassSummary pass, PassSummary[] passes)
    {
        PassSummary[] others = [.. passes.Where(other => other != pass)];
        return (End(pass.Settled, pass) - Start(pass.Settled, pass)) - Median([.. others.Select(other => End(other.Settled, other) - Start(other.Settled, other)).Where(double.IsFinite).Order()]);
    }

    private static double Alone(PassSummary pass)
    {
        PassSeries series = pass.Series;
        bool same = Change(series.Flow, pass) / Math.Abs(Start(series.Flow, pass)) < SameFlow
            && !(Change(series.Firing, pass) > SameFiring) && !(Change(series.FeedTemperature, pass) > SameTemperature) && Change(series.Pressure, pass) < SamePressure;
        return same ? End(pass.Settled, pass) - Start(pass.Settled, pass) : double.NaN;
    }

    private static double Change(double[] values, PassSummary pass) => Math.Abs(End(values, pass) - Start(values, pass));

    private static double Start(double[] values, PassSummary pass)
    {
        DateTimeOffset[] times = pass.Series.Times;
        return new Windows(times, values).Mean(times[0].AddTicks(-1), times[0] + Tenth(times));
    }

    private static double End(double[] values, PassSummary pass)
    {
        DateTimeOffset[] times = pass.Series.Times;
        return new Windows(times, values).Mean(times[^1] - Tenth(times), times[^1]);
    }

    private static TimeSpan Tenth(DateTimeOffset[] times) => (times[^1] - times[0]) / 10;

    private static double Median(double[] sorted) =>
        sorted.Length == 0 ? double.NaN : (sorted[(sorted.Length - 1) / 2] + sorted[sorted.Length / 2]) / 2;
}
