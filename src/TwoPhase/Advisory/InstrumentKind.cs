namespace TwoPhase.Advisory;

/// <summary>What an instrument of a generator measures.</summary>
public enum InstrumentKind
{
    /// <summary>Nothing.</summary>
    None,

    /// <summary>Feed flow into one pass.</summary>
    FeedFlow,

    /// <summary>Differential pressure of the meter at the outlet of one pass.</summary>
    Differential,

    /// <summary>Steam quality at the outlet of one pass, known otherwise than by its meter.</summary>
    OutletQuality,

    /// <summary>Heat absorbed by one pass, or by all together.</summary>
    AbsorbedHeat,

    /// <summary>Absolute pressure at the outlet of one pass, or in the header.</summary>
    OutletPressure,

    /// <summary>Temperature of the feed of one pass, or of all.</summary>
    FeedTemperature,

    /// <summary>Feed flow of all passes together.</summary>
    TotalFeed,

    /// <summary>Steam that leaves the separator.</summary>
    SeparatorSteam,

    /// <summary>Water that leaves the separator.</summary>
    SeparatorWater,

    /// <summary>Quality behind the separator's inlet: steam over steam and water, as dissolved solids tell it.</summary>
    SeparatorQuality,

    /// <summary>Heat that the fuel brings.</summary>
    FuelHeat,

    /// <summary>Share of the fuel's heat that the water absorbs.</summary>
    Efficiency,

    /// <summary>Differential pressure of one meter on the combined outlet.</summary>
    CombinedDifferential,
}
