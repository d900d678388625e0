namespace TwoPhase.Slip;

public abstract partial class VoidFractionModel
{
    /// <summary>Bestion (1990): drift flux for bundles and ducts, from a reactor code.</summary>
    /// <remarks>
    /// <para>Drift flux (see <see cref="DriftFlux"/>) with C0 = 1 and Vgj = 0.188 [g D (ρl − ρg)/ρg]^(1/2).</para>
    /// <para>D bore [m], ρl and ρg saturated densities [kg/m³], g standard gravity [m/s²].</para>
    /// <para>Range: 0 ≤ x ≤ 1, vertical upflow (flagged below 60° of slope, our reading of vertical). The drift does not vanish with
    /// the liquid, so α ends below 1.</para>
    /// <para>Accuracy: none stated.</para>
    /// <para>Source: Bestion, Nuclear Engineering and Design 124(3), 229-245 (1990). A later variant takes C0 = 1.2 − 0.2 (ρg/ρl)^(1/2).</para>
    /// </remarks>
    public static VoidFractionModel Bestion { get; } =
        new DriftFluxCorrelation("Bestion", DistributionParameter.Constant(1), DriftVelocity.Bestion, Math.PI / 3);
}
