namespace TwoPhase.Metering;

/// <summary>What a feed-flow meter really senses, so how its reading depends on the density of the water.</summary>
public enum FeedMeterPrinciple
{
    /// <summary>Volume flow (turbine, vortex, magnetic, positive displacement), shown as mass with a density constant.</summary>
    Volumetric,

    /// <summary>A differential (orifice, nozzle, Venturi tube), ranged for one density.</summary>
    DifferentialPressure,

    /// <summary>Mass flow itself (Coriolis).</summary>
    Mass,
}
