using TwoPhase.Holdup;
using TwoPhase.Metering;
using TwoPhase.Passes;
using UnitsNet;

namespace TwoPhase.Tests.Passes;

/// <summary>
/// A pass known as roughly as a user knows it, calibrated on one quiet minute, against two synthetic histories whose truth is
/// known: an independent model with heat spread unevenly in a way that is not told.
/// </summary>
public class PassCalibrationTests
{
    private static readonly ReferenceTable FiringUp = ReferenceTable.Load("Passes/Data/firing-step-up.csv"), FeedWarms = ReferenceTable.Load("Passes/Data/feed-warms.csv");

    // Dry C, homogeneous wet stream, expansibility taken as 1: the constant √2 C E A says the same.
    private static readonly QualityMeter Meter = new(new SiteConstantMeter(Area.FromSquareMeters(0.995 * Math.Sqrt(2) * Math.PI / 4 * 0.049 * 0.049 / Math.Sqrt(1 - Math.Pow(49 / 77.9, 4)))), WetSteamModel.Homogeneous);

    public static TheoryData<string> Histories => [nameof(FiringUp), nameof(FeedWarms)];

    [Theory, MemberData(nameof(Histories))]
    public void Fit_FirstMinute_PredictsTheQualityOfBothRestPoints(string history)
    {
        ReferenceTable table = Table(history);
        PassCalibration fit = Fit(table);
        Assert.Equal(CalibrationWarnings.None, fit.Warnings);
        (Power low, Power high) = fit.HeatInterval();
        Assert.True(low < fit.HeatAtFullFiring && fit.HeatAtFullFiring < high);
        Assert.InRange((double)((high.Megawatts - low.Megawatts) / fit.HeatAtFullFiring.Megawatts), 1e-4, 0.01);
        Approx.Absolute(0.78, Rest(fit.Pass, First(table)).OutletQuality.DecimalFractions, 0.01);
        Approx.Absolute(Last(table)[^1]["true_quality"], Rest(fit.Pass, Last(table)).OutletQuality.DecimalFractions, 0.01);
    }

    // With 41 % in the first half and even heat within each half, as the user knows it.
    [Theory, MemberData(nameof(Histories))]
    public void Holdup_BetweenTheRestPoints_ChangesAsItShould_WithinAQuarter(string history)
    {
        ReferenceTable table = Table(history);
        Approx.Relative(TrueChange(table), Change(Fit(table).Pass, table), 0.25);
    }

    // How the heat runs along the bank decides: with its share kept and the flux rising along it (its feed end is the cold end of
    // the gas), the slope that meets one history meets the other. Even flux overstates both changes by 15 to 17 %; the share
    // moves them by 1 to 2 % a point, the slip model by at most 5 %.
    [Fact]
    public void Holdup_FluxFittedToOneHistory_HoldsForTheOther()
    {
        Pass pass = Fit(FiringUp).Pass;
        Pass Rising(double slope) => pass.WithHeat(new(
            new SectionHeat("bank", Ratio.FromPercent(41), new FluxPoint(Ratio.Zero, 1 - slope), new FluxPoint(Ratio.FromPercent(100), 1 + slope)),
            new SectionHeat("coil", Ratio.FromPercent(59))));
        double slope = MathNet.Numerics.RootFinding.Brent.FindRoot(s => Change(Rising(s), FiringUp) - TrueChange(FiringUp), 0, 0.99, 1e-6);
        Assert.InRange(slope, 0.5, 0.9);
        Approx.Relative(TrueChange(FeedWarms), Change(Rising(slope), FeedWarms), 0.05);
    }

    [Fact]
    public void Fit_KnownPass_FindsHeatAndFriction()
    {
        Pass truth = ExamplePass.Pass.WithFrictionFactor(1.37);
        PassConditions conditions = ExamplePass.Conditions;
        PassProfile rest = SteadyState.Solve(truth, conditions);
        var samples = Enumerable.Range(0, 40).Select(i => new CalibrationSample(conditions.FeedFlow, conditions.FeedTemperature!.Value, Ratio.FromPercent(95), conditions.OutletPressure,
            MassFraction.FromDecimalFractions(rest.OutletQuality.DecimalFractions + (0.004 * Noise(i))), Pressure.FromPascals(rest.Inlet.Pressure.Pascals + (8e3 * Noise(i + 7))))).ToList();
        PassCalibration fit = PassCalibration.Fit(ExamplePass.Pass, samples);
        Approx.Relative(8.2e6 / 0.95, (double)fit.HeatAtFullFiring.Watts, 2e-3);
        Approx.Relative(1.37, fit.FrictionFactor!.Value, 0.01);
        Assert.True(fit.FrictionInterval!.Value.Contains(1.37));
        Assert.InRange(fit.FrictionInterval.Value.High - fit.FrictionInterval.Value.Low, 1e-5, 0.1);
        Approx.Relative(rest.PressureDrop.Total.Pascals, SteadyState.Solve(fit.Pass, conditions).PressureDrop.Total.Pascals, 0.01);
        Assert.Contains("MW at full firing", fit.ToString(), StringComparison.Ordinal);
    }

