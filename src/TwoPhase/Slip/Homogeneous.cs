using TwoPhase.Flow;

namespace TwoPhase.Slip;

public abstract partial class VoidFractionModel
{
    /// <summary>Homogeneous flow: both phases move at one velocity, S = 1.</summary>
    /// <remarks>
    /// <para>α = x / (x + (1 − x) ρg/ρl).</para>
    /// <para>α void fraction [-], x flowing quality [kg/kg], ρl and ρg saturated densities [kg/m³].</para>
    /// <para>Range: 0 ≤ x ≤ 1; the limit for high mass flux and for pressures near critical.</para>
    /// <para>Accuracy: none stated; an upper bound of the void fraction wherever the vapour is the faster phase.</para>
    /// <para>Source: Collier and Thome, Convective Boiling and Condensation, 3rd ed. (1994), section 2.3; definition.</para>
    /// </remarks>
    public static VoidFractionModel Homogeneous { get; } = new HomogeneousModel();

    private sealed class HomogeneousModel : VoidFractionModel
    {
        public override string Name => "Homogeneous";

        protected internal override double SlipRatioCore(in FlowState flow) => 1;

        protected internal override double VoidFractionCore(in FlowState flow) => VoidFractionFromSlip(flow, 1);
    }
}
