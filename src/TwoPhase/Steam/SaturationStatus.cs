namespace TwoPhase.Steam;

/// <summary>What became of one sample of a column of pressures.</summary>
public enum SaturationStatus
{
    /// <summary>Nothing: the sample was never computed.</summary>
    None = 0,

    /// <summary>Both phases were computed.</summary>
    Saturated = 1,

    /// <summary>The pressure is NaN or infinite; the results are NaN.</summary>
    Missing = 2,

    /// <summary>The pressure lies below 611.213 Pa or above 22.064 MPa, where nothing is saturated; the results are NaN.</summary>
    OutOfRange = 3,
}
