using TwoPhase.Boiling;
using TwoPhase.Dynamics;
using TwoPhase.Passes;
using TwoPhase.Steam;
using TwoPhase.Tests.Support;
using UnitsNet;
using static TwoPhase.Tests.Dynamics.Simulations;

namespace TwoPhase.Tests.Dynamics;

public class FiringTripTests
{
    private const double Area = Math.PI / 4 * 0.0779 * 0.0779, Volume = Area * 671;

    // As in the light-off: 7850 kg/m³ and 550 J/(kg·K) (common practice, no source).
    private const double MetalPerMetre = Math.PI / 4 * ((0.0889 * 0.0889) - (0.0779 * 0.0779)) * 7850 * 550;

    private static readonly FiringTripReport Report = new FiringTrip(Start).Run(MeteredPass);

    // By hand. Water that stood at the boiling boundary is the last that boils: what follows it, on its way from feed to boiling, must fill the tubes down to
    // the outlet, and cools the metal, which makes it later by the metal's share of the heat capacity.
    [Theory]
    [InlineData(9.6), InlineData(14)]
    public void Run_Quench_TakesThePassageOfTheWaterAndItsMetal(double megapascals)
    {
        PassConditions running = SteadyState.FindHeat(MeteredPass, Start.WithOutletPressure(Pressure.FromMegapascals(megapascals)), MassFraction.FromPercent(78)).Conditions;
        double feed = SteamState.FromPressureTemperature(running.OutletPressure, running.FeedTemperature!.Value).SpecificEnthalpy.JoulesPerKilogram, boiling = Saturation.FromPressure(running.OutletPressure).Liquid.SpecificEnthalpy.JoulesPerKilogram;
        SteamState middle = SteamState.FromPressureEnthalpy(running.OutletPressure, SpecificEnergy.FromJoulesPerKilogram((feed + boiling) / 2));
        double onset = BoilingOnset.Of(SteadyState.Solve(MeteredPass, running))!.Position.Meters, density = middle.Density.KilogramsPerCubicMeter;
        double passage = Area * (671 - onset) * density / running.FeedFlow.KilogramsPerSecond, metal = MetalPerMetre / (Area * density * middle.IsobaricHeatCapacity!.Value.JoulesPerKilogramKelvin);
        FiringTripReport report = new FiringTrip(running).Run(MeteredPass);
        Approx.Relative(passage * (1 + metal), (report.Quenched!.Value - report.Course.FireOut).Seconds, 0.1);
    }

    // At the end the pass is full of feed.
    [Fact]
    public void Run_Refilled_IsWhatIsBetweenFeedWaterAndSteadyHoldup()
    {
        double density = SteamState.FromPressureTemperature(Start.OutletPressure, Start.FeedTemperature!.Value).Density.KilogramsPerCubicMeter;
        Approx.Relative((Volume * density) - Report.History[0].Holdup.Kilograms, Report.Refilled.Kilograms, 0.01);
        Approx.Absolute(Start.FeedTemperature.Value.DegreesCelsius, Report.History[^1].OutletTemperature.DegreesCelsius, 0.5);
    }

    // Nothing swells any more: by volume as much leaves as comes in, but it is wet steam. Hot metal and falling pressure still make some.
    [Fact]
    public void Run_OutletFlow_FallsToWhatTheVolumeOfTheFeedDrivesOut()
    {
        SteamState outlet = SteamState.FromPressureQuality(Start.OutletPressure, MassFraction.FromPercent(78));
        double feed = SteamState.FromPressureTemperature(Start.OutletPressure, Start.FeedTemperature!.Value).Density.KilogramsPerCubicMeter;
        double driven = Start.FeedFlow.KilogramsPerSecond * outlet.Density.KilogramsPerCubicMeter / feed;
        Assert.InRange(Report.LowestOutletFlow.KilogramsPerSecond / driven, 1, 1.5);
        Assert.True(Report.Figures.PeakError!.Value.DecimalFractions < -0.5);
    }

    [Fact]
    public void Run_Events_ComeInTheirOrder()
    {
        Duration?[] times = [Report.Course.FireOut, Report.TimeOfLowest, Report.SteamEnds, Report.FlowIsBack, Report.Course.Length];
        Assert.All(times.Zip(times.Skip(1)), pair => Assert.True(pair.First < pair.Second));
        Assert.True(Report.Quenched <= Report.SteamEnds);
        Assert.Equal(SimulationEnd.Completed, Report.History.End);
        Assert.All(Report.History, row => Approx.Absolute(0, row.MassResidual, 1e-9));
        Assert.All(Report.History, row => Approx.Absolute(0, row.EnergyResidual, 1e-9));
    }

    // The front of feed is at the outlet within minutes: from saturation to feed temperature no faster than at once, and not over half an hour.
    [Fact]
    public void Run_Cooling_IsOfTheOrderOfSaturationToFeedOverAPassage()
    {
        double all = Saturation.FromPressure(Start.OutletPressure).Temperature.DegreesCelsius - Start.FeedTemperature!.Value.DegreesCelsius;
        Assert.InRange(Report.OutletCooling.DegreesCelsiusPerMinute, all / 30, all / 2);
        Assert.InRange(Report.MetalCooling.DegreesCelsiusPerMinute, all / 30, all);
    }

    // Refractory goes on giving heat: the quench comes later.
    [Fact]
    public void Run_WithRefractory_QuenchesLater()
    {
        var lags = new HeatLags(Seconds(5), Ratio.FromPercent(8), Duration.FromMinutes(20));
        FiringTripReport report = new FiringTrip(Start).Run(MeteredPass, SimulatorOptions.Default.WithHeatLags(lags));
        Assert.True(report.Quenched > Report.Quenched);
    }

    [Fact]
    public void Constructor_NoHeat_Throws() => Assert.Throws<ArgumentOutOfRangeException>(() => new FiringTrip(Start.WithAbsorbedHeat(Power.Zero)));
}
