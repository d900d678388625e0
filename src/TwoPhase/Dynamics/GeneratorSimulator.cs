using System.Runtime.ExceptionServices;
using TwoPhase.Passes;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Dynamics;

/// <summary>All passes of a generator in time, side by side on as many threads as there are.</summary>
/// <remarks>
/// <para>The passes meet in what is imposed on them: one fire, one feed temperature, one header at either end. Between one instant and the next each
/// goes its own way, so the result does not depend on the number of threads.</para>
/// <para>Advisory only, as <see cref="PassSimulator"/>, with its range and its omissions. Flow that sloshes between passes is among them: a valve answers
/// the inlet pressure of the second before.</para>
/// <para>Immutable and safe to share between threads.</para>
/// </remarks>
public sealed class GeneratorSimulator
{
    // Rows between two looks at progress and cancellation where nothing ties the passes together.
    private const int Stretch = 60;

    // A valve answers the pressure of the beat before. The pressure along a pass must follow more slowly than that, or the two chase each other.
    private const double LongestBeat = 1, LeastPressureLag = 5;

    private readonly int _threads;

    /// <summary>A way to simulate generators.</summary>
    /// <param name="options">How each pass is simulated; null for the defaults.</param>
    /// <param name="threads">Most threads at a time, one at least; null for as many as there are processors.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="threads"/> is less than one.</exception>
    public GeneratorSimulator(SimulatorOptions? options = null, int? threads = null)
    {
        Options = options ?? SimulatorOptions.Default;
        _threads = (int)Require.Within(threads ?? Environment.ProcessorCount, 1, int.MaxValue, "Number of threads", Scale.None, nameof(threads));
    }

    /// <summary>How each pass is simulated.</summary>
    public SimulatorOptions Options { get; }

    /// <summary>Runs a generator from rest through a schedule and keeps a row of each pass for every <see cref="SimulatorOptions.Sampling"/>.</summary>
    /// <param name="schedule">The schedule.</param>
    /// <param name="duration">How long.</param>
    /// <param name="progress">Told the share done, from the calling thread.</param>
    /// <param name="cancellation">Ends the run early, with an exception.</param>
    /// <exception cref="ArgumentException">A condition is outside its limits, a pass cannot be simulated, a header does not reach into a pass, or valves meet too short a pressure lag.</exception>
    /// <exception cref="OperationCanceledException">The run was cancelled.</exception>
    public GeneratorHistory Run(GeneratorSchedule schedule, Duration duration, IProgress<Ratio>? progress = null, CancellationToken cancellation = default)
    {
        double seconds = Require.Positive(duration.Si(), "Duration", Scale.Seconds, nameof(duration)), sampling = Options.RawSampling;
        if (Require.NotNull(schedule, nameof(schedule)).Supply is not null && Options.RawPressureLag < LeastPressureLag)
            throw Require.OutOfRange(Options.RawPressureLag, "Pressure lag", Scale.Seconds, nameof(schedule), $"must be at least {Scale.Seconds.Text(LeastPressureLag)} with feed valves");
        ParallelOptions threads = new() { MaxDegreeOfParallelism = _threads, CancellationToken = cancellation };
        var passes = new PassRun[schedule.Passes.Length];
        Each(passes.Length, threads, i => passes[i] = new(schedule, i, Options));

        FeedHeader? header = schedule.Supply is { } supply ? new(supply, passes) : null;
        List<double> pressures = [header?.Pressure ?? double.NaN];
        int rows = (int)Math.Ceiling((seconds / sampling) - 1e-9), stretch = header is null ? Stretch : 1;
        for (int row = 0; row < rows; row += stretch)
        {
            int first = row, end = Math.Min(rows, row + stretch);
            double from = row * sampling, to = Math.Min(seconds, end * sampling);
            if (header is null) Each(passes.Length, threads, i => passes[i].Go(first, end, sampling, seconds));
            else Together(header, passes, from, to, threads);
            pressures.AddRange(Enumerable.Repeat(header?.Pressure ?? double.NaN, end - row));
            progress?.Report(Ratio.FromDecimalFractions(to / seconds));
        }

        return new(schedule.Generator, [.. passes.Select(static pass => pass.History())], pressures);
    }

    // One row in beats, the header asked at the start of each.
    private static void Together(FeedHeader header, PassRun[] passes, double from, double to, ParallelOptions threads)
    {
        int beats = Math.Max(1, (int)Math.Ceiling(((to - from) / LongestBeat) - 1e-9));
        for (int beat = 0; beat < beats; beat++)
        {
            double start = from + ((to - from) * beat / beats), end = from + ((to - from) * (beat + 1) / beats);
            header.Settle(start, end);
            Each(passes.Length, threads, i => passes[i].Advance(start, end));
        }

        foreach (PassRun pass in passes) pass.Keep();
    }

    private static void Each(int count, ParallelOptions threads, Action<int> action)
    {
        try
        {
            Parallel.For(0, count, threads, action);
        }
        catch (AggregateException several)
        {
            ExceptionDispatchInfo.Capture(several.InnerExceptions[0]).Throw();   // the same as without threads
        }
    }
}
