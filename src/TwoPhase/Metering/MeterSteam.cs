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

    /// <summary>Steam at a pressure, from the saturation table: within 1e-9 of the formulation, several times faster.</summary>
    /// <param name="pressure">p [Pa], on the saturation line; trusted.</param>
    /// <param name="expansion">Whether temperature and isentropic exponent are wanted, for a meter with a geometry; else they are NaN.</param>
    /// <param name="transport">Whether viscosities and surface tension are wanted; else they are NaN.</param>
    public static MeterSteam At(double pressure, bool expansion, bool transport)
    {
        SaturatedPhases phases = SaturationTable.Phases(pressure);
        SaturatedFluid fluid = expansion || transport ? SaturationTable.Fluid(pressure) : new(Numerics.Four.NaN);
        return new MeterSteam
        {
            Temperature = fluid.Temperature,
            LiquidDensity = 1 / phases.LiquidVolume,
            VapourDensity = 1 / phases.VapourVolume,
            IsentropicExponent = expansion ? SaturationTable.Expansion(pressure).VapourIsentropicExponent : double.NaN,
            LiquidViscosity = fluid.LiquidViscosity,
            VapourViscosity = fluid.VapourViscosity,
            SurfaceTension = fluid.SurfaceTension,
        };
    }
}
