using System.Runtime.CompilerServices;
using TwoPhase.Numerics;

namespace TwoPhase.Steam;

internal static partial class Region2
{
    /// <summary>Supersaturated vapour, held back from condensing: between the saturation line and 95 % equilibrium quality, up to 10 MPa.</summary>
    /// <remarks>Source: IAPWS R7-97(2012), section 6.2, equation (18).</remarks>
    [MethodImpl(Fast.Hot)]
    public static PhaseCore Metastable(double pressure, double temperature)
    {
        // The ideal part is that of stable vapour with two coefficients adjusted (note to Table 10).
        const double n1 = -0.96937268393049e1 - StableN1, n2 = 0.10087275970006e2 - StableN2;
        double pi = pressure * 1e-6, tau = 540 / temperature;
        PowerRow ideal = Ideal(PowerRow.Base(tau)).And(n1).And(n2, 1, PowerRow.Base(tau));
        return FromParts(pressure, temperature, ideal, MetastableResidual(PowerRow.Base(pi), PowerRow.Base(tau - 0.5)));
    }

    // Equation (19) with Table 16 as printed: Σ n π^I (τ − 0.5)^J.
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static PowerSum MetastableResidual(Spread a, Spread b)
    {
        Spread a2 = a * a, a3 = a2 * a, a4 = a2 * a2, a5 = a4 * a;
        Spread b2 = b * b, b4 = b2 * b2, b5 = b4 * b, b7 = b5 * b2, b8 = b4 * b4, b9 = b8 * b, b10 = b8 * b2, b11 = b9 * b2, b16 = b8 * b8;

        var sum = default(PowerSum);
        sum.Add(1, a, PowerRow
            .Of(-0.73362260186506e-2)
            .And(-0.88223831943146e-1, 2, b2)
            .And(-0.72334555213245e-1, 5, b5)
            .And(-0.40813178534455e-2, 11, b11));
        sum.Add(2, a2, PowerRow
            .Of(0.20097803380207e-2, 1, b)
            .And(-0.53045921898642e-1, 7, b7)
            .And(-0.76190409086970e-2, 16, b16));
        sum.Add(3, a3, PowerRow
            .Of(-0.63498037657313e-2, 4, b4)
            .And(-0.86043093028588e-1, 16, b16));
        sum.Add(4, a4, PowerRow
            .Of(0.75321581522770e-2, 7, b7)
            .And(-0.79238375446139e-2, 10, b10));
        sum.Add(5, a5, PowerRow
            .Of(-0.22888160778447e-3, 9, b9)
            .And(-0.26456501482810e-2, 10, b10));
        return sum;
    }
}
