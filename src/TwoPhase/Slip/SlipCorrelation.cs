using TwoPhase.Flow;

namespace TwoPhase.Slip;

public abstract partial class VoidFractionModel
{
    /// <summary>A correlation that is published as a slip ratio, finite for every quality; the void fraction follows from it.</summary>
    private abstract class SlipCorrelation(string name) : VoidFractionModel
    {
        public override string Name => name;

        protected internal abstract override double SlipRatioCore(in FlowState flow);

        protected internal override double VoidFractionCore(in FlowState flow) => VoidFractionFromSlip(flow, SlipRatioCore(flow));
    }
}
