using FsCheck;
using FsCheck.Fluent;
using TwoPhase.Flow;

namespace TwoPhase.Tests.Support;

/// <summary>Random flows of saturated water and steam, as in the tubes of a steam generator and somewhat beyond.</summary>
public static class AnyFlow
{
    public static Arbitrary<FlowState> Flows() => (
        from kilopascals in Gen.Choose(500, 20000)
        from thousandths in Gen.Choose(0, 1000)
        from massFlux in Gen.Choose(50, 3000)
        from millimetres in Gen.Choose(10, 120)
        from degrees in Gen.Choose(0, 90)
        select FlowStates.At(kilopascals * 1e3, thousandths / 1000.0, massFlux, millimetres / 1000.0, degrees * Math.PI / 180)).ToArbitrary();

    /// <summary>The limit that the critical point is: two phases that no longer differ.</summary>
    public static FlowState Critical(double quality) => new()
    {
        Pressure = 22.064e6,
        SaturationTemperature = 647.096,
        LiquidDensity = 322,
        VapourDensity = 322,
        LiquidViscosity = 4e-5,
        VapourViscosity = 4e-5,
        SurfaceTension = 0,
        Quality = quality,
        MassFlux = 1000,
        Bore = 0.08,
    };
}
