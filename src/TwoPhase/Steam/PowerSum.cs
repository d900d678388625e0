#if NET
global using Spread = System.Runtime.Intrinsics.Vector256<double>;
using System.Runtime.CompilerServices;
using System.Runtime.Intrinsics;

namespace TwoPhase.Steam;

/// <summary>
/// Σ n b^J and its logarithmic derivatives: b ∂/∂b (n J b^J) and b² ∂²/∂b² (n J (J − 1) b^J). The three stand side by side in a
/// register, so that a term costs one multiply-add; with a constant J their factors are constants too.
/// </summary>
internal readonly struct PowerRow
{
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private PowerRow(Spread sums) => Sums = sums;

    public Spread Sums { get; }

    public double Value => Sums.ToScalar();

    public double First => Sums.GetElement(1);

    public double Second => Sums.GetElement(2);

    /// <summary>A number in every place, ready to be raised to powers.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Spread Base(double number) => Vector256.Create(number);

    /// <summary>The first term: coefficient n, exponent J, and b^J.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static PowerRow Of(double n, int exponent, Spread power) => new(Factors(n, exponent) * power);

    /// <summary>The first term, n b^0.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static PowerRow Of(double n) => new(Factors(n, 0));

    /// <summary>This row and one more term.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public PowerRow And(double n, int exponent, Spread power) => new(Vector256.FusedMultiplyAdd(Factors(n, exponent), power, Sums));

    /// <summary>This row and n b^0.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public PowerRow And(double n) => new(Sums + Factors(n, 0));

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static Spread Factors(double n, int exponent) => Vector256.Create(n, n * exponent, n * (exponent * (exponent - 1)), 0);
}

/// <summary>
/// Σ n a^I b^J with all logarithmic derivatives to second order, summed row by row: the form shared by every fundamental
/// equation of the formulation.
/// </summary>
internal struct PowerSum
{
    // Value and derivatives in b, side by side: of the sum itself, of a ∂/∂a, and of a² ∂²/∂a².
    private Spread _sum, _byA, _byAA;

    /// <summary>Σ n a^I b^J.</summary>
    public readonly double Value => _sum.ToScalar();

    /// <summary>a ∂/∂a.</summary>
    public readonly double A => _byA.ToScalar();

    /// <summary>a² ∂²/∂a².</summary>
    public readonly double AA => _byAA.ToScalar();

    /// <summary>b ∂/∂b.</summary>
    public readonly double B => _sum.GetElement(1);

    /// <summary>b² ∂²/∂b².</summary>
    public readonly double BB => _sum.GetElement(2);

    /// <summary>a b ∂²/∂a∂b.</summary>
    public readonly double AB => _byA.GetElement(1);

    /// <summary>Adds the row of a^0.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public void Add(PowerRow row) => _sum += row.Sums;

    /// <summary>Adds the row of a^I, I above zero.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public void Add(int exponent, Spread power, PowerRow row)
    {
        Spread sums = row.Sums * power;
        _sum += sums;
        _byA = Vector256.FusedMultiplyAdd(Vector256.Create((double)exponent), sums, _byA);
        _byAA = Vector256.FusedMultiplyAdd(Vector256.Create((double)(exponent * (exponent - 1))), sums, _byAA);
    }
}
#endif
