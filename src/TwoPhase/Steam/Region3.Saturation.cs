using static TwoPhase.Steam.Water97;

namespace TwoPhase.Steam;

internal static partial class Region3
{
    /// <summary>Both phases above 623.15 K: the outer roots ρ of p(ρ,T) = ps(T).</summary>
    public static SaturationCore Saturated(double pressure, double temperature)
    {
        // A little beyond the root on its outer side p(ρ) is monotonic and its curvature keeps Newton steps on that side.
        double tau = Math.Max(0, 1 - (temperature / CriticalTemperature));
        double liquid = ApproximateLiquidDensity(tau), vapour = ApproximateVapourDensity(tau);
        return new()
        {
            Liquid = OuterRoot(pressure, temperature, liquid + (0.05 * (liquid - CriticalDensity))),
            Vapour = OuterRoot(pressure, temperature, vapour - (0.05 * (CriticalDensity - vapour))),
        };
    }

    private static PhaseCore OuterRoot(double pressure, double temperature, double density)
    {
        PhaseCore phase = At(density, temperature);
        double previous = 0;
        for (int i = 0; i < 60 && phase.BulkModulus > 0; i++)
        {
            double step = (pressure - phase.Pressure) * density / phase.BulkModulus;

            // All steps go one way until round-off turns one back; at the critical point none is left to take.
            if (step * previous < 0 || Math.Abs(step) <= 1e-15 * density) break;
            density += step;
            previous = step;
            phase = At(density, temperature);
        }

        return phase with { Pressure = pressure };
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
