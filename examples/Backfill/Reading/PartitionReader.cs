using System.Runtime.CompilerServices;
using Backfill.Plan;

namespace Backfill.Reading;

/// <summary>The readings of a partition, and what is wrong with them.</summary>
internal sealed class PartitionReader(Site site, HistoryFolder history)
{
    public const string NoFile = "no file";

    /// <summary>The rows, part by part, in the one block; throws <see cref="FileFault"/> at the first thing that is wrong.</summary>
    public async IAsyncEnumerable<Block> ReadAsync(Partition partition, Block block, [EnumeratorCancellation] CancellationToken cancellation)
    {
        string file = history.FileOf(partition) ?? throw new FileFault(NoFile);
        await using TableReader reader = await TableReader.OpenAsync(file, site[partition.Pass].Columns, cancellation);
        long rows = 0;
        while (await reader.NextAsync(block, cancellation))
        {
            CheckDay(file, partition, block, rows);
            rows += block.Count;
            yield return block;
        }

        if (rows == 0) throw new FileFault(file, "there is no row in it");
    }

    /// <summary>Why a partition cannot be read; null where it can.</summary>
    public async Task<string?> TroubleAsync(Partition partition, Block block, CancellationToken cancellation)
    {
        try
        {
            await foreach (Block _ in ReadAsync(partition, block, cancellation)) { }
            return null;
        }
        catch (FileFault fault)
        {
            return fault.Message;
        }
    }

    private static void CheckDay(string file, Partition partition, Block block, long before)
    {
        DateTime start = partition.Start, end = start.AddDays(1);
        for (int i = 0; i < block.Count; i++)
        {
            if (block.Times[i] < start || block.Times[i] >= end)
                throw new FileFault(file, FormattableString.Invariant($"row {before + i + 1} is of {block.Times[i]:yyyy-MM-dd'T'HH:mm:ss}Z, not of {partition.DayFolder}"));
        }
    }
}
