using System.Runtime.CompilerServices;
using TwoPhase.Numerics;

namespace TwoPhase.Steam;

/// <summary>Liquid water up to 623.15 K and 100 MPa.</summary>
/// <remarks>Source: IAPWS R7-97(2012), section 5.1, equation (7): γ(π,τ) with π = p / 16.53 MPa and τ = 1386 K / T.</remarks>
internal static partial class Region1
{
    [MethodImpl(Fast.Hot)]
    public static PhaseCore At(double pressure, double temperature)
    {
        double pi = pressure * (1 / 16.53e6), tau = 1386 / temperature;
        double a = 7.1 - pi, b = tau - 1.222;
        PowerSum sum = Sum(PowerRow.Base(a), PowerRow.Base(b));
        double byPi = -pi / a, byTau = tau / b;
        return PhaseCore.FromGibbs(
            pressure,
            temperature,
            sum.Value,
            byPi * sum.A,
            byPi * byPi * sum.AA,
            byTau * sum.B,
            byTau * byTau * sum.BB,
            byPi * byTau * sum.AB);
    }
}
