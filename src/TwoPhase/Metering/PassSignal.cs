using TwoPhase.Units;

namespace TwoPhase.Metering;

/// <summary>What can be measured on one pass.</summary>
public enum PassSignal
{
    /// <summary>No signal.</summary>
    None,

    /// <summary>Feed flow into the pass.</summary>
    FeedFlow,

    /// <summary>Differential pressure of the outlet meter.</summary>
    Differential,

    /// <summary>Absolute pressure at the outlet meter.</summary>
    OutletPressure,

    /// <summary>Absolute pressure at the inlet of the pass.</summary>
    InletPressure,

    /// <summary>Temperature of the wet steam at the outlet.</summary>
    OutletTemperature,

    /// <summary>Temperature of the feed water.</summary>
    FeedTemperature,

    /// <summary>Firing, as a share of full firing.</summary>
    Firing,

    /// <summary>Opening of the feed valve.</summary>
    FeedValvePosition,
}

/// <summary>The unit kind of each pass signal.</summary>
internal static class PassSignals
{
    public const int Count = (int)PassSignal.FeedValvePosition + 1;

    public static UnitKind Kind(PassSignal signal) => signal switch
    {
        PassSignal.FeedFlow => UnitKind.MassFlow,
        PassSignal.Differential => UnitKind.PressureDifference,
        PassSignal.OutletPressure or PassSignal.InletPressure => UnitKind.AbsolutePressure,
        PassSignal.OutletTemperature or PassSignal.FeedTemperature => UnitKind.Temperature,
        PassSignal.Firing or PassSignal.FeedValvePosition => UnitKind.Ratio,
        _ => throw new ArgumentOutOfRangeException(nameof(signal), signal, "This is no signal of a pass."),
    };
}
