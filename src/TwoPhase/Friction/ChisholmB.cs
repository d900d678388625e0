using TwoPhase.Flow;
using TwoPhase.Numerics;

namespace TwoPhase.Friction;

public abstract partial class FrictionModel
{
    /// <summary>Chisholm (1973), the B-coefficient method.</summary>
    /// <remarks>
    /// <para>dp/dz = l {1 + (Y² − 1) [B x^0.875 (1 − x)^0.875 + x^1.75]}, Y² = g/l; l and g the gradients of the whole flow as liquid and as vapour.</para>
    /// <para>Y ≤ 9.5: B = 4.8 (G ≤ 500), 2400/G (to 1900), 55/√G (above); Y ≤ 28: B = 520/(Y √G) (G ≤ 600), 21/Y (above);
    /// Y above 28: B = 15 000/(Y² √G). G mass flux [kg/(m²·s)], x flowing quality [kg/kg].</para>
    /// <para>Range: 0 ≤ x ≤ 1, either end exact; any Y, but B jumps at Y = 9.5 and 28, as published. Steam above 2 MPa has Y below 9.5.</para>
    /// <para>Accuracy: none stated.</para>
    /// <para>Source: Chisholm, Int. J. Heat Mass Transfer 16(2), 347-358 (1973), smooth tubes with Blasius's exponent 0.25; l and g here
    /// by Colebrook's factor, so that roughness counts.</para>
    /// </remarks>
    public static FrictionModel ChisholmB { get; } = new ChisholmBModel();

    private sealed class ChisholmBModel : FrictionModel
    {
        public override string Name => "Chisholm B";

        protected internal override double GradientCore(in FlowState flow, double roughness)
        {
            (double l, double g) = FrictionFactor.GradientPair(flow, roughness);
            double vapour = SevenEighths(flow.Quality), liquid = SevenEighths(1 - flow.Quality);
            return l + ((g - l) * ((B(flow.MassFlux, Fast.Sqrt(g / l)) * vapour * liquid) + (vapour * vapour)));
        }

        // x^0.875 by square roots: a third of the cost of a power.
        private static double SevenEighths(double x)
        {
            double eighth = Fast.Sqrt(Fast.Sqrt(Fast.Sqrt(x))), quarter = eighth * eighth;
            return eighth * quarter * quarter * quarter;
        }

        private static double B(double massFlux, double y) => y switch
        {
            <= 9.5 => massFlux <= 500 ? 4.8 : massFlux < 1900 ? 2400 / massFlux : 55 / Fast.Sqrt(massFlux),
            <= 28 => massFlux <= 600 ? 520 / (y * Fast.Sqrt(massFlux)) : 21 / y,
            _ => 15000 / (y * y * Fast.Sqrt(massFlux)),
        };
    }
}
