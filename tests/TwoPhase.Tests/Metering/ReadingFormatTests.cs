using FsCheck.Xunit;
using TwoPhase.Metering;
using TwoPhase.Units;
using UnitsNet;
using UnitsNet.Units;

namespace TwoPhase.Tests.Metering;

public class ReadingFormatTests
{
    private static readonly DateTimeOffset Noon = new(2031, 5, 14, 12, 0, 0, TimeSpan.Zero);

    private static readonly ReadingFormat Metric =
        new(MassFlowUnit.KilogramPerSecond, TemperatureUnit.DegreeCelsius, RatioUnit.Percent, PressureUnit.Megapascal, PressureUnit.Kilopascal);

    [Fact]
    public void Read_GoodSample_KeepsEveryValue()
    {
        PassReading reading = Metric.Read(Noon, 4.8, 172, 100, 9.6, 41.6);
        Assert.Equal(Noon, reading.Time);
        Assert.Equal(4.8, reading.FeedFlow!.Value.KilogramsPerSecond);
        Assert.Equal(445.15, reading.FeedTemperature!.Value.Kelvins);
        Assert.Equal(1, reading.Firing!.Value.DecimalFractions);
        Assert.Equal(9.6e6, reading.OutletPressure!.Value.Pascals);
        Assert.Equal(41600, reading.Differential!.Value.Pascals);
        Assert.True(reading.GivesQuality);
        Assert.Equal(SignalSource.Pass, reading.Source(PassSignal.FeedFlow));
        Assert.Equal(SignalStatus.Missing, reading.Status(PassSignal.InletPressure));
        Assert.Null(reading.InletPressure);
    }

    [Fact]
    public void Read_PlantUnitsAndSi_AreTheSameReading()
    {
        UnitBasis site = UnitBasis.None.WithAtmosphericPressure(Pressure.FromKilopascals(93));
        PassReading si = Metric.Read(Noon, 4.8, 172, 100, 9.6, 41.6);
        // Water at 101.325 kPa by IAPWS-95 (python3 iapws 1.5.2): 999.0171 kg/m³ at 60 °F, 999.1026 at 15 °C.
        const double psi = 6894.757293168361, pound = 0.45359237, inch = 0.0254 * 9.80665;
        PassReading imperial = new ReadingFormat("lb/h", "degF", "fraction", "psig", "inH2O at 60 degF", site)
            .Read(Noon, 4.8 * 3600 / pound, (172 * 1.8) + 32, 1, (9.6e6 - 93e3) / psi, 41600 / (inch * 999.0171));
        PassReading mixed = new ReadingFormat("m3/d of cold water at 15 degC", "K", "%", "barg at 101.325 kPa(a)", "% of a 75 kPa span")
            .Read(Noon, 4.8 * 86400 / 999.1026, 445.15, 100, 96 - 1.01325, 41.6 / 0.75);
        foreach (PassReading other in new[] { imperial, mixed })
        {
            Approx.Relative(si.FeedFlow!.Value.KilogramsPerSecond, other.FeedFlow!.Value.KilogramsPerSecond, 2e-7);
            Approx.Relative(si.OutletPressure!.Value.Pascals, other.OutletPressure!.Value.Pascals, 1e-12);
            Approx.Relative(si.Differential!.Value.Pascals, other.Differential!.Value.Pascals, 2e-7);
            Approx.Relative(si.FeedTemperature!.Value.Kelvins, other.FeedTemperature!.Value.Kelvins, 1e-12);
        }
    }

    [Theory]
    [InlineData(double.NaN, SignalStatus.Missing)]
    [InlineData(double.PositiveInfinity, SignalStatus.OutOfRange)]
    [InlineData(double.NegativeInfinity, SignalStatus.OutOfRange)]
    [InlineData(-1, SignalStatus.OutOfRange)]
    [InlineData(1e300, SignalStatus.OutOfRange)]
    [InlineData(0, SignalStatus.Good)]
    public void Read_HostileFlow_IsAStatus(double raw, SignalStatus status)
    {
        PassReading reading = Metric.Read(Noon, raw, 172, 100, 9.6, 41.6);
        Assert.Equal(status, reading.Status(PassSignal.FeedFlow));
        Assert.Equal(status == SignalStatus.Good, reading.FeedFlow is not null);
        Assert.Equal(status == SignalStatus.Good, reading.GivesQuality);
        Assert.Equal(SignalStatus.Good, reading.Status(PassSignal.Differential));
    }

    [Property(MaxTest = 500)]
    public void Read_AnyNumbers_NeverThrows(double flow, double temperature, double firing, double pressure, double differential)
    {
        PassReading reading = Metric.Read(DateTimeOffset.MinValue, flow, temperature, firing, pressure, differential);
        Assert.Equal(reading.FeedFlow is null, reading.Status(PassSignal.FeedFlow) != SignalStatus.Good);
        Assert.Equal(reading.OutletPressure is null, reading.Status(PassSignal.OutletPressure) != SignalStatus.Good);
    }

    [Theory]
    [InlineData("m3/d", "psia", "kPa", "'flow'", "base density")]
    [InlineData("kg/s", "kPa", "kPa", "'pressure'", "gauge or absolute")]
    [InlineData("kg/s", "psig", "kPa", "'pressure'", "atmospheric")]
    [InlineData("kg/s", "psia", "kPa(g)", "'differential'", "static pressure")]
    [InlineData("Mlb/h", "psia", "kPa", "'flow'", "two meanings")]
    public void New_BasisLeftOut_NamesTheColumn(string flow, string pressure, string differential, string column, string why)
    {
        FormatException error = Assert.Throws<FormatException>(() => new ReadingFormat(flow, "degC", "%", pressure, differential));
        Assert.Contains(column, error.Message, StringComparison.Ordinal);
        Assert.Contains(why, error.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void New_TagWithoutBasis_NamesTheTag()
    {
        TagSet<PassSignal> tags = TagSet.OfPass.With(PassSignal.OutletPressure, Tag.Parse("QX-PT-204 [bar]"));
        FormatException error = Assert.Throws<FormatException>(() => new ReadingFormat(tags));
        Assert.Contains("QX-PT-204", error.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Add_SignalWithoutTag_StaysMissing()
    {
        var format = new ReadingFormat(TagSet.OfPass.With(PassSignal.FeedValvePosition, new Tag("ZT-1", "%")));
        PassReading reading = format.Add(format.Add(default, PassSignal.FeedFlow, 3), PassSignal.FeedValvePosition, 40);
        Assert.Equal(SignalStatus.None, reading.Status(PassSignal.FeedFlow));
        Approx.Relative(0.4, reading.FeedValvePosition!.Value.DecimalFractions, 1e-15);
        Assert.True(format.Reads(PassSignal.FeedValvePosition));
        Assert.False(format.Reads(PassSignal.FeedFlow));
    }

    [Fact]
    public void Read_Sample_AllocatesNothing()
    {
        bool any = false;
        Assert.Equal(0, AllocationProbe.Bytes(() =>
        {
            for (int i = 0; i < 100; i++) any |= Metric.Read(Noon, 4.8, 172, 100, 9.6, double.NaN).GivesQuality;
        }));
        Assert.False(any);
    }
}
