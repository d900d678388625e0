using TwoPhase.Flow;

namespace TwoPhase.Tests.Support;

/// <summary>One flow at a pass outlet with rounded properties at 10 MPa, so that hand calculations need no steam tables.</summary>
internal static class ReferencePoint
{
    public static FlowState At(double quality) => new()
    {
        Pressure = 10e6,
        SaturationTemperature = 584.15,
        LiquidDensity = 688.4,
        VapourDensity = 55.45,
        LiquidViscosity = 8.172e-5,
        VapourViscosity = 2.019e-5,
        SurfaceTension = 0.01186,
        Quality = quality,
        MassFlux = 1007.109,
        Bore = 0.0779,
    };
}
