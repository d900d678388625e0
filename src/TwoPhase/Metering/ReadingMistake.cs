namespace TwoPhase.Metering;

/// <summary>What is commonly wrong with a reading of quality.</summary>
public enum ReadingMistake
{
    /// <summary>None; the value of a default suspicion.</summary>
    None = 0,

    /// <summary>Gauge pressure taken as absolute.</summary>
    GaugeForAbsolute,

    /// <summary>Pressure of the header taken for that at the meter.</summary>
    HeaderPressure,

    /// <summary>Diameters measured cold and used hot.</summary>
    ColdBore,

    /// <summary>Scale on the wall of the throat.</summary>
    ThroatScale,

    /// <summary>Feed meter ranged for a density that the water does not have.</summary>
    FeedDensity,

    /// <summary>Feed meter reads high by a constant share.</summary>
    FeedScale,

    /// <summary>Square root extracted twice.</summary>
    RootTwice,

    /// <summary>Square root missing: a linear signal taken for one with the root extracted, and squared.</summary>
    RootMissing,

    /// <summary>Impulse legs of unequal height or density, or a zero that has moved.</summary>
    UnequalLegs,

    /// <summary>cp/cv taken for the isentropic exponent.</summary>
    WrongExponent,

    /// <summary>Wet discharge coefficient with a model that wants the dry one, or the dry with one that brings its own.</summary>
    MixedCoefficient,

    /// <summary>Drain or vent hole through an orifice plate, left out of its bore.</summary>
    DrainHole,

    /// <summary>Orifice plate the wrong way round, or its edge worn.</summary>
    PlateReversedOrWorn,
}
