namespace TwoPhase.Metering;

/// <summary>Expansibility factors of ISO 5167: by how much a gas, expanding on its way to the throat, lets less through than its upstream density says.</summary>
internal static class Expansibility
{
    /// <summary>Nozzles and Venturi tubes: isentropic flow to the throat.</summary>
    /// <remarks>
    /// <para>ε = √{ [κ τ^(2/κ)/(κ − 1)] · [(1 − β⁴)/(1 − β⁴ τ^(2/κ))] · [(1 − τ^((κ−1)/κ))/(1 − τ)] }, τ = p2/p1.</para>
    /// <para>ε [-], κ isentropic exponent [-], β diameter ratio [-], p1 and p2 pressures at the tappings [Pa].</para>
    /// <para>Range: τ ≥ 0.75.</para>
    /// <para>Accuracy: see the element; 2 Δp/p1 % for nozzles, (4 + 100 β⁸) Δp/p1 % for Venturi tubes, k = 2.</para>
    /// <para>Source: ISO 5167-3:2003, 5.1.6.3 and ISO 5167-4:2003, 5.6.</para>
    /// </remarks>
    public static double Nozzle(double diameterRatio, double pressure, double differential, double isentropicExponent)
    {
        double y = differential / pressure, k = isentropicExponent, beta2 = diameterRatio * diameterRatio, beta4 = beta2 * beta2;
        double logTau = LogOneMinus(y);
        double tau2k = Math.Exp(2 / k * logTau);
        // 1 − τ^((κ−1)/κ) loses its digits for a small differential when taken as a difference.
        double expansion = -ExpMinusOne((k - 1) / k * logTau) / y;
        return Numerics.Fast.Sqrt(k * tau2k / (k - 1) * ((1 - beta4) / (1 - (beta4 * tau2k))) * expansion);
    }

    /// <summary>Orifice plates.</summary>
    /// <remarks>
    /// <para>ε = 1 − (0.351 + 0.256 β⁴ + 0.93 β⁸) [1 − (p2/p1)^(1/κ)].</para>
    /// <para>ε [-], κ isentropic exponent [-], β diameter ratio [-], p1 and p2 pressures at the tappings [Pa].</para>
    /// <para>Range: p2/p1 ≥ 0.75.</para>
    /// <para>Accuracy: 3.5 Δp/(κ p1) %, k = 2.</para>
    /// <para>Source: ISO 5167-2:2003, 5.3.2.2, eq. (5).</para>
    /// </remarks>
    public static double Orifice(double diameterRatio, double pressure, double differential, double isentropicExponent)
    {
        double beta2 = diameterRatio * diameterRatio, beta4 = beta2 * beta2;
        return 1 + ((0.351 + (0.256 * beta4) + (0.93 * beta4 * beta4)) * ExpMinusOne(LogOneMinus(differential / pressure) / isentropicExponent));
    }

    // ln(1 − y) and eᵃ − 1 to full precision for small arguments; netstandard2.0 has neither.
    private static double LogOneMinus(double y)
    {
        double u = 1 - y;
        return u == 1 ? -y : Math.Log(u) * (-y / (u - 1));
    }

    private static double ExpMinusOne(double a)
    {
        // The usual reading: seven terms are exact to the last bit.
        if (Math.Abs(a) < 0.02) return a * (1 + (a * (1.0 / 2) * (1 + (a * (1.0 / 3) * (1 + (a * (1.0 / 4) * (1 + (a * (1.0 / 5) * (1 + (a * (1.0 / 6) * (1 + (a * (1.0 / 7)))))))))))));
        double u = Math.Exp(a);
        if (u == 1) return a;
        double v = u - 1;
        return v == -1 ? -1 : v * (a / Math.Log(u));
    }
}
