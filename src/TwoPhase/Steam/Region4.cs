using static TwoPhase.Numerics.Fast;

namespace TwoPhase.Steam;

/// <summary>The saturation line between 273.15 K and the critical point.</summary>
/// <remarks>
/// Source: IAPWS R7-97(2012), section 8, equation (29), an implicit biquadratic in β = (p / 1 MPa)^(1/4) and
/// ϑ = T + n9 / (T − n10), solved for either in equations (30) and (31).
/// </remarks>
internal static class Region4
{
    // Table 34.
    private const double N1 = 0.11670521452767e4, N2 = -0.72421316703206e6, N3 = -0.17073846940092e2, N4 = 0.12020824702470e5, N5 = -0.32325550322333e7;
    private const double N6 = 0.14915108613530e2, N7 = -0.48232657361591e4, N8 = 0.40511340542057e6, N9 = -0.23855557567849, N10 = 0.65017534844798e3;

    /// <summary>ps(T) [Pa], equation (30).</summary>
    public static double Pressure(double temperature)
    {
        double beta = Beta(Theta(temperature)), squared = beta * beta;
        return squared * squared * 1e6;
    }

    /// <summary>Ts(p) [K], equation (31).</summary>
    public static double Temperature(double pressure)
    {
        double beta = Sqrt(Sqrt(pressure * 1e-6));
        double e = (((beta + N3) * beta) + N6), f = (((N1 * beta) + N4) * beta) + N7, g = (((N2 * beta) + N5) * beta) + N8;
        double d = 2 * g / (-f - Sqrt((f * f) - (4 * e * g)));
        double sum = N10 + d;
        return (sum - Sqrt((sum * sum) - (4 * (N9 + (N10 * d))))) / 2;
    }

    /// <summary>dTs/dp [K/Pa], the slope of equation (29) itself.</summary>
    public static double TemperatureByPressure(double pressure, double temperature)
    {
        double beta = Sqrt(Sqrt(pressure * 1e-6)), theta = Theta(temperature);
        double byBeta = (2 * beta * ((((theta + N1) * theta) + N2))) + (((N3 * theta) + N4) * theta) + N5;
        double byTheta = (((2 * theta) + N1) * beta * beta) + (((2 * N3 * theta) + N4) * beta) + (2 * N6 * theta) + N7;
        double offset = temperature - N10, thetaByTemperature = 1 - (N9 / (offset * offset));
        return -byBeta * beta / (4 * pressure * byTheta * thetaByTemperature);
    }

    private static double Theta(double temperature) => temperature + (N9 / (temperature - N10));

    private static double Beta(double theta)
    {
        double a = ((theta + N1) * theta) + N2, b = (((N3 * theta) + N4) * theta) + N5, c = (((N6 * theta) + N7) * theta) + N8;
        return 2 * c / (Sqrt((b * b) - (4 * a * c)) - b);
    }
}
