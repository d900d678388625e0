using TwoPhase.Units;

namespace PassReport.History;

/// <summary>
/// One row for each sample: time, tag, value and, where the historian gives it, status. The rows may be in any order between tags;
/// each tag's own times must not go back. A value holds until the tag reports again, no longer than the settings allow, and never
/// backwards in time.
/// </summary>
internal static class LongForm
{
    public static HistoryTable Read(HistoryReader reader)
    {
        int timeColumn = reader.TimeColumn(), tagColumn = reader.Column("tag", "the tag"), valueColumn = reader.Column("value", "the value"), statusColumn = reader.Find("status");
        Dictionary<string, Tag> tags = reader.Tags(_ => null);
        var streams = tags.Keys.ToDictionary(name => name, _ => new Stream(reader.Times()), StringComparer.Ordinal);
        while (reader.Next())
        {
            string[] cells = reader.Cells;
            if (tagColumn >= cells.Length || !streams.TryGetValue(cells[tagColumn].Trim(), out Stream? stream)) continue;
            string name = cells[tagColumn].Trim();
            string stamp = timeColumn < cells.Length ? cells[timeColumn] : "";
            if (stream.Times.Read(stamp, out DateTimeOffset time) is { } fault)
            {
                reader.Faults.Add(fault, reader.Row, name, stamp);
                continue;
            }

            string status = statusColumn >= 0 && statusColumn < cells.Length ? cells[statusColumn].Trim() : "";
            stream.Samples.Add(new(time, reader.Row, Value(reader, valueColumn < cells.Length ? cells[valueColumn] : "", status, name)));
        }

        if (streams.FirstOrDefault(pair => pair.Value.Samples.Count == 0) is { Key: { } absent }) throw reader.Fault($"no row carries tag '{absent}', which the generator names");
        return Aligned(streams, tags, TimeSpan.FromSeconds(reader.Settings.HoldSeconds));
    }

    private static double Value(HistoryReader reader, string text, string status, string name)
    {
        bool good = status.Length == 0 || reader.Settings.GoodStatuses.Contains(status, StringComparer.OrdinalIgnoreCase);
        if (good) return reader.Number(text, name);
        reader.Faults.Add(SampleFault.BadStatus, reader.Row, name, status);
        return double.NaN;
    }

    private static HistoryTable Aligned(Dictionary<string, Stream> streams, Dictionary<string, Tag> tags, TimeSpan hold)
    {
        var rowOf = new SortedDictionary<DateTimeOffset, int>();
        foreach (Sample sample in streams.Values.SelectMany(stream => stream.Samples)) rowOf.TryAdd(sample.Time, sample.Row);
        DateTimeOffset[] times = [.. rowOf.Keys];
        return new HistoryTable(times, [.. rowOf.Values], streams.ToDictionary(pair => pair.Key, pair => Held(pair.Value.Samples, times, hold)), tags);
    }

    private static double[] Held(List<Sample> samples, DateTimeOffset[] times, TimeSpan hold)
    {
        var column = new double[times.Length];
        int next = 0;
        for (int i = 0; i < times.Length; i++)
        {
            while (next < samples.Count && samples[next].Time <= times[i]) next++;
            column[i] = next > 0 && times[i] - samples[next - 1].Time <= hold ? samples[next - 1].Value : double.NaN;
        }

        return column;
    }

    private readonly record struct Sample(DateTimeOffset Time, int Row, double Value);

    private sealed class Stream(TimeReader times)
    {
        public TimeReader Times { get; } = times;

        public List<Sample> Samples { get; } = [];
    }
}
