using TwoPhase.Flow;

namespace TwoPhase.HeatTransfer;

public abstract partial class FilmModel
{
    /// <summary>Gungor and Winterton (1987): the simplified form, one enhancement factor on the liquid's convection.</summary>
    /// <remarks>
    /// <para>h = hl [1 + 3000 Bo^0.86 + 1.12 (x/(1 − x))^0.75 (ρl/ρg)^0.41]; hl Dittus-Boelter of the liquid share, Bo = q/(G hfg).
    /// In a tube within 45° of the horizontal with Fr = G²/(ρl² g D) below 0.05 the bracket takes the factor Fr^(0.1 − 2Fr).</para>
    /// <para>h film coefficient [W/(m²·K)], q heat flux [W/m²], G mass flux, x quality, ρl and ρg saturated densities. Towards dry
    /// steam, where the liquid share and h would vanish, the result is never less than Dittus-Boelter for all the flow as vapour.</para>
    /// <para>Range: 0.08 to 20.3 MPa, G 12.4 to 61518 kg/(m²·s), q 0.35 to 9534 kW/m², D 2.95 to 32 mm; limits of the 1986 data bank, from memory.</para>
    /// <para>Accuracy: none stated in the sources at hand.</para>
    /// <para>Source: Gungor and Winterton, Chem. Eng. Res. Des. 65, 148-156 (1987).</para>
    /// </remarks>
    public static FilmModel GungorWinterton1987 { get; } = new GungorWinterton1987Model();

    private sealed class GungorWinterton1987Model : FilmModel
    {
        public override string Name => "Gungor-Winterton 1987";

        protected internal override double CoefficientCore(in FlowState flow, double heatFlux)
        {
            double wet = LiquidShare(flow);
            double enhancement = 1
                + (3000 * Math.Pow(heatFlux / (flow.MassFlux * flow.LatentHeat), 0.86))
                + (1.12 * Math.Pow(flow.Quality / wet, 0.75) * Math.Pow(flow.LiquidDensity / flow.VapourDensity, 0.41));
            if (IsPartlyWetted(flow)) enhancement *= HorizontalFactor(LiquidFroude(flow));
            double convective = SinglePhaseFilm.DittusBoelterCore(SinglePhase.Liquid(flow, flow.MassFlux * wet));
            return NotBelowDrySteam(flow, wet, convective, enhancement * convective);
        }

        protected internal override Applicability CheckCore(in FlowState flow, double heatFlux) => GungorWintertonRange(flow, heatFlux);
    }
}
