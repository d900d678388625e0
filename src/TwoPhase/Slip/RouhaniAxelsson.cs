namespace TwoPhase.Slip;

public abstract partial class VoidFractionModel
{
    /// <summary>Rouhani and Axelsson (1970): drift flux for boiling water.</summary>
    /// <remarks>
    /// <para>Drift flux (see <see cref="DriftFlux"/>) with C0 = 1 + 0.2 (1 − x) and Vgj = 1.18 (1 − x) [g σ (ρl − ρg)/ρl²]^(1/4).</para>
    /// <para>x flowing quality [kg/kg], σ surface tension [N/m], ρl and ρg saturated densities [kg/m³], g standard gravity [m/s²].</para>
    /// <para>Range: 0 ≤ x ≤ 1; boiling water; meant for α above 0.25.</para>
    /// <para>Accuracy: none stated for this form.</para>
    /// <para>Source: Rouhani and Axelsson, Int. J. Heat Mass Transfer 13(2), 383-393 (1970), as quoted in the review of
    /// Woldesemayat and Ghajar, Int. J. Multiphase Flow 33(4), 347-370 (2007).</para>
    /// </remarks>
    public static VoidFractionModel RouhaniAxelsson { get; } =
        new DriftFluxCorrelation("Rouhani-Axelsson", DistributionParameter.RouhaniAxelsson, DriftVelocity.RouhaniAxelsson);

    /// <summary>Rouhani and Axelsson (1970), the form whose distribution parameter depends on mass flux.</summary>
    /// <remarks>
    /// <para>Drift flux (see <see cref="DriftFlux"/>) with C0 = 1 + 0.2 (1 − x) (g D)^(1/4) (ρl/G)^(1/2) and Vgj = 1.18 (1 − x) [g σ (ρl − ρg)/ρl²]^(1/4).</para>
    /// <para>x flowing quality [kg/kg], D bore [m], G mass flux [kg/(m²·s)], σ surface tension [N/m], ρl and ρg saturated densities [kg/m³], g standard gravity [m/s²].</para>
    /// <para>Range: 0 ≤ x ≤ 1; meant for α below 0.25 or low mass flux.</para>
    /// <para>Accuracy: none stated for this form.</para>
    /// <para>Source: Rouhani and Axelsson, Int. J. Heat Mass Transfer 13(2), 383-393 (1970), as quoted in the review of
    /// Woldesemayat and Ghajar, Int. J. Multiphase Flow 33(4), 347-370 (2007).</para>
    /// </remarks>
    public static VoidFractionModel RouhaniAxelssonMassFlux { get; } =
        new DriftFluxCorrelation("Rouhani-Axelsson, with mass flux", DistributionParameter.RouhaniAxelssonMassFlux, DriftVelocity.RouhaniAxelsson);

    /// <summary>Rouhani and Axelsson (1970) in the form for vertical tubes.</summary>
    /// <remarks>
    /// <para>Drift flux (see <see cref="DriftFlux"/>) with C0 = 1 + 0.2 (1 − x) (g D)^(1/4) (ρl/G)^(1/2) and Vgj = 1.18 [g σ (ρl − ρg)/ρl²]^(1/4).</para>
    /// <para>x flowing quality [kg/kg], D bore [m], G mass flux [kg/(m²·s)], σ surface tension [N/m], ρl and ρg saturated densities [kg/m³], g standard gravity [m/s²].</para>
    /// <para>Range: vertical upflow (flagged below 60° of slope, our reading of vertical). The drift does not vanish with the liquid, so α ends a little below 1.</para>
    /// <para>Accuracy: none stated for this form.</para>
    /// <para>Source: Rouhani and Axelsson, Int. J. Heat Mass Transfer 13(2), 383-393 (1970), in the form of later data books.</para>
    /// </remarks>
    public static VoidFractionModel RouhaniAxelssonVertical { get; } =
        new DriftFluxCorrelation("Rouhani-Axelsson, vertical", DistributionParameter.RouhaniAxelssonMassFlux, DriftVelocity.RouhaniAxelssonVertical, Math.PI / 3);
}
