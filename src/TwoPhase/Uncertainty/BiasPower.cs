using MathNet.Numerics.Distributions;
using MathNet.Numerics.LinearAlgebra;
using MathNet.Numerics.Random;

namespace TwoPhase.Uncertainty;

/// <summary>What measurement tests can find: how large a bias must be, for its measurement to be named and not another.</summary>
/// <remarks>
/// <para>With a bias b of measurement j the tests are normal with means b/u(b)·ρij and correlations ρij. A bias is found when the largest test is beyond its critical
/// value and j is among the <see cref="Suspects"/>.</para>
/// <para>Accuracy: by 4000 draws, the same each time: about 1 % of the bias.</para>
/// <para>Source: a true hypothesis is less likely than another by a factor k with probability at most 1/k: Royall, Statistical Evidence (1997), 1.4; tests as in <see cref="LinearReconciliation"/>.</para>
/// </remarks>
internal static class BiasPower
{
    private const int Draws = 4000;
    private const double LikelihoodRatio = 20;
    private const double Alike = 0.99;      // correlation of tests that no bias of interest would tell apart
    private const double Largest = 1000;    // in standard uncertainties of the bias: beyond, it is not found

    /// <summary>The measurements whose bias explains the imbalances nearly as well as that of the best, the best first; empty without redundancy.</summary>
    public static int[] Suspects(LinearReconciliation linear)
    {
        double[] statistics = [.. linear.MeasurementTests.Select(z => z * z)];
        if (!linear.IsRedundant.Any(redundant => redundant)) return [];
        double best = statistics.Max();
        return [.. Enumerable.Range(0, statistics.Length).Where(j => linear.IsRedundant[j] && best - statistics[j] <= Slack).OrderByDescending(j => statistics[j])];
    }

    /// <summary>L/L of the best, from the difference of both statistics.</summary>
    public static double RelativeLikelihood(double test, double best) => Math.Exp(((test * test) - (best * best)) / 2);

    /// <summary>Number of tests that differ: what a critical value for the largest of them must reckon with.</summary>
    public static int DistinctTests(LinearReconciliation linear)
    {
        List<int> kept = [];
        for (int j = 0; j < linear.IsRedundant.Count; j++)
            if (linear.IsRedundant[j] && !kept.Any(k => AreAlike(linear, j, k))) kept.Add(j);
        return kept.Count;
    }

    /// <summary>Whether the balances can hardly tell a bias of one from a bias of the other.</summary>
    public static bool AreAlike(LinearReconciliation linear, int first, int second) => Math.Abs(linear.TestCorrelation(first, second)) > Alike;

    /// <summary>Smallest bias of each measurement that is found with a probability; NaN where none is.</summary>
    public static double[] SmallestBiases(LinearReconciliation linear, double criticalValue, double probability)
    {
        int[] tested = [.. Enumerable.Range(0, linear.IsRedundant.Count).Where(j => linear.IsRedundant[j])];
        double[] smallest = [.. Enumerable.Repeat(double.NaN, linear.IsRedundant.Count)];
        if (tested.Length == 0) return smallest;

        Matrix<double> correlation = Matrix<double>.Build.Dense(tested.Length, tested.Length, (i, j) => linear.TestCorrelation(tested[i], tested[j]));
        double[][] noise = Noise(correlation);
        for (int j = 0; j < tested.Length; j++)
            smallest[tested[j]] = Smallest(size => Found(noise, correlation, j, size, criticalValue) >= probability) * linear.Biases[tested[j]].StandardUncertainty;
        return smallest;
    }

    private static double Slack => 2 * Math.Log(LikelihoodRatio);

    private static double[][] Noise(Matrix<double> correlation)
    {
        var spectrum = correlation.Evd(Symmetricity.Symmetric);
        Vector<double> roots = spectrum.EigenValues.Map(value => Math.Sqrt(Math.Max(value.Real, 0)));
        Matrix<double> factor = spectrum.EigenVectors * Matrix<double>.Build.DenseOfDiagonalVector(roots);
        double[] independent = new double[correlation.RowCount];
        MersenneTwister stream = new(1, threadSafe: false);
        double[][] noise = new double[Draws][];
        for (int draw = 0; draw < Draws; draw++)
        {
            Normal.Samples(stream, independent, 0, 1);
            noise[draw] = (factor * Vector<double>.Build.Dense(independent)).ToArray();
        }

        return noise;
    }

    private static double Found(double[][] noise, Matrix<double> correlation, int biased, double size, double criticalValue)
    {
        double[] mean = (size * correlation.Column(biased)).ToArray();
        int found = 0;
        foreach (double[] draw in noise)
        {
            double own = Square(draw[biased] + mean[biased]), best = own;
            for (int k = 0; k < draw.Length; k++) best = Math.Max(best, Square(draw[k] + mean[k]));
            if (best > criticalValue * criticalValue && best - own <= Slack) found++;
        }

        return (double)found / noise.Length;

        static double Square(double z) => z * z;
    }

    private static double Smallest(Func<double, bool> isFound)
    {
        double low = 0, high = 4;
        while (!isFound(high))
        {
            (low, high) = (high, 2 * high);
            if (high > Largest) return double.NaN;
        }

        while (high - low > 0.01)
        {
            double middle = (low + high) / 2;
            if (isFound(middle)) high = middle;
            else low = middle;
        }

        return high;
    }
}
