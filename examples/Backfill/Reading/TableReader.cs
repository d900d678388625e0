namespace Backfill.Reading;

/// <summary>A file of times and numbers, read part by part. Whatever is wrong with it is a <see cref="FileFault"/>.</summary>
internal abstract class TableReader(string file) : IAsyncDisposable
{
    public const string TimeColumn = "time";

    protected string File { get; } = file;

    public static async Task<TableReader> OpenAsync(string file, IReadOnlyList<string> columns, CancellationToken cancellation) => await Guard<TableReader>(file, async () =>
        Path.GetExtension(file).Equals(".csv", StringComparison.OrdinalIgnoreCase)
            ? new CsvTable(file, columns)
            : await ParquetTable.BeginAsync(file, columns, cancellation));

    /// <summary>Fills the block with the next rows; false behind the last.</summary>
    public Task<bool> NextAsync(Block block, CancellationToken cancellation) => Guard(File, () => FillAsync(block, cancellation));

    public abstract ValueTask DisposeAsync();

    protected abstract Task<bool> FillAsync(Block block, CancellationToken cancellation);

    protected FileFault Fault(string what) => new(File, what);

    // Neither library promises which exceptions a broken file leads to.
    private static async Task<T> Guard<T>(string file, Func<Task<T>> read)
    {
        try
        {
            return await read();
        }
        catch (Exception error) when (error is not (FileFault or OperationCanceledException or OutOfMemoryException))
        {
            throw new FileFault(file, error.Message.Split('\n')[0].TrimEnd());
        }
    }
}
