namespace TwoPhase.Stability;

/// <summary>What a stability criterion finds.</summary>
public enum StabilityStatus
{
    /// <summary>Not looked at; the value of no finding.</summary>
    None = 0,

    /// <summary>On the stable side of the threshold.</summary>
    Stable = 1,

    /// <summary>Beyond the threshold.</summary>
    Unstable = 2,

    /// <summary>The criterion does not hold for this state; the reason says why.</summary>
    NotApplicable = 3,
}
