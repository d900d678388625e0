namespace TwoPhase.Advisory;

/// <summary>Whether the raw reading of a pass can be believed now.</summary>
public enum Trust
{
    /// <summary>Nothing is known: too few readings yet, a gap too long, or inputs that no flowing pass has.</summary>
    Unknown = 0,

    /// <summary>The reading is what the pass delivers, within the tolerance.</summary>
    Believable = 1,

    /// <summary>The holdup moves, or has just moved: the reading may be off. The estimate says for how much longer.</summary>
    Settling = 2,

    /// <summary>The reading is above the true quality by more than the tolerance.</summary>
    ReadsHigh = 3,

    /// <summary>The reading is below the true quality by more than the tolerance.</summary>
    ReadsLow = 4,

    /// <summary>An input is missing, frozen or out of range; the estimate says which.</summary>
    InputFault = 5,

    /// <summary>Plant and model no longer agree: heat, meter or feed flow, which one pass alone cannot tell apart. The estimate gives both ends.</summary>
    Disagreement = 6,

    /// <summary>The pass is not in a state that has a quality (see <see cref="QualityEstimate.State"/>).</summary>
    NotRunning = 7,
}
