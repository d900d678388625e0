using System.Globalization;
using CsvHelper;
using CsvHelper.Configuration;

namespace Backfill.Reading;

/// <summary>A CSV file with a heading, some rows at a time. What is no number is a missing value.</summary>
internal sealed class CsvTable : TableReader
{
    private const int Rows = 8192;

    // A time without its offset from UTC could be any of two dozen.
    private static readonly string[] TimeFormats = ["yyyy-MM-dd'T'HH:mm:ss.FFFFFFFK", "yyyy-MM-dd HH:mm:ss.FFFFFFFK"];

    private readonly CsvReader _reader;
    private readonly int _time;
    private readonly int[] _numbers;

    public CsvTable(string file, IReadOnlyList<string> columns)
        : base(file)
    {
        _reader = new(new StreamReader(file), new CsvConfiguration(CultureInfo.InvariantCulture) { DetectColumnCountChanges = true });
        if (!_reader.Read()) throw Fault("the file is empty");
        _reader.ReadHeader();
        _time = Index(TimeColumn);
        _numbers = [.. columns.Select(Index)];
    }

    public override ValueTask DisposeAsync()
    {
        _reader.Dispose();
        return ValueTask.CompletedTask;
    }

    protected override async Task<bool> FillAsync(Block block, CancellationToken cancellation)
    {
        block.Begin(Rows);
        cancellation.ThrowIfCancellationRequested();
        while (block.Count < Rows && await _reader.ReadAsync()) Take(block);
        return block.Count > 0;
    }

    private void Take(Block block)
    {
        int row = block.Count++;
        block.Times[row] = Time(_reader.GetField(_time) ?? "");
        for (int i = 0; i < _numbers.Length; i++)
            block.Columns[i][row] = double.TryParse(_reader.GetField(_numbers[i]), NumberStyles.Float, CultureInfo.InvariantCulture, out double value) ? value : double.NaN;
    }

    private DateTime Time(string text) =>
        DateTime.TryParseExact(text, TimeFormats, CultureInfo.InvariantCulture, DateTimeStyles.AdjustToUniversal, out DateTime time) && time.Kind == DateTimeKind.Utc
            ? time
            : throw Fault($"row {_reader.Parser.Row}: '{text}' is no time like 2031-03-04T00:00:00Z");

    private int Index(string name)
    {
        int index = Array.IndexOf(_reader.HeaderRecord!, name);
        return index >= 0 ? index : throw Fault($"there is no column '{name}'; there are {string.Join(", ", _reader.HeaderRecord!.Select(static column => $"'{column}'"))}");
    }
}
