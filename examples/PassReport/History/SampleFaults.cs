namespace PassReport.History;

/// <summary>Why one sample was skipped.</summary>
internal enum SampleFault
{
    Blank,
    Text,
    BadWord,
    BadStatus,
    OutOfRange,
    TimeUnreadable,
    TimeWithoutZone,
    TimeSkippedByClock,
    TimeBackwards,
    ShortRow,
}

/// <summary>Counts what is wrong with samples and remembers where; a fault of a sample never ends the run.</summary>
internal sealed class SampleFaults
{
    private const int Remembered = 100_000;

    private readonly List<Entry> _entries = [];
    private readonly SortedDictionary<SampleFault, int> _counts = [];

    public int Count { get; private set; }

    public IReadOnlyDictionary<SampleFault, int> Counts => _counts;

    /// <summary>The faults in the order they were met; the first hundred thousand.</summary>
    public IReadOnlyList<Entry> Entries => _entries;

    public void Add(SampleFault fault, int row, string column, string text)
    {
        Count++;
        _counts[fault] = _counts.GetValueOrDefault(fault) + 1;
        if (_entries.Count < Remembered) _entries.Add(new(fault, row, column, text.Length > 40 ? text[..40] + "…" : text));
    }

    public static string Words(SampleFault fault) => fault switch
    {
        SampleFault.Blank => "blank",
        SampleFault.Text => "not a number",
        SampleFault.BadWord => "a bad-value word",
        SampleFault.BadStatus => "flagged by its status",
        SampleFault.OutOfRange => "out of range",
        SampleFault.TimeUnreadable => "time not readable",
        SampleFault.TimeWithoutZone => "time without offset, and no zone given",
        SampleFault.TimeSkippedByClock => "time that the clock skipped",
        SampleFault.TimeBackwards => "time going backwards",
        _ => "row too short",
    };

    internal readonly record struct Entry(SampleFault Fault, int Row, string Column, string Text);
}
