using TwoPhase.Dynamics;
using TwoPhase.Metering;
using TwoPhase.Passes;
using TwoPhase.Tests.Passes;
using TwoPhase.Tests.Support;
using TwoPhase.Units;
using UnitsNet;
using UnitsNet.Units;

namespace TwoPhase.Tests.Dynamics;

/// <summary>
/// Histories of an independent model of the same pass, whose heat profile and slip differ from ours: calibrated on the first
/// minute, then driven only by the columns that a user has.
/// </summary>
public class ScenarioTests
{
    // C E A √2 of the venturi of the data files: C 0.995, pipe 77.9 mm, throat 49.0 mm, expansibility taken as 1.
    private static readonly QualityMeter Meter = new(
        new SiteConstantMeter(Area.FromSquareMillimeters(0.995 * Math.PI / 4 * 49 * 49 * Math.Sqrt(2) / Math.Sqrt(1 - Math.Pow(49 / 77.9, 4)))), WetSteamModel.Homogeneous);

    // 41 % of the heat in the first half is what a user knows; 40 % suits both files as well as one even share in each half can.
    [Theory]
    [InlineData("firing-step-up"), InlineData("feed-warms")]
    public void Run_DrivenByAUsersColumns_FollowsTheTruth(string name)
    {
        ReferenceTable table = ReferenceTable.Load($"Dynamics/Data/{name}.csv");
        PassHistory history = Replay(table, ExamplePass.Pass.WithConvectiveShare(Ratio.FromPercent(40)));
        foreach (ReferenceTable.Row row in table.Rows)
        {
            PassInstant instant = history[(int)row["time_s"]];
            Approx.Absolute(row["quality_true"], instant.TrueQuality.DecimalFractions, 0.015, $"quality at {row["time_s"]} s");
            Approx.Relative(row["outlet_flow_true_kg_s"], instant.OutletFlow.KilogramsPerSecond, 0.03, $"outlet flow at {row["time_s"]} s");
        }

        double pushed = table.Rows[0]["holdup_true_kg"] - table.Rows[^1]["holdup_true_kg"];
        Approx.Relative(pushed, history[0].Holdup.Kilograms - history[^1].Holdup.Kilograms, 0.25, "water pushed out");
    }

    // The split fitted, one share and a straight line in each half for both files: what is left is slip, and the first-order grid of the other model.
    [Theory]
    [InlineData("firing-step-up"), InlineData("feed-warms")]
    public void Run_WithTheHeatSplitFitted_HoldsWhatTheTruthHolds(string name)
    {
        ReferenceTable table = ReferenceTable.Load($"Dynamics/Data/{name}.csv");
        PassHistory history = Replay(table, Simulations.FittedPass);
        foreach (ReferenceTable.Row row in table.Rows) Approx.Absolute(row["quality_true"], history[(int)row["time_s"]].TrueQuality.DecimalFractions, 0.006, $"quality at {row["time_s"]} s");
        double pushed = table.Rows[0]["holdup_true_kg"] - table.Rows[^1]["holdup_true_kg"];
        Approx.Relative(pushed, history[0].Holdup.Kilograms - history[^1].Holdup.Kilograms, 0.05, "water pushed out");
        Approx.Relative(table.Rows[0]["holdup_true_kg"], history[0].Holdup.Kilograms, 0.03, "holdup");
    }

    private static PassHistory Replay(ReferenceTable table, Pass tubes)
    {
        double[] time = Samples(table, "time_s"), flow = Samples(table, "feed_flow_kg_s"), feed = Samples(table, "feed_temperature_C"), firing = Samples(table, "firing_percent");
        double[] pressure = Smoothed(time, Samples(table, "outlet_pressure_MPa_abs"));
        MassFlow meanFlow = MassFlow.FromKilogramsPerSecond(FirstMinute(table, "feed_flow_kg_s"));
        Pressure meanPressure = Pressure.FromMegapascals(FirstMinute(table, "outlet_pressure_MPa_abs"));
        MassFraction quality = Meter.Quality(meanFlow, meanPressure, Pressure.FromKilopascals(FirstMinute(table, "venturi_dp_kPa"))).Quality;

        Pass pass = tubes.WithMeter(Meter);
        PassConditions start = SteadyState.FindHeat(pass, new(meanFlow, Temperature.FromDegreesCelsius(FirstMinute(table, "feed_temperature_C")), meanPressure, Power.Zero), quality).Conditions;
        Column<DurationUnit> seconds = Column.Of<DurationUnit>(time, DurationUnit.Second);
        OperatingSchedule schedule = new OperatingSchedule(start)
            .WithFeedFlow(seconds, Column.Of<MassFlowUnit>(flow, MassFlowUnit.KilogramPerSecond))
            .WithFeedTemperature(seconds, Column.Of<TemperatureUnit>(feed, TemperatureUnit.DegreeCelsius))
            .WithOutletPressure(seconds, Column.Of<PressureUnit>(pressure, PressureUnit.Megapascal))
            .WithFiring(seconds, Column.Of<RatioUnit>(firing, RatioUnit.Percent), start.AbsorbedHeat);
        return new PassSimulator(pass, start).Run(schedule, Duration.FromSeconds(time[^1]));
    }

    private static double[] Samples(ReferenceTable table, string column) => [.. table.Rows.Select(row => row[column])];

    private static double FirstMinute(ReferenceTable table, string column) => table.Rows.Where(row => row["time_s"] < 60).Average(row => row[column]);

    // The transmitter's noise is not the pressure's: 3 kPa from second to second, taken as real, would flash and condense 3 % of the flow.
    private static double[] Smoothed(double[] time, double[] values) =>
        [.. time.Select(now => time.Zip(values).Where(sample => Math.Abs(sample.First - now) <= 30).Average(sample => sample.Second))];
}
