using TwoPhase.Numerics;

namespace TwoPhase.Units;

/// <summary>The straight line from the numbers of a column to another unit: y = factor·x + offset.</summary>
internal readonly struct LinearMap(double factor, double offset)
{
    // A power of two, so that scaling is exact, and so large that no temperature offset reaches the factor's last digit.
    public const long Far = 1L << 60;

    public double Factor { get; } = factor;

    public double Offset { get; } = offset;

    public LinearMap Inverse => new(1 / Factor, -Offset / Factor);

    /// <summary>The line through the values at 0 and at <see cref="Far"/>.</summary>
    public static LinearMap Through(double atZero, double atFar) => new((atFar - atZero) / Far, atZero);

    public double Map(double x) => Fast.MultiplyAdd(x, Factor, Offset);
}
