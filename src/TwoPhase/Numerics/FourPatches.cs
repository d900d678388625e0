using System.Runtime.CompilerServices;
#if NET
using System.Runtime.Intrinsics;
#endif

namespace TwoPhase.Numerics;

/// <summary>
/// Four smooth functions of two variables as polynomials of the fourth degree: rows of an <see cref="OctaveGrid"/> in the
/// first, equal columns in the second. Neighbouring patches share the nodes of their common edge, so functions that meet there still do.
/// </summary>
/// <remarks>What belongs to the fourth power in the first is so small that it may run straight from one edge of a column to the other.</remarks>
internal sealed class FourPatches
{
    private const int Bits = 4;
    private const int Rise = 4;
    private const int Run = 5;
    private const int Tip = Four.Count * Rise * Run;
    private const int Stride = Tip + (4 * Four.Count);

    private readonly int _first;
    private readonly int _columns;
    private readonly CoefficientBlock _coefficients;

    /// <param name="low">Lowest first variable.</param>
    /// <param name="high">Highest first variable.</param>
    /// <param name="columns">How many columns there are of the second.</param>
    /// <param name="functions">
    /// The four functions of the first variable, a column, and from 0 to 1 the place in it; called at 25 nodes of each patch, to the end of the last row.
    /// </param>
    [MethodImpl(Fast.Hot)]
    public FourPatches(double low, double high, int columns, Func<double, int, double, Four> functions)
    {
        _first = OctaveGrid.Locate(low, Bits, out _);
        _columns = columns;
        int patches = (OctaveGrid.Locate(high, Bits, out _) - _first + 1) * columns;
        _coefficients = new(patches * Stride);
        var (alongRow, alongColumn) = (new ChebyshevCell(Run - 1), new ChebyshevCell(Rise));
        for (int patch = 0; patch < patches; patch++)
        {
            int row = _first + (patch / columns);
            double start = OctaveGrid.Start(row, Bits), half = (OctaveGrid.Start(row + 1, Bits) - start) / 2;
            for (int node = 0; node < (Rise + 1) * Run; node++)
            {
                double x = start + (half * (1 + alongColumn.Nodes[node / Run]));
                double u = (1 + alongRow.Nodes[node % Run]) / 2;
                Add(_coefficients.Slice(patch * Stride, Stride), alongColumn, alongRow, node, functions(x, patch % columns, u));
            }
        }
    }

    /// <summary>Bytes that the coefficients take.</summary>
    public long Bytes => sizeof(double) * (long)_coefficients.Length;

    /// <summary>All four at one place inside the grid; <paramref name="across"/> from the middle of the first column, −1/2 to less than half beyond the last.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public Four At(double x, double across)
    {
#if NET
        Vector256<double> sum = InRegister(x, across);
        return new(sum[0], sum[1], sum[2], sum[3]);
#else
        ref double c = ref Locate(x, across, out double r, out double s);
        return new(Sum(ref c, r, s), Sum(ref Unsafe.Add(ref c, 1), r, s), Sum(ref Unsafe.Add(ref c, 2), r, s), Sum(ref Unsafe.Add(ref c, 3), r, s));
#endif
    }

#if NET
    /// <summary>The four, left where they were computed.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public Vector256<double> InRegister(double x, double across)
    {
        // An even power of r and the next odd one share a register; even and odd powers of s are chains side by side.
        ref double c = ref Locate(x, across, out double r, out double s);
        Vector512<double> one = Vector512.Create(s), two = one * one, square = Vector512.Create(r * r);
        ref double tip = ref Unsafe.Add(ref c, Tip);
        Vector512<double> both = Vector512.FusedMultiplyAdd(Vector512.FusedMultiplyAdd(Term(ref tip, 1), one, Term(ref tip, 0)), square, Row(ref c, 1, one, two));
        both = Vector512.FusedMultiplyAdd(both, square, Row(ref c, 0, one, two));
        return Vector256.FusedMultiplyAdd(both.GetUpper(), Vector256.Create(r), both.GetLower());
    }
#endif

    // The patch, and the place in it: r from −1 to 1, s from −1/2 to 1/2.
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private ref double Locate(double x, double across, out double r, out double s)
    {
        int row = OctaveGrid.Locate(x, Bits, out r) - _first;
        s = across - Fast.Round(across, out int column);
        return ref _coefficients[((row * _columns) + column) * Stride];
    }

    // Where the coefficient of r^i s^j stands: pairs of i, then j, then odd after even.
    private static int Offset(int i, int j) => Four.Count * ((((i / 2) * Run) + j) * 2 + (i % 2));

    [MethodImpl(Fast.Hot)]
    private static void Add(Span<double> coefficients, ChebyshevCell alongColumn, ChebyshevCell alongRow, int node, Four value)
    {
        int alongNode = node % Run;
        double tip = alongColumn.Weight(Rise, node / Run);
        for (int i = 0; i < Rise; i++)
        {
            double weight = alongColumn.Weight(i, node / Run) + (i == 2 ? tip : 0);
            for (int j = 0; j < Run; j++) value.AddTo(coefficients.Slice(Offset(i, j), Four.Count), weight * alongRow.Weight(j, alongNode) * (1 << j));
        }

        // As r⁴ − r², so that rows meet where it is left out.
        if (alongNode is not (0 or Run - 1)) return;
        double slope = alongNode == 0 ? -tip : tip;
        value.AddTo(coefficients.Slice(Tip, Four.Count), tip / 2);
        value.AddTo(coefficients.Slice(Tip + (2 * Four.Count), Four.Count), slope);
        value.AddTo(coefficients.Slice(Offset(2, 0), Four.Count), -tip / 2);
        value.AddTo(coefficients.Slice(Offset(2, 1), Four.Count), -slope);
    }

#if NET
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static Vector512<double> Row(ref double c, int pair, Vector512<double> one, Vector512<double> two)
    {
        ref double row = ref Unsafe.Add(ref c, pair * Run * Vector512<double>.Count);
        Vector512<double> even = Vector512.FusedMultiplyAdd(Vector512.FusedMultiplyAdd(Term(ref row, 4), two, Term(ref row, 2)), two, Term(ref row, 0));
        Vector512<double> odd = Vector512.FusedMultiplyAdd(Term(ref row, 3), two, Term(ref row, 1));
        return Vector512.FusedMultiplyAdd(odd, one, even);
    }

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static Vector512<double> Term(ref double row, int power) => Vector512.LoadUnsafe(ref row, (nuint)(power * Vector512<double>.Count));
#else
    private static double Sum(ref double c, double r, double s)
    {
        double sum = Unsafe.Add(ref c, Tip) + (s * Unsafe.Add(ref c, Tip + (2 * Four.Count)));
        for (int i = Rise - 1; i >= 0; i--)
        {
            double row = 0;
            for (int j = Run - 1; j >= 0; j--) row = (row * s) + Unsafe.Add(ref c, Offset(i, j));
            sum = (sum * r) + row;
        }

        return sum;
    }
#endif
}
