namespace PassReport.Report;

/// <summary>Means of a column over spans of time, quick whatever their length; samples that are NaN do not count.</summary>
internal sealed class Windows
{
    private readonly DateTimeOffset[] _times;
    private readonly double[] _sums;
    private readonly int[] _counts;

    public Windows(DateTimeOffset[] times, double[] values)
    {
        _times = times;
        _sums = new double[values.Length + 1];
        _counts = new int[values.Length + 1];
        for (int i = 0; i < values.Length; i++)
        {
            bool good = double.IsFinite(values[i]);
            _sums[i + 1] = _sums[i] + (good ? values[i] : 0);
            _counts[i + 1] = _counts[i] + (good ? 1 : 0);
        }
    }

    /// <summary>Mean of the samples after <paramref name="from"/> and up to <paramref name="to"/>; NaN when there is none.</summary>
    public double Mean(DateTimeOffset from, DateTimeOffset to)
    {
        int low = After(from), high = After(to), count = _counts[high] - _counts[low];
        return count > 0 ? (_sums[high] - _sums[low]) / count : double.NaN;
    }

    public double Mean(DateTimeOffset to, TimeSpan length) => Mean(to - length, to);

    /// <summary>Index of the first sample later than a time.</summary>
    private int After(DateTimeOffset time)
    {
        int low = 0, high = _times.Length;
        while (low < high)
        {
            int middle = (low + high) / 2;
            if (_times[middle] <= time) low = middle + 1;
            else high = middle;
        }

        return low;
    }
}
