using System.Globalization;
using TwoPhase.Steam;
using UnitsNet;

namespace TwoPhase.Tests.Steam;

public class SteamStateTests
{
    private static readonly Pressure TenMegapascals = Pressure.FromMegapascals(10);

    [Fact]
    public void FromPressureTemperature_SubcooledWater_KnowsAllButQuality()
    {
        // R7-97(2012), Table 5: 3 MPa, 300 K.
        var state = SteamState.FromPressureTemperature(Pressure.FromMegapascals(3), Temperature.FromKelvins(300));
        Assert.Equal(1, state.Region);
        Assert.Equal(SteamPhase.Liquid, state.Phase);
        Assert.Null(state.Quality);
        Approx.Relative(115.331273, state.SpecificEnthalpy.KilojoulesPerKilogram, 5e-9);
        Approx.Relative(1507.73921, state.SpeedOfSound!.Value.MetersPerSecond, 5e-9);
        Approx.Relative(0.100215168e-2, state.SpecificVolume.CubicMetersPerKilogram, 5e-9);
        Assert.True(state.EquilibriumQuality!.Value.DecimalFractions < 0);
        Assert.NotNull(state.DynamicViscosity);
        Assert.NotNull(state.ThermalConductivity);
    }

    [Fact]
    public void FromPressureQuality_WetSteam_LeavesPhasePropertiesNull()
    {
        var state = SteamState.FromPressureQuality(TenMegapascals, MassFraction.FromPercent(80));
        Assert.Equal(4, state.Region);
        Assert.Equal(SteamPhase.Wet, state.Phase);
        Approx.Relative(0.8, state.Quality!.Value.DecimalFractions, 1e-15);
        Assert.Equal(state.Quality.Value.DecimalFractions, state.EquilibriumQuality!.Value.DecimalFractions);
        Assert.Null(state.IsobaricHeatCapacity);
        Assert.Null(state.IsochoricHeatCapacity);
        Assert.Null(state.SpeedOfSound);
        Assert.Null(state.DynamicViscosity);
        Assert.Null(state.ThermalConductivity);
        Assert.Null(state.IsentropicExponent);

        // R7-97(2012), Table 36: Ts(10 MPa).
        Approx.Relative(584.149488, state.Temperature.Kelvins, 1e-9);
    }

    [Fact]
    public void Phase_AroundTheCriticalPoint_FollowsTheTrade()
    {
        Assert.Equal(SteamPhase.Supercritical, At(25, 700).Phase);
        Assert.Equal(SteamPhase.Liquid, At(25, 640).Phase);
        Assert.Equal(SteamPhase.Vapour, At(22, 660).Phase);
        Assert.Equal(SteamPhase.Liquid, At(22, 646).Phase);
        Assert.Equal(SteamPhase.Vapour, At(1, 1500).Phase);
        Assert.Equal(SteamPhase.None, default(SteamState).Phase);
        Assert.Null(At(25, 700).EquilibriumQuality);
    }

    [Fact]
    public void CriticalPoint_EveryDoor_StaysFiniteOrSaysSo()
    {
        var state = SteamState.FromTemperatureDensity(Temperature.FromKelvins(647.096), Density.FromKilogramsPerCubicMeter(322));
        Approx.Relative(22.064e6, state.Pressure.Pascals, 1e-8);
        Assert.True(state.SpeedOfSound!.Value.MetersPerSecond > 0);
        Assert.True(state.IsobaricHeatCapacity!.Value.JoulesPerKilogramKelvin > 1e6);
        Assert.True(state.ThermalConductivity!.Value.WattsPerMeterKelvin > 0);
        Approx.Absolute(0, Saturation.FromPressure(Pressure.FromMegapascals(22.064)).SurfaceTension.NewtonsPerMeter, 1e-12);
    }

    [Fact]
    public void Equality_SameState_IsOverTheDoubles()
    {
        SteamState one = At(10, 500), same = SteamState.FromPressureTemperature(Pressure.FromBars(100), Temperature.FromKelvins(500));
        Assert.Equal(one, same);
        Assert.NotEqual(one, At(10, 501));
        Assert.Equal(
            SteamState.FromPressureQuality(TenMegapascals, MassFraction.FromPercent(50)),
            SteamState.FromPressureQuality(TenMegapascals, MassFraction.FromPercent(50)));
    }

