using TwoPhase.Flow;
using TwoPhase.Numerics;

namespace TwoPhase.Slip;

public abstract partial class VoidFractionModel
{
    /// <summary>Chisholm (1983) after Armand: void fraction from that of homogeneous flow.</summary>
    /// <remarks>
    /// <para>α = αh / [αh + √(1 − αh)], which is S = 1/√(1 − αh), αh void fraction of homogeneous flow.</para>
    /// <para>α void fraction [-], S slip ratio [-]; it grows without limit as x goes to 1.</para>
    /// <para>Range: 0 ≤ x ≤ 1; from air-water in horizontal tubes. Toward critical pressure the slip does not go to 1.</para>
    /// <para>Accuracy: none stated.</para>
    /// <para>Source: Chisholm, Two-Phase Flow in Pipelines and Heat Exchangers (1983), after Armand (1946).</para>
    /// </remarks>
    public static VoidFractionModel ChisholmArmand { get; } = new ChisholmArmandModel();

    private sealed class ChisholmArmandModel : VoidFractionModel
    {
        public override string Name => "Chisholm-Armand";

        protected internal override double VoidFractionCore(in FlowState flow)
        {
            double homogeneous = VoidFractionFromSlip(flow, 1);
            return homogeneous / (homogeneous + Fast.Sqrt(LiquidShare(flow)));
        }

        protected internal override double SlipRatioCore(in FlowState flow) => 1 / Fast.Sqrt(LiquidShare(flow));

        // 1 − αh, written so that it keeps its digits as x goes to 1.
        private static double LiquidShare(in FlowState flow)
        {
            double liquid = (1 - flow.Quality) * flow.VapourDensity;
            return liquid / ((flow.Quality * flow.LiquidDensity) + liquid);
        }
    }
}
