namespace TwoPhase.Dynamics;

/// <summary>How far a simulation has come.</summary>
public enum SimulationEnd
{
    /// <summary>It has not ended.</summary>
    None = 0,

    /// <summary>It ran for as long as was asked.</summary>
    Completed = 1,

    /// <summary>The flow stood still or turned back somewhere in the pass: what follows is outside the model.</summary>
    FlowStagnated = 2,

    /// <summary>Water or steam somewhere in the pass left the range of the steam formulation.</summary>
    OutsideFormulation = 3,

    /// <summary>The quality that counts as dryout was reached at the outlet: a wall that is no longer wetted is outside the model.</summary>
    DryoutReached = 4,
}
