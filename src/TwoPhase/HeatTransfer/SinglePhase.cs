using TwoPhase.Flow;

namespace TwoPhase.HeatTransfer;

/// <summary>One phase flowing alone in a tube, raw SI: what a single-phase film correlation works on.</summary>
internal readonly struct SinglePhase(double massFlux, double bore, double viscosity, double conductivity, double heatCapacity)
{
    /// <summary>Re = G D / μ [-].</summary>
    public double Reynolds { get; } = massFlux * bore / viscosity;

    /// <summary>Pr = μ cp / k [-].</summary>
    public double Prandtl { get; } = viscosity * heatCapacity / conductivity;

    /// <summary>k / D [W/(m²·K)], which makes a coefficient of a Nusselt number.</summary>
    public double Conductance { get; } = conductivity / bore;

    /// <summary>The liquid of a boiling flow as if it were alone in the tube, at the given mass flux [kg/(m²·s)].</summary>
    public static SinglePhase Liquid(in FlowState flow, double massFlux) =>
        new(massFlux, flow.Bore, flow.LiquidViscosity, flow.LiquidConductivity, flow.LiquidHeatCapacity);

    /// <summary>The vapour of a boiling flow as if it were alone in the tube, at the given mass flux [kg/(m²·s)].</summary>
    public static SinglePhase Vapour(in FlowState flow, double massFlux) =>
        new(massFlux, flow.Bore, flow.VapourViscosity, flow.VapourConductivity, flow.VapourHeatCapacity);
}
