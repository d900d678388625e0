using TwoPhase.Units;

namespace PassReport.History;

/// <summary>One column for each tag, <c>tag [unit]</c>, and one row for each time.</summary>
internal static class WideForm
{
    public static HistoryTable Read(HistoryReader reader)
    {
        int timeColumn = reader.TimeColumn();
        TimeReader times = reader.Times();
        Dictionary<string, Tag> tags = reader.Tags(name => HistoryReader.Heading(reader.Header[reader.Column(name, "a tag of the generator")], name).Unit);
        (string Name, int Column, List<double> Values)[] columns = [.. tags.Keys.Select(name => (name, Single(reader, name), new List<double>()))];

        List<DateTimeOffset> stamps = [];
        List<int> rows = [];
        while (reader.Next())
        {
            string[] cells = reader.Cells;
            string stamp = timeColumn < cells.Length ? cells[timeColumn] : "";
            if (times.Read(stamp, out DateTimeOffset time) is { } fault)
            {
                reader.Faults.Add(fault, reader.Row, reader.Header[timeColumn], stamp);
                continue;
            }

            stamps.Add(time);
            rows.Add(reader.Row);
            foreach ((string name, int column, List<double> values) in columns) values.Add(Value(reader, cells, column, name));
        }

        return new HistoryTable([.. stamps], [.. rows], columns.ToDictionary(column => column.Name, column => column.Values.ToArray()), tags);
    }

    private static double Value(HistoryReader reader, string[] cells, int column, string name)
    {
        if (column < cells.Length) return reader.Number(cells[column], name);
        reader.Faults.Add(SampleFault.ShortRow, reader.Row, name, "");
        return double.NaN;
    }

    private static int Single(HistoryReader reader, string name)
    {
        int first = reader.Column(name, "a tag of the generator");
        int last = Array.FindLastIndex(reader.Header, heading => HistoryReader.Heading(heading, name).Name == name);
        return last <= first ? first : throw reader.Fault($"columns {first + 1} and {last + 1} are both named '{name}'");
    }
}
