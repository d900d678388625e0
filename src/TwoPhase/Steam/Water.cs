using static TwoPhase.Steam.Water97;

namespace TwoPhase.Steam;

/// <summary>
/// Equilibrium states from any two properties, raw SI, for loops: arguments are trusted to be numbers, and where the
/// formulation has no state the answer is <c>default</c>, region 0.
/// </summary>
internal static partial class Water
{
    /// <summary>The state at p [Pa] and T [K]; on the saturation line itself, vapour.</summary>
    public static WaterCore AtPressureTemperature(double pressure, double temperature)
    {
        if (!(pressure >= LowestPressure && pressure <= HighestPressure && temperature >= LowestTemperature && temperature <= HighestTemperature)) return default;
        if (temperature > Border25Temperature)
            return pressure <= HighestPressureOfRegion5 ? new(5, Region5.At(pressure, temperature)) : default;

        bool vapour = temperature >= CriticalTemperature || pressure <= Region4.Pressure(temperature);
        if (temperature <= Border13Temperature)
            return vapour ? new(2, Region2.At(pressure, temperature)) : new(1, Region1.At(pressure, temperature));

        bool dense = temperature <= Border23.HighestTemperature && pressure > Border23.Pressure(temperature);
        return dense
            ? new(3, Region3.AtPressure(pressure, temperature, vapour))
            : new(2, Region2.At(pressure, temperature));
    }

    /// <summary>The state at p [Pa] and h [J/kg].</summary>
    public static WaterCore AtPressureEnthalpy(double pressure, double enthalpy) => OnIsobar(pressure, Property.Enthalpy, enthalpy);

    /// <summary>The state at p [Pa] and s [J/(kg·K)].</summary>
    public static WaterCore AtPressureEntropy(double pressure, double entropy) => OnIsobar(pressure, Property.Entropy, entropy);

    /// <summary>The state at p [Pa] and ρ [kg/m³]; in water colder than its greatest density the warmer one of two.</summary>
    public static WaterCore AtPressureDensity(double pressure, double density) =>
        density > 0 ? OnIsobar(pressure, Property.Volume, 1 / density) : default;

    /// <summary>Wet steam at p [Pa] and x [kg/kg].</summary>
    public static WaterCore AtPressureQuality(double pressure, double quality) =>
        pressure >= SaturationLine.LowestPressure && pressure < CriticalPressure && quality >= 0 && quality <= 1
            ? new(SaturationLine.AtPressure(pressure), quality)
            : default;

    /// <summary>Wet steam at T [K] and x [kg/kg].</summary>
    public static WaterCore AtTemperatureQuality(double temperature, double quality) =>
        temperature >= LowestTemperature && temperature < CriticalTemperature && quality >= 0 && quality <= 1
            ? new(SaturationLine.AtTemperature(temperature), quality)
            : default;

    /// <summary>(h − h′) / (h″ − h′) at the pressure of a state; NaN where no saturation exists.</summary>
    public static double EquilibriumQuality(in WaterCore state) => state.IsWet ? state.Quality
        : state.Pressure >= SaturationLine.LowestPressure && state.Pressure < CriticalPressure
            ? SaturationLine.AtPressure(state.Pressure).EquilibriumQuality(state.Enthalpy)
            : double.NaN;
}
