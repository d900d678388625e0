using TwoPhase.Flow;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Friction;

/// <summary>Pressure lost in bends, fittings and restrictors, where one phase or both flow.</summary>
/// <remarks>
/// <para>One phase: Δp = K G²/(2 ρ). Both: Δp = φ² K G²/(2 ρl), φ² = 1 + (ρl/ρg − 1) [B x (1 − x) + x²].</para>
/// <para>K loss coefficient on the velocity in the tube [-], G mass flux there [kg/(m²·s)], ρ density [kg/m³], φ² two-phase multiplier [-],
/// B Chisholm's coefficient [-], x flowing quality [kg/kg].</para>
/// <para>Range: 0 ≤ x ≤ 1, either end exact. B = 1 is homogeneous flow; bends have more (see <see cref="BendB"/>).
/// No flashing or choking in the fitting.</para>
/// <para>Accuracy: none stated; K itself is seldom better than 20 %.</para>
/// <para>Source: Chisholm, Two-Phase Flow in Pipelines and Heat Exchangers (1983).</para>
/// </remarks>
public static partial class LocalLoss
{
    /// <summary>The loss where one phase flows.</summary>
    /// <param name="massFlux">G, not negative.</param>
    /// <param name="density">ρ, greater than zero.</param>
    /// <param name="lossCoefficient">K, not negative.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is outside its limits.</exception>
    public static Pressure Of(MassFlux massFlux, Density density, double lossCoefficient)
    {
        double g = Require.NotNegative(massFlux.Si(), "Mass flux", Scale.KilogramsPerSquareMetreSecond, nameof(massFlux));
        double rho = Require.Positive(density.Si(), "Density", Scale.KilogramsPerCubicMetre, nameof(density));
        double k = Require.NotNegative(lossCoefficient, "Loss coefficient", Scale.None, nameof(lossCoefficient));
        return Pressure.FromPascals(k * g * g / (2 * rho));
    }

    /// <summary>The loss where both phases flow.</summary>
    /// <param name="flow">The flow in the tube.</param>
    /// <param name="lossCoefficient">K for one phase, not negative.</param>
    /// <param name="b">Chisholm's B, not negative; 1 for homogeneous flow.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is outside its limits.</exception>
    public static Pressure Of(in TwoPhaseFlow flow, double lossCoefficient, double b = 1)
    {
        Require.NotNegative(lossCoefficient, "Loss coefficient", Scale.None, nameof(lossCoefficient));
        Require.NotNegative(b, "Chisholm's B", Scale.None, nameof(b));
        return Pressure.FromPascals(Core(flow.State, lossCoefficient, b));
    }

    /// <summary>φ²: the loss of a fitting over that of the whole flow as liquid.</summary>
    /// <param name="flow">The flow in the tube.</param>
    /// <param name="b">Chisholm's B, not negative; 1 for homogeneous flow.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="b"/> is negative.</exception>
    public static double Multiplier(in TwoPhaseFlow flow, double b)
    {
        Require.NotNegative(b, "Chisholm's B", Scale.None, nameof(b));
        return MultiplierCore(flow.State, b);
    }

    internal static double Core(in FlowState flow, double lossCoefficient, double b) =>
        lossCoefficient * flow.MassFlux * flow.MassFlux / (2 * flow.LiquidDensity) * MultiplierCore(flow, b);

    internal static double MultiplierCore(in FlowState flow, double b)
    {
        double x = flow.Quality;
        return 1 + (((flow.LiquidDensity / flow.VapourDensity) - 1) * ((b * x * (1 - x)) + (x * x)));
    }
}
