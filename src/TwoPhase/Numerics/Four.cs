using System.Runtime.CompilerServices;
using System.Runtime.InteropServices;
#if NET
using System.Runtime.Intrinsics;
#endif

namespace TwoPhase.Numerics;

/// <summary>Four numbers that are computed side by side, in one vector register where the runtime has one.</summary>
[StructLayout(LayoutKind.Sequential)]
internal readonly struct Four(double a, double b, double c, double d)
{
    public const int Count = 4;

    public static readonly Four NaN = new(double.NaN, double.NaN, double.NaN, double.NaN);

    public readonly double A = a;
    public readonly double B = b;
    public readonly double C = c;
    public readonly double D = d;

    /// <summary>ln of the product of the four raised to four exponents: the logarithms cost little more than one.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static double LogOfPowers(Four factors, Four exponents)
    {
#if NET
        if (Vector256.IsHardwareAccelerated)
            return Vector256.Sum(Vector256.Create(exponents.A, exponents.B, exponents.C, exponents.D) * Vector256.Log(Vector256.Create(factors.A, factors.B, factors.C, factors.D)));
#endif
        return (exponents.A * Math.Log(factors.A)) + (exponents.B * Math.Log(factors.B)) + (exponents.C * Math.Log(factors.C)) + (exponents.D * Math.Log(factors.D));
    }

    /// <summary>Adds the four, times a weight, to four numbers.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public void AddTo(Span<double> sums, double weight)
    {
        sums[0] += weight * A;
        sums[1] += weight * B;
        sums[2] += weight * C;
        sums[3] += weight * D;
    }
}
