using TwoPhase.Flow;

namespace TwoPhase.HeatTransfer;

public abstract partial class NetVapourModel
{
    /// <summary>Saha and Zuber (1974): net vapour generation limited by heat transfer at low, by hydrodynamics at high Péclet number.</summary>
    /// <remarks>
    /// <para>h′ − hd = 0.0022 q D cpl/kl for Pe ≤ 70 000, 154 q/G above; Pe = G D cpl/kl.</para>
    /// <para>hd bulk enthalpy at departure, h′ that of saturated liquid [J/kg], q heat flux [W/m²], G mass flux, D bore, cpl and kl
    /// heat capacity and conductivity of saturated liquid.</para>
    /// <para>Range: water 0.1 to 13.8 MPa, G 95 to 2760 kg/(m²·s), q 280 to 1890 kW/m²; from memory.</para>
    /// <para>Accuracy: none stated in the sources at hand.</para>
    /// <para>Source: Saha and Zuber, Proc. 5th Int. Heat Transfer Conf., Tokyo, 4, 175-179 (1974).</para>
    /// </remarks>
    public static NetVapourModel SahaZuber { get; } = new SahaZuberModel();

    private sealed class SahaZuberModel : NetVapourModel
    {
        public override string Name => "Saha-Zuber";

        // The branches meet at Pe = 70 000, where 0.0022 Pe = 154, so the smaller is the one that holds.
        protected internal override double SubcoolingCore(in FlowState flow, double heatFlux)
        {
            double peclet = flow.MassFlux * flow.Bore * flow.LiquidHeatCapacity / flow.LiquidConductivity;
            return heatFlux / flow.MassFlux * Math.Min(0.0022 * peclet, 154);
        }

        protected internal override Applicability CheckCore(in FlowState flow, double heatFlux) => Applicability.Inside
            .Check(ApplicabilityLimits.Pressure, flow.Pressure, 0.1e6, 13.8e6)
            .Check(ApplicabilityLimits.MassFlux, flow.MassFlux, 95, 2760)
            .Check(ApplicabilityLimits.HeatFlux, heatFlux, 280e3, 1.89e6);
    }
}
