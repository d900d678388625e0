using TwoPhase.Flow;
using TwoPhase.Numerics;

namespace TwoPhase.Friction;

public abstract partial class FrictionModel
{
    /// <summary>Müller-Steinhagen and Heck (1986): between all liquid and all vapour by an empirical curve. The default of this library.</summary>
    /// <remarks>
    /// <para>dp/dz = [a + 2 (b − a) x] (1 − x)^(1/3) + b x³, a and b the gradients of the whole flow as liquid and as vapour.</para>
    /// <para>dp/dz, a, b frictional gradients [Pa/m], x flowing quality [kg/kg].</para>
    /// <para>Range: 0 ≤ x ≤ 1, either end exact; bores 4 to 392 mm (as remembered).</para>
    /// <para>Accuracy: mean error about 40 % over the 9300 points of the paper, air-oil to steam-water (as remembered).</para>
    /// <para>Source: Müller-Steinhagen and Heck, Chem. Eng. Process. 20(6), 297-308 (1986); a and b here by Colebrook's factor,
    /// so that roughness counts (the paper: smooth tubes, Blasius).</para>
    /// </remarks>
    public static FrictionModel MullerSteinhagenHeck { get; } = new MullerSteinhagenHeckModel();

    private sealed class MullerSteinhagenHeckModel : FrictionModel
    {
        public override string Name => "Müller-Steinhagen-Heck";

        protected internal override double GradientCore(in FlowState flow, double roughness)
        {
            double x = flow.Quality;
            (double a, double b) = FrictionFactor.GradientPair(flow, roughness);
            return ((a + (2 * (b - a) * x)) * Fast.Cbrt(1 - x)) + (b * x * x * x);
        }

        protected internal override Applicability CheckCore(in FlowState flow) =>
            Applicability.Inside.Check(ApplicabilityLimits.Bore, flow.Bore, 0.004, 0.392);
    }
}
