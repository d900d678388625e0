using System.Buffers;
using System.Numerics;
using Parquet;
using Parquet.Schema;

namespace Backfill.Reading;

/// <summary>A Parquet file, one row group at a time.</summary>
internal sealed class ParquetTable : TableReader
{
    // More than a day of a row every 10 ms: the count itself is broken.
    private const long MostRows = 10_000_000;

    private readonly ParquetReader _reader;
    private readonly DataField _time;
    private readonly DataField[] _numbers;
    private int _group;

    private ParquetTable(string file, ParquetReader reader, IReadOnlyList<string> columns)
        : base(file)
    {
        _reader = reader;
        _time = Field(TimeColumn);
        if (_time is not DateTimeDataField { IsAdjustedToUTC: true } || _time.IsNullable) throw Fault($"column '{TimeColumn}' is no timestamp in UTC without gaps");
        _numbers = [.. columns.Select(Field)];
        DataField? text = Array.Find(_numbers, static field => !IsNumber(field));
        if (text is not null) throw Fault($"column '{text.Name}' has no numbers but {text.ClrType.Name}");
    }

    public static async Task<ParquetTable> BeginAsync(string file, IReadOnlyList<string> columns, CancellationToken cancellation)
    {
        ParquetReader reader = await ParquetReader.CreateAsync(file, cancellationToken: cancellation);
        try
        {
            return new(file, reader, columns);
        }
        catch
        {
            await reader.DisposeAsync();
            throw;
        }
    }

    public override ValueTask DisposeAsync() => _reader.DisposeAsync();

    protected override async Task<bool> FillAsync(Block block, CancellationToken cancellation)
    {
        if (_group == _reader.RowGroupCount) return false;
        using ParquetRowGroupReader group = _reader.OpenRowGroupReader(_group++);
        if (group.RowCount is < 0 or > MostRows) throw Fault($"row group {_group} says that it has {group.RowCount} rows");
        int rows = (int)group.RowCount;
        block.Begin(rows);
        await group.ReadAsync<DateTime>(_time, block.Times.AsMemory(0, rows), cancellationToken: cancellation);
        for (int i = 0; i < _numbers.Length; i++) await Read(group, _numbers[i], block.Columns[i], rows, cancellation);
        block.Count = rows;
        return true;
    }

    private DataField Field(string name) => Array.Find(_reader.Schema.DataFields, field => field.Name == name)
        ?? throw Fault($"there is no column '{name}'; there are {string.Join(", ", _reader.Schema.DataFields.Select(static field => $"'{field.Name}'"))}");

    private static bool IsNumber(DataField field) => field.ClrType == typeof(double) || field.ClrType == typeof(float) || field.ClrType == typeof(int) || field.ClrType == typeof(long);

    private static Task Read(ParquetRowGroupReader group, DataField field, double[] into, int rows, CancellationToken cancellation) =>
        field.ClrType == typeof(double) ? Read<double>(group, field, into, rows, cancellation)
        : field.ClrType == typeof(float) ? Read<float>(group, field, into, rows, cancellation)
        : field.ClrType == typeof(int) ? Read<int>(group, field, into, rows, cancellation)
        : Read<long>(group, field, into, rows, cancellation);

    private static async Task Read<T>(ParquetRowGroupReader group, DataField field, double[] into, int rows, CancellationToken cancellation)
        where T : struct, INumber<T>
    {
        if (field.IsNullable)
        {
            T?[] values = ArrayPool<T?>.Shared.Rent(rows);
            await group.ReadAsync<T>(field, values.AsMemory(0, rows), cancellationToken: cancellation);
            for (int i = 0; i < rows; i++) into[i] = values[i] is { } value ? double.CreateChecked(value) : double.NaN;
            ArrayPool<T?>.Shared.Return(values);
        }
        else
        {
            T[] values = ArrayPool<T>.Shared.Rent(rows);
            await group.ReadAsync<T>(field, values.AsMemory(0, rows), cancellationToken: cancellation);
            for (int i = 0; i < rows; i++) into[i] = double.CreateChecked(values[i]);
            ArrayPool<T>.Shared.Return(values);
        }
    }
}
