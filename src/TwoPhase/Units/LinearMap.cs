using TwoPhase.Numerics;

namespace TwoPhase.Units;

/// <summary>The straight line from the numbers of a column to another unit: y = factor·x + offset.</summary>
internal readonly struct LinearMap(double factor, double offset = 0)
{
    // A power of two, so that scaling is exact, and so large that no temperature offset reaches the factor's last digit.
    public const long Far = 1L << 60;

    public double Factor { get; } = factor;

    public double Offset { get; } = offset;

    public LinearMap Inverse => new(1 / Factor, -Offset / Factor);

    /// <summary>The line through the values at 0 and at <see cref="Far"/>.</summary>
    public static LinearMap Through(double atZero, double atFar) => new((atFar - atZero) / Far, atZero);

    /// <summary>The same line from another zero, for example from the site's atmosphere.</summary>
    public LinearMap Above(double zero) => new(Factor, Offset + zero);

    /// <summary>The line with each unit worth <paramref name="size"/> of what it was.</summary>
    public LinearMap Times(double size) => new(Factor * size, Offset * size);

    /// <summary>The line that spreads 0 to 100 over <paramref name="low"/> to <paramref name="high"/> of this one.</summary>
    public LinearMap PerCentOf(double low, double high) => new(Factor * (high - low) / 100, Map(low));

    public double Map(double x) => Fast.MultiplyAdd(x, Factor, Offset);
}
