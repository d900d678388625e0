using FsCheck.Xunit;
using TwoPhase.Metering;
using TwoPhase.Steam;

namespace TwoPhase.Tests.Metering;

/// <summary>The fast steam of the meters against the formulation itself.</summary>
public class MeterSteamTests
{
    [Property(MaxTest = 500)]
    public void At_AnyPressure_IsWithinABillionthOfTheFormulation(ushort step)
    {
        double pressure = 2e4 * Math.Pow(22e6 / 2e4, step / 65535.0);
        MeterSteam fast = MeterSteam.At(pressure, expansion: true, transport: true);
        SaturationCore exact = SaturationLine.AtPressure(pressure);
        Approx.Relative(exact.Temperature, fast.Temperature, 1e-9);
        Approx.Relative(exact.Liquid.Density, fast.LiquidDensity, 1e-9);
        Approx.Relative(exact.Vapour.Density, fast.VapourDensity, 1e-9);
        Approx.Relative(exact.Vapour.IsentropicExponent, fast.IsentropicExponent, 1e-9);
        Approx.Relative(Transport.Viscosity(exact.Liquid.Density, exact.Temperature), fast.LiquidViscosity, 1e-9);
        Approx.Relative(Transport.Viscosity(exact.Vapour.Density, exact.Temperature), fast.VapourViscosity, 1e-9);
        Approx.Relative(Transport.SurfaceTension(exact.Temperature), fast.SurfaceTension, 1e-9);
    }

    // w²/(p v) of saturated steam at 10 MPa is 1.238; cp/cv there is 2.30.
    [Fact]
    public void IsentropicExponent_AtTenMegapascals_IsNotTheRatioOfHeatCapacities() =>
        Approx.Absolute(1.2377, MeterSteam.At(10e6, expansion: true, transport: false).IsentropicExponent, 1e-4);
}
