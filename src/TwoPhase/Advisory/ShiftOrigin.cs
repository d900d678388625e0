namespace TwoPhase.Advisory;

/// <summary>Where a lasting shift of a pass against its base comes from, as far as the passes together can show.</summary>
public enum ShiftOrigin
{
    /// <summary>There is none beyond the limit.</summary>
    None = 0,

    /// <summary>All passes share it: heat (heating value, burner, soot) or a common tag (firing, feed temperature, header pressure, a shared flow constant).</summary>
    Common = 1,

    /// <summary>This pass alone has it: its meter, its feed flow or its share of the heat.</summary>
    ThisPass = 2,

    /// <summary>Heat, meter or feed flow, not separable: too few other passes are known at this time.</summary>
    NotSeparable = 3,
}
