namespace PassReport.Report;

/// <summary>A stretch of time in which what goes into a pass had moved, so that its outlet flow was not its feed flow.</summary>
/// <param name="Start">When the first input began to move.</param>
/// <param name="End">When the pass had settled again.</param>
/// <param name="Cause">The input that moved most.</param>
/// <param name="Before">Mean quality read before.</param>
/// <param name="After">Mean quality read after; NaN when the history ends first.</param>
/// <param name="Overshoot">How far the reading went beyond both, with its sign: false by at least this much.</param>
/// <param name="PeakTime">When it was farthest out.</param>
internal sealed record Move(DateTimeOffset Start, DateTimeOffset End, string Cause, double Before, double After, double Overshoot, DateTimeOffset PeakTime);

/// <summary>Finds the moves of a pass. The rule is a simple one: it needs no model of the pass, and it proves nothing about the true quality.</summary>
internal static class Moves
{
    // Common practice, no source: a minute's mean rides over noise, and five minutes are a few residence times of a pass.
    private static readonly TimeSpan Averaging = TimeSpan.FromSeconds(60), Reach = TimeSpan.FromSeconds(120), Settling = TimeSpan.FromSeconds(300), Level = TimeSpan.FromSeconds(180);

    private const double FlowStep = 0.02, FiringStep = 0.01, TemperatureStep = 1.5, PressureStep = 60e3;

    public static IReadOnlyList<Move> Of(PassSeries pass)
    {
        Input[] inputs =
        [
            new("feed flow", new Windows(pass.Times, pass.Flow), FlowStep, IsRelative: true),
            new("firing", new Windows(pass.Times, pass.Firing), FiringStep, IsRelative: false),
            new("feed temperature", new Windows(pass.Times, pass.FeedTemperature), TemperatureStep, IsRelative: false),
            new("outlet pressure", new Windows(pass.Times, pass.Pressure), PressureStep, IsRelative: false),
        ];
        var quality = new Windows(pass.Times, pass.Quality);
        List<Move> moves = [];
        (DateTimeOffset Start, DateTimeOffset Last, string Cause, double Size)? open = null;
        foreach (DateTimeOffset time in pass.Times)
        {
            if (open is { } ended && time - ended.Last > Settling)
            {
                moves.Add(Closed(pass, quality, ended.Start, time, ended.Cause));
                open = null;
            }

            if (time - pass.Times[0] < Averaging + Reach) continue;
            (string cause, double size) = inputs.Select(input => (input.Name, Size: input.Steps(time))).MaxBy(step => step.Size);
            if (!(size > 1)) continue;
            open = open is { } now ? (now.Start, time, size > now.Size ? cause : now.Cause, Math.Max(size, now.Size)) : (time - Averaging, time, cause, size);
        }

        if (open is { } last) moves.Add(Closed(pass, quality, last.Start, pass.Times[^1], last.Cause));
        return moves;
    }

    /// <summary>For each sample whether it lies in a move; the moves are in order and do not overlap.</summary>
    public static bool[] Inside(DateTimeOffset[] times, IReadOnlyList<Move> moves)
    {
        var inside = new bool[times.Length];
        int next = 0;
        for (int i = 0; i < times.Length; i++)
        {
            while (next < moves.Count && moves[next].End < times[i]) next++;
            inside[i] = next < moves.Count && times[i] >= moves[next].Start;
        }

        return inside;
    }

    private static Move Closed(PassSeries pass, Windows quality, DateTimeOffset start, DateTimeOffset end, string cause)
    {
        double before = quality.Mean(start - Averaging, Level), after = quality.Mean(end, Averaging);
        double low = Math.Min(before, after), high = Math.Max(before, after), farthest = 0;
        DateTimeOffset peak = start;
        foreach (DateTimeOffset time in pass.Times.SkipWhile(time => time < start).TakeWhile(time => time <= end))
        {
            double mean = quality.Mean(time, TimeSpan.FromSeconds(30));
            double beyond = mean > high ? mean - high : mean < low ? mean - low : 0;
            if (Math.Abs(beyond) > Math.Abs(farthest)) (farthest, peak) = (beyond, time);
        }

        return new Move(start, end, cause, before, after, farthest, peak);
    }

    private readonly record struct Input(string Name, Windows Values, double Step, bool IsRelative)
    {
        /// <summary>Change of the mean over the reach, in steps that count as a move.</summary>
        public double Steps(DateTimeOffset time)
        {
            double now = Values.Mean(time, Averaging), then = Values.Mean(time - Reach, Averaging);
            double change = Math.Abs(now - then) / (IsRelative ? Math.Abs(then) : 1);
            return double.IsFinite(change) ? change / Step : 0;
        }
    }
}
