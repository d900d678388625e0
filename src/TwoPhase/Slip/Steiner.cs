namespace TwoPhase.Slip;

public abstract partial class VoidFractionModel
{
    /// <summary>Rouhani-Axelsson in Steiner's form for horizontal tubes: the default of this library.</summary>
    /// <remarks>
    /// <para>Drift flux (see <see cref="DriftFlux"/>) with C0 = 1 + 0.12 (1 − x) and Vgj = 1.18 (1 − x) [g σ (ρl − ρg)/ρl²]^(1/4).</para>
    /// <para>x flowing quality [kg/kg], σ surface tension [N/m], ρl and ρg saturated densities [kg/m³], g standard gravity [m/s²].</para>
    /// <para>Range: 0 ≤ x ≤ 1, horizontal tubes (flagged beyond 5° of slope, our reading of horizontal).</para>
    /// <para>Accuracy: none stated. Open data for tubes of 50 to 80 mm at 8 to 12 MPa and x above 0.5 are scarce: treat the liquid
    /// content as good to 30 %.</para>
    /// <para>Source: Steiner, VDI Heat Atlas, 2nd ed. (2010), part H3, after Rouhani and Axelsson, Int. J. Heat Mass Transfer 13(2), 383-393 (1970).</para>
    /// </remarks>
    public static VoidFractionModel Steiner { get; } =
        new DriftFluxCorrelation("Steiner (Rouhani-Axelsson, horizontal)", DistributionParameter.Steiner, DriftVelocity.RouhaniAxelsson, -Level, Level);

    // What still counts as a horizontal tube: 5°.
    private const double Level = 5 * Math.PI / 180;
}
