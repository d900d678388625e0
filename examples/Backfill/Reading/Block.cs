namespace Backfill.Reading;

/// <summary>Some rows of a file, column by column; reused from one part of a file to the next. NaN where a value is missing.</summary>
internal sealed class Block(int columns)
{
    public DateTime[] Times { get; private set; } = [];

    public double[][] Columns { get; } = [.. Enumerable.Range(0, columns).Select(static _ => Array.Empty<double>())];

    public int Count { get; set; }

    /// <summary>Makes room for so many rows, and none in it.</summary>
    public void Begin(int rows)
    {
        Count = 0;
        if (Times.Length >= rows) return;
        Times = new DateTime[rows];
        for (int i = 0; i < Columns.Length; i++) Columns[i] = new double[rows];
    }
}
