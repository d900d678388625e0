using FsCheck.Xunit;
using TwoPhase.Flow;
using TwoPhase.HeatTransfer;
using TwoPhase.Passes;
using TwoPhase.Steam;
using UnitsNet;

namespace TwoPhase.Tests.Passes;

public class PassWallTests
{
    private static readonly PassProfile Profile = SteadyState.FindHeat(ExamplePass.Pass, ExamplePass.Conditions, MassFraction.FromPercent(78));

    [Fact]
    public void WallAt_BoilingRow_IsTheFilmModelThenTheTubeWall()
    {
        // By hand: Ts + q/h, then Q ln(ro/ri)/(2π k) through 5.5 mm of carbon steel, 44 W/(m·K).
        int row = Row(0.5);
        ProfilePoint point = Profile[row];
        PassWall wall = Profile.WallAt(row);
        double q = point.HeatFlux.WattsPerSquareMeter, h = FilmModel.Default.Coefficient(Profile.FlowAt(row), point.HeatFlux).WattsPerSquareMeterKelvin;
        double wetted = point.Temperature.Kelvins + (q / h), outside = wetted + (q * 0.0779 / 2 * Math.Log(88.9 / 77.9) / 44);
        Approx.Relative(h, wall.FilmCoefficient.WattsPerSquareMeterKelvin, 1e-9);
        Approx.Relative(wetted, wall.Temperatures.InsideMetal.Kelvins, 1e-9);
        Approx.Relative(outside, wall.Temperatures.OutsideMetal.Kelvins, 1e-9);
        Assert.Equal(FlowPattern.Of(Profile.FlowAt(row)).Regime, wall.Pattern.Regime);
        Assert.Equal(CriticalQualityModel.Default.Critical(Profile.FlowAt(row), point.HeatFlux).Mean.DecimalFractions, wall.CriticalQuality!.Value.Mean.DecimalFractions, 1e-9);
    }

    [Fact]
    public void WallAt_ColdLiquid_IsGnielinskiOfTheWater()
    {
        ProfilePoint inlet = Profile.Inlet;
        SteamState water = SteamState.FromPressureTemperature(inlet.Pressure, inlet.Temperature);
        double h = SinglePhaseFilm.Gnielinski(water, inlet.MassFlux, Length.FromMillimeters(77.9)).WattsPerSquareMeterKelvin;
        PassWall wall = Profile.WallAt(0);
        Approx.Relative(h, wall.FilmCoefficient.WattsPerSquareMeterKelvin, 1e-6);
        Approx.Relative(inlet.Temperature.Kelvins + (inlet.HeatFlux.WattsPerSquareMeter / h), wall.Temperatures.WettedSurface.Kelvins, 1e-9);
        Assert.Equal(FlowRegime.Liquid, wall.Pattern.Regime);
        Assert.Null(wall.DryTemperatures);
    }

    [Fact]
    public void WallAt_AlongThePass_HasNoJumpWhereBoilingBegins()
    {
        // Rows stand some metres apart there, and liquid warms by less than a kelvin a metre: no step of the wall beyond that of the flow and of the film over one row.
        double before = double.NaN;
        for (int i = 0; i < Profile.Count && Profile[i].EquilibriumQuality.DecimalFractions < 0.1; i++)
        {
            double wall = Profile.WallAt(i).Temperatures.WettedSurface.Kelvins;
            if (i > 0 && Profile[i].Section == Profile[i - 1].Section) Assert.True(Math.Abs(wall - before) <= Math.Abs(Profile[i].Temperature.Kelvins - Profile[i - 1].Temperature.Kelvins) + 0.5, $"{Profile[i]}: wall {before} K to {wall} K");
            before = wall;
        }
    }

    [Fact]
    public void WallAt_OutletAtSeventyEight_WouldBeTenToThirtyKelvinsHotterDry()
    {
        // The size that the trade reports for a wall that dries out at 60 to 100 kW/m² and 10 MPa; common practice, no source.
        foreach (double megawatts in new[] { 60, 100 })
        {
            Pass pass = new("1", [ExamplePass.Tubes("coil", 8.2e6 / (Math.PI * 0.0779 * megawatts * 1e3))]);
            PassProfile profile = SteadyState.FindHeat(pass, ExamplePass.Conditions, MassFraction.FromPercent(78));
            PassWall wall = profile.WallAt(profile.Count - 1);
            Assert.InRange(wall.DryTemperatures!.Value.OutsideMetal.Kelvins - wall.Temperatures.OutsideMetal.Kelvins, 10, 30);
        }
    }

