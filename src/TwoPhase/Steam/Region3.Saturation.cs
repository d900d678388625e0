using static TwoPhase.Steam.Water97;

namespace TwoPhase.Steam;

internal static partial class Region3
{
    /// <summary>Both phases above 623.15 K: the outer roots ρ of p(ρ,T) = ps(T).</summary>
    public static SaturationCore Saturated(double pressure, double temperature)
    {
        double tau = Math.Max(0, 1 - (temperature / CriticalTemperature));
        return new()
        {
            Liquid = AtPressure(pressure, temperature, vapour: false, ApproximateLiquidDensity(tau)),
            Vapour = AtPressure(pressure, temperature, vapour: true, ApproximateVapourDensity(tau)),
        };
    }

    // Saturated densities of IAPWS SR1-86(1992), equations (2) and (3), here only to start from; τ = 1 − T/Tc.
    private static double ApproximateLiquidDensity(double tau) => CriticalDensity * (1
        + (1.99274064 * Math.Pow(tau, 1.0 / 3))
        + (1.09965342 * Math.Pow(tau, 2.0 / 3))
        - (0.510839303 * Math.Pow(tau, 5.0 / 3))
        - (1.75493479 * Math.Pow(tau, 16.0 / 3)));

    private static double ApproximateVapourDensity(double tau) => CriticalDensity * Math.Exp(
        (-2.03150240 * Math.Pow(tau, 2.0 / 6))
        - (2.68302940 * Math.Pow(tau, 4.0 / 6))
        - (5.38626492 * Math.Pow(tau, 8.0 / 6))
        - (17.2991605 * Math.Pow(tau, 18.0 / 6)));
}
