using System.Diagnostics;
using System.Globalization;

namespace TwoPhase.Benchmarks.Ratios;

/// <summary>
/// Times cases against yardsticks in one process, interleaved round by round, and keeps the best round of each: what other
/// work on the machine disturbs, it disturbs for both.
/// </summary>
internal static class RatioReport
{
    private const int Rounds = 41;
    private const double SecondsPerTrial = 0.005;

    public static void Print(IEnumerable<IRatioSuite> suites)
    {
        Console.WriteLine($"Processor: {Processor()}; .NET {Environment.Version}; best of {Rounds} interleaved rounds.");
        foreach (IRatioSuite suite in suites) Print(suite);
    }

    private static void Print(IRatioSuite suite)
    {
        RatioCase[] cases = [.. suite.Cases()];
        RatioCase[] all = [.. cases.Select(one => one.Yardstick).OfType<RatioCase>().Distinct(), .. cases];
        Dictionary<RatioCase, double> nanoseconds = Measure([.. all.Distinct()]);

        Console.WriteLine();
        Console.WriteLine($"## {suite.Name}");
        Console.WriteLine();
        Console.WriteLine("| what | ns per call | ratio | target | bytes per call |");
        Console.WriteLine("|---|---|---|---|---|");
        foreach (RatioCase one in all.Distinct()) Console.WriteLine(Row(one, nanoseconds));
        if (suite.Cold is not null) Console.WriteLine(ColdStart.Row(suite));
    }

    private static string Row(RatioCase one, Dictionary<RatioCase, double> nanoseconds)
    {
        string ratio = one.Yardstick is null ? "" : Text(nanoseconds[one] / nanoseconds[one.Yardstick]) + " " + one.Yardstick.What.Split(':')[0];
        string target = one.Target is null ? "" : "≤ " + Text(one.Target.Value);
        return $"| {one.What} | {Text(nanoseconds[one])} | {ratio} | {target} | {Text(Bytes(one))} |";
    }

    private static Dictionary<RatioCase, double> Measure(RatioCase[] cases)
    {
        // Through tier-1 compilation first: it happens in the background, some tenths of a second after thirty calls.
        for (int pass = 0; pass < 4; pass++)
        {
            foreach (RatioCase one in cases) Seconds(one, 0.02);
            Thread.Sleep(150);
        }

        var best = cases.ToDictionary(one => one, _ => double.PositiveInfinity);
        for (int round = 0; round < Rounds; round++)
        {
            foreach (RatioCase one in cases) best[one] = Math.Min(best[one], Seconds(one, SecondsPerTrial) * 1e9);
        }

        return best;
    }

    // Seconds per call, over as many runs of the loop as fill the time, one at least.
    private static double Seconds(RatioCase one, double atLeast)
    {
        long runs = 0;
        double sum = 0;
        long start = Stopwatch.GetTimestamp();
        TimeSpan elapsed;
        do
        {
            sum += one.Run();
            runs++;
            elapsed = Stopwatch.GetElapsedTime(start);
        }
        while (elapsed.TotalSeconds < atLeast);

        if (double.IsNaN(sum)) throw new InvalidOperationException($"'{one.What}' returns NaN.");
        return elapsed.TotalSeconds / (runs * one.Calls);
    }

    private static double Bytes(RatioCase one)
    {
        long before = GC.GetAllocatedBytesForCurrentThread();
        one.Run();
        return (double)(GC.GetAllocatedBytesForCurrentThread() - before) / one.Calls;
    }

    private static string Text(double value) => value.ToString("G3", CultureInfo.InvariantCulture);

    private static string Processor()
    {
        const string file = "/proc/cpuinfo";
        string? line = File.Exists(file) ? File.ReadLines(file).FirstOrDefault(text => text.StartsWith("model name", StringComparison.Ordinal)) : null;
        return line?.Split(':')[1].Trim() ?? Environment.GetEnvironmentVariable("PROCESSOR_IDENTIFIER") ?? "unknown";
    }
}
