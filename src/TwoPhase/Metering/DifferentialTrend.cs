namespace TwoPhase.Metering;

/// <summary>How, by a wet-steam model, the differential moves with quality at a given total flow: how many qualities can fit one reading.</summary>
public enum DifferentialTrend
{
    /// <summary>Not stated: the whole range of quality is searched for the lowest that fits, and for others.</summary>
    Unknown,

    /// <summary>It rises from the lowest quality to dry steam: one quality fits one reading.</summary>
    Rising,

    /// <summary>It rises to one peak and falls from there to dry steam: near dryness two qualities fit one reading.</summary>
    RisingThenFalling,
}
