using TwoPhase.Flow;
using TwoPhase.Numerics;

namespace TwoPhase.HeatTransfer;

public abstract partial class OnsetModel
{
    /// <summary>Davis and Anderson (1966): onset of nucleate boiling where the wall has cavities of every size.</summary>
    /// <remarks>
    /// <para>ΔT = √(8 σ Ts q / (kl hfg ρg)): the temperature profile of the liquid at the wall just touches the line of bubble equilibrium.</para>
    /// <para>ΔT wall superheat [K], σ surface tension, Ts saturation temperature [K], q heat flux [W/m²], kl conductivity of the
    /// liquid, hfg latent heat, ρg density of the vapour.</para>
    /// <para>Range: derived; wetting liquids on surfaces with cavities up to the size that the result implies.</para>
    /// <para>Accuracy: none stated; a lower bound on surfaces without large cavities.</para>
    /// <para>Source: Davis and Anderson, AIChE Journal 12(4), 774-780 (1966).</para>
    /// </remarks>
    public static OnsetModel DavisAnderson { get; } = new DavisAndersonModel();

    private sealed class DavisAndersonModel : OnsetModel
    {
        public override string Name => "Davis-Anderson";

        protected internal override double SuperheatCore(in FlowState flow, double heatFlux) => Fast.Sqrt(
            8 * flow.SurfaceTension * flow.SaturationTemperature * heatFlux / (flow.LiquidConductivity * flow.LatentHeat * flow.VapourDensity));
    }
}
