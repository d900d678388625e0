using System.Diagnostics;
using System.Globalization;
using System.Runtime;

namespace TwoPhase.Benchmarks.Ratios;

/// <summary>The first call of a fresh process against its own steady state; a child process for each trial.</summary>
internal static class ColdStart
{
    private const int Trials = 5;
    private const int SteadyCalls = 60;

    /// <summary>The child's part: writes the times of the first call, of the compiling in it, of the second and of the steady call, in milliseconds.</summary>
    public static void MeasureHere(string suite)
    {
        (_, Action call) = RatioSuites.Named(suite).Cold ?? throw new ArgumentException($"Suite '{suite}' has no cold case.", nameof(suite));
        double before = JitInfo.GetCompilationTime(currentThread: true).TotalMilliseconds, first = Milliseconds(call);
        double compiling = JitInfo.GetCompilationTime(currentThread: true).TotalMilliseconds - before, second = Milliseconds(call);
        double steady = double.PositiveInfinity;
        for (int i = 0; i < SteadyCalls; i++)
        {
            Thread.Sleep(10);
            steady = Math.Min(steady, Milliseconds(call));
        }

        Console.WriteLine(string.Create(CultureInfo.InvariantCulture, $"{first} {compiling} {second} {steady}"));
    }

    public static string Row(IRatioSuite suite)
    {
        double[][] trials = [.. Enumerable.Range(0, Trials).Select(_ => Trial(suite.Name))];
        double[] quickest = trials.MinBy(trial => trial[0])!;
        double first = quickest[0], compiling = quickest[1], second = trials.Min(trial => trial[2]), steady = trials.Min(trial => trial[3]);
        string what = suite.Cold!.Value.What;
        return string.Create(CultureInfo.InvariantCulture, $"""
            | {what}: first call, compiling and building included | {first * 1e6:G3} | {first / steady:G3} of the steady {steady:G3} ms | | |
            | {what}: first call less its {compiling:G3} ms of compiling | {(first - compiling) * 1e6:G3} | {(first - compiling) / steady:G3} | ≤ 2 | |
            | {what}: second call | {second * 1e6:G3} | {second / steady:G3} | ≤ 2 | |
            """);
    }

    private static double[] Trial(string suite)
    {
        var start = new ProcessStartInfo(Environment.ProcessPath!) { RedirectStandardOutput = true };
        if (Path.GetFileNameWithoutExtension(start.FileName) == "dotnet") start.ArgumentList.Add(typeof(ColdStart).Assembly.Location);
        start.ArgumentList.Add("cold");
        start.ArgumentList.Add(suite);
        using Process child = Process.Start(start)!;
        double[] times = [.. child.StandardOutput.ReadToEnd()
            .Split((char[]?)null, StringSplitOptions.RemoveEmptyEntries)
            .Select(text => double.Parse(text, CultureInfo.InvariantCulture))];
        child.WaitForExit();
        return times;
    }

    private static double Milliseconds(Action call)
    {
        long start = Stopwatch.GetTimestamp();
        call();
        return Stopwatch.GetElapsedTime(start).TotalMilliseconds;
    }
}
