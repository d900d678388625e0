namespace LivePasses.Live;

/// <summary>The last half hour of a pass, a point every ten seconds of plant time; never grows.</summary>
internal sealed class Trend
{
    private const int Room = 180;
    private static readonly TimeSpan Step = TimeSpan.FromSeconds(10);

    private readonly TrendPoint[] _points = new TrendPoint[Room];

    /// <summary>Points ever added.</summary>
    public long Count { get; private set; }

    public void Add(in TrendPoint point)
    {
        if (Count > 0 && Math.Abs((point.Time - _points[(Count - 1) % Room].Time).Ticks) < Step.Ticks) return;
        _points[Count++ % Room] = point;
    }

    /// <summary>The points from a count on, as far as they are still held.</summary>
    public IReadOnlyList<TrendPoint> From(long count)
    {
        long first = Math.Max(count, Count - Room);
        var points = new TrendPoint[Math.Max(0, Count - first)];
        for (int i = 0; i < points.Length; i++) points[i] = _points[(first + i) % Room];
        return points;
    }
}

/// <summary>Indicated and estimated quality at a time [kg/kg]; null where there is none.</summary>
internal readonly record struct TrendPoint(DateTimeOffset Time, double? Indicated, double? Estimated);
