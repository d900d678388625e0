using TwoPhase.Steam;

namespace TwoPhase.Flow;

/// <summary>The one place that fills a <see cref="FlowState"/> from saturated steam; SI, arguments trusted.</summary>
internal static class FlowStates
{
    /// <summary>The flow at p [Pa], x [kg/kg], G [kg/(m²·s)], D [m] and θ [rad].</summary>
    public static FlowState At(double pressure, double quality, double massFlux, double bore, double inclination) =>
        Of(SaturationLine.AtPressure(pressure), quality, massFlux, bore, inclination);

    /// <summary>The flow of steam whose saturation is known.</summary>
    public static FlowState Of(in SaturationCore steam, double quality, double massFlux, double bore, double inclination) => new()
    {
        Pressure = steam.Pressure,
        SaturationTemperature = steam.Temperature,
        LiquidDensity = steam.Liquid.Density,
        VapourDensity = steam.Vapour.Density,
        LiquidViscosity = Transport.Viscosity(steam.Liquid.Density, steam.Temperature),
        VapourViscosity = Transport.Viscosity(steam.Vapour.Density, steam.Temperature),
        LiquidConductivity = Transport.Conductivity(steam.Liquid),
        VapourConductivity = Transport.Conductivity(steam.Vapour),
        LiquidHeatCapacity = steam.Liquid.IsobaricHeatCapacity,
        VapourHeatCapacity = steam.Vapour.IsobaricHeatCapacity,
        LatentHeat = steam.LatentHeat,
        SurfaceTension = Transport.SurfaceTension(steam.Temperature),
        Quality = quality,
        MassFlux = massFlux,
        Bore = bore,
        Inclination = inclination,
    };
}
