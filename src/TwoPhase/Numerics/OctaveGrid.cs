using System.Runtime.CompilerServices;
#if NET
using System.Runtime.Intrinsics;
#endif

namespace TwoPhase.Numerics;

/// <summary>
/// Equal cells inside each octave of a positive number, found from its bits: the cell is the exponent with the leading bits of
/// the mantissa, the place inside the cell is the rest. No division, no logarithm, no search.
/// </summary>
/// <remarks>An octave has 2^bits cells; bits is a constant at every call, so that the shifts are too.</remarks>
internal static class OctaveGrid
{
    private const int MantissaBits = 52;
    private const long One = 0x3FF0000000000000;

    /// <summary>The cell of a number, counted from zero at 0; and, −1 to 1, the place inside it.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static int Locate(double value, int bits, out double place)
    {
        long pattern = BitConverter.DoubleToInt64Bits(value);
        long rest = (pattern << bits) & ((1L << MantissaBits) - 1);
        place = Fast.MultiplyAdd(2, BitConverter.Int64BitsToDouble(rest | One), -3);
        return (int)(pattern >> (MantissaBits - bits));
    }

#if NET
    /// <summary>The cells of four numbers, and the place of each inside its own.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static void Locate(Vector256<double> values, int bits, out Vector256<long> cells, out Vector256<double> places)
    {
        Vector256<long> patterns = values.AsInt64();
        Vector256<long> rests = (patterns << bits) & Vector256.Create((1L << MantissaBits) - 1);
        places = Vector256.FusedMultiplyAdd((rests | Vector256.Create(One)).AsDouble(), Vector256.Create(2.0), Vector256.Create(-3.0));
        cells = patterns >> (MantissaBits - bits);
    }
#endif

    /// <summary>Where a cell begins.</summary>
    public static double Start(int cell, int bits) => BitConverter.Int64BitsToDouble((long)cell << (MantissaBits - bits));
}
