namespace TwoPhase.Advisory;

/// <summary>What a lasting shift of one pass may be.</summary>
public enum ShiftCause
{
    /// <summary>Nothing.</summary>
    None = 0,

    /// <summary>The pass takes other heat; meter and feed flow are true.</summary>
    Heat = 1,

    /// <summary>The outlet meter is off; heat and feed flow are true.</summary>
    Meter = 2,

    /// <summary>The feed flow is other than its meter says; heat and outlet meter are true.</summary>
    FeedFlow = 3,

    /// <summary>Less leaves the pass than the feed meter sends: a passing drain or a tube leak. Dangerous: the true quality rises while the reading falls.</summary>
    Leak = 4,
}
