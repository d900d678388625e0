using TwoPhase.Flow;
using TwoPhase.HeatTransfer;
using TwoPhase.Passes;

namespace TwoPhase.Tests.Support;

/// <summary>
/// The fluid of the analytic solutions: liquid of constant density, volume linear in enthalpy while it boils, saturation
/// values that do not depend on pressure.
/// </summary>
internal readonly struct ConstantDensityFluid : IPassFluid
{
    private const double LiquidDensity = 688, VapourDensity = 55.5, Latent = 1.317e6, Boiling = 584.15, HeatCapacity = 5000, Mu = 8e-5, Sigma = 0.012;

    /// <summary>h of saturated liquid [J/kg].</summary>
    public static double SaturatedEnthalpy => HeatCapacity * Boiling;

    /// <summary>h of feed that lacks a given heat to boil [J/kg].</summary>
    public static double Subcooled(double lacking) => SaturatedEnthalpy - lacking;

    public double HighestPressure => 22e6;

    public SaturatedPair Saturated(double pressure) =>
        new(pressure, new(1 / LiquidDensity, 1 / VapourDensity, SaturatedEnthalpy, SaturatedEnthalpy + Latent, Boiling, Sigma, Mu, Mu / 4));

    public void Saturated(double pressure, out SaturatedPair pair) => pair = Saturated(pressure);

    public FluidPoint At(double pressure, double enthalpy, in SaturatedPair saturated, double near = 0)
    {
        const double slope = ((1 / VapourDensity) - (1 / LiquidDensity)) / Latent;
        double above = enthalpy - SaturatedEnthalpy;
        return above <= 0
            ? new() { Temperature = enthalpy / HeatCapacity, SpecificVolume = 1 / LiquidDensity }
            : new() { Temperature = Boiling + (Math.Max(0, above - Latent) / HeatCapacity), SpecificVolume = (1 / LiquidDensity) + (slope * above), VolumeByEnthalpy = slope };
    }

    public double Viscosity(double density, double temperature) => Mu;

    public double LiquidEnthalpy(double pressure, double temperature) => HeatCapacity * temperature;

    public PhaseTransport Transport(double pressure, double enthalpy) => default;

    // A round figure, the same everywhere, as the closed forms of fluid and wall have it.
    public double Film(in PhaseTransport phase, double massFlux, double bore) => 9000;

    public double Film(in FlowState flow, FilmModel model, double heatFlux) => 9000;
}
