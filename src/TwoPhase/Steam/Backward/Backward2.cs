using TwoPhase.Numerics;

namespace TwoPhase.Steam.Backward;

/// <summary>
/// Region 2, steam: T(p,h), T(p,s) and p(h,s), each in subregions 2a (up to 4 MPa), 2b and 2c (about s = 5.85 kJ/(kg·K)).
/// SI in, SI out, arguments trusted.
/// </summary>
/// <remarks>
/// <para>Range: region 2 of the formulation, stable steam up to 1073.15 K and 100 MPa.</para>
/// <para>Accuracy: T within 25 mK and p within 0.01 % of the forward equation: starting values.</para>
/// <para>Source: IAPWS R7-97(2012), section 6.3; SR2-01(2014), section 6.</para>
/// </remarks>
internal static partial class Backward2
{
    private const double EntropyOfBorderBc = 5.85e3;

    // Where the border 2b-2c leaves the saturation line; below it there is no 2c.
    private const double LowestPressureOfC = 6.5467e6;

    /// <summary>h [J/kg] of the border 2b-2c at p [Pa]: R7-97(2012), Eq. (21), Table 19.</summary>
    public static double EnthalpyOfBorderBc(double p) =>
        1e3 * (0.26526571908428e4 + Fast.Sqrt(((p / 1e6) - 0.45257578905948e1) / 0.12809002730136e-3));

    /// <summary>p [Pa] of the border 2b-2c at h [J/kg]: R7-97(2012), Eq. (20), Table 19.</summary>
    public static double PressureOfBorderBc(double h)
    {
        double eta = h / 1e3;
        return 1e6 * (0.90584278514723e3 + (eta * (-0.67955786399241 + (eta * 0.12809002730136e-3))));
    }

    /// <summary>h [J/kg] of the border 2a-2b at s [J/(kg·K)]: SR2-01(2014), Eq. (2), Table 5.</summary>
    public static double EnthalpyOfBorderAb(double s)
    {
        double sigma = s / 1e3;
        return 1e3 * (-0.349898083432139e4 + (sigma * (0.257560716905876e4 + (sigma * (-0.421073558227969e3 + (sigma * 0.276349063799944e2))))));
    }

    /// <summary>T [K] from p [Pa] and h [J/kg].</summary>
    public static double TemperatureFromEnthalpy(double p, double h)
    {
        double pi = p / 1e6, eta = h / 2000e3;
        if (p <= 4e6) return TemperatureOfEnthalpyA.Sum(pi, eta - 2.1);
        return p <= LowestPressureOfC || h >= EnthalpyOfBorderBc(p)
            ? TemperatureOfEnthalpyB.Sum(pi - 2, eta - 2.6)
            : TemperatureOfEnthalpyC.Sum(pi + 25, eta - 1.8);
    }

    /// <summary>T [K] from p [Pa] and s [J/(kg·K)].</summary>
    public static double TemperatureFromEntropy(double p, double s)
    {
        double pi = p / 1e6;
        if (p <= 4e6) return TemperatureOfEntropyA.Sum(Fast.Sqrt(Fast.Sqrt(pi)), (s / 2e3) - 2);
        return s >= EntropyOfBorderBc
            ? TemperatureOfEntropyB.Sum(pi, 10 - (s / 0.7853e3))
            : TemperatureOfEntropyC.Sum(pi, 2 - (s / 2.9251e3));
    }

    /// <summary>p [Pa] from h [J/kg] and s [J/(kg·K)].</summary>
    public static double PressureFromEnthalpyEntropy(double h, double s)
    {
        if (h <= EnthalpyOfBorderAb(s)) return 4e6 * FourthPower(PressureOfBothA.Sum((h / 4200e3) - 0.5, (s / 12e3) - 1.2));
        return s >= EntropyOfBorderBc
            ? 100e6 * FourthPower(PressureOfBothB.Sum((h / 4100e3) - 0.6, (s / 7.9e3) - 1.01))
            : 100e6 * FourthPower(PressureOfBothC.Sum((h / 3500e3) - 0.7, (s / 5.9e3) - 1.1));
    }

    private static double FourthPower(double x) => x * x * (x * x);
}
