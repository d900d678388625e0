namespace TwoPhase.Advisory;

/// <summary>Why a pass is, or is not, advised to be moved.</summary>
public enum AdviceReason
{
    /// <summary>No advice was asked for.</summary>
    None = 0,

    /// <summary>It is the turn of this pass.</summary>
    Move = 1,

    /// <summary>It is at its set-point, as far as can be told.</summary>
    AtSetPoint = 2,

    /// <summary>Another pass is further off, and comes first.</summary>
    AnotherFirst = 3,

    /// <summary>A pass still settles: wait until it is believable.</summary>
    Settling = 4,

    /// <summary>Its reading is not believable: see its estimate. Fall back on the plant's own procedure.</summary>
    NotBelievable = 5,

    /// <summary>The pass does not run at more than half of full firing.</summary>
    NotRunning = 6,

    /// <summary>What is known of the quality is too uncertain to leave any room below the limit: anchor it by a test first.</summary>
    NoRoom = 7,
}
