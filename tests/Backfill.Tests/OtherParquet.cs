using ParquetSharp;

namespace Backfill.Tests;

/// <summary>Parquet by another implementation than the program's: that of Apache Arrow (C++), through ParquetSharp.</summary>
internal static class OtherParquet
{
    public static string[] Names(string file)
    {
        using ParquetFileReader reader = new(file);
        return [.. Enumerable.Range(0, reader.FileMetaData.NumColumns).Select(i => reader.FileMetaData.Schema.Column(i).Name)];
    }

    public static T[] Read<T>(string file, string column)
    {
        int index = Array.IndexOf(Names(file), column);
        using ParquetFileReader reader = new(file);
        List<T> values = [];
        for (int g = 0; g < reader.FileMetaData.NumRowGroups; g++)
        {
            using RowGroupReader group = reader.RowGroup(g);
            using LogicalColumnReader<T> reading = group.Column(index).LogicalReader<T>();
            values.AddRange(reading.ReadAll((int)group.MetaData.NumRows));
        }

        return [.. values];
    }

    /// <summary>Writes columns in groups of so many rows.</summary>
    public static void Write(string file, int rowsOfGroup, int rows, params (Column Column, Array Values)[] columns)
    {
        using ParquetFileWriter writer = new(file, [.. columns.Select(column => column.Column)], Compression.Snappy);
        for (int from = 0; from < rows; from += rowsOfGroup)
        {
            using RowGroupWriter group = writer.AppendRowGroup();
            foreach ((_, Array values) in columns) WriteColumn(group, values, from, Math.Min(rowsOfGroup, rows - from));
        }

        writer.Close();
    }

    private static void WriteColumn(RowGroupWriter group, Array values, int from, int count)
    {
        switch (values)
        {
            case DateTime[] times: Write(group, times, from, count); break;
            case DateTimeNanos[] times: Write(group, times, from, count); break;
            case double[] numbers: Write(group, numbers, from, count); break;
            case double?[] numbers: Write(group, numbers, from, count); break;
            case float[] numbers: Write(group, numbers, from, count); break;
            case int?[] numbers: Write(group, numbers, from, count); break;
            case long[] numbers: Write(group, numbers, from, count); break;
            case string[] words: Write(group, words, from, count); break;
            default: throw new NotSupportedException(values.GetType().Name);
        }
    }

    private static void Write<T>(RowGroupWriter group, T[] values, int from, int count)
    {
        using LogicalColumnWriter<T> writer = group.NextColumn().LogicalWriter<T>();
        writer.WriteBatch(values, from, count);
    }
}
