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
        double pi = pressure * 1e-6, tau = 540 / temperature;
        return FromParts(pressure, temperature, Ideal(PowerRow.Base(tau)), Residual(PowerRow.Base(pi), PowerRow.Base(tau - 0.5)));
    }

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static PhaseCore FromParts(double pressure, double temperature, in PowerRow ideal, in PowerSum residual)
    {
        double tau = 540 / temperature, byTau = tau / (tau - 0.5);
        return PhaseCore.FromGibbs(
            pressure,
            temperature,
            Math.Log(pressure * 1e-6) + ideal.Value + residual.Value,
            1 + residual.A,
            residual.AA - 1,
            ideal.First + (byTau * residual.B),
            ideal.Second + (byTau * byTau * residual.BB),
            byTau * residual.AB);
    }
}
