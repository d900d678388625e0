using System.Runtime.CompilerServices;
using TwoPhase.Numerics;

namespace TwoPhase.Steam;

/// <summary>Dense fluid around and above the critical point: 623.15 K up to the 2-3 border, to 100 MPa.</summary>
/// <remarks>Source: IAPWS R7-97(2012), section 7, equation (28): φ(δ,τ) with δ = ρ / ρc and τ = Tc / T.</remarks>
internal static partial class Region3
{
    [MethodImpl(Fast.Hot)]
    public static PhaseCore At(double density, double temperature)
    {
        double delta = density / Water97.CriticalDensity, tau = Water97.CriticalTemperature / temperature;
        PowerSum sum = Sum(PowerRow.Base(delta), PowerRow.Base(tau));
        return PhaseCore.FromHelmholtz(
            density,
            temperature,
            sum.Value + (N1 * Math.Log(delta)),
            sum.A + N1,
            sum.AA - N1,
            sum.B,
            sum.BB,
            sum.AB);
    }
}
