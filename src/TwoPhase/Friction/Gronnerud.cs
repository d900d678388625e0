using TwoPhase.Flow;
using TwoPhase.Numerics;
using TwoPhase.Units;

namespace TwoPhase.Friction;

public abstract partial class FrictionModel
{
    /// <summary>Grønnerud (1972), made for circulation evaporators.</summary>
    /// <remarks>
    /// <para>dp/dz = l {1 + P [(ρl/ρg) / (μl/μg)^0.25 − 1]}, l the gradient of the whole flow as liquid; P = φ [x + 4 (x^1.8 − x^10 φ^0.5)],
    /// φ = 1 for Fr ≥ 1, else Fr^0.3 + 0.0055 ln²(1/Fr); Fr = G²/(g D ρl²).</para>
    /// <para>x flowing quality [kg/kg], G mass flux [kg/(m²·s)], D bore [m], ρ densities [kg/m³], μ viscosities [Pa·s].</para>
    /// <para>Range: 0 ≤ x &lt; 1; the liquid end is exact, the vapour end only nearly so. Fitted to boiling refrigerants.</para>
    /// <para>Accuracy: none stated.</para>
    /// <para>Source: Grønnerud, Annexe 1972-1, Bull. de l'Inst. du Froid, 127-138 (1972), as quoted in the data books; l here by Colebrook's factor.</para>
    /// </remarks>
    public static FrictionModel Gronnerud { get; } = new GronnerudModel();

    private sealed class GronnerudModel : FrictionModel
    {
        public override string Name => "Grønnerud";

        protected internal override double GradientCore(in FlowState flow, double roughness)
        {
            double x = flow.Quality;
            double froude = flow.MassFlux * flow.MassFlux / (SiDoor.StandardGravity * flow.Bore * flow.LiquidDensity * flow.LiquidDensity);
            double logarithm = Math.Log(froude);
            double phi = froude >= 1 ? 1 : Math.Exp(0.3 * logarithm) + (0.0055 * logarithm * logarithm);
            double x2 = x * x, x10 = x2 * x2 * x2 * x2 * x2;
            double share = phi * (x + (4 * (Math.Pow(x, 1.8) - (x10 * Math.Sqrt(phi)))));
            double ratio = flow.LiquidDensity / flow.VapourDensity * Fast.Sqrt(Fast.Sqrt(flow.VapourViscosity / flow.LiquidViscosity));
            return LiquidOnly(flow, roughness) * (1 + (share * (ratio - 1)));
        }

        protected internal override Applicability CheckCore(in FlowState flow) =>
            Applicability.Inside.Check(ApplicabilityLimits.Quality, flow.Quality, 0, 0.99999);
    }
}
