using FsCheck;
using FsCheck.Fluent;
using FsCheck.Xunit;
using TwoPhase.Metering;
using UnitsNet;

namespace TwoPhase.Tests.Metering;

public class DifferentialPressureTransmitterTests
{
    private static readonly DifferentialPressureTransmitter Linear = new(Pressure.FromKilopascals(60), TransmitterCharacteristic.Linear);
    private static readonly DifferentialPressureTransmitter Root = new(Pressure.FromKilopascals(60), TransmitterCharacteristic.SquareRoot);

    [Theory]
    [InlineData(0, 4, 4)]
    [InlineData(15, 8, 12)]       // a quarter of the differential is half of the flow
    [InlineData(60, 20, 20)]
    [InlineData(39.6, 14.56, 16.99846)]
    public void Current_KnownShares_FollowsTheCharacteristic(double kilopascals, double linear, double root)
    {
        Approx.Absolute(linear, Linear.Current(Pressure.FromKilopascals(kilopascals)).Milliamperes, 1e-12);
        Approx.Absolute(root, Root.Current(Pressure.FromKilopascals(kilopascals)).Milliamperes, 5e-6);
    }

    [Property]
    public Property Read_OfCurrent_GivesTheDifferentialBack() => Prop.ForAll(Gen.Choose(1, 975).Select(permille => permille * 0.06).ToArbitrary(), kilopascals =>
    {
        foreach (DifferentialPressureTransmitter transmitter in new[] { Linear, Root })
        {
            TransmitterReading back = transmitter.Read(transmitter.Current(Pressure.FromKilopascals(kilopascals)));
            Assert.Equal(TransmitterStatus.Good, back.Status);
            Approx.Relative(kilopascals, back.Differential!.Value.Kilopascals, 1e-12);
            Approx.Relative(kilopascals, transmitter.Read(transmitter.Output(Pressure.FromKilopascals(kilopascals))).Differential!.Value.Kilopascals, 1e-12);
        }
    });

    // NAMUR NE 43 limits (from memory).
    [Theory]
    [InlineData(3.5, TransmitterStatus.Failed)]
    [InlineData(3.6, TransmitterStatus.Failed)]
    [InlineData(3.8, TransmitterStatus.AtFloor)]
    [InlineData(3.95, TransmitterStatus.AtFloor)]
    [InlineData(12, TransmitterStatus.Good)]
    [InlineData(19.9, TransmitterStatus.AtCeiling)]
    [InlineData(20.5, TransmitterStatus.AtCeiling)]
    [InlineData(21, TransmitterStatus.Failed)]
    [InlineData(0, TransmitterStatus.Failed)]
    public void Read_EndsOfTheOutput_SaysWhat(double milliamperes, TransmitterStatus status)
    {
        TransmitterReading reading = Linear.Read(ElectricCurrent.FromMilliamperes(milliamperes));
        Assert.Equal(status, reading.Status);
        Assert.Equal(status != TransmitterStatus.Failed, reading.Differential.HasValue);
    }

    [Fact]
    public void Current_AboveTheSpan_Saturates() =>
        Assert.Equal(20.5, Linear.Current(Pressure.FromKilopascals(500)).Milliamperes, 12);

    [Fact]
    public void Read_BelowTheCutoff_SaysSo()
    {
        DifferentialPressureTransmitter cut = Root.WithLowCutoff(Ratio.FromPercent(1));
        Assert.Equal(4, cut.Current(Pressure.FromKilopascals(0.5)).Milliamperes, 12);
        Assert.Equal(TransmitterStatus.BelowCutoff, cut.Read(ElectricCurrent.FromMilliamperes(4)).Status);
        Assert.True(cut.Current(Pressure.FromKilopascals(0.7)).Milliamperes > 5.6);    // root of 1.17 % of span
    }

    [Fact]
    public void Read_BiasedLegs_TakesTheHeadOut()
    {
        Pressure head = ImpulseLines.Head(Length.FromMeters(1.1), Density.FromKilogramsPerCubicMeter(992.2), Length.FromMeters(1), Density.FromKilogramsPerCubicMeter(992.2));
        Approx.Relative(0.1 * 992.2 * 9.80665, head.Pascals, 1e-12);

        DifferentialPressureTransmitter biased = Linear.WithImpulseLineHead(head);
        Approx.Relative(Linear.Current(Pressure.FromPascals(40e3 + head.Pascals)).Milliamperes, biased.Current(Pressure.FromPascals(40e3)).Milliamperes, 1e-12);
        Approx.Relative(40e3, biased.Read(biased.Current(Pressure.FromPascals(40e3))).Differential!.Value.Pascals, 1e-12);
    }

    [Theory]
    [InlineData(12, SignalStatus.Good)]
    [InlineData(20.4, SignalStatus.Saturated)]
    [InlineData(3.9, SignalStatus.Saturated)]
    [InlineData(22, SignalStatus.Bad)]
    public void WithDifferential_TransmitterStatus_BecomesTheSignals(double milliamperes, SignalStatus status)
    {
        PassReading reading = new PassReading(DateTimeOffset.UnixEpoch, MassFlow.FromKilogramsPerSecond(4.8), null).WithDifferential(Linear.Read(ElectricCurrent.FromMilliamperes(milliamperes)));
        Assert.Equal(status, reading.Status(PassSignal.Differential));
        Assert.Equal(status == SignalStatus.Good ? 30e3 : null, reading.Differential?.Pascals);
        Assert.Equal(SignalStatus.Missing, reading.WithDifferential(default).Status(PassSignal.Differential));
    }

    [Fact]
    public void Default_Reading_IsNoGoodNews()
    {
        Assert.Equal(TransmitterStatus.None, default(TransmitterReading).Status);
        Assert.Null(default(TransmitterReading).Differential);
    }

    [Fact]
    public void Transmitter_Impossible_ThrowsNamingTheValue()
    {
        Assert.Contains("60 kPa", Assert.Throws<ArgumentOutOfRangeException>(() => new DifferentialPressureTransmitter(Pressure.FromKilopascals(60), Pressure.FromKilopascals(60), TransmitterCharacteristic.Linear)).Message, StringComparison.Ordinal);
        Assert.Throws<ArgumentOutOfRangeException>(() => new DifferentialPressureTransmitter(Pressure.FromKilopascals(60), (TransmitterCharacteristic)7));
        Assert.Throws<ArgumentOutOfRangeException>(() => Linear.WithLowCutoff(Ratio.FromPercent(60)));
        Assert.Throws<ArgumentOutOfRangeException>(() => new TransmitterDamping(Duration.FromSeconds(-1)));
        Assert.Throws<ArgumentOutOfRangeException>(() => new TransmitterDamping(Duration.FromSeconds(1)).Advance(Pressure.FromKilopascals(1), Duration.FromSeconds(-1)));
    }

    [Fact]
    public void Advance_Step_ReachesSixtyThreePercentAfterOneTimeConstant()
    {
        TransmitterDamping damping = new(Duration.FromSeconds(1.5));
        Assert.Equal(0, damping.Advance(Pressure.Zero, Duration.Zero).Pascals);
        for (int i = 0; i < 10; i++) damping.Advance(Pressure.FromPascals(1000), Duration.FromSeconds(0.1));
        Approx.Relative(1000 * (1 - Math.Exp(-1)), damping.Advance(Pressure.FromPascals(1000), Duration.FromSeconds(0.5)).Pascals, 1e-12);   // ten small steps and one: the same
        Assert.Equal(7, new TransmitterDamping(Duration.Zero).Advance(Pressure.FromPascals(7), Duration.FromSeconds(1)).Pascals);
    }
}
