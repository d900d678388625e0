using TwoPhase.Benchmarks.Ratios;
using TwoPhase.Slip;

namespace TwoPhase.Benchmarks.Slip;

/// <summary>Void fraction by every model.</summary>
internal sealed class SlipRatios : IRatioSuite
{
    public string Name => "Slip";

    public IEnumerable<RatioCase> Cases() => VoidFractionModel.All.Select(model => RandomFlows.Case(model.Name, model.VoidFractionCore));
}
