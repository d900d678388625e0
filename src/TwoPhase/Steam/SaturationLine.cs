using System.Runtime.CompilerServices;

namespace TwoPhase.Steam;

/// <summary>Saturated liquid and vapour, from the forward equations: regions 1 and 2 up to 623.15 K, region 3 above.</summary>
internal static class SaturationLine
{
    /// <summary>ps at 273.15 K, where the formulation begins [Pa]; written out, so that loops hold it as a constant from their first call on.</summary>
    public const double LowestPressure = 611.2126774443453;

    /// <summary>Whether anything is saturated at a pressure; false for NaN.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static bool Covers(double pressure) => pressure >= LowestPressure && pressure <= Water97.CriticalPressure;

    /// <summary>ps(T) [Pa].</summary>
    public static double Pressure(double temperature) => Region4.Pressure(temperature);

    /// <summary>Ts(p) [K].</summary>
    public static double Temperature(double pressure) => Region4.Temperature(pressure);

    /// <summary>Both phases at a pressure [Pa].</summary>
    public static SaturationCore AtPressure(double pressure) => At(pressure, Region4.Temperature(pressure));

    /// <summary>Both phases at a temperature [K].</summary>
    public static SaturationCore AtTemperature(double temperature) => At(Region4.Pressure(temperature), temperature);

    private static SaturationCore At(double pressure, double temperature) => temperature <= Water97.Border13Temperature
        ? new() { Liquid = Region1.At(pressure, temperature), Vapour = Region2.At(pressure, temperature) }
        : Region3.Saturated(pressure, temperature);
}
