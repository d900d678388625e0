namespace TwoPhase.Numerics;

/// <summary>A value and its slope.</summary>
internal readonly struct Sloped(double value, double slope)
{
    public double Value { get; } = value;

    public double Slope { get; } = slope;
}
