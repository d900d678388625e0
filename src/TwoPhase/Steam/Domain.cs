using TwoPhase.Units;
using UnitsNet;
using static TwoPhase.Steam.Water97;

namespace TwoPhase.Steam;

/// <summary>The limits of the formulation as checks at the public doors; each check returns the raw SI value.</summary>
internal static class Domain
{
    public static double Pressure(Pressure pressure, string parameter)
    {
        double value = Require.Positive(pressure.Si(), "Pressure p", Scale.Megapascals, parameter);
        if (value < LowestPressure) throw Require.OutOfRange(value, "Pressure p", new Scale("Pa", 1), parameter, "must be at least 1e-9 Pa");
        return value <= HighestPressure ? value : throw Require.OutOfRange(value, "Pressure p", Scale.Megapascals, parameter, "must not exceed 100 MPa");
    }

    public static void Region5Pressure(double pressure, string parameter)
    {
        if (pressure > HighestPressureOfRegion5)
            throw Require.OutOfRange(pressure, "Pressure p", Scale.Megapascals, parameter, "must not exceed 50 MPa above 1073.15 K");
    }

    public static double Temperature(Temperature temperature, string parameter) =>
        Require.Within(temperature.Si(), LowestTemperature, HighestTemperature, "Temperature T", Scale.Kelvins, parameter);

    public static double Density(Density density, string parameter) =>
        Require.Positive(density.Si(), "Density ρ", Scale.KilogramsPerCubicMetre, parameter);

    public static double SaturationPressure(Pressure pressure, string parameter) =>
        Require.Within(pressure.Si(), SaturationLine.LowestPressure, CriticalPressure, "Saturation pressure p", Scale.Megapascals, parameter);

    public static double SaturationTemperature(Temperature temperature, string parameter) =>
        Require.Within(temperature.Si(), LowestTemperature, CriticalTemperature, "Saturation temperature T", Scale.Kelvins, parameter);

    public static double Quality(MassFraction quality, string parameter) =>
        Require.Within(quality.Si(), 0, 1, "Quality x", Scale.None, parameter);

    /// <summary>The error for a value that no state at this pressure has, with the limits there.</summary>
    public static ArgumentOutOfRangeException OutsideIsobar(double pressure, Property property, double value, string parameter)
    {
        double coldest = property == Property.Volume ? Water.DensestTemperature(pressure) : LowestTemperature;
        double cold = Water.AtPressureTemperature(pressure, coldest).Phase.Value(property);
        double hot = Water.AtPressureTemperature(pressure, Branch.HighestTemperatureAt(pressure)).Phase.Value(property);
        string at = $" at {Scale.Megapascals.Text(pressure)}";
        return property switch
        {
            Property.Enthalpy => Outside(value, cold, hot, "Specific enthalpy h", Scale.KilojoulesPerKilogram, at, parameter),
            Property.Entropy => Outside(value, cold, hot, "Specific entropy s", Scale.KilojoulesPerKilogramKelvin, at, parameter),
            _ => Outside(1 / value, 1 / hot, 1 / cold, "Density ρ", Scale.KilogramsPerCubicMetre, at, parameter),
        };
    }

    /// <summary>The error for a density that no state at this temperature has, with the limits there.</summary>
    public static ArgumentOutOfRangeException OutsideIsotherm(double temperature, double density, string parameter)
    {
        double highest = temperature > Border25Temperature ? HighestPressureOfRegion5 : HighestPressure;
        double densest = Water.AtPressureTemperature(highest, temperature).Density;
        return Outside(density, 0, densest, "Density ρ", Scale.KilogramsPerCubicMetre, $" at {Scale.Kelvins.Text(temperature)}", parameter);
    }

    private static ArgumentOutOfRangeException Outside(double value, double low, double high, string quantity, Scale scale, string at, string parameter) =>
        Require.OutOfRange(value, quantity, scale, parameter, $"must lie between {scale.Text(low)} and {scale.Text(high)}{at}");
}
