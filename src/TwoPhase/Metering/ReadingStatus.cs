namespace TwoPhase.Metering;

/// <summary>What a reading of quality is, or why there is none.</summary>
public enum ReadingStatus
{
    /// <summary>Nothing was read: the status of a default reading, never good news.</summary>
    None = 0,

    /// <summary>Wet steam: a quality from 0 to 1.</summary>
    WetSteam,

    /// <summary>A quality below 0: by the model the meter sees water below saturation, or the inputs do not belong together.</summary>
    SubcooledOutlet,

    /// <summary>A quality above 1: by the model the meter sees superheated steam, or the inputs do not belong together.</summary>
    SuperheatedOutlet,

    /// <summary>An input is missing (NaN); no quality.</summary>
    Missing,

    /// <summary>The flow is not greater than zero, or infinite; no quality.</summary>
    FlowOutOfRange,

    /// <summary>The pressure lies outside the saturation line of water; no quality.</summary>
    PressureOutOfRange,

    /// <summary>The differential is not greater than zero, or not below the static pressure; no quality.</summary>
    DifferentialOutOfRange,

    /// <summary>The search ended without a quality that gives the differential: the model returned no finite density.</summary>
    NotSolved,
}
