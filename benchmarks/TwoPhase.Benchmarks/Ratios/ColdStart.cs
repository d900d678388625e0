using System.Diagnostics;
using System.Globalization;

namespace TwoPhase.Benchmarks.Ratios;

/// <summary>The first call of a fresh process against its own steady state; a child process for each trial.</summary>
internal static class ColdStart
{
    private const int Trials = 5;
    private const int SteadyCalls = 60;

    /// <summary>The child's part: writes the first call's time and the steady one, in milliseconds.</summary>
    public static void MeasureHere(string suite)
    {
        (_, Action call) = RatioSuites.Named(suite).Cold ?? throw new ArgumentException($"Suite '{suite}' has no cold case.", nameof(suite));
        double first = Milliseconds(call);
        double steady = double.PositiveInfinity;
        for (int i = 0; i < SteadyCalls; i++)
        {
            Thread.Sleep(10);
            steady = Math.Min(steady, Milliseconds(call));
        }

        Console.WriteLine(string.Create(CultureInfo.InvariantCulture, $"{first} {steady}"));
    }

    public static string Row(IRatioSuite suite)
    {
        (double First, double Steady)[] trials = [.. Enumerable.Range(0, Trials).Select(_ => Trial(suite.Name))];
        double first = trials.Min(trial => trial.First), steady = trials.Min(trial => trial.Steady);
        return string.Create(CultureInfo.InvariantCulture, $"| {suite.Cold!.Value.What} | {first * 1e6:G3} | {first / steady:G3} of the steady {steady:G3} ms | ≤ 2 | |");
    }

    private static (double First, double Steady) Trial(string suite)
    {
        var start = new ProcessStartInfo(Environment.ProcessPath!) { RedirectStandardOutput = true };
        if (Path.GetFileNameWithoutExtension(start.FileName) == "dotnet") start.ArgumentList.Add(typeof(ColdStart).Assembly.Location);
        start.ArgumentList.Add("cold");
        start.ArgumentList.Add(suite);
        using Process child = Process.Start(start)!;
        string[] numbers = child.StandardOutput.ReadToEnd().Split((char[]?)null, StringSplitOptions.RemoveEmptyEntries);
        child.WaitForExit();
        return (double.Parse(numbers[0], CultureInfo.InvariantCulture), double.Parse(numbers[1], CultureInfo.InvariantCulture));
    }

    private static double Milliseconds(Action call)
    {
        long start = Stopwatch.GetTimestamp();
        call();
        return Stopwatch.GetElapsedTime(start).TotalMilliseconds;
    }
}
