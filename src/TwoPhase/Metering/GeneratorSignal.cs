using TwoPhase.Units;

namespace TwoPhase.Metering;

/// <summary>What is measured once for all passes of a generator.</summary>
public enum GeneratorSignal
{
    /// <summary>No signal.</summary>
    None,

    /// <summary>Temperature of the feed water.</summary>
    FeedTemperature,

    /// <summary>Feed flow of all passes together.</summary>
    TotalFeed,

    /// <summary>Absolute pressure of the steam header.</summary>
    HeaderPressure,

    /// <summary>Differential pressure of one meter on the combined outlet.</summary>
    CombinedDifferential,

    /// <summary>Firing, as a share of full firing.</summary>
    Firing,

    /// <summary>Fuel gas, counted at 15 °C and 101.325 kPa.</summary>
    FuelGasFlow,

    /// <summary>Oxygen in the flue gas, by dry volume.</summary>
    ExcessOxygen,

    /// <summary>Temperature of the flue gas in the stack.</summary>
    StackTemperature,

    /// <summary>Temperature of the flue gas between radiant and convection section.</summary>
    BridgeWallTemperature,

    /// <summary>Steam leaving the separator.</summary>
    SeparatorSteamFlow,

    /// <summary>Water leaving the separator.</summary>
    SeparatorWaterFlow,

    /// <summary>Dissolved solids, or one conserved species, in the feed.</summary>
    FeedSolids,

    /// <summary>The same in the separator's water.</summary>
    WaterSolids,
}

/// <summary>The unit kind of each generator signal.</summary>
internal static class GeneratorSignals
{
    public const int Count = (int)GeneratorSignal.WaterSolids + 1;

    /// <summary>What a pass is read by where it has no instrument of its own.</summary>
    public static readonly (PassSignal Own, GeneratorSignal Shared)[] SharedWithPasses =
    [
        (PassSignal.FeedTemperature, GeneratorSignal.FeedTemperature),
        (PassSignal.Firing, GeneratorSignal.Firing),
        (PassSignal.OutletPressure, GeneratorSignal.HeaderPressure),
    ];

    public static UnitKind Kind(GeneratorSignal signal) => signal switch
    {
        GeneratorSignal.FeedTemperature or GeneratorSignal.StackTemperature or GeneratorSignal.BridgeWallTemperature => UnitKind.Temperature,
        GeneratorSignal.TotalFeed or GeneratorSignal.SeparatorSteamFlow or GeneratorSignal.SeparatorWaterFlow => UnitKind.MassFlow,
        GeneratorSignal.HeaderPressure => UnitKind.AbsolutePressure,
        GeneratorSignal.CombinedDifferential => UnitKind.PressureDifference,
        GeneratorSignal.Firing or GeneratorSignal.ExcessOxygen => UnitKind.Ratio,
        GeneratorSignal.FuelGasFlow => UnitKind.StandardGasFlow,
        GeneratorSignal.FeedSolids or GeneratorSignal.WaterSolids => UnitKind.Density,
        _ => throw new ArgumentOutOfRangeException(nameof(signal), signal, "This is no signal of a generator."),
    };
}
