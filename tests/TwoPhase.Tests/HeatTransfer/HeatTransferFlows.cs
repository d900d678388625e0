using TwoPhase.Flow;

namespace TwoPhase.Tests.HeatTransfer;

/// <summary>The reference point of the tests with the properties that heat transfer needs besides.</summary>
internal static class HeatTransferFlows
{
    /// <summary>Saturated water at 10 MPa, rounded values of IAPWS-IF97 and R15-11 (python3-iapws 1.5.2), 4.8 kg/s in a bore of 77.9 mm.</summary>
    public static FlowState TenMegapascals(double quality) => ReferencePoint.At(quality) with
    {
        LiquidConductivity = 0.5353,
        VapourConductivity = 0.07834,
        LiquidHeatCapacity = 6127.5,
        VapourHeatCapacity = 7147,
        LatentHeat = 1.3176e6,
    };
}
