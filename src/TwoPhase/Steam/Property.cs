namespace TwoPhase.Steam;

/// <summary>A property that grows with temperature along an isobar, and so fixes the state together with the pressure.</summary>
internal enum Property
{
    Enthalpy,
    Entropy,
    Volume,
}

internal static class Properties
{
    /// <summary>The value of a property.</summary>
    public static double Value(this in PhaseCore phase, Property property) => property switch
    {
        Property.Enthalpy => phase.Enthalpy,
        Property.Entropy => phase.Entropy,
        _ => phase.SpecificVolume,
    };

    /// <summary>Its slope with temperature at constant pressure.</summary>
    public static double SlopeAlongIsobar(this in PhaseCore phase, Property property) => property switch
    {
        Property.Enthalpy => phase.IsobaricHeatCapacity,
        Property.Entropy => phase.IsobaricHeatCapacity / phase.Temperature,
        _ => phase.VolumeByTemperature,
    };

    /// <summary>(y − y′) / (y″ − y′), the quality that the property implies; outside 0 to 1 beside the dome.</summary>
    public static double Lever(this in SaturationCore saturation, Property property, double value)
    {
        double liquid = saturation.Liquid.Value(property);
        return (value - liquid) / (saturation.Vapour.Value(property) - liquid);
    }
}
