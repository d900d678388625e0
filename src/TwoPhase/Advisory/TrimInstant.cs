using System.Globalization;
using TwoPhase.Dynamics;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Advisory;

/// <summary>A pass under a quality trim at one instant: what is true, and what the trim went by.</summary>
public readonly record struct TrimInstant
{
    /// <summary>The pass.</summary>
    public PassInstant Pass { get; internal init; }

    /// <summary>The value that the next move goes by; null where there is none to be believed.</summary>
    public MassFraction? Value => double.IsNaN(RawValue) ? null : MassFraction.FromDecimalFractions(RawValue);

    /// <summary>What it is trimmed to; null before the loop has closed.</summary>
    public MassFraction? SetPoint => double.IsNaN(RawSetPoint) ? null : MassFraction.FromDecimalFractions(RawSetPoint);

    /// <summary>What the trim did in the interval that ends here.</summary>
    public TrimStatus Status { get; internal init; }

    /// <summary>Whether the estimator believes the raw reading; <see cref="Trust.Unknown"/> without an estimator.</summary>
    public Trust Trust { get; internal init; }

    internal double RawValue { get; init; }

    internal double RawSetPoint { get; init; }

    internal object ToDump() => ToString();

    /// <summary>The instant in engineering units, invariant culture.</summary>
    public override string ToString() => string.Format(
        CultureInfo.InvariantCulture, "{0}; trimmed by {1} to {2}, {3}", Pass, Scale.None.Text(RawValue), Scale.None.Text(RawSetPoint), Status);
}
