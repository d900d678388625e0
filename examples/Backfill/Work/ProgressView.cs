using System.Diagnostics;
using Spectre.Console;

namespace Backfill.Work;

/// <summary>How far the work is and how long it still takes: a bar on a terminal, a line for each tenth elsewhere.</summary>
internal static class ProgressView
{
    /// <summary>Runs the work; it is given what it calls after each of so many steps.</summary>
    public static async Task RunAsync(IAnsiConsole console, bool isTerminal, string what, int steps, Func<Action, Task> work)
    {
        if (!isTerminal)
        {
            await work(new Lines(console, what, steps).Step);
            return;
        }

        await console.Progress()
            .Columns(new TaskDescriptionColumn(), new ProgressBarColumn(), new PercentageColumn(), new ElapsedTimeColumn(), new RemainingTimeColumn())
            .StartAsync(async context =>
            {
                ProgressTask task = context.AddTask(what, maxValue: Math.Max(1, steps));
                await work(() => task.Increment(1));
            });
    }

    private sealed class Lines(IAnsiConsole console, string what, int steps)
    {
        private readonly Lock _lock = new();
        private readonly long _start = Stopwatch.GetTimestamp();
        private int _done;

        public void Step()
        {
            lock (_lock)
            {
                _done++;
                if (_done * 10 / steps == (_done - 1) * 10 / steps) return;
                TimeSpan left = Stopwatch.GetElapsedTime(_start) * (steps - _done) / _done;
                console.WriteLine(FormattableString.Invariant($"{what}: {100 * _done / steps} %, about {left:hh\\:mm\\:ss} left"));
            }
        }
    }
}
