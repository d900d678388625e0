using TwoPhase.Flow;
using TwoPhase.Slip;

namespace TwoPhase.Tests.Slip;

public class VoidFractionAllocationTests
{
    public static TheoryData<VoidFractionModel> Models => [.. VoidFractionModel.All];

    [Theory, MemberData(nameof(Models), DisableDiscoveryEnumeration = true)]
    public void Model_EveryDoor_AllocatesNothing(VoidFractionModel model)
    {
        FlowState state = FlowStates.At(10e6, 0.78, 1000, 0.078, 0);
        var flow = new TwoPhaseFlow(state);
        double sum = 0;
        Assert.Equal(0, AllocationProbe.Bytes(() => sum += model.VoidFractionCore(state) + model.SlipRatioCore(state) + model.QualityCore(state, 0.5)
            + model.VoidFraction(flow).Value + model.Check(flow).FirstValue + model.Split(flow).SlipRatio));
    }
}
