using System.Globalization;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Limits;

/// <summary>A limit on something dissolved that does not leave with the steam: what the feed brings and what the outlet water may hold.</summary>
/// <remarks>
/// <para>Concentration factor of the outlet water = 1/(1 − x), so the limit is met up to x = 1 − feed/limit.</para>
/// <para>x outlet quality [kg/kg]; both concentrations of cold water, per litre or per kilogram alike.</para>
/// <para>Range: 0 ≤ x &lt; 1, what does not evaporate and has not fallen out on the way. Accuracy: exact for such solids; silica dissolves
/// in steam a little, hardness falls out as scale before it is seen.</para>
/// <para>Source: mass balance; that four to five times is the usual concentration: Fanaritis and Kimmel, J. Pet. Tech. 17(4), 409-416 (1965).</para>
/// </remarks>
public sealed class SolidsLimit
{
    private static readonly Scale MilligramsPerLitre = new("mg/L", 1e3);

    private readonly double _feed, _limit;   // kg/m³

    /// <summary>A limit of your own.</summary>
    /// <param name="name">What is dissolved.</param>
    /// <param name="feed">Concentration in the feed, not negative.</param>
    /// <param name="limit">Greatest concentration in the outlet water, greater than zero.</param>
    /// <exception cref="ArgumentOutOfRangeException">A concentration is outside its limits.</exception>
    public SolidsLimit(string name, MassConcentration feed, MassConcentration limit)
    {
        Name = string.IsNullOrWhiteSpace(name) ? throw new ArgumentException("A solids limit needs a name.", nameof(name)) : name;
        _feed = Require.NotNegative(feed.Si(), $"Feed concentration of '{name}'", MilligramsPerLitre, nameof(feed));
        _limit = Require.Positive(limit.Si(), $"Limit of '{name}'", MilligramsPerLitre, nameof(limit));
    }

    /// <summary>What is dissolved.</summary>
    public string Name { get; }

    /// <summary>Concentration in the feed.</summary>
    public MassConcentration Feed => MassConcentration.FromKilogramsPerCubicMeter(_feed);

    /// <summary>Greatest concentration in the outlet water.</summary>
    public MassConcentration Limit => MassConcentration.FromKilogramsPerCubicMeter(_limit);

    /// <summary>Greatest outlet quality that meets the limit: 1 − feed/limit; negative where the feed alone exceeds it.</summary>
    public MassFraction GreatestQuality => MassFraction.FromDecimalFractions(RawGreatestQuality);

    internal double RawGreatestQuality => 1 - (_feed / _limit);

    /// <summary>Total dissolved solids.</summary>
    /// <param name="feed">Concentration in the feed.</param>
    /// <param name="limit">Greatest concentration in the outlet water.</param>
    public static SolidsLimit Dissolved(MassConcentration feed, MassConcentration limit) => new("dissolved solids", feed, limit);

    /// <summary>Silica.</summary>
    /// <param name="feed">Concentration in the feed.</param>
    /// <param name="limit">Greatest concentration in the outlet water.</param>
    public static SolidsLimit Silica(MassConcentration feed, MassConcentration limit) => new("silica", feed, limit);

    /// <summary>Hardness, counted as calcium carbonate.</summary>
    /// <param name="feed">Concentration in the feed.</param>
    /// <param name="limit">Greatest concentration in the outlet water.</param>
    public static SolidsLimit Hardness(MassConcentration feed, MassConcentration limit) => new("hardness", feed, limit);

    /// <summary>Concentration in the outlet water at a quality: feed/(1 − x).</summary>
    /// <param name="quality">x, 0 to below 1.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="quality"/> leaves no water, or is negative.</exception>
    public MassConcentration ConcentrationAt(MassFraction quality)
    {
        double x = Require.NotNegative(quality.Si(), "Quality x", Scale.None, nameof(quality));
        return MassConcentration.FromKilogramsPerCubicMeter(_feed / (1 - Require.Below(x, 1, "Quality x", Scale.None, nameof(quality))));
    }

    internal string TextAt(double quality) => string.Format(
        CultureInfo.InvariantCulture, "{0} of {1} in the outlet water, concentrated {2:F2} times", MilligramsPerLitre.Text(_feed / (1 - quality), "G4"), MilligramsPerLitre.Text(_limit, "G4"), 1 / (1 - quality));

    internal object ToDump() => ToString();

    /// <summary>Name, feed and limit, invariant culture.</summary>
    public override string ToString() => $"{Name}: {MilligramsPerLitre.Text(_feed, "G4")} in the feed, {MilligramsPerLitre.Text(_limit, "G4")} at the outlet";
}
