using TwoPhase.Benchmarks.Ratios;
using TwoPhase.Flow;
using TwoPhase.HeatTransfer;

namespace TwoPhase.Benchmarks.HeatTransfer;

/// <summary>Every film, dryout, onset and flow-pattern core over random evaporator states.</summary>
internal sealed class HeatTransferRatios : IRatioSuite
{
    private const int Count = 1024;

    // 2 to 16 MPa, any quality, 200 to 2000 kg/(m²·s), 20 to 500 kW/m², slightly inclined tubes.
    private static readonly FlowState[] Flows = Random();
    private static readonly double[] HeatFluxes = Yardsticks.Fill(Count, 20e3, 500e3);

    public string Name => "HeatTransfer";

    public IEnumerable<RatioCase> Cases()
    {
        yield return Case("Gnielinski, one phase", 8, (in FlowState flow, double _) => SinglePhaseFilm.GnielinskiCore(SinglePhase.Liquid(flow, flow.MassFlux)));
        foreach (FilmModel model in FilmModel.All)
            yield return Case(model == FilmModel.Chen ? model.Name + " (solves for superheat)" : model.Name, model == FilmModel.Chen ? null : 8, model.CoefficientCore);
        foreach (CriticalQualityModel model in CriticalQualityModel.All)
            yield return Case(model.Name, 8, (in FlowState flow, double heatFlux) => model.MeanCore(flow, heatFlux) is var mean ? mean - model.SpreadCore(flow, mean) : 0);
        foreach (OnsetModel model in OnsetModel.All) yield return Case(model.Name, 8, model.SuperheatCore);
        foreach (NetVapourModel model in NetVapourModel.All)
            yield return Case(model.Name + " with Levy's profile", 8, (in FlowState flow, double heatFlux) => NetVapourModel.LevyTrueQuality(0, model.DepartureCore(flow, heatFlux)));
        yield return Case("Taitel-Dukler pattern (solves for level)", null, (in FlowState flow, double _) => FlowPattern.Core(flow).StratificationMargin);
    }

    private delegate double Core(in FlowState flow, double heatFlux);

    private static RatioCase Case(string what, double? target, Core core) => new(what, Count, () =>
    {
        double sum = 0;
        for (int i = 0; i < Flows.Length; i++) sum += core(Flows[i], HeatFluxes[i]);
        return sum;
    })
    {
        Yardstick = Yardsticks.P,
        Target = target,
    };

    private static FlowState[] Random()
    {
        double[] unit = Yardsticks.Fill(4 * Count, 0, 1);
        var flows = new FlowState[Count];
        for (int i = 0; i < Count; i++)
        {
            flows[i] = FlowStates.At(2e6 + (14e6 * unit[4 * i]), unit[(4 * i) + 1], 200 + (1800 * unit[(4 * i) + 2]), 0.078, 0.1 * unit[(4 * i) + 3]);
        }

        return flows;
    }
}
