using MathNet.Numerics;
using MathNet.Numerics.Distributions;
using MathNet.Numerics.Statistics;
using TwoPhase.Uncertainty;

namespace TwoPhase.Passes;

/// <summary>Readings of one thing that should stand still: mean, its uncertainty with neighbouring readings correlated, and whether it drifts.</summary>
/// <remarks>Source: effective number of readings n (1 − r)/(1 + r) with r the lag-one correlation; Bayley and Hammersley, Suppl. J. R. Stat. Soc. 8(2), 184-197 (1946), first-order form.</remarks>
internal readonly struct Series
{
    // Thirds that differ by this many standard errors, and by more than this share of the mean, have drifted.
    private const double DriftErrors = 4, DriftShare = 2e-3;

    public Series(double[] values)
    {
        Mean = values.Mean();
        Deviation = values.Length > 1 ? values.StandardDeviation() : 0;
        // The scatter about the line of best fit: a drift must not pass for noise that is slow.
        double[] scatter = Scatter(values);
        double correlation = Deviation > 0 && values.Length > 3 ? Correlation(scatter) : 0;
        Effective = values.Length * (1 - correlation) / (1 + correlation);
        int third = values.Length / 3;
        if (third < 2) return;
        double change = values.AsSpan(values.Length - third).ToArray().Mean() - values.AsSpan(0, third).ToArray().Mean();
        double error = scatter.StandardDeviation() * Math.Sqrt(2 / (Effective / 3));
        Drifts = Math.Abs(change) > DriftErrors * error && Math.Abs(change) > DriftShare * Math.Abs(Mean);
    }

    public double Mean { get; }

    public double Deviation { get; }

    /// <summary>Readings that count as independent.</summary>
    public double Effective { get; }

    public bool Drifts { get; }

    public double StandardError => Deviation / Math.Sqrt(Effective);

    public CoverageInterval Interval(double probability)
    {
        double half = StudentT.InvCDF(0, 1, Math.Max(Effective - 1, 1), 0.5 + (probability / 2)) * StandardError;
        return new(Mean - half, Mean + half, probability);
    }

    private static double[] Scatter(double[] values)
    {
        if (values.Length < 2) return [0];
        double[] order = [.. Enumerable.Range(0, values.Length).Select(i => (double)i)];
        (double intercept, double slope) = Fit.Line(order, values);
        return [.. values.Select((value, i) => value - intercept - (slope * i))];
    }

    // Not below zero: readings that alternate do not make a mean better than it is.
    private static double Correlation(double[] scatter)
    {
        double sum = 0, square = scatter[0] * scatter[0];
        for (int i = 1; i < scatter.Length; i++)
        {
            square += scatter[i] * scatter[i];
            sum += scatter[i] * scatter[i - 1];
        }

        return square > 0 ? Math.Min(Math.Max(sum / square, 0), 0.99) : 0;
    }
}
