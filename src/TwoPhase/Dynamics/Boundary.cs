namespace TwoPhase.Dynamics;

/// <summary>What stands in a cell between one phase and two.</summary>
internal enum Boundary
{
    None = 0,

    /// <summary>Liquid below, both phases above.</summary>
    Boiling = 1,

    /// <summary>Both phases below, vapour above.</summary>
    Dew = 2,

    /// <summary>Both phases behind, colder water ahead.</summary>
    Collapse = 3,
}
