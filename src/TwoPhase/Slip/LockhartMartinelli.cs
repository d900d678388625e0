namespace TwoPhase.Slip;

public abstract partial class VoidFractionModel
{
    /// <summary>Lockhart and Martinelli (1949), in Butterworth's closed form.</summary>
    /// <remarks>
    /// <para>α = 1 / {1 + 0.28 [(1 − x)/x]^0.64 (ρg/ρl)^0.36 (μl/μg)^0.07}.</para>
    /// <para>α void fraction [-], x flowing quality [kg/kg], ρl and ρg saturated densities [kg/m³], μl and μg their viscosities [Pa·s].</para>
    /// <para>Range: 0 ≤ x ≤ 1; from air with water and oils near atmospheric pressure in horizontal tubes of 1.5 to 26 mm. At the pressures
    /// of steam generators the slip comes out below 1 over much of the range: a yardstick, not a recommendation.</para>
    /// <para>Accuracy: none stated for steam.</para>
    /// <para>Source: Lockhart and Martinelli, Chem. Eng. Prog. 45(1), 39-48 (1949); closed form: Butterworth, Int. J. Multiphase Flow 1(4), 553-560 (1975).</para>
    /// </remarks>
    public static VoidFractionModel LockhartMartinelli { get; } = new ButterworthCorrelation("Lockhart-Martinelli", 0.28, 0.64, 0.36, 0.07);
}
