using TwoPhase.Flow;
using TwoPhase.Numerics;

namespace TwoPhase.Slip;

public abstract partial class VoidFractionModel
{
    /// <summary>Chisholm (1973): slip from the density of the homogeneous mixture.</summary>
    /// <remarks>
    /// <para>S = √[1 − x (1 − ρl/ρg)] = √(ρl/ρh), ρh density of the homogeneous mixture.</para>
    /// <para>S slip ratio [-], x flowing quality [kg/kg], ρl and ρg saturated densities [kg/m³].</para>
    /// <para>Range: 0 ≤ x ≤ 1, no other stated.</para>
    /// <para>Accuracy: none stated.</para>
    /// <para>Source: Chisholm, Int. J. Heat Mass Transfer 16(2), 347-358 (1973).</para>
    /// </remarks>
    public static VoidFractionModel Chisholm { get; } = new ChisholmModel();

    private sealed class ChisholmModel() : SlipCorrelation("Chisholm")
    {
        protected internal override double SlipRatioCore(in FlowState flow) =>
            Fast.Sqrt(1 + (flow.Quality * ((flow.LiquidDensity / flow.VapourDensity) - 1)));
    }
}
