using TwoPhase.Flow;
using TwoPhase.Numerics;

namespace TwoPhase.Slip;

public abstract partial class VoidFractionModel
{
    /// <summary>Fauske (1961): the slip at which momentum flux is least, for critical flow.</summary>
    /// <remarks>
    /// <para>S = (ρl/ρg)^(1/2).</para>
    /// <para>S slip ratio [-], ρl and ρg saturated densities [kg/m³].</para>
    /// <para>Range: 0 ≤ x ≤ 1; made for choked flow, where it bounds the slip; in tubes far from choking it holds too much liquid.</para>
    /// <para>Accuracy: none stated.</para>
    /// <para>Source: Fauske, Proc. Heat Transfer and Fluid Mechanics Institute, Stanford, 79-89 (1961).</para>
    /// </remarks>
    public static VoidFractionModel Fauske { get; } = new FauskeModel();

    private sealed class FauskeModel() : SlipCorrelation("Fauske")
    {
        protected internal override double SlipRatioCore(in FlowState flow) => Fast.Sqrt(flow.LiquidDensity / flow.VapourDensity);
    }
}
