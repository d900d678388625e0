using System.Runtime.CompilerServices;
using TwoPhase.Numerics;

namespace TwoPhase.Steam;

internal static partial class Region3
{
    // Equation (28) of R7-97(2012) with Table 30 as printed, n1 ln δ first: φ = n1 ln δ + Σ n δ^I τ^J.
    private const double N1 = 0.10658070028513e1;

    [MethodImpl(Fast.Hot)]
    private static PowerSum Sum(Spread a, Spread b)
    {
        Spread a2 = a * a, a3 = a2 * a, a4 = a2 * a2, a5 = a4 * a, a6 = a4 * a2, a7 = a4 * a3, a8 = a4 * a4, a9 = a8 * a, a10 = a8 * a2, a11 = a8 * a3;
        Spread b2 = b * b, b3 = b2 * b, b4 = b2 * b2, b6 = b4 * b2, b7 = b4 * b3, b8 = b4 * b4, b10 = b8 * b2, b12 = b8 * b4, b15 = b8 * b7, b16 = b8 * b8,
               b17 = b16 * b, b22 = b16 * b6, b23 = b16 * b7, b26 = b16 * b10;

        var sum = default(PowerSum);
        sum.Add(PowerRow
            .Of(-0.15732845290239e2)
            .And(0.20944396974307e2, 1, b)
            .And(-0.76867707878716e1, 2, b2)
            .And(0.26185947787954e1, 7, b7)
            .And(-0.28080781148620e1, 10, b10)
            .And(0.12053369696517e1, 12, b12)
            .And(-0.84566812812502e-2, 23, b23));
        sum.Add(1, a, PowerRow
            .Of(-0.12654315477714e1, 2, b2)
            .And(-0.11524407806681e1, 6, b6)
            .And(0.88521043984318, 15, b15)
            .And(-0.64207765181607, 17, b17));
        sum.Add(2, a2, PowerRow
            .Of(0.38493460186671)
            .And(-0.85214708824206, 2, b2)
            .And(0.48972281541877e1, 6, b6)
            .And(-0.30502617256965e1, 7, b7)
            .And(0.39420536879154e-1, 22, b22)
            .And(0.12558408424308, 26, b26));
        sum.Add(3, a3, PowerRow
            .Of(-0.27999329698710)
            .And(0.13899799569460e1, 2, b2)
            .And(-0.20189915023570e1, 4, b4)
            .And(-0.82147637173963e-2, 16, b16)
            .And(-0.47596035734923, 26, b26));
        sum.Add(4, a4, PowerRow
            .Of(0.43984074473500e-1)
            .And(-0.44476435428739, 2, b2)
            .And(0.90572070719733, 4, b4)
            .And(0.70522450087967, 26, b26));
        sum.Add(5, a5, PowerRow
            .Of(0.10770512626332, 1, b)
            .And(-0.32913623258954, 3, b3)
            .And(-0.50871062041158, 26, b26));
        sum.Add(6, a6, PowerRow
            .Of(-0.22175400873096e-1)
            .And(0.94260751665092e-1, 2, b2)
            .And(0.16436278447961, 26, b26));
        sum.Add(7, a7, PowerRow
            .Of(-0.13503372241348e-1, 2, b2));
        sum.Add(8, a8, PowerRow
            .Of(-0.14834345352472e-1, 26, b26));
        sum.Add(9, a9, PowerRow
            .Of(0.57922953628084e-3, 2, b2)
            .And(0.32308904703711e-2, 26, b26));
        sum.Add(10, a10, PowerRow
            .Of(0.80964802996215e-4)
            .And(-0.16557679795037e-3, 1, b));
        sum.Add(11, a11, PowerRow
            .Of(-0.44923899061815e-4, 26, b26));
        return sum;
    }
}
