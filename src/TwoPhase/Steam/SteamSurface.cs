using System.Runtime.CompilerServices;
using TwoPhase.Numerics;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Steam;

/// <summary>
/// Temperature, volume, quality and the two density derivatives from pressure and enthalpy, for solvers and live code: a look-up
/// some thirty times faster than the formulation it is built from. Immutable; share one between threads.
/// </summary>
/// <remarks>
/// <para>Liquid and vapour have a grid each, whose one edge is the saturation line itself: enthalpy is measured from h′ or h″, and
/// nothing is interpolated across. Wet steam comes from both saturated phases by the lever rule.</para>
/// <para>Range: <see cref="Default"/> 0.5 to 16.5 MPa and 100 to 3600 kJ/kg; a range of one's own within 0.066 to 16.529 MPa, between
/// liquid at 0 °C and vapour at 800 °C.</para>
/// <para>Accuracy: T and v within 1e-7 relative, quality within 1e-7, derivatives within 1e-5 relative of the formulation (R7-97(2012));
/// in the default range. In wet steam (∂ρ/∂p)h uses the slope of the saturation-pressure equation, not Clapeyron's: they differ by
/// up to 1.6e-4 in the formulation.</para>
/// <para>Source: the idea of spline look-up from IAPWS G13-15(2015); the scheme is our own.</para>
/// </remarks>
public sealed class SteamSurface
{
    private const int LiquidColumns = 24;
    private const int VapourColumns = 16;

    // Each grid reaches a little into its phase even where the range asked for does not.
    private const double LeastReach = 50e3;
    private const double HighestVapourEnthalpy = 2805e3;

    private static readonly Lazy<SteamSurface> Shared = new(() => new(0.5e6, 16.5e6, 100e3, 3600e3));

    private readonly double _lowestPressure;
    private readonly double _highestPressure;
    private readonly double _lowestEnthalpy;
    private readonly double _highestEnthalpy;
    private readonly double _liquidFloor;
    private readonly double _vapourCeiling;

    // h′, h″, and over what u is measured: 1/(h′ − floor) and 1/(ceiling − h″).
    private readonly FourCurves _edges;
    private readonly FourPatches _liquid;
    private readonly FourPatches _vapour;

    /// <summary>A surface over a range of one's own; building it takes some tenths of a second at the most.</summary>
    /// <param name="lowestPressure">Lowest pressure, at least 0.065536 MPa.</param>
    /// <param name="highestPressure">Highest pressure, at most 16.529 MPa.</param>
    /// <param name="lowestEnthalpy">Lowest specific enthalpy, at least that of liquid at 0 °C and the highest pressure.</param>
    /// <param name="highestEnthalpy">Highest specific enthalpy, at most that of vapour at 800 °C and the highest pressure.</param>
    /// <exception cref="ArgumentOutOfRangeException">A limit lies outside what the surface can hold, or low is not below high.</exception>
    public SteamSurface(Pressure lowestPressure, Pressure highestPressure, SpecificEnergy lowestEnthalpy, SpecificEnergy highestEnthalpy)
        : this(
            SurfaceRange.Pressure(lowestPressure.Si(), SaturationTable.LowestPressure, nameof(lowestPressure)),
            SurfaceRange.Pressure(highestPressure.Si(), lowestPressure.Si(), nameof(highestPressure)),
            SurfaceRange.LowestEnthalpy(lowestEnthalpy.Si(), highestPressure.Si(), nameof(lowestEnthalpy)),
            SurfaceRange.HighestEnthalpy(highestEnthalpy.Si(), lowestEnthalpy.Si(), highestPressure.Si(), nameof(highestEnthalpy)))
    {
    }

    private SteamSurface(double lowestPressure, double highestPressure, double lowestEnthalpy, double highestEnthalpy)
    {
        (_lowestPressure, _highestPressure, _lowestEnthalpy, _highestEnthalpy) = (lowestPressure, highestPressure, lowestEnthalpy, highestEnthalpy);
        _liquidFloor = Math.Min(lowestEnthalpy, SaturationTable.Phases(lowestPressure).LiquidEnthalpy - LeastReach);
        _vapourCeiling = Math.Max(highestEnthalpy, HighestVapourEnthalpy + LeastReach);

        _edges = SaturationTable.Curves(s =>
            new(s.Liquid.Enthalpy, s.Vapour.Enthalpy, 1 / (s.Liquid.Enthalpy - _liquidFloor), 1 / (_vapourCeiling - s.Vapour.Enthalpy)));
        _liquid = new(lowestPressure, highestPressure, LiquidColumns, (p, u) => SurfaceNodes.Liquid(p, _liquidFloor, u));
        _vapour = new(lowestPressure, highestPressure, VapourColumns, (p, u) => SurfaceNodes.Vapour(p, _vapourCeiling, u));
    }

