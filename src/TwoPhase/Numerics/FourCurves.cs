using System.Runtime.CompilerServices;
#if NET
using System.Runtime.Intrinsics;
#endif

namespace TwoPhase.Numerics;

/// <summary>Four smooth functions of one positive variable, as polynomials of the seventh degree on an <see cref="OctaveGrid"/>.</summary>
internal sealed class FourCurves
{
    public const int Bits = 4;
    private const int Degree = 7;
    public const int Stride = Four.Count * (Degree + 1);

    private readonly int _first;
    private readonly CoefficientBlock _coefficients;

    /// <param name="low">Lowest place.</param>
    /// <param name="high">Highest place; the cells reach a little beyond, at least to the end of its coarser patch (<see cref="FourPatches"/>).</param>
    /// <param name="functions">The four functions; called at the eight nodes of each cell.</param>
    [MethodImpl(Fast.Hot)]
    public FourCurves(double low, double high, Func<double, Four> functions)
    {
        _first = OctaveGrid.Locate(low, Bits, out _);
        int cells = OctaveGrid.Locate(high, Bits, out _) - _first + 3;
        _coefficients = new(cells * Stride);
        var polynomial = new ChebyshevCell(Degree);
        for (int cell = 0; cell < cells; cell++)
        {
            double start = OctaveGrid.Start(_first + cell, Bits), half = (OctaveGrid.Start(_first + cell + 1, Bits) - start) / 2;
            for (int node = 0; node <= Degree; node++)
            {
                Four value = functions(start + (half * (1 + polynomial.Nodes[node])));
                for (int power = 0; power <= Degree; power++)
                    value.AddTo(_coefficients.Slice((cell * Stride) + (power * Four.Count), Four.Count), polynomial.Weight(power, node));
            }
        }
    }

    /// <summary>The lowest cell.</summary>
    public int First => _first;

    /// <summary>The coefficients of two over one grid: of each power four and four.</summary>
    public static CoefficientBlock Interleave(FourCurves first, FourCurves second)
    {
        var both = new CoefficientBlock(2 * first._coefficients.Length);
        for (int i = 0; i < first._coefficients.Length; i += Four.Count)
        {
            first._coefficients.Slice(i, Four.Count).CopyTo(both.Slice(2 * i, Four.Count));
            second._coefficients.Slice(i, Four.Count).CopyTo(both.Slice((2 * i) + Four.Count, Four.Count));
        }

        return both;
    }

    /// <summary>All four at one place inside the grid.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public Four At(double x)
    {
        int cell = OctaveGrid.Locate(x, Bits, out double s) - _first;
        ref double c = ref _coefficients[cell * Stride];
#if NET
        // In pairs, then pairs of pairs: a third of the wait of one chain.
        Vector256<double> one = Vector256.Create(s), two = one * one, four = two * two;
        Vector256<double> low = Vector256.FusedMultiplyAdd(Pair(ref c, 2, one), two, Pair(ref c, 0, one));
        Vector256<double> high = Vector256.FusedMultiplyAdd(Pair(ref c, 6, one), two, Pair(ref c, 4, one));
        return Unsafe.BitCast<Vector256<double>, Four>(Vector256.FusedMultiplyAdd(high, four, low));
#else
        return new(Sum(ref c, s), Sum(ref Unsafe.Add(ref c, 1), s), Sum(ref Unsafe.Add(ref c, 2), s), Sum(ref Unsafe.Add(ref c, 3), s));
#endif
    }

#if NET
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static Vector256<double> Pair(ref double c, int power, Vector256<double> s) => Vector256.FusedMultiplyAdd(
        Vector256.LoadUnsafe(ref c, (nuint)((power + 1) * Four.Count)),
        s,
        Vector256.LoadUnsafe(ref c, (nuint)(power * Four.Count)));
#else
    private static double Sum(ref double c, double s)
    {
        double sum = Unsafe.Add(ref c, Degree * Four.Count);
        for (int power = Degree - 1; power >= 0; power--) sum = (sum * s) + Unsafe.Add(ref c, power * Four.Count);
        return sum;
    }
#endif
}
