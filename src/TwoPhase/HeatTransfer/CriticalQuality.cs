using System.Globalization;
using TwoPhase.Flow;
using UnitsNet;

namespace TwoPhase.HeatTransfer;

/// <summary>Where the wall dries out, as a quality: the mean of the perimeter, and the top and the bottom of the tube.</summary>
/// <remarks>
/// <para>Values are as computed, never clamped: above 1 the wall stays wet up to dry steam, below 0 the top is never wetted.</para>
/// <para>Advisory: when <see cref="IsIndicatorOnly"/> is true the value may rank tubes and show trends, no more.</para>
/// </remarks>
public readonly struct CriticalQuality : IEquatable<CriticalQuality>
{
    private readonly double _mean;
    private readonly double _spread;

    internal CriticalQuality(double mean, double spread, Applicability applicability) =>
        (_mean, _spread, Applicability) = (mean, spread, applicability);

    /// <summary>Mean critical quality of the perimeter [kg/kg]; above 1 when the wall stays wet up to dry steam.</summary>
    public MassFraction Mean => MassFraction.FromDecimalFractions(_mean);

    /// <summary>Critical quality at the top of the tube, the first to dry [kg/kg]; may lie below 0 or above 1.</summary>
    public MassFraction Top => MassFraction.FromDecimalFractions(_mean - (_spread / 2));

    /// <summary>Critical quality at the bottom of the tube, the last to dry [kg/kg]; may lie above 1.</summary>
    public MassFraction Bottom => MassFraction.FromDecimalFractions(_mean + (_spread / 2));

    /// <summary>Whether the flow lies inside the published range of the model; never checked in a default value.</summary>
    public Applicability Applicability { get; }

    /// <summary>True unless the flow lies inside the published range: then an indicator, not a limit, and never an alarm.</summary>
    public bool IsIndicatorOnly => !Applicability.IsInside;

    /// <inheritdoc/>
    public bool Equals(CriticalQuality other) =>
        _mean.Equals(other._mean) && _spread.Equals(other._spread) && Applicability.Equals(other.Applicability);

    /// <inheritdoc/>
    public override bool Equals(object? obj) => obj is CriticalQuality other && Equals(other);

    /// <inheritdoc/>
    public override int GetHashCode() => (_mean.GetHashCode() * 397) ^ _spread.GetHashCode();

    /// <summary>Whether two results are equal.</summary>
    public static bool operator ==(CriticalQuality left, CriticalQuality right) => left.Equals(right);

    /// <summary>Whether two results differ.</summary>
    public static bool operator !=(CriticalQuality left, CriticalQuality right) => !left.Equals(right);

    internal object ToDump() => ToString();

    /// <summary>The three qualities in per cent and the finding on the range, invariant culture.</summary>
    public override string ToString() => string.Format(
        CultureInfo.InvariantCulture,
        "critical quality {0:F1} % (top {1:F1} %, bottom {2:F1} %), {3}",
        _mean * 100,
        (_mean - (_spread / 2)) * 100,
        (_mean + (_spread / 2)) * 100,
        IsIndicatorOnly ? "indicator only, " + Applicability : Applicability.ToString());
}
