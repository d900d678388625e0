using TwoPhase.Dynamics;
using TwoPhase.Tests.Support;

namespace TwoPhase.Tests.Dynamics;

/// <summary>A step of the feed temperature through a pass full of liquid that nothing heats.</summary>
public class FrontTests
{
    private const double Step = 5e4, Transit = UniformChannel.Length * 688 / UniformChannel.MassFlux;

    [Theory]
    [InlineData(80, 0.035)]
    [InlineData(160, 0.015)]
    public void Advance_WithoutMetal_KeepsAFrontSharp(int cells, double share)
    {
        double[] rise = Rises(cells, metal: false, 600);
        double first = Crossing(rise, 0.1), last = Crossing(rise, 0.9);
        Assert.True(last - first <= share * Transit, $"{last - first:F2} s of {Transit:F1} s");
        Approx.Relative(Transit, Crossing(rise, 0.5), 2e-3);
        Assert.InRange(rise.Min(), -1e-9, 0);
        Assert.InRange(rise.Max(), 0.999, 1 + 1e-9);
    }

    // Fluid and wall exchanging heat, no conduction along either: Anzelius, Z. angew. Math. Mech. 6, 291 (1926); Schumann, J. Franklin
    // Inst. 208, 405 (1929). The outlet rises as J(ξ, η) = 1 − e^−η ∫0..ξ e^−s I0(2 √(η s)) ds with ξ = UA/(ṁ cp), η = UA (t − transit)/C.
    [Fact]
    public void Advance_WithMetal_FollowsTheClosedForm()
    {
        double[] rise = Rises(80, metal: true, 900);
        const double steel = 0.25 * Math.PI * ((0.0889 * 0.0889) - (0.0779 * 0.0779)) * UniformChannel.Length;
        double exchange = 9000 * Math.PI * UniformChannel.Bore * UniformChannel.Length, capacity = Channels.MetalCapacity;
        Assert.InRange(capacity / steel, 3e6, 5e6);
        double xi = exchange / (Channels.Flow * 5000);
        for (int t = (int)Transit + 1; t < rise.Length; t += 5) Approx.Absolute(Outlet(xi, exchange * (t - Transit) / capacity), rise[t], 0.03, $"{t} s");

        // The middle comes later by the metal's share, ξ at η: to first order η = ξ there.
        Approx.Relative(Transit * (1 + (capacity / (688 * 5000 * UniformChannel.Area * UniformChannel.Length))), Crossing(rise, 0.5), 0.01);
    }

    private static double[] Rises(int cells, bool metal, int seconds)
    {
        Channel<ConstantDensityFluid> channel = Channels.Uniform(cells, heat: 0, metal: metal);
        double before = channel.FeedEnthalpy;
        channel.FeedEnthalpy += Step;
        var rise = new double[seconds + 1];
        for (int t = 1; t <= seconds; t++)
        {
            Assert.True(channel.Advance(1, Channels.Flow, Channels.Pressure));
            rise[t] = (channel.Outlet.OutEnthalpy - before) / Step;
        }

        Approx.Absolute(0, channel.EnergyResidual, 1e-12);
        return rise;
    }

    private static double Crossing(double[] rise, double level)
    {
        int after = Array.FindIndex(rise, value => value >= level);
        return after - ((rise[after] - level) / (rise[after] - rise[after - 1]));
    }

    private static double Outlet(double xi, double eta)
    {
        // Trapezoidal rule; e^−s−η I0(2 √(η s)) = e^−(√η − √s)² times the scaled Bessel function.
        const int steps = 2000;
        double sum = 0;
        for (int i = 0; i <= steps; i++)
        {
            double s = xi * i / steps, root = Math.Sqrt(eta) - Math.Sqrt(s);
            sum += Math.Exp(-root * root) * ScaledBessel(2 * Math.Sqrt(eta * s)) * (i == 0 || i == steps ? 0.5 : 1);
        }

        return 1 - (sum * xi / steps);
    }

    // e^−z I0(z) = (1/π) ∫0..π e^(z (cos θ − 1)) dθ; the trapezoidal rule is spectral on a period.
    private static double ScaledBessel(double z)
    {
        const int steps = 100;
        double sum = 0;
        for (int i = 0; i < steps; i++) sum += Math.Exp(z * (Math.Cos(Math.PI * (i + 0.5) / steps) - 1));
        return sum / steps;
    }
}
