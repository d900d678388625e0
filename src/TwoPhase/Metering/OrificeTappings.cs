namespace TwoPhase.Metering;

/// <summary>Where the pressure tappings of an orifice plate sit, after ISO 5167-2.</summary>
public enum OrificeTappings
{
    /// <summary>At both faces of the plate.</summary>
    Corner,

    /// <summary>One pipe diameter upstream and half a diameter downstream.</summary>
    DiameterAndHalf,

    /// <summary>25.4 mm from either face.</summary>
    Flange,
}
