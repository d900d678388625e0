using TwoPhase.Dynamics;
using TwoPhase.Steam;
using TwoPhase.Tests.Support;
using UnitsNet;
using static TwoPhase.Tests.Dynamics.Simulations;

namespace TwoPhase.Tests.Dynamics;

public class FlowLossTests
{
    // By hand: at rest with a share r of the flow x = (Q/(r ṁ) + h − h′)/(h″ − h′), so dryout is reached below one r, in the end, and above it never.
    private static double LeastFlow
    {
        get
        {
            Saturation steam = Saturation.FromPressure(Start.OutletPressure);
            double feed = SteamState.FromPressureTemperature(Start.OutletPressure, Start.FeedTemperature!.Value).SpecificEnthalpy.JoulesPerKilogram, boiling = steam.Liquid.SpecificEnthalpy.JoulesPerKilogram;
            return (double)Start.AbsorbedHeat.Watts / (Start.FeedFlow.KilogramsPerSecond * ((0.95 * steam.LatentHeat.JoulesPerKilogram) + boiling - feed));
        }
    }

    [Fact]
    public void Run_FlowLeftOnBothSidesOfTheEnergyBalance_DriesOutOnlyBelow()
    {
        FlowLossReport above = Run(LeastFlow * 1.02), below = Run(LeastFlow * 0.98);
        Assert.Null(above.DryoutReached);
        Assert.Equal(SimulationEnd.Completed, above.History.End);
        Assert.NotNull(below.DryoutReached);
    }

    [Fact]
    public void Run_ReachesDryout_StopsThereAndSaysWhy()
    {
        FlowLossReport report = Run(0.5);
        Assert.Equal(SimulationEnd.DryoutReached, report.History.End);
        Assert.InRange(report.QualityAtEnd.DecimalFractions, 0.95, 0.97);
        Assert.All(report.History.Take(report.History.Count - 1), row => Assert.True(row.TrueQuality.DecimalFractions < 0.95));
        Assert.Equal(report.DryoutReached, report.History[^1].Time);
        Assert.Contains(report.Cautions, caution => caution.Contains("outside the model", StringComparison.Ordinal));
        Assert.Contains(report.Cautions, caution => caution.Contains(report.History.EndReason, StringComparison.Ordinal));
        Assert.All(report.History, row => Approx.Absolute(0, row.MassResidual, 1e-9));
        Assert.All(report.History, row => Approx.Absolute(0, row.EnergyResidual, 1e-9));
    }

    // Not before the water that stood at the meter has gone by, nor after all water that stood in the pass could have boiled away.
    [Fact]
    public void Run_TimeLeft_LiesWithinWhatTheHeatCanBoil()
    {
        FlowLossReport report = Run(0.2);
        double latent = Saturation.FromPressure(Start.OutletPressure).LatentHeat.JoulesPerKilogram, boilsPerSecond = (double)Start.AbsorbedHeat.Watts / latent;
        Assert.InRange(report.TimeLeft!.Value.Seconds, 10, report.History[0].Holdup.Kilograms / (boilsPerSecond - (0.2 * Start.FeedFlow.KilogramsPerSecond)));
    }

    [Fact]
    public void Run_LessFlowLeftOrLostSooner_DriesOutSooner()
    {
        double[] left = [.. new[] { 0.8, 0.6, 0.4, 0.2 }.Select(share => Run(share).TimeLeft!.Value.Seconds)], over = [.. new[] { 120.0, 60, 10, 0 }.Select(fall => Run(0.4, fall).TimeLeft!.Value.Seconds)];
        Assert.All(left.Zip(left.Skip(1)), pair => Assert.True(pair.First > pair.Second));
        Assert.All(over.Zip(over.Skip(1)), pair => Assert.True(pair.First > pair.Second));
    }

    // The reading is made with a feed flow that no longer leaves: far above the truth, for the same reason as in a step.
    [Fact]
    public void Run_Reading_IsFarAboveTheTruth()
    {
        FlowLossReport report = Run(0.5);
        Assert.True(report.IndicatedAtEnd!.Value.DecimalFractions > 1.5);
    }

    [Fact]
    public void Run_HardlyAnyFlowLeft_EndsWhereTheFlowStagnates()
    {
        FlowLossReport report = Run(0.01);
        Assert.Equal(SimulationEnd.FlowStagnated, report.History.End);
        Assert.Null(report.TimeLeft);
        Assert.Contains(report.Cautions, caution => caution.Contains("stagnated or reversed", StringComparison.Ordinal));
    }

    [Fact]
    public void Constructor_BadInput_ThrowsNamingTheValue()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => new FlowLoss(Start, Ratio.Zero, Seconds(10)));
        Assert.Contains("1", Assert.Throws<ArgumentOutOfRangeException>(() => new FlowLoss(Start, Ratio.FromPercent(100), Seconds(10))).Message, StringComparison.Ordinal);
        Assert.Contains("1.5", Assert.Throws<ArgumentOutOfRangeException>(() => new FlowLoss(Start, Ratio.FromPercent(50), Seconds(10), MassFraction.FromDecimalFractions(1.5))).Message, StringComparison.Ordinal);
        Assert.Contains("0.78", Assert.Throws<ArgumentException>(() => new FlowLoss(Start, Ratio.FromPercent(50), Seconds(10), MassFraction.FromDecimalFractions(0.7)).Run(MeteredPass)).Message, StringComparison.Ordinal);
    }

    private static FlowLossReport Run(double left, double over = 10) => new FlowLoss(Start, Ratio.FromDecimalFractions(left), Seconds(over)).Run(MeteredPass);
}
