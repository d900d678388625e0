namespace TwoPhase.Metering;

/// <summary>What a quality is computed from, as its budget names it.</summary>
public enum MeteringInput
{
    /// <summary>Feed flow, taken as the total flow at the meter.</summary>
    FeedFlow,

    /// <summary>Differential, by the transmitter.</summary>
    Differential,

    /// <summary>Absolute pressure at the meter.</summary>
    Pressure,

    /// <summary>Discharge coefficient of the element.</summary>
    DischargeCoefficient,

    /// <summary>Expansibility factor.</summary>
    Expansibility,

    /// <summary>Pipe diameter.</summary>
    PipeDiameter,

    /// <summary>Throat diameter.</summary>
    ThroatDiameter,

    /// <summary>Constant of a meter without geometry.</summary>
    MeterConstant,

    /// <summary>The wet-steam model: how far the differential that it predicts may be from the true one.</summary>
    WetModel,

    /// <summary>Density of the saturated liquid, as the steam formulation has it.</summary>
    LiquidDensity,

    /// <summary>Density of the saturated vapour, as the steam formulation has it.</summary>
    VapourDensity,
}
