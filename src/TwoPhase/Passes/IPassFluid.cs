using TwoPhase.Flow;
using TwoPhase.HeatTransfer;

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
internal readonly struct SaturatedPair
{
    /// <summary>p [Pa].</summary>
    public double Pressure { get; init; }

    /// <summary>Ts [K].</summary>
    public double Temperature { get; init; }

    /// <summary>h′ [J/kg].</summary>
    public double LiquidEnthalpy { get; init; }

    /// <summary>h″ [J/kg].</summary>
    public double VapourEnthalpy { get; init; }

    /// <summary>v′ [m³/kg].</summary>
    public double LiquidVolume { get; init; }

    /// <summary>v″ [m³/kg].</summary>
    public double VapourVolume { get; init; }

    /// <summary>μ′ [Pa·s].</summary>
    public double LiquidViscosity { get; init; }

    /// <summary>μ″ [Pa·s].</summary>
    public double VapourViscosity { get; init; }

    /// <summary>σ [N/m].</summary>
    public double SurfaceTension { get; init; }

    /// <summary>h″ − h′ [J/kg].</summary>
    public double LatentHeat => VapourEnthalpy - LiquidEnthalpy;

    /// <summary>xe = (h − h′)/(h″ − h′), any value.</summary>
    public double Quality(double enthalpy) => (enthalpy - LiquidEnthalpy) / LatentHeat;
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
internal readonly record struct PhaseTransport(double Viscosity, double Conductivity, double HeatCapacity);
