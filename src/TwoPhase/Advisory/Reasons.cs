namespace TwoPhase.Advisory;

/// <summary>The three largest of some reasons.</summary>
internal readonly struct Reasons
{
    public EstimateReason First { get; private init; }

    public EstimateReason Second { get; private init; }

    public EstimateReason Third { get; private init; }

    public static Reasons Sorted(EstimateReason a, EstimateReason b, EstimateReason c, EstimateReason d) => default(Reasons).With(a).With(b).With(c).With(d);

    private Reasons With(EstimateReason next)
    {
        double size = Math.Abs(next.RawSize);
        if (First.Kind == EstimateReasonKind.None || size > Math.Abs(First.RawSize)) return new() { First = next, Second = First, Third = Second };
        if (Second.Kind == EstimateReasonKind.None || size > Math.Abs(Second.RawSize)) return new() { First = First, Second = next, Third = Second };
        return Third.Kind == EstimateReasonKind.None || size > Math.Abs(Third.RawSize) ? new() { First = First, Second = Second, Third = next } : this;
    }
}
