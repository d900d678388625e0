using System.Runtime.CompilerServices;
#if NET
using System.Runtime.Intrinsics;
#endif

namespace TwoPhase.Numerics;

/// <summary>Four smooth functions of one positive variable, as polynomials of the seventh degree on an <see cref="OctaveGrid"/>.</summary>
internal sealed class FourCurves
{
    private const int Degree = 7;
    private const int Stride = Four.Count * (Degree + 1);

    private readonly OctaveGrid _grid;
    private readonly double[] _coefficients;

    /// <param name="grid">The cells.</param>
    /// <param name="cells">How many there are.</param>
    /// <param name="functions">The four functions; called at the eight nodes of each cell.</param>
    public FourCurves(OctaveGrid grid, int cells, Func<double, Four> functions)
    {
        _grid = grid;
        _coefficients = new double[cells * Stride];
        var polynomial = new ChebyshevCell(Degree);
        for (int cell = 0; cell < cells; cell++)
        {
            double start = grid.Start(cell), half = (grid.Start(cell + 1) - start) / 2;
            for (int node = 0; node <= Degree; node++)
            {
                Four value = functions(start + (half * (1 + polynomial.Nodes[node])));
                for (int power = 0; power <= Degree; power++)
                {
                    Span<double> row = _coefficients.AsSpan((cell * Stride) + (power * Four.Count), Four.Count);
                    double weight = polynomial.Weight(power, node);
                    row[0] += weight * value.A;
                    row[1] += weight * value.B;
                    row[2] += weight * value.C;
                    row[3] += weight * value.D;
                }
            }
        }
    }

    /// <summary>All four at one place inside the grid.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public Four At(double x)
    {
        int cell = _grid.Locate(x, out double place);
        double s = (2 * place) - 1;
        ref double c = ref _coefficients[cell * Stride];
#if NET
        // Even and odd powers are two chains side by side: half the wait of one.
        Vector256<double> one = Vector256.Create(s), two = one * one;
        Vector256<double> even = Vector256.FusedMultiplyAdd(Row(ref c, 6), two, Row(ref c, 4));
        Vector256<double> odd = Vector256.FusedMultiplyAdd(Row(ref c, 7), two, Row(ref c, 5));
        even = Vector256.FusedMultiplyAdd(even, two, Row(ref c, 2));
        odd = Vector256.FusedMultiplyAdd(odd, two, Row(ref c, 3));
        even = Vector256.FusedMultiplyAdd(even, two, Row(ref c, 0));
        odd = Vector256.FusedMultiplyAdd(odd, two, Row(ref c, 1));
        return Unsafe.BitCast<Vector256<double>, Four>(Vector256.FusedMultiplyAdd(odd, one, even));
#else
        return new(Sum(ref c, s), Sum(ref Unsafe.Add(ref c, 1), s), Sum(ref Unsafe.Add(ref c, 2), s), Sum(ref Unsafe.Add(ref c, 3), s));
#endif
    }

    /// <summary>All four and their derivatives at one place inside the grid.</summary>
    public Four At(double x, out Four slope)
    {
        int cell = _grid.Locate(x, out double place);
        double s = (2 * place) - 1, scale = 2 / (_grid.Start(cell + 1) - _grid.Start(cell));
        ref double c = ref _coefficients[cell * Stride];
#if NET
        Vector256<double> at = Vector256.Create(s), sum = Row(ref c, Degree), derivative = Vector256<double>.Zero;
        for (int power = Degree - 1; power >= 0; power--)
        {
            derivative = Vector256.FusedMultiplyAdd(derivative, at, sum);
            sum = Vector256.FusedMultiplyAdd(sum, at, Row(ref c, power));
        }

        slope = Unsafe.BitCast<Vector256<double>, Four>(derivative * scale);
        return Unsafe.BitCast<Vector256<double>, Four>(sum);
#else
        slope = new(
            scale * Derivative(ref c, s),
            scale * Derivative(ref Unsafe.Add(ref c, 1), s),
            scale * Derivative(ref Unsafe.Add(ref c, 2), s),
            scale * Derivative(ref Unsafe.Add(ref c, 3), s));
        return At(x);
#endif
    }

#if NET
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static Vector256<double> Row(ref double c, int power) => Vector256.LoadUnsafe(ref c, (nuint)(power * Four.Count));
#else
    private static double Sum(ref double c, double s)
    {
        double sum = Unsafe.Add(ref c, Degree * Four.Count);
        for (int power = Degree - 1; power >= 0; power--) sum = (sum * s) + Unsafe.Add(ref c, power * Four.Count);
        return sum;
    }

    private static double Derivative(ref double c, double s)
    {
        double derivative = 0;
        for (int power = Degree; power > 0; power--) derivative = (derivative * s) + (power * Unsafe.Add(ref c, power * Four.Count));
        return derivative;
    }
#endif
}
