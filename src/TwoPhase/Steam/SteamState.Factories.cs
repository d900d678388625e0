using TwoPhase.Units;
using UnitsNet;
using static TwoPhase.Steam.Water97;

namespace TwoPhase.Steam;

public readonly partial record struct SteamState
{
    /// <summary>The state at a pressure and a temperature; exactly on the saturation line, vapour.</summary>
    /// <param name="pressure">p, absolute pressure, above zero, up to 100 MPa; up to 50 MPa above 1073.15 K.</param>
    /// <param name="temperature">T, 273.15 K to 2273.15 K.</param>
    /// <exception cref="ArgumentOutOfRangeException">The state lies outside the formulation.</exception>
    public static SteamState FromPressureTemperature(Pressure pressure, Temperature temperature)
    {
        double p = Domain.Pressure(pressure, nameof(pressure)), t = Domain.Temperature(temperature, nameof(temperature));
        WaterCore core = Water.AtPressureTemperature(p, t);
        return core.Region != 0
            ? new(core)
            : throw Require.OutOfRange(p, "Pressure p", Scale.Megapascals, nameof(pressure), $"lies outside the formulation at {Scale.Kelvins.Text(t)}");
    }

    /// <summary>The state at a pressure and a specific enthalpy.</summary>
    /// <param name="pressure">p, absolute pressure, above zero, up to 100 MPa.</param>
    /// <param name="enthalpy">h, between its values at the lowest and the highest temperature at this pressure.</param>
    /// <exception cref="ArgumentOutOfRangeException">The state lies outside the formulation.</exception>
    public static SteamState FromPressureEnthalpy(Pressure pressure, SpecificEnergy enthalpy)
    {
        double p = Domain.Pressure(pressure, nameof(pressure)), h = Domain.Enthalpy(enthalpy, nameof(enthalpy));
        WaterCore core = Water.AtPressureEnthalpy(p, h);
        return core.Region != 0
            ? new(core)
            : throw Require.OutOfRange(h, "Specific enthalpy h", Scale.KilojoulesPerKilogram, nameof(enthalpy), $"lies outside the formulation at {Scale.Megapascals.Text(p)}");
    }

    /// <summary>Wet steam at a pressure and a quality.</summary>
    /// <param name="pressure">p, absolute pressure, 611.213 Pa up to, but not including, 22.064 MPa.</param>
    /// <param name="quality">x, 0 (saturated liquid) to 1 (saturated vapour).</param>
    /// <exception cref="ArgumentOutOfRangeException">No such wet steam.</exception>
    public static SteamState FromPressureQuality(Pressure pressure, MassFraction quality)
    {
        double p = Domain.SaturationPressure(pressure, nameof(pressure)), x = Domain.Quality(quality, nameof(quality));
        _ = Require.Below(p, CriticalPressure, "Pressure p", Scale.Megapascals, nameof(pressure));
        return new(Water.AtPressureQuality(p, x));
    }

    /// <summary>Wet steam at a temperature and a quality.</summary>
    /// <param name="temperature">T, 273.15 K up to, but not including, 647.096 K.</param>
    /// <param name="quality">x, 0 (saturated liquid) to 1 (saturated vapour).</param>
    /// <exception cref="ArgumentOutOfRangeException">No such wet steam.</exception>
    public static SteamState FromTemperatureQuality(Temperature temperature, MassFraction quality)
    {
        double t = Domain.SaturationTemperature(temperature, nameof(temperature)), x = Domain.Quality(quality, nameof(quality));
        _ = Require.Below(t, CriticalTemperature, "Temperature T", Scale.Kelvins, nameof(temperature));
        return new(Water.AtTemperatureQuality(t, x));
    }
}
