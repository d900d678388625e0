using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Passes;

/// <summary>
/// A heat exchanger between two places of one pass: the feed in one unheated section is warmed by the water of another
/// unheated section further on, so that the first tubes of the convection bank stay above the acid dew point.
/// </summary>
/// <remarks>
/// <para>Both sides are sections of the pass and keep their volume, metal and friction; the exchanged heat is spread evenly along
/// each. The two streams run in counterflow. A by-pass leads part of the feed around the cold side; it mixes behind it.</para>
/// <para>UA: Q = UA ΔTlm with the logarithmic mean of the two end differences. Effectiveness: Q = ε m (h(p, Thot,in) − hcold,in),
/// with m the flow through the cold side; Incropera and DeWitt, Fundamentals of Heat and Mass Transfer, chapter 11.</para>
/// </remarks>
public sealed class FeedInterchanger
{
    private FeedInterchanger(string coldSection, string hotSection, double conductance, double effectiveness, double bypass)
    {
        ColdSection = Require.NotNull(coldSection, nameof(coldSection));
        HotSection = Require.NotNull(hotSection, nameof(hotSection));
        if (coldSection == hotSection) throw new ArgumentException($"The interchanger needs two sections; both sides name '{coldSection}'.", nameof(hotSection));
        WattsPerKelvin = conductance;
        Effectiveness = effectiveness;
        RawBypass = bypass;
    }

    /// <summary>Section whose water is warmed.</summary>
    public string ColdSection { get; }

    /// <summary>Section whose water gives the heat.</summary>
    public string HotSection { get; }

    /// <summary>UA [W/K]; 0 when the interchanger is given by its effectiveness. (UnitsNet has no quantity for it.)</summary>
    public double WattsPerKelvin { get; }

    /// <summary>ε [-]; 0 when the interchanger is given by its UA.</summary>
    public double Effectiveness { get; }

    /// <summary>Share of the feed that by-passes the cold side.</summary>
    public Ratio Bypass => Ratio.FromDecimalFractions(RawBypass);

    internal double RawBypass { get; }

    /// <summary>An interchanger given by its surface and coefficient.</summary>
    /// <param name="coldSection">Section whose water is warmed.</param>
    /// <param name="hotSection">Section whose water gives the heat.</param>
    /// <param name="coefficient">U, overall heat transfer coefficient, greater than zero.</param>
    /// <param name="surface">A, the surface that U is based on, greater than zero.</param>
    /// <exception cref="ArgumentOutOfRangeException">A value is not greater than zero.</exception>
    public static FeedInterchanger FromSurface(string coldSection, string hotSection, HeatTransferCoefficient coefficient, Area surface) => new(
        coldSection,
        hotSection,
        Require.Positive(coefficient.Si(), "Heat transfer coefficient of the interchanger", new Scale("W/(m²·K)", 1), nameof(coefficient))
            * Require.Positive(surface.Si(), "Surface of the interchanger", new Scale("m²", 1), nameof(surface)),
        effectiveness: 0,
        bypass: 0);

    /// <summary>An interchanger given by its effectiveness.</summary>
    /// <param name="coldSection">Section whose water is warmed.</param>
    /// <param name="hotSection">Section whose water gives the heat.</param>
    /// <param name="effectiveness">ε, above 0 and below 1.</param>
    /// <exception cref="ArgumentOutOfRangeException">ε is outside 0 to 1.</exception>
    public static FeedInterchanger FromEffectiveness(string coldSection, string hotSection, double effectiveness) => new(
        coldSection,
        hotSection,
        conductance: 0,
        Require.Below(Require.Positive(effectiveness, "Effectiveness of the interchanger", Scale.None, nameof(effectiveness)), 1, "Effectiveness of the interchanger", Scale.None, nameof(effectiveness)),
        bypass: 0);

    /// <summary>The same with part of the feed led around the cold side.</summary>
    /// <param name="bypass">Share of the feed, 0 to below 1.</param>
    public FeedInterchanger WithBypass(Ratio bypass) => new(
        ColdSection,
        HotSection,
        WattsPerKelvin,
        Effectiveness,
        Require.Below(Require.NotNegative(bypass.Si(), "By-pass of the interchanger", Scale.None, nameof(bypass)), 1, "By-pass of the interchanger", Scale.None, nameof(bypass)));
}
