using FsCheck.Xunit;
using TwoPhase.Steam;

namespace TwoPhase.Tests.Steam;

/// <summary>
/// Where regions meet. The formulation's own permitted steps (R7-97(2012), section 10, "Prague values", from memory):
/// 0.05 % in v, 0.2 kJ/kg in h, 0.2 J/(kg·K) in s, 1 % in cp, 1 % in w.
/// </summary>
[Properties(Arbitrary = [typeof(StatePoints)], MaxTest = 300)]
public class BorderTests
{
    [Property]
    public void Border13_AnyPressure_IsContinuousWithinTheFormulation(PlanePoint point)
    {
        double p = 16.53e6 + (83.4e6 * Share(point));
        Meets(Region1.At(p, 623.15), Region3.AtPressure(p, 623.15, vapour: false), point);
    }

    [Property]
    public void Border23_AnyTemperature_IsContinuousWithinTheFormulation(PlanePoint point)
    {
        double t = 623.2 + (239.9 * Share(point)), p = Border23.Pressure(t);
        Meets(Region2.At(p, t), Region3.AtPressure(p, t, vapour: true), point);
        Approx.Relative(t, Border23.Temperature(p), 1e-9, point.ToString());
    }

    [Property]
    public void Border25_AnyPressure_IsContinuousWithinTheFormulation(PlanePoint point)
    {
        double p = 50e6 * Share(point);
        if (p <= 0) return;
        Meets(Region2.At(p, 1073.15), Region5.At(p, 1073.15), point);
    }

    [Fact]
    public void Saturation_At62315_IsContinuousWithinTheFormulation()
    {
        double p = Region4.Pressure(623.15);
        SaturationCore dense = Region3.Saturated(p, 623.15), light = SaturationLine.AtTemperature(623.15);

        // Measured apart: v′ 3.3e-5, v″ 1.0e-4, h′ 31 J/kg, h″ 39 J/kg (two public implementations, README of the reference data).
        Meets(light.Liquid, dense.Liquid, default);
        Meets(light.Vapour, dense.Vapour, default);
    }

    [Fact]
    public void Saturation_TowardsTheCriticalPoint_PhasesMeet()
    {
        double previous = double.PositiveInfinity;
        foreach (double below in new[] { 10, 1, 0.1, 0.01, 1e-3, 1e-4, 1e-5, 1e-6, 0 })
        {
            SaturationCore steam = SaturationLine.AtTemperature(Water97.CriticalTemperature - below);
            double difference = steam.Liquid.Density - steam.Vapour.Density;
            Assert.InRange(difference, 0, previous);
            Assert.True(steam.Liquid.IsobaricHeatCapacity > 0 && steam.Vapour.IsobaricHeatCapacity > 0);
            previous = difference;
        }

        Assert.InRange(previous, 0, 1);
        Approx.Relative(322, SaturationLine.AtTemperature(Water97.CriticalTemperature).Liquid.Density, 2e-3);
    }

    [Property]
    public void Enthalpy_AlongAnIsobar_GrowsWithTemperature(PlanePoint point)
    {
        double step = 1 + (100 * Share(point));
        WaterCore state = point.State, warmer = Water.AtPressureTemperature(point.Pressure, point.Temperature + step);
        if (warmer.Region == 0) return;
        Assert.True(warmer.Enthalpy > state.Enthalpy && warmer.Entropy > state.Entropy, point.ToString());
        Assert.True(state.Phase.IsobaricHeatCapacity > state.Phase.IsochoricHeatCapacity * (1 - 1e-12) && state.Phase.IsochoricHeatCapacity > 0 && state.Phase.BulkModulus > 0, point.ToString());
    }

    [Property]
    public void WetSteam_AtTheEnds_IsTheSaturatedPhase(WetPoint point)
    {
        SaturationCore steam = SaturationLine.AtPressure(point.Pressure);
        WaterCore liquid = Water.AtPressureQuality(point.Pressure, 0), vapour = Water.AtPressureQuality(point.Pressure, 1);
        Assert.Equal(steam.Liquid.Enthalpy, liquid.Enthalpy);
        Assert.Equal(steam.Liquid.SpecificVolume, liquid.SpecificVolume);
        Assert.Equal(steam.Vapour.Enthalpy, vapour.Enthalpy);
        Assert.Equal(steam.Vapour.Entropy, vapour.Entropy);
    }

    private static double Share(PlanePoint point) => Math.Log(point.Pressure / 100) / Math.Log(1e6);

    private static void Meets(in PhaseCore a, in PhaseCore b, PlanePoint point)
    {
        string what = point + " " + a + b;
        Approx.Relative(a.SpecificVolume, b.SpecificVolume, 5e-4, what);
        Approx.Absolute(a.Enthalpy, b.Enthalpy, 200, what);
        Approx.Absolute(a.Entropy, b.Entropy, 0.2, what);
        Approx.Relative(a.IsobaricHeatCapacity, b.IsobaricHeatCapacity, 0.01, what);
        Approx.Relative(a.SpeedOfSound, b.SpeedOfSound, 0.01, what);
    }
}
