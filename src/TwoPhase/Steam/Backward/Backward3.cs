namespace TwoPhase.Steam.Backward;

/// <summary>
/// Region 3, about the critical point: T(p,h), v(p,h), T(p,s), v(p,s) and p(h,s), each in subregions 3a (liquid side) and 3b
/// (vapour side), which meet at the critical isentrope. SI in, SI out, arguments trusted.
/// </summary>
/// <remarks>
/// <para>Range: region 3 of the formulation, from 623.15 K to the 2-3 border and up to 100 MPa, outside the two-phase dome.</para>
/// <para>Accuracy: T within 25 mK, v and p within 0.01 %, of the forward equation: starting values.</para>
/// <para>Source: IAPWS SR3-03(2014), sections 3 and 4; SR4-04(2014), section 3.</para>
/// </remarks>
internal static partial class Backward3
{
    /// <summary>Critical entropy [J/(kg·K)], the border of 3a and 3b: SR3-03(2014), section 2.</summary>
    public const double CriticalEntropy = 4.41202148223476e3;

    /// <summary>h [J/kg] of the border 3a-3b at p [Pa]: SR3-03(2014), Eq. (1), Table 2.</summary>
    public static double EnthalpyOfBorderAb(double p)
    {
        double pi = p / 1e6;
        return 1e3 * (0.201464004206875e4 + (pi * (0.374696550136983e1 + (pi * (-0.219921901054187e-1 + (pi * 0.875131686009950e-4))))));
    }

    /// <summary>T [K] from p [Pa] and h [J/kg].</summary>
    public static double TemperatureFromEnthalpy(double p, double h) => h <= EnthalpyOfBorderAb(p)
        ? 760 * TemperatureOfEnthalpyA.Sum((p / 100e6) + 0.240, (h / 2300e3) - 0.615)
        : 860 * TemperatureOfEnthalpyB.Sum((p / 100e6) + 0.298, (h / 2800e3) - 0.720);

    /// <summary>v [m³/kg] from p [Pa] and h [J/kg].</summary>
    public static double VolumeFromEnthalpy(double p, double h) => h <= EnthalpyOfBorderAb(p)
        ? 0.0028 * VolumeOfEnthalpyA.Sum((p / 100e6) + 0.128, (h / 2100e3) - 0.727)
        : 0.0088 * VolumeOfEnthalpyB.Sum((p / 100e6) + 0.0661, (h / 2800e3) - 0.720);

    /// <summary>T [K] from p [Pa] and s [J/(kg·K)].</summary>
    public static double TemperatureFromEntropy(double p, double s) => s <= CriticalEntropy
        ? 760 * TemperatureOfEntropyA.Sum((p / 100e6) + 0.240, (s / 4.4e3) - 0.703)
        : 860 * TemperatureOfEntropyB.Sum((p / 100e6) + 0.760, (s / 5.3e3) - 0.818);

    /// <summary>v [m³/kg] from p [Pa] and s [J/(kg·K)].</summary>
    public static double VolumeFromEntropy(double p, double s) => s <= CriticalEntropy
        ? 0.0028 * VolumeOfEntropyA.Sum((p / 100e6) + 0.187, (s / 4.4e3) - 0.755)
        : 0.0088 * VolumeOfEntropyB.Sum((p / 100e6) + 0.298, (s / 5.3e3) - 0.816);

    /// <summary>p [Pa] from h [J/kg] and s [J/(kg·K)].</summary>
    public static double PressureFromEnthalpyEntropy(double h, double s) => s <= CriticalEntropy
        ? 99e6 * PressureOfBothA.Sum((h / 2300e3) - 1.01, (s / 4.4e3) - 0.750)
        : 16.6e6 / PressureOfBothB.Sum((h / 2800e3) - 0.681, (s / 5.3e3) - 0.792);
}
