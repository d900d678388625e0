#if NET
using System.Runtime.CompilerServices;
using System.Runtime.Intrinsics;
using TwoPhase.Numerics;
using static System.Runtime.Intrinsics.Vector256;
#endif

namespace TwoPhase.Flow;

public static partial class FrictionFactor
{
    /// <summary>dp/dz [Pa/m] of the whole flow as liquid and as vapour; both at once, where the machine can, for little more than the cost of one.</summary>
    internal static (double Liquid, double Vapour) GradientPair(in FlowState flow, double roughness)
    {
#if NET
        double reynolds = flow.MassFlux * flow.Bore, liquidReynolds = reynolds / flow.LiquidViscosity, vapourReynolds = reynolds / flow.VapourViscosity;
        if (IsHardwareAccelerated && liquidReynolds > TransitionReynolds && vapourReynolds > TransitionReynolds)
        {
            Vector256<double> factor = ColebrookPair(liquidReynolds, vapourReynolds, roughness / flow.Bore);
            double kinetic = flow.MassFlux * flow.MassFlux / (2 * flow.Bore);
            return (factor.ToScalar() * kinetic / flow.LiquidDensity, factor.GetElement(1) * kinetic / flow.VapourDensity);
        }
#endif
        return (
            GradientCore(flow.MassFlux, flow.Bore, flow.LiquidDensity, flow.LiquidViscosity, roughness),
            GradientCore(flow.MassFlux, flow.Bore, flow.VapourDensity, flow.VapourViscosity, roughness));
    }

#if NET
    // ColebrookCore for two Re above transition, in lanes 0 and 1 (four lanes, because the runtime's logarithm of two is slow until it
    // is compiled anew). The same start and Householder step; the second step is Halley's, with the logarithm of the first and a
    // series for the little it moved. Relative error of f at most 1e-15.
    [MethodImpl(Fast.Hot)]
    private static Vector256<double> ColebrookPair(double reynolds0, double reynolds1, double relativeRoughness)
    {
        Vector256<double> c = Create(0.86858896380650365530), one = Create(1.0); // c = 2 / ln 10
        Vector256<double> a = Create(relativeRoughness / 3.7), b = Create(2.51) / Create(reynolds0, reynolds1, reynolds0, reynolds1);
        Vector256<double> s = -c * Log(a + (b * 7.5));

        Vector256<double> argument = FusedMultiplyAdd(b, s, a), logarithm = Log(argument), k = b / argument;
        Vector256<double> residual = FusedMultiplyAdd(c, logarithm, s), slope = FusedMultiplyAdd(c, k, one), second = -c * k * k, third = -2 * k * second;
        Vector256<double> step = residual * ((3 * residual * second) - (6 * slope * slope))
            / ((6 * slope * slope * slope) - (6 * residual * slope * second) + (residual * residual * third));

        logarithm += LogOnePlus(k * step);
        s += step;
        k = b / FusedMultiplyAdd(b, s, a);
        residual = FusedMultiplyAdd(c, logarithm, s);
        slope = FusedMultiplyAdd(c, k, one);
        Vector256<double> scale = FusedMultiplyAdd(slope, slope, 0.5 * c * residual * k * k);
        Vector256<double> root = scale / FusedMultiplyAdd(s, scale, -residual * slope); // √f
        return root * root;
    }

    // ln(1 + d) = 2 artanh(d / (2 + d)), by its series; d is at most 0.11 above transition.
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static Vector256<double> LogOnePlus(Vector256<double> d)
    {
        Vector256<double> z = d / (d + Create(2.0)), w = z * z;
        Vector256<double> sum = FusedMultiplyAdd(w, Create(1.0 / 11), Create(1.0 / 9));
        sum = FusedMultiplyAdd(w, sum, Create(1.0 / 7));
        sum = FusedMultiplyAdd(w, sum, Create(1.0 / 5));
        sum = FusedMultiplyAdd(w, sum, Create(1.0 / 3));
        return 2 * FusedMultiplyAdd(z * w, sum, z);
    }
#endif
}
