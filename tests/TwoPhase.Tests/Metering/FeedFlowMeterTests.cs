using TwoPhase.Metering;
using UnitsNet;

namespace TwoPhase.Tests.Metering;

public class FeedFlowMeterTests
{
    private static readonly Density Base = Density.FromKilogramsPerCubicMeter(922.8);     // water of about 150 °C, rounded
    private static readonly Density Actual = Density.FromKilogramsPerCubicMeter(901.8);   // of about 172 °C, rounded

    [Theory]
    [InlineData(FeedMeterPrinciple.Volumetric, 901.8 / 922.8)]
    [InlineData(FeedMeterPrinciple.DifferentialPressure, 0.988556105)]   // its root, by hand
    [InlineData(FeedMeterPrinciple.Mass, 1)]
    public void TrueFlow_WaterLighterThanTheRanging_IsLess(FeedMeterPrinciple principle, double factor)
    {
        FeedFlowMeter meter = new(principle, Base);
        Approx.Relative(4.8 * factor, meter.TrueFlow(MassFlow.FromKilogramsPerSecond(4.8), Actual).KilogramsPerSecond, 1e-8);
        Approx.Relative(4.8 * factor, meter.TrueFlow(VolumeFlow.FromCubicMetersPerSecond(4.8 / 922.8), Actual).KilogramsPerSecond, 1e-8);
        Approx.Relative(4.8, meter.TrueFlow(MassFlow.FromKilogramsPerSecond(4.8), Base).KilogramsPerSecond, 1e-15);
    }

    [Fact]
    public void TrueFlow_BadInput_ThrowsNamingTheValue()
    {
        FeedFlowMeter meter = new(FeedMeterPrinciple.Volumetric, Base);
        Assert.Contains("-1 kg/s", Assert.Throws<ArgumentOutOfRangeException>(() => meter.TrueFlow(MassFlow.FromKilogramsPerSecond(-1), Actual)).Message, StringComparison.Ordinal);
        Assert.Throws<ArgumentOutOfRangeException>(() => meter.TrueFlow(MassFlow.FromKilogramsPerSecond(1), Density.Zero));
        Assert.Throws<ArgumentOutOfRangeException>(() => new FeedFlowMeter((FeedMeterPrinciple)9, Base));
    }
}
