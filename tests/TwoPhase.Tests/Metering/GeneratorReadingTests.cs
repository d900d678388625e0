using TwoPhase.Metering;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Tests.Metering;

public class GeneratorReadingTests
{
    private static readonly DateTimeOffset Noon = new(2031, 5, 14, 12, 0, 0, TimeSpan.Zero);

    private static PassReading Pass(double flow) => new(Noon, MassFlow.FromKilogramsPerSecond(flow), Pressure.FromKilopascals(40));

    [Fact]
    public void ReadingOf_PassWithoutOwnPressure_TakesTheHeaders()
    {
        GeneratorReading reading = new GeneratorReading(Noon, [Pass(4), Pass(5).WithOutletPressure(Pressure.FromMegapascals(9.7))])
            .WithHeaderPressure(Pressure.FromMegapascals(9.5)).WithFeedTemperature(Temperature.FromKelvins(445)).WithFiring(Ratio.FromPercent(80));
        PassReading first = reading.ReadingOf(0), second = reading.ReadingOf(1);
        Assert.Equal((9.5e6, SignalSource.Generator), (first.OutletPressure!.Value.Pascals, first.Source(PassSignal.OutletPressure)));
        Assert.Equal((9.7e6, SignalSource.Pass), (second.OutletPressure!.Value.Pascals, second.Source(PassSignal.OutletPressure)));
        Assert.Equal(SignalSource.Generator, second.Source(PassSignal.Firing));
        Assert.Equal(445, second.FeedTemperature!.Value.Kelvins);
        Assert.True(first.GivesQuality);
        Assert.Throws<ArgumentOutOfRangeException>(() => reading.ReadingOf(2));
    }

    [Fact]
    public void ReadingOf_OwnPressureBad_FallsBackAndSaysSo()
    {
        PassReading pass = new GeneratorReading(Noon, [Pass(4).Without(PassSignal.OutletPressure, SignalStatus.Bad)]).WithHeaderPressure(Pressure.FromMegapascals(9.5)).ReadingOf(0);
        Assert.Equal(SignalSource.Generator, pass.Source(PassSignal.OutletPressure));
        PassReading alone = new GeneratorReading(Noon, [Pass(4).Without(PassSignal.OutletPressure, SignalStatus.Bad)]).ReadingOf(0);
        Assert.Equal(SignalStatus.Bad, alone.Status(PassSignal.OutletPressure));
    }

    [Fact]
    public void CombinedOutlet_NoTotalMeter_SumsThePasses()
    {
        GeneratorReading reading = new GeneratorReading(Noon, [Pass(4), Pass(5)]).WithCombinedDifferential(Pressure.FromKilopascals(60)).WithHeaderPressure(Pressure.FromMegapascals(9.5));
        Assert.Equal(9, reading.CombinedOutlet().FeedFlow!.Value.KilogramsPerSecond);
        Assert.True(reading.CombinedOutlet().GivesQuality);
        Assert.Equal(9.2, reading.WithTotalFeed(MassFlow.FromKilogramsPerSecond(9.2)).CombinedOutlet().FeedFlow!.Value.KilogramsPerSecond);
        Assert.Equal(SignalSource.Generator, reading.WithTotalFeed(MassFlow.FromKilogramsPerSecond(9.2)).CombinedOutlet().Source(PassSignal.FeedFlow));
    }

    [Fact]
    public void CombinedOutlet_OneFlowMissing_HasNoTotal()
    {
        GeneratorReading reading = new GeneratorReading(Noon, [Pass(4), Pass(5).Without(PassSignal.FeedFlow, SignalStatus.Missing)]);
        Assert.Null(reading.CombinedOutlet().FeedFlow);
    }

    [Fact]
    public void With_EverySignal_ComesBack()
    {
        GeneratorReading reading = new GeneratorReading(Noon, []).WithFuelGasFlow(VolumeFlow.FromCubicMetersPerHour(3600)).WithExcessOxygen(Ratio.FromPercent(3))
            .WithStackTemperature(Temperature.FromKelvins(450)).WithBridgeWallTemperature(Temperature.FromKelvins(1100))
            .WithSeparatorFlows(MassFlow.FromKilogramsPerSecond(22), null).WithSolids(MassConcentration.FromKilogramsPerCubicMeter(7), MassConcentration.FromKilogramsPerCubicMeter(35));
        Approx.Relative(1, reading.FuelGasFlow!.Value.CubicMetersPerSecond, 1e-15);
        Assert.Equal((450.0, 1100.0, 22.0), (reading.StackTemperature!.Value.Kelvins, reading.BridgeWallTemperature!.Value.Kelvins, reading.SeparatorSteamFlow!.Value.KilogramsPerSecond));
        Assert.Equal((7.0, 35.0), (reading.FeedSolids!.Value.KilogramsPerCubicMeter, reading.WaterSolids!.Value.KilogramsPerCubicMeter));
        Approx.Relative(0.03, reading.ExcessOxygen!.Value.DecimalFractions, 1e-15);
        Assert.Null(reading.SeparatorWaterFlow);
        Assert.Equal(SignalStatus.Missing, reading.Status(GeneratorSignal.SeparatorWaterFlow));
        Assert.Equal(SignalStatus.Bad, reading.Without(GeneratorSignal.StackTemperature, SignalStatus.Bad).Status(GeneratorSignal.StackTemperature));
    }

    [Fact]
    public void Format_TagsOfAGenerator_AreReadInTheirUnits()
    {
        var format = new GeneratorFormat(TagSet.OfGenerator.With(GeneratorSignal.HeaderPressure, Tag.Parse("PT-1 [barg at 93 kPa]")).With(GeneratorSignal.FuelGasFlow, Tag.Parse("FT-9 [kscf/d]")));
        GeneratorReading reading = format.Add(format.Add(new GeneratorReading(Noon, []), GeneratorSignal.HeaderPressure, 94.07), GeneratorSignal.Firing, 100);
        Approx.Relative(9.5e6, reading.HeaderPressure!.Value.Pascals, 1e-12);
        Assert.Null(reading.Firing);
        FormatException error = Assert.Throws<FormatException>(() => new GeneratorFormat(TagSet.OfGenerator.With(GeneratorSignal.HeaderPressure, Tag.Parse("PT-1 [bar]"))));
        Assert.Contains("PT-1", error.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void TagSet_AfterWith_IsACopy()
    {
        TagSet<PassSignal> one = TagSet.OfPass.With(PassSignal.FeedFlow, new Tag("A", "kg/s"));
        TagSet<PassSignal> two = one.With(PassSignal.Differential, new Tag("B", "kPa"));
        Assert.Equal((1, 2), (one.Count, two.Count));
        Assert.Null(one[PassSignal.Differential]);
        Assert.Equal("B", two[PassSignal.Differential]!.Name);
        Assert.Throws<ArgumentOutOfRangeException>(() => one.With(PassSignal.None, new Tag("C", "")));
    }
}
