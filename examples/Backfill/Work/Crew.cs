using Backfill.Plan;

namespace Backfill.Work;

/// <summary>Chains, and the workers that take them forward a day at a time.</summary>
/// <remarks>The chain with most days before it goes first, so that all end together; no worker owns one, and none waits for another.</remarks>
internal sealed class Crew
{
    private readonly Lock _lock = new();
    private readonly PriorityQueue<Link, (int Left, int Number)> _links = new();

    /// <summary>Adds a chain, to be done from a day on.</summary>
    public void Add(Chain chain, DateOnly from)
    {
        if (from <= chain.Last) Put(new(chain, from, _links.Count));
    }

    /// <summary>Does all days of all chains, each by <paramref name="work"/>.</summary>
    public async Task WorkAsync(int workers, Func<Chain, DateOnly, Bench, CancellationToken, Task> work, CancellationToken cancellation)
    {
        using var fault = CancellationTokenSource.CreateLinkedTokenSource(cancellation);
        await Task.WhenAll(Enumerable.Range(0, Math.Min(workers, _links.Count)).Select(_ => Task.Run(async () =>
        {
            try
            {
                // A worker that finds no chain may go: those that others hold go on with them.
                Bench bench = new();
                while (Take() is { } link)
                {
                    await work(link.Chain, link.Day, bench, fault.Token);
                    if (link.Day < link.Chain.Last) Put(link with { Day = link.Day.AddDays(1) });
                }
            }
            catch
            {
                await fault.CancelAsync();
                throw;
            }
        })));
    }

    private Link? Take()
    {
        lock (_lock) return _links.TryDequeue(out Link? link, out _) ? link : null;
    }

    private void Put(Link link)
    {
        lock (_lock) _links.Enqueue(link, (link.Day.DayNumber - link.Chain.Last.DayNumber, link.Number));
    }

    private sealed record Link(Chain Chain, DateOnly Day, int Number);
}
