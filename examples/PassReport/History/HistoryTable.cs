using TwoPhase.Units;

namespace PassReport.History;

/// <summary>A history in columns: one time for each row and, for each tag, one number for each time; NaN where a sample was skipped.</summary>
internal sealed class HistoryTable
{
    private readonly Dictionary<string, double[]> _columns;

    public HistoryTable(DateTimeOffset[] times, int[] rows, Dictionary<string, double[]> columns, IReadOnlyDictionary<string, Tag> tags) =>
        (Times, Rows, _columns, Tags) = (times, rows, columns, tags);

    public DateTimeOffset[] Times { get; }

    /// <summary>Row of the file that each time came from.</summary>
    public int[] Rows { get; }

    /// <summary>The tags by name, each with the unit that the file or the generator says.</summary>
    public IReadOnlyDictionary<string, Tag> Tags { get; }

    public double[] this[string tag] => _columns[tag];
}
