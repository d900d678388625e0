namespace TwoPhase.Passes;

/// <summary>Five equally spaced nodes, and the weights that integrate the quartic through five values over them.</summary>
/// <remarks>Source: closed Newton-Cotes formulas; Abramowitz and Stegun, Handbook of Mathematical Functions (1964), 25.4.14 (Boole) and, for part of the interval, the quartic integrated.</remarks>
internal static class Panel
{
    public const int Intervals = 4;

    /// <summary>Integral from node 0 to node <paramref name="last"/> of the quartic through five values.</summary>
    public static double Integral(int last, double spacing, double f0, double f1, double f2, double f3, double f4) => spacing * (last switch
    {
        1 => ((251 * f0) + (646 * f1) - (264 * f2) + (106 * f3) - (19 * f4)) / 720,
        2 => ((29 * f0) + (124 * f1) + (24 * f2) + (4 * f3) - f4) / 90,
        3 => ((27 * f0) + (102 * f1) + (72 * f2) + (42 * f3) - (3 * f4)) / 80,
        _ => Boole(1, f0, f1, f2, f3, f4),
    });

    /// <summary>Boole's rule over the whole panel.</summary>
    public static double Boole(double spacing, double f0, double f1, double f2, double f3, double f4) =>
        spacing * (2.0 / 45) * ((7 * (f0 + f4)) + (32 * (f1 + f3)) + (12 * f2));

    /// <summary>Simpson's rule over the same nodes; its distance from Boole's bounds the error of the latter on smooth functions.</summary>
    public static double Simpson(double spacing, double f0, double f1, double f2, double f3, double f4) =>
        spacing / 3 * (f0 + (4 * (f1 + f3)) + (2 * f2) + f4);

    /// <summary>The quartic through five values, <paramref name="at"/> spacings from the first: Newton's forward differences.</summary>
    public static double Quartic(double at, double f0, double f1, double f2, double f3, double f4)
    {
        double second = f2 - (2 * f1) + f0, third = f3 - (3 * f2) + (3 * f1) - f0, fourth = f4 - (4 * f3) + (6 * f2) - (4 * f1) + f0;
        return f0 + (at * (f1 - f0 + ((at - 1) / 2 * (second + ((at - 2) / 3 * (third + ((at - 3) / 4 * fourth)))))));
    }

    /// <summary>The parabola through three values, <paramref name="at"/> spacings from the first.</summary>
    public static double Parabola(double at, double f0, double f1, double f2) => f0 + (at * (f1 - f0 + ((at - 1) / 2 * (f2 - (2 * f1) + f0))));
}
