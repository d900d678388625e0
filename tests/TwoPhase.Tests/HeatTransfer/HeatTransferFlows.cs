using TwoPhase.Flow;

namespace TwoPhase.Tests.HeatTransfer;

/// <summary>Flows that the tests of this folder share.</summary>
internal static class HeatTransferFlows
{
    /// <summary>
    /// Saturated water at 10 MPa, rounded values of IAPWS-IF97 (python3-iapws 1.5.2), 4.8 kg/s in a bore of 77.9 mm. The vapour's
    /// conductivity and heat capacity are the R15-11 and IF97 values at saturation.
    /// </summary>
    public static FlowState TenMegapascals(double quality) => new()
    {
        Pressure = 10e6,
        SaturationTemperature = 584.15,
        LiquidDensity = 688.4,
        VapourDensity = 55.45,
        LiquidViscosity = 8.172e-5,
        VapourViscosity = 2.019e-5,
        LiquidConductivity = 0.5353,
        VapourConductivity = 0.07834,
        LiquidHeatCapacity = 6127.5,
        VapourHeatCapacity = 7147,
        LatentHeat = 1.3176e6,
        SurfaceTension = 0.01186,
        MassFlux = 1007.109,
        Bore = 0.0779,
        Quality = quality,
    };
}
