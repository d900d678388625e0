using System.Globalization;
using UnitsNet;

namespace TwoPhase.Advisory;

/// <summary>The shift of one pass against its base, beside that of the others.</summary>
public readonly record struct PassShift
{
    /// <summary>Where it comes from.</summary>
    public ShiftOrigin Origin { get; internal init; }

    /// <summary>The pass's own part, as a change of its heat: 0.02 for two per cent more; null where the pass is not known.</summary>
    public Ratio? Own => double.IsNaN(RawOwn) ? null : Ratio.FromDecimalFractions(RawOwn);

    /// <summary>What it would be as a change of its differential.</summary>
    public Ratio? AsDifferential => double.IsNaN(RawAsDifferential) ? null : Ratio.FromDecimalFractions(RawAsDifferential);

    internal double RawOwn { get; init; }

    internal double RawAsDifferential { get; init; }

    internal object ToDump() => ToString();

    /// <summary>Origin and size, invariant culture.</summary>
    public override string ToString() => string.Format(CultureInfo.InvariantCulture, "{0} {1:+0.0%;-0.0%}", Origin, RawOwn);
}
