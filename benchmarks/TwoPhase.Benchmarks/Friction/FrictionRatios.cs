using TwoPhase.Benchmarks.Ratios;
using TwoPhase.Flow;
using TwoPhase.Friction;

namespace TwoPhase.Benchmarks.Friction;

/// <summary>Friction gradient by every model in a tube of 46 µm roughness, and the friction factor that most of them take twice.</summary>
internal sealed class FrictionRatios : IRatioSuite
{
    private const double Roughness = 46e-6;

    public string Name => "Friction";

    public IEnumerable<RatioCase> Cases() => FrictionModel.All
        .Select(model => RandomFlows.Case(model.Name, (in FlowState flow) => model.GradientCore(flow, Roughness)))
        .Prepend(RandomFlows.Case("Colebrook to round-off", (in FlowState flow) => FrictionFactor.OfCore(flow.MassFlux * flow.Bore / flow.LiquidViscosity, Roughness / flow.Bore)));
}
