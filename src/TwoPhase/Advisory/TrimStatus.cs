namespace TwoPhase.Advisory;

/// <summary>What a quality trim is doing.</summary>
public enum TrimStatus
{
    /// <summary>It has not begun, or has no source.</summary>
    None = 0,

    /// <summary>It trims the feed flow.</summary>
    Trimming = 1,

    /// <summary>The feed flow stands at one of its limits.</summary>
    AtLimit = 2,

    /// <summary>There is no value to be believed: the feed flow follows its feed-forward alone. On a plant the fallback stands here.</summary>
    Holding = 3,
}
