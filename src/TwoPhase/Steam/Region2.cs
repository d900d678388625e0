using System.Runtime.CompilerServices;
using TwoPhase.Numerics;

namespace TwoPhase.Steam;

/// <summary>Vapour up to 1073.15 K, below saturation and below the border of region 3.</summary>
/// <remarks>Source: IAPWS R7-97(2012), section 6.1, equation (15): ideal part γ° and residual part γʳ with π = p / 1 MPa and τ = 540 K / T.</remarks>
internal static partial class Region2
{
    [MethodImpl(Fast.Hot)]
    public static PhaseCore At(double pressure, double temperature)
    {
        double pi = pressure * 1e-6, tau = 540 / temperature, b = tau - 0.5;
        PowerSum sum = Residual(pi, b);
        PowerRow ideal = Ideal(tau);
        double byTau = tau / b;
        return PhaseCore.FromGibbs(
            pressure,
            temperature,
            Math.Log(pi) + ideal.Value + sum.Value,
            1 + sum.A,
            sum.AA - 1,
            ideal.First + (byTau * sum.B),
            ideal.Second + (byTau * byTau * sum.BB),
            byTau * sum.AB);
    }
}
