using TwoPhase.Flow;

namespace TwoPhase.Friction;

public abstract partial class FrictionModel
{
    /// <summary>Homogeneous flow with McAdams's mixture viscosity (1942).</summary>
    /// <remarks>
    /// <para>dp/dz = f(G D/μ) G² v / (2 D), v = x/ρg + (1 − x)/ρl, 1/μ = x/μg + (1 − x)/μl.</para>
    /// <para>f Darcy friction factor (see <see cref="FrictionFactor.Of"/>) [-], G mass flux [kg/(m²·s)], D bore [m], x flowing quality [kg/kg], ρ densities [kg/m³], μ viscosities [Pa·s].</para>
    /// <para>Range: 0 ≤ x ≤ 1, either end exact; best at high mass flux (above 2000 kg/(m²·s)) and at high pressure.</para>
    /// <para>Accuracy: none stated.</para>
    /// <para>Source: McAdams, Woods and Heroman, Trans. ASME 64, 193-200 (1942); Collier and Thome, Convective Boiling and Condensation, 3rd ed. (1994), section 2.3.</para>
    /// </remarks>
    public static FrictionModel HomogeneousMcAdams { get; } = new HomogeneousModel("Homogeneous, McAdams", static (in FlowState flow) =>
        1 / ((flow.Quality / flow.VapourViscosity) + ((1 - flow.Quality) / flow.LiquidViscosity)));

    /// <summary>Homogeneous flow with Cicchitti's mixture viscosity (1960).</summary>
    /// <remarks>
    /// <para>dp/dz = f(G D/μ) G² v / (2 D), v = x/ρg + (1 − x)/ρl, μ = x μg + (1 − x) μl.</para>
    /// <para>f Darcy friction factor (see <see cref="FrictionFactor.Of"/>) [-], G mass flux [kg/(m²·s)], D bore [m], x flowing quality [kg/kg], ρ densities [kg/m³], μ viscosities [Pa·s].</para>
    /// <para>Range: 0 ≤ x ≤ 1, either end exact; best at high mass flux (above 2000 kg/(m²·s)) and at high pressure.</para>
    /// <para>Accuracy: none stated.</para>
    /// <para>Source: Cicchitti et al., Energia Nucleare 7(6), 407-425 (1960); Collier and Thome, Convective Boiling and Condensation, 3rd ed. (1994), section 2.3.</para>
    /// </remarks>
    public static FrictionModel HomogeneousCicchitti { get; } = new HomogeneousModel("Homogeneous, Cicchitti", static (in FlowState flow) =>
        (flow.Quality * flow.VapourViscosity) + ((1 - flow.Quality) * flow.LiquidViscosity));

    /// <summary>Homogeneous flow with Dukler's mixture viscosity (1964).</summary>
    /// <remarks>
    /// <para>dp/dz = f(G D/μ) G² v / (2 D), v = x/ρg + (1 − x)/ρl, μ = [x μg/ρg + (1 − x) μl/ρl] / v.</para>
    /// <para>f Darcy friction factor (see <see cref="FrictionFactor.Of"/>) [-], G mass flux [kg/(m²·s)], D bore [m], x flowing quality [kg/kg], ρ densities [kg/m³], μ viscosities [Pa·s].</para>
    /// <para>Range: 0 ≤ x ≤ 1, either end exact; best at high mass flux (above 2000 kg/(m²·s)) and at high pressure.</para>
    /// <para>Accuracy: none stated.</para>
    /// <para>Source: Dukler, Wicks and Cleveland, AIChE J. 10(1), 44-51 (1964); Collier and Thome, Convective Boiling and Condensation, 3rd ed. (1994), section 2.3.</para>
    /// </remarks>
    public static FrictionModel HomogeneousDukler { get; } = new HomogeneousModel("Homogeneous, Dukler", static (in FlowState flow) =>
        ((flow.Quality * flow.VapourViscosity / flow.VapourDensity) + ((1 - flow.Quality) * flow.LiquidViscosity / flow.LiquidDensity)) / Mixture.HomogeneousVolume(flow));

    private delegate double MixtureViscosity(in FlowState flow);

    private sealed class HomogeneousModel(string name, MixtureViscosity viscosity) : FrictionModel
    {
        public override string Name => name;

        protected internal override double GradientCore(in FlowState flow, double roughness) =>
            FrictionFactor.GradientCore(flow.MassFlux, flow.Bore, 1 / Mixture.HomogeneousVolume(flow), viscosity(flow), roughness);

        protected internal override Applicability CheckCore(in FlowState flow) =>
            Applicability.Inside.Check(ApplicabilityLimits.MassFlux, flow.MassFlux, 2000, double.PositiveInfinity);
    }
}
