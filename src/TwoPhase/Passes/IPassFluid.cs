using System.Runtime.CompilerServices;
using TwoPhase.Flow;
using TwoPhase.HeatTransfer;
using TwoPhase.Numerics;
using TwoPhase.Steam;

namespace TwoPhase.Passes;

/// <summary>
/// The fluid as the steady, the transient and the live solver see it, SI doubles. A struct that implements it is a type
/// argument of the solvers, so the runtime compiles them for it and no call goes through an interface.
/// </summary>
/// <remarks>
/// <see cref="SteamFluid"/> is the one in use. Analytic solutions hold for a liquid of constant density and a volume linear in
/// enthalpy at constant pressure; tests supply such a fluid and run the same code.
/// </remarks>
internal interface IPassFluid
{
    /// <summary>Pressure below which liquid and vapour can be in equilibrium [Pa].</summary>
    double HighestPressure { get; }

    /// <summary>Both phases in equilibrium at a pressure below <see cref="HighestPressure"/>.</summary>
    SaturatedPair Saturated(double pressure);

    /// <summary>The same, straight to where it is wanted.</summary>
    void Saturated(double pressure, out SaturatedPair pair);

    /// <summary>The equilibrium state at p and h with its derivatives; T = 0 where the fluid has no such state.</summary>
    /// <param name="pressure">p [Pa].</param>
    /// <param name="enthalpy">h [J/kg].</param>
    /// <param name="saturated">Both phases at the same pressure.</param>
    /// <param name="near">T of a state close by [K], which spares a search; 0 for none.</param>
    FluidPoint At(double pressure, double enthalpy, in SaturatedPair saturated, double near = 0);

    /// <summary>μ of one phase [Pa·s].</summary>
    double Viscosity(double density, double temperature);

    /// <summary>h of liquid at p and T [J/kg], continued above saturation as liquid; NaN where the fluid has none.</summary>
    double LiquidEnthalpy(double pressure, double temperature);

    /// <summary>What one phase alone has to carry heat with, at p and h.</summary>
    PhaseTransport Transport(double pressure, double enthalpy);

    /// <summary>Film coefficient between wall and one phase [W/(m²·K)].</summary>
    double Film(in PhaseTransport phase, double massFlux, double bore);

    /// <summary>Film coefficient where both phases flow [W/(m²·K)].</summary>
    /// <param name="flow">What the flow is there; conductivities and heat capacities are filled in.</param>
    /// <param name="model">The correlation.</param>
    /// <param name="heatFlux">q at the inside surface [W/m²], zero or more.</param>
    double Film(in FlowState flow, FilmModel model, double heatFlux);
}

/// <summary>Liquid and vapour in equilibrium.</summary>
internal struct SaturatedPair
{
    // In the order in which they are found and side by side as they are.
    private Eight _values;
    private double _pressure;

    /// <summary>Both phases from numbers of their own.</summary>
    /// <param name="pressure">p [Pa].</param>
    /// <param name="values">v′, v″ [m³/kg], h′, h″ [J/kg], Ts [K], σ [N/m], μ′ and μ″ [Pa·s].</param>
    public SaturatedPair(double pressure, Eight values) => (_pressure, _values) = (pressure, values);

    /// <summary>p [Pa].</summary>
    public readonly double Pressure => _pressure;

    /// <summary>v′ [m³/kg].</summary>
    public readonly double LiquidVolume => _values.A;

    /// <summary>v″ [m³/kg].</summary>
    public readonly double VapourVolume => _values.B;

    /// <summary>h′ [J/kg].</summary>
    public readonly double LiquidEnthalpy => _values.C;

    /// <summary>h″ [J/kg].</summary>
    public readonly double VapourEnthalpy => _values.D;

    /// <summary>Ts [K].</summary>
    public readonly double Temperature => _values.E;

    /// <summary>σ [N/m].</summary>
    public readonly double SurfaceTension => _values.F;

    /// <summary>μ′ [Pa·s].</summary>
    public readonly double LiquidViscosity => _values.G;

    /// <summary>μ″ [Pa·s].</summary>
    public readonly double VapourViscosity => _values.H;

    /// <summary>h″ − h′ [J/kg].</summary>
    public readonly double LatentHeat => VapourEnthalpy - LiquidEnthalpy;

    /// <summary>xe = (h − h′)/(h″ − h′), any value.</summary>
    public readonly double Quality(double enthalpy) => (enthalpy - LiquidEnthalpy) / LatentHeat;

    /// <summary>Water and steam at a pressure.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static void Find(double pressure, out SaturatedPair pair)
    {
        SaturationTable.PhasesAndFluid(pressure, out pair._values);
        pair._pressure = pressure;
    }
}

/// <summary>An equilibrium state at p and h.</summary>
internal readonly struct FluidPoint
{
    /// <summary>T [K]; 0 where the fluid has no such state.</summary>
    public double Temperature { get; init; }

    /// <summary>v [m³/kg], of both phases together inside the dome.</summary>
    public double SpecificVolume { get; init; }

    /// <summary>(∂v/∂h)p [m³/J].</summary>
    public double VolumeByEnthalpy { get; init; }

    /// <summary>(∂v/∂p)h [m³/(kg·Pa)].</summary>
    public double VolumeByPressure { get; init; }
}

/// <summary>One phase alone as its film sees it.</summary>
/// <param name="Viscosity">μ [Pa·s].</param>
/// <param name="Conductivity">k [W/(m·K)].</param>
/// <param name="HeatCapacity">cp [J/(kg·K)].</param>
internal readonly record struct PhaseTransport(double Viscosity, double Conductivity, double HeatCapacity)
{
    /// <summary>On the straight line from one to another.</summary>
    public static PhaseTransport Between(in PhaseTransport from, in PhaseTransport to, double share) => new(
        from.Viscosity + (share * (to.Viscosity - from.Viscosity)),
        from.Conductivity + (share * (to.Conductivity - from.Conductivity)),
        from.HeatCapacity + (share * (to.HeatCapacity - from.HeatCapacity)));
}
