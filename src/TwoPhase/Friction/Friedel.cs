using TwoPhase.Flow;
using TwoPhase.Numerics;
using TwoPhase.Units;

namespace TwoPhase.Friction;

public abstract partial class FrictionModel
{
    /// <summary>Friedel (1979), horizontal tubes and vertical upflow.</summary>
    /// <remarks>
    /// <para>dp/dz = l [E + 3.24 F H / (Fr^0.0454 We^0.035)], l the gradient of the whole flow as liquid, g as vapour; E = (1 − x)² + x² g/l,
    /// F = x^0.78 (1 − x)^0.224, H = (ρl/ρg)^0.91 (μg/μl)^0.19 (1 − μg/μl)^0.7, Fr = G² v²/(g D), We = G² D v/σ, v = x/ρg + (1 − x)/ρl.</para>
    /// <para>x flowing quality [kg/kg], G mass flux [kg/(m²·s)], D bore [m], ρ densities [kg/m³], μ viscosities [Pa·s], σ surface tension [N/m].
    /// Many books print Fr^0.045, which differs by at most 0.4 %.</para>
    /// <para>Range: 0 ≤ x ≤ 1, either end exact; bore above 4 mm, μl/μg below 1000, not for downflow.</para>
    /// <para>Accuracy: standard deviation 30 % to 40 % over 25 000 points (as quoted in handbooks).</para>
    /// <para>Source: Friedel, European Two-Phase Flow Group Meeting, Ispra (1979), paper E2; l and g here by Colebrook's factor, so that roughness counts.</para>
    /// </remarks>
    public static FrictionModel Friedel { get; } = new FriedelModel();

    private sealed class FriedelModel : FrictionModel
    {
        public override string Name => "Friedel";

        protected internal override double GradientCore(in FlowState flow, double roughness)
        {
            double x = flow.Quality, y = 1 - x, flux = flow.MassFlux * Mixture.HomogeneousVolume(flow);
            (double l, double g) = FrictionFactor.GradientPair(flow, roughness);
            double viscosityRatio = flow.VapourViscosity / flow.LiquidViscosity;
            double froude = flux * flux / (SiDoor.StandardGravity * flow.Bore);
            double weber = flow.MassFlux * flux * flow.Bore / flow.SurfaceTension;

            // F H / (Fr^… We^…) as one exponential: seven powers would cost more than both friction factors together.
            // A logarithm of 0 (x at an end, critical point) is −∞ and the term 0, as it should be.
            double slip = Math.Exp(
                Four.LogOfPowers(new(x, y, flow.LiquidDensity / flow.VapourDensity, viscosityRatio), new(0.78, 0.224, 0.91, 0.19))
                + Four.LogOfPowers(new(1 - viscosityRatio, froude, weber, 1), new(0.7, -0.0454, -0.035, 0)));
            return (l * ((y * y) + (3.24 * slip))) + (g * x * x);
        }

        protected internal override Applicability CheckCore(in FlowState flow) => Applicability.Inside
            .Check(ApplicabilityLimits.Bore, flow.Bore, 0.004, double.PositiveInfinity)
            .Check(ApplicabilityLimits.ViscosityRatio, flow.LiquidViscosity / flow.VapourViscosity, 0, 1000)
            .Check(ApplicabilityLimits.Inclination, flow.Inclination, 0, Math.PI / 2);
    }
}
