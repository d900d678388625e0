using Backfill.Plan;
using Backfill.Reading;

namespace Backfill.Work;

/// <summary>What has been done, and what could not be.</summary>
internal sealed class Tally
{
    private readonly Lock _lock = new();
    private readonly SortedDictionary<string, string> _bad = new(StringComparer.Ordinal);

    public int Stand { get; private set; }

    public int Done { get; private set; }

    public int WithoutFile { get; private set; }

    /// <summary>Partitions whose file could not be read, and why; in order.</summary>
    public IReadOnlyDictionary<string, string> Bad => _bad;

    /// <summary>Counts a partition that an earlier run has done.</summary>
    public void Stood(Partition partition, string? gap)
    {
        Stand++;
        Count(partition, gap);
    }

    public void Did(Partition partition, string? gap)
    {
        lock (_lock)
        {
            Done++;
            Count(partition, gap);
        }
    }

    private void Count(Partition partition, string? gap)
    {
        if (gap == PartitionReader.NoFile) WithoutFile++;
        else if (gap is not null) _bad[partition.ToString()] = gap;
    }
}
