namespace TwoPhase.Advisory;

/// <summary>What has told causes of a shift apart.</summary>
public enum ShiftWitness
{
    /// <summary>Nothing.</summary>
    None = 0,

    /// <summary>Pressure drop of the pass.</summary>
    PressureDrop = 1,

    /// <summary>Temperature of the metal.</summary>
    MetalTemperature = 2,

    /// <summary>Temperature at the outlet, which boiling ties to the pressure there.</summary>
    OutletTemperature = 3,

    /// <summary>Quality at the separator, by its flows or by solids.</summary>
    SeparatorQuality = 4,

    /// <summary>Steam and water that leave the separator.</summary>
    SeparatorFlow = 5,

    /// <summary>Feed of all passes by its own meter.</summary>
    TotalFeed = 6,
}
