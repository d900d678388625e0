using TwoPhase.Flow;
using TwoPhase.Numerics;
using TwoPhase.Steam;

namespace TwoPhase.HeatTransfer;

public abstract partial class FilmModel
{
    /// <summary>Steiner and Taborek (1992) in the form of the VDI Heat Atlas: nucleate and convective boiling joined by a cubic law.</summary>
    /// <remarks>
    /// <para>h³ = hB³ + hK³. Convective part: hK = hlo {(1 − x)^0.01 [(1 − x)^1.5 + 1.9 x^0.6 (ρl/ρg)^0.35]^−2.2 + x^0.01 [(hgo/hlo)
    /// (1 + 8 (1 − x)^0.7 (ρl/ρg)^0.67)]^−2}^−0.5, with hlo and hgo by Gnielinski for all the flow as liquid and as vapour; it joins both at the ends.</para>
    /// <para>Nucleate part, water at Ra = 1 µm: hB = 25580 W/(m²·K) · 0.72 (q/q₀)^n (D/D₀)^−0.4 [2.816 pr^0.45 + (3.4 + 1.7/(1 − pr⁷))
    /// pr^3.7], n = 0.8 − 0.1 exp(1.75 pr), q₀ = 150 kW/m², D₀ = 10 mm, pr = p/pc.</para>
    /// <para>h film coefficient [W/(m²·K)], x quality, ρl and ρg saturated densities, q heat flux [W/m²], D bore. The factor 0.72 is the
    /// one tabulated for water; the general fit in molar mass, for fluids without a value of their own, would give 0.96 and an h 5 % higher at 10 MPa.</para>
    /// <para>Range: vertical tubes, wetted wall; 0.001 ≤ pr ≤ 0.8, 3.5 ≤ ρl/ρg ≤ 5000, D 1 to 32 mm. A horizontal tube in annular flow
    /// is computed alike and flagged.</para>
    /// <para>Accuracy: none stated in the sources at hand.</para>
    /// <para>Source: Steiner and Taborek, Heat Transfer Engineering 13(2), 43-69 (1992); VDI Heat Atlas, section H3.4 (9th German ed.
    /// Hbb, eq. 38, for the convective part). Nucleate coefficients and the bore range from memory.</para>
    /// </remarks>
    public static FilmModel SteinerTaborek { get; } = new SteinerTaborekModel();

    private sealed class SteinerTaborekModel : FilmModel
    {
        private const double ReferenceCoefficient = 25580, WaterFactor = 0.72;                  // hB,0 [W/(m²·K)], C_F
        private const double LogReferenceFlux = 11.918390573078392, LogReferenceBore = -4.605170185988091; // ln 150e3, ln 0.01

        public override string Name => "Steiner-Taborek";

        protected internal override double CoefficientCore(in FlowState flow, double heatFlux)
        {
            double nucleate = heatFlux > 0 ? NucleateBoiling(flow, heatFlux) : 0, convective = ConvectiveBoiling(flow);
            return Fast.Cbrt((nucleate * nucleate * nucleate) + (convective * convective * convective));
        }

        protected internal override Applicability CheckCore(in FlowState flow, double heatFlux) => Applicability.Inside
            .Check(ApplicabilityLimits.Bore, flow.Bore, 0.001, 0.032)
            .Check(ApplicabilityLimits.Inclination, Math.Abs(flow.Inclination), 1.5, Math.PI / 2)
            .Check(ApplicabilityLimits.Pressure, flow.Pressure, 0.001 * Water97.CriticalPressure, 0.8 * Water97.CriticalPressure)
            .Check(ApplicabilityLimits.DensityRatio, flow.VapourDensity / flow.LiquidDensity, 1 / 5000.0, 1 / 3.5);

        private static double ConvectiveBoiling(in FlowState flow)
        {
            double liquid = SinglePhaseFilm.GnielinskiCore(SinglePhase.Liquid(flow, flow.MassFlux));
            double vapour = SinglePhaseFilm.GnielinskiCore(SinglePhase.Vapour(flow, flow.MassFlux));
            double x = flow.Quality, wet = 1 - x;
            double lnX = Math.Log(x), lnWet = Math.Log(wet), lnRatio = Math.Log(flow.LiquidDensity / flow.VapourDensity);
            double wetTerm = (wet * Math.Sqrt(wet)) + (1.9 * Math.Exp((0.6 * lnX) + (0.35 * lnRatio)));
            double dryTerm = vapour / liquid * (1 + (8 * Math.Exp((0.7 * lnWet) + (0.67 * lnRatio))));
            double sum = Math.Exp((0.01 * lnWet) - (2.2 * Math.Log(wetTerm))) + (Math.Exp(0.01 * lnX) / (dryTerm * dryTerm));
            return liquid / Math.Sqrt(sum);
        }

        private static double NucleateBoiling(in FlowState flow, double heatFlux)
        {
            double reduced = flow.Pressure / Water97.CriticalPressure, cube = reduced * reduced * reduced;
            double root = Math.Exp(0.15 * Math.Log(reduced));   // pr^0.45 = root³, pr^3.7 = pr⁴/root²
            double pressure = (2.816 * root * root * root) + ((3.4 + (1.7 / (1 - (cube * cube * reduced)))) * cube * reduced / (root * root));
            double exponent = 0.8 - (0.1 * Math.Exp(1.75 * reduced));
            return ReferenceCoefficient * WaterFactor * pressure * Math.Exp(
                (exponent * (Math.Log(heatFlux) - LogReferenceFlux)) - (0.4 * (Math.Log(flow.Bore) - LogReferenceBore)));
        }
    }
}
