using System.Runtime.CompilerServices;
#if NET
using System.Runtime.Intrinsics;
#endif

namespace TwoPhase.Numerics;

/// <summary>Two sets of <see cref="FourCurves"/> side by side, in one register where the processor has it: little dearer than one.</summary>
internal sealed class EightCurves(FourCurves first, FourCurves second)
{
#if NET
    private readonly int _first = first.First;
    private readonly CoefficientBlock _coefficients = FourCurves.Interleave(first, second);

    /// <summary>All eight at one place inside the grid, straight into memory: handed back they would be taken apart and put together again, at the price of finding them.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public void At(double x, out Eight values)
    {
        Unsafe.SkipInit(out values);
        InRegister(x).StoreUnsafe(ref Unsafe.As<Eight, double>(ref values));
    }

    /// <summary>The eight, left where they were computed.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public Vector512<double> InRegister(double x)
    {
        int cell = OctaveGrid.Locate(x, FourCurves.Bits, out double s) - _first;
        ref double c = ref _coefficients[cell * 2 * FourCurves.Stride];
        Vector512<double> one = Vector512.Create(s), two = one * one, four = two * two;
        Vector512<double> low = Vector512.FusedMultiplyAdd(Pair(ref c, 2, one), two, Pair(ref c, 0, one));
        Vector512<double> high = Vector512.FusedMultiplyAdd(Pair(ref c, 6, one), two, Pair(ref c, 4, one));
        return Vector512.FusedMultiplyAdd(high, four, low);
    }

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static Vector512<double> Pair(ref double c, int power, Vector512<double> s) => Vector512.FusedMultiplyAdd(
        Vector512.LoadUnsafe(ref c, (nuint)((power + 1) * 2 * Four.Count)),
        s,
        Vector512.LoadUnsafe(ref c, (nuint)(power * 2 * Four.Count)));
#else
    public void At(double x, out Eight values) => values = new(first.At(x), second.At(x));
#endif
}
