using MathNet.Numerics.Distributions;
using TwoPhase.Dynamics;
using TwoPhase.Metering;
using UnitsNet;

namespace Backfill.Demo;

/// <summary>Makes one day of one pass. What a day holds depends on seed, day and pass alone, so a part of a year is the same as in the whole.</summary>
/// <param name="seed">The seed.</param>
/// <param name="meter">The meter of the passes.</param>
/// <param name="everySeconds">From row to row.</param>
/// <param name="minutes">Minutes after and before each midnight that are made; 720 for the whole day.</param>
internal sealed class DayMaker(Chance seed, QualityMeter meter, int everySeconds, int minutes)
{
    // Begun at rest so long before the first row that nothing of the beginning is left: some four times the water's way through the pass.
    private const int Before = 1200, Day = 86_400, HalfDay = 720;

    public DemoColumns Make(DateOnly day, string pass)
    {
        DemoColumns columns = new();
        InstrumentFaults faults = new(seed, day, pass);
        Random noise = seed.Of(pass, day.DayNumber).Of("noise").Stream();
        int length = minutes * 60;
        foreach ((int from, int to) in minutes < HalfDay ? [(0, length), (Day - length, Day)] : new[] { (0, Day) }) Make(columns, new(seed, pass), faults, noise, day, from, to);
        return columns;
    }

    private void Make(DemoColumns columns, Scenario scenario, InstrumentFaults faults, Random noise, DateOnly day, int from, int to)
    {
        DateTime midnight = day.ToDateTime(TimeOnly.MinValue, DateTimeKind.Utc);
        double start = day.DayNumber * (double)Day;
        PassSimulator simulator = Plant.At(scenario.At(start + from - Before), meter);
        for (int second = from - Before + everySeconds; second < to; second += everySeconds)
        {
            double now = start + second;
            PassInstant instant = simulator.Advance(scenario.At(now), Duration.FromSeconds(everySeconds));
            if (second < from) continue;
            columns.Add(
                midnight.AddSeconds(second),
                faults.FeedFlow(second, scenario.FeedFlow(now) * (1 + Noise(noise, 0.003))),
                scenario.FeedCelsius(now) + Noise(noise, 0.1),
                100 * scenario.Firing(now),
                scenario.HeaderMegapascals(now) + Noise(noise, 0.003),
                faults.Differential(second, instant.Differential!.Value.Kilopascals * (1 + Noise(noise, 0.005))));
            columns.AddTruth(instant.TrueQuality.DecimalFractions, instant.OutletFlow.KilogramsPerSecond);
        }
    }

    private static double Noise(Random random, double deviation) => Normal.Sample(random, 0, deviation);
}
