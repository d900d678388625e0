using MathNet.Numerics;

namespace TwoPhase.Numerics;

/// <summary>Mean and variance of a standard normal number of which nothing is known but that it lies between two bounds.</summary>
/// <remarks>
/// <para>Z = Φ(b) − Φ(a), mean (φ(a) − φ(b))/Z, variance 1 + (a·φ(a) − b·φ(b))/Z − mean². Far out, mean a + 1/a and variance 1/a².</para>
/// <para>Source: Johnson, Kotz and Balakrishnan, Continuous Univariate Distributions, vol. 1, 2nd ed. (1994), section 10.1.</para>
/// </remarks>
internal static class TruncatedNormal
{
    private const double Far = 8, RootTwo = 1.4142135623730951, RootTwoPi = 2.5066282746310002;

    public static (double Mean, double Variance) Between(double low, double high)
    {
        // On the upper side, where the tails are small numbers and their difference is not lost.
        if (low + high < 0)
        {
            (double mirrored, double same) = Between(-high, -low);
            return (-mirrored, same);
        }

        if (low > Far) return (Math.Min(high, low + (1 / low)), Math.Min(1 / (low * low), (high - low) * (high - low) / 12));
        double within = (SpecialFunctions.Erfc(low / RootTwo) - SpecialFunctions.Erfc(high / RootTwo)) / 2;
        double atLow = Density(low), atHigh = Density(high), mean = (atLow - atHigh) / within;
        return (mean, Math.Max(0, 1 + (((low * atLow) - (high * atHigh)) / within) - (mean * mean)));
    }

    private static double Density(double z) => Math.Exp(-z * z / 2) / RootTwoPi;
}
