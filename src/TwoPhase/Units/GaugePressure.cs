using System.Globalization;
using UnitsNet;

namespace TwoPhase.Units;

/// <summary>A pressure read against the site's atmosphere. Everything else in this library is absolute.</summary>
public readonly struct GaugePressure : IEquatable<GaugePressure>
{
    private readonly double _gauge;
    private readonly double _atmosphere;

    /// <summary>Makes a gauge pressure.</summary>
    /// <param name="gauge">What the gauge shows; negative below the atmosphere, never below absolute zero.</param>
    /// <param name="atmosphere">Absolute pressure of the site's atmosphere, 50 kPa to 110 kPa.</param>
    /// <exception cref="ArgumentOutOfRangeException">The atmosphere is none, or the absolute pressure would be negative.</exception>
    public GaugePressure(Pressure gauge, Pressure atmosphere)
    {
        _atmosphere = CheckAtmosphere(atmosphere.Si(), nameof(atmosphere));
        _gauge = gauge.Si();
        if (!(_gauge >= -_atmosphere)) throw Require.OutOfRange(_gauge, "Gauge pressure", Scale.Kilopascals, nameof(gauge), $"must not be below {Scale.Kilopascals.Text(-_atmosphere)}, the vacuum at this site");
    }

    /// <summary>What the gauge shows.</summary>
    public Pressure Gauge => Pressure.FromPascals(_gauge);

    /// <summary>Absolute pressure of the site's atmosphere.</summary>
    public Pressure Atmosphere => Pressure.FromPascals(_atmosphere);

    /// <summary>The absolute pressure, as every other door takes it.</summary>
    public Pressure Absolute => Pressure.FromPascals(_gauge + _atmosphere);

    /// <summary>The gauge pressure that shows an absolute one.</summary>
    /// <param name="absolute">Absolute pressure, not negative.</param>
    /// <param name="atmosphere">Absolute pressure of the site's atmosphere, 50 kPa to 110 kPa.</param>
    /// <exception cref="ArgumentOutOfRangeException">The atmosphere is none, or the absolute pressure is negative.</exception>
    public static GaugePressure FromAbsolute(Pressure absolute, Pressure atmosphere)
    {
        double p = Require.NotNegative(absolute.Si(), "Absolute pressure", Scale.Kilopascals, nameof(absolute));
        return new GaugePressure(Pressure.FromPascals(p - atmosphere.Si()), atmosphere);
    }

    /// <summary>Same gauge and same atmosphere.</summary>
    /// <param name="left">One pressure.</param>
    /// <param name="right">The other pressure.</param>
    public static bool operator ==(GaugePressure left, GaugePressure right) => left.Equals(right);

    /// <summary>Another gauge or another atmosphere.</summary>
    /// <param name="left">One pressure.</param>
    /// <param name="right">The other pressure.</param>
    public static bool operator !=(GaugePressure left, GaugePressure right) => !left.Equals(right);

    /// <summary>Same gauge and same atmosphere.</summary>
    /// <param name="other">The other pressure.</param>
    public bool Equals(GaugePressure other) => _gauge == other._gauge && _atmosphere == other._atmosphere;

    /// <summary>Same gauge and same atmosphere.</summary>
    /// <param name="obj">The other pressure.</param>
    public override bool Equals(object? obj) => obj is GaugePressure other && Equals(other);

    /// <summary>Hash of both values.</summary>
    public override int GetHashCode() => (_gauge, _atmosphere).GetHashCode();

    internal object ToDump() => ToString();

    /// <summary>For example <c>9500 kPa gauge over 93 kPa</c>; invariant.</summary>
    public override string ToString() =>
        string.Format(CultureInfo.InvariantCulture, "{0} gauge over {1}", Scale.Kilopascals.Text(_gauge), Scale.Kilopascals.Text(_atmosphere));

    // From the highest inhabited site to the deepest mine, weather included.
    internal static double CheckAtmosphere(double pascals, string parameter) =>
        Require.Within(pascals, 50e3, 110e3, "Atmospheric pressure of the site", Scale.Kilopascals, parameter);
}
