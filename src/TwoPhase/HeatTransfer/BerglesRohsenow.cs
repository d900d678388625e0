using TwoPhase.Flow;

namespace TwoPhase.HeatTransfer;

public abstract partial class OnsetModel
{
    /// <summary>Bergles and Rohsenow (1964): onset of nucleate boiling of water on commercially finished surfaces.</summary>
    /// <remarks>
    /// <para>q = 1082 p^1.156 (1.8 ΔT)^(2.16/p^0.0234), here with p in bar; solved for ΔT in closed form.</para>
    /// <para>q heat flux [W/m²], p pressure, ΔT wall superheat [K].</para>
    /// <para>Range: water, 0.1 to 13.8 MPa.</para>
    /// <para>Accuracy: none stated in the sources at hand.</para>
    /// <para>Source: Bergles and Rohsenow, J. Heat Transfer 86(3), 365-372 (1964).</para>
    /// </remarks>
    public static OnsetModel BerglesRohsenow { get; } = new BerglesRohsenowModel();

    private sealed class BerglesRohsenowModel : OnsetModel
    {
        public override string Name => "Bergles-Rohsenow";

        protected internal override double SuperheatCore(in FlowState flow, double heatFlux)
        {
            double bar = flow.Pressure / 1e5;
            return Math.Pow(heatFlux / (1082 * Math.Pow(bar, 1.156)), Math.Pow(bar, 0.0234) / 2.16) / 1.8;
        }

        protected internal override Applicability CheckCore(in FlowState flow, double heatFlux) =>
            Applicability.Inside.Check(ApplicabilityLimits.Pressure, flow.Pressure, 0.1e6, 13.8e6);
    }
}
