using TwoPhase.Numerics;

namespace TwoPhase.Tests.Numerics;

public class TruncatedNormalTests
{
    // Half-normal: mean √(2/π), variance 1 − 2/π. Symmetric about 0 within one standard deviation: variance 1 − 2φ(1)/(2Φ(1) − 1) with the printed φ(1) = 0.24197 and Φ(1) = 0.84134.
    [Fact]
    public void Between_KnownLaws_HasTheirMoments()
    {
        (double mean, double variance) = TruncatedNormal.Between(0, 40);
        Approx.Relative(Math.Sqrt(2 / Math.PI), mean, 1e-12);
        Approx.Relative(1 - (2 / Math.PI), variance, 1e-12);
        (mean, variance) = TruncatedNormal.Between(-1, 1);
        Approx.Absolute(0, mean, 1e-15);
        Approx.Absolute(1 - (2 * 0.24197 / (2 * 0.84134 - 1)), variance, 3e-5);
        Approx.Absolute(1, TruncatedNormal.Between(-40, 40).Variance, 1e-12);
    }

    [Theory]
    [InlineData(0.3, 2), InlineData(2, 2.5), InlineData(5, 9), InlineData(7.9, 8.3), InlineData(8.1, 8.5), InlineData(12, 30), InlineData(-1.5, 0.2)]
    public void Between_AgainstQuadrature_Agrees(double low, double high)
    {
        double middle = Math.Max(low, 0), upper = Math.Min(high, middle + 6);
        double Moment(int power) => MathNet.Numerics.Integration.GaussLegendreRule.Integrate(z => Math.Pow(z, power) * Math.Exp(((middle * middle) - (z * z)) / 2), low, upper, 64);
        double mean = Moment(1) / Moment(0), variance = (Moment(2) / Moment(0)) - (mean * mean);
        (double m, double v) = TruncatedNormal.Between(low, high);
        Approx.Absolute(mean, m, low > 8 ? 0.02 : 1e-6);
        Approx.Absolute(variance, v, low > 8 ? 0.01 : 1e-6);
        (double mirrored, double same) = TruncatedNormal.Between(-high, -low);
        Approx.Absolute(-m, mirrored, 1e-12);
        Approx.Absolute(v, same, 1e-12);
    }
}
