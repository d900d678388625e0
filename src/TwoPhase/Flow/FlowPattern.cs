using System.Globalization;

namespace TwoPhase.Flow;

/// <summary>The flow pattern in a horizontal or slightly inclined tube by Taitel and Dukler (1976), with how far it is from stratifying.</summary>
/// <remarks>
/// <para>Groups: X² = (dp/dz)ls / (dp/dz)gs; F = √(ρg/(ρl − ρg)) jg / √(g D cos θ); K = F √(D jl/νl); T² = (dp/dz)ls / ((ρl − ρg) g cos θ).
/// Level h = hL/D of stratified flow from the balance of both phases' momentum, turbulent both, equal friction at wall and interface:
/// X² ũl² (ũl D̃l)^−0.2 S̃l/Ãl − ũg² (ũg D̃g)^−0.2 (S̃g/Ãg + S̃i/Ãl + S̃i/Ãg) + 4 Y = 0, Y = (ρl − ρg) g sin θ / (dp/dz)gs.</para>
/// <para>Not stratified where F ≥ (1 − h) √(Ãg / (ũg² dÃl/dh)); then annular below h = 0.5, and intermittent or, where T² ≥ 8 Ãg /
/// (S̃i ũl² (ũl D̃l)^−0.2), dispersed bubble above it. Stratified flow is wavy where K ≥ 2 / (√ũl ũg √0.01).</para>
/// <para>(dp/dz)ls, (dp/dz)gs gradient of one phase alone in a smooth tube by <see cref="FrictionFactor.Of"/>; jl, jg superficial
/// velocities [m/s]; θ inclination upwards; areas over D², lengths over D, velocities over superficial ones; νl kinematic viscosity.
/// Where the balance has several roots (upflow) the lowest level is taken.</para>
/// <para>Range: round tubes within 10° of the horizontal, adiabatic, smooth. Steeper tubes are computed and flagged.</para>
/// <para>Accuracy: none stated; boundaries on a regime map are bands, so look at the margins.</para>
/// <para>Source: Taitel and Dukler, AIChE Journal 22(1), 47-55 (1976); the intermittent-annular border at h = 0.5 is that paper's,
/// 0.35 was proposed later.</para>
/// <para>Advisory: a dry tube top overheats; the margin shows where to look, and protects nothing.</para>
/// </remarks>
public readonly partial struct FlowPattern : IEquatable<FlowPattern>
{
    private FlowPattern(FlowRegime regime, double level, double x, double f, double k, double t, in Boundaries boundaries, Applicability applicability)
    {
        Regime = regime;
        Level = level;
        MartinelliParameter = x;
        Froude = f;
        WaveParameter = k;
        DispersionParameter = t;
        StratificationFroude = boundaries.Froude;
        WaveBoundary = boundaries.Wave;
        DispersionBoundary = boundaries.Dispersion;
        Applicability = applicability;
    }

    /// <summary>The pattern.</summary>
    public FlowRegime Regime { get; }

    /// <summary>hL/D, level of the liquid over the bore if the flow were stratified [-], 0 to 1.</summary>
    public double Level { get; }

    /// <summary>X, Lockhart-Martinelli parameter [-]; 0 at x = 1, infinite at x = 0.</summary>
    public double MartinelliParameter { get; }

    /// <summary>F, vapour Froude number [-].</summary>
    public double Froude { get; }

    /// <summary>K, wave parameter [-].</summary>
    public double WaveParameter { get; }

    /// <summary>T, dispersion parameter [-].</summary>
    public double DispersionParameter { get; }

    /// <summary>The F at which this flow would stratify, at its X [-].</summary>
    public double StratificationFroude { get; }

    /// <summary>The K above which stratified flow is wavy, at this X [-].</summary>
    public double WaveBoundary { get; }

    /// <summary>The T above which bubbles stay dispersed, at this X [-].</summary>
    public double DispersionBoundary { get; }

    /// <summary>
    /// F over the F at which the flow would stratify: above 1 the flow wets the whole tube, below 1 its top is dry. As F follows
    /// mass flow at constant quality while X hardly moves, this is about the factor by which the flow may fall. 0 at x = 0, infinite at x = 1.
    /// </summary>
    public double StratificationMargin => Regime switch
    {
        FlowRegime.Vapour => double.PositiveInfinity,
        FlowRegime.Liquid or FlowRegime.None => 0,
        _ => Froude / StratificationFroude,
    };

    /// <summary>True where liquid lies below and vapour above.</summary>
    public bool IsStratified => Regime is FlowRegime.StratifiedSmooth or FlowRegime.StratifiedWavy;

    /// <summary>Whether the flow lies inside the range of the map.</summary>
    public Applicability Applicability { get; }

    /// <inheritdoc/>
    public bool Equals(FlowPattern other) =>
        Regime == other.Regime && Level.Equals(other.Level) && MartinelliParameter.Equals(other.MartinelliParameter)
        && Froude.Equals(other.Froude) && WaveParameter.Equals(other.WaveParameter) && DispersionParameter.Equals(other.DispersionParameter)
        && StratificationFroude.Equals(other.StratificationFroude) && WaveBoundary.Equals(other.WaveBoundary)
        && DispersionBoundary.Equals(other.DispersionBoundary) && Applicability.Equals(other.Applicability);

    /// <inheritdoc/>
    public override bool Equals(object? obj) => obj is FlowPattern other && Equals(other);

    /// <inheritdoc/>
    public override int GetHashCode() => ((int)Regime * 397) ^ Froude.GetHashCode();

    /// <summary>Whether two results are equal.</summary>
    public static bool operator ==(FlowPattern left, FlowPattern right) => left.Equals(right);

    /// <summary>Whether two results differ.</summary>
    public static bool operator !=(FlowPattern left, FlowPattern right) => !left.Equals(right);

    internal object ToDump() => ToString();

    /// <summary>Pattern and margin, invariant culture.</summary>
    public override string ToString() => string.Format(
        CultureInfo.InvariantCulture, "{0}, stratification margin {1:G3}, level {2:F2} of the bore, {3}", Regime, StratificationMargin, Level, Applicability);
}
