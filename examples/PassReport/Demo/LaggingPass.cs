using TwoPhase.Steam;
using UnitsNet;

namespace PassReport.Demo;

/// <summary>
/// A pass for demonstration: uniform heat, one pressure, homogeneous flow at rest, and in motion a water mass and an outlet
/// quality that both follow their values at rest with a first-order lag. Not a simulator: it shows how a reading goes wrong, not
/// by how much at a plant.
/// </summary>
/// <remarks>
/// <para>Water at rest: m (τ + θ), τ = ρl A Δh/q′ time to boiling, θ = ln(1 + Ω Λ/u)/Ω time in the boiling length Λ, Ω = q′ vfg/(A hfg).</para>
/// <para>Source: the steady part of the solution for a uniformly heated channel, as in Gonzalez-Santalo and Lahey, J. Heat Transfer 95 (1973).</para>
/// </remarks>
internal sealed class LaggingPass
{
    private const double Bore = 0.0779, Length = 672, MassLag = 110, QualityLag = 140;
    private const double Area = Math.PI / 4 * Bore * Bore;

    private double _mass = double.NaN;

    /// <summary>Quality at the outlet, the true one.</summary>
    public double Quality { get; private set; }

    /// <summary>Flow out of the pass [kg/s]; differs from the feed while the water mass changes.</summary>
    public double OutletFlow { get; private set; }

    /// <summary>Lets time pass.</summary>
    /// <param name="seconds">How much.</param>
    /// <param name="flow">Feed flow [kg/s].</param>
    /// <param name="feed">Feed temperature [K].</param>
    /// <param name="pressure">Absolute pressure [Pa].</param>
    /// <param name="heat">Absorbed heat [W].</param>
    public void Advance(double seconds, double flow, double feed, double pressure, double heat)
    {
        (double mass, double quality) = AtRest(flow, feed, pressure, heat);
        if (double.IsNaN(_mass)) (_mass, Quality) = (mass, quality);
        double change = (mass - _mass) * -Expm1(-seconds / MassLag);
        _mass += change;
        OutletFlow = flow - (change / seconds);
        Quality += (quality - Quality) * -Expm1(-seconds / QualityLag);
    }

    private static (double Mass, double Quality) AtRest(double flow, double feed, double pressure, double heat)
    {
        var p = Pressure.FromPascals(pressure);
        var steam = Saturation.FromPressure(p);
        double h = SteamState.FromPressureTemperature(p, Temperature.FromKelvins(feed)).SpecificEnthalpy.JoulesPerKilogram;
        double hl = steam.Liquid.SpecificEnthalpy.JoulesPerKilogram, latent = steam.LatentHeat.JoulesPerKilogram;
        double rhoL = steam.Liquid.Density.KilogramsPerCubicMeter, vfg = (1 / steam.Vapour.Density.KilogramsPerCubicMeter) - (1 / rhoL);
        double perMetre = heat / Length, omega = perMetre * vfg / (Area * latent);
        double boilingTime = rhoL * Area * (hl - h) / perMetre;
        double speed = flow / (rhoL * Area), boilingLength = Length - (speed * boilingTime);
        return (flow * (boilingTime + (Math.Log(1 + (omega * boilingLength / speed)) / omega)), (h + (heat / flow) - hl) / latent);
    }

    private static double Expm1(double x) => Math.Exp(x) - 1;
}
