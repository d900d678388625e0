using System.Globalization;
using TwoPhase.Flow;
using UnitsNet;

namespace TwoPhase.Metering;

/// <summary>The quality that total flow, pressure and differential pressure imply at one meter.</summary>
public readonly struct QualityReading : IEquatable<QualityReading>
{
    private readonly double _quality;
    private readonly double _effectiveDensity;

    internal QualityReading(double quality, double effectiveDensity, ReadingStatus status, Applicability applicability)
    {
        _quality = quality;
        _effectiveDensity = effectiveDensity;
        Status = status;
        Applicability = applicability;
    }

    /// <summary>x, steam quality as computed, never clamped; outside 0..1 when <see cref="Status"/> says so; 0 in a default reading.</summary>
    public MassFraction Quality => MassFraction.FromDecimalFractions(_quality);

    internal double QualityCore => _quality;

    /// <summary>ρe, effective density of the wet steam by the model.</summary>
    public Density EffectiveDensity => Density.FromKilogramsPerCubicMeter(_effectiveDensity);

    /// <summary>What the outlet is; <see cref="ReadingStatus.None"/> in a default reading.</summary>
    public ReadingStatus Status { get; }

    /// <summary>Whether meter and model were used inside their published limits, and whether a second quality fits the reading.</summary>
    public Applicability Applicability { get; }

    /// <inheritdoc/>
    public bool Equals(QualityReading other) =>
        _quality.Equals(other._quality) && _effectiveDensity.Equals(other._effectiveDensity) && Status == other.Status && Applicability == other.Applicability;

    /// <inheritdoc/>
    public override bool Equals(object? obj) => obj is QualityReading other && Equals(other);

    /// <inheritdoc/>
    public override int GetHashCode() => (_quality.GetHashCode() * 397) ^ _effectiveDensity.GetHashCode() ^ (int)Status;

    /// <summary>Whether two readings are the same.</summary>
    public static bool operator ==(QualityReading left, QualityReading right) => left.Equals(right);

    /// <summary>Whether two readings differ.</summary>
    public static bool operator !=(QualityReading left, QualityReading right) => !left.Equals(right);

    internal object ToDump() => ToString();

    /// <summary>The reading in words, invariant culture.</summary>
    public override string ToString() => Status == ReadingStatus.None
        ? "no reading"
        : string.Format(CultureInfo.InvariantCulture, "quality {0:F4}, effective density {1:F2} kg/m³, {2}, {3}", _quality, _effectiveDensity, Status, Applicability);
}
