using System.Globalization;
using MathNet.Numerics.Statistics;

namespace TwoPhase.Uncertainty;

/// <summary>The distribution of a result as trials have drawn it.</summary>
/// <remarks>Source: JCGM 101:2008, 7.6 (estimate and standard uncertainty) and 7.7 (coverage intervals).</remarks>
public sealed class MonteCarloResult
{
    private readonly double[] _sorted;

    internal MonteCarloResult(double[] results, int trials, bool settled = true)
    {
        (Mean, StandardUncertainty) = ArrayStatistics.MeanStandardDeviation(results);
        _sorted = (double[])results.Clone();
        Array.Sort(_sorted);
        Trials = trials;
        Settled = settled;
    }

    /// <summary>Average of the trials. It differs from the result at the estimates when the function is not linear.</summary>
    public double Mean { get; }

    /// <summary>u(y), standard deviation of the trials.</summary>
    public double StandardUncertainty { get; }

    /// <summary>Number of trials.</summary>
    public int Trials { get; }

    /// <summary>False when an adaptive run reached its limit before the digits asked for had settled.</summary>
    public bool Settled { get; }

    /// <summary>The results of the trials in ascending order.</summary>
    public IReadOnlyList<double> Sorted => Array.AsReadOnly(_sorted);

    /// <summary>The interval that leaves as much probability below it as above it.</summary>
    /// <param name="coverageProbability">p, between 0 and 1; 0.95 by default.</param>
    public CoverageInterval SymmetricInterval(double coverageProbability = 0.95)
    {
        int covered = Covered(coverageProbability);
        int low = (_sorted.Length - covered) / 2;
        return new(_sorted[low], _sorted[Math.Min(low + covered, _sorted.Length - 1)], coverageProbability);
    }

    /// <summary>The shortest of all intervals of that probability; what to state when the distribution is lopsided.</summary>
    /// <param name="coverageProbability">p, between 0 and 1; 0.95 by default.</param>
    public CoverageInterval ShortestInterval(double coverageProbability = 0.95)
    {
        int covered = Covered(coverageProbability), best = 0;
        for (int low = 1; low + covered < _sorted.Length; low++)
            if (_sorted[low + covered] - _sorted[low] < _sorted[best + covered] - _sorted[best]) best = low;
        return new(_sorted[best], _sorted[best + covered], coverageProbability);
    }

    // q = p·M, rounded; an interval is y(r) to y(r + q).
    private int Covered(double coverageProbability) =>
        Math.Min((int)Math.Round(CoverageInterval.Probability(coverageProbability) * _sorted.Length), _sorted.Length - 1);

    internal object ToDump() => ToString();

    /// <summary>The result in one line.</summary>
    public override string ToString() =>
        string.Format(CultureInfo.InvariantCulture, "{0:G6}, u = {1:G4}, {2}, {3} trials", Mean, StandardUncertainty, SymmetricInterval(), Trials);
}
