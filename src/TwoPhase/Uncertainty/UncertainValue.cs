namespace TwoPhase.Uncertainty;

/// <summary>A quantity and how well it is known.</summary>
/// <typeparam name="TQuantity">A quantity whose differences are of the same kind.</typeparam>
public readonly record struct UncertainValue<TQuantity>
    where TQuantity : struct
{
    /// <summary>A value with its uncertainty.</summary>
    /// <param name="value">The value.</param>
    /// <param name="standardUncertainty">One standard deviation, k = 1.</param>
    public UncertainValue(TQuantity value, TQuantity standardUncertainty) => (Value, StandardUncertainty) = (value, standardUncertainty);

    /// <summary>The value.</summary>
    public TQuantity Value { get; }

    /// <summary>One standard deviation, k = 1.</summary>
    public TQuantity StandardUncertainty { get; }

    internal object ToDump() => ToString();

    /// <summary>Value and uncertainty, invariant culture.</summary>
    public override string ToString() => FormattableString.Invariant($"{Value:G5} ± {StandardUncertainty:G2} (k = 1)");
}
