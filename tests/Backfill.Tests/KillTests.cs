using System.Diagnostics;

namespace Backfill.Tests;

[Collection(InventedHistory.Name)]
public sealed class KillTests(InventedHistory history)
{
    // At random moments of starting up, planning and working; a run that gets to its end before it is killed must be right too, and another is begun.
    [Fact]
    public async Task Run_KilledTenTimes_EndsWithTheBytesOfAnUninterruptedRun()
    {
        var random = new Random(20310304);
        string output = Path.Combine(history.Fresh(), "out");
        int kills = 0, halfDone = 0;
        while (kills < 10)
        {
            using Process process = Support.Start("run", history.Folder, "--out", output, "--threads", "2");
            int partitions = Partitions(output) + random.Next(3);
            while (!process.HasExited && Partitions(output) < partitions) await Task.Delay(1);
            await Task.Delay(random.Next(Partitions(output) < partitions + 1 ? 250 : 25));
            process.Kill();
            await process.WaitForExitAsync();
            if (process.ExitCode == 0)
            {
                Support.AreEqual(history.Estimates, output);
                Directory.Delete(output, recursive: true);
                continue;
            }

            kills++;
            if (Directory.Exists(output) && Directory.EnumerateDirectories(output, "*.partial", SearchOption.AllDirectories).Any()) halfDone++;
        }

        Assert.True(halfDone > 0, "No kill met a partition at work.");
        (int code, _, string error) = await Support.RunAsync("run", history.Folder, "--out", output, "--threads", "2");
        Assert.Equal((0, ""), (code, error));
        Support.AreEqual(history.Estimates, output);
    }

    private static int Partitions(string output) =>
        Directory.Exists(output) ? Directory.EnumerateDirectories(output, "day=*").Sum(static day => Directory.EnumerateDirectories(day, "pass=*").Count()) : 0;
}
