namespace Backfill.Tests;

[Collection(InventedHistory.Name)]
public sealed class BadFileTests(InventedHistory history)
{
    [Fact]
    public async Task Run_BadFilesAmongTheInputs_AreReportedSkippedAndVisibleUntilTheyAreMended()
    {
        string folder = history.Fresh(), copy = Path.Combine(folder, "history");
        Support.Copy(history.History, copy);
        File.Copy(history.Generator, Path.Combine(folder, "generator.json"));
        Damage(copy);

        (int code, string report, string error) = await Support.RunAsync("run", folder);
        Assert.Equal(3, code);
        Assert.Contains("Partitions: 18 done, 0 stood from before, 1 without a file, 4 with a bad file.", report, StringComparison.Ordinal);
        Assert.Collection(
            error.TrimEnd().Split('\n'),
            static line => Assert.StartsWith("day=2031-03-04/pass=3: readings.csv: the file is empty", line, StringComparison.Ordinal),
            static line => Assert.StartsWith("day=2031-03-05/pass=1: readings.parquet: not a parquet file", line, StringComparison.Ordinal),
            static line => Assert.StartsWith("day=2031-03-06/pass=2: readings.parquet: there is no column 'feed_temperature_degC'; there are 'time', 'feed_flow_kg_s'", line, StringComparison.Ordinal),
            static line => Assert.StartsWith("day=2031-03-07/pass=3: readings.parquet: row 1 is of 2031-03-08T00:00:00Z, not of day=2031-03-07", line, StringComparison.Ordinal));
        AreGaps(Path.Combine(folder, "estimates"));

        // Again: what was bad is still said to be.
        (int again, string still, string same) = await Support.RunAsync("run", folder);
        Assert.Equal((3, error), (again, same));
        Assert.Contains("Partitions: 0 done, 18 stood from before, 1 without a file, 4 with a bad file.", still, StringComparison.Ordinal);

        // Mended: those days and what follows them are estimated anew, as if nothing had been.
        Directory.Delete(copy, recursive: true);
        Support.Copy(history.History, copy);
        (int mended, string last, string none) = await Support.RunAsync("run", folder);
        Assert.Equal((0, ""), (mended, none));
        Assert.Contains("Partitions: 15 done, 3 stood from before", last, StringComparison.Ordinal);
        Support.AreEqual(history.Estimates, Path.Combine(folder, "estimates"));
    }

    [Theory]
    [InlineData("time,feed_flow_kg_s\n2031-03-04T00:00:00Z,4.8\n", "there is no column 'feed_temperature_degC'; there are 'time', 'feed_flow_kg_s'")]
    [InlineData("time,{columns}\n2031-03-04T00:00:00,4.8,168,92,9.2,41\n", "row 2: '2031-03-04T00:00:00' is no time like 2031-03-04T00:00:00Z")]
    [InlineData("time,{columns}\n2031-03-04T00:00:00Z,4.8,168,92,9.2,41\n2031-03-04T00:00:01Z,4.8,16", "")]
    [InlineData("time,{columns}\n", "there is no row in it")]
    [InlineData("time,{columns}\n2031-03-04T00:00:00+02:00,4.8,168,92,9.2,41\n", "row 1 is of 2031-03-03T22:00:00Z, not of day=2031-03-04")]
    public async Task Run_BadCsv_IsReportedAndSkipped(string text, string expected)
    {
        string folder = history.Fresh(), file = Path.Combine(folder, "history", "day=2031-03-04", "pass=1", "readings.csv");
        Directory.CreateDirectory(Path.GetDirectoryName(file)!);
        await File.WriteAllTextAsync(file, text.Replace("{columns}", "feed_flow_kg_s,feed_temperature_degC,firing_pct,outlet_pressure_MPa_abs,differential_kPa", StringComparison.Ordinal));
        (int code, _, string error) = await Support.RunAsync("run", folder, "--generator", history.Generator);
        Assert.Equal(3, code);
        Assert.StartsWith("day=2031-03-04/pass=1: readings.csv: " + expected, Assert.Single(error.TrimEnd().Split('\n')), StringComparison.Ordinal);
    }

