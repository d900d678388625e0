using System.Globalization;
using Backfill.Writing;

namespace Backfill.Demo;

/// <summary>The readings of one day of one pass, as generator.json names them, and the truth of the same seconds.</summary>
internal sealed class DemoColumns
{
    private const int Capacity = 86_400;

    private readonly TimeColumn _time = new("time", Capacity);
    private readonly NumberColumn<double> _flow = new("feed_flow_kg_s", Capacity), _warmth = new("feed_temperature_degC", Capacity), _firing = new("firing_pct", Capacity),
        _pressure = new("outlet_pressure_MPa_abs", Capacity), _differential = new("differential_kPa", Capacity), _quality = new("quality_true", Capacity), _outlet = new("outlet_flow_true_kg_s", Capacity);

    private int _count;

    public void Add(DateTime time, double? flow, double celsius, double percent, double megapascals, double kilopascals)
    {
        _time.Values[_count] = time;
        _flow.Values[_count] = flow is { } there ? Math.Round(there, 4) : null;
        _warmth.Values[_count] = Math.Round(celsius, 2);
        _firing.Values[_count] = Math.Round(percent, 2);
        _pressure.Values[_count] = Math.Round(megapascals, 4);
        _differential.Values[_count] = Math.Round(kilopascals, 3);
    }

    public void AddTruth(double quality, double outletFlow)
    {
        _quality.Values[_count] = Math.Round(quality, 6);
        _outlet.Values[_count++] = Math.Round(outletFlow, 5);
    }

    public Task WriteTruthAsync(string file, CancellationToken cancellation) => WriteAsync(file, [_time, _quality, _outlet], cancellation);

    public Task WriteReadingsAsync(string file, bool asCsv, CancellationToken cancellation)
    {
        NumberColumn<double>[] numbers = [_flow, _warmth, _firing, _pressure, _differential];
        return asCsv ? WriteCsvAsync(file, numbers, cancellation) : WriteAsync(file, [_time, .. numbers], cancellation);
    }

    private async Task WriteAsync(string file, TableColumn[] columns, CancellationToken cancellation)
    {
        await using TableWriter writer = await TableWriter.CreateAsync(file, columns, cancellation);
        await writer.WriteAsync(_count, cancellation);
    }

    private async Task WriteCsvAsync(string file, NumberColumn<double>[] numbers, CancellationToken cancellation)
    {
        await using var writer = new StreamWriter(file);
        await writer.WriteAsync($"time,{string.Join(',', numbers.Select(static column => column.Field.Name))}\n");
        for (int i = 0; i < _count; i++)
        {
            cancellation.ThrowIfCancellationRequested();
            string values = string.Join(',', numbers.Select(column => column.Values[i]?.ToString("R", CultureInfo.InvariantCulture)));
            await writer.WriteAsync(FormattableString.Invariant($"{_time.Values[i]:yyyy-MM-dd'T'HH:mm:ss}Z,{values}\n"));
        }
    }
}
