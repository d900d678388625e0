using TwoPhase.Steam.Backward;
using static TwoPhase.Steam.Water97;

namespace TwoPhase.Steam;

internal static partial class Water
{
    /// <summary>
    /// The state at h [J/kg] and s [J/(kg·K)]: along an isentrope h grows with p, (∂h/∂p)s = v, so that Newton's method in
    /// ln p on the (p,s) door finds it from anywhere, through every region and the dome.
    /// </summary>
    /// <remarks>On a seam of the formulation, where h along the isentrope jumps by up to 0.09 kJ/kg, the nearer side is the answer.</remarks>
    public static WaterCore AtEnthalpyEntropy(double enthalpy, double entropy)
    {
        if (!Numerics.Fast.IsFinite(enthalpy) || !Numerics.Fast.IsFinite(entropy)) return default;

        double low = Math.Log(LowestPressureOf(entropy)), high = Math.Log(HighestPressure);
        if (!(low > -700)) return default;

        double x = Math.Log(Start(enthalpy, entropy));
        if (!(x > low && x < high)) x = (low + high) / 2;
        WaterCore best = default;
        double smallest = double.PositiveInfinity, scale = Math.Abs(enthalpy) + 1e3;
        for (int i = 0; i < 100 && high - low > 1e-15 * Math.Abs(x); i++)
        {
            double pressure = Math.Exp(x);
            WaterCore state = AtPressureEntropy(pressure, entropy);
            double next = double.NaN;
            if (state.Region == 0)
            {
                // No state: the isentrope leaves the formulation at its hot end above, at its cold end below.
                if (IsTooCold(pressure, entropy)) low = x;
                else high = x;
            }
            else
            {
                double missing = enthalpy - state.Enthalpy;
                if (Math.Abs(missing) < smallest) (smallest, best) = (Math.Abs(missing), state);
                if (smallest <= 1e-14 * scale) break;
                if (missing > 0) low = x;
                else high = x;
                next = x + (missing / (pressure * state.SpecificVolume));
            }

            x = next > low && next < high ? next : (low + high) / 2;
        }

        return smallest <= Seam ? best : default;
    }

    // The largest jump of h across a border of regions [J/kg].
    private const double Seam = 100;

    // s of vapour at 273.15 K falls by R for each factor e of pressure; a little lower, to be on the safe side.
    private static double LowestPressureOf(double entropy)
    {
        const double vapourAtLowest = 9155.5;
        return 0.5 * SaturationLine.LowestPressure * Math.Exp(-Math.Max(0, entropy - vapourAtLowest) / GasConstant);
    }

    private static bool IsTooCold(double pressure, double entropy) =>
        entropy < AtPressureTemperature(pressure, LowestTemperature).Entropy;

    // p of the backward equation where there is one.
    private static double Start(double enthalpy, double entropy)
    {
        const double liquid1 = 3778.281340, vapour2 = 5850, wettest = Boundaries.LowestEntropyOfSaturationTemperature;
        if (entropy <= liquid1 && enthalpy <= Boundaries.LiquidEnthalpy(entropy)) return Backward1.PressureFromEnthalpyEntropy(enthalpy, entropy);
        if (entropy >= vapour2 && enthalpy >= Boundaries.VapourEnthalpy(entropy)) return Backward2.PressureFromEnthalpyEntropy(enthalpy, entropy);
        return entropy >= wettest ? Region4.Pressure(Boundaries.SaturationTemperatureFromEnthalpyEntropy(enthalpy, entropy)) : double.NaN;
    }
}
