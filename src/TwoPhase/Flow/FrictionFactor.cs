using System.Diagnostics;
using TwoPhase.Numerics;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Flow;

/// <summary>Darcy's friction factor of a round tube carrying one phase: Δp/L = f G² / (2 D ρ).</summary>
/// <remarks>
/// <para>Re = G D / μ Reynolds number [-], ε/D roughness relative to the bore [-], f Darcy friction factor [-] (four times Fanning's).</para>
/// <para>Up to Re = 2040 flow is taken as laminar, above it as turbulent: f steps up there, as the flow itself may. Between
/// about 2000 and 4000 real flow is unsettled and no formula is good; <see cref="Churchill"/> passes through it smoothly.</para>
/// </remarks>
public static partial class FrictionFactor
{
    /// <summary>Re above which flow is taken as turbulent: the onset that Avila et al., Science 333, 192-196 (2011) found in a pipe.</summary>
    public const double TransitionReynolds = 2040;

    // Relative roughness beyond which no formula was ever fitted; also where a "roughness" is most likely in the wrong unit.
    private const double GreatestRoughness = 0.5;

    /// <summary>f of laminar or turbulent flow: <see cref="Laminar"/> up to Re = 2040, <see cref="Colebrook"/> above.</summary>
    /// <param name="reynolds">Re, greater than zero.</param>
    /// <param name="relativeRoughness">ε/D, 0 for a smooth tube, below 0.5.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is outside its limits.</exception>
    public static double Of(double reynolds, double relativeRoughness)
    {
        Demand(reynolds, relativeRoughness);
        return OfCore(reynolds, relativeRoughness);
    }

    /// <summary>Frictional pressure gradient of one phase alone in the tube.</summary>
    /// <param name="massFlux">G, not negative.</param>
    /// <param name="bore">D, greater than zero.</param>
    /// <param name="density">ρ, greater than zero.</param>
    /// <param name="viscosity">μ, greater than zero.</param>
    /// <param name="roughness">ε, zero for a smooth tube, less than half the bore.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is outside its limits.</exception>
    public static PressureGradient Gradient(MassFlux massFlux, Length bore, Density density, DynamicViscosity viscosity, Length roughness)
    {
        double g = Require.NotNegative(massFlux.Si(), "Mass flux", Scale.KilogramsPerSquareMetreSecond, nameof(massFlux));
        double d = Require.Positive(bore.Si(), "Bore", Scale.Millimetres, nameof(bore));
        double rho = Require.Positive(density.Si(), "Density", Scale.KilogramsPerCubicMetre, nameof(density));
        double mu = Require.Positive(viscosity.Si(), "Viscosity", PascalSeconds, nameof(viscosity));
        double k = Require.NotNegative(roughness.Si(), "Roughness", Scale.Millimetres, nameof(roughness));
        Require.Below(k, d / 2, "Roughness", Scale.Millimetres, nameof(roughness));
        return PressureGradient.FromPascalsPerMetre(GradientCore(g, d, rho, mu, k));
    }

    internal static double OfCore(double reynolds, double relativeRoughness) =>
        reynolds <= TransitionReynolds ? 64 / reynolds : ColebrookCore(reynolds, relativeRoughness);

    /// <summary>dp/dz [Pa/m] of one phase alone, SI in; exactly 0 at no flow, where f itself has no value.</summary>
    internal static double GradientCore(double massFlux, double bore, double density, double viscosity, double roughness)
    {
        Debug.Assert(massFlux >= 0 && bore > 0 && density > 0 && viscosity > 0 && roughness >= 0);
        double reynolds = massFlux * bore / viscosity;
        return reynolds <= TransitionReynolds
            ? 32 * viscosity * massFlux / (density * bore * bore)
            : ColebrookCore(reynolds, roughness / bore) * massFlux * massFlux / (2 * bore * density);
    }

    private static readonly Scale PascalSeconds = new("Pa·s", 1);

    private static void Demand(double reynolds, double relativeRoughness)
    {
        Require.Positive(reynolds, "Reynolds number", Scale.None, nameof(reynolds));
        Require.NotNegative(relativeRoughness, "Relative roughness", Scale.None, nameof(relativeRoughness));
        Require.Below(relativeRoughness, GreatestRoughness, "Relative roughness", Scale.None, nameof(relativeRoughness));
    }
}
