using TwoPhase.Dynamics;
using TwoPhase.Passes;
using TwoPhase.Tests.Support;
using TwoPhase.Units;
using UnitsNet;
using UnitsNet.Units;
using static TwoPhase.Tests.Dynamics.Simulations;

namespace TwoPhase.Tests.Dynamics;

public class OperatingScheduleTests
{
    [Fact]
    public void At_StepAndRamp_AreAsGiven()
    {
        OperatingSchedule schedule = Still.StepFeedFlow(Seconds(10), Flow(5)).RampFeedFlow(Seconds(20), Seconds(10), Flow(4));
        Assert.Equal(4.8, At(schedule, 9.999), 1e-12);
        Assert.Equal(5, At(schedule, 10), 1e-12);
        Assert.Equal(4.5, At(schedule, 25), 1e-12);
        Assert.Equal(4, At(schedule, 1000), 1e-12);
        Assert.Equal(30, schedule.LastChange.Seconds);
        Assert.Equal(4.8, Still.At(Seconds(1000)).FeedFlow.KilogramsPerSecond, 1e-12);
    }

    [Fact]
    public void At_EveryQuantity_CanMove()
    {
        PassConditions end = Still
            .StepFeedTemperature(Seconds(1), Temperature.FromDegreesCelsius(180))
            .StepOutletPressure(Seconds(2), Pressure.FromMegapascals(9))
            .StepAbsorbedHeat(Seconds(3), Power.FromMegawatts(7))
            .At(Seconds(4));
        Assert.Equal(180, end.FeedTemperature!.Value.DegreesCelsius, 1e-9);
        Assert.Equal(9, end.OutletPressure.Megapascals, 1e-12);
        Assert.Equal(7, end.RawAbsorbedHeat / 1e6, 1e-12);
        Approx.Relative(Start.RawAbsorbedHeat / 1e6 * 0.9, Still.StepFiring(Seconds(1), Ratio.FromPercent(90)).At(Seconds(1)).RawAbsorbedHeat / 1e6, 1e-12);
    }

    // A flow brings the same mass whatever the sampling: the mean over an interval is exact.
    [Theory]
    [InlineData(0, 40), InlineData(5, 10), InlineData(9.5, 10.5), InlineData(12, 23), InlineData(31, 33)]
    public void Over_AnInterval_IsTheMean(double from, double to)
    {
        OperatingSchedule schedule = Still.StepFeedFlow(Seconds(10), Flow(5)).RampFeedFlow(Seconds(20), Seconds(10), Flow(4));
        const int steps = 100_000;
        double sum = 0;
        for (int i = 0; i < steps; i++) sum += At(schedule, from + ((to - from) * (i + 0.5) / steps));
        Approx.Relative(sum / steps, schedule.Over(from, to).FeedFlow.KilogramsPerSecond, 1e-6);
    }

    [Fact]
    public void With_ColumnsOfHistory_RunsStraightAcrossGaps()
    {
        double[] minutes = [0, 1, 2, 3];
        OperatingSchedule schedule = Still
            .WithFeedFlow(Column.Of<DurationUnit>(minutes, DurationUnit.Minute), Column.Of<MassFlowUnit>([18, double.NaN, 36, 36], MassFlowUnit.TonnePerHour))
            .WithFiring(Column.Of<DurationUnit>(minutes, DurationUnit.Minute), Column.Of<RatioUnit>([50, 50, 100, 100], RatioUnit.Percent), Power.FromMegawatts(8))
            .WithOutletPressure(Column.Of<DurationUnit>(minutes, DurationUnit.Minute), Column.Of<PressureUnit>([95, 95, 96, 97], PressureUnit.Bar))
            .WithFeedTemperature(Column.Of<DurationUnit>(minutes, DurationUnit.Minute), Column.Of<TemperatureUnit>([170, 171, 172, 173], TemperatureUnit.DegreeCelsius));
        PassConditions middle = schedule.At(Seconds(60));
        Approx.Relative(7.5, middle.FeedFlow.KilogramsPerSecond, 1e-12);
        Approx.Relative(4, middle.RawAbsorbedHeat / 1e6, 1e-12);
        Approx.Relative(9.5, middle.OutletPressure.Megapascals, 1e-12);
        Approx.Relative(444.15, middle.FeedTemperature!.Value.Kelvins, 1e-12);
        Approx.Relative(5, schedule.Over(-5, 0).FeedFlow.KilogramsPerSecond, 1e-12);
    }

    [Fact]
    public void With_WhatMakesNoSense_ThrowsSayingWhy()
    {
        double[] seconds = [0, 1];
        Assert.Contains("2 samples and 1 times", Assert.Throws<ArgumentException>(() => Still.WithFeedFlow(Column.Of<DurationUnit>([0], DurationUnit.Second), Column.Of<MassFlowUnit>([1, 2], MassFlowUnit.KilogramPerSecond))).Message, StringComparison.Ordinal);
        Assert.Throws<ArgumentOutOfRangeException>(() => Still.WithFeedFlow(Column.Of<DurationUnit>([1, 0], DurationUnit.Second), Column.Of<MassFlowUnit>([1, 2], MassFlowUnit.KilogramPerSecond)));
        Assert.Throws<ArgumentOutOfRangeException>(() => Still.WithFeedFlow(Column.Of<DurationUnit>(seconds, DurationUnit.Second), Column.Of<MassFlowUnit>([1, -2], MassFlowUnit.KilogramPerSecond)));
        Assert.Throws<ArgumentException>(() => Still.WithAbsorbedHeat(Column.Of<DurationUnit>(seconds, DurationUnit.Second), Column.Of<PowerUnit>([double.NaN, double.NaN], PowerUnit.Megawatt)));
        Assert.Contains("3 s", Assert.Throws<ArgumentOutOfRangeException>(() => Still.StepFeedFlow(Seconds(3), Flow(5)).StepFeedFlow(Seconds(2), Flow(4))).Message, StringComparison.Ordinal);
        Assert.Throws<ArgumentOutOfRangeException>(() => Still.StepFeedFlow(Seconds(3), MassFlow.Zero));
        Assert.Throws<ArgumentException>(() => new OperatingSchedule(Start.WithFeedEnthalpy(SpecificEnergy.FromKilojoulesPerKilogram(700))).StepFeedTemperature(Seconds(1), Temperature.FromKelvins(400)));
        Assert.Throws<ArgumentOutOfRangeException>(() => new OperatingSchedule(default));
    }

    private static MassFlow Flow(double kilogramsPerSecond) => MassFlow.FromKilogramsPerSecond(kilogramsPerSecond);

    private static double At(OperatingSchedule schedule, double seconds) => schedule.At(Seconds(seconds)).FeedFlow.KilogramsPerSecond;
}
