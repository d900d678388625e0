using TwoPhase.Flow;
using TwoPhase.Steam;

namespace TwoPhase.HeatTransfer;

public abstract partial class FilmModel
{
    /// <summary>Gungor and Winterton (1986): flow boiling as enhanced convection plus suppressed pool boiling.</summary>
    /// <remarks>
    /// <para>h = E hl + S hp; hl Dittus-Boelter of the liquid share, hp Cooper's pool boiling; E = 1 + 24000 Bo^1.16 +
    /// 1.37 Xtt^−0.86, S = 1 / (1 + 1.15·10⁻⁶ E² Rel^1.17), Bo = q/(G hfg), Rel = G(1 − x)D/μl. In a tube within 45° of the
    /// horizontal with Fr = G²/(ρl² g D) below 0.05, E takes the factor Fr^(0.1 − 2Fr) and S the factor √Fr.</para>
    /// <para>hp = 55 pr^0.12 (−lg pr)^−0.55 M^−0.5 q^0.67 for water, M = 18.015 kg/kmol, surface roughness 1 µm.</para>
    /// <para>h film coefficient [W/(m²·K)], Xtt Martinelli parameter of turbulent phases, q heat flux [W/m²], pr p/pc. Towards
    /// dry steam, where the liquid share and h would vanish, the result is never less than Dittus-Boelter for all the flow as vapour.</para>
    /// <para>Range: 0.08 to 20.3 MPa, G 12.4 to 61518 kg/(m²·s), q 0.35 to 9534 kW/m², D 2.95 to 32 mm.</para>
    /// <para>Accuracy: mean deviation 21.4 % over 3693 saturated points, of water and other fluids; figures from memory.</para>
    /// <para>Source: Gungor and Winterton, Int. J. Heat Mass Transfer 29(3), 351-358 (1986); Cooper, IChemE Symp. Ser. 86, 785-793 (1984).</para>
    /// </remarks>
    public static FilmModel GungorWinterton1986 { get; } = new GungorWinterton1986Model();

    private sealed class GungorWinterton1986Model : FilmModel
    {
        public override string Name => "Gungor-Winterton 1986";

        protected internal override double CoefficientCore(in FlowState flow, double heatFlux)
        {
            double wet = LiquidShare(flow);
            SinglePhase liquid = SinglePhase.Liquid(flow, flow.MassFlux * wet);
            double enhancement = 1
                + (24000 * Math.Exp(1.16 * Math.Log(heatFlux / (flow.MassFlux * flow.LatentHeat))))
                + (1.37 * Math.Exp(0.86 * LogInverseMartinelli(flow, wet)));
            double suppression = 1 / (1 + (1.15e-6 * enhancement * enhancement * Math.Exp(1.17 * Math.Log(liquid.Reynolds))));
            if (IsPartlyWetted(flow))
            {
                double froude = LiquidFroude(flow);
                enhancement *= HorizontalFactor(froude);
                suppression *= Math.Sqrt(froude);
            }

            double convective = SinglePhaseFilm.DittusBoelterCore(liquid);
            return NotBelowDrySteam(flow, wet, convective, (enhancement * convective) + (suppression * CooperPoolBoiling(flow.Pressure, heatFlux)));
        }

        protected internal override Applicability CheckCore(in FlowState flow, double heatFlux) => GungorWintertonRange(flow, heatFlux);
    }

    /// <summary>Cooper's pool boiling of water at 1 µm roughness [W/(m²·K)].</summary>
    internal static double CooperPoolBoiling(double pressure, double heatFlux)
    {
        const double ln10 = 2.302585092994046;
        double lnReduced = Math.Log(pressure / Water97.CriticalPressure);
        return 55 / Math.Sqrt(MolarMass) * Math.Exp((0.12 * lnReduced) - (0.55 * Math.Log(-lnReduced / ln10)) + (0.67 * Math.Log(heatFlux)));
    }
}
