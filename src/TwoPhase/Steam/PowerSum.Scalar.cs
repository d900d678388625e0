#if !NET
global using Spread = double;
using System.Runtime.CompilerServices;

namespace TwoPhase.Steam;

// The same, number by number, where the runtime has no registers of four.
internal readonly struct PowerRow
{
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private PowerRow(double value, double first, double second) => (Value, First, Second) = (value, first, second);

    public double Value { get; }

    public double First { get; }

    public double Second { get; }

    public static Spread Base(double number) => number;

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static PowerRow Of(double n, int exponent, double power) => default(PowerRow).And(n, exponent, power);

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static PowerRow Of(double n) => new(n, 0, 0);

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public PowerRow And(double n, int exponent, double power) =>
        new(Value + (n * power), First + (n * exponent * power), Second + (n * (exponent * (exponent - 1)) * power));

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public PowerRow And(double n) => new(Value + n, First, Second);
}

internal struct PowerSum
{
    public double Value { get; private set; }

    public double A { get; private set; }

    public double AA { get; private set; }

    public double B { get; private set; }

    public double BB { get; private set; }

    public double AB { get; private set; }

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public void Add(PowerRow row) => (Value, B, BB) = (Value + row.Value, B + row.First, BB + row.Second);

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public void Add(int exponent, double power, PowerRow row)
    {
        double value = row.Value * power, first = row.First * power;
        Value += value;
        A += exponent * value;
        AA += exponent * (exponent - 1) * value;
        B += first;
        BB += row.Second * power;
        AB += exponent * first;
    }
}
#endif
