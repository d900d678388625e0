using TwoPhase.Numerics;

namespace TwoPhase.Flow;

/// <summary>Areas, perimeters and velocity ratios of liquid lying in a round tube; lengths over D, areas over D², velocities over superficial ones.</summary>
internal readonly struct StratifiedGeometry
{
    /// <param name="level">hL/D, between 0 and 1, ends excluded.</param>
    public StratifiedGeometry(double level)
    {
        // From whichever side is the thinner: the area of a thin segment is a small difference otherwise.
        double halfAngle = Math.Acos(1 - (2 * Math.Min(level, 1 - level)));
        double chord = 2 * Math.Sqrt(level * (1 - level));
        double segment = 0.25 * SineDefect(halfAngle);
        bool low = level <= 0.5;
        Interface = chord;
        LiquidArea = low ? segment : (Math.PI / 4) - segment;
        VapourArea = low ? (Math.PI / 4) - segment : segment;
        LiquidPerimeter = low ? halfAngle : Math.PI - halfAngle;
        VapourPerimeter = Math.PI - LiquidPerimeter;
    }

    /// <summary>S̃i, which is also dÃl/dh.</summary>
    public double Interface { get; }

    public double LiquidArea { get; }

    public double VapourArea { get; }

    public double LiquidPerimeter { get; }

    public double VapourPerimeter { get; }

    /// <summary>ũl = (π/4)/Ãl.</summary>
    public double LiquidVelocity => Math.PI / 4 / LiquidArea;

    /// <summary>ũg = (π/4)/Ãg.</summary>
    public double VapourVelocity => Math.PI / 4 / VapourArea;

    /// <summary>ũl² (ũl D̃l)^−0.2: wall friction of the liquid over that of the liquid alone, D̃l its open-channel diameter.</summary>
    public double LiquidFriction => LiquidVelocity * LiquidVelocity * Math.Pow(LiquidVelocity * 4 * LiquidArea / LiquidPerimeter, -0.2);

    /// <summary>ũg² (ũg D̃g)^−0.2: wall friction of the vapour over that of the vapour alone, D̃g its closed-channel diameter.</summary>
    public double VapourFriction => VapourVelocity * VapourVelocity * Math.Pow(VapourVelocity * 4 * VapourArea / (VapourPerimeter + Interface), -0.2);

    // a − sin a cos a, without cancellation at small a.
    private static double SineDefect(double a) => a > 0.1 ? a - (Math.Sin(a) * Math.Cos(a)) : Series(2 * a);

    // (b − sin b)/2 by its series; b below 0.2, so four terms are exact to round-off.
    private static double Series(double b)
    {
        double square = b * b;
        return Fast.MultiplyAdd(-square, Fast.MultiplyAdd(-square, Fast.MultiplyAdd(-square, 1 / 362880.0, 1 / 5040.0), 1 / 120.0), 1 / 6.0) * b * square / 2;
    }
}
