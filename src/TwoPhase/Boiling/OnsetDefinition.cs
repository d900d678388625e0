namespace TwoPhase.Boiling;

/// <summary>What is meant by the place where boiling begins.</summary>
public enum OnsetDefinition
{
    /// <summary>Not said; the value of nothing.</summary>
    None = 0,

    /// <summary>Equilibrium quality is zero: the flow as a whole is saturated.</summary>
    Equilibrium = 1,

    /// <summary>The wall is hot enough for bubbles to form on it, in liquid that is still subcooled.</summary>
    FirstBubbles = 2,

    /// <summary>Bubbles leave the wall and stay, in liquid that is still subcooled.</summary>
    NetVapour = 3,
}
