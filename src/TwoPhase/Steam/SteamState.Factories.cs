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
        if (t > Border25Temperature) Domain.Region5Pressure(p, nameof(pressure));
        return new(Water.AtPressureTemperature(p, t));
    }

    /// <summary>The state at a pressure and a specific enthalpy.</summary>
    /// <param name="pressure">p, absolute pressure, above zero, up to 100 MPa.</param>
    /// <param name="enthalpy">h, between its values at the lowest and the highest temperature at this pressure.</param>
    /// <exception cref="ArgumentOutOfRangeException">The state lies outside the formulation.</exception>
    public static SteamState FromPressureEnthalpy(Pressure pressure, SpecificEnergy enthalpy)
    {
        double p = Domain.Pressure(pressure, nameof(pressure)), h = enthalpy.Si();
        WaterCore state = Water.AtPressureEnthalpy(p, h);
        return state.Region != 0 ? new(state) : throw Domain.OutsideIsobar(p, Property.Enthalpy, h, nameof(enthalpy));
    }

    /// <summary>The state at a pressure and a specific entropy.</summary>
    /// <param name="pressure">p, absolute pressure, above zero, up to 100 MPa.</param>
    /// <param name="entropy">s, between its values at the lowest and the highest temperature at this pressure.</param>
    /// <exception cref="ArgumentOutOfRangeException">The state lies outside the formulation.</exception>
    public static SteamState FromPressureEntropy(Pressure pressure, SpecificEntropy entropy)
    {
        double p = Domain.Pressure(pressure, nameof(pressure)), s = entropy.Si();
        WaterCore state = Water.AtPressureEntropy(p, s);
        return state.Region != 0 ? new(state) : throw Domain.OutsideIsobar(p, Property.Entropy, s, nameof(entropy));
    }

    /// <summary>The state at a pressure and a density.</summary>
    /// <remarks>Cold water has two temperatures of the same density, at 1 bar between 0 and 8 °C; the warmer one is returned.</remarks>
    /// <param name="pressure">p, absolute pressure, above zero, up to 100 MPa.</param>
    /// <param name="density">ρ, between its values at the highest temperature and at the temperature of greatest density at this pressure.</param>
    /// <exception cref="ArgumentOutOfRangeException">The state lies outside the formulation.</exception>
    public static SteamState FromPressureDensity(Pressure pressure, Density density)
    {
        double p = Domain.Pressure(pressure, nameof(pressure)), rho = Domain.Density(density, nameof(density));
        WaterCore state = Water.AtPressureDensity(p, rho);
        return state.Region != 0 ? new(state) : throw Domain.OutsideIsobar(p, Property.Volume, 1 / rho, nameof(density));
    }

    /// <summary>The state at a temperature and a density.</summary>
    /// <param name="temperature">T, 273.15 K to 2273.15 K.</param>
    /// <param name="density">ρ, above zero, up to its value at the highest pressure at this temperature.</param>
    /// <exception cref="ArgumentOutOfRangeException">The state lies outside the formulation.</exception>
    public static SteamState FromTemperatureDensity(Temperature temperature, Density density)
    {
        double t = Domain.Temperature(temperature, nameof(temperature)), rho = Domain.Density(density, nameof(density));
        WaterCore state = Water.AtTemperatureDensity(t, rho);
        return state.Region != 0 ? new(state) : throw Domain.OutsideIsotherm(t, rho, nameof(density));
    }

    /// <summary>The state at a specific enthalpy and a specific entropy: the end of an isentropic expansion, for example.</summary>
    /// <param name="enthalpy">h, such that the formulation has a state with this entropy.</param>
    /// <param name="entropy">s, likewise.</param>
    /// <exception cref="ArgumentOutOfRangeException">The formulation has no such state.</exception>
    public static SteamState FromEnthalpyEntropy(SpecificEnergy enthalpy, SpecificEntropy entropy)
    {
        double h = enthalpy.Si(), s = entropy.Si();
        WaterCore state = Water.AtEnthalpyEntropy(h, s);
        return state.Region != 0 ? new(state) : throw Require.OutOfRange(
            h,
            "Specific enthalpy h",
            Scale.KilojoulesPerKilogram,
            nameof(enthalpy),
            $"with specific entropy s = {Scale.KilojoulesPerKilogramKelvin.Text(s)} must be a state between 273.15 K and 1073.15 K up to 100 MPa, or up to 2273.15 K and 50 MPa");
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
