namespace TwoPhase.Slip;

public abstract partial class VoidFractionModel
{
    /// <summary>Thom (1964), boiling water, in Butterworth's closed form.</summary>
    /// <remarks>
    /// <para>α = 1 / {1 + (1 − x)/x · (ρg/ρl)^0.89 (μl/μg)^0.18}, which is S = (ρl/ρg)^0.11 (μl/μg)^0.18.</para>
    /// <para>α void fraction [-], S slip ratio [-], x flowing quality [kg/kg], ρl and ρg saturated densities [kg/m³], μl and μg their viscosities [Pa·s].</para>
    /// <para>Range: 0 ≤ x ≤ 1; steam and water up to the critical pressure.</para>
    /// <para>Accuracy: none stated. Against the slip that Thom tabulated (as remembered: 1.57 at 8.6 MPa, 6.45 at 0.1 MPa) the closed
    /// form is about 12 % high near 8 MPa and 40 % low near atmospheric pressure.</para>
    /// <para>Source: Thom, Int. J. Heat Mass Transfer 7(7), 709-724 (1964); closed form: Butterworth, Int. J. Multiphase Flow 1(4), 553-560 (1975).</para>
    /// </remarks>
    public static VoidFractionModel Thom { get; } = new ButterworthCorrelation("Thom", 1, 1, 0.89, 0.18);
}
