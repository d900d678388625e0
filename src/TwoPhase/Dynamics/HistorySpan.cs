using UnitsNet;

namespace TwoPhase.Dynamics;

/// <summary>A stretch of a history.</summary>
public readonly record struct HistorySpan
{
    internal HistorySpan(double from, double to) => (RawFrom, RawTo) = (from, to);

    /// <summary>Time of its first row.</summary>
    public Duration From => Duration.FromSeconds(RawFrom);

    /// <summary>Time of its last row.</summary>
    public Duration To => Duration.FromSeconds(RawTo);

    internal double RawFrom { get; }

    internal double RawTo { get; }

    internal object ToDump() => ToString();

    /// <summary>From and to in seconds, invariant culture.</summary>
    public override string ToString() => FormattableString.Invariant($"{RawFrom:F0} s to {RawTo:F0} s");
}