    // Single, integer and gappy columns are numbers too; words among CSV numbers are missing values.
    [Fact]
    public async Task Read_OtherKindsOfNumber_AreTheSameNumbers()
    {
        string folder = history.Fresh(), parquet = Path.Combine(folder, "a.parquet"), csv = Path.Combine(folder, "a.csv");
        DateTime[] times = [.. Enumerable.Range(0, 5).Select(static i => new DateTime(2031, 3, 4, 0, 0, i, DateTimeKind.Utc))];
        OtherParquet.Write(
            parquet,
            2,
            5,
            (new ParquetSharp.Column<ParquetSharp.DateTimeNanos>("time", ParquetSharp.LogicalType.Timestamp(isAdjustedToUtc: true, ParquetSharp.TimeUnit.Nanos)), times.Select(static time => new ParquetSharp.DateTimeNanos(time)).ToArray()),
            (new ParquetSharp.Column<float>("a"), new[] { 0.5f, 1.5f, 2.5f, 3.5f, 4.5f }),
            (new ParquetSharp.Column<int?>("b"), new int?[] { 1, null, 3, null, 5 }),
            (new ParquetSharp.Column<long>("c"), new[] { 1L, 2, 3, 4, 5 }));
        await File.WriteAllTextAsync(csv, "b,c,time,a\n1,1,2031-03-04T00:00:00Z,0.5\nout of service,2,2031-03-04T00:00:01.000Z,1.5\n3,3,2031-03-04 00:00:02Z,2.5\n,4,2031-03-04T01:00:03+01:00,3.5\n5,5,2031-03-04T00:00:04Z,4.5\n");
        foreach (string file in new[] { parquet, csv })
        {
            Reading.Block block = new(3);
            List<(DateTime, double, double, double)> rows = [];
            await using Reading.TableReader reader = await Reading.TableReader.OpenAsync(file, ["a", "b", "c"], CancellationToken.None);
            while (await reader.NextAsync(block, CancellationToken.None)) rows.AddRange(Enumerable.Range(0, block.Count).Select(i => (block.Times[i], block.Columns[0][i], block.Columns[1][i], block.Columns[2][i])));
            Assert.Equal([(times[0], 0.5, 1, 1), (times[1], 1.5, double.NaN, 2), (times[2], 2.5, 3, 3), (times[3], 3.5, double.NaN, 4), (times[4], 4.5, 5, 5)], rows);
        }
    }

    private static void Damage(string history)
    {
        string truncated = Of(history, "2031-03-05", "1"), wrong = Of(history, "2031-03-06", "2"), empty = Of(history, "2031-03-04", "3"), otherDay = Of(history, "2031-03-07", "3"), lacking = Of(history, "2031-03-08", "2");
        File.WriteAllBytes(truncated, File.ReadAllBytes(truncated)[..2000]);
        DateTime[] times = OtherParquet.Read<DateTime>(wrong, "time");
        OtherParquet.Write(
            wrong,
            1000,
            times.Length,
            (new ParquetSharp.Column<DateTime>("time", ParquetSharp.LogicalType.Timestamp(isAdjustedToUtc: true, ParquetSharp.TimeUnit.Micros)), times),
            (new ParquetSharp.Column<string>("feed_flow_kg_s"), times.Select(static _ => "4.8 kg/s").ToArray()));
        File.Delete(empty);
        File.WriteAllText(Path.ChangeExtension(empty, ".csv"), "");
        File.Copy(Of(history, "2031-03-08", "3"), otherDay, overwrite: true);
        Directory.Delete(Path.GetDirectoryName(lacking)!, recursive: true);
    }

    private static void AreGaps(string estimates)
    {
        string gap = Estimates("2031-03-05", "1");
        Assert.Equal([new DateTime(2031, 3, 5, 0, 0, 0, DateTimeKind.Utc)], OtherParquet.Read<DateTime>(gap, "time"));
        Assert.StartsWith("readings.parquet: not a parquet file", OtherParquet.Read<string>(gap, "gap").Single(), StringComparison.Ordinal);
        Assert.Equal(["Unknown"], OtherParquet.Read<string>(gap, "trust"));
        Assert.Equal([null], OtherParquet.Read<float?>(gap, "quality_estimated"));
        Assert.Equal("no file", OtherParquet.Read<string>(Estimates("2031-03-08", "2"), "gap").Single());
        Assert.Equal(720, OtherParquet.Read<float?>(Estimates("2031-03-06", "1"), "quality_estimated").Length);

        string Estimates(string day, string pass) => Path.Combine(estimates, $"day={day}", $"pass={pass}", "estimates.parquet");
    }

    private static string Of(string history, string day, string pass) => Path.Combine(history, $"day={day}", $"pass={pass}", "readings.parquet");
}
