using System.Globalization;
using CsvHelper;
using CsvHelper.Configuration;
using TwoPhase.Units;

namespace PassReport.History;

/// <summary>Opens a history file, finds out its form and reads it.</summary>
internal sealed class HistoryReader : IDisposable
{
    private readonly string _file;
    private readonly IReadOnlyList<Tag> _wanted;
    private readonly StreamReader _stream;
    private readonly CsvParser _parser;
    private readonly NumberFormatInfo _numbers;

    private HistoryReader(string file, HistorySettings settings, IReadOnlyList<Tag> wanted, SampleFaults faults, IProgress<double>? progress)
    {
        (_file, Settings, _wanted, Faults, Progress) = (file, settings, wanted, faults, progress);
        try
        {
            _stream = new StreamReader(file);
        }
        catch (Exception error) when (error is IOException or UnauthorizedAccessException)
        {
            throw new FileFault(file, "", error is FileNotFoundException or DirectoryNotFoundException ? "there is no such file" : error.Message);
        }

        _numbers = new NumberFormatInfo { NumberDecimalSeparator = settings.DecimalComma ? "," : ".", NumberGroupSeparator = " " };
        var configuration = new CsvConfiguration(CultureInfo.InvariantCulture) { BadDataFound = null, Delimiter = Delimiter(file), IgnoreBlankLines = true };
        _parser = new CsvParser(_stream, configuration);
    }

    public HistorySettings Settings { get; }

    public SampleFaults Faults { get; }

    public string[] Header { get; private set; } = [];

    public string[] Cells => _parser.Record ?? [];

    /// <summary>Row of the file, counted from 1, header included.</summary>
    public int Row => _parser.RawRow;

    private IProgress<double>? Progress { get; }

    public static HistoryTable Read(string file, HistorySettings settings, IReadOnlyList<Tag> wanted, SampleFaults faults, IProgress<double>? progress = null)
    {
        using var reader = new HistoryReader(file, settings, wanted, faults, progress);
        if (!reader._parser.Read()) throw new FileFault(file, "", "the file is empty");
        reader.Header = [.. reader.Cells.Select(cell => cell.Trim())];
        bool isLong = reader.Find("tag") >= 0 && reader.Find("value") >= 0;
        HistoryTable table = isLong ? LongForm.Read(reader) : WideForm.Read(reader);
        return table.Times.Length > 0 ? table : throw reader.NoTimes();
    }

    /// <summary>The next row; false at the end.</summary>
    public bool Next()
    {
        if (_parser.Row % 1000 == 0 && _stream.BaseStream.Length > 0) Progress?.Report((double)_stream.BaseStream.Position / _stream.BaseStream.Length);
        return _parser.Read();
    }

    public int Find(string column) => Array.FindIndex(Header, heading => string.Equals(Heading(heading, column).Name, column, StringComparison.OrdinalIgnoreCase));

    public int Column(string column, string why) =>
        Find(column) is >= 0 and int index ? index : throw Fault($"there is no column '{column}' ({why}); the file has {Listed(Header)}");

    public FileFault Fault(string what) => new(_file, "row 1", what);

    /// <summary>A reader of times for one stream of samples, as the settings and the header say.</summary>
    public TimeReader Times()
    {
        Tag time = TimeTag();
        bool counted = time.Unit.Length > 0;
        if (counted && time.Unit is not ("s" or "sec" or "seconds")) throw Fault($"time column '{time}': a counted time is in seconds, [s]");
        TimeZoneInfo? zone = null;
        if (Settings.Zone is { } name && !TimeZoneInfo.TryFindSystemTimeZoneById(name, out zone)) throw Fault($"time zone '{name}' is not known to this computer");
        return new TimeReader(zone, counted ? Settings.Start ?? DateTimeOffset.UnixEpoch : null, Settings.TimeFormat, _numbers);
    }

    public int TimeColumn() => Column(TimeTag().Name, "the time");

    /// <summary>Each wanted tag with its unit, taken from the file's heading where the generator leaves it open.</summary>
    public Dictionary<string, Tag> Tags(Func<string, string?> headingUnit)
    {
        var tags = new Dictionary<string, Tag>(StringComparer.Ordinal);
        foreach (Tag tag in _wanted)
        {
            string? heading = headingUnit(tag.Name);
            if (tag.Unit.Length > 0 && heading is { Length: > 0 } && !SameUnit(tag.Unit, heading)) throw new FileFault(_file, $"row 1, column '{tag.Name}'", $"the file says [{heading}] and the generator [{tag.Unit}]: which is it?");
            tags[tag.Name] = tag.Unit.Length > 0 ? tag : tag.WithUnit(heading ?? "");
        }

        return tags;
    }

    /// <summary>The number in a cell; NaN with a fault counted when there is none.</summary>
    public double Number(string text, string column)
    {
        string trimmed = text.Trim();
        if (double.TryParse(trimmed, NumberStyles.Float, _numbers, out double number) && double.IsFinite(number)) return number;
        SampleFault fault = trimmed.Length == 0 ? SampleFault.Blank : Settings.BadValues.Contains(trimmed, StringComparer.OrdinalIgnoreCase) ? SampleFault.BadWord : SampleFault.Text;
        Faults.Add(fault, Row, column, trimmed);
        return double.NaN;
    }

    public void Dispose()
    {
        _parser.Dispose();
        _stream.Dispose();
    }

    private Tag TimeTag() => Tag.Parse(Settings.Time);

    /// <summary>A heading as the tag of that name where it can be: <c>name [unit]</c>, or <c>name (unit)</c> as spreadsheets have it.</summary>
    public static Tag Heading(string heading, string column)
    {
        if (heading.Length == 0 || heading[0] == '[') return Tag.Parse("?" + heading);
        bool round = heading.Length > column.Length + 2 && heading[^1] == ')' && heading.StartsWith(column, StringComparison.OrdinalIgnoreCase) && heading[column.Length..].TrimStart()[0] == '(';
        return round ? new Tag(column, heading[column.Length..].Trim()[1..^1]) : Tag.Parse(heading);
    }

    private FileFault NoTimes()
    {
        if (Faults.Entries is not [var first, ..]) return new(_file, "", "no row has a time that can be read: there are no rows");
        string way = first.Fault == SampleFault.TimeWithoutZone
            ? "has no offset; name its zone in the generator's file, \"history\": { \"zone\": \"America/Edmonton\" }"
            : "is not ISO 8601; say how it is written in the generator's file, \"history\": { \"timeFormat\": \"MM/dd/yyyy HH:mm:ss\" }";
        return new(_file, $"row {first.Row}", $"no row has a time that can be read; '{first.Text}' {(Settings.TimeFormat is { } format && first.Fault == SampleFault.TimeUnreadable ? $"is not written as \"{format}\"" : way)}");
    }

    private static string Listed(string[] names) => names.Length <= 8 ? string.Join(", ", names) : string.Join(", ", names[..8]) + $" and {names.Length - 8} more";

    private static bool SameUnit(string a, string b) => string.Equals(a.Replace(" ", ""), b.Replace(" ", ""), StringComparison.Ordinal);

    private static string Delimiter(string file)
    {
        string heading = File.ReadLines(file).FirstOrDefault() ?? "";
        return new[] { ",", ";", "\t" }.MaxBy(candidate => heading.Split(candidate).Length)!;
    }
}
