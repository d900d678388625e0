namespace TwoPhase.Advisory;

/// <summary>What a change of a pass against its baseline speaks for. A suspect to be looked at, no diagnosis.</summary>
public enum HealthFinding
{
    /// <summary>Nothing beyond the limits.</summary>
    None = 0,

    /// <summary>The metal runs hotter for the same heat: scale inside, the bore being where the heat has to get through. Dangerous: tubes overheat and rupture.</summary>
    ScaleInside = 1,

    /// <summary>The pass takes less of the heat and its metal runs no hotter: soot or slag outside, or flames that no longer reach it.</summary>
    SootOutside = 2,

    /// <summary>The pass costs more pressure and its metal runs no hotter: a narrowing at one place, a valve, roughness.</summary>
    NarrowerInside = 3,

    /// <summary>The pass costs less pressure: what lay in it has gone, or part of its water leaves before the end.</summary>
    LessResistance = 4,
}
