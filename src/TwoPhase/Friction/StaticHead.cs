using TwoPhase.Flow;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Friction;

/// <summary>The weight of the mixture along a tube that rises or falls.</summary>
/// <remarks>
/// <para>dp/dz = g sin θ [α ρg + (1 − α) ρl]: positive, a loss, where the flow rises.</para>
/// <para>g standard gravity [m/s²], θ inclination [rad], α void fraction [-], ρl and ρg saturated densities [kg/m³].</para>
/// <para>Range: any.</para>
/// <para>Accuracy: that of the void fraction.</para>
/// <para>Source: Collier and Thome, Convective Boiling and Condensation, 3rd ed. (1994), section 2.2; definition.</para>
/// </remarks>
public static class StaticHead
{
    /// <summary>The gradient, positive where pressure falls in the direction of flow.</summary>
    /// <param name="flow">The flow, with its inclination.</param>
    /// <param name="voidFraction">α, 0 to 1.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="voidFraction"/> is outside 0 to 1.</exception>
    public static PressureGradient Gradient(in TwoPhaseFlow flow, Ratio voidFraction) => PressureGradient.FromPascalsPerMetre(
        GradientCore(flow.State, Require.Within(voidFraction.Si(), 0, 1, "Void fraction", Scale.None, nameof(voidFraction))));

    internal static double GradientCore(in FlowState flow, double voidFraction) =>
        SiDoor.StandardGravity * Math.Sin(flow.Inclination) * Mixture.StaticDensity(flow, voidFraction);
}
