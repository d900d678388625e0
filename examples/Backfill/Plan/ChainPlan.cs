namespace Backfill.Plan;

/// <summary>How a history is cut into chains, and which of them are this process's.</summary>
/// <param name="ChainDays">Days of a chain; 0 for one chain from the first day to the last.</param>
/// <param name="WarmUpDays">Days that are read before a chain that does not begin with the history.</param>
internal sealed record ChainPlan(int ChainDays, int WarmUpDays)
{
    /// <summary>The chains of a share of the work. They are cut by the calendar, so that every process cuts them alike.</summary>
    public IReadOnlyList<Chain> Chains(HistoryFolder history, Share share) =>
        [.. Stretches(history.First, history.Last).SelectMany(stretch => history.Passes.Select(pass => ChainOf(pass, stretch, history.First))).Where((_, i) => share.Has(i))];

    private Chain ChainOf(string pass, (DateOnly First, DateOnly Last) stretch, DateOnly begin) =>
        new(pass, stretch.First, stretch.Last, DateOnly.FromDayNumber(Math.Max(begin.DayNumber, stretch.First.DayNumber - WarmUpDays)));

    private IEnumerable<(DateOnly First, DateOnly Last)> Stretches(DateOnly first, DateOnly last)
    {
        while (first <= last)
        {
            int end = ChainDays == 0 ? last.DayNumber : Math.Min(last.DayNumber, (((first.DayNumber / ChainDays) + 1) * ChainDays) - 1);
            yield return (first, DateOnly.FromDayNumber(end));
            first = DateOnly.FromDayNumber(end + 1);
        }
    }
}
