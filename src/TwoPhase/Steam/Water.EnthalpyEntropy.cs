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

        double low = Math.Log(Math.Max(LowestPressureOf(entropy), LowestPressure)), high = Math.Log(HighestPressure);

        double x = Math.Log(Start(enthalpy, entropy));
        if (!(x > low && x < high)) x = (low + high) / 2;
        WaterCore below = default, above = default;
        double scale = Math.Abs(enthalpy) + 1e3, previous = double.PositiveInfinity;
        for (int i = 0; i < 100 && high - low > 1e-15 * Math.Abs(x); i++)
        {
            double pressure = Math.Exp(x);
            WaterCore state = OnIsobar(pressure, Property.Entropy, entropy, SearchBeyond);
            double next = double.NaN;
            if (state.Region == 0)
            {
                // The isentrope leaves the formulation at its hot end above, at its cold end below.
                if (IsTooCold(pressure, entropy)) low = x;
                else high = x;
            }
            else
            {
                double step = (enthalpy - state.Enthalpy) / (pressure * state.SpecificVolume);
                bool settled = Math.Abs(step) < 1e-11 && Math.Abs(step) >= previous / 2;
                if (x + step == x || settled) return Inside(state);
                previous = Math.Abs(step);
                if (step > 0) (low, below) = (x, state);
                else (high, above) = (x, state);
                next = x + step;
            }

            x = next > low && next < high ? next : (low + high) / 2;
        }

        // Nothing left between two pressures: the state, or a seam with a state on either side, or an end of the formulation.
        double short1 = Math.Abs(enthalpy - below.Enthalpy), short2 = Math.Abs(enthalpy - above.Enthalpy);
        bool isSeam = below.Region != 0 && above.Region != 0;
        WaterCore nearer = above.Region == 0 || (below.Region != 0 && short1 < short2) ? below : above;
        return Math.Abs(enthalpy - nearer.Enthalpy) <= (isSeam ? Seam : EdgeTolerance * scale) ? Inside(nearer) : default;
    }

    private static WaterCore Inside(in WaterCore state)
    {
        const double tolerance = EdgeTolerance * HighestTemperature;
        return state.Temperature >= LowestTemperature - tolerance && state.Temperature <= Branch.HighestTemperatureAt(state.Pressure) + tolerance ? state : default;
    }

    // The search may look this far over the ends of the formulation [K]: along the isentropes of water at 0 °C the temperature falls, then rises.
    private const double SearchBeyond = 2;

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
