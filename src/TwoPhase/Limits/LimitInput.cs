namespace TwoPhase.Limits;

/// <summary>What an operator or time can change, in the step by which limits are compared.</summary>
public enum LimitInput
{
    /// <summary>None moves it.</summary>
    None = 0,

    /// <summary>Absorbed heat, +1 %.</summary>
    Heat = 1,

    /// <summary>Feed flow, +1 %.</summary>
    FeedFlow = 2,

    /// <summary>Feed temperature, +1 K.</summary>
    FeedTemperature = 3,

    /// <summary>Outlet pressure, +0.1 MPa.</summary>
    OutletPressure = 4,

    /// <summary>Scale on the water side of every heated section, +0.1 mm.</summary>
    Scale = 5,
}
