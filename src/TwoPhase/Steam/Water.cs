using static TwoPhase.Steam.Water97;

namespace TwoPhase.Steam;

/// <summary>
/// Equilibrium states from any two properties, raw SI, for loops: arguments are trusted to be numbers, and where the
/// formulation has no state the answer is <c>default</c>, region 0.
/// </summary>
internal static partial class Water
{
    /// <summary>The state at p [Pa] and T [K]; on the saturation line itself, vapour.</summary>
    public static WaterCore AtPressureTemperature(double pressure, double temperature) => RegionOf(pressure, temperature) switch
    {
        1 => new(1, Region1.At(pressure, temperature)),
        2 => new(2, Region2.At(pressure, temperature)),
        _ => default,
    };

    /// <summary>The state at p [Pa] and h [J/kg].</summary>
    public static WaterCore AtPressureEnthalpy(double pressure, double enthalpy)
    {
        if (!(pressure > 0 && pressure <= HighestPressure)) return default;
        if (pressure >= SaturationLine.LowestPressure && pressure < CriticalPressure)
        {
            // The backward equations are good to 25 mK, enough to land on the wrong side: the phase is decided first.
            SaturationCore saturation = SaturationLine.AtPressure(pressure);
            double quality = saturation.EquilibriumQuality(enthalpy);
            if (quality >= 0 && quality <= 1) return new(saturation, quality);
            if (quality < 0) return Solved1(pressure, enthalpy);
        }

        return Solved2(pressure, enthalpy);
    }

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

    private static int RegionOf(double pressure, double temperature)
    {
        if (!(pressure > 0 && pressure <= HighestPressure && temperature >= LowestTemperature)) return 0;
        if (temperature <= Border13Temperature) return pressure > Region4.Pressure(temperature) ? 1 : 2;
        return temperature <= Border25Temperature && pressure <= 16.529e6 ? 2 : 0;
    }

    private static WaterCore Solved1(double pressure, double enthalpy)
    {
        double temperature = Region1.BackwardTemperature(pressure, enthalpy);
        PhaseCore phase = Region1.At(pressure, temperature);
        for (int i = 0; i < 6; i++)
        {
            double step = (enthalpy - phase.Enthalpy) / phase.IsobaricHeatCapacity;
            temperature += step;
            phase = Region1.At(pressure, temperature);
            if (Math.Abs(step) < 1e-9 * temperature) break;
        }

        return temperature >= LowestTemperature - 1e-6 && temperature <= Border13Temperature + 1e-6 ? new(1, phase) : default;
    }

    private static WaterCore Solved2(double pressure, double enthalpy)
    {
        double temperature = Region2.BackwardTemperature(pressure, enthalpy);
        PhaseCore phase = Region2.At(pressure, temperature);
        for (int i = 0; i < 6; i++)
        {
            double step = (enthalpy - phase.Enthalpy) / phase.IsobaricHeatCapacity;
            temperature += step;
            phase = Region2.At(pressure, temperature);
            if (Math.Abs(step) < 1e-9 * temperature) break;
        }

        return temperature >= LowestTemperature - 1e-6 && temperature <= Border25Temperature + 1e-6 && pressure <= 16.529e6 ? new(2, phase) : default;
    }
}
