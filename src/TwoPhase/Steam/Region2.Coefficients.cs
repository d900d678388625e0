using System.Runtime.CompilerServices;
using TwoPhase.Numerics;

namespace TwoPhase.Steam;

internal static partial class Region2
{
    // The first two of Table 10, which metastable vapour replaces.
    private const double StableN1 = -0.96927686500217e1, StableN2 = 0.10086655968018e2;

    // Equation (16) of R7-97(2012) with Table 10 as printed, without its ln π: Σ n τ^J.
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static PowerRow Ideal(Spread t)
    {
        Spread t2 = t * t, t3 = t2 * t, tm1 = PowerRow.Base(1) / t, tm2 = tm1 * tm1, tm3 = tm2 * tm1, tm4 = tm3 * tm1, tm5 = tm4 * tm1;

        return PowerRow
            .Of(StableN1)
            .And(StableN2, 1, t)
            .And(-0.56087911283020e-2, -5, tm5)
            .And(0.71452738081455e-1, -4, tm4)
            .And(-0.40710498223928, -3, tm3)
            .And(0.14240819171444e1, -2, tm2)
            .And(-0.43839511319450e1, -1, tm1)
            .And(-0.28408632460772, 2, t2)
            .And(0.21268463753307e-1, 3, t3);
    }

    // Equation (17) with Table 11 as printed: Σ n π^I (τ − 0.5)^J, one row for each exponent I.
    [MethodImpl(Fast.Hot)]
    private static PowerSum Residual(Spread a, Spread b)
    {
        Spread a2 = a * a, a3 = a2 * a, a4 = a2 * a2, a5 = a4 * a, a6 = a4 * a2, a7 = a4 * a3, a8 = a4 * a4, a9 = a8 * a, a10 = a8 * a2, a16 = a8 * a8,
               a18 = a16 * a2, a20 = a16 * a4, a21 = a16 * a5, a22 = a16 * a6, a23 = a16 * a7, a24 = a16 * a8;
        Spread b2 = b * b, b3 = b2 * b, b4 = b2 * b2, b6 = b4 * b2, b7 = b4 * b3, b8 = b4 * b4, b10 = b8 * b2, b11 = b8 * b3, b13 = b10 * b3,
               b14 = b8 * b6, b16 = b8 * b8, b20 = b16 * b4, b21 = b14 * b7, b25 = b14 * b11, b26 = b16 * b10, b29 = b16 * b13, b32 = b16 * b16, b35 = b32 * b3,
               b36 = b32 * b4, b39 = b32 * b7, b40 = b32 * b8, b48 = b32 * b16, b50 = b25 * b25, b53 = b32 * b21, b57 = b32 * b25, b58 = b32 * b26;

        var sum = default(PowerSum);
        sum.Add(1, a, PowerRow
            .Of(-0.17731742473213e-2)
            .And(-0.17834862292358e-1, 1, b)
            .And(-0.45996013696365e-1, 2, b2)
            .And(-0.57581259083432e-1, 3, b3)
            .And(-0.50325278727930e-1, 6, b6));
        sum.Add(2, a2, PowerRow
            .Of(-0.33032641670203e-4, 1, b)
            .And(-0.18948987516315e-3, 2, b2)
            .And(-0.39392777243355e-2, 4, b4)
            .And(-0.43797295650573e-1, 7, b7)
            .And(-0.26674547914087e-4, 36, b36));
        sum.Add(3, a3, PowerRow
            .Of(0.20481737692309e-7)
            .And(0.43870667284435e-6, 1, b)
            .And(-0.32277677238570e-4, 3, b3)
            .And(-0.15033924542148e-2, 6, b6)
            .And(-0.40668253562649e-1, 35, b35));
        sum.Add(4, a4, PowerRow
            .Of(-0.78847309559367e-9, 1, b)
            .And(0.12790717852285e-7, 2, b2)
            .And(0.48225372718507e-6, 3, b3));
        sum.Add(5, a5, PowerRow
            .Of(0.22922076337661e-5, 7, b7));
        sum.Add(6, a6, PowerRow
            .Of(-0.16714766451061e-10, 3, b3)
            .And(-0.21171472321355e-2, 16, b16)
            .And(-0.23895741934104e2, 35, b35));
        sum.Add(7, a7, PowerRow
            .Of(-0.59059564324270e-17)
            .And(-0.12621808899101e-5, 11, b11)
            .And(-0.38946842435739e-1, 25, b25));
        sum.Add(8, a8, PowerRow
            .Of(0.11256211360459e-10, 8, b8)
            .And(-0.82311340897998e1, 36, b36));
        sum.Add(9, a9, PowerRow
            .Of(0.19809712802088e-7, 13, b13));
        sum.Add(10, a10, PowerRow
            .Of(0.10406965210174e-18, 4, b4)
            .And(-0.10234747095929e-12, 10, b10)
            .And(-0.10018179379511e-8, 14, b14));
        sum.Add(16, a16, PowerRow
            .Of(-0.80882908646985e-10, 29, b29)
            .And(0.10693031879409, 50, b50));
        sum.Add(18, a18, PowerRow
            .Of(-0.33662250574171, 57, b57));
        sum.Add(20, a20, PowerRow
            .Of(0.89185845355421e-24, 20, b20)
            .And(0.30629316876232e-12, 35, b35)
            .And(-0.42002467698208e-5, 48, b48));
        sum.Add(21, a21, PowerRow
            .Of(-0.59056029685639e-25, 21, b21));
        sum.Add(22, a22, PowerRow
            .Of(0.37826947613457e-5, 53, b53));
        sum.Add(23, a23, PowerRow
            .Of(-0.12768608934681e-14, 39, b39));
        sum.Add(24, a24, PowerRow
            .Of(0.73087610595061e-28, 26, b26)
            .And(0.55414715350778e-16, 40, b40)
            .And(-0.94369707241210e-6, 58, b58));
        return sum;
    }
}
