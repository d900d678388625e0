using System.Runtime.CompilerServices;
using TwoPhase.Numerics;

namespace TwoPhase.Steam;

/// <summary>
/// Saturated liquid and vapour from pressure, for loops: one-dimensional polynomials instead of the formulation, some thirty
/// times faster. Built from it once, on first use, 32 KiB for each group of four properties. Raw SI.
/// </summary>
/// <remarks>
/// <para>Range: 65.536 kPa to 16.529 MPa (Ts = 623.15 K) from the table; outside it the formulation itself answers, at its own
/// pace, and NaN where there is no saturation.</para>
/// <para>Accuracy: within 1e-12 relative of <see cref="SaturationLine"/>, heat capacities 2e-12; conductivities 1e-4, since their critical
/// enhancement has kinks.</para>
/// </remarks>
internal static class SaturationTable
{
    /// <summary>Lowest pressure of the table [Pa], 2^16.</summary>
    public const double LowestPressure = 65536;

    /// <summary>Highest pressure of the table [Pa], ps(623.15 K) written out: above it the saturated states are those of region 3.</summary>
    public const double HighestPressure = 16529164.252604509;

    /// <summary>Whether the table holds a pressure; false for NaN.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static bool Covers(double pressure) => pressure >= LowestPressure && pressure <= HighestPressure;

    /// <summary>v′, v″ [m³/kg], h′, h″ [J/kg].</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static SaturatedPhases Phases(double pressure) =>
        new(Covers(pressure) ? PhaseCurves.Table.At(pressure) : Exact(pressure, PhaseCurves.Of));

    /// <summary>As <see cref="Phases(double)"/>, unchecked: to the end of the last cell, with regions 1 and 2 continued above 623.15 K.</summary>
    public static SaturatedPhases Continued(double pressure) => new(PhaseCurves.Table.At(pressure));

    /// <summary>Ts [K] and how v of wet steam follows h and p; only inside the table.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static SaturatedSlopes Slopes(double pressure) => new(SlopeCurves.Table.At(pressure));

    /// <summary>Ts [K].</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static double Temperature(double pressure) => Covers(pressure) ? Slopes(pressure).Temperature : Exact(pressure, FluidCurves.Of).A;

    /// <summary>Ts [K], σ [N/m], μ′ and μ″ [Pa·s].</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static SaturatedFluid Fluid(double pressure) =>
        new(Covers(pressure) ? FluidCurves.Table.At(pressure) : Exact(pressure, FluidCurves.Of));

    /// <summary>What <see cref="Phases"/> and <see cref="Fluid"/> give, in one go and in their order.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static void PhasesAndFluid(double pressure, out Eight values)
    {
        if (Covers(pressure)) BothCurves.Table.At(pressure, out values);
        else values = new(Exact(pressure, PhaseCurves.Of), Exact(pressure, FluidCurves.Of));
    }

    /// <summary>k′ and k″ [W/(m·K)], cp′ and cp″ [J/(kg·K)].</summary>
    public static SaturatedHeat Heat(double pressure) =>
        new(Covers(pressure) ? HeatCurves.Table.At(pressure) : Exact(pressure, HeatCurves.Of));

    /// <summary>κ″ [-], the isentropic exponent of the vapour, and s′, s″ [J/(kg·K)].</summary>
    public static SaturatedExpansion Expansion(double pressure) =>
        new(Covers(pressure) ? ExpansionCurves.Table.At(pressure) : Exact(pressure, ExpansionCurves.Of));

    /// <summary>Any four smooth functions of the saturated state as curves over the table's cells.</summary>
    public static FourCurves Curves(Func<SaturationCore, Four> group) =>
        new(LowestPressure, HighestPressure, pressure =>
        {
            // The last cells reach beyond 623.15 K: regions 1 and 2 are continued there, so that nothing crosses the seam.
            double temperature = Region4.Temperature(pressure);
            return group(new() { Liquid = Region1.At(pressure, temperature), Vapour = Region2.At(pressure, temperature) });
        });

    private static Four Exact(double pressure, Func<SaturationCore, Four> group) =>
        SaturationLine.Covers(pressure) ? group(SaturationLine.AtPressure(pressure)) : Four.NaN;

    // One class for each group, so that each is built when it is first asked for.
    private static class PhaseCurves
    {
        public static readonly Func<SaturationCore, Four> Of = s =>
            new(s.Liquid.SpecificVolume, s.Vapour.SpecificVolume, s.Liquid.Enthalpy, s.Vapour.Enthalpy);

        public static readonly FourCurves Table = Curves(Of);
    }

    private static class SlopeCurves
    {
        public static readonly FourCurves Table = Curves(s =>
        {
            double along = s.TemperatureByPressure, byEnthalpy = (s.Vapour.SpecificVolume - s.Liquid.SpecificVolume) / s.LatentHeat;
            double liquid = s.Liquid.VolumeAlong(along) - (byEnthalpy * s.Liquid.EnthalpyAlong(along));
            double vapour = s.Vapour.VolumeAlong(along) - (byEnthalpy * s.Vapour.EnthalpyAlong(along));
            return new(s.Temperature, byEnthalpy, liquid, vapour);
        });
    }

    private static class FluidCurves
    {
        public static readonly Func<SaturationCore, Four> Of = s => new(
            s.Temperature,
            Transport.SurfaceTension(s.Temperature),
            Transport.Viscosity(s.Liquid.Density, s.Temperature),
            Transport.Viscosity(s.Vapour.Density, s.Temperature));

        public static readonly FourCurves Table = Curves(Of);
    }

    private static class BothCurves
    {
        public static readonly EightCurves Table = new(PhaseCurves.Table, FluidCurves.Table);
    }

    private static class HeatCurves
    {
        public static readonly Func<SaturationCore, Four> Of = s => new(
            Transport.Conductivity(s.Liquid),
            Transport.Conductivity(s.Vapour),
            s.Liquid.IsobaricHeatCapacity,
            s.Vapour.IsobaricHeatCapacity);

        public static readonly FourCurves Table = Curves(Of);
    }

    private static class ExpansionCurves
    {
        public static readonly Func<SaturationCore, Four> Of = s =>
            new(s.Vapour.IsentropicExponent, s.Liquid.Entropy, s.Vapour.Entropy, 0);

        public static readonly FourCurves Table = Curves(Of);
    }
}
