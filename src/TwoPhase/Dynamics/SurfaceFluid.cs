using System.Runtime.CompilerServices;
using TwoPhase.Flow;
using TwoPhase.HeatTransfer;
using TwoPhase.Numerics;
using TwoPhase.Passes;
using TwoPhase.Steam;

namespace TwoPhase.Dynamics;

/// <summary>Water and steam by the fast surface, and by the formulation where the surface does not reach: what thousands of steps a second need.</summary>
internal readonly struct SurfaceFluid : IPassFluid
{
    private readonly SteamSurface _surface;

    public SurfaceFluid(SteamSurface surface) => _surface = surface;

    public double HighestPressure => default(SteamFluid).HighestPressure;

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public SaturatedPair Saturated(double pressure) => default(SteamFluid).Saturated(pressure);

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public void Saturated(double pressure, out SaturatedPair pair) => default(SteamFluid).Saturated(pressure, out pair);

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public FluidPoint At(double pressure, double enthalpy, in SaturatedPair saturated, double near = 0)
    {
        if (!_surface.TrySinglePhase(pressure, enthalpy, saturated.LiquidEnthalpy, saturated.VapourEnthalpy, out Four point)) return default(SteamFluid).At(pressure, enthalpy, saturated, near);
        return new() { Temperature = point.A, SpecificVolume = point.B, VolumeByEnthalpy = point.C, VolumeByPressure = point.D };
    }

    public double Viscosity(double density, double temperature) => default(SteamFluid).Viscosity(density, temperature);

    public double LiquidEnthalpy(double pressure, double temperature) => default(SteamFluid).LiquidEnthalpy(pressure, temperature);

    public PhaseTransport Transport(double pressure, double enthalpy) => default(SteamFluid).Transport(pressure, enthalpy);

    public double Film(in PhaseTransport phase, double massFlux, double bore) => default(SteamFluid).Film(phase, massFlux, bore);

    public double Film(in FlowState flow, FilmModel model, double heatFlux) => default(SteamFluid).Film(flow, model, heatFlux);
}
