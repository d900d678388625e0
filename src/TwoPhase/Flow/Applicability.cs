using System.Globalization;

namespace TwoPhase.Flow;

/// <summary>
/// Whether a published formula was used inside its published range. Outside, the result is still computed; this value
/// says which limits were exceeded, and for the first of them the value and the limits.
/// </summary>
/// <remarks>Allocates nothing. A <c>default</c> value was never checked: neither inside nor outside.</remarks>
public readonly struct Applicability : IEquatable<Applicability>
{
    private readonly bool _checked;

    private Applicability(ApplicabilityLimits exceeded, double value, double low, double high)
    {
        _checked = true;
        Exceeded = exceeded;
        FirstValue = value;
        FirstLow = low;
        FirstHigh = high;
    }

    /// <summary>Inside every limit.</summary>
    public static Applicability Inside { get; } = new(ApplicabilityLimits.None, 0, 0, 0);

    /// <summary>True when the range was checked and no limit is exceeded.</summary>
    public bool IsInside => _checked && Exceeded == ApplicabilityLimits.None;

    /// <summary>Every limit that is exceeded.</summary>
    public ApplicabilityLimits Exceeded { get; }

    /// <summary>The value that exceeds the first limit found, in the unit that <see cref="ApplicabilityLimits"/> gives; 0 inside.</summary>
    public double FirstValue { get; }

    /// <summary>Lower limit for <see cref="FirstValue"/>; minus infinity where there is none; 0 inside.</summary>
    public double FirstLow { get; }

    /// <summary>Upper limit for <see cref="FirstValue"/>; infinity where there is none; 0 inside.</summary>
    public double FirstHigh { get; }

    /// <summary>This finding with one more limit checked: <paramref name="value"/> against <paramref name="low"/> to <paramref name="high"/>, both included.</summary>
    /// <param name="limit">The limit that the value is checked against; one flag.</param>
    /// <param name="value">The value, in the unit that <see cref="ApplicabilityLimits"/> gives. NaN counts as outside.</param>
    /// <param name="low">Lower limit.</param>
    /// <param name="high">Upper limit.</param>
    public Applicability Check(ApplicabilityLimits limit, double value, double low, double high) =>
        value >= low && value <= high ? With(default, 0, 0, 0) : With(limit, value, low, high);

    /// <summary>This finding and another together; the first value stays this one's if it has any.</summary>
    /// <param name="other">The other finding.</param>
    public Applicability And(Applicability other) => other._checked
        ? With(other.Exceeded, other.FirstValue, other.FirstLow, other.FirstHigh)
        : this;

    private Applicability With(ApplicabilityLimits limit, double value, double low, double high) =>
        Exceeded == ApplicabilityLimits.None
            ? new(limit, value, low, high)
            : new(Exceeded | limit, FirstValue, FirstLow, FirstHigh);

    /// <inheritdoc/>
    public bool Equals(Applicability other) =>
        _checked == other._checked && Exceeded == other.Exceeded
        && FirstValue.Equals(other.FirstValue) && FirstLow.Equals(other.FirstLow) && FirstHigh.Equals(other.FirstHigh);

    /// <inheritdoc/>
    public override bool Equals(object? obj) => obj is Applicability other && Equals(other);

    /// <inheritdoc/>
    public override int GetHashCode() => ((int)Exceeded * 397) ^ FirstValue.GetHashCode();

    /// <summary>Whether two findings are the same.</summary>
    public static bool operator ==(Applicability left, Applicability right) => left.Equals(right);

    /// <summary>Whether two findings differ.</summary>
    public static bool operator !=(Applicability left, Applicability right) => !left.Equals(right);

    internal object ToDump() => ToString();

    /// <summary>The finding in words, invariant culture, SI units.</summary>
    public override string ToString() => !_checked ? "not checked"
        : Exceeded == ApplicabilityLimits.None ? "inside its range"
        : string.Format(CultureInfo.InvariantCulture, "outside its range: {0} ({1:G6}, limits {2:G6} to {3:G6})", Exceeded, FirstValue, FirstLow, FirstHigh);
}