    [Fact]
    public void WallAt_FluxPeak_ActsInTheFireOnly()
    {
        int coil = Row(0.5), bank = 0;
        Assert.Equal(Profile.WallAt(bank), Profile.WallAt(bank, 1.8));
        WallTemperatures even = Profile.WallAt(coil).Temperatures, peak = Profile.WallAt(coil, 1.8).Temperatures;
        Approx.Relative(1.8 * even.WettedHeatFlux.WattsPerSquareMeter, peak.WettedHeatFlux.WattsPerSquareMeter, 1e-12);
        Assert.True(peak.OutsideMetal > even.OutsideMetal);
        Assert.Contains("Flux peak = 0.5 must lie between 1 and 4", Assert.Throws<ArgumentOutOfRangeException>(() => Profile.WallAt(coil, 0.5)).Message, StringComparison.Ordinal);
    }

    [Fact]
    public void WallAt_RibbedBore_IsFlagged()
    {
        Pass ribbed = new("1", [ExamplePass.Tubes("coil", 671).WithRibs(1.5)]);
        PassProfile profile = SteadyState.FindHeat(ribbed, ExamplePass.Conditions, MassFraction.FromPercent(78));
        PassWall wall = profile.WallAt(profile.Count - 1);
        Assert.True(wall.FilmApplicability.Exceeded.HasFlag(ApplicabilityLimits.RibbedBore));
        Assert.True(wall.CriticalQuality!.Value.Applicability.Exceeded.HasFlag(ApplicabilityLimits.RibbedBore));
    }

    [Fact]
    public void WallAt_UnheatedLine_HasTheTemperatureOfTheFlow()
    {
        Pass pass = ExamplePass.Pass.WithOutletLine(new OutletLine(Length.FromMillimeters(77.9), 2, Volume.FromLiters(50)));
        PassProfile profile = SteadyState.FindHeat(pass, ExamplePass.Conditions, MassFraction.FromPercent(78));
        PassWall wall = profile.WallAt(profile.Count - 1);
        Assert.Equal(profile.Outlet.Temperature, wall.Temperatures.OutsideMetal);
        Assert.Null(wall.CriticalQuality);
    }

    [Fact]
    public void WallAt_SuperheatedOutlet_IsGnielinskiOfTheSteam()
    {
        PassProfile dry = SteadyState.FindHeat(ExamplePass.Pass, ExamplePass.Conditions, MassFraction.FromPercent(108));
        ProfilePoint outlet = dry.Outlet;
        SteamState steam = SteamState.FromPressureEnthalpy(outlet.Pressure, outlet.Enthalpy);
        Approx.Relative(SinglePhaseFilm.Gnielinski(steam, outlet.MassFlux, Length.FromMillimeters(77.9)).WattsPerSquareMeterKelvin, dry.WallAt(dry.Count - 1).FilmCoefficient.WattsPerSquareMeterKelvin, 1e-9);
    }

    [Property(MaxTest = 20)]
    public bool OutsideMetal_ThickerScale_IsHotter(byte thickness)
    {
        double millimetres = thickness / 200.0;
        return Metal(millimetres + 0.1) > Metal(millimetres);

        static double Metal(double millimetres)
        {
            Pass pass = new("1", [ExamplePass.Tubes("coil", 671).WithScale(Length.FromMillimeters(millimetres), ThermalConductivity.FromWattsPerMeterKelvin(1.5))]);
            PassProfile profile = SteadyState.Solve(pass, ExamplePass.Conditions);
            return profile.WallAt(profile.Count - 1).Temperatures.OutsideMetal.Kelvins;
        }
    }

    private static int Row(double quality) => Enumerable.Range(0, Profile.Count).First(i => Profile[i].Quality.DecimalFractions >= quality);
}
