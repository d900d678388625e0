using System.Globalization;
using Backfill.Plan;
using Backfill.Reading;
using Backfill.Writing;
using Spectre.Console;

namespace Backfill.Commands;

/// <summary>How far reading and estimate are from the truth of the invented year.</summary>
internal sealed class Comparison(DemoFolder folder, IAnsiConsole console)
{
    public async Task DoAsync(CancellationToken cancellation)
    {
        Site site = Site.Read(folder.Generator);
        var truth = HistoryFolder.Scan(folder.Truth, [.. site.Generator.Passes.Select(static pass => pass.Name)]);
        Table table = new Table().MinimalBorder().AddColumns("pass", "rows", "reading rms", "estimate rms");
        foreach (string pass in truth.Passes)
        {
            Errors errors = new();
            for (DateOnly day = truth.First; day <= truth.Last; day = day.AddDays(1)) await AddAsync(errors, truth, new(day, pass), cancellation);
            table.AddRow(pass, errors.Rows.ToString("N0", CultureInfo.InvariantCulture), Points(errors.Reading), Points(errors.Estimate));
        }

        console.Write(table);
        console.WriteLine("Points of quality, over the rows that have all three. Everything here is invented: the plant behind the readings is a simulation that differs from what generator.json says.");
    }

    private async Task AddAsync(Errors errors, HistoryFolder truth, Partition partition, CancellationToken cancellation)
    {
        string estimates = Path.Combine(folder.Estimates, partition.Folder, OutputFolder.EstimatesFile);
        if (truth.FileOf(partition) is not { } file || !File.Exists(estimates)) return;
        Dictionary<DateTime, double> qualities = [];
        await foreach (Block block in BlocksAsync(file, ["quality_true"], cancellation))
        {
            for (int i = 0; i < block.Count; i++) qualities[block.Times[i]] = block.Columns[0][i];
        }

        await foreach (Block block in BlocksAsync(estimates, ["quality_read", "quality_estimated"], cancellation))
        {
            for (int i = 0; i < block.Count; i++)
            {
                if (qualities.TryGetValue(block.Times[i], out double quality)) errors.Add(block.Columns[0][i] - quality, block.Columns[1][i] - quality);
            }
        }
    }

    private static async IAsyncEnumerable<Block> BlocksAsync(string file, string[] columns, [System.Runtime.CompilerServices.EnumeratorCancellation] CancellationToken cancellation)
    {
        Block block = new(columns.Length);
        await using TableReader reader = await TableReader.OpenAsync(file, columns, cancellation);
        while (await reader.NextAsync(block, cancellation)) yield return block;
    }

    private static string Points(double error) => (100 * error).ToString("F2", CultureInfo.InvariantCulture);

    private sealed class Errors
    {
        private double _reading, _estimate;

        public long Rows { get; private set; }

        public double Reading => Math.Sqrt(_reading / Rows);

        public double Estimate => Math.Sqrt(_estimate / Rows);

        public void Add(double reading, double estimate)
        {
            if (!double.IsFinite(reading) || !double.IsFinite(estimate)) return;
            _reading += reading * reading;
            _estimate += estimate * estimate;
            Rows++;
        }
    }
}
