using System.Globalization;
using Backfill.Commands;
using Backfill.Plan;
using Spectre.Console;

namespace Backfill.Tests;

[Collection(InventedHistory.Name)]
public sealed class RunTests(InventedHistory history)
{
    private static readonly string[] Days = ["2031-03-04", "2031-03-05", "2031-03-06", "2031-03-07", "2031-03-08", "2031-03-09"];

    // The truth is that of the simulation which made the readings; slip, bore and heat split of its pass are not those that the program is told.
    [Fact]
    public async Task Compare_AfterARun_ShowsTheEstimateNearerToTheTruthThanTheReading()
    {
        (int code, string output, _) = await Support.RunAsync("compare", history.Folder);
        Assert.Equal(0, code);
        string[][] rows = [.. output.Split('\n').Select(static line => line.Split('│', StringSplitOptions.TrimEntries)).Where(static cells => cells.Length == 4 && cells[0] is "1" or "2" or "3")];
        Assert.Equal(3, rows.Length);
        Assert.All(rows, static cells => Assert.True(2 * Number(cells[3]) < Number(cells[2]), string.Join(' ', cells)));
        Assert.Contains("invented", output, StringComparison.Ordinal);
    }

    // Each day begins with the state that the day before has saved.
    [Fact]
    public void Estimates_OverMidnight_GoOnWithoutABump()
    {
        for (int day = 1; day < Days.Length; day++)
        {
            string before = Estimates(Days[day - 1], "2"), after = Estimates(Days[day], "2");
            float?[] old = OtherParquet.Read<float?>(before, "quality_estimated"), fresh = OtherParquet.Read<float?>(after, "quality_estimated");
            Assert.InRange(fresh[0]!.Value - old[^1]!.Value, -0.001f, 0.001f);
            Assert.NotEqual("Unknown", OtherParquet.Read<string>(after, "trust")[0]);
            Assert.Equal(TimeSpan.FromSeconds(1), OtherParquet.Read<DateTime>(after, "time")[0] - OtherParquet.Read<DateTime>(before, "time")[^1]);
        }
    }

    [Fact]
    public async Task Run_CsvInPlaceOfParquet_WritesTheSameBytes()
    {
        string folder = history.Fresh();
        Assert.Equal(0, (await Support.RunAsync(InventedHistory.Generate(folder, "--passes", "1", "--days", "2", "--csv"))).Code);
        Assert.Equal(0, (await Support.RunAsync("run", folder)).Code);
        Assert.Equal(2, Directory.EnumerateFiles(Path.Combine(folder, "history"), "*.csv", SearchOption.AllDirectories).Count());
        foreach (string day in Days[..2]) Support.AreEqual(PartitionOf(history.Estimates, day, "1"), PartitionOf(Path.Combine(folder, "estimates"), day, "1"));
    }

    // Apache Arrow's writer: other row groups, other compression, columns in another order, one more than needed, milliseconds.
    [Fact]
    public async Task Run_ParquetOfAnotherWriter_WritesTheSameBytes()
    {
        string folder = history.Fresh(), own = Path.Combine(PartitionOf(history.History, Days[0], "1"), "readings.parquet"), other = Path.Combine(folder, "history", "day=2031-03-04", "pass=1", "part-0.snappy.parquet");
        Directory.CreateDirectory(Path.GetDirectoryName(other)!);
        DateTime[] times = OtherParquet.Read<DateTime>(own, "time");
        string[] names = ["differential_kPa", "feed_flow_kg_s", "outlet_pressure_MPa_abs"], whole = ["feed_temperature_degC", "firing_pct"];
        OtherParquet.Write(
            other,
            100,
            times.Length,
            [
                .. names.Select(name => (new ParquetSharp.Column<double?>(name) as ParquetSharp.Column, OtherParquet.Read<double?>(own, name) as Array)),
                (new ParquetSharp.Column<string>("operator"), times.Select(static _ => "nobody").ToArray()),
                (new ParquetSharp.Column<DateTime>("time", ParquetSharp.LogicalType.Timestamp(isAdjustedToUtc: true, ParquetSharp.TimeUnit.Millis)), times),
                .. whole.Select(name => (new ParquetSharp.Column<double>(name) as ParquetSharp.Column, OtherParquet.Read<double?>(own, name).Select(static value => value!.Value).ToArray() as Array)),
            ]);
        (int code, _, string error) = await Support.RunAsync("run", folder, "--generator", history.Generator);
        Assert.Equal((0, ""), (code, error));
        Support.AreEqual(PartitionOf(history.Estimates, Days[0], "1"), PartitionOf(Path.Combine(folder, "estimates"), Days[0], "1"));
    }

