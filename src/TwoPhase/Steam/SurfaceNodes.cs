using System.Runtime.CompilerServices;
using TwoPhase.Numerics;
using TwoPhase.Steam.Backward;

namespace TwoPhase.Steam;

/// <summary>The formulation's values at the nodes of a surface: T, p v, (∂v/∂h)p and (∂v/∂p)h of a phase that is known beforehand.</summary>
internal static class SurfaceNodes
{
    private const int MaximumSteps = 8;

    /// <summary>Liquid at the part <paramref name="u"/> of the way from an enthalpy to h′(p).</summary>
    [MethodImpl(Fast.Hot)]
    public static Four Liquid(double pressure, double floor, double u)
    {
        double enthalpy = floor + (u * (SaturationTable.Continued(pressure).LiquidEnthalpy - floor));
        return Values(Solve(Region1.At, pressure, enthalpy, Backward1.TemperatureFromEnthalpy(pressure, enthalpy)));
    }

    /// <summary>Vapour at the part <paramref name="u"/> of the way from h″(p) to an enthalpy.</summary>
    [MethodImpl(Fast.Hot)]
    public static Four Vapour(double pressure, double ceiling, double u)
    {
        double saturated = SaturationTable.Continued(pressure).VapourEnthalpy, enthalpy = saturated + (u * (ceiling - saturated));
        return Values(Solve(Region2.At, pressure, enthalpy, Backward2.TemperatureFromEnthalpy(pressure, enthalpy)));
    }

    /// <summary>Wet steam of quality <paramref name="u"/>.</summary>
    public static Four Wet(double pressure, double u)
    {
        SaturatedPhases phases = SaturationTable.Continued(pressure);
        SaturatedSlopes slopes = SaturationTable.Slopes(pressure);
        double volume = ((1 - u) * phases.LiquidVolume) + (u * phases.VapourVolume);
        return new(slopes.Temperature, pressure * volume, slopes.VolumeByEnthalpy, slopes.VolumeByPressure(u));
    }

    private static Four Values(in PhaseCore phase) =>
        new(phase.Temperature, phase.Pressure * phase.SpecificVolume, phase.VolumeByEnthalpy, phase.VolumeByPressure);

    // Newton from the backward equation, 25 mK away at the most: two or three steps.
    [MethodImpl(Fast.Hot)]
    private static PhaseCore Solve(Func<double, double, PhaseCore> region, double pressure, double enthalpy, double temperature)
    {
        PhaseCore phase = region(pressure, temperature);
        for (int i = 0; i < MaximumSteps; i++)
        {
            double step = (enthalpy - phase.Enthalpy) / phase.IsobaricHeatCapacity;
            temperature += step;
            phase = region(pressure, temperature);
            if (Math.Abs(step) < 1e-7) break;
        }

        return phase;
    }
}
