using System.Globalization;
using UnitsNet;

namespace TwoPhase.Advisory;

/// <summary>One reason why the reading is not the truth, or why the truth is not well known, with its size in quality.</summary>
/// <param name="Kind">What it is.</param>
public readonly record struct EstimateReason(EstimateReasonKind Kind)
{
    internal EstimateReason(EstimateReasonKind kind, double size)
        : this(kind) => RawSize = size;

    /// <summary>By how much, with its sign where it has one.</summary>
    public MassFraction Size => MassFraction.FromDecimalFractions(RawSize);

    internal double RawSize { get; }

    internal object ToDump() => ToString();

    /// <summary>Kind and size, invariant culture.</summary>
    public override string ToString() => Kind == EstimateReasonKind.None ? "none" : string.Format(CultureInfo.InvariantCulture, "{0} {1:+0.000;-0.000}", Kind, RawSize);
}

/// <summary>What a reason is about.</summary>
public enum EstimateReasonKind
{
    /// <summary>No reason.</summary>
    None = 0,

    /// <summary>More water leaves the pass than comes in, or less.</summary>
    HoldupMotion = 1,

    /// <summary>Heat, meter or feed flow has changed against the base; one pass cannot tell which.</summary>
    ShiftAgainstBase = 2,

    /// <summary>Noise of flow and differential in the reading of this sample.</summary>
    Noise = 3,

    /// <summary>Meter, wet-steam model, feed flow and pressure: what no transient can show.</summary>
    MeterAndFeed = 4,
}
