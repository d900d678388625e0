using FsCheck.Xunit;
using TwoPhase.Flow;
using TwoPhase.HeatTransfer;
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
        // Tests of python library ht 1.0: turbulent_Dittus_Boelter(Re=1E5, Pr=1.2) = 247.40036409449127.
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
    public void Gnielinski_FeedWater_IsSeveralKilowattsPerSquareMetreAndKelvin()
    {
        // Water at 150 °C and 10 MPa, 1000 kg/(m²·s) in a 78 mm bore; properties rounded from python3-iapws 1.5.2. Own arithmetic: Re = 424 460, Pr = 1.142.
        MassFlux flux = MassFlux.FromKilogramsPerSecondPerSquareMeter(1000);
        Length bore = Length.FromMillimeters(78);
        DynamicViscosity viscosity = DynamicViscosity.FromPascalSeconds(1.8376e-4);
        ThermalConductivity conductivity = ThermalConductivity.FromWattsPerMeterKelvin(0.6895);
        SpecificEntropy heatCapacity = SpecificEntropy.FromJoulesPerKilogramKelvin(4285);
        Approx.Relative(6834, SinglePhaseFilm.Gnielinski(flux, bore, viscosity, conductivity, heatCapacity).WattsPerSquareMeterKelvin, 0.01);
        Assert.True(SinglePhaseFilm.CheckGnielinski(flux, bore, viscosity, conductivity, heatCapacity).IsInside);
        Assert.True(SinglePhaseFilm.CheckDittusBoelter(flux, bore, viscosity, conductivity, heatCapacity).IsInside);
        Assert.Equal(ApplicabilityLimits.Reynolds, SinglePhaseFilm.CheckGnielinski(flux / 150, bore, viscosity, conductivity, heatCapacity).Exceeded);
    }

    [Fact]
    public void Gnielinski_NoConductivity_ThrowsNamingTheValue()
    {
        ArgumentOutOfRangeException error = Assert.Throws<ArgumentOutOfRangeException>(() => SinglePhaseFilm.Gnielinski(
            MassFlux.FromKilogramsPerSecondPerSquareMeter(1000), Length.FromMillimeters(78), DynamicViscosity.FromPascalSeconds(1e-4), ThermalConductivity.Zero, SpecificEntropy.FromJoulesPerKilogramKelvin(4285)));
        Assert.Equal("conductivity", error.ParamName);
        Assert.Contains("0 W/(m·K)", error.Message, StringComparison.Ordinal);
    }
}
