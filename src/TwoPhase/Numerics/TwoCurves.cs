using System.Runtime.CompilerServices;
#if NET
using System.Runtime.Intrinsics;
using System.Runtime.Intrinsics.X86;
#endif

namespace TwoPhase.Numerics;

/// <summary>
/// Two smooth functions of one positive variable, as cubics on an <see cref="OctaveGrid"/> so fine that a cell is one cache line:
/// the shortest way from a number to two others.
/// </summary>
internal sealed class TwoCurves
{
    private const int Bits = 8;
    private const int Degree = 3;
    private const int Stride = 1 << StrideBits;   // two functions of four coefficients
    private const int StrideBits = 3;

    private readonly int _first;
    private readonly CoefficientBlock _coefficients;

    /// <param name="low">Lowest place.</param>
    /// <param name="high">Highest place; the last cell may reach a little beyond.</param>
    /// <param name="functions">The two functions; called at the four nodes of each cell.</param>
    [MethodImpl(Fast.Hot)]
    public TwoCurves(double low, double high, Func<double, (double First, double Second)> functions)
    {
        _first = OctaveGrid.Locate(low, Bits, out _);
        int cells = OctaveGrid.Locate(high, Bits, out _) - _first + 1;
        _coefficients = new(cells * Stride);
        var polynomial = new ChebyshevCell(Degree);
        for (int cell = 0; cell < cells; cell++)
        {
            Span<double> sums = _coefficients.Slice(cell * Stride, Stride);
            double start = OctaveGrid.Start(_first + cell, Bits), half = (OctaveGrid.Start(_first + cell + 1, Bits) - start) / 2;
            for (int node = 0; node <= Degree; node++)
            {
                (double first, double second) = functions(start + (half * (1 + polynomial.Nodes[node])));
                for (int power = 0; power <= Degree; power++)
                {
                    sums[2 * power] += polynomial.Weight(power, node) * first;
                    sums[(2 * power) + 1] += polynomial.Weight(power, node) * second;
                }
            }
        }
    }

    /// <summary>Both at one place inside the grid.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public void At(double x, out double first, out double second)
    {
        int cell = OctaveGrid.Locate(x, Bits, out double s) - _first;
        ref double c = ref _coefficients[cell * Stride];
#if NET
        Vector128<double> place = Vector128.Create(s), both = Vector128.LoadUnsafe(ref c, 2 * Degree);
        both = Vector128.FusedMultiplyAdd(both, place, Vector128.LoadUnsafe(ref c, 4));
        both = Vector128.FusedMultiplyAdd(both, place, Vector128.LoadUnsafe(ref c, 2));
        both = Vector128.FusedMultiplyAdd(both, place, Vector128.LoadUnsafe(ref c));
        (first, second) = (both.ToScalar(), both.GetElement(1));
#else
        first = (((((Unsafe.Add(ref c, 6) * s) + Unsafe.Add(ref c, 4)) * s) + Unsafe.Add(ref c, 2)) * s) + c;
        second = (((((Unsafe.Add(ref c, 7) * s) + Unsafe.Add(ref c, 5)) * s) + Unsafe.Add(ref c, 3)) * s) + Unsafe.Add(ref c, 1);
#endif
    }

#if NET
    /// <summary>Whether the processor can do four places at a time.</summary>
    public static bool IsVectorised => Avx2.IsSupported && Vector256.IsHardwareAccelerated;

    /// <summary>The curves held in registers, for a loop.</summary>
    public Vectors InVectors
    {
        [MethodImpl(MethodImplOptions.AggressiveInlining)]
        get => new(ref _coefficients[0], _first);
    }

    public readonly ref struct Vectors
    {
        private readonly ref double _start;
        private readonly Vector256<long> _first;

        [MethodImpl(MethodImplOptions.AggressiveInlining)]
        public Vectors(ref double start, int first)
        {
            _start = ref start;
            _first = Vector256.Create((long)first);
        }

        /// <summary>Both at four places inside the grid, the same to the last bit as one by one.</summary>
        [MethodImpl(MethodImplOptions.AggressiveInlining)]
        public void At(Vector256<double> x, out Vector256<double> first, out Vector256<double> second)
        {
            OctaveGrid.Locate(x, Bits, out Vector256<long> cells, out Vector256<double> s);
            Vector256<long> starts = (cells - _first) << StrideBits;
            Vector256<double> even = Pair(starts.GetLower().ToScalar(), starts.GetUpper().ToScalar(), Avx.UnpackLow(s, s));
            Vector256<double> odd = Pair(starts.GetLower().GetElement(1), starts.GetUpper().GetElement(1), Avx.UnpackHigh(s, s));
            (first, second) = (Avx.UnpackLow(even, odd), Avx.UnpackHigh(even, odd));
        }

        // Both functions at two places.
        [MethodImpl(MethodImplOptions.AggressiveInlining)]
        private Vector256<double> Pair(long one, long other, Vector256<double> s)
        {
            ref double low = ref Unsafe.Add(ref _start, (nint)one), high = ref Unsafe.Add(ref _start, (nint)other);
            Vector256<double> sum = Both(ref low, ref high, 2 * Degree);
            sum = Vector256.FusedMultiplyAdd(sum, s, Both(ref low, ref high, 4));
            sum = Vector256.FusedMultiplyAdd(sum, s, Both(ref low, ref high, 2));
            return Vector256.FusedMultiplyAdd(sum, s, Both(ref low, ref high, 0));
        }

        [MethodImpl(MethodImplOptions.AggressiveInlining)]
        private static Vector256<double> Both(ref double low, ref double high, nuint at) =>
            Vector256.Create(Vector128.LoadUnsafe(ref low, at), Vector128.LoadUnsafe(ref high, at));
    }
#endif
}
