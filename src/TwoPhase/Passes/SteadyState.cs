using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Passes;

/// <summary>The steady state of one pass: what stands where when nothing moves.</summary>
/// <remarks>
/// <para>Energy: dh/dz = q′/ṁ, so with the heat given the enthalpy along the pass is known and one march upstream from the outlet
/// pressure gives the pressures. Kinetic and potential energy are left out (below 1e-4 of the enthalpy rise in this trade).
/// Phases are in thermal equilibrium; the flowing quality is the equilibrium quality, 0 in subcooled liquid.</para>
/// <para>Momentum: −dp/dz = friction + fittings + ρ g sin θ + d(G² vM)/dz with vM = x²/(α ρg) + (1 − x)²/((1 − α) ρl).</para>
/// <para>Source: Collier and Thome, Convective Boiling and Condensation, 3rd ed. (1994), sections 2.2 to 2.4 (separated flow).</para>
/// </remarks>
public static class SteadyState
{
    /// <summary>The profile of a pass whose feed, outlet pressure and heat are given.</summary>
    /// <param name="pass">The pass.</param>
    /// <param name="conditions">What is imposed on it.</param>
    /// <param name="models">Slip and friction; null for the defaults.</param>
    /// <param name="options">What counts, and how finely; null for everything.</param>
    /// <exception cref="ArgumentException">The conditions do not fit the pass or the steam formulation; the message names the section.</exception>
    /// <exception cref="Numerics.ConvergenceException">No steady state exists: the pass chokes, or pressure rises to critical; the message names the section.</exception>
    public static PassProfile Solve(Pass pass, PassConditions conditions, PassModels? models = null, SteadyOptions? options = null) =>
        Solve(default(SteamFluid), pass, conditions, SteadyTarget.Profile, 0, models, options);

    /// <summary>The heat that brings the outlet to a wanted quality, and the profile that goes with it: see its <see cref="PassProfile.Conditions"/>.</summary>
    /// <param name="pass">The pass.</param>
    /// <param name="conditions">Feed and outlet pressure; the heat in it is not used.</param>
    /// <param name="outletQuality">Wanted equilibrium quality where the outlet pressure is measured; below 0 for a subcooled outlet, above 1 for a superheated one.</param>
    /// <param name="models">Slip and friction; null for the defaults.</param>
    /// <param name="options">What counts, and how finely; null for everything.</param>
    /// <exception cref="ArgumentException">The feed is already beyond that quality, or as for <see cref="Solve(Pass, PassConditions, PassModels?, SteadyOptions?)"/>.</exception>
    public static PassProfile FindHeat(Pass pass, PassConditions conditions, MassFraction outletQuality, PassModels? models = null, SteadyOptions? options = null) =>
        Solve(default(SteamFluid), pass, conditions, SteadyTarget.Heat, outletQuality.Si(), models, options);

    /// <summary>The feed flow that leaves at a wanted quality with the heat given, and the profile that goes with it.</summary>
    /// <param name="pass">The pass.</param>
    /// <param name="conditions">Feed temperature, outlet pressure and heat; the flow in it is not used.</param>
    /// <param name="outletQuality">Wanted equilibrium quality where the outlet pressure is measured.</param>
    /// <param name="models">Slip and friction; null for the defaults.</param>
    /// <param name="options">What counts, and how finely; null for everything.</param>
    /// <exception cref="ArgumentException">The feed is already beyond that quality, there is no heat, or as for <see cref="Solve(Pass, PassConditions, PassModels?, SteadyOptions?)"/>.</exception>
    public static PassProfile FindFlow(Pass pass, PassConditions conditions, MassFraction outletQuality, PassModels? models = null, SteadyOptions? options = null) =>
        Solve(default(SteamFluid), pass, conditions, SteadyTarget.Flow, outletQuality.Si(), models, options);

    internal static PassProfile Solve<TFluid>(in TFluid fluid, Pass pass, in PassConditions conditions, SteadyTarget target, double outletQuality, PassModels? models, SteadyOptions? options)
        where TFluid : struct, IPassFluid =>
        new SteadySolver<TFluid>(fluid, Require.NotNull(pass, nameof(pass)), conditions, models ?? PassModels.Default, options ?? SteadyOptions.Default)
            .Solve(target, Require.Finite(outletQuality, "Outlet quality", Scale.None, nameof(outletQuality)));
}

/// <summary>What a steady solution is looked for.</summary>
internal enum SteadyTarget
{
    /// <summary>Flow and heat are given.</summary>
    Profile = 0,

    /// <summary>The heat for an outlet quality.</summary>
    Heat = 1,

    /// <summary>The flow for an outlet quality.</summary>
    Flow = 2,
}
