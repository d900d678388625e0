namespace TwoPhase.Slip;

public abstract partial class VoidFractionModel
{
    /// <summary>Baroczy (1963), in Butterworth's closed form.</summary>
    /// <remarks>
    /// <para>α = 1 / {1 + [(1 − x)/x]^0.74 (ρg/ρl)^0.65 (μl/μg)^0.13}.</para>
    /// <para>α void fraction [-], x flowing quality [kg/kg], ρl and ρg saturated densities [kg/m³], μl and μg their viscosities [Pa·s].</para>
    /// <para>Range: 0 ≤ x ≤ 1; from liquid mercury-nitrogen and air-water. At low x the slip falls below 1, and toward critical
    /// pressure it does not go to 1.</para>
    /// <para>Accuracy: none stated.</para>
    /// <para>Source: Baroczy, Chem. Eng. Prog. Symp. Ser. 61(57), 179-191 (1965); closed form: Butterworth, Int. J. Multiphase Flow 1(4), 553-560 (1975).</para>
    /// </remarks>
    public static VoidFractionModel Baroczy { get; } = new ButterworthCorrelation("Baroczy", 1, 0.74, 0.65, 0.13);
}
