namespace TwoPhase.Benchmarks.Ratios;

/// <summary>What times are divided by, so that numbers from unlike machines can be compared.</summary>
internal static class Yardsticks
{
    private const int PowCalls = 4096;
    private const int Samples = 1 << 22;

    private static readonly double[] Bases = Fill(PowCalls, 0.5, 20);
    private static readonly double[] Exponents = Fill(PowCalls, -3, 3, 2);
    private static readonly double[][] Streams = [.. Enumerable.Range(0, 5).Select(seed => Fill(Samples, 0, 1, seed))];

    /// <summary>P: one <see cref="Math.Pow(double, double)"/> of random reals.</summary>
    public static RatioCase P { get; } = new("P: one Math.Pow of random reals", PowCalls, () =>
    {
        double sum = 0;
        for (int i = 0; i < Bases.Length; i++) sum += Math.Pow(Bases[i], Exponents[i]);
        return sum;
    });

    /// <summary>W: per sample, four doubles read from memory and one written.</summary>
    public static RatioCase W { get; } = new("W: four doubles in, one out, per sample", Samples, () =>
    {
        double[] a = Streams[0], b = Streams[1], c = Streams[2], d = Streams[3], into = Streams[4];
        int width = System.Numerics.Vector<double>.Count;
        for (int i = 0; i < into.Length; i += width)
        {
            System.Numerics.Vector<double> sum = new System.Numerics.Vector<double>(a, i) + new System.Numerics.Vector<double>(b, i)
                + new System.Numerics.Vector<double>(c, i) + new System.Numerics.Vector<double>(d, i);
            sum.CopyTo(into, i);
        }

        return into[^1];
    });

    /// <summary>Random numbers between two limits, the same for a seed in every run.</summary>
    public static double[] Fill(int count, double low, double high, int seed = 20260)
    {
        var random = new Random(seed);
        var values = new double[count];
        for (int i = 0; i < count; i++) values[i] = low + ((high - low) * random.NextDouble());
        return values;
    }
}
