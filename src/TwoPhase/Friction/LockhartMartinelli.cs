using TwoPhase.Flow;
using TwoPhase.Numerics;

namespace TwoPhase.Friction;

public abstract partial class FrictionModel
{
    /// <summary>Lockhart and Martinelli (1949) with Chisholm's constants (1967).</summary>
    /// <remarks>
    /// <para>dp/dz = l + C √(l g) + g, which is l (1 + C/X + 1/X²) with X² = l/g; l and g the gradients of liquid and vapour each flowing alone.</para>
    /// <para>C = 20 both turbulent, 12 liquid laminar, 10 vapour laminar, 5 both laminar; a phase alone is laminar (f = 64/Re) below
    /// Re = 2000, else f = 0.184 Re^−0.2 (smooth tube).</para>
    /// <para>Range: 0 ≤ x ≤ 1, either end exact; bores 1.5 to 26 mm, near atmospheric pressure. Two to three times too high at 10 MPa, and
    /// blind to roughness: a yardstick, not a recommendation.</para>
    /// <para>Accuracy: none stated for steam.</para>
    /// <para>Source: Lockhart and Martinelli, Chem. Eng. Prog. 45(1), 39-48 (1949); Chisholm, Int. J. Heat Mass Transfer 10(12), 1767-1778 (1967).</para>
    /// </remarks>
    public static FrictionModel LockhartMartinelli { get; } = new LockhartMartinelliModel();

    private sealed class LockhartMartinelliModel : FrictionModel
    {
        private const double LaminarLimit = 2000;

        public override string Name => "Lockhart-Martinelli-Chisholm";

        protected internal override double GradientCore(in FlowState flow, double roughness)
        {
            double liquid = (1 - flow.Quality) * flow.MassFlux, vapour = flow.Quality * flow.MassFlux;
            bool liquidLaminar = liquid * flow.Bore / flow.LiquidViscosity < LaminarLimit;
            bool vapourLaminar = vapour * flow.Bore / flow.VapourViscosity < LaminarLimit;
            double l = Alone(liquid, flow.Bore, flow.LiquidDensity, flow.LiquidViscosity, liquidLaminar);
            double g = Alone(vapour, flow.Bore, flow.VapourDensity, flow.VapourViscosity, vapourLaminar);
            double c = (liquidLaminar, vapourLaminar) switch { (false, false) => 20, (true, false) => 12, (false, true) => 10, _ => 5 };
            return l + (c * Fast.Sqrt(l * g)) + g;
        }

        protected internal override Applicability CheckCore(in FlowState flow) => Applicability.Inside
            .Check(ApplicabilityLimits.Bore, flow.Bore, 0.0015, 0.026)
            .Check(ApplicabilityLimits.Pressure, flow.Pressure, 0.1e6, 0.4e6);

        private static double Alone(double massFlux, double bore, double density, double viscosity, bool laminar) => laminar
            ? 32 * viscosity * massFlux / (density * bore * bore)
            : 0.184 * Math.Pow(massFlux * bore / viscosity, -0.2) * massFlux * massFlux / (2 * bore * density);
    }
}
