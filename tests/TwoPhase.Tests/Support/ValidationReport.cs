using System.Collections.Concurrent;
using System.Globalization;
using System.Text;
using TwoPhase.Tests.House;

namespace TwoPhase.Tests.Support;

/// <summary>One comparison as it was made.</summary>
/// <param name="What">What was compared.</param>
/// <param name="Expected">The published or reference value.</param>
/// <param name="Actual">What the library gave.</param>
/// <param name="Error">Their difference, relative or absolute.</param>
/// <param name="Tolerance">What it may be.</param>
/// <param name="IsRelative">Which of the two it is.</param>
internal readonly record struct Comparison(string What, double Expected, double Actual, double Error, double Tolerance, bool IsRelative);

/// <summary>
/// Every check against something published, with its source, as a test run made it. Written where <c>TWOPHASE_VALIDATION</c> names a folder;
/// otherwise nothing is kept.
/// </summary>
internal static class ValidationReport
{
    // So many comparisons of one place are listed, so many are kept; the worst always is.
    private const int Listed = 12, Kept = 5000;

    private static readonly string? Folder = Environment.GetEnvironmentVariable("TWOPHASE_VALIDATION") is { Length: > 0 } folder ? Path.GetFullPath(folder, Repository.Root) : null;
    private static readonly ConcurrentDictionary<(string File, int Line, string Table), Place> Places = new();

    public static void Add(string file, int line, in Comparison comparison)
    {
        if (Folder is null) return;
        int start = file.Replace('\\', '/').LastIndexOf("tests/TwoPhase.Tests/", StringComparison.Ordinal);
        if (start >= 0) Places.GetOrAdd((file[start..], line, ReferenceTable.LastLoaded ?? ""), static _ => new()).Add(comparison);
    }

    /// <summary>Writes what is on record.</summary>
    public static void Write()
    {
        if (Folder is null) return;
        Directory.CreateDirectory(Folder);
        var page = new StringBuilder();
        using var rows = new StreamWriter(Path.Combine(Folder, "validation.csv"));
        rows.WriteLine("test file,line,table,what,expected,got,difference,allowed,kind");
        int published = 0, comparisons = 0;
        foreach (var group in Places.OrderBy(static place => place.Key.File, StringComparer.Ordinal).ThenBy(static place => place.Key.Line).ThenBy(static place => place.Key.Table, StringComparer.Ordinal)
            .Select(static place => (place.Key, place.Value, Source: CheckSource.Of(place.Key.File, place.Key.Line, place.Key.Table)))
            .Where(static place => place.Source.Length > 0))
        {
            published++;
            comparisons += group.Value.Count;
            page.AppendLine(CultureInfo.InvariantCulture, $"\n### {Name(group.Key.File)}, line {group.Key.Line}{(group.Key.Table.Length > 0 ? ", " + group.Key.Table : "")}\n\n{group.Source}\n");
            Table(page, group.Value);
            foreach (Comparison row in group.Value.Rows)
                rows.WriteLine(string.Create(CultureInfo.InvariantCulture, $"{group.Key.File},{group.Key.Line},{group.Key.Table},{Quoted(row.What)},{row.Expected:R},{row.Actual:R},{row.Error:G3},{row.Tolerance:G3},{(row.IsRelative ? "relative" : "absolute")}"));
        }

        string head = string.Create(CultureInfo.InvariantCulture, $"# Validation\n\n{comparisons:N0} comparisons at {published:N0} places of the tests with a named source; {typeof(global::TwoPhase.Passes.Pass).Assembly.GetName().Version} on {System.Runtime.InteropServices.RuntimeInformation.FrameworkDescription}. All rows are in validation.csv.\n");
        File.WriteAllText(Path.Combine(Folder, "validation.md"), head + page);
    }

    private static void Table(StringBuilder page, Place place)
    {
        page.AppendLine("| what | expected | got | difference | allowed |\n|---|---|---|---|---|");
        IReadOnlyList<Comparison> rows = place.Count <= Listed ? place.Rows : [place.Worst];
        foreach (Comparison row in rows)
            page.AppendLine(CultureInfo.InvariantCulture, $"| {row.What.Replace("|", "\\|", StringComparison.Ordinal)} | {row.Expected:G10} | {row.Actual:G10} | {row.Error:G2}{(row.IsRelative ? " of it" : "")} | {row.Tolerance:G2} |");
        if (place.Count > Listed) page.AppendLine(CultureInfo.InvariantCulture, $"\nThe worst of {place.Count:N0}.");
    }

    private static string Name(string file) => file["tests/TwoPhase.Tests/".Length..^".cs".Length];

    private static string Quoted(string text) => "\"" + text.Replace("\"", "\"\"", StringComparison.Ordinal) + "\"";

    private sealed class Place
    {
        private readonly List<Comparison> _rows = [];

        public int Count { get; private set; }

        public Comparison Worst { get; private set; }

        public IReadOnlyList<Comparison> Rows => _rows;

        public void Add(in Comparison row)
        {
            lock (_rows)
            {
                if (Count == 0 || row.Error / row.Tolerance > Worst.Error / Worst.Tolerance) Worst = row;
                if (Count++ < Kept) _rows.Add(row);
            }
        }
    }
}
