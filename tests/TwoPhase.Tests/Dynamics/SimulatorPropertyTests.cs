using FsCheck;
using FsCheck.Fluent;
using FsCheck.Xunit;
using TwoPhase.Dynamics;
using TwoPhase.Tests.Support;
using UnitsNet;
using static TwoPhase.Tests.Dynamics.Simulations;

namespace TwoPhase.Tests.Dynamics;

public class SimulatorPropertyTests
{
    private static readonly SimulatorOptions Coarse = SimulatorOptions.Default.WithCells(20);

    /// <summary>Four sizes from -1 to 1: what a schedule does to flow, heat, feed temperature and pressure.</summary>
    private static Arbitrary<double[]> Moves => Gen.ArrayOf(Gen.Choose(-1000, 1000).Select(value => value / 1000.0), 8).ToArbitrary();

    [Property(MaxTest = 30)]
    public Property Run_AnyScheduleWithinLimits_StaysWithinPhysics() => Prop.ForAll(Moves, moves =>
    {
        OperatingSchedule schedule = Still
            .RampFeedFlow(Seconds(5), Seconds(10 * (1 + moves[4])), Start.FeedFlow * (1 + (0.4 * moves[0])))
            .RampFiring(Seconds(5), Seconds(10 * (1 + moves[5])), Ratio.FromDecimalFractions(1 + (0.4 * moves[1])))
            .RampFeedTemperature(Seconds(5), Seconds(10 * (1 + moves[6])), Start.FeedTemperature!.Value + TemperatureDelta.FromKelvins(50 * moves[2]))
            .RampOutletPressure(Seconds(5), Seconds(20 + (10 * moves[7])), Start.OutletPressure + Pressure.FromMegapascals(moves[3]));
        PassHistory history = Run(schedule, 300, Coarse);
        PassInstant before = history[0];
        foreach (PassInstant row in history)
        {
            Assert.InRange(row.OutletFlow.KilogramsPerSecond, 0, 20);
            Assert.InRange(row.Holdup.Kilograms, 100, 3000);
            Assert.InRange(row.TrueQuality.DecimalFractions, 0.2, 2);
            Assert.InRange(row.HottestMetal.DegreesCelsius, 250, 900);
            Approx.Absolute(before.TrueQuality.DecimalFractions, row.TrueQuality.DecimalFractions, 0.03, "quality within a second");
            Approx.Absolute(0, row.MassResidual, 1e-9);
            Approx.Absolute(0, row.EnergyResidual, 1e-9);
            before = row;
        }
    });

    // To first order a schedule and its mirror give mirrored answers: what is left of their sum goes with the square of the size.
    [Property(MaxTest = 10)]
    public Property Run_AScheduleAndItsMirror_GiveMirroredAnswers() => Prop.ForAll(Moves, moves =>
    {
        const double size = 0.01;
        PassHistory up = Small(moves, size), down = Small(moves, -size);
        double flow = Start.FeedFlow.KilogramsPerSecond;
        for (int t = 0; t < up.Count; t++)
        {
            Approx.Absolute(0, (up[t].OutletFlow.KilogramsPerSecond + down[t].OutletFlow.KilogramsPerSecond - (2 * flow)) / flow, 0.1 * size, $"flow at {t} s");
            Approx.Absolute(0, up[t].TrueQuality.DecimalFractions + down[t].TrueQuality.DecimalFractions - (2 * up[0].TrueQuality.DecimalFractions), 0.1 * size, $"quality at {t} s");
        }
    });

    private static PassHistory Small(double[] moves, double size) => Run(
        Still.StepFeedFlow(Seconds(5), Start.FeedFlow * (1 + (size * moves[0])))
            .StepFiring(Seconds(5), Ratio.FromDecimalFractions(1 + (size * moves[1])))
            .RampOutletPressure(Seconds(5), Seconds(30), Start.OutletPressure * (1 + (0.2 * size * moves[3]))),
        200,
        SimulatorOptions.Default);
}
