using System.Runtime.CompilerServices;
#if NET
using System.Runtime.Intrinsics;
#endif

namespace TwoPhase.Numerics;

/// <summary>
/// Four smooth functions of two variables as polynomials of the fifth degree in each: rows of an <see cref="OctaveGrid"/> in the
/// first, equal columns from 0 to 1 in the second. Neighbouring patches share the nodes of their common edge, so they meet.
/// </summary>
internal sealed class FourPatches
{
    private const int Bits = 3;
    private const int Degree = 5;
    private const int Side = Degree + 1;
    private const int Stride = Four.Count * Side * Side;

    private readonly int _first;
    private readonly int _columns;
    private readonly CoefficientBlock _coefficients;

    /// <param name="low">Lowest first variable.</param>
    /// <param name="high">Highest first variable.</param>
    /// <param name="columns">How many columns between 0 and 1 of the second.</param>
    /// <param name="functions">The four functions; called at 36 nodes of each patch, to the end of the last row.</param>
    [MethodImpl(Fast.Hot)]
    public FourPatches(double low, double high, int columns, Func<double, double, Four> functions)
    {
        _first = OctaveGrid.Locate(low, Bits, out _);
        _columns = columns;
        int patches = (OctaveGrid.Locate(high, Bits, out _) - _first + 1) * columns;
        _coefficients = new(patches * Stride);
        var polynomial = new ChebyshevCell(Degree);
        for (int patch = 0; patch < patches; patch++)
        {
            int row = _first + (patch / columns), column = patch % columns;
            double start = OctaveGrid.Start(row, Bits), half = (OctaveGrid.Start(row + 1, Bits) - start) / 2;
            for (int node = 0; node < Side * Side; node++)
            {
                double x = start + (half * (1 + polynomial.Nodes[node / Side]));
                double u = (column + ((1 + polynomial.Nodes[node % Side]) / 2)) / columns;
                Add(_coefficients.Slice(patch * Stride, Stride), polynomial, node, functions(x, u));
            }
        }
    }

    /// <summary>Bytes that the coefficients take.</summary>
    public long Bytes => sizeof(double) * (long)_coefficients.Length;

    /// <summary>All four at one place inside the grid; <paramref name="u"/> from 0 to 1.</summary>
    [MethodImpl(Fast.Hot)]
    public Four At(double x, double u)
    {
        int row = OctaveGrid.Locate(x, Bits, out double r) - _first;
        double across = u * _columns;
        int column = Math.Min(Fast.Truncate(across), _columns - 1);
        double s = (2 * (across - column)) - 1;
        ref double c = ref _coefficients[((row * _columns) + column) * Stride];
#if NET
        // An even power of r and the next odd one share a register; even and odd powers of s are chains side by side.
        Vector512<double> one = Vector512.Create(s), two = one * one, square = Vector512.Create(r * r);
        Vector512<double> both = Vector512.FusedMultiplyAdd(Row(ref c, 2, one, two), square, Row(ref c, 1, one, two));
        both = Vector512.FusedMultiplyAdd(both, square, Row(ref c, 0, one, two));
        return Unsafe.BitCast<Vector256<double>, Four>(Vector256.FusedMultiplyAdd(both.GetUpper(), Vector256.Create(r), both.GetLower()));
#else
        return new(Sum(ref c, r, s), Sum(ref Unsafe.Add(ref c, 1), r, s), Sum(ref Unsafe.Add(ref c, 2), r, s), Sum(ref Unsafe.Add(ref c, 3), r, s));
#endif
    }

    // Where the coefficient of r^i s^j stands: pairs of i, then j, then odd after even.
    private static int Offset(int i, int j) => Four.Count * ((((i / 2) * Side) + j) * 2 + (i % 2));

    [MethodImpl(Fast.Hot)]
    private static void Add(Span<double> coefficients, ChebyshevCell polynomial, int node, Four value)
    {
        for (int i = 0; i < Side; i++)
        {
            for (int j = 0; j < Side; j++)
                value.AddTo(coefficients.Slice(Offset(i, j), Four.Count), polynomial.Weight(i, node / Side) * polynomial.Weight(j, node % Side));
        }
    }

#if NET
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static Vector512<double> Row(ref double c, int pair, Vector512<double> one, Vector512<double> two)
    {
        ref double row = ref Unsafe.Add(ref c, pair * Side * Vector512<double>.Count);
        Vector512<double> even = Vector512.FusedMultiplyAdd(Term(ref row, 4), two, Term(ref row, 2));
        Vector512<double> odd = Vector512.FusedMultiplyAdd(Term(ref row, 5), two, Term(ref row, 3));
        even = Vector512.FusedMultiplyAdd(even, two, Term(ref row, 0));
        odd = Vector512.FusedMultiplyAdd(odd, two, Term(ref row, 1));
        return Vector512.FusedMultiplyAdd(odd, one, even);
    }

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static Vector512<double> Term(ref double row, int power) => Vector512.LoadUnsafe(ref row, (nuint)(power * Vector512<double>.Count));
#else
    private static double Sum(ref double c, double r, double s)
    {
        double sum = 0;
        for (int i = Degree; i >= 0; i--)
        {
            double row = 0;
            for (int j = Degree; j >= 0; j--) row = (row * s) + Unsafe.Add(ref c, Offset(i, j));
            sum = (sum * r) + row;
        }

        return sum;
    }
#endif
}
