using FsCheck.Xunit;
using TwoPhase.Steam;

namespace TwoPhase.Tests.Steam;

/// <summary>Through every door and back again.</summary>
[Properties(Arbitrary = [typeof(StatePoints)], MaxTest = 500)]
public class RoundTripTests
{
    private const double Tolerance = 1e-9;

    [Property]
    public void AtPressureEnthalpy_AnyState_GivesBackTheTemperature(PlanePoint point) =>
        Same(point.State, Water.AtPressureEnthalpy(point.Pressure, point.State.Enthalpy));

    [Property]
    public void AtPressureEntropy_AnyState_GivesBackTheTemperature(PlanePoint point) =>
        Same(point.State, Water.AtPressureEntropy(point.Pressure, point.State.Entropy));

    [Property]
    public void AtPressureDensity_AnyState_GivesBackTheTemperature(PlanePoint point)
    {
        // Around its greatest density water has no temperature to give back to nine digits.
        if (point.State.Region == 1 && point.Temperature < 285) return;
        Same(point.State, Water.AtPressureDensity(point.Pressure, point.State.Density));
    }

    [Property]
    public void AtTemperatureDensity_AnyState_GivesBackThePressure(PlanePoint point)
    {
        WaterCore state = point.State, again = Water.AtTemperatureDensity(point.Temperature, state.Density);
        Assert.Equal(state.Region, again.Region);

        // One unit in the last place of ρ is worth K times that in p.
        Approx.Absolute(point.Pressure, again.Pressure, (Tolerance * point.Pressure) + (1e-15 * state.Phase.BulkModulus), point.ToString());
    }

    [Property]
    public void AtEnthalpyEntropy_AnyState_GivesBackPressureAndTemperature(PlanePoint point)
    {
        WaterCore state = point.State, again = Water.AtEnthalpyEntropy(state.Enthalpy, state.Entropy);
        Assert.True(state.Region == again.Region, $"region {again.Region} instead of {state.Region} at {point}");
        Approx.Relative(point.Temperature, again.Temperature, Tolerance, point.ToString());

        // dp = (dh − T ds) / v: round-off of h and s is worth more in p the stiffer the fluid.
        double roundOff = 4e-15 * (Math.Abs(state.Enthalpy) + (state.Temperature * Math.Abs(state.Entropy))) / state.SpecificVolume;
        Approx.Absolute(point.Pressure, again.Pressure, (Tolerance * point.Pressure) + roundOff, point.ToString());
    }

    [Property]
    public void EveryDoor_WetState_GivesBackTheQuality(WetPoint point)
    {
        WaterCore state = point.State;
        Wet(point, Water.AtTemperatureQuality(state.Temperature, point.Quality));
        Wet(point, Water.AtPressureEnthalpy(point.Pressure, state.Enthalpy));
        Wet(point, Water.AtPressureEntropy(point.Pressure, state.Entropy));
        Wet(point, Water.AtPressureDensity(point.Pressure, state.Density));
        Wet(point, Water.AtTemperatureDensity(state.Temperature, state.Density));
        Wet(point, Water.AtEnthalpyEntropy(state.Enthalpy, state.Entropy));
    }

    [Property]
    public void AtPressureTemperature_BesideTheDome_IsOnTheSideAskedFor(WetPoint point)
    {
        double saturation = SaturationLine.Temperature(point.Pressure);
        SaturationCore steam = SaturationLine.AtPressure(point.Pressure);
        WaterCore liquid = Water.AtPressureTemperature(point.Pressure, saturation * (1 - 1e-10)), vapour = Water.AtPressureTemperature(point.Pressure, saturation * (1 + 1e-10));
        Assert.True(saturation < Water97.LowestTemperature + 1e-6 || liquid.SteamPhase == SteamPhase.Liquid, point.ToString());
        Assert.True(vapour.SteamPhase == SteamPhase.Vapour, point.ToString());
        Assert.True(liquid.Region == 0 || liquid.Enthalpy < steam.Liquid.Enthalpy, point.ToString());
        Assert.True(vapour.Enthalpy > steam.Vapour.Enthalpy, point.ToString());
    }

    private static void Same(in WaterCore expected, in WaterCore actual)
    {
        string what = expected.ToString();
        Assert.True(expected.Region == actual.Region, $"region {actual.Region} for {what}");
        Approx.Relative(expected.Temperature, actual.Temperature, Tolerance, what);
        Approx.Relative(expected.Pressure, actual.Pressure, Tolerance, what);
    }

    private static void Wet(WetPoint point, in WaterCore actual)
    {
        Assert.True(actual.IsWet, $"region {actual.Region} at {point}");
        Approx.Absolute(point.Quality, actual.Quality, Tolerance, point.ToString());
        Approx.Relative(point.Pressure, actual.Pressure, Tolerance, point.ToString());
    }
}