    /// <summary>The shared surface from 0.5 to 16.5 MPa and from 100 to 3600 kJ/kg, built when it is first asked for.</summary>
    public static SteamSurface Default => Shared.Value;

    /// <summary>Lowest pressure of the range.</summary>
    public Pressure LowestPressure => Pressure.FromPascals(_lowestPressure);

    /// <summary>Highest pressure of the range.</summary>
    public Pressure HighestPressure => Pressure.FromPascals(_highestPressure);

    /// <summary>Lowest specific enthalpy of the range.</summary>
    public SpecificEnergy LowestEnthalpy => SpecificEnergy.FromJoulesPerKilogram(_lowestEnthalpy);

    /// <summary>Highest specific enthalpy of the range.</summary>
    public SpecificEnergy HighestEnthalpy => SpecificEnergy.FromJoulesPerKilogram(_highestEnthalpy);

    /// <summary>Bytes that the tables take.</summary>
    internal long Bytes => _liquid.Bytes + _vapour.Bytes;

    /// <summary>The state at a pressure and an enthalpy.</summary>
    /// <param name="pressure">p, absolute pressure, inside the range.</param>
    /// <param name="enthalpy">h, specific enthalpy, inside the range.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument lies outside the range.</exception>
    public SurfaceState At(Pressure pressure, SpecificEnergy enthalpy) => new(Evaluate(
        Require.Within(pressure.Si(), _lowestPressure, _highestPressure, "Pressure p", Scale.Megapascals, nameof(pressure)),
        Require.Within(enthalpy.Si(), _lowestEnthalpy, _highestEnthalpy, "Specific enthalpy h", Scale.KilojoulesPerKilogram, nameof(enthalpy))));

    /// <summary>Raw SI for loops; NaN throughout outside the range. Quality is (h − h′)/(h″ − h′), below 0 or above 1 outside wet steam.</summary>
    internal SurfacePoint Evaluate(double pressure, double enthalpy)
    {
        bool inside = pressure >= _lowestPressure && pressure <= _highestPressure && enthalpy >= _lowestEnthalpy && enthalpy <= _highestEnthalpy;
        if (!inside) return SurfacePoint.NaN;

        Four edges = _edges.At(pressure);
        double liquid = edges.A, vapour = edges.B, quality = (enthalpy - liquid) / (vapour - liquid);
        if (enthalpy < liquid) return Single(_liquid.At(pressure, (enthalpy - _liquidFloor) * edges.C), pressure, quality);
        if (enthalpy > vapour) return Single(_vapour.At(pressure, (enthalpy - vapour) * edges.D), pressure, quality);

        SaturatedPhases phases = SaturationTable.Continued(pressure);
        SaturatedSlopes slopes = SaturationTable.Slopes(pressure);
        double volume = ((1 - quality) * phases.LiquidVolume) + (quality * phases.VapourVolume), byVolume = -1 / (volume * volume);
        return new(slopes.Temperature, volume, quality, byVolume * slopes.VolumeByEnthalpy, byVolume * slopes.VolumeByPressure(quality));
    }

    /// <summary>As <see cref="Evaluate"/> outside wet steam, for whoever knows h′ and h″ already; the quality is left out. False inside it and outside the range.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    internal bool TrySinglePhase(double pressure, double enthalpy, double liquidEnthalpy, double vapourEnthalpy, out SurfacePoint point)
    {
        bool liquid = enthalpy <= liquidEnthalpy, inside = pressure >= _lowestPressure && pressure <= _highestPressure && enthalpy >= _lowestEnthalpy && enthalpy <= _highestEnthalpy;
        point = SurfacePoint.NaN;
        if (!inside || !(liquid || enthalpy >= vapourEnthalpy)) return false;
        Four values = liquid
            ? _liquid.At(pressure, (enthalpy - _liquidFloor) / (liquidEnthalpy - _liquidFloor))
            : _vapour.At(pressure, (enthalpy - vapourEnthalpy) / (_vapourCeiling - vapourEnthalpy));
        point = Single(values, pressure, double.NaN);
        return true;
    }

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static SurfacePoint Single(Four values, double pressure, double quality) =>
        new(values.A, values.B / pressure, quality, values.C, values.D);
}
