using TwoPhase.Numerics;
using TwoPhase.Units;

namespace TwoPhase.Flow;

public static partial class FrictionFactor
{
    /// <summary>Laminar flow: f = 64/Re.</summary>
    /// <remarks>
    /// <para>Range: Re up to about 2000, any roughness.</para>
    /// <para>Accuracy: exact for developed flow of constant properties.</para>
    /// <para>Source: Hagen (1839) and Poiseuille (1840); White, Fluid Mechanics, section 6.4.</para>
    /// </remarks>
    /// <param name="reynolds">Re, greater than zero.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="reynolds"/> is not greater than zero.</exception>
    public static double Laminar(double reynolds) => 64 / Require.Positive(reynolds, "Reynolds number", Scale.None, nameof(reynolds));

    /// <summary>Colebrook (1939), turbulent flow in smooth and rough tubes, solved to round-off.</summary>
    /// <remarks>
    /// <para>1/√f = −2 log10(ε/D / 3.7 + 2.51 / (Re √f)).</para>
    /// <para>Range: Re 4000 to 1e8, ε/D 0 to 0.05.</para>
    /// <para>Accuracy: about 10 % to 15 % of measured factors (the equation); 1e-15 relative (this solution of it).</para>
    /// <para>Source: Colebrook, J. Inst. Civil Engineers 11(4), 133-156 (1939).</para>
    /// </remarks>
    /// <param name="reynolds">Re, greater than zero.</param>
    /// <param name="relativeRoughness">ε/D, 0 for a smooth tube, below 0.5.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is outside its limits.</exception>
    public static double Colebrook(double reynolds, double relativeRoughness)
    {
        Demand(reynolds, relativeRoughness);
        return ColebrookCore(reynolds, relativeRoughness);
    }

    /// <summary>Haaland (1983), an explicit form close to <see cref="Colebrook"/>.</summary>
    /// <remarks>
    /// <para>1/√f = −1.8 log10[(ε/D / 3.7)^1.11 + 6.9/Re].</para>
    /// <para>Range: Re 4000 to 1e8, ε/D 1e-6 to 0.05.</para>
    /// <para>Accuracy: within 2 % of Colebrook's equation.</para>
    /// <para>Source: Haaland, J. Fluids Engineering 105(1), 89-90 (1983).</para>
    /// </remarks>
    /// <param name="reynolds">Re, greater than zero.</param>
    /// <param name="relativeRoughness">ε/D, 0 for a smooth tube, below 0.5.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is outside its limits.</exception>
    public static double Haaland(double reynolds, double relativeRoughness)
    {
        Demand(reynolds, relativeRoughness);
        double inverseRoot = -1.8 * Math.Log10(Math.Pow(relativeRoughness / 3.7, 1.11) + (6.9 / reynolds));
        return 1 / (inverseRoot * inverseRoot);
    }

    /// <summary>Churchill (1977), one explicit form through laminar, transitional and turbulent flow without a step.</summary>
    /// <remarks>
    /// <para>f = 8 [(8/Re)^12 + (A + B)^(−3/2)]^(1/12), A = {2.457 ln[1 / ((7/Re)^0.9 + 0.27 ε/D)]}^16, B = (37530/Re)^16.</para>
    /// <para>Range: any Re, ε/D 0 to 0.05.</para>
    /// <para>Accuracy: within about 1 % of Colebrook's equation for Re above 1e4; the transition is a plausible curve, no more.</para>
    /// <para>Source: Churchill, Chemical Engineering 84(24), 91-92 (1977).</para>
    /// </remarks>
    /// <param name="reynolds">Re, greater than zero.</param>
    /// <param name="relativeRoughness">ε/D, 0 for a smooth tube, below 0.5.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is outside its limits.</exception>
    public static double Churchill(double reynolds, double relativeRoughness)
    {
        Demand(reynolds, relativeRoughness);
        double a = Math.Pow(-2.457 * Math.Log(Math.Pow(7 / reynolds, 0.9) + (0.27 * relativeRoughness)), 16);
        double b = Math.Pow(37530 / reynolds, 16);
        return 8 * Math.Pow(Math.Pow(8 / reynolds, 12) + Math.Pow(a + b, -1.5), 1.0 / 12);
    }

    internal static double ColebrookCore(double reynolds, double relativeRoughness)
    {
        // s = 1/√f solves s + c ln(a + b s) = 0: one substitution from the middle of the practical range (f = 0.018), then two
        // Householder steps of fourth order. Relative error of f after them at most 7e-16, over Re 2040-1e8 and ε/D 0-0.49.
        const double c = 0.86858896380650365530; // 2 / ln 10
        double a = relativeRoughness / 3.7, b = 2.51 / reynolds;
        double s = -c * Math.Log(a + (b * 7.5));
        s = Improve(s, a, b);
        s = Improve(s, a, b);
        return 1 / (s * s);

        static double Improve(double s, double a, double b)
        {
            double argument = a + (b * s);
            double residual = s + (c * Math.Log(argument));
            double k = b / argument;
            double slope = 1 + (c * k), second = -c * k * k, third = -2 * k * second;
            return s - (residual * ((6 * slope * slope) - (3 * residual * second))
                / ((6 * slope * slope * slope) - (6 * residual * slope * second) + (residual * residual * third)));
        }
    }
}