    [Fact]
    public void Fit_StretchThatIsNotQuiet_SaysSo()
    {
        CalibrationSample Sample(int i, double drift, double flow) => new(MassFlow.FromKilogramsPerSecond(4.8 + (flow * i)), Temperature.FromDegreesCelsius(172), Ratio.FromPercent(100), Pressure.FromMegapascals(9.6), MassFraction.FromDecimalFractions(0.78 + (drift * i) + (0.003 * Noise(i))));
        CalibrationWarnings Warn(double drift, double flow) => PassCalibration.Fit(ExamplePass.Pass, [.. Enumerable.Range(0, 60).Select(i => Sample(i, drift, flow))]).Warnings;
        Assert.Equal(CalibrationWarnings.None, Warn(0, 0));
        Assert.True(Warn(1e-3, 0).HasFlag(CalibrationWarnings.NotAtRest));
        Assert.True(Warn(0, 0.004).HasFlag(CalibrationWarnings.InputsMoved));
        Assert.True(PassCalibration.Fit(ExamplePass.Pass, [.. Enumerable.Range(0, 4).Select(i => Sample(i, 0, 0))]).Warnings.HasFlag(CalibrationWarnings.FewReadings));
    }

    [Fact]
    public void Fit_BadInput_SaysWhat()
    {
        CalibrationSample sample = new(MassFlow.FromKilogramsPerSecond(4.8), Temperature.FromDegreesCelsius(172), Ratio.FromPercent(100), Pressure.FromMegapascals(9.6), MassFraction.FromPercent(78));
        CalibrationSample with = new(MassFlow.FromKilogramsPerSecond(4.8), Temperature.FromDegreesCelsius(172), Ratio.FromPercent(100), Pressure.FromMegapascals(9.6), MassFraction.FromPercent(78), Pressure.FromMegapascals(9.601));
        Assert.Contains("2 readings for pass '1'", Assert.Throws<ArgumentException>(() => PassCalibration.Fit(ExamplePass.Pass, [sample, sample])).Message, StringComparison.Ordinal);
        Assert.Contains("1 of 3 readings", Assert.Throws<ArgumentException>(() => PassCalibration.Fit(ExamplePass.Pass, [sample, sample, with])).Message, StringComparison.Ordinal);
        Assert.Contains("No friction factor", Assert.Throws<ArgumentException>(() => PassCalibration.Fit(ExamplePass.Pass, [with, with, with])).Message, StringComparison.Ordinal);
        Assert.Throws<ArgumentOutOfRangeException>(() => new CalibrationSample(MassFlow.FromKilogramsPerSecond(4.8), Temperature.FromDegreesCelsius(172), Ratio.Zero, Pressure.FromMegapascals(9.6), MassFraction.FromPercent(78)));
        Assert.Contains("Inlet pressure = 9 MPa must exceed", Assert.Throws<ArgumentOutOfRangeException>(() => new CalibrationSample(MassFlow.FromKilogramsPerSecond(4.8), Temperature.FromDegreesCelsius(172), Ratio.FromPercent(100), Pressure.FromMegapascals(9.6), MassFraction.FromPercent(78), Pressure.FromMegapascals(9))).Message, StringComparison.Ordinal);
    }

    // Repeatable, mean near zero, neighbours unlike.
    private static double Noise(int i) => Math.Sin(12.9898 * (i + 1) * (i + 3));

    private static ReferenceTable Table(string name) => name == nameof(FiringUp) ? FiringUp : FeedWarms;

    private static ReferenceTable.Row[] First(ReferenceTable table) => [.. table.Rows.Where(row => row["time_s"] < 300)];

    private static ReferenceTable.Row[] Last(ReferenceTable table) => [.. table.Rows.Where(row => row["time_s"] >= 300)];

    private static PassCalibration Fit(ReferenceTable table) => PassCalibration.Fit(ExamplePass.Pass, [.. First(table).Take(60).Select(row => CalibrationSample.FromDifferential(
        Meter,
        MassFlow.FromKilogramsPerSecond(row["feed_flow_kg_s"]),
        Temperature.FromDegreesCelsius(row["feed_temperature_C"]),
        Ratio.FromPercent(row["firing_percent"]),
        Pressure.FromMegapascals(row["outlet_pressure_MPa_abs"]),
        Pressure.FromKilopascals(row["venturi_dp_kPa"])))]);

    private static PassProfile Rest(Pass pass, ReferenceTable.Row[] rows) => SteadyState.Solve(pass, new PassConditions(
        MassFlow.FromKilogramsPerSecond(rows.Average(row => row["feed_flow_kg_s"])),
        Temperature.FromDegreesCelsius(rows.Average(row => row["feed_temperature_C"])),
        Pressure.FromMegapascals(rows.Average(row => row["outlet_pressure_MPa_abs"])),
        Power.FromWatts((double)pass.HeatAtFullFiring!.Value.Watts * rows.Average(row => row["firing_percent"]) / 100)));

    private static double TrueChange(ReferenceTable table) => table.Rows[^1]["true_holdup_kg"] - table.Rows[0]["true_holdup_kg"];

    private static double Change(Pass pass, ReferenceTable table) => WaterHoldup.Of(Rest(pass, First(table))).ChangeTo(WaterHoldup.Of(Rest(pass, Last(table)))).Total.Kilograms;
}
