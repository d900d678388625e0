using System.Globalization;
using UnitsNet;

namespace TwoPhase.Flow;

/// <summary>A loss of pressure per length of tube, positive where the pressure falls downstream.</summary>
/// <remarks>UnitsNet has no such quantity, so this is a small one of our own.</remarks>
public readonly struct PressureGradient : IEquatable<PressureGradient>, IComparable<PressureGradient>
{
    private PressureGradient(double pascalsPerMetre) => PascalsPerMetre = pascalsPerMetre;

    /// <summary>The gradient in Pa/m.</summary>
    public double PascalsPerMetre { get; }

    /// <summary>The gradient in kPa/m.</summary>
    public double KilopascalsPerMetre => PascalsPerMetre / 1e3;

    /// <summary>A gradient from a number of Pa/m.</summary>
    /// <param name="value">The gradient in Pa/m.</param>
    public static PressureGradient FromPascalsPerMetre(double value) => new(value);

    /// <summary>The pressure lost over a length at this gradient.</summary>
    /// <param name="length">The length of tube.</param>
    public Pressure Over(Length length) => Pressure.FromPascals(PascalsPerMetre * Units.SiDoor.Si(length));

    /// <inheritdoc/>
    public bool Equals(PressureGradient other) => PascalsPerMetre.Equals(other.PascalsPerMetre);

    /// <inheritdoc/>
    public override bool Equals(object? obj) => obj is PressureGradient other && Equals(other);

    /// <inheritdoc/>
    public override int GetHashCode() => PascalsPerMetre.GetHashCode();

    /// <inheritdoc/>
    public int CompareTo(PressureGradient other) => PascalsPerMetre.CompareTo(other.PascalsPerMetre);

    /// <summary>Whether two gradients are equal.</summary>
    public static bool operator ==(PressureGradient left, PressureGradient right) => left.Equals(right);

    /// <summary>Whether two gradients differ.</summary>
    public static bool operator !=(PressureGradient left, PressureGradient right) => !left.Equals(right);

    /// <summary>Whether the left gradient is the smaller.</summary>
    public static bool operator <(PressureGradient left, PressureGradient right) => left.PascalsPerMetre < right.PascalsPerMetre;

    /// <summary>Whether the left gradient is the larger.</summary>
    public static bool operator >(PressureGradient left, PressureGradient right) => left.PascalsPerMetre > right.PascalsPerMetre;

    /// <summary>Whether the left gradient is not the larger.</summary>
    public static bool operator <=(PressureGradient left, PressureGradient right) => left.PascalsPerMetre <= right.PascalsPerMetre;

    /// <summary>Whether the left gradient is not the smaller.</summary>
    public static bool operator >=(PressureGradient left, PressureGradient right) => left.PascalsPerMetre >= right.PascalsPerMetre;

    internal object ToDump() => ToString();

    /// <summary>The gradient with its unit, invariant culture.</summary>
    public override string ToString() => PascalsPerMetre.ToString("G6", CultureInfo.InvariantCulture) + " Pa/m";
}
