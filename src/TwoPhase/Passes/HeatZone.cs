namespace TwoPhase.Passes;

/// <summary>Where a section takes its heat from.</summary>
public enum HeatZone
{
    /// <summary>From nothing: outside the fire.</summary>
    Unheated = 0,

    /// <summary>From the flame, by radiation for the most part.</summary>
    Radiant = 1,

    /// <summary>From the flue gas in the convection bank.</summary>
    Convective = 2,
}
