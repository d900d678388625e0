namespace TwoPhase.Limits;

/// <summary>What a limit of a pass is about.</summary>
public enum LimitKind
{
    /// <summary>Nothing; the value of no limit.</summary>
    None = 0,

    /// <summary>The site's own limit of outlet quality: the headline.</summary>
    OutletQuality = 1,

    /// <summary>What is dissolved in the water that leaves.</summary>
    Solids = 2,

    /// <summary>The quality at which a correlation has the wall dry out: an indicator, never an alarm.</summary>
    CriticalQuality = 3,

    /// <summary>Liquid below and vapour above in a heated tube that lies flat.</summary>
    Stratification = 4,

    /// <summary>The outside of the tube metal.</summary>
    MetalTemperature = 5,

    /// <summary>Velocity at which clean steel begins to erode.</summary>
    ErosionalVelocity = 6,

    /// <summary>Range of the differential-pressure transmitter at the outlet.</summary>
    Differential = 7,

    /// <summary>Range of the feed flow of the pass.</summary>
    FeedFlow = 8,
}
