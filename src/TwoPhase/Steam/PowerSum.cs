using System.Runtime.CompilerServices;
using static TwoPhase.Numerics.Fast;

namespace TwoPhase.Steam;

/// <summary>
/// Σ n b^J and its logarithmic derivatives: b ∂/∂b (n J b^J) and b² ∂²/∂b² (n J (J − 1) b^J). With a constant J the factors
/// are folded by the compiler, so a term costs three multiply-adds.
/// </summary>
internal readonly struct PowerRow
{
    public readonly double Value;
    public readonly double First;
    public readonly double Second;

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private PowerRow(double value, double first, double second) => (Value, First, Second) = (value, first, second);

    /// <summary>The first term: coefficient n, exponent J, and b^J.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static PowerRow Of(double n, int exponent, double power) =>
        new(n * power, n * exponent * power, n * (exponent * (exponent - 1)) * power);

    /// <summary>This row and one more term.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public PowerRow And(double n, int exponent, double power) => new(
        MultiplyAdd(n, power, Value),
        MultiplyAdd(n * exponent, power, First),
        MultiplyAdd(n * (exponent * (exponent - 1)), power, Second));
}

/// <summary>
/// Σ n a^I b^J with all logarithmic derivatives to second order, summed row by row: the form shared by every fundamental
/// equation of the formulation.
/// </summary>
internal struct PowerSum
{
    /// <summary>Σ n a^I b^J.</summary>
    public double Value;

    /// <summary>a ∂/∂a.</summary>
    public double A;

    /// <summary>a² ∂²/∂a².</summary>
    public double AA;

    /// <summary>b ∂/∂b.</summary>
    public double B;

    /// <summary>b² ∂²/∂b².</summary>
    public double BB;

    /// <summary>a b ∂²/∂a∂b.</summary>
    public double AB;

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public void Add(int exponent, double power, PowerRow row)
    {
        double value = row.Value * power, first = row.First * power;
        Value += value;
        A = MultiplyAdd(exponent, value, A);
        AA = MultiplyAdd(exponent * (exponent - 1), value, AA);
        B += first;
        BB = MultiplyAdd(row.Second, power, BB);
        AB = MultiplyAdd(exponent, first, AB);
    }
}
