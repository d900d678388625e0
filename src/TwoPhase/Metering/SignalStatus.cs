namespace TwoPhase.Metering;

/// <summary>Whether one measured value can be used.</summary>
public enum SignalStatus
{
    /// <summary>Nothing was ever read; the status of a default reading.</summary>
    None,

    /// <summary>A number inside what the instrument can measure.</summary>
    Good,

    /// <summary>No value at this time, or no such tag.</summary>
    Missing,

    /// <summary>The historian or the control system itself calls the value bad.</summary>
    Bad,

    /// <summary>A number that the quantity cannot have: infinite, a negative flow, a temperature below freezing.</summary>
    OutOfRange,

    /// <summary>The instrument stands at an end of its range, or below its low cut-off: the true value lies beyond what it can say.</summary>
    Saturated,
}
