namespace TwoPhase.Slip;

public abstract partial class VoidFractionModel
{
    /// <summary>Turner and Wallis (1965), the phases in two separate cylinders, in Butterworth's closed form.</summary>
    /// <remarks>
    /// <para>α = 1 / {1 + [(1 − x)/x]^0.72 (ρg/ρl)^0.40 (μl/μg)^0.08}.</para>
    /// <para>α void fraction [-], x flowing quality [kg/kg], ρl and ρg saturated densities [kg/m³], μl and μg their viscosities [Pa·s].</para>
    /// <para>Range: 0 ≤ x ≤ 1; both phases turbulent. At low x the slip falls below 1, and toward critical pressure it does not go to 1.</para>
    /// <para>Accuracy: none stated.</para>
    /// <para>Source: Turner and Wallis, report NYO-3114-6, Dartmouth College (1965); closed form: Butterworth, Int. J. Multiphase Flow 1(4), 553-560 (1975).</para>
    /// </remarks>
    public static VoidFractionModel TurnerWallis { get; } = new ButterworthCorrelation("Turner-Wallis", 1, 0.72, 0.40, 0.08);
}
