namespace TwoPhase.Metering;

/// <summary>How often the square root is extracted between a meter and its reading, by the way the differential follows the load.</summary>
public enum SquareRootFinding
{
    /// <summary>The readings do not tell: too few, or the load hardly moved.</summary>
    Undecided = 0,

    /// <summary>Once, as it should be.</summary>
    Once,

    /// <summary>Twice: the differential moves half as much as it should.</summary>
    Twice,

    /// <summary>Not at all where it is expected: the differential moves twice as much as it should.</summary>
    Missing,
}
