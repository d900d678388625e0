namespace TwoPhase.Flow;

/// <summary>Saturated liquid and vapour flowing together in a tube: the argument of every slip, friction and film model.</summary>
public readonly partial record struct TwoPhaseFlow
{
    private readonly FlowState _state;

    internal TwoPhaseFlow(in FlowState state) => _state = state;

    /// <summary>The same flow in raw SI units, for models of your own.</summary>
    public FlowState State => _state;
}
