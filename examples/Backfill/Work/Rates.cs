using System.Diagnostics;

namespace Backfill.Work;

/// <summary>How many rows went through, and how long the threads were at what.</summary>
internal sealed class Rates
{
    private long _rows, _reading, _estimating;

    public long Rows => _rows;

    /// <summary>Rows a second of one thread that does nothing but infer the raw reading from the meter.</summary>
    public double Reading => PerSecond(_rows, _reading);

    /// <summary>Rows a second of one thread that does nothing but estimate.</summary>
    public double Estimating => PerSecond(_rows, _estimating);

    /// <summary>Rows a second since a time stamp, files and all threads included.</summary>
    public double Overall(long since) => PerSecond(_rows, Stopwatch.GetTimestamp() - since);

    public void Add(int rows, long reading, long estimating)
    {
        Interlocked.Add(ref _rows, rows);
        Interlocked.Add(ref _reading, reading);
        Interlocked.Add(ref _estimating, estimating);
    }

    private static double PerSecond(long rows, long ticks) => ticks > 0 ? rows * (double)Stopwatch.Frequency / ticks : 0;
}
