using TwoPhase.Dynamics;
using TwoPhase.Holdup;
using TwoPhase.Passes;
using TwoPhase.Slip;
using TwoPhase.Tests.Passes;
using TwoPhase.Tests.Support;
using UnitsNet;

namespace TwoPhase.Tests.Dynamics;

/// <summary>Left alone, the simulator agrees with the steady solver.</summary>
public class RestTests
{
    public static TheoryData<string> Slips => new(VoidFractionModel.All.Select(model => model.Name));

    [Theory, MemberData(nameof(Slips))]
    public void Advance_NothingChanges_StaysAtTheSteadyState(string slip)
    {
        var models = new PassModels(VoidFractionModel.All.Single(model => model.Name == slip));
        PassConditions conditions = ByEnthalpy(ExamplePass.Conditions);
        PassProfile profile = SteadyState.Solve(ExamplePass.Pass, conditions, models);
        var simulator = new PassSimulator(ExamplePass.Pass, conditions, SimulatorOptions.Default.WithModels(models));
        PassInstant start = simulator.Now, later = simulator.Advance(conditions, Duration.FromSeconds(120));
        foreach (PassInstant instant in new[] { start, later })
        {
            Approx.Absolute(profile.OutletQuality.DecimalFractions, instant.TrueQuality.DecimalFractions, 1e-9, "quality");
            Approx.Relative(conditions.FeedFlow.KilogramsPerSecond, instant.OutletFlow.KilogramsPerSecond, 1e-9, "flow");
            Approx.Relative(Onset(profile), instant.BoilingOnset!.Value.Meters, 1e-3, "onset");
            Approx.Relative(Held(profile), instant.Holdup.Kilograms, 1e-3, "holdup");
            Approx.Relative(profile.Inlet.Pressure.Pascals, instant.InletPressure.Pascals, 1e-4, "inlet pressure");
            Approx.Absolute(0, instant.MassResidual, 1e-12);
            Approx.Absolute(0, instant.EnergyResidual, 1e-12);
        }
    }

    // Second order: four times as near with half the cell. The heat profile is bent on purpose.
    [Fact]
    public void New_TwiceTheCells_IsFourTimesAsNear()
    {
        Pass pass = ExamplePass.Pass.WithHeat(new(
            new SectionHeat("bank", Ratio.FromPercent(41), new FluxPoint(Ratio.Zero, 1), new FluxPoint(Ratio.FromPercent(100), 3)),
            new SectionHeat("coil", Ratio.FromPercent(59), new FluxPoint(Ratio.Zero, 3), new FluxPoint(Ratio.FromPercent(100), 1))));
        PassConditions conditions = ByEnthalpy(ExamplePass.Conditions);
        PassProfile profile = SteadyState.Solve(pass, conditions);
        double Error(int cells, Func<PassInstant, double> of, double truth) => Math.Abs((of(new PassSimulator(pass, conditions, SimulatorOptions.Default.WithCells(cells)).Now) / truth) - 1);
        double coarse = Error(80, row => row.Holdup.Kilograms, Held(profile)), fine = Error(320, row => row.Holdup.Kilograms, Held(profile));
        Assert.True(coarse < 1e-3 && fine < coarse / 10, $"holdup {coarse:E2}, {fine:E2}");
        coarse = Error(80, row => row.BoilingOnset!.Value.Meters, Onset(profile));
        fine = Error(320, row => row.BoilingOnset!.Value.Meters, Onset(profile));
        Assert.True(coarse < 1e-3 && fine < coarse / 8, $"onset {coarse:E2}, {fine:E2}");
    }

    [Fact]
    public void New_FeedByTemperature_AgreesWithTheSteadyState()
    {
        PassProfile profile = SteadyState.Solve(ExamplePass.Pass, ExamplePass.Conditions);
        PassInstant start = new PassSimulator(ExamplePass.Pass, ExamplePass.Conditions).Now;

        // The inlet pressure is second order in the cell, and the enthalpy of the feed depends on it a little.
        Approx.Absolute(profile.OutletQuality.DecimalFractions, start.TrueQuality.DecimalFractions, 1e-6);
        Assert.Equal(profile.Outlet.Temperature.Kelvins, start.OutletTemperature.Kelvins, 1e-6);
    }

    [Fact]
    public void Advance_OutletLineAndSeveralBores_StaysAtTheSteadyState()
    {
        Pass pass = new Pass("1", [
            ExamplePass.Tubes("bank", 300).AsConvective(),
            new TubeSection("riser", Length.FromMillimeters(90), Length.FromMillimeters(102), Length.FromMeters(12)).AsUnheated(),
            ExamplePass.Tubes("coil", 320)]).WithOutletLine(new(Length.FromMillimeters(77.9), 6, Volume.FromCubicMeters(0.05)));
        PassConditions conditions = ByEnthalpy(ExamplePass.Conditions);
        PassProfile profile = SteadyState.Solve(pass, conditions);
        PassInstant later = new PassSimulator(pass, conditions).Advance(conditions, Duration.FromSeconds(120));
        Approx.Relative(conditions.FeedFlow.KilogramsPerSecond, later.OutletFlow.KilogramsPerSecond, 1e-9);
        Approx.Absolute(profile.OutletQuality.DecimalFractions, later.TrueQuality.DecimalFractions, 1e-9);
        Approx.Relative(Held(profile), later.Holdup.Kilograms, 1e-3);
    }

    [Fact]
    public void Advance_ToOtherConditions_ComesToRestAtTheirSteadyState()
    {
        PassConditions conditions = ByEnthalpy(ExamplePass.Conditions), other = conditions.WithFeedFlow(MassFlow.FromKilogramsPerSecond(5)).WithOutletPressure(Pressure.FromMegapascals(9.4));
        var simulator = new PassSimulator(ExamplePass.Pass, conditions);
        simulator.Advance(other, Duration.FromSeconds(60));
        PassInstant end = simulator.Advance(other, Duration.FromSeconds(1500)), rest = new PassSimulator(ExamplePass.Pass, other).Now;
        Approx.Relative(5, end.OutletFlow.KilogramsPerSecond, 1e-9);
        Approx.Absolute(rest.TrueQuality.DecimalFractions, end.TrueQuality.DecimalFractions, 1e-9);
        Approx.Relative(rest.Holdup.Kilograms, end.Holdup.Kilograms, 1e-7);
        Approx.Absolute(0, end.MassResidual, 1e-10);
        Approx.Absolute(0, end.EnergyResidual, 1e-10);
    }

    private static PassConditions ByEnthalpy(PassConditions conditions) => conditions.WithFeedEnthalpy(SteadyState.Solve(ExamplePass.Pass, conditions).Inlet.Enthalpy);

    private static double Onset(PassProfile profile) => profile.First(row => row.EquilibriumQuality.DecimalFractions > -1e-9).Position.Meters;

    private static double Held(PassProfile profile) => WaterHoldup.Of(profile).Total.Kilograms;
}
