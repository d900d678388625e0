using System.Runtime.CompilerServices;
using TwoPhase.Numerics;

namespace TwoPhase.Steam;

/// <summary>Steam from 1073.15 K to 2273.15 K, up to 50 MPa.</summary>
/// <remarks>Source: IAPWS R7-97(2012), section 9, equation (32): ideal part γ° and residual part γʳ with π = p / 1 MPa and τ = 1000 K / T.</remarks>
internal static class Region5
{
    [MethodImpl(Fast.Hot)]
    public static PhaseCore At(double pressure, double temperature)
    {
        double pi = pressure * 1e-6, tau = 1000 / temperature;
        PowerSum sum = Residual(PowerRow.Base(pi), PowerRow.Base(tau));
        PowerRow ideal = Ideal(PowerRow.Base(tau));
        return PhaseCore.FromGibbs(
            pressure,
            temperature,
            Math.Log(pi) + ideal.Value + sum.Value,
            1 + sum.A,
            sum.AA - 1,
            ideal.First + sum.B,
            ideal.Second + sum.BB,
            sum.AB);
    }

    // Equation (33) with Table 37 as printed, without its ln π: Σ n τ^J.
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static PowerRow Ideal(Spread t)
    {
        Spread t2 = t * t, tm1 = PowerRow.Base(1) / t, tm2 = tm1 * tm1, tm3 = tm2 * tm1;

        return PowerRow
            .Of(-0.13179983674201e2)
            .And(0.68540841634434e1, 1, t)
            .And(-0.24805148933466e-1, -3, tm3)
            .And(0.36901534980333, -2, tm2)
            .And(-0.31161318213925e1, -1, tm1)
            .And(-0.32961626538917, 2, t2);
    }

    // Equation (34) with Table 38 as printed: Σ n π^I τ^J.
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static PowerSum Residual(Spread a, Spread b)
    {
        Spread a2 = a * a, a3 = a2 * a;
        Spread b2 = b * b, b3 = b2 * b, b4 = b3 * b, b7 = b4 * b3, b9 = b7 * b2;

        var sum = default(PowerSum);
        sum.Add(1, a, PowerRow
            .Of(0.15736404855259e-2, 1, b)
            .And(0.90153761673944e-3, 2, b2)
            .And(-0.50270077677648e-2, 3, b3));
        sum.Add(2, a2, PowerRow
            .Of(0.22440037409485e-5, 3, b3)
            .And(-0.41163275453471e-5, 9, b9));
        sum.Add(3, a3, PowerRow
            .Of(0.37919454822955e-7, 7, b7));
        return sum;
    }
}
