using System.Globalization;
using MathNet.Numerics.Distributions;
using MathNet.Numerics.Statistics;
using TwoPhase.Numerics;
using TwoPhase.Units;

namespace TwoPhase.Uncertainty;

/// <summary>One input quantity of a measurement: its estimate and what is known about the error of that estimate.</summary>
/// <remarks>
/// <para>Numbers are in the caller's own unit, the same one that the measurement function expects; <see cref="Unit"/> labels it in tables.</para>
/// <para>Source: JCGM 100:2008, clause 4 (standard uncertainties of types A and B); JCGM 101:2008, clause 6.4 (distributions).</para>
/// </remarks>
public sealed class UncertainInput
{
    /// <summary>An input known by estimate and standard uncertainty; normal where a distribution is needed.</summary>
    /// <param name="name">The name that the measurement function and the tables use.</param>
    /// <param name="estimate">x, the best value.</param>
    /// <param name="standardUncertainty">u(x), one standard deviation (k = 1), not negative; 0 for an exact number.</param>
    /// <exception cref="ArgumentException"><paramref name="name"/> is empty.</exception>
    /// <exception cref="ArgumentOutOfRangeException">A value is not finite, or the uncertainty is negative.</exception>
    public UncertainInput(string name, double estimate, double standardUncertainty)
        : this(
            name,
            Require.Finite(estimate, "Estimate", Scale.None, nameof(estimate)),
            Require.NotNegative(standardUncertainty, "Standard uncertainty", Scale.None, nameof(standardUncertainty)),
            double.PositiveInfinity,
            "",
            null)
    {
    }

    private UncertainInput(string name, double estimate, double standardUncertainty, double degreesOfFreedom, string unit, IContinuousDistribution? distribution)
    {
        if (string.IsNullOrWhiteSpace(name)) throw new ArgumentException("An input needs a name.", nameof(name));
        Name = name;
        Estimate = estimate;
        StandardUncertainty = standardUncertainty;
        DegreesOfFreedom = degreesOfFreedom;
        Unit = unit;
        Distribution = distribution;
    }

    /// <summary>The name that the measurement function and the tables use.</summary>
    public string Name { get; }

    /// <summary>x, in the caller's unit.</summary>
    public double Estimate { get; }

    /// <summary>u(x), one standard deviation (k = 1), in the caller's unit.</summary>
    public double StandardUncertainty { get; }

    /// <summary>ν, degrees of freedom of the uncertainty itself; infinity when it is taken as exactly known.</summary>
    public double DegreesOfFreedom { get; }

    /// <summary>Label of the unit in tables; may be empty.</summary>
    public string Unit { get; }

    /// <summary>The distribution that Monte Carlo draws from; null for the normal one, or Student's t when ν is finite.</summary>
    public IContinuousDistribution? Distribution { get; }

    /// <summary>An input with a distribution of its own, any continuous one of MathNet.Numerics that has a mean and a variance.</summary>
    /// <param name="name">The name that the measurement function and the tables use.</param>
    /// <param name="distribution">The distribution of the value. Its random source is not used: trials draw from the seed given to them.</param>
    /// <exception cref="ArgumentException">The distribution has no finite mean or standard deviation.</exception>
    public static UncertainInput FromDistribution(string name, IContinuousDistribution distribution)
    {
        Require.NotNull(distribution, nameof(distribution));
        var (mean, deviation) = Moments(distribution);
        return Fast.IsFinite(mean) && Fast.IsFinite(deviation)
            ? new(name, mean, deviation, double.PositiveInfinity, "", distribution)
            : throw new ArgumentException($"The distribution of {name}, {distribution}, has no finite mean and standard deviation.", nameof(distribution));
    }

    private static (double Mean, double Deviation) Moments(IContinuousDistribution distribution)
    {
        try { return (distribution.Mean, distribution.StdDev); }
        catch (NotSupportedException) { return (double.NaN, double.NaN); }   // how MathNet says that there is none
    }

    /// <summary>An input known only by bounds: any value between them is as likely as another, u = half-width/√3.</summary>
    /// <param name="name">The name that the measurement function and the tables use.</param>
    /// <param name="low">Lower bound.</param>
    /// <param name="high">Upper bound, above the lower.</param>
    /// <exception cref="ArgumentOutOfRangeException">The bounds are not finite or not in order.</exception>
    public static UncertainInput FromBounds(string name, double low, double high)
    {
        Require.Finite(low, "Lower bound", Scale.None, nameof(low));
        Require.Finite(high, "Upper bound", Scale.None, nameof(high));
        Require.Below(low, high, "Lower bound", Scale.None, nameof(low));
        return FromDistribution(name, new ContinuousUniform(low, high));
    }

    /// <summary>An input with an expanded uncertainty from a certificate: u = U/k.</summary>
    /// <param name="name">The name that the measurement function and the tables use.</param>
    /// <param name="estimate">x.</param>
    /// <param name="expandedUncertainty">U, not negative.</param>
    /// <param name="coverageFactor">k, greater than zero; 2 on most certificates.</param>
    public static UncertainInput FromExpanded(string name, double estimate, double expandedUncertainty, double coverageFactor) =>
        new(name, estimate, expandedUncertainty / Require.Positive(coverageFactor, "Coverage factor k", Scale.None, nameof(coverageFactor)));

    /// <summary>An input from repeated independent observations (type A): mean, u = s/√n, ν = n − 1.</summary>
    /// <param name="name">The name that the measurement function and the tables use.</param>
    /// <param name="observations">At least two observations.</param>
    /// <exception cref="ArgumentException">Fewer than two observations.</exception>
    public static UncertainInput FromObservations(string name, IEnumerable<double> observations)
    {
        double[] values = [.. Require.NotNull(observations, nameof(observations))];
        if (values.Length < 2) throw new ArgumentException($"{values.Length} observations of {name}; a spread needs at least 2.", nameof(observations));
        var (mean, deviation) = ArrayStatistics.MeanStandardDeviation(values);
        return new UncertainInput(name, mean, deviation / Math.Sqrt(values.Length)).WithDegreesOfFreedom(values.Length - 1);
    }

    /// <summary>The same input with a unit label.</summary>
    /// <param name="unit">Label, for example "kPa".</param>
    public UncertainInput WithUnit(string unit) =>
        new(Name, Estimate, StandardUncertainty, DegreesOfFreedom, Require.NotNull(unit, nameof(unit)), Distribution);

    /// <summary>The same input with degrees of freedom of its uncertainty; Monte Carlo then draws a scaled and shifted t (JCGM 101, 6.4.9.7).</summary>
    /// <param name="degreesOfFreedom">ν, greater than zero; ν = ½·(Δu/u)^−2 for an uncertainty trusted to the relative doubt Δu/u (JCGM 100, G.3).</param>
    public UncertainInput WithDegreesOfFreedom(double degreesOfFreedom) =>
        degreesOfFreedom > 0
            ? new(Name, Estimate, StandardUncertainty, degreesOfFreedom, Unit, Distribution)
            : throw Require.OutOfRange(degreesOfFreedom, "Degrees of freedom ν", Scale.None, nameof(degreesOfFreedom), "must be greater than zero");

    internal object ToDump() => ToString();

    /// <summary>The input in one line.</summary>
    public override string ToString() =>
        string.Format(CultureInfo.InvariantCulture, "{0} = {1:G6} ± {2:G3}{3}{4} (k = 1)", Name, Estimate, StandardUncertainty, Unit.Length == 0 ? "" : " ", Unit);
}
