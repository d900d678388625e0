using TwoPhase.Dynamics;
using TwoPhase.Flow;
using TwoPhase.Slip;
using TwoPhase.Tests.Support;

namespace TwoPhase.Tests.Dynamics;

/// <summary>The channel against the closed forms of <see cref="UniformChannel"/>, no metal, pressure held.</summary>
public class AnalyticTests
{
    private const int Fine = 320;

    // Printed with the derivation for the base case of UniformChannel: computed once by an independent script, seven digits.
    [Theory]
    [InlineData("flow", 0.95, 100, 258.6628, 1001.9925, 0.794547)]
    [InlineData("flow", 0.95, 190, 252.6820, 1000.5602, 0.807409)]
    [InlineData("flow", 0.95, 240, 252.6820, 975.6747, 0.830241)]
    [InlineData("flow", 0.95, 400, 252.6820, 956.6500, 0.848497)]
    [InlineData("flow", 1.10, 190, 292.5792, 1021.1592, 0.726518)]
    [InlineData("flow", 1.10, 400, 292.5792, 1107.7000, 0.662902)]
    [InlineData("heat", 1.06, 100, 257.1991, 1061.4302, 0.797368)]
    [InlineData("heat", 1.06, 210, 250.9256, 1045.7609, 0.822969)]
    [InlineData("heat", 1.06, 400, 250.9256, 1007.0000, 0.858024)]
    [InlineData("heat", 0.93, 210, 286.0012, 948.0952, 0.738254)]
    [InlineData("heat", 0.93, 400, 286.0012, 1007.0000, 0.689937)]
    [InlineData("feed", 7.25e5, 175, 265.9811, 1007.0000, 0.780445)]
    [InlineData("feed", 7.25e5, 400, 285.6834, 1007.0000, 0.742480)]
    [InlineData("feed", 6.25e5, 400, 246.2788, 1007.0000, 0.818411)]
    public void Advance_AfterAStep_MatchesTheTable(string what, double size, double seconds, double onset, double massFlux, double quality)
    {
        ChannelAnswer closed = Closed(what, size, seconds);
        Approx.Relative(onset, closed.Onset, 1e-6, "the closed form itself");
        Approx.Relative(massFlux, closed.MassFlux, 1e-6, "the closed form itself");
        Approx.Relative(quality, closed.Quality, 2e-6, "the closed form itself");

        (Channel<ConstantDensityFluid> channel, double flow) = Stepped(what, size, Fine);
        Assert.True(channel.Advance(seconds, flow, Channels.Pressure));
        ChannelAnswer answer = Channels.Answer(channel);
        Approx.Relative(onset, answer.Onset, 1e-3, "onset");
        Approx.Relative(massFlux, answer.MassFlux, 1e-3, "mass flux");
        Approx.Relative(quality, answer.Quality, 1e-3, "quality");
    }

    // At every second over 400 s, the passing of the kink that the step leaves in the flow included: no grid resolves that.
    [Theory]
    [InlineData("flow", 0.95), InlineData("flow", 1.10), InlineData("heat", 1.06), InlineData("heat", 0.93)]
    public void Advance_AfterAStep_ConvergesToTheClosedForm(string what, double size)
    {
        double coarse = MeanError(what, size, 80, 400), middle = MeanError(what, size, 160, 400), fine = MeanError(what, size, Fine, 400);
        Assert.True(fine < 1e-4 && fine < middle && middle < coarse, $"{coarse:E2}, {middle:E2}, {fine:E2}");
    }

    // Until the boiling boundary stands still all is smooth: second order. Observed 2.0 to 2.3.
    [Theory]
    [InlineData("flow", 0.95), InlineData("flow", 1.10), InlineData("heat", 1.06), InlineData("heat", 0.93)]
    public void Advance_BeforeTheKink_IsOfSecondOrder(string what, double size)
    {
        double coarse = MeanError(what, size, 40, 150), fine = MeanError(what, size, 160, 150), order = Math.Log(coarse / fine) / Math.Log(4);
        Assert.True(order > 1.7, $"order {order:F2}: {coarse:E2}, {fine:E2}");
    }

    // A jump of the feed leaves a jump in the outlet flow, 10 % and more of it within seconds: only the time of that can be off.
    [Theory]
    [InlineData(7.25e5), InlineData(6.25e5)]
    public void Advance_AfterAStepOfTheFeed_ConvergesToTheClosedForm(double lacking)
    {
        double coarse = MeanError("feed", lacking, 80, 400), fine = MeanError("feed", lacking, Fine, 400);
        Assert.True(fine < 3e-3 && fine < coarse / 2, $"{coarse:E2}, {fine:E2}");
    }

    // Constant distribution parameter and drift velocity (Zuber and Staub's kinematic waves), same derivation, independent script.
    [Theory]
    [InlineData(120, 257.1991, 996.2199, 0.802511)]
    [InlineData(230, 252.6820, 973.2543, 0.832524)]
    public void Advance_WithSlip_MatchesTheTable(double seconds, double onset, double massFlux, double quality)
    {
        VoidFractionModel slip = VoidFractionModel.DriftFlux(DistributionParameter.Constant(1.13), new QuarterMetrePerSecond());
        Channel<ConstantDensityFluid> channel = Channels.Uniform(Fine, slip);
        Assert.True(channel.Advance(seconds, 0.95 * Channels.Flow, Channels.Pressure));
        ChannelAnswer answer = Channels.Answer(channel);
        Approx.Relative(onset, answer.Onset, 1e-3, "onset");
        Approx.Relative(massFlux, answer.MassFlux, 1e-3, "mass flux");
        Approx.Relative(quality, answer.Quality, 1e-3, "quality");
    }

    private static (Channel<ConstantDensityFluid> Channel, double Flow) Stepped(string what, double size, int cells)
    {
        Channel<ConstantDensityFluid> channel = Channels.Uniform(cells);
        if (what == "heat") channel.Heat *= size;
        if (what == "feed") channel.FeedEnthalpy = ConstantDensityFluid.Subcooled(size);
        return (channel, what == "flow" ? size * Channels.Flow : Channels.Flow);
    }

    private static ChannelAnswer Closed(string what, double size, double seconds) => what switch
    {
        "flow" => UniformChannel.FlowStep(size, seconds),
        "heat" => UniformChannel.HeatStep(size, seconds),
        _ => UniformChannel.FeedStep(size, seconds),
    };

    private static double MeanError(string what, double size, int cells, int seconds)
    {
        (Channel<ConstantDensityFluid> channel, double flow) = Stepped(what, size, cells);
        double sum = 0;
        for (int t = 1; t <= seconds; t++)
        {
            Assert.True(channel.Advance(1, flow, Channels.Pressure));
            sum += Math.Abs((Channels.Answer(channel).MassFlux / Closed(what, size, t).MassFlux) - 1);
        }

        return sum / seconds;
    }

    private sealed class QuarterMetrePerSecond : DriftVelocity
    {
        public override string Name => "0.25 m/s";

        protected internal override double Core(in FlowState flow) => 0.25;
    }
}
