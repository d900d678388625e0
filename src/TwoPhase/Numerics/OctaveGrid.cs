using System.Runtime.CompilerServices;

namespace TwoPhase.Numerics;

/// <summary>
/// Equal cells inside each octave of a positive number, found from its bits: the cell is the exponent with the leading bits of
/// the mantissa, the place inside the cell is the rest. No division, no logarithm, no search.
/// </summary>
internal readonly struct OctaveGrid
{
    private const int MantissaBits = 52;
    private const long One = 0x3FF0000000000000;

    private readonly int _shift;
    private readonly long _first;

    /// <param name="lowest">The cell that holds this number is cell 0.</param>
    /// <param name="cellsPerOctave">A power of two.</param>
    public OctaveGrid(double lowest, int cellsPerOctave)
    {
        int bits = 0;
        while (1 << bits < cellsPerOctave) bits++;
        _shift = MantissaBits - bits;
        _first = BitConverter.DoubleToInt64Bits(lowest) >> _shift;
    }

    /// <summary>The cell of a number and, 0 to 1, the place inside it.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public int Locate(double value, out double place)
    {
        long bits = BitConverter.DoubleToInt64Bits(value);
        long rest = (bits & ((1L << _shift) - 1)) << (MantissaBits - _shift);
        place = BitConverter.Int64BitsToDouble(rest | One) - 1;
        return (int)((bits >> _shift) - _first);
    }

    /// <summary>Where a cell begins.</summary>
    public double Start(int cell) => BitConverter.Int64BitsToDouble((_first + cell) << _shift);
}
