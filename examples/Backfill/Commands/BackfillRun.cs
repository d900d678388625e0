using System.Diagnostics;
using Backfill.Plan;
using Backfill.Reading;
using Backfill.Work;
using Backfill.Writing;
using Spectre.Console;

namespace Backfill.Commands;

/// <summary>Where a run finds what and how it goes about it.</summary>
internal sealed record RunSettings(string Generator, string History, string Output, int Threads, ChainPlan Plan, Share Share);

/// <summary>Estimates a history, or goes on with it.</summary>
internal sealed class BackfillRun(RunSettings settings, IAnsiConsole console, bool isTerminal)
{
    /// <summary>Called after each partition; what a test watches the memory by.</summary>
    public Action? AfterPartition { get; init; }

    /// <returns>What has been done.</returns>
    public async Task<Tally> DoAsync(CancellationToken cancellation)
    {
        var site = Site.Read(settings.Generator);
        var history = HistoryFolder.Scan(settings.History, [.. site.Generator.Passes.Select(static pass => pass.Name)]);
        using var claim = Claim.Take(settings.Output, site, settings.Plan, settings.Share);
        var output = new OutputFolder(settings.Output);
        var reader = new PartitionReader(site, history);
        Tally tally = new();
        Rates rates = new();
        Estimation estimation = new(site, reader, output, rates);
        (Crew crew, int open) = await PlanAsync(history, new(reader, output, tally), cancellation);
        long start = Stopwatch.GetTimestamp();
        await ProgressView.RunAsync(console, isTerminal, "Estimating", open, step => crew.WorkAsync(settings.Threads, async (chain, day, bench, token) =>
        {
            tally.Did(chain.On(day), await estimation.DoAsync(chain, day, bench, token));
            AfterPartition?.Invoke();
            step();
        }, cancellation));
        Report(history, tally, rates, start);
        return tally;
    }

    private async Task<(Crew Crew, int Open)> PlanAsync(HistoryFolder history, Resumption resumption, CancellationToken cancellation)
    {
        Crew crew = new();
        int open = 0;
        foreach (Chain chain in settings.Plan.Chains(history, settings.Share))
        {
            DateOnly from = await resumption.FirstOpenDayAsync(chain, cancellation);
            crew.Add(chain, from);
            open += chain.Last.DayNumber - from.DayNumber + 1;
        }

        return (crew, open);
    }

    private void Report(HistoryFolder history, Tally tally, Rates rates, long start)
    {
        console.WriteLine(FormattableString.Invariant($"Passes {string.Join(", ", history.Passes)}, {history.First:yyyy-MM-dd} to {history.Last:yyyy-MM-dd}. Partitions: {tally.Done} done, {tally.Stand} stood from before, {tally.WithoutFile} without a file, {tally.Bad.Count} with a bad file."));
        if (rates.Rows == 0) return;
        console.WriteLine(FormattableString.Invariant($"Rows: {rates.Rows:N0}, {rates.Overall(start):N0} a second with everything (--threads {settings.Threads})."));
        console.WriteLine(FormattableString.Invariant($"One thread: raw reading {rates.Reading:N0} rows a second, estimator {rates.Estimating:N0} rows a second."));
    }
}
