using System.Runtime.CompilerServices;
using TwoPhase.Numerics;

namespace TwoPhase.Steam;

internal static partial class Region1
{
    // Equation (7) of R7-97(2012) with Table 2 as printed: Σ n (7.1 − π)^I (τ − 1.222)^J, one row for each exponent I.
    // Powers are written out as products, each as few steps from b as it goes; a run-time table of exponents is several times slower.
    [MethodImpl(Fast.Hot)]
    private static PowerSum Sum(Spread a, Spread b)
    {
        Spread a2 = a * a, a3 = a2 * a, a4 = a2 * a2, a5 = a4 * a, a8 = a4 * a4, a16 = a8 * a8, a21 = a16 * a5, a23 = a21 * a2, a29 = a21 * a8, a30 = a29 * a,
               a31 = a29 * a2, a32 = a16 * a16;
        Spread b2 = b * b, b3 = b2 * b, b4 = b2 * b2, b5 = b4 * b, b6 = b4 * b2, b8 = b4 * b4, b10 = b8 * b2, b17 = b8 * b8 * b, bm1 = PowerRow.Base(1) / b,
               bm2 = bm1 * bm1, bm3 = bm2 * bm1, bm4 = bm2 * bm2, bm5 = bm4 * bm1, bm6 = bm4 * bm2, bm7 = bm4 * bm3, bm8 = bm4 * bm4, bm9 = bm8 * bm1,
               bm11 = bm8 * bm3, bm16 = bm8 * bm8, bm24 = bm16 * bm8, bm29 = bm24 * bm5, bm31 = bm24 * bm7, bm32 = bm16 * bm16, bm38 = bm32 * bm6,
               bm39 = bm32 * bm7, bm40 = bm32 * bm8, bm41 = bm32 * bm9;

        var sum = default(PowerSum);
        sum.Add(PowerRow
            .Of(0.14632971213167, -2, bm2)
            .And(-0.84548187169114, -1, bm1)
            .And(-0.37563603672040e1)
            .And(0.33855169168385e1, 1, b)
            .And(-0.95791963387872, 2, b2)
            .And(0.15772038513228, 3, b3)
            .And(-0.16616417199501e-1, 4, b4)
            .And(0.81214629983568e-3, 5, b5));
        sum.Add(1, a, PowerRow
            .Of(0.28319080123804e-3, -9, bm9)
            .And(-0.60706301565874e-3, -7, bm7)
            .And(-0.18990068218419e-1, -1, bm1)
            .And(-0.32529748770505e-1)
            .And(-0.21841717175414e-1, 1, b)
            .And(-0.52838357969930e-4, 3, b3));
        sum.Add(2, a2, PowerRow
            .Of(-0.47184321073267e-3, -3, bm3)
            .And(-0.30001780793026e-3)
            .And(0.47661393906987e-4, 1, b)
            .And(-0.44141845330846e-5, 3, b3)
            .And(-0.72694996297594e-15, 17, b17));
        sum.Add(3, a3, PowerRow
            .Of(-0.31679644845054e-4, -4, bm4)
            .And(-0.28270797985312e-5)
            .And(-0.85205128120103e-9, 6, b6));
        sum.Add(4, a4, PowerRow
            .Of(-0.22425281908000e-5, -5, bm5)
            .And(-0.65171222895601e-6, -2, bm2)
            .And(-0.14341729937924e-12, 10, b10));
        sum.Add(5, a5, PowerRow
            .Of(-0.40516996860117e-6, -8, bm8));
        sum.Add(8, a8, PowerRow
            .Of(-0.12734301741641e-8, -11, bm11)
            .And(-0.17424871230634e-9, -6, bm6));
        sum.Add(21, a21, PowerRow
            .Of(-0.68762131295531e-18, -29, bm29));
        sum.Add(23, a23, PowerRow
            .Of(0.14478307828521e-19, -31, bm31));
        sum.Add(29, a29, PowerRow
            .Of(0.26335781662795e-22, -38, bm38));
        sum.Add(30, a30, PowerRow
            .Of(-0.11947622640071e-22, -39, bm39));
        sum.Add(31, a31, PowerRow
            .Of(0.18228094581404e-23, -40, bm40));
        sum.Add(32, a32, PowerRow
            .Of(-0.93537087292458e-25, -41, bm41));
        return sum;
    }
}
