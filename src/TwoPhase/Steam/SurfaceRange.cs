using TwoPhase.Units;

namespace TwoPhase.Steam;

/// <summary>What a surface can hold: one pressure range below 623.15 K saturation, and regions 1 and 2 on either side of the dome.</summary>
internal static class SurfaceRange
{
    public static double Pressure(double value, double low, string parameter) =>
        Require.Within(value, low, SaturationTable.HighestPressure, "Pressure p", Scale.Megapascals, parameter);

    public static double LowestEnthalpy(double value, double highestPressure, string parameter)
    {
        double coldest = Region1.At(highestPressure, Water97.LowestTemperature).Enthalpy;
        return Require.Within(value, coldest, Hottest(highestPressure), "Specific enthalpy h", Scale.KilojoulesPerKilogram, parameter);
    }

    public static double HighestEnthalpy(double value, double lowestEnthalpy, double highestPressure, string parameter) =>
        Require.Within(value, lowestEnthalpy, Hottest(highestPressure), "Specific enthalpy h", Scale.KilojoulesPerKilogram, parameter);

    private static double Hottest(double pressure) => Region2.At(pressure, Water97.Border25Temperature).Enthalpy;
}
