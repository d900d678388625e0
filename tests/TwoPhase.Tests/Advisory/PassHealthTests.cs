using TwoPhase.Advisory;
using TwoPhase.Metering;
using TwoPhase.Passes;
using TwoPhase.Tests.Passes;
using UnitsNet;
using static TwoPhase.Tests.Advisory.Plants;

namespace TwoPhase.Tests.Advisory;

public class PassHealthTests
{
    private static readonly HealthFigures Clean = Figures(KnownPass, 1, 1);

    // Scale of 0.2 mm, a conductivity as scale has it: the metal runs hotter by the flux times its resistance, and little else moves.
    [Fact]
    public void Of_ScaledPass_SuspectsScaleInside()
    {
        Pass scaled = new Pass("1", [.. KnownPass.Sections.Select(section => section.WithScale(Length.FromMillimeters(0.2), ThermalConductivity.FromWattsPerMeterKelvin(1.5)))])
            .WithConvectiveShare(Ratio.FromPercent(41));
        PassHealth health = PassHealth.Of(Clean, Figures(scaled, 1, 0.995));
        Assert.Equal(HealthFinding.ScaleInside, health.Finding);
        Assert.True(health.MetalExcess!.Value.DecimalFractions > 0.3, $"{health}");
        Assert.InRange(health.HeatShare!.Value.DecimalFractions, -0.01, 0.002);
    }

    [Fact]
    public void Of_LessHeat_SuspectsSootOutside()
    {
        PassHealth health = PassHealth.Of(Clean, Figures(KnownPass, 1, 0.95));
        Assert.Equal(HealthFinding.SootOutside, health.Finding);
        Approx.Absolute(-0.05, health.HeatShare!.Value.DecimalFractions, 0.003);
        Assert.InRange(health.MetalExcess!.Value.DecimalFractions, -0.05, 0.05);
        Assert.InRange(health.PressureDrop!.Value.DecimalFractions, -0.02, 0.02);

        // When all passes take less, it is fuel or burner, and no pass is accused.
        HealthFigures[] before = [Clean, Clean, Clean], after = [.. Enumerable.Repeat(Figures(KnownPass, 1, 0.95), 3)];
        Assert.All(PassHealth.Of(before, after), pass => Assert.Equal(HealthFinding.None, pass.Finding));
        after[1] = Clean;
        Assert.Equal(HealthFinding.None, PassHealth.Of(before, after)[0].Finding);
        Assert.Equal(HealthFinding.SootOutside, PassHealth.Of(before, [Clean, after[0], Clean])[1].Finding);
        Assert.Throws<ArgumentException>(() => PassHealth.Of(before, [Clean]));
    }

    [Theory]
    [InlineData(0.8), InlineData(0.65)]
    public void Of_LowerLoad_FindsNothing(double load)
    {
        PassHealth health = PassHealth.Of(Clean, Figures(KnownPass, load, 1));
        Assert.Equal(HealthFinding.None, health.Finding);
        Assert.InRange(health.PressureDrop!.Value.DecimalFractions, -0.02, 0.02);
        Assert.InRange(health.MetalExcess!.Value.DecimalFractions, -0.12, 0.12);
    }

    [Fact]
    public void Of_MorePressureDrop_SuspectsANarrowing()
    {
        PassHealth health = PassHealth.Of(Clean, Figures(KnownPass, 1, 1, resistance: 1.1));
        Assert.Equal(HealthFinding.NarrowerInside, health.Finding);
        Approx.Absolute(0.10, health.PressureDrop!.Value.DecimalFractions, 0.01);
        Assert.Equal(HealthFinding.LessResistance, PassHealth.Of(Clean, Figures(KnownPass, 1, 1, resistance: 0.9)).Finding);
        HealthFigures mean = HealthFigures.Mean([Clean, Figures(KnownPass, 1, 1, resistance: 1.1)]);
        Approx.Absolute(1.05, mean.Friction!.Value, 0.01);
        Assert.Throws<ArgumentException>(() => HealthFigures.Mean([]));
        Assert.Null(HealthFigures.Of(new QualityEstimator(KnownPass, Meter), default));
    }

    // What the instruments of a pass at rest say, from its steady state: flow and firing at a load, heat per firing, pressure drop times a factor.
    private static HealthFigures Figures(Pass plant, double load, double heat, double resistance = 1)
    {
        PassConditions conditions = Start with { RawFeedFlow = load * Start.RawFeedFlow, RawAbsorbedHeat = load * heat * Start.RawAbsorbedHeat };
        PassProfile truth = SteadyState.Solve(plant, conditions);
        Pressure inlet = conditions.OutletPressure + (truth.PressureDrop.Total * resistance);
        int[] heated = [.. Enumerable.Range(0, truth.Count).Where(i => truth[i].Position.Meters > 400)];
        Temperature?[] metal = [.. Enumerable.Range(1, 4).Select(i => (Temperature?)truth.WallAt(heated[(i * heated.Length / 5)]).Temperatures.OutsideMetal)];
        double differential = Meter.Differential(conditions.FeedFlow, conditions.OutletPressure, truth.OutletQuality).Kilopascals;
        var estimator = new QualityEstimator(KnownPass, Meter, EstimatorOptions.Default.WithCells(30));
        PassReading reading = default;
        for (int t = 0; t < 700; t++)
        {
            reading = Format.Read(Midnight.AddSeconds(t), conditions.RawFeedFlow * (1 + (1e-6 * (t % 2))), conditions.RawFeedTemperature - 273.15, 100 * load, conditions.RawOutletPressure * 1e-6, differential * (1 + (1e-6 * (t % 2))))
                .WithInletPressure(inlet).WithMetalTemperatures(metal);
            estimator.Update(reading);
        }

        return HealthFigures.Of(estimator, reading)!;
    }
}
