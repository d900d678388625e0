using System.Globalization;

namespace TwoPhase.Tests.Support;

/// <summary>
/// A table of reference values kept as a CSV file beside the tests: lines that begin with '#' name its source, the first
/// other line names the columns. An empty cell reads as NaN.
/// </summary>
internal sealed class ReferenceTable
{
    private static readonly AsyncLocal<string?> Last = new();

    private readonly string[] _columns;

    private readonly string _path;

    private ReferenceTable(string path, string[] columns, IReadOnlyList<Row> rows) => (_path, _columns, Rows) = (path, columns, rows);

    /// <summary>Path of the table that the running test has last taken a value from.</summary>
    public static string? LastLoaded => Last.Value;

    public IReadOnlyList<Row> Rows { get; }

    /// <param name="path">Path below the test project, for example "Steam/Data/r7-97-table35.csv".</param>
    public static ReferenceTable Load(string path)
    {
        string[] lines = [.. File.ReadLines(Path.Combine(AppContext.BaseDirectory, path)).Where(line => line.Length > 0 && line[0] != '#')];
        string[] columns = lines[0].Split(',');
        var rows = new List<Row>(lines.Length);
        var table = new ReferenceTable(path, columns, rows);
        rows.AddRange(lines.Skip(1).Select(line => new Row(table, line.Split(','))));
        return table;
    }

    public sealed class Row(ReferenceTable table, string[] cells)
    {
        public double this[string column] => Text(column) is { Length: > 0 } text ? double.Parse(text, NumberStyles.Float, CultureInfo.InvariantCulture) : double.NaN;

        public string Text(string column)
        {
            Last.Value = table._path;
            int index = Array.IndexOf(table._columns, column);
            return index >= 0 ? cells[index] : throw new ArgumentException($"No column '{column}'.", nameof(column));
        }

        public override string ToString() => string.Join(",", cells);
    }
}
