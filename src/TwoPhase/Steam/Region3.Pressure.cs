using TwoPhase.Steam.Backward;
using static TwoPhase.Steam.Water97;

namespace TwoPhase.Steam;

internal static partial class Region3
{
    /// <summary>Above every density of the region: 765 kg/m³ at 623.15 K and 100 MPa.</summary>
    public const double HighestDensity = 800;

    private const double LowestDensity = 20;

    /// <summary>The state at p and T, from the backward equation v(p,T) on.</summary>
    /// <param name="pressure">p [Pa].</param>
    /// <param name="temperature">T [K].</param>
    /// <param name="vapour">Which phase, below Tc; idle above.</param>
    public static PhaseCore AtPressure(double pressure, double temperature, bool vapour) =>
        AtPressure(pressure, temperature, vapour, 1 / Volume3.At(pressure, temperature, vapour));

    /// <summary>
    /// The state at p and T: the root ρ of p(ρ,T) = p. Below Tc the equation loops through the dome and has up to three
    /// roots; the outer one of the phase asked for is taken. Starts from a density [kg/m³] somewhere near.
    /// </summary>
    private static PhaseCore AtPressure(double pressure, double temperature, bool vapour, double start)
    {
        bool subcritical = temperature < CriticalTemperature;
        double low = subcritical && !vapour ? CriticalDensity : LowestDensity;
        double high = subcritical && vapour ? CriticalDensity : HighestDensity;
        double density = start > low && start < high ? start : (low + high) / 2;
        double previous = double.PositiveInfinity;
        PhaseCore phase = At(density, temperature), stable = phase;
        for (int i = 0; i < 100; i++)
        {
            if (phase.BulkModulus <= 0)
            {
                // Inside the spinodal, where Newton's direction is of no use: go outwards.
                density = vapour ? (low + density) / 2 : (density + high) / 2;
                phase = At(density, temperature);
                continue;
            }

            stable = phase;
            double missing = pressure - phase.Pressure;

            // Once the pressure is met and nears it no more, the rest is round-off.
            if (Math.Abs(missing) <= 1e-12 * pressure && Math.Abs(missing) >= previous / 2) break;
            previous = Math.Abs(missing);
            if (missing > 0) low = Math.Max(low, density);
            else high = Math.Min(high, density);
            double next = density + (missing * density / phase.BulkModulus);
            if (next == density) break;
            density = next > low && next < high ? next : (low + high) / 2;
            phase = At(density, temperature);
        }

        // Within 1e-5 K of Tc the saturation equation asks for slightly more than the spinodal gives: its stable side is the answer.
        return (phase.BulkModulus > 0 ? phase : stable) with { Pressure = pressure };
    }
}
