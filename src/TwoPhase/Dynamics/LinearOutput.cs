namespace TwoPhase.Dynamics;

/// <summary>What a linear view looks at.</summary>
public enum LinearOutput
{
    /// <summary>True quality at the outlet [kg/kg].</summary>
    TrueQuality,

    /// <summary>The quality that meter and feed flow indicate [kg/kg].</summary>
    IndicatedQuality,

    /// <summary>Water and steam held in the pass [kg].</summary>
    Holdup,

    /// <summary>Outlet flow [kg/s].</summary>
    OutletFlow,
}
