using TwoPhase.Flow;

namespace TwoPhase.Slip;

public abstract partial class VoidFractionModel
{
    /// <summary>Drift flux with a distribution parameter and a drift velocity of one's choice.</summary>
    /// <remarks>
    /// <para>α = jg / (C0 (jg + jl) + Vgj), with jg = x G/ρg and jl = (1 − x) G/ρl.</para>
    /// <para>α void fraction [-], C0 distribution parameter [-], Vgj drift velocity [m/s], jg and jl superficial velocities [m/s],
    /// x flowing quality [kg/kg], G mass flux [kg/(m²·s)], ρl and ρg saturated densities [kg/m³].</para>
    /// <para>Range: that of its two laws, which were fitted together: not every pair is sensible. Where C0 does not go to 1 as
    /// x goes to 1, <see cref="Check(in TwoPhaseFlow)"/> flags <see cref="ApplicabilityLimits.DistributionParameter"/>: α then ends
    /// at 1/C0, and the liquid left near the end of a pass comes out several times too large.</para>
    /// <para>Accuracy: that of its two laws.</para>
    /// <para>Source: Zuber and Findlay, J. Heat Transfer 87(4), 453-468 (1965).</para>
    /// </remarks>
    /// <param name="distribution">The law of C0.</param>
    /// <param name="drift">The law of Vgj.</param>
    /// <exception cref="ArgumentNullException">An argument is null.</exception>
    public static VoidFractionModel DriftFlux(DistributionParameter distribution, DriftVelocity drift) =>
        new DriftFluxCorrelation(
            $"Drift flux, {Units.Require.NotNull(distribution, nameof(distribution)).Name} and {Units.Require.NotNull(drift, nameof(drift)).Name}",
            distribution,
            drift);

    private sealed class DriftFluxCorrelation(string name, DistributionParameter distribution, DriftVelocity drift, double lowest = -Math.PI / 2, double highest = Math.PI / 2)
        : VoidFractionModel
    {
        public override string Name => name;

        protected internal override double VoidFractionCore(in FlowState flow)
        {
            // Everything times ρg/G.
            double vapour = flow.Quality, liquid = (1 - flow.Quality) * (flow.VapourDensity / flow.LiquidDensity);

            // Without vapour C0 and Vgj may both be 0 (Dix at the critical point).
            return vapour > 0 ? vapour / ((distribution.Core(flow) * (vapour + liquid)) + (drift.Core(flow) * (flow.VapourDensity / flow.MassFlux))) : 0;
        }

        // S = [(C0 − 1) jg + C0 jl + Vgj] / jl: the same as from α, but without 1 − α.
        protected internal override double SlipRatioCore(in FlowState flow)
        {
            FlowState inside = InsideTheEnds(flow, 0);
            double vapour = inside.Quality / flow.VapourDensity, liquid = (1 - inside.Quality) / flow.LiquidDensity;
            double c0 = distribution.Core(inside);
            return c0 + ((((c0 - 1) * vapour) + (drift.Core(inside) / flow.MassFlux)) / liquid);
        }

        protected internal override Applicability CheckCore(in FlowState flow) =>
            Applicability.Inside
                .Check(ApplicabilityLimits.DistributionParameter, distribution.Core(flow with { Quality = 1 }), 1 - 1e-9, 1 + 1e-9)
                .Check(ApplicabilityLimits.Inclination, flow.Inclination, lowest, highest);
    }
}
