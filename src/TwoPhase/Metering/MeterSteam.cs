using TwoPhase.Steam;

namespace TwoPhase.Metering;

/// <summary>What a meter needs to know of saturated steam at one pressure, SI.</summary>
internal readonly struct MeterSteam
{
    public double Temperature { get; private init; }

    public double LiquidDensity { get; private init; }

    public double VapourDensity { get; private init; }

    public double IsentropicExponent { get; private init; }

    public double LiquidViscosity { get; private init; }

    public double VapourViscosity { get; private init; }

    public double SurfaceTension { get; private init; }

    /// <param name="pressure">p [Pa], on the saturation line; trusted.</param>
    /// <param name="transport">Whether viscosities and surface tension are wanted; else they are NaN.</param>
    public static MeterSteam At(double pressure, bool transport)
    {
        SaturationCore steam = SaturationLine.AtPressure(pressure);
        double liquid = steam.Liquid.Density, vapour = steam.Vapour.Density, temperature = steam.Temperature;
        return new MeterSteam
        {
            Temperature = temperature,
            LiquidDensity = liquid,
            VapourDensity = vapour,
            IsentropicExponent = steam.Vapour.IsentropicExponent,
            LiquidViscosity = transport ? Transport.Viscosity(liquid, temperature) : double.NaN,
            VapourViscosity = transport ? Transport.Viscosity(vapour, temperature) : double.NaN,
            SurfaceTension = transport ? Transport.SurfaceTension(temperature) : double.NaN,
        };
    }
}
