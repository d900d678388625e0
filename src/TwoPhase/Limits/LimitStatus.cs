namespace TwoPhase.Limits;

/// <summary>How a pass stands to a limit.</summary>
public enum LimitStatus
{
    /// <summary>Not looked at; the value of no finding.</summary>
    None = 0,

    /// <summary>The limit is kept.</summary>
    Within = 1,

    /// <summary>The limit is exceeded.</summary>
    Beyond = 2,

    /// <summary>A figure to watch for its trend and to rank passes by; whatever its sign, no alarm.</summary>
    Indicator = 3,

    /// <summary>The limit does not apply here, or was not given; the reason says which.</summary>
    NotApplicable = 4,
}
