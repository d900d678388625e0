using Parquet;
using Parquet.Schema;

namespace Backfill.Writing;

/// <summary>A Parquet file that is written one row group after another. The same rows always give the same bytes.</summary>
internal sealed class TableWriter : IAsyncDisposable
{
    private static readonly ParquetOptions Options = new() { CompressionMethod = CompressionMethod.Zstd };

    private readonly FileStream _file;
    private readonly ParquetWriter _writer;
    private readonly IReadOnlyList<TableColumn> _columns;

    private TableWriter(FileStream file, ParquetWriter writer, IReadOnlyList<TableColumn> columns) => (_file, _writer, _columns) = (file, writer, columns);

    public static async Task<TableWriter> CreateAsync(string path, IReadOnlyList<TableColumn> columns, CancellationToken cancellation)
    {
        FileStream file = File.Create(path);
        var schema = new ParquetSchema(columns.Select(static column => column.Field));
        return new(file, await ParquetWriter.CreateAsync(schema, file, Options, cancellationToken: cancellation), columns);
    }

    public async Task WriteAsync(int rows, CancellationToken cancellation)
    {
        using ParquetRowGroupWriter group = _writer.CreateRowGroup();
        foreach (TableColumn column in _columns) await column.WriteAsync(group, rows, cancellation);
    }

    public async ValueTask DisposeAsync()
    {
        await _writer.DisposeAsync();
        ToDisk();
        await _file.DisposeAsync();
    }

    // On the disk before the folder gets its name; there is no asynchronous way to ask for that.
    private void ToDisk() => _file.Flush(flushToDisk: true);
}
