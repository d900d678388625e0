using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Limits;

/// <summary>What one step of one input does to the margin of a limit.</summary>
public readonly record struct LimitEffect
{
    private readonly QuantityScale? _quantity;

    internal LimitEffect(LimitInput input, double change, QuantityScale quantity) => (Input, RawChange, _quantity) = (input, change, quantity);

    /// <summary>The input, and with it the step.</summary>
    public LimitInput Input { get; }

    /// <summary>Change of the margin, negative where the step brings the limit nearer; null where the pass has no steady state after the step.</summary>
    public IQuantity? Change => _quantity is null || double.IsNaN(RawChange) ? null : _quantity.Difference(RawChange);

    /// <summary>In SI, NaN where there is none.</summary>
    internal double RawChange { get; }

    internal object ToDump() => ToString();

    /// <summary>Input and change, invariant culture.</summary>
    public override string ToString() => _quantity is null || double.IsNaN(RawChange) ? $"{Input}: none" : $"{Input}: {_quantity.DifferenceText(RawChange)}";
}
