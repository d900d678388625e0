using TwoPhase.Metering;
using UnitsNet;

namespace TwoPhase.Tests.Metering;

public class PassReadingTests
{
    private static readonly DateTimeOffset Noon = new(2031, 5, 14, 12, 0, 0, TimeSpan.Zero);

    private static readonly PassReading Good = new PassReading(Noon, MassFlow.FromKilogramsPerSecond(4.8), Pressure.FromKilopascals(41.6))
        .WithOutletPressure(Pressure.FromMegapascals(9.6));

    [Fact]
    public void Default_EverySignal_IsNoGoodNews()
    {
        PassReading reading = default;
        Assert.False(reading.GivesQuality);
        Assert.Null(reading.FeedFlow);
        Assert.Equal(SignalStatus.None, reading.Status(PassSignal.FeedFlow));
        Assert.Equal(SignalSource.None, reading.Source(PassSignal.FeedFlow));
        Assert.Empty(reading.MetalTemperatures);
    }

    [Fact]
    public void With_EverySignal_ComesBack()
    {
        PassReading reading = Good.WithInletPressure(Pressure.FromMegapascals(10.9)).WithOutletTemperature(Temperature.FromKelvins(580))
            .WithFeedTemperature(Temperature.FromKelvins(445)).WithFiring(Ratio.FromPercent(90)).WithFeedValvePosition(Ratio.FromPercent(55))
            .WithMetalTemperatures([Temperature.FromKelvins(600), null]);
        Assert.Equal((10.9e6, 580.0, 445.0), (reading.InletPressure!.Value.Pascals, reading.OutletTemperature!.Value.Kelvins, reading.FeedTemperature!.Value.Kelvins));
        Approx.Relative(0.9, reading.Firing!.Value.DecimalFractions, 1e-15);
        Approx.Relative(0.55, reading.FeedValvePosition!.Value.DecimalFractions, 1e-15);
        Assert.Equal(600, reading.MetalTemperatures[0]!.Value.Kelvins);
        Assert.Null(reading.MetalTemperatures[1]);
        Assert.True(reading != Good);
        Assert.True(reading == Good.WithFeedValvePosition(Ratio.FromPercent(55)).WithFiring(Ratio.FromPercent(90)).WithFeedTemperature(Temperature.FromKelvins(445))
            .WithOutletTemperature(Temperature.FromKelvins(580)).WithInletPressure(Pressure.FromMegapascals(10.9)).WithMetalTemperatures([Temperature.FromKelvins(600), null]));
    }

    [Fact]
    public void Without_BadDifferential_SaysBadAndGivesNoQuality()
    {
        PassReading reading = Good.Without(PassSignal.Differential, SignalStatus.Bad);
        Assert.True(Good.GivesQuality);
        Assert.False(reading.GivesQuality);
        Assert.Equal(SignalStatus.Bad, reading.Status(PassSignal.Differential));
        Assert.Throws<ArgumentOutOfRangeException>(() => Good.Without(PassSignal.Differential, SignalStatus.Good));
    }

    [Fact]
    public void New_NegativeFlow_IsAStatusNotAnException()
    {
        var reading = new PassReading(Noon, MassFlow.FromKilogramsPerSecond(-4.8), null);
        Assert.Equal(SignalStatus.OutOfRange, reading.Status(PassSignal.FeedFlow));
        Assert.Equal(SignalStatus.Missing, reading.Status(PassSignal.Differential));
    }

    [Fact]
    public void ToString_CommaCulture_IsInvariant() =>
        Culture.Run("de-DE", () => Assert.Equal("2031-05-14 12:00:00 +00:00: flow 4.8 kg/s, outlet pressure 9.6 MPa, differential Bad", Good.Without(PassSignal.Differential, SignalStatus.Bad).ToString()));

    [Fact]
    public void Equals_OtherTimeOrOtherMetal_IsAnotherReading()
    {
        Assert.Equal(Good, Good.WithOutletPressure(Good.OutletPressure));
        PassReading warm = Good.WithMetalTemperatures([Temperature.FromKelvins(600)]), warmer = Good.WithMetalTemperatures([Temperature.FromKelvins(601)]);
        Assert.NotEqual(warm, warmer);
        Assert.True(warm == Good.WithMetalTemperatures([Temperature.FromKelvins(600)]));
        Assert.NotEqual(Good, new PassReading(Good.Time.AddSeconds(1), Good.FeedFlow, Good.Differential).WithOutletPressure(Good.OutletPressure));
    }
}
