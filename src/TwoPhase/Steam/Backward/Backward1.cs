namespace TwoPhase.Steam.Backward;

/// <summary>Region 1, liquid up to 623.15 K: T(p,h), T(p,s) and p(h,s). SI in, SI out, arguments trusted.</summary>
/// <remarks>
/// <para>Range: region 1 of the formulation, 273.15 to 623.15 K and up to 100 MPa.</para>
/// <para>Accuracy: T within 25 mK and p within 15 kPa of the forward equation (the releases' own limits): starting values.</para>
/// <para>Source: IAPWS R7-97(2012), section 5.2; SR2-01(2014), section 5.</para>
/// </remarks>
internal static partial class Backward1
{
    /// <summary>T [K] from p [Pa] and h [J/kg].</summary>
    public static double TemperatureFromEnthalpy(double p, double h) => TemperatureOfEnthalpy.Sum(p / 1e6, (h / 2500e3) + 1);

    /// <summary>T [K] from p [Pa] and s [J/(kg·K)].</summary>
    public static double TemperatureFromEntropy(double p, double s) => TemperatureOfEntropy.Sum(p / 1e6, (s / 1e3) + 2);

    /// <summary>p [Pa] from h [J/kg] and s [J/(kg·K)].</summary>
    public static double PressureFromEnthalpyEntropy(double h, double s) =>
        100e6 * PressureOfBoth.Sum((h / 3400e3) + 0.05, (s / 7.6e3) + 0.05);
}
