namespace TwoPhase.Steam.Backward;

/// <summary>
/// The lines that divide the h-s plane, and the saturation line above 623.15 K as p(h) and p(s): which region a state given by
/// enthalpy and entropy lies in. SI in, SI out, arguments trusted.
/// </summary>
/// <remarks>
/// <para>Range: each equation's own span of s or h, beside it.</para>
/// <para>Accuracy: Ts(h,s) within 1 mK of the forward equations; the lines are for choosing a region, not for properties.</para>
/// <para>Source: IAPWS SR3-03(2014), section 4.4; SR4-04(2014), sections 4 to 6.</para>
/// </remarks>
internal static partial class Boundaries
{
    /// <summary>Entropy of saturated vapour at 623.15 K [J/(kg·K)], below which Tsat(h,s) has no equation.</summary>
    public const double LowestEntropyOfSaturationTemperature = 5.210887825e3;

    private const double LiquidEntropyAt623 = 3.778281340e3;
    private const double LowestEntropyOf2AB = 5.85e3;

    /// <summary>p [Pa] of the saturation line at h [J/kg], between h′(623.15 K) and h″(623.15 K).</summary>
    public static double SaturationPressureFromEnthalpy(double h) => 22e6 * PressureOfEnthalpy.Sum((h / 2600e3) - 1.02, (h / 2600e3) - 0.608);

    /// <summary>p [Pa] of the saturation line at s [J/(kg·K)], between s′(623.15 K) and s″(623.15 K).</summary>
    public static double SaturationPressureFromEntropy(double s) => 22e6 * PressureOfEntropy.Sum((s / 5.2e3) - 1.03, (s / 5.2e3) - 0.699);

    /// <summary>h′ [J/kg] of saturated liquid at s [J/(kg·K)], from s′(273.15 K) = −0.1545 J/(kg·K) to the critical entropy.</summary>
    public static double LiquidEnthalpy(double s)
    {
        TermTable table = s <= LiquidEntropyAt623 ? Liquid1 : Liquid3A;
        return 1700e3 * table.Sum((s / 3.8e3) - 1.09, (s / 3.8e3) + 0.366e-4);
    }

    /// <summary>h″ [J/kg] of saturated vapour at s [J/(kg·K)], from the critical entropy to s″(273.15 K) = 9155.8 J/(kg·K).</summary>
    public static double VapourEnthalpy(double s)
    {
        if (s >= LowestEntropyOf2AB) return 2800e3 * Math.Exp(Vapour2AB.Sum((5.21e3 / s) - 0.513, (s / 9.2e3) - 0.524));
        double root = Vapour2C3B.Sum((s / 5.9e3) - 1.02, (s / 5.9e3) - 0.726);
        return 2800e3 * (root * root) * (root * root);
    }

    /// <summary>h [J/kg] of the isotherm 623.15 K at s [J/(kg·K)], the border of regions 1 and 3, from 3397.783 to 3778.281 J/(kg·K).</summary>
    public static double EnthalpyOfBorder13(double s) => 1700e3 * Border13.Sum((s / 3.8e3) - 0.884, (s / 3.8e3) - 0.864);

    /// <summary>T [K] of the border of regions 2 and 3 at h [J/kg] and s [J/(kg·K)], 2563.592 to 2812.942 kJ/kg and 5048.097 to 5260.579 J/(kg·K).</summary>
    public static double TemperatureOfBorder23(double h, double s) => 900 * Border23.Sum((h / 3000e3) - 0.727, (s / 5.3e3) - 0.864);

    /// <summary>Ts [K] of wet steam at h [J/kg] and s [J/(kg·K)], for s from <see cref="LowestEntropyOfSaturationTemperature"/> up.</summary>
    public static double SaturationTemperatureFromEnthalpyEntropy(double h, double s) =>
        550 * SaturationTemperature.Sum((h / 2800e3) - 0.119, (s / 9.2e3) - 1.07);
}
