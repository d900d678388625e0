namespace TwoPhase.Numerics;

/// <summary>A number that may not be known: NaN then, and NaN too where it was never set, which a bare double would show as a 0.</summary>
internal readonly record struct Known
{
    // The bits of NaN.
    private const long Unset = unchecked((long)0xFFF8_0000_0000_0000);

    private readonly long _bits;

    private Known(double value) => _bits = BitConverter.DoubleToInt64Bits(value) ^ Unset;

    public static implicit operator double(Known known) => BitConverter.Int64BitsToDouble(known._bits ^ Unset);

    public static implicit operator Known(double value) => new(value);
}
