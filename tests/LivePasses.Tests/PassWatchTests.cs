using LivePasses.Live;
using Microsoft.Extensions.Logging.Abstractions;
using TwoPhase.Metering;
using UnitsNet;

namespace LivePasses.Tests;

/// <summary>What is kept over a restart, without brokers and clocks.</summary>
public class PassWatchTests
{
    private static readonly DateTimeOffset Noon = new(2031, 3, 9, 12, 0, 0, TimeSpan.Zero);
    private static readonly LiveSettings Settings = Rig.Usual(0);

    [Fact]
    public void Restore_SavedState_GoesOnToTheLastBit()
    {
        PassWatch first = Watch(), second = Watch(), fresh = Watch();
        for (int i = 0; i < 400; i++) first.Take(Reading(i));
        second.Restore(first.Save());
        foreach (PassWatch watch in new[] { first, second, fresh }) watch.Take(Reading(400));
        Assert.NotNull(QualityOf(first));
        Assert.Equal(QualityOf(first), QualityOf(second));
        Assert.Null(QualityOf(fresh));   // one that knows nothing needs a minute
    }

    [Theory]
    [InlineData("another", null)]
    [InlineData(null, "no state")]
    [InlineData(null, "{}")]
    public void Restore_OfSomethingElse_IsRefusedAndChangesNothing(string? generator, string? state)
    {
        PassWatch watch = Watch();
        for (int i = 0; i < 400; i++) watch.Take(Reading(i));
        SavedState saved = watch.Save();
        Assert.ThrowsAny<FormatException>(() => watch.Restore(saved with { Generator = generator ?? saved.Generator, State = state ?? saved.State }));
        watch.Take(Reading(400));
        Assert.NotNull(QualityOf(watch));
    }

    private static PassWatch Watch() => new(Settings, NullLogger<PassWatch>.Instance);

    private static double? QualityOf(PassWatch watch) => watch.Look(watch.NothingSeen()).Passes[0].Quality.Value;

    private static GeneratorReading Reading(int second)
    {
        Pressure pressure = Pressure.FromMegapascals(9.6);
        MassFlow flow = MassFlow.FromKilogramsPerSecond(4.42 + (0.001 * (second % 7)));
        return new GeneratorReading(Noon.AddSeconds(second), Settings.Generator.Passes.Select(pass =>
            new PassReading(Noon.AddSeconds(second), flow, pass.Meter!.Differential(flow, pressure, MassFraction.FromDecimalFractions(0.74)))
                .WithOutletPressure(pressure).WithFeedTemperature(Temperature.FromKelvins(445)).WithFiring(Ratio.FromPercent(92))));
    }
}
