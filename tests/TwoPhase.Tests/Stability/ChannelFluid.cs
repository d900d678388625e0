using TwoPhase.Flow;
using TwoPhase.Friction;
using TwoPhase.HeatTransfer;
using TwoPhase.Passes;
using TwoPhase.Slip;
using UnitsNet;

namespace TwoPhase.Tests.Stability;

/// <summary>The fluid of the closed forms, so thin that a rough tube has one friction factor for liquid, mixture and vapour.</summary>
internal readonly struct ChannelFluid : IPassFluid
{
    public const double Bore = 0.0779, MassFlux = 1007, Roughness = 46e-6;

    private static readonly SteadyOptions Options = SteadyOptions.Default.WithoutGravity().WithoutAcceleration();

    /// <summary>Homogeneous void fraction and friction.</summary>
    public static PassModels Models { get; } = new(VoidFractionModel.Homogeneous, FrictionModel.HomogeneousCicchitti);

    /// <summary>Friction only.</summary>
    public static SteadyOptions FrictionOnly => Options;

    /// <summary>Fully rough: f = [2 lg(3.7 D/ε)]^−2.</summary>
    public static double FrictionFactor { get; } = 1 / Math.Pow(2 * Math.Log10(3.7 * Bore / Roughness), 2);

    public static double Area => Math.PI / 4 * Bore * Bore;

    private static ConstantDensityFluid Fluid => default;

    public double HighestPressure => Fluid.HighestPressure;

    public static TubeSection Tube(double metres) => new TubeSection("tubes", Length.FromMeters(Bore), Length.FromMillimeters(88.9), Length.FromMeters(metres)).WithRoughness(Length.FromMeters(Roughness));

    /// <summary>The base case of the closed forms for a pass, with feed that lacks a given heat to boil [J/kg].</summary>
    public static PassProfile Solve(Pass pass, double lacking, double linearHeat = 12180) => SteadyState.Solve(default(ChannelFluid), pass, Conditions(lacking, linearHeat * pass.Sections[^1].FlowLength.Meters), SteadyTarget.Profile, 0, Models, FrictionOnly);

    public static PassConditions Conditions(double lacking, double heat) =>
        new PassConditions(MassFlow.FromKilogramsPerSecond(MassFlux * Area), Temperature.FromKelvins(500), Pressure.FromMegapascals(10), Power.FromWatts(heat)).WithFeedEnthalpy(SpecificEnergy.FromJoulesPerKilogram(ConstantDensityFluid.Subcooled(lacking)));

    public SaturatedPair Saturated(double pressure)
    {
        SaturatedPair pair = Fluid.Saturated(pressure);
        return new(pressure, new(pair.LiquidVolume, pair.VapourVolume, pair.LiquidEnthalpy, pair.VapourEnthalpy, pair.Temperature, pair.SurfaceTension, 1e-16, 1e-16));
    }

    public void Saturated(double pressure, out SaturatedPair pair) => pair = Saturated(pressure);

    public FluidPoint At(double pressure, double enthalpy, in SaturatedPair saturated, double near = 0) => Fluid.At(pressure, enthalpy, saturated, near);

    public double Viscosity(double density, double temperature) => 1e-16;

    public double LiquidEnthalpy(double pressure, double temperature) => Fluid.LiquidEnthalpy(pressure, temperature);

    public PhaseTransport Transport(double pressure, double enthalpy) => Fluid.Transport(pressure, enthalpy);

    public double Film(in PhaseTransport phase, double massFlux, double bore) => Fluid.Film(phase, massFlux, bore);

    public double Film(in FlowState flow, FilmModel model, double heatFlux) => Fluid.Film(flow, model, heatFlux);
}
