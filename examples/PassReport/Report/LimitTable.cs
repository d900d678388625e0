using System.Globalization;
using Spectre.Console;
using TwoPhase.Limits;
using TwoPhase.Stability;
using static PassReport.Report.Words;

namespace PassReport.Report;

/// <summary>How far each pass is from its limits, on the screen and as rows of a file.</summary>
internal static class LimitTable
{
    public static readonly string[] Heading = ["pass", "limit", "status", "section", "position_m", "value", "limit_value", "unit", "margin", "margin_unit", "moved_most_by", "heat_plus_1_percent", "flow_plus_1_percent", "feed_plus_1_K", "pressure_plus_0.1_MPa", "scale_plus_0.1_mm", "reason"];

    public static void Write(IAnsiConsole console, IReadOnlyList<Margins> margins)
    {
        Table table = new Table().Border(TableBorder.Simple).AddColumn("Pass");
        foreach (string heading in new[] { "To quality\nlimit, points", "To solids\nlimit, points", "Metal\n°C", "To metal\nlimit, K", "Dryout\nindicator", "would be\nK hotter", "Flow over\nstratified", "Inlet kPa\nto be steady" }) table.AddColumn(new TableColumn(new Text(heading)).RightAligned().NoWrap());
        foreach (Margins pass in margins)
        {
            table.AddRow(new Text(pass.Pass.Name), Points(pass[LimitKind.OutletQuality]), Points(Nearest(pass, LimitKind.Solids)), new Text(Words.Number(Metal(pass), "0")), new Text(Words.Number(Margins.Number(pass[LimitKind.MetalTemperature]), "+0;−0")),
                Points(pass[LimitKind.CriticalQuality]), new Text(Words.Number(pass.Limits.Critical?.Mean.HotterBy.Kelvins ?? double.NaN, "0")), new Text(Words.Number(1 + Margins.Number(pass[LimitKind.Stratification]), "0.0")), new Text(Steady(pass.Wave)));
        }

        console.Write(table);
        foreach (string sentence in Beyond(margins)) console.WriteLine(sentence);
        console.WriteLine("Computed at rest for wet walls: never a substitute for tube-skin thermocouples or trips. The dryout indicator comes from narrower tubes and is no alarm; passes run well at 10 to 25 points below zero.");
    }

    public static IEnumerable<string[]> Rows(IReadOnlyList<Margins> margins) => margins.SelectMany(pass => pass.Limits.Select(row => (string[])
    [
        pass.Pass.Name, row.Name, row.Status.ToString(), row.Section ?? "", Full(row.Position?.Meters), Full((double?)row.Value?.Value), Full((double?)row.Limit?.Value), row.Value?.Unit.ToString() ?? "", Full((double?)row.Margin?.Value), row.Margin?.Unit.ToString() ?? "",
        row.MovedMostBy == LimitInput.None ? "" : row.MovedMostBy.ToString(),
        .. new[] { LimitInput.Heat, LimitInput.FeedFlow, LimitInput.FeedTemperature, LimitInput.OutletPressure, LimitInput.Scale }.Select(input => Full((double?)row.Effects.FirstOrDefault(effect => effect.Input == input).Change?.Value)),
        row.Reason,
    ]));

    private static IEnumerable<string> Beyond(IReadOnlyList<Margins> margins)
    {
        foreach (Margins pass in margins)
        {
            foreach (LimitFinding row in pass.Limits.Beyond) yield return $"{pass.Pass.Name} is beyond a limit: {row}; {Mover(row.MovedMostBy)} moves it most.";
        }

        if (margins.Count > 0 && !margins[0].Limits.Site.IsOutletQualityConfirmed) yield return "The limit of outlet quality is the usual 0.80 of plain bores. It is for you to confirm: \"limits\" in the generator's file.";
    }

    private static string Mover(LimitInput input) => input switch
    {
        LimitInput.Heat => "heat",
        LimitInput.FeedFlow => "feed flow",
        LimitInput.FeedTemperature => "feed temperature",
        LimitInput.OutletPressure => "outlet pressure",
        LimitInput.Scale => "scale",
        _ => "nothing",
    };

    private static LimitFinding Nearest(Margins pass, LimitKind kind) => pass.Limits.Where(row => row.Kind == kind).OrderBy(Margins.Number).First();

    private static double Metal(Margins pass) => Enumerable.Range(0, pass.Interior.Profile.Count).Max(i => pass.Interior.Profile.WallAt(i, pass.Limits.Site.FluxPeak).Temperatures.OutsideMetal.DegreesCelsius);

    private static Text Points(LimitFinding row) => new(Words.Points(Margins.Number(row)));

    private static string Steady(DensityWave wave) => wave.Status switch
    {
        StabilityStatus.NotApplicable => "–",
        StabilityStatus.Stable => "none",
        _ => Words.Number(wave.RestrictionNeeded!.Value.Kilopascals, "0"),
    };

    private static string Full(double? value) => value is { } number && double.IsFinite(number) ? number.ToString("R", CultureInfo.InvariantCulture) : "";
}
