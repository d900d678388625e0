using Backfill.Plan;
using Backfill.Reading;
using Backfill.Writing;

namespace Backfill.Work;

/// <summary>Where a chain goes on: what stands in the output is kept as far as it is still what the history says.</summary>
internal sealed class Resumption(PartitionReader reader, OutputFolder output, Tally tally)
{
    private readonly Block _block = new(MeasuredPass.MostColumns);

    /// <summary>The first day to be done; what stood behind it is taken away, since it was estimated from another past.</summary>
    public async Task<DateOnly> FirstOpenDayAsync(Chain chain, CancellationToken cancellation)
    {
        DateOnly day = chain.First;
        while (day <= chain.Last && await StandsAsync(chain.On(day), cancellation)) day = day.AddDays(1);

        // From the end, so that a run killed meanwhile leaves no hole.
        for (DateOnly last = chain.Last; last >= day; last = last.AddDays(-1)) output.Forget(chain.On(last));
        return day;
    }

    private async Task<bool> StandsAsync(Partition partition, CancellationToken cancellation)
    {
        if (!output.IsDone(partition)) return false;
        string? gap = output.GapOf(partition);

        // A file that could not be read may have been mended.
        if (gap is not null && await reader.TroubleAsync(partition, _block, cancellation) != gap) return false;
        tally.Stood(partition, gap);
        return true;
    }
}
