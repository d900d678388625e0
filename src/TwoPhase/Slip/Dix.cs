namespace TwoPhase.Slip;

public abstract partial class VoidFractionModel
{
    /// <summary>Dix (1971): drift flux for rod bundles.</summary>
    /// <remarks>
    /// <para>Drift flux (see <see cref="DriftFlux"/>) with C0 = β [1 + (1/β − 1)^b], b = (ρg/ρl)^0.1, and Vgj = 2.9 [g σ (ρl − ρg)/ρl²]^(1/4).</para>
    /// <para>β void fraction of homogeneous flow [-], σ surface tension [N/m], ρl and ρg saturated densities [kg/m³], g standard gravity [m/s²].</para>
    /// <para>Range: 0 ≤ x ≤ 1, vertical upflow (flagged below 60° of slope, our reading of vertical), low flow. C0 is below 1 for
    /// small β. The drift does not vanish with the liquid, so α ends a little below 1.</para>
    /// <para>Accuracy: none stated.</para>
    /// <para>Source: Dix, Vapor Void Fractions for Forced Convection with Subcooled Boiling at Low Flow Rates, thesis, University of California, Berkeley (1971).</para>
    /// </remarks>
    public static VoidFractionModel Dix { get; } =
        new DriftFluxCorrelation("Dix", DistributionParameter.Dix, DriftVelocity.Dix, Math.PI / 3);
}
