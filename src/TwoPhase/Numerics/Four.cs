using System.Runtime.CompilerServices;
using System.Runtime.InteropServices;

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
