using TwoPhase.Numerics;
using TwoPhase.Steam;

namespace TwoPhase.Tests.Steam;

public class SaturationTableTests
{
    // Round-off of the formulation itself is a few 1e-14 in v′; the polynomials add as much.
    private const double Tolerance = 1e-12;

    // The critical enhancement of R15-11 takes a function of density that is pieced together from five polynomials (Table 6).
    private const double Kinked = 1e-4;

    [Fact]
    public void Groups_AnyPressureOfTheTable_AgreeWithTheFormulation()
    {
        foreach (double pressure in Pressures(20000))
        {
            SaturationCore exact = SaturationLine.AtPressure(pressure);
            SaturatedPhases phases = SaturationTable.Phases(pressure);
            SaturatedFluid fluid = SaturationTable.Fluid(pressure);
            SaturatedHeat heat = SaturationTable.Heat(pressure);
            SaturatedExpansion expansion = SaturationTable.Expansion(pressure);
            string where = $"p = {pressure} Pa";

            Approx.Relative(exact.Liquid.SpecificVolume, phases.LiquidVolume, Tolerance, where);
            Approx.Relative(exact.Vapour.SpecificVolume, phases.VapourVolume, Tolerance, where);
            Approx.Relative(exact.Liquid.Enthalpy, phases.LiquidEnthalpy, Tolerance, where);
            Approx.Relative(exact.Vapour.Enthalpy, phases.VapourEnthalpy, Tolerance, where);
            Approx.Relative(exact.Temperature, fluid.Temperature, Tolerance, where);
            Approx.Relative(Transport.SurfaceTension(exact.Temperature), fluid.SurfaceTension, Tolerance, where);
            Approx.Relative(Transport.Viscosity(exact.Liquid.Density, exact.Temperature), fluid.LiquidViscosity, Tolerance, where);
            Approx.Relative(Transport.Viscosity(exact.Vapour.Density, exact.Temperature), fluid.VapourViscosity, Tolerance, where);
            Approx.Relative(Transport.Conductivity(exact.Liquid), heat.LiquidConductivity, Kinked, where);
            Approx.Relative(Transport.Conductivity(exact.Vapour), heat.VapourConductivity, Kinked, where);
            Approx.Relative(exact.Liquid.IsobaricHeatCapacity, heat.LiquidHeatCapacity, 2 * Tolerance, where);
            Approx.Relative(exact.Vapour.IsobaricHeatCapacity, heat.VapourHeatCapacity, 2 * Tolerance, where);
            Approx.Relative(exact.Vapour.IsentropicExponent, expansion.VapourIsentropicExponent, Tolerance, where);
            Approx.Relative(exact.Liquid.Entropy, expansion.LiquidEntropy, Tolerance, where);
            Approx.Relative(exact.Vapour.Entropy, expansion.VapourEntropy, Tolerance, where);
        }
    }

    [Fact]
    public void Slopes_AnyPressureOfTheTable_AreThoseOfWetSteam()
    {
        foreach (double pressure in Pressures(2000))
        {
            SaturatedSlopes slopes = SaturationTable.Slopes(pressure);
            foreach (double quality in new[] { 0, 0.4, 1 })
            {
                WaterCore exact = Water.AtPressureQuality(pressure, quality);
                Approx.Relative(exact.Temperature, slopes.Temperature, Tolerance);
                Approx.Relative(exact.VolumeByEnthalpy, slopes.VolumeByEnthalpy, Tolerance);
                Approx.Relative(exact.VolumeByPressure, slopes.VolumeByPressure(quality), 1e-10);
            }
        }
    }

    // The quality that a homogeneous meter reads is v over v″ − v′: what the table's error does to it.
    [Fact]
    public void Phases_QualityOfAMeter_IsTheFormulationsOwn()
    {
        foreach (double pressure in Pressures(5000))
        {
            SaturationCore exact = SaturationLine.AtPressure(pressure);
            SaturatedPhases table = SaturationTable.Phases(pressure);
            foreach (double quality in new[] { 0, 0.3, 0.78, 1 })
            {
                double volume = exact.Liquid.SpecificVolume + (quality * (exact.Vapour.SpecificVolume - exact.Liquid.SpecificVolume));
                Approx.Absolute(quality, (volume - table.LiquidVolume) / (table.VapourVolume - table.LiquidVolume), 1e-12);
            }
        }
    }

    [Theory]
    [InlineData(1000)]
    [InlineData(65535.9)]
    [InlineData(16.53e6)]
    [InlineData(21e6)]
    public void Phases_SaturationOutsideTheTable_IsTheFormulationsOwn(double pressure)
    {
        Assert.False(SaturationTable.Covers(pressure));
        Assert.Equal(SaturationLine.AtPressure(pressure).Vapour.Enthalpy, SaturationTable.Phases(pressure).VapourEnthalpy);
        Assert.Equal(SaturationLine.AtPressure(pressure).Temperature, SaturationTable.Fluid(pressure).Temperature);
    }

    [Theory]
    [InlineData(double.NaN)]
    [InlineData(0)]
    [InlineData(-1e6)]
    [InlineData(600)]
    [InlineData(22.1e6)]
    [InlineData(double.PositiveInfinity)]
    public void Phases_NoSaturation_IsNaN(double pressure)
    {
        Assert.True(double.IsNaN(SaturationTable.Phases(pressure).LiquidVolume));
        Assert.True(double.IsNaN(SaturationTable.Expansion(pressure).VapourIsentropicExponent));
    }

    // In the table, at both ends, and where the formulation itself answers.
    [Fact]
    public void PhasesAndFluid_AnyPressure_AreBoth()
    {
        foreach (double pressure in Pressures(500).Concat([5e4, 18e6, 22.1e6]))
        {
            SaturationTable.PhasesAndFluid(pressure, out Eight both);
            Assert.Equal(SaturationTable.Phases(pressure), new(new(both.A, both.B, both.C, both.D)));
            Assert.Equal(SaturationTable.Fluid(pressure), new(new(both.E, both.F, both.G, both.H)));
        }
    }

    // Both ends are written out as constants.
    [Fact]
    public void Ends_AreThoseOfTheSaturationPressureEquation()
    {
        Approx.Relative(SaturationLine.Pressure(623.15), SaturationTable.HighestPressure, 1e-15);
        Approx.Relative(SaturationLine.Pressure(273.15), SaturationLine.LowestPressure, 1e-15);
    }

    [Fact]
    public void Phases_AllocatesNothing() =>
        Assert.Equal(0, AllocationProbe.Bytes(() => SaturationTable.Phases(7e6)));

    // Even in the logarithm, both ends included.
    private static IEnumerable<double> Pressures(int count)
    {
        double low = SaturationTable.LowestPressure, ratio = SaturationTable.HighestPressure / low;
        for (int i = 0; i < count; i++) yield return Math.Min(low * Math.Pow(ratio, i / (count - 1.0)), SaturationTable.HighestPressure);
    }
}
