using TwoPhase.Numerics;

namespace TwoPhase.Steam;

/// <summary>v′, v″ and h′, h″ at one pressure, raw SI.</summary>
internal readonly struct SaturatedPhases(Four values)
{
    public double LiquidVolume => values.A;

    public double VapourVolume => values.B;

    public double LiquidEnthalpy => values.C;

    public double VapourEnthalpy => values.D;
}

/// <summary>Ts and the slopes of wet steam at one pressure, raw SI.</summary>
internal readonly struct SaturatedSlopes(Four values)
{
    public double Temperature => values.A;

    /// <summary>(∂v/∂h)p = (v″ − v′) / (h″ − h′) [m³/J], the same at every quality.</summary>
    public double VolumeByEnthalpy => values.B;

    /// <summary>(∂v/∂p)h [m³/(kg·Pa)], linear in quality.</summary>
    public double VolumeByPressure(double quality) => ((1 - quality) * values.C) + (quality * values.D);
}

/// <summary>Ts, σ, μ′ and μ″ at one pressure, raw SI.</summary>
internal readonly struct SaturatedFluid(Four values)
{
    public double Temperature => values.A;

    public double SurfaceTension => values.B;

    public double LiquidViscosity => values.C;

    public double VapourViscosity => values.D;
}

/// <summary>Thermal conductivities and isobaric heat capacities at one pressure, raw SI.</summary>
internal readonly struct SaturatedHeat(Four values)
{
    public double LiquidConductivity => values.A;

    public double VapourConductivity => values.B;

    public double LiquidHeatCapacity => values.C;

    public double VapourHeatCapacity => values.D;
}

/// <summary>κ″, s′ and s″ at one pressure, raw SI.</summary>
internal readonly struct SaturatedExpansion(Four values)
{
    public double VapourIsentropicExponent => values.A;

    public double LiquidEntropy => values.B;

    public double VapourEntropy => values.C;
}
