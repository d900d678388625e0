using System.Runtime.CompilerServices;
#if NET
using System.Runtime.Intrinsics;
#endif
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
    private const int LiquidColumns = 31;
    private const int WetColumns = 1;
    private const int VapourColumns = 25;

    // Just short of where a further column would begin.
    private const double LastOfVapour = VapourColumns - 1e-13;

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

    // Where liquid, wet steam and vapour begin, the floor, h′ and h″, and how many columns of each a J/kg crosses.
    private readonly EightCurves _phases;
    private readonly FourPatches _patches;

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

        _phases = new(
            SaturationTable.Curves(s => new(_liquidFloor, s.Liquid.Enthalpy, s.Vapour.Enthalpy, 0)),
            SaturationTable.Curves(s => new(LiquidColumns / (s.Liquid.Enthalpy - _liquidFloor), WetColumns / s.LatentHeat, VapourColumns / (_vapourCeiling - s.Vapour.Enthalpy), 0)));
        _patches = new(lowestPressure, highestPressure, LiquidColumns + WetColumns + VapourColumns, Node);
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
    internal long Bytes => _patches.Bytes;

    /// <summary>The state at a pressure and an enthalpy.</summary>
    /// <param name="pressure">p, absolute pressure, inside the range.</param>
    /// <param name="enthalpy">h, specific enthalpy, inside the range.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument lies outside the range.</exception>
    public SurfaceState At(Pressure pressure, SpecificEnergy enthalpy) => new(Evaluate(
        Require.Within(pressure.Si(), _lowestPressure, _highestPressure, "Pressure p", Scale.Megapascals, nameof(pressure)),
        Require.Within(enthalpy.Si(), _lowestEnthalpy, _highestEnthalpy, "Specific enthalpy h", Scale.KilojoulesPerKilogram, nameof(enthalpy))));

    /// <summary>Raw SI for loops; NaN throughout outside the range. Quality is (h − h′)/(h″ − h′), below 0 or above 1 outside wet steam.</summary>
    [MethodImpl(Fast.Hot | MethodImplOptions.AggressiveInlining)]
    internal SurfacePoint Evaluate(double pressure, double enthalpy)
    {
        if (!IsInside(pressure, enthalpy)) return SurfacePoint.NaN;

        // Which phase it is makes no branch: over states in no order a processor guesses every second one wrong, which takes as long as all the rest.
        double across = Across(pressure, enthalpy, out double quality);
#if NET
        Vector256<double> values = _patches.InRegister(pressure, across);
        Vector128<double> slopes = values.GetUpper();
        return Point(values.ToScalar(), values.GetElement(1), slopes.ToScalar(), slopes.GetElement(1), pressure, quality);
#else
        Four values = _patches.At(pressure, across);
        return Point(values.A, values.B, values.C, values.D, pressure, quality);
#endif
    }

    /// <summary>T, v, (∂v/∂h)p and (∂v/∂p)h outside wet steam, for whoever knows h′ and h″ already. False inside it and outside the range.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    internal bool TrySinglePhase(double pressure, double enthalpy, double liquidEnthalpy, double vapourEnthalpy, out Four point)
    {
        bool liquid = enthalpy <= liquidEnthalpy;
        point = default;
        if (!IsInside(pressure, enthalpy) || !(liquid || enthalpy >= vapourEnthalpy)) return false;
        double across = liquid
            ? (LiquidColumns * (enthalpy - _liquidFloor) / (liquidEnthalpy - _liquidFloor)) - 0.5
            : LiquidColumns + WetColumns - 0.5 + (LastOfVapour * (enthalpy - vapourEnthalpy) / (_vapourCeiling - vapourEnthalpy));
        Four values = At(pressure, across);
        point = new(values.A, values.B / pressure, values.C, values.D);
        return true;
    }

    // v and ρ = 1/v by one division.
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static SurfacePoint Point(double temperature, double work, double volumeByEnthalpy, double volumeByPressure, double pressure, double quality)
    {
        double inverse = 1 / (pressure * work), density = pressure * pressure * inverse, byVolume = -density * density;
        return new(temperature, work * work * inverse, quality, byVolume * volumeByEnthalpy, byVolume * volumeByPressure);
    }

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private bool IsInside(double pressure, double enthalpy) =>
        pressure >= _lowestPressure && pressure <= _highestPressure && enthalpy >= _lowestEnthalpy && enthalpy <= _highestEnthalpy;

    // How many columns lie below h: what it has crossed of liquid, and of wet steam, and of vapour, none less than nothing or more than all.
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private double Across(double pressure, double enthalpy, out double quality)
    {
#if NET
        Vector512<double> phases = _phases.InRegister(pressure);
        Vector256<double> crossed = (Vector256.Create(enthalpy) - phases.GetLower()) * phases.GetUpper();
        quality = crossed.GetElement(1);
        crossed = Vector256.MinNative(Vector256.MaxNative(crossed, Vector256<double>.Zero), Vector256.Create(LiquidColumns, WetColumns, LastOfVapour, -0.5));
        return Vector128.Sum(crossed.GetLower() + crossed.GetUpper());
#else
        // Where each begins, then how many columns a joule crosses.
        _phases.At(pressure, out Eight phases);
        quality = (enthalpy - phases.B) * phases.F;
        return -0.5 + Fast.Clamp((enthalpy - phases.A) * phases.E, 0, LiquidColumns) + Fast.Clamp(quality, 0, WetColumns) + Fast.Clamp((enthalpy - phases.C) * phases.G, 0, LastOfVapour);
#endif
    }

    [MethodImpl(Fast.Hot)]
    private Four At(double pressure, double across) => _patches.At(pressure, across);

    private Four Node(double pressure, int column, double u) => column switch
    {
        < LiquidColumns => SurfaceNodes.Liquid(pressure, _liquidFloor, (column + u) / LiquidColumns),
        LiquidColumns => SurfaceNodes.Wet(pressure, u),
        _ => SurfaceNodes.Vapour(pressure, _vapourCeiling, (column - LiquidColumns - WetColumns + u) / VapourColumns),
    };
}
