using static PassReport.Report.Words;

namespace PassReport.Report;

/// <summary>What the report says in sentences: the verdict first, the cautions last.</summary>
internal static class Verdict
{
    // Two points are what noise and small differences between passes leave; common practice, no source.
    private const double Notable = 0.02;

    private static readonly TimeSpan Peak = TimeSpan.FromSeconds(30);

    public static IEnumerable<string> Sentences(IReadOnlyList<PassSummary> passes)
    {
        PassSummary[] reading = [.. passes.Where(pass => double.IsFinite(pass.Quality))];
        if (reading.Length == 0)
        {
            yield return "No pass gives a quality at the end of this history.";
        }
        else
        {
            yield return Level(reading, passes.Count);
        }

        foreach (PassSummary pass in passes.Where(pass => Math.Abs(pass.Wander) > Notable)) yield return Wandering(pass, passes.Count);
        PassSummary[] swung = [.. passes.Where(pass => Math.Abs(pass.Largest?.Overshoot ?? 0) > Notable)];
        if (swung.Length > 0) yield return False(swung.MaxBy(pass => Math.Abs(pass.Largest!.Overshoot))!, swung.Length);
        foreach (PassSummary pass in passes.Where(pass => pass.DisagreesSince is not null))
            yield return $"{pass.Name}: meter and model disagree since {Time(pass.DisagreesSince!.Value)}: its heat, its meter or its feed flow, which one pass alone cannot tell apart.";
        if (passes.Where(pass => pass.IsMovingNow).Select(pass => pass.Name).ToArray() is { Length: > 0 } moving)
            yield return $"At the end of the history the inputs of {Listed(moving)} are still moving or settling: do not believe the last reading yet.";
        if (swung.Length == 0 && passes.All(pass => !(Math.Abs(pass.Wander) > Notable) && Math.Abs(pass.Apart) <= Notable)) yield return "Nothing here asks for attention.";
    }

    public static IEnumerable<string> Cautions(IReadOnlyList<PassSummary> passes)
    {
        yield return "A quality is inferred from the differential and the feed flow; it is right only while as much leaves the pass as enters it. A move counts as settled five minutes after the inputs rest: a rule of thumb.";
        if (passes.Any(pass => pass.Series.Estimate is not null)) yield return "The estimate is the library's model of the pass, corrected by the meter: it takes away what the water on the move does to a reading, not what is wrong with a meter.";
        if (passes.FirstOrDefault(pass => pass.Models.Count > 1) is { } pass)
        {
            yield return $"The wet-steam models differ by {Size(pass.HighestModel - pass.LowestModel)} points on one and the same reading. Until a separator or laboratory test has settled the model, compare passes, not absolute values.";
            if (pass.Models.Any(model => !model.Reading.Applicability.IsInside)) yield return "Some models are used outside their published range here; passes.csv says which.";
        }

        foreach (PassSummary skipped in passes.Where(pass => pass.Skipped > 0.01)) yield return $"{skipped.Name} gave no quality for {Share(skipped.Skipped)} of its samples.";
        foreach (PassSummary outside in passes.Where(pass => pass.OutsideDome > 0)) yield return $"{outside.Name} read below 0 or above 1 for {Share(outside.OutsideDome)} of its samples: water or superheated steam at the outlet, or an instrument at fault.";
        yield return "Advisory only: no safety function. The plant's protective systems, local codes and licensed engineers come first.";
    }

    public static string Why(PassSummary pass)
    {
        List<string> why = [];
        if (Math.Abs(pass.Apart) > Notable) why.Add($"reads {Points(pass.Apart)} from the middle");
        if (Math.Abs(pass.Wander) > Notable) why.Add($"wandered {Points(pass.Wander)} at rest");
        if (Math.Abs(pass.Largest?.Overshoot ?? 0) > Notable) why.Add($"swung {Points(pass.Largest!.Overshoot)} false");
        if (pass.Skipped > 0.01) why.Add($"{Share(pass.Skipped)} unread");
        if (pass.IsMovingNow) why.Add("still moving");
        return why.Count == 0 ? "quiet" : string.Join("; ", why);
    }

    private static string Level(PassSummary[] reading, int count)
    {
        PassSummary low = reading.MinBy(pass => pass.Quality)!, high = reading.MaxBy(pass => pass.Quality)!;
        if (count == 1) return $"{low.Name} reads a quality of {Number(low.Quality, "0.000")} over the last ten minutes.";
        string some = reading.Length == count ? $"The {count} passes read" : $"{reading.Length} of {count} passes read";
        return $"{some} between {Number(low.Quality, "0.000")} ({low.Name}) and {Number(high.Quality, "0.000")} ({high.Name}) over the last ten minutes.";
    }

    private static string Wandering(PassSummary pass, int count) => count > 1
        ? $"{pass.Name} has wandered {Points(pass.Wander)} points against the other passes from the first to the last tenth of the history, at rest: its meter, its feed meter or its heat. Look there first."
        : $"{pass.Name} has wandered {Points(pass.Wander)} points at rest from the first to the last tenth of the history with its inputs unchanged: its meter or its heat. One pass alone cannot tell which.";

    private static string False(PassSummary pass, int count)
    {
        Move move = pass.Largest!;
        string others = count == 1 ? "" : $" The same happened, smaller, in {Words.Count(count - 1, "other pass", "other passes")}.";
        double left = pass.EstimatedAround(move.PeakTime, Peak), read = pass.ReadAround(move.PeakTime, Peak);
        string truth = double.IsFinite(left)
            ? $"By the estimate {Number(left, "0.000")} left the pass then: the reading of {Number(read, "0.000")} was {Size(read - left)} points false."
            : "At least that much of it was water on the move, not quality.";
        return $"The reading was false while inputs moved: at {Time(move.PeakTime)} {pass.Name} stood {Size(move.Overshoot)} points {(move.Overshoot > 0 ? "above" : "below")} its level before and after ({Number(move.Before, "0.000")} and {Number(move.After, "0.000")}), after a move of the {move.Cause}. {truth}{others}";
    }
}
