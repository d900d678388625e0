namespace TwoPhase.Units;

/// <summary>Density of air-free water at atmospheric pressure, for volumes of cold water and for inches of water.</summary>
/// <remarks>
/// <para>ρ = a5 [1 − (t + a1)² (t + a2) / (a3 (t + a4))], t temperature [°C], ρ density [kg/m³].</para>
/// <para>Range: 0 °C to 40 °C.</para>
/// <para>Accuracy: 0.00085 kg/m³.</para>
/// <para>Source: Tanaka, Girard, Davis, Peuto and Bignell, Metrologia 38, 301-309 (2001), the formula recommended by the CIPM.</para>
/// </remarks>
internal static class ColdWater
{
    public const double LowestKelvins = 273.15;
    public const double HighestKelvins = 313.15;

    public static double Density(double kelvins)
    {
        const double a1 = -3.983035, a2 = 301.797, a3 = 522528.9, a4 = 69.34881, a5 = 999.974950;
        double t = kelvins - 273.15;
        return a5 * (1 - ((t + a1) * (t + a1) * (t + a2) / (a3 * (t + a4))));
    }
}
