using TwoPhase.Flow;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Friction;

/// <summary>The pressure that goes into speeding up the mixture as it evaporates in a tube of one bore.</summary>
/// <remarks>
/// <para>Δp = G² (v′out − v′in), v′ = x²/(α ρg) + (1 − x)²/[(1 − α) ρl].</para>
/// <para>G mass flux [kg/(m²·s)], x flowing quality [kg/kg], α void fraction [-], ρl and ρg saturated densities [kg/m³].</para>
/// <para>Range: any.</para>
/// <para>Accuracy: that of the void fraction.</para>
/// <para>Source: Collier and Thome, Convective Boiling and Condensation, 3rd ed. (1994), section 2.4.</para>
/// </remarks>
public static class AccelerationLoss
{
    // Mass flux at both ends is one number, told twice; this much may be rounding.
    private const double Rounding = 1e-6;

    /// <summary>Pressure at the inlet over that at the outlet for acceleration alone; negative where the flow slows down.</summary>
    /// <param name="inlet">The flow at the inlet.</param>
    /// <param name="inletVoidFraction">α at the inlet; above 0 where there is vapour, below 1 where there is liquid.</param>
    /// <param name="outlet">The flow at the outlet, of the same mass flux.</param>
    /// <param name="outletVoidFraction">α at the outlet; above 0 where there is vapour, below 1 where there is liquid.</param>
    /// <exception cref="ArgumentOutOfRangeException">A void fraction is outside its limits, or the mass fluxes differ.</exception>
    public static Pressure Difference(in TwoPhaseFlow inlet, Ratio inletVoidFraction, in TwoPhaseFlow outlet, Ratio outletVoidFraction)
    {
        FlowState from = inlet.State, to = outlet.State;
        double flux = to.MassFlux;
        Require.Within(flux, from.MassFlux * (1 - Rounding), from.MassFlux * (1 + Rounding), "Mass flux at the outlet", Scale.KilogramsPerSquareMetreSecond, nameof(outlet));
        double before = Mixture.MomentumVolume(from, Demand(from, inletVoidFraction, nameof(inletVoidFraction)));
        double after = Mixture.MomentumVolume(to, Demand(to, outletVoidFraction, nameof(outletVoidFraction)));
        return Pressure.FromPascals(flux * flux * (after - before));
    }

    private static double Demand(in FlowState flow, Ratio voidFraction, string parameter)
    {
        double alpha = Require.Within(voidFraction.Si(), 0, 1, "Void fraction", Scale.None, parameter);
        if (alpha == 0 && flow.Quality > 0) throw Require.OutOfRange(alpha, "Void fraction", Scale.None, parameter, "must be above 0 where there is vapour");
        if (alpha == 1 && flow.Quality < 1) throw Require.OutOfRange(alpha, "Void fraction", Scale.None, parameter, "must be below 1 where there is liquid");
        return alpha;
    }
}
