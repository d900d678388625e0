namespace TwoPhase.Advisory;

/// <summary>What a quality trim is fed with.</summary>
public enum TrimSource
{
    /// <summary>Nothing: the feed flow follows its feed-forward alone.</summary>
    None = 0,

    /// <summary>The quality that meter and feed flow indicate.</summary>
    Raw = 1,

    /// <summary>The quality that an estimator says leaves the pass.</summary>
    Corrected = 2,

    /// <summary>The mean of both, weighted by <see cref="TrimSettings.RawShare"/>.</summary>
    Blended = 3,
}
