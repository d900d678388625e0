using TwoPhase.Dynamics;
using TwoPhase.Holdup;
using TwoPhase.Passes;
using TwoPhase.Slip;
using TwoPhase.Tests.Support;
using UnitsNet;
using static TwoPhase.Tests.Dynamics.Simulations;

namespace TwoPhase.Tests.Dynamics;

/// <summary>A pass full of liquid that begins to boil at its outlet.</summary>
public class FirstBoilingTests
{
    // λ at 1.05 of the length before the heat is half as much again; the boundary comes in at 46 s.
    private const double Lacking = UniformChannel.Lacking * 1.05 * UniformChannel.Length / 265.9811, Ratio = 1.5;

    [Theory]
    [InlineData(30, 1e-12), InlineData(60, 1.5e-3), InlineData(100, 1e-3), InlineData(200, 1e-3), InlineData(300, 1e-3)]
    public void Advance_BoundaryEntersFromTheOutlet_MatchesTheClosedForm(double seconds, double tolerance)
    {
        Channel<ConstantDensityFluid> channel = Channels.Uniform(320, lacking: Lacking);
        channel.Heat *= Ratio;
        Assert.True(channel.Advance(seconds, Channels.Flow, Channels.Pressure));
        ChannelAnswer closed = UniformChannel.FirstBoiling(Lacking, Ratio, seconds), answer = Channels.Answer(channel);
        if (closed.Onset < UniformChannel.Length) Approx.Relative(closed.Onset, answer.Onset, 1e-3, "onset");
        else Assert.Equal(double.NaN, answer.Onset);
        Approx.Relative(closed.MassFlux, answer.MassFlux, tolerance, "mass flux");
        if (closed.Quality > 0) Approx.Absolute(closed.Quality, answer.Quality, 1e-3, "quality");
        Approx.Absolute(0, channel.EnergyResidual, 1e-12);
    }

    // Half an hour from a fifth of the heat to all of it. Pressure and flow push each other hardest at low pressure, where a little
    // steam takes much room; whoever finds them one after the other stops here.
    [Theory]
    [InlineData(0.5), InlineData(2), InlineData(9.6), InlineData(14)]
    public void Run_LiquidFilledPass_ReachesItsSteadyState(double megapascals)
    {
        PassConditions end = Running(megapascals);
        PassHistory history = Run(LightOff(end), 3600);
        Assert.Equal(SimulationEnd.Completed, history.End);
        PassProfile steady = SteadyState.Solve(MeteredPass, end);
        Approx.Relative(WaterHoldup.Of(steady).Total.Kilograms, history[^1].Holdup.Kilograms, 5e-3);
        Approx.Absolute(steady.OutletQuality.DecimalFractions, history[^1].TrueQuality.DecimalFractions, 1e-4);
        Assert.All(history, row => Approx.Absolute(0, row.EnergyResidual, 1e-9));
        Assert.All(history, row => Approx.Absolute(0, row.MassResidual, 1e-9));
    }

    // The lag of the pressure is an option, not a crutch: without any the surge is the same within a few per cent.
    [Fact]
    public void Run_WithoutPressureLag_SurgesAlike()
    {
        OperatingSchedule schedule = LightOff(Running(2));
        PassHistory lagging = Run(schedule, 1200), quick = Run(schedule, 1200, SimulatorOptions.Default.WithPressureLag(Duration.Zero));
        Assert.Equal(SimulationEnd.Completed, quick.End);
        double Peak(PassHistory history) => history.Max(row => row.OutletFlow.KilogramsPerSecond);
        Approx.Relative(Peak(lagging), Peak(quick), 0.03);
        Approx.Relative(lagging[^1].Holdup.Kilograms, quick[^1].Holdup.Kilograms, 0.01);
    }

    // Nothing swings from second to second while the boundary walks from cell to cell.
    [Theory]
    [InlineData(2), InlineData(9.6)]
    public void Run_Surge_IsSmooth(double megapascals)
    {
        PassHistory history = Run(LightOff(Running(megapascals)), 1500);
        double[] flow = [.. history.Select(row => row.OutletFlow.KilogramsPerSecond)];
        int first = history.ToList().FindIndex(row => row.BoilingOnset is not null) + 20;
        for (int t = first; t < flow.Length - 1; t++) Approx.Absolute(0, flow[t + 1] - (2 * flow[t]) + flow[t - 1], 0.05 * flow[t], $"{t} s");
    }

    [Fact]
    public void Run_TwiceTheCells_PushesOutTheSame()
    {
        OperatingSchedule schedule = LightOff(Running(2));
        PassHistory coarse = Run(schedule, 1200), fine = Run(schedule, 1200, SimulatorOptions.Default.WithCells(160));
        Approx.Relative(fine.Max(row => row.OutletFlow.KilogramsPerSecond), coarse.Max(row => row.OutletFlow.KilogramsPerSecond), 0.01);
        for (int t = 0; t <= 1200; t += 10) Approx.Relative(fine[t].Holdup.Kilograms, coarse[t].Holdup.Kilograms, 5e-3, $"{t} s");
    }

    private static PassConditions Running(double megapascals)
    {
        double feed = Math.Min(171.85, megapascals < 1 ? 120 : 171.85);
        return SteadyState.FindHeat(MeteredPass, new(Start.FeedFlow, Temperature.FromDegreesCelsius(feed), Pressure.FromMegapascals(megapascals), Power.Zero), MassFraction.FromPercent(78)).Conditions;
    }

    private static OperatingSchedule LightOff(PassConditions end) => new OperatingSchedule(end.WithAbsorbedHeat(Power.Zero))
        .RampAbsorbedHeat(Seconds(10), Seconds(60), end.AbsorbedHeat * 0.2m)
        .RampAbsorbedHeat(Seconds(600), Seconds(1200), end.AbsorbedHeat);
}
