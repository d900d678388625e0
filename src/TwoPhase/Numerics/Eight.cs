using System.Runtime.InteropServices;

namespace TwoPhase.Numerics;

/// <summary>Eight numbers that are computed side by side, as <see cref="Four"/>.</summary>
[StructLayout(LayoutKind.Sequential)]
internal readonly struct Eight(double a, double b, double c, double d, double e, double f, double g, double h)
{
    public readonly double A = a;
    public readonly double B = b;
    public readonly double C = c;
    public readonly double D = d;
    public readonly double E = e;
    public readonly double F = f;
    public readonly double G = g;
    public readonly double H = h;

    public Eight(Four first, Four second)
        : this(first.A, first.B, first.C, first.D, second.A, second.B, second.C, second.D)
    {
    }
}
