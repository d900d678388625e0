namespace TwoPhase.Passes;

/// <summary>What a calibration must be read with.</summary>
[Flags]
public enum CalibrationWarnings
{
    /// <summary>Nothing.</summary>
    None = 0,

    /// <summary>The heat per firing drifts over the stretch by more than its scatter explains: the pass was not at rest, or something drifts.</summary>
    NotAtRest = 1 << 0,

    /// <summary>Feed flow, feed temperature, firing or outlet pressure moved over the stretch: the water held moved with it.</summary>
    InputsMoved = 1 << 1,

    /// <summary>Fewer than ten readings, or readings so correlated that they count for fewer: the intervals are wide and rough.</summary>
    FewReadings = 1 << 2,

    /// <summary>The inlet pressure asks for a friction factor below 0.5 or above 2: look at the gauges, the roughness and the scale before you use it.</summary>
    FrictionFarOff = 1 << 3,
}
