using FsCheck.Xunit;
using TwoPhase.Flow;
using TwoPhase.HeatTransfer;
using TwoPhase.Steam;
using UnitsNet;

namespace TwoPhase.Tests.HeatTransfer;

public class SinglePhaseFilmTests
{
    // Recomputed in Python from the formulas as printed; h = Nu for k/D = 1.
    [Theory]
    [InlineData(1e4, 0.7, 29.77282, 31.60582)]
    [InlineData(1e5, 7, 598.53388, 500.91848)]
    [InlineData(5e5, 0.95, 790.80108, 816.56974)]
    public void Nusselt_TurbulentFlow_MatchesIndependentArithmetic(double reynolds, double prandtl, double gnielinski, double dittusBoelter)
    {
        SinglePhase phase = new(reynolds, 1, 1, 1, prandtl);
        Approx.Relative(gnielinski, SinglePhaseFilm.GnielinskiCore(phase), 2e-7);
        Approx.Relative(dittusBoelter, SinglePhaseFilm.DittusBoelterCore(phase), 2e-7);
    }

    [Fact]
    public void DittusBoelter_Heating_MatchesHt() =>
        // Tests of the python library ht: turbulent_Dittus_Boelter(Re=1E5, Pr=1.2) = 247.40036409449127.
        Approx.Relative(247.40036409449127, SinglePhaseFilm.DittusBoelterCore(new(1e5, 1, 1, 1, 1.2)), 1e-13);

    [Theory]
    [InlineData(2000, 48.0 / 11)]
    [InlineData(2300, 48.0 / 11)]
    public void Gnielinski_LaminarFlow_IsTheExactNusseltOfUniformHeat(double reynolds, double expected) =>
        Approx.Relative(expected, SinglePhaseFilm.GnielinskiNusselt(reynolds, 1), 1e-15);

    [Property]
    public bool Gnielinski_AcrossTheTransition_IsContinuousAndRises(ushort step, byte prandtl)
    {
        double reynolds = 2300 + (step / 30.0), pr = 0.7 + (prandtl / 20.0);
        double at = SinglePhaseFilm.GnielinskiNusselt(reynolds, pr), beside = SinglePhaseFilm.GnielinskiNusselt(reynolds + 1e-3, pr);
        return beside > at && beside - at < 1e-5 * at;
    }

    [Fact]
    public void Gnielinski_FeedWater_MatchesIndependentArithmetic()
    {
        // Water at 150 °C and 10 MPa, 1000 kg/(m²·s) in a bore of 78 mm; properties by python3-iapws 1.5.2, formula in Python.
        SteamState water = SteamState.FromPressureTemperature(Pressure.FromMegapascals(10), Temperature.FromDegreesCelsius(150));
        MassFlux flux = MassFlux.FromKilogramsPerSecondPerSquareMeter(1000);
        Length bore = Length.FromMillimeters(78);
        Approx.Relative(6866.992656761391, SinglePhaseFilm.Gnielinski(water, flux, bore).WattsPerSquareMeterKelvin, 1e-8);
        Approx.Relative(6782.0277568508345, SinglePhaseFilm.DittusBoelter(water, flux, bore).WattsPerSquareMeterKelvin, 1e-8);
        Assert.True(SinglePhaseFilm.CheckGnielinski(water, flux, bore).IsInside);
        Assert.True(SinglePhaseFilm.CheckDittusBoelter(water, flux, bore).IsInside);
        Assert.Equal(ApplicabilityLimits.Reynolds, SinglePhaseFilm.CheckGnielinski(water, flux / 150, bore).Exceeded);
    }

    [Fact]
    public void Gnielinski_WetSteamOrNoFlow_ThrowsSayingSo()
    {
        SteamState wet = SteamState.FromPressureQuality(Pressure.FromMegapascals(10), MassFraction.FromPercent(50));
        MassFlux flux = MassFlux.FromKilogramsPerSecondPerSquareMeter(1000);
        ArgumentException error = Assert.Throws<ArgumentException>(() => SinglePhaseFilm.Gnielinski(wet, flux, Length.FromMillimeters(78)));
        Assert.Equal("state", error.ParamName);
        Assert.Contains("x = 0.5", error.Message, StringComparison.Ordinal);
        Assert.Throws<ArgumentException>(() => SinglePhaseFilm.DittusBoelter(default, flux, Length.FromMillimeters(78)));
        ArgumentOutOfRangeException range = Assert.Throws<ArgumentOutOfRangeException>(() => SinglePhaseFilm.Gnielinski(
            SteamState.FromPressureTemperature(Pressure.FromMegapascals(10), Temperature.FromDegreesCelsius(150)), -flux, Length.FromMillimeters(78)));
        Assert.Equal("massFlux", range.ParamName);
        Assert.Contains("-1000 kg/(m²·s)", range.Message, StringComparison.Ordinal);
    }
}
