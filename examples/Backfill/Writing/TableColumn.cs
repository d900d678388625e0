using Parquet;
using Parquet.Schema;

namespace Backfill.Writing;

/// <summary>A column of rows that wait to be written.</summary>
internal abstract class TableColumn(DataField field)
{
    public DataField Field { get; } = field;

    public abstract Task WriteAsync(ParquetRowGroupWriter group, int rows, CancellationToken cancellation);
}

/// <summary>Times in UTC, to the microsecond.</summary>
internal sealed class TimeColumn(string name, int capacity) : TableColumn(new DateTimeDataField(name, DateTimeFormat.Timestamp, isAdjustedToUTC: true, unit: DateTimeTimeUnit.Micros))
{
    public DateTime[] Values { get; } = new DateTime[capacity];

    public override Task WriteAsync(ParquetRowGroupWriter group, int rows, CancellationToken cancellation) =>
        group.WriteAsync<DateTime>(Field, Values.AsMemory(0, rows), cancellationToken: cancellation);
}

/// <summary>Numbers, null where there is none.</summary>
internal sealed class NumberColumn<T>(string name, int capacity) : TableColumn(new DataField<T>(name, nullable: true))
    where T : struct
{
    public T?[] Values { get; } = new T?[capacity];

    public override Task WriteAsync(ParquetRowGroupWriter group, int rows, CancellationToken cancellation) =>
        group.WriteAsync<T>(Field, (ReadOnlyMemory<T?>)Values.AsMemory(0, rows), cancellationToken: cancellation);
}

/// <summary>Words, null where there is none.</summary>
internal sealed class WordColumn(string name, int capacity) : TableColumn(new DataField<string>(name, nullable: true))
{
    public string?[] Values { get; } = new string?[capacity];

    public override Task WriteAsync(ParquetRowGroupWriter group, int rows, CancellationToken cancellation) =>
        group.WriteAsync(Field, new ArraySegment<string>(Values!, 0, rows));
}
