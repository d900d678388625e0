using TwoPhase.Flow;

namespace TwoPhase.HeatTransfer;

public abstract partial class FilmModel
{
    /// <summary>Dougall and Rohsenow (1963): the film behind dryout, as vapour at saturation carrying the droplets at its own speed.</summary>
    /// <remarks>
    /// <para>h = 0.023 (kg/D) Reg^0.8 Prg^0.4, Reg = G D/μg [x + (ρg/ρl)(1 − x)].</para>
    /// <para>h film coefficient over Tw − Ts [W/(m²·K)], G mass flux, D bore, x quality; kg, μg, Prg of saturated vapour. At x = 1 it is
    /// Dittus-Boelter for the vapour. Does not depend on heat flux.</para>
    /// <para>Range: published for Freon-113 at low quality and low pressure; droplets in equilibrium with the vapour.</para>
    /// <para>Accuracy: none stated; as vapour in truth superheats, the wall temperature computed here is a lower bound at low mass flux.</para>
    /// <para>Source: Dougall and Rohsenow, MIT Report 9079-26 (1963); Collier and Thome, Convective Boiling and Condensation, 3rd ed. (1994), section 7.6.</para>
    /// </remarks>
    public static FilmModel DougallRohsenow { get; } = new DougallRohsenowModel();

    private sealed class DougallRohsenowModel : FilmModel
    {
        public override string Name => "Dougall-Rohsenow";

        public override bool IsForDryWall => true;

        protected internal override double CoefficientCore(in FlowState flow, double heatFlux) =>
            SinglePhaseFilm.DittusBoelterCore(SinglePhase.Vapour(flow, flow.MassFlux * VapourShare(flow)));
    }
}
