using TwoPhase.Flow;
using TwoPhase.Numerics;

namespace TwoPhase.Slip;

public abstract partial class VoidFractionModel
{
    /// <summary>Premoli, Francesco and Prina (1970), the CISE correlation.</summary>
    /// <remarks>
    /// <para>S = 1 + E1 √[Y/(1 + Y E2) − Y E2], and S = 1 where the bracket is negative; Y = αh/(1 − αh), αh void fraction of homogeneous flow;</para>
    /// <para>E1 = 1.578 Re^−0.19 (ρl/ρg)^0.22, E2 = 0.0273 We Re^−0.51 (ρl/ρg)^−0.08, Re = G D/μl, We = G² D/(σ ρl).</para>
    /// <para>S slip ratio [-], G mass flux [kg/(m²·s)], D bore [m], ρl and ρg saturated densities [kg/m³], μl viscosity of the liquid [Pa·s], σ surface tension [N/m].</para>
    /// <para>Range: 0 ≤ x ≤ 1, vertical upflow (flagged below 60° of slope, our reading of vertical). At the mass flux of a steam generator the
    /// bracket is negative above x of about 0.7: homogeneous flow from there on.</para>
    /// <para>Accuracy: none stated.</para>
    /// <para>Source: Premoli, Francesco and Prina, European Two-Phase Flow Group Meeting, Milan (1970); coefficients as later
    /// programs and reviews quote them.</para>
    /// </remarks>
    public static VoidFractionModel Premoli { get; } = new PremoliModel();

    private sealed class PremoliModel() : SlipCorrelation("Premoli (CISE)")
    {
        protected internal override double SlipRatioCore(in FlowState flow)
        {
            double reynolds = flow.MassFlux * flow.Bore / flow.LiquidViscosity;
            double weber = flow.MassFlux * flow.MassFlux * flow.Bore / (flow.SurfaceTension * flow.LiquidDensity);
            double ratio = flow.LiquidDensity / flow.VapourDensity;
            double e1 = 1.578 * Math.Pow(reynolds, -0.19) * Math.Pow(ratio, 0.22);
            double e2 = 0.0273 * weber * Math.Pow(reynolds, -0.51) * Math.Pow(ratio, -0.08);
            double y = flow.Quality / (1 - flow.Quality) * ratio;

            // Y/(1 + Y E2) as 1/(1/Y + E2): Y is infinite at x = 1. NaN (0·∞ at the critical point) counts as negative.
            double excess = (1 / ((1 / y) + e2)) - (y * e2);
            return excess > 0 ? 1 + (e1 * Fast.Sqrt(excess)) : 1;
        }

        protected internal override Applicability CheckCore(in FlowState flow) =>
            Applicability.Inside.Check(ApplicabilityLimits.Inclination, flow.Inclination, Math.PI / 3, Math.PI / 2);
    }
}
