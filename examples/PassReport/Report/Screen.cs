using PassReport.History;
using Spectre.Console;
using static PassReport.Report.Words;

namespace PassReport.Report;

/// <summary>The report on the screen: verdict, one row a pass, cautions.</summary>
internal static class Screen
{
    public static void Write(IAnsiConsole console, string generator, IReadOnlyList<PassSummary> passes, IReadOnlyList<Margins> margins, SampleFaults faults, string folder)
    {
        DateTimeOffset[] times = passes[0].Series.Times;
        console.WriteLine($"{generator}, {Time(times[0])} to {Time(times[^1])} ({Length(times[^1] - times[0])}, {Words.Count(times.Length, "row", "rows")})");
        console.WriteLine();
        foreach (string sentence in Verdict.Sentences(passes)) console.WriteLine(sentence);
        console.WriteLine();
        console.Write(Rows(passes));
        console.WriteLine("Means of the last ten minutes; most in need of attention first. Models: what the published wet-steam models make of the same reading."
            + (passes.Any(pass => pass.Series.Estimate is not null) ? " Estimated: ± twice the standard uncertainty, the meter's own and the wet-steam model's included." : ""));
        if (passes.Any(pass => pass.Interior is not null))
        {
            console.WriteLine();
            console.Write(Interiors(passes));
            console.WriteLine("At rest, with the heat that the meter's reading asks for. The water held downstream of boiling is good to about 30 %: published slip models differ.");
        }

        // A steady state says nothing of a pass that is not in one.
        if (passes.Where(pass => pass.IsMovingNow && pass.Series.Pass.Sections.Count > 0).Select(pass => pass.Name).ToArray() is { Length: > 0 } moving)
            console.WriteLine($"What stands inside {Listed(moving)} is left out: still moving.");

        if (margins.Count > 0)
        {
            console.WriteLine();
            LimitTable.Write(console, margins);
        }

        console.WriteLine();
        foreach (string caution in Verdict.Cautions(passes)) console.WriteLine("- " + caution);
        if (faults.Count > 0) console.WriteLine("- " + Skipped(faults));
        console.WriteLine();
        console.WriteLine($"Full figures and pictures: {folder}");
    }

    private static Table Rows(IReadOnlyList<PassSummary> passes)
    {
        Table table = new Table().Border(TableBorder.Simple).AddColumn("Pass");
        foreach (string heading in new[] { "Flow\nkg/s", "Pressure\nMPa abs", "Differential\nkPa", "Quality\nread", "Left the pass,\nestimated", "Models\nlow – high" }) table.AddColumn(new TableColumn(new Text(heading)).RightAligned().NoWrap());
        table.AddColumn("Why");
        foreach (PassSummary pass in passes)
        {
            table.AddRow(new Text(pass.Name), new Text(Number(pass.Flow, "0.000")), new Text(Number(pass.Pressure / 1e6, "0.000")), new Text(Number(pass.Differential / 1e3, "0.00")),
                new Text(Number(pass.Quality, "0.000")), new Text(Estimate(pass)), new Text($"{Number(pass.LowestModel, "0.00")} – {Number(pass.HighestModel, "0.00")}"), new Text(Verdict.Why(pass)));
        }

        return table;
    }

    private static string Estimate(PassSummary pass) => double.IsFinite(pass.Estimated) ? $"{Number(pass.Estimated, "0.000")} ± {Number(pass.Uncertainty, "0.000")}" : "–";

    private static Table Interiors(IReadOnlyList<PassSummary> passes)
    {
        Table table = new Table().Border(TableBorder.Simple).AddColumn("Pass");
        foreach (string heading in new[] { "Heat\nMW", "Boils from\nm", "of length\n%", "Water held\nkg", "upstream of\nboiling kg", "Residence\ns", "Pressure\ndrop kPa" }) table.AddColumn(new TableColumn(new Text(heading)).RightAligned().NoWrap());
        foreach (PassSummary pass in passes)
        {
            if (pass.Interior is not { } inside) continue;
            table.AddRow(new Text(pass.Name), new Text(Number((double)inside.Profile.Conditions.AbsorbedHeat.Megawatts, "0.00")), new Text(Number(inside.Onset?.Position.Meters ?? double.NaN, "0")),
                new Text(Number(inside.Onset?.ShareOfLength.Percent ?? double.NaN, "0.0")), new Text(Number(inside.Holdup.Total.Kilograms, "0")), new Text(Number(inside.Holdup.UpstreamOfOnset.Kilograms, "0")),
                new Text(Number(inside.Holdup.ResidenceTime.Seconds, "0")), new Text(Number(inside.Profile.PressureDrop.Total.Kilopascals, "0")));
        }

        return table;
    }

    private static string Skipped(SampleFaults faults)
    {
        SampleFaults.Entry first = faults.Entries[0];
        string kinds = string.Join(", ", faults.Counts.Select(pair => $"{pair.Value} {SampleFaults.Words(pair.Key)}"));
        return $"{Words.Count(faults.Count, "sample was", "samples were")} skipped ({kinds}); the first in row {first.Row}, column {first.Column}. faults.csv lists them.";
    }
}
