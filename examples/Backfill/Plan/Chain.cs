namespace Backfill.Plan;

/// <summary>Days of one pass that follow each other: each begins with what the estimator knew at the end of the day before.</summary>
/// <param name="Pass">The pass.</param>
/// <param name="First">Its first day.</param>
/// <param name="Last">Its last day.</param>
/// <param name="WarmUpFrom">First of the days that are only read, to know the pass when the first day begins; the first day itself for none.</param>
internal sealed record Chain(string Pass, DateOnly First, DateOnly Last, DateOnly WarmUpFrom)
{
    public int Days => Last.DayNumber - First.DayNumber + 1;

    public Partition On(DateOnly day) => new(day, Pass);
}
