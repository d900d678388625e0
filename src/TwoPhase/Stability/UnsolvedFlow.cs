using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Stability;

/// <summary>A flow at which a pass has no steady state.</summary>
public readonly record struct UnsolvedFlow
{
    private readonly double _flow;

    internal UnsolvedFlow(double flow, string reason) => (_flow, Reason) = (flow, reason);

    /// <summary>The flow.</summary>
    public MassFlow Flow => MassFlow.FromKilogramsPerSecond(_flow);

    /// <summary>Why there is none.</summary>
    public string Reason { get; }

    internal object ToDump() => ToString();

    /// <summary>Flow and reason, invariant culture.</summary>
    public override string ToString() => $"{Scale.KilogramsPerSecond.Text(_flow)}: {Reason}";
}
