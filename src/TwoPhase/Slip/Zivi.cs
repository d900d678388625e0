using TwoPhase.Flow;
using TwoPhase.Numerics;

namespace TwoPhase.Slip;

public abstract partial class VoidFractionModel
{
    /// <summary>Zivi (1964): the slip at which entropy production is least.</summary>
    /// <remarks>
    /// <para>S = (ρl/ρg)^(1/3), so α = 1 / (1 + (1 − x)/x · (ρg/ρl)^(2/3)).</para>
    /// <para>S slip ratio [-], α void fraction [-], x flowing quality [kg/kg], ρl and ρg saturated densities [kg/m³].</para>
    /// <para>Range: 0 ≤ x ≤ 1; derived for annular flow without entrainment and without wall friction.</para>
    /// <para>Accuracy: none stated; the paper's data lie between this result and S = 1.</para>
    /// <para>Source: Zivi, J. Heat Transfer 86(2), 247-251 (1964).</para>
    /// </remarks>
    public static VoidFractionModel Zivi { get; } = new ZiviModel();

    private sealed class ZiviModel() : SlipCorrelation("Zivi")
    {
        protected internal override double SlipRatioCore(in FlowState flow) => Fast.Cbrt(flow.LiquidDensity / flow.VapourDensity);
    }
}
