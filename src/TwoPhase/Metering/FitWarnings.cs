namespace TwoPhase.Metering;

/// <summary>What a fit must be read with.</summary>
[Flags]
public enum FitWarnings
{
    /// <summary>Nothing to say.</summary>
    None = 0,

    /// <summary>The data cannot tell: the 95 % interval is wide against what the parameter could be. Take more readings, at other loads or qualities.</summary>
    NotDetermined = 1 << 0,

    /// <summary>The best value lies at an end of the range that was allowed.</summary>
    AtLimit = 1 << 1,

    /// <summary>The residuals drift with the differential: one parameter does not describe these readings, or an instrument drifts with load.</summary>
    Trend = 1 << 2,

    /// <summary>Fewer than four readings: the interval rests on little.</summary>
    FewReadings = 1 << 3,
}
