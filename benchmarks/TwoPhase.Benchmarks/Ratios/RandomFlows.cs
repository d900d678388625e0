using TwoPhase.Flow;

namespace TwoPhase.Benchmarks.Ratios;

/// <summary>Random flows for the correlations: 0.5 to 20 MPa, any quality, 100 to 3000 kg/(m²·s), level tube of 78 mm.</summary>
internal static class RandomFlows
{
    private const int Count = 1024;

    private static readonly FlowState[] Flows = Fill();

    public delegate double Core(in FlowState flow);

    /// <summary>A case that runs a core over all of them, measured in P.</summary>
    public static RatioCase Case(string what, Core core) => new(what, Count, () =>
    {
        double sum = 0;
        for (int i = 0; i < Flows.Length; i++) sum += core(Flows[i]);
        return sum;
    })
    {
        Yardstick = Yardsticks.P,
        Target = 8,
    };

    private static FlowState[] Fill()
    {
        double[] unit = Yardsticks.Fill(3 * Count, 0, 1);
        var flows = new FlowState[Count];
        for (int i = 0; i < Count; i++)
            flows[i] = FlowStates.At(0.5e6 + (19.5e6 * unit[3 * i]), unit[(3 * i) + 1], 100 + (2900 * unit[(3 * i) + 2]), 0.078, 0);
        return flows;
    }
}
