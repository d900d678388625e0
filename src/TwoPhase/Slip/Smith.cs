using TwoPhase.Flow;
using TwoPhase.Numerics;

namespace TwoPhase.Slip;

public abstract partial class VoidFractionModel
{
    /// <summary>Smith (1969): a homogeneous core with entrained liquid and a liquid film, at equal velocity heads.</summary>
    /// <remarks>
    /// <para>S = K + (1 − K) √{[ρl/ρg + K (1 − x)/x] / [1 + K (1 − x)/x]}, with K = 0.4 the share of the liquid that is entrained.</para>
    /// <para>S slip ratio [-], x flowing quality [kg/kg], ρl and ρg saturated densities [kg/m³].</para>
    /// <para>Range: 0 ≤ x ≤ 1; fitted to steam-water and air-water in horizontal and vertical tubes, said to hold regardless of pressure, mass flux and flow pattern.</para>
    /// <para>Accuracy: most of the paper's data within 10 % (as quoted from memory; not read in the paper).</para>
    /// <para>Source: Smith, Proc. Inst. Mech. Engrs 184(1), 647-664 (1969). Several later papers lose the square root.</para>
    /// </remarks>
    public static VoidFractionModel Smith { get; } = new SmithModel();

    private sealed class SmithModel() : SlipCorrelation("Smith")
    {
        private const double K = 0.4;

        protected internal override double SlipRatioCore(in FlowState flow)
        {
            // Numerator and denominator times x, so that x = 0 needs no special case.
            double x = flow.Quality, entrained = K * (1 - x);
            return K + ((1 - K) * Fast.Sqrt(((flow.LiquidDensity / flow.VapourDensity * x) + entrained) / (x + entrained)));
        }
    }
}
