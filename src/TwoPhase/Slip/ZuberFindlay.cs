namespace TwoPhase.Slip;

public abstract partial class VoidFractionModel
{
    /// <summary>Zuber and Findlay (1965), churn-turbulent bubbly flow of boiling water, with constant distribution parameter.</summary>
    /// <remarks>
    /// <para>Drift flux (see <see cref="DriftFlux"/>) with C0 = 1.13 and Vgj = 1.41 [g σ (ρl − ρg)/ρl²]^(1/4).</para>
    /// <para>σ surface tension [N/m], ρl and ρg saturated densities [kg/m³], g standard gravity [m/s²].</para>
    /// <para>Range: bubbly and churn flow in vertical tubes, low x. C0 stays at 1.13, so α ends at 0.885: always flagged, and of
    /// no use near the end of a pass.</para>
    /// <para>Accuracy: none stated.</para>
    /// <para>Source: Zuber and Findlay, J. Heat Transfer 87(4), 453-468 (1965); the pair of constants as textbooks quote it for boiling water.</para>
    /// </remarks>
    public static VoidFractionModel ZuberFindlay { get; } =
        new DriftFluxCorrelation("Zuber-Findlay", DistributionParameter.Constant(1.13), DriftVelocity.Churn, Math.PI / 3);
}
