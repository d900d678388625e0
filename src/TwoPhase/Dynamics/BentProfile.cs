using TwoPhase.Numerics;

namespace TwoPhase.Dynamics;

/// <summary>
/// A cell in which a phase boundary stands. What flows has an enthalpy that is linear along it; what is held follows that with one
/// slope below the boundary and another above, since slip lets vapour run ahead. Enthalpies count from the boundary [J/kg].
/// </summary>
/// <remarks>
/// With u = F + S/2 the part of the profile above, e = u²/2S its mean excess: h̄ = g₀ (F − e) + g₁ e, a quadratic in u.
/// </remarks>
internal struct BentProfile
{
    /// <summary>S, change of the flowing enthalpy over the cell, greater than zero; g₀ and g₁, ∂h held / ∂h flowing below and above.</summary>
    public double Spread, Below, Above;

    /// <summary>Whether a mean that is held puts the boundary inside the cell.</summary>
    public readonly bool Holds(double held) => 2 * held > -Spread * Below && 2 * held < Spread * Above;

    /// <summary>Mean of what is held with a mean F of what flows.</summary>
    public readonly double Held(double flow)
    {
        double u = flow + (Spread / 2);
        return (Below * flow) + ((Above - Below) * u * u / (2 * Spread));
    }

    /// <summary>Mean of what flows with a mean that is held.</summary>
    public readonly double Flow(double held) => PartAbove(held, out _) - (Spread / 2);

    /// <summary>Mean over the cell of what is held above the boundary, zero where below, and its derivative.</summary>
    public readonly double Over(double held, out double slope)
    {
        if (!Holds(held))
        {
            slope = held > 0 ? 1 : 0;
            return Math.Max(0, held);
        }

        double u = PartAbove(held, out double rate);
        slope = Above * u / Spread * rate;
        return Above * u * u / (2 * Spread);
    }

    private readonly double PartAbove(double held, out double rate)
    {
        double a = (Above - Below) / (2 * Spread), c = held + (Below * Spread / 2), root = Fast.Sqrt((Below * Below) + (4 * a * c));
        rate = 1 / root;
        return 2 * c / (Below + root);
    }
}
