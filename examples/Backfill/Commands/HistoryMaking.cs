using Backfill.Demo;
using Backfill.Plan;
using Backfill.Work;
using Spectre.Console;

namespace Backfill.Commands;

/// <summary>What is to be made of the invented year.</summary>
internal sealed record MakingSettings(DemoFolder Folder, DateOnly First, int Days, int Passes, int EverySeconds, int Minutes, int Seed, bool AsCsv, int Threads);

/// <summary>Makes a part of the invented year: the history, and the truth apart from it.</summary>
internal sealed class HistoryMaking(MakingSettings settings, IAnsiConsole console, bool isTerminal)
{
    public async Task DoAsync(CancellationToken cancellation)
    {
        DemoFolder folder = settings.Folder;
        Directory.CreateDirectory(folder.Root);
        await WriteGeneratorAsync(folder.Generator, cancellation);
        Site site = Site.Read(folder.Generator);
        string[] passes = [.. site.Generator.Passes.Select(static pass => pass.Name).Take(settings.Passes)];
        Partition[] partitions = [.. Enumerable.Range(0, settings.Days).SelectMany(day => passes.Select(pass => new Partition(settings.First.AddDays(day), pass)))];
        ParallelOptions threads = new() { MaxDegreeOfParallelism = settings.Threads, CancellationToken = cancellation };
        await ProgressView.RunAsync(console, isTerminal, "Inventing", partitions.Length, step => Parallel.ForEachAsync(partitions, threads, async (partition, token) =>
        {
            await MakeAsync(partition, site, token);
            step();
        }));
        console.WriteLine(FormattableString.Invariant($"Invented: generator, readings and truth of passes {string.Join(", ", passes)}, {settings.First:yyyy-MM-dd} to {partitions[^1].Day:yyyy-MM-dd}, seed {settings.Seed}. No such plant exists."));
    }

    private async Task MakeAsync(Partition partition, Site site, CancellationToken cancellation)
    {
        DemoColumns columns = new DayMaker(new((ulong)settings.Seed), site[partition.Pass].Meter, settings.EverySeconds, settings.Minutes).Make(partition.Day, partition.Pass);
        string readings = Directory.CreateDirectory(Path.Combine(settings.Folder.History, partition.Folder)).FullName;
        string truth = Directory.CreateDirectory(Path.Combine(settings.Folder.Truth, partition.Folder)).FullName;
        await columns.WriteReadingsAsync(Path.Combine(readings, settings.AsCsv ? "readings.csv" : "readings.parquet"), settings.AsCsv, cancellation);
        await columns.WriteTruthAsync(Path.Combine(truth, "truth.parquet"), cancellation);
    }

    private static async Task WriteGeneratorAsync(string file, CancellationToken cancellation)
    {
        await using Stream from = typeof(HistoryMaking).Assembly.GetManifestResourceStream("generator.json")!;
        await using FileStream to = File.Create(file);
        await from.CopyToAsync(to, cancellation);
    }
}
