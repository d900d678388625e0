using TwoPhase.Units;
using UnitsNet;
using static TwoPhase.Steam.Water97;

namespace TwoPhase.Steam;

/// <summary>The limits of the formulation as checks at the public doors; each returns the raw SI value.</summary>
internal static class Domain
{
    public static double Pressure(Pressure pressure, string parameter)
    {
        double value = Require.Positive(pressure.Si(), "Pressure p", Scale.Megapascals, parameter);
        return value <= HighestPressure ? value : throw Require.OutOfRange(value, "Pressure p", Scale.Megapascals, parameter, "must not exceed 100 MPa");
    }

    public static double Temperature(Temperature temperature, string parameter) =>
        Require.Within(temperature.Si(), LowestTemperature, HighestTemperature, "Temperature T", Scale.Kelvins, parameter);

    public static double SaturationPressure(Pressure pressure, string parameter) =>
        Require.Within(pressure.Si(), SaturationLine.LowestPressure, CriticalPressure, "Saturation pressure p", Scale.Megapascals, parameter);

    public static double SaturationTemperature(Temperature temperature, string parameter) =>
        Require.Within(temperature.Si(), LowestTemperature, CriticalTemperature, "Saturation temperature T", Scale.Kelvins, parameter);

    public static double Quality(MassFraction quality, string parameter) =>
        Require.Within(quality.Si(), 0, 1, "Quality x", Scale.None, parameter);

    public static double Enthalpy(SpecificEnergy enthalpy, string parameter) =>
        Require.Finite(enthalpy.Si(), "Specific enthalpy h", Scale.KilojoulesPerKilogram, parameter);
}