    [Fact]
    public void ToString_CommaCulture_StaysInvariant()
    {
        CultureInfo before = CultureInfo.CurrentCulture;
        try
        {
            CultureInfo.CurrentCulture = CultureInfo.GetCultureInfo("de-DE");
            Assert.Equal("Wet x = 0.5, 10 MPa, 310.9995 °C, 102.6368 kg/m³, 2066.67 kJ/kg", SteamState.FromPressureQuality(TenMegapascals, MassFraction.FromDecimalFractions(0.5)).ToString());
            Assert.Equal("no state", default(SteamState).ToString());
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }

    [Theory]
    [InlineData(-1, 500, "pressure", "-1 MPa")]
    [InlineData(0, 500, "pressure", "0 MPa")]
    [InlineData(101, 500, "pressure", "100 MPa")]
    [InlineData(51, 1100, "pressure", "50 MPa")]
    [InlineData(10, 273, "temperature", "273.15 K")]
    [InlineData(10, 2274, "temperature", "2273.15 K")]
    public void FromPressureTemperature_OutsideTheFormulation_ThrowsNamingValueAndLimit(double megapascals, double kelvins, string parameter, string text) =>
        Names(parameter, text, () => At(megapascals, kelvins));

    [Fact]
    public void OtherDoors_OutsideTheFormulation_ThrowNamingValueAndLimits()
    {
        Names("enthalpy", "5000 kJ/kg must lie between ", () => SteamState.FromPressureEnthalpy(Pressure.FromMegapascals(70), SpecificEnergy.FromKilojoulesPerKilogram(5000)));
        Names("entropy", "at 10 MPa", () => SteamState.FromPressureEntropy(TenMegapascals, SpecificEntropy.FromKilojoulesPerKilogramKelvin(-1)));
        Names("density", "2000 kg/m³", () => SteamState.FromPressureDensity(TenMegapascals, Density.FromKilogramsPerCubicMeter(2000)));
        Names("density", "at 500 K", () => SteamState.FromTemperatureDensity(Temperature.FromKelvins(500), Density.FromKilogramsPerCubicMeter(2000)));
        Names("density", "greater than zero", () => SteamState.FromTemperatureDensity(Temperature.FromKelvins(500), Density.FromKilogramsPerCubicMeter(-2)));
        Names("enthalpy", "9000 kJ/kg with", () => SteamState.FromEnthalpyEntropy(SpecificEnergy.FromKilojoulesPerKilogram(9000), SpecificEntropy.FromKilojoulesPerKilogramKelvin(5)));
        Names("quality", "1.2 must lie between 0 and 1", () => SteamState.FromPressureQuality(TenMegapascals, MassFraction.FromDecimalFractions(1.2)));
        Names("quality", "-0.1", () => SteamState.FromTemperatureQuality(Temperature.FromKelvins(500), MassFraction.FromDecimalFractions(-0.1)));
        Names("pressure", "22.064 MPa", () => SteamState.FromPressureQuality(Pressure.FromMegapascals(22.064), MassFraction.FromDecimalFractions(0.5)));
        Names("temperature", "647.096 K", () => SteamState.FromTemperatureQuality(Temperature.FromKelvins(647.096), MassFraction.FromDecimalFractions(0.5)));
    }

    [Fact]
    public void EveryDoorAndProperty_OnceWarm_AllocatesNothing()
    {
        SpecificEnergy h = SpecificEnergy.FromKilojoulesPerKilogram(2000);
        SpecificEntropy s = SpecificEntropy.FromKilojoulesPerKilogramKelvin(4.5);
        Density rho = Density.FromKilogramsPerCubicMeter(700);
        Temperature t = Temperature.FromKelvins(500);
        double sink = 0;
        long bytes = AllocationProbe.Bytes(() =>
        {
            sink += SteamState.FromPressureTemperature(TenMegapascals, t).Core.Enthalpy;
            sink += SteamState.FromPressureEnthalpy(TenMegapascals, h).Core.Enthalpy;
            sink += SteamState.FromPressureEntropy(TenMegapascals, s).Core.Enthalpy;
            sink += SteamState.FromPressureDensity(TenMegapascals, rho).Core.Enthalpy;
            sink += SteamState.FromTemperatureDensity(t, rho).Core.Enthalpy;
            sink += SteamState.FromEnthalpyEntropy(h, s).Core.Enthalpy;
            SteamState state = SteamState.FromPressureTemperature(TenMegapascals, t);
            sink += state.SpecificVolume.Value + state.IsobaricHeatCapacity!.Value.Value + state.ThermalConductivity!.Value.Value + state.EquilibriumQuality!.Value.Value;
            Saturation steam = Saturation.FromPressure(TenMegapascals);
            sink += steam.Liquid.DynamicViscosity.Value + steam.Vapour.SpeedOfSound.Value + steam.SurfaceTension.Value;
        });
        Assert.Equal(0, bytes);
        Assert.True(sink != 0);
    }

    private static SteamState At(double megapascals, double kelvins) =>
        SteamState.FromPressureTemperature(Pressure.FromMegapascals(megapascals), Temperature.FromKelvins(kelvins));

    private static void Names(string parameter, string text, Func<SteamState> door)
    {
        ArgumentOutOfRangeException error = Assert.Throws<ArgumentOutOfRangeException>(() => door());
        Assert.Equal(parameter, error.ParamName);
        Assert.Contains(text, error.Message, StringComparison.Ordinal);
    }
}
