using TwoPhase.Numerics;

namespace TwoPhase.Steam;

/// <summary>The border between regions 2 and 3, 623.15 K at 16.5292 MPa to 863.15 K at 100 MPa.</summary>
/// <remarks>Source: IAPWS R7-97(2012), section 4, equations (5) and (6) with Table 1: π = p / 1 MPa, θ = T / 1 K.</remarks>
internal static class Border23
{
    private const double N1 = 0.34805185628969e3, N2 = -0.11671859879975e1, N3 = 0.10192970039326e-2, N4 = 0.57254459862746e3, N5 = 0.13918839778870e2;

    /// <summary>Foot of the border, at 623.15 K [Pa]: below it there is no region 3.</summary>
    public static readonly double LowestPressure = Pressure(Water97.Border13Temperature);

    /// <summary>Top of the border, at 100 MPa [K].</summary>
    public static readonly double HighestTemperature = Temperature(Water97.HighestPressure);

    /// <summary>p(T) [Pa], equation (5).</summary>
    public static double Pressure(double temperature) => 1e6 * (N1 + (temperature * (N2 + (N3 * temperature))));

    /// <summary>T(p) [K], equation (6).</summary>
    public static double Temperature(double pressure) => N4 + Fast.Sqrt(((pressure * 1e-6) - N5) / N3);
}