    [Fact]
    public async Task Run_InSharesOneAfterTheOther_WritesTheSameBytes()
    {
        string output = Path.Combine(history.Fresh(), "out");
        Assert.Equal(0, (await Support.RunAsync("run", history.Folder, "--out", output, "--share", "2/2")).Code);
        Assert.False(Directory.Exists(PartitionOf(output, Days[0], "1")));
        Assert.Equal(0, (await Support.RunAsync("run", history.Folder, "--out", output, "--share", "1/2", "--threads", "4")).Code);
        Support.AreEqual(history.Estimates, output);
    }

    // A chain that begins in the middle has read the day before it and no more: that must be enough to know the pass.
    [Fact]
    public async Task Run_InShortChains_SaysNearlyTheSame()
    {
        string one = Path.Combine(history.Fresh(), "out"), many = Path.Combine(history.Fresh(), "out");
        Assert.Equal(0, (await Support.RunAsync("run", history.Folder, "--out", one, "--chain-days", "2", "--threads", "1")).Code);
        Assert.Equal(0, (await Support.RunAsync("run", history.Folder, "--out", many, "--chain-days", "2", "--threads", "4")).Code);
        Support.AreEqual(one, many);
        float?[] whole = OtherParquet.Read<float?>(Estimates(Days[^1], "1"), "quality_estimated"), cut = OtherParquet.Read<float?>(Path.Combine(PartitionOf(one, Days[^1], "1"), "estimates.parquet"), "quality_estimated");
        double[] apart = [.. whole.Zip(cut).Where(static pair => pair.First is not null && pair.Second is not null).Select(static pair => Math.Abs(pair.First!.Value - pair.Second!.Value))];
        Assert.InRange(apart.Length, 500, 720);
        Assert.InRange(apart.Max(), 0, 0.003);
    }

    [Fact]
    public async Task Generate_APartOfTheYear_IsThatPartOfTheWhole()
    {
        string folder = history.Fresh();
        Assert.Equal(0, (await Support.RunAsync(InventedHistory.Generate(folder, "--start", Days[3], "--passes", "2"))).Code);
        foreach (string pass in new[] { "1", "2" }) Support.AreEqual(PartitionOf(history.History, Days[3], pass), PartitionOf(Path.Combine(folder, "history"), Days[3], pass));
    }

    // All that a run holds, collected after each partition. One that kept its rows would hold some 200 kB more after each, three megabytes at the end; what the runtime itself keeps moves by a tenth of that.
    [Fact]
    public async Task Run_OverALongerHistory_HoldsNoMoreMemory()
    {
        List<long> held = [];
        RunSettings settings = new(history.Generator, history.History, Path.Combine(history.Fresh(), "out"), 1, new ChainPlan(0, 1), Share.All);
        IAnsiConsole console = AnsiConsole.Create(new AnsiConsoleSettings { Out = new AnsiConsoleOutput(TextWriter.Null) });
        await new BackfillRun(settings, console, isTerminal: false) { AfterPartition = () => held.Add(GC.GetTotalMemory(forceFullCollection: true)) }.DoAsync(CancellationToken.None);
        Assert.Equal(InventedHistory.Partitions, held.Count);
        long early = held.Take(3).Max(), late = held.TakeLast(6).Max();
        Assert.True(late - early < 1_000_000, $"{early} bytes after 3 partitions, {late} at the end: {string.Join(", ", held)}");
    }

    private static double Number(string text) => double.Parse(text, CultureInfo.InvariantCulture);

    private static string PartitionOf(string folder, string day, string pass) => Path.Combine(folder, $"day={day}", $"pass={pass}");

    private string Estimates(string day, string pass) => Path.Combine(PartitionOf(history.Estimates, day, pass), "estimates.parquet");
}
