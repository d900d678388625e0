using System.Globalization;
using CsvHelper;
using PassReport.History;

namespace PassReport.Report;

/// <summary>The full figures as CSV: the history of quality, the passes, the moves, and the samples that were skipped.</summary>
internal static class Figures
{
    public static void Write(string folder, IReadOnlyList<PassSummary> passes, IReadOnlyList<Margins> margins, SampleFaults faults)
    {
        Quality(Path.Combine(folder, "quality.csv"), [.. passes.OrderBy(pass => pass.Name, StringComparer.OrdinalIgnoreCase)]);
        Table(Path.Combine(folder, "passes.csv"), ["pass", "flow_kg_s", "pressure_Pa_abs", "differential_Pa", "quality", "apart_from_middle", "wander_at_rest", "share_moving", "share_unread", "attention_points", "heat_W", "boils_from_m", "water_held_kg", "water_upstream_of_boiling_kg", "residence_s", "pressure_drop_Pa", "model", "model_quality", "model_inside_range", "model_exceeds"],
            passes.SelectMany(pass => pass.Models.DefaultIfEmpty().Select(model => (string[])
            [
                pass.Name, Full(pass.Flow), Full(pass.Pressure), Full(pass.Differential), Full(pass.Quality), Full(pass.Apart), Full(pass.Wander), Full(pass.Moving), Full(pass.Skipped), Full(pass.Attention),
                .. Inside(pass.Interior),
                model.Model?.Name ?? "", model.Model is null ? "" : Full(model.Reading.Quality.DecimalFractions), model.Model is null ? "" : model.Reading.Applicability.IsInside ? "yes" : "no", model.Model is null || model.Reading.Applicability.IsInside ? "" : model.Reading.Applicability.Exceeded.ToString(),
            ])));
        Table(Path.Combine(folder, "moves.csv"), ["pass", "start", "end", "cause", "quality_before", "quality_after", "overshoot", "peak_time"],
            passes.SelectMany(pass => pass.Moves.Select(move => new[] { pass.Name, Iso(move.Start), Iso(move.End), move.Cause, Full(move.Before), Full(move.After), Full(move.Overshoot), Iso(move.PeakTime) })));
        Table(Path.Combine(folder, "limits.csv"), LimitTable.Heading, LimitTable.Rows(margins));
        Table(Path.Combine(folder, "faults.csv"), ["row", "column", "fault", "text"],
            faults.Entries.Select(entry => new[] { entry.Row.ToString(CultureInfo.InvariantCulture), entry.Column, SampleFaults.Words(entry.Fault), entry.Text }));
    }

    private static string[] Inside(Interior? inside) => inside is null ? ["", "", "", "", "", ""]
        : [Full((double)inside.Profile.Conditions.AbsorbedHeat.Watts), Full(inside.Onset?.Position.Meters ?? double.NaN), Full(inside.Holdup.Total.Kilograms), Full(inside.Holdup.UpstreamOfOnset.Kilograms), Full(inside.Holdup.ResidenceTime.Seconds), Full(inside.Profile.PressureDrop.Total.Pascals)];

    private static void Quality(string file, PassSummary[] passes)
    {
        DateTimeOffset[] times = passes[0].Series.Times;
        bool[][] moving = [.. passes.Select(pass => Moves.Inside(times, pass.Moves))];
        Table(file, ["time", .. passes.SelectMany(pass => (string[])[$"{pass.Name} quality [kg/kg]", $"{pass.Name} status", .. Estimated(pass, $"{pass.Name} estimated [kg/kg]", $"{pass.Name} u motion [kg/kg]", $"{pass.Name} u absolute [kg/kg]", $"{pass.Name} trust")])],
            Enumerable.Range(0, times.Length).Select(i => (string[])[Iso(times[i]), .. passes.SelectMany((pass, p) => (string[])
            [
                Six(pass.Series.Quality[i]),
                moving[p][i] && !double.IsNaN(pass.Series.Quality[i]) ? pass.Series.Status[i] + ", inputs moving" : pass.Series.Status[i].ToString(),
                .. pass.Series.Estimate is { } estimate ? [Six(estimate.Quality.Span[i]), Six(estimate.Motion.Span[i]), Six(estimate.Absolute.Span[i]), estimate.Trust.Span[i].ToString()] : Array.Empty<string>(),
            ])]));
    }

    private static string[] Estimated(PassSummary pass, params string[] headings) => pass.Series.Estimate is null ? [] : headings;

    private static string Six(double quality) => double.IsNaN(quality) ? "" : quality.ToString("F6", CultureInfo.InvariantCulture);

    private static void Table(string file, string[] heading, IEnumerable<string[]> rows)
    {
        using var writer = new StreamWriter(file) { NewLine = "\n" };
        using var csv = new CsvWriter(writer, CultureInfo.InvariantCulture);
        foreach (string[] row in rows.Prepend(heading))
        {
            foreach (string cell in row) csv.WriteField(cell);
            csv.NextRecord();
        }
    }

    private static string Full(double value) => double.IsFinite(value) ? value.ToString("R", CultureInfo.InvariantCulture) : "";

    private static string Iso(DateTimeOffset time) => time.ToString("yyyy-MM-dd'T'HH:mm:sszzz", CultureInfo.InvariantCulture);
}
