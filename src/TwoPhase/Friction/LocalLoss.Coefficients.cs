using TwoPhase.Numerics;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Friction;

public static partial class LocalLoss
{
    /// <summary>K of a smooth bend, friction along its axis included.</summary>
    /// <remarks>
    /// <para>K = f θ R/D + (0.10 + 2.4 f) sin(θ/2) + 6.6 f [√sin(θ/2) + sin(θ/2)] / (R/D)^(4θ/π).</para>
    /// <para>f Darcy friction factor of the tube [-], θ angle of the bend [rad], R radius of its axis [m], D bore [m]. The first term is the
    /// friction of a straight tube of the length of the axis: take it off where that length is counted as tube.</para>
    /// <para>Range: turbulent flow, R/D of 1 and more, bends up to 180°.</para>
    /// <para>Accuracy: none stated; other handbooks differ by 30 %.</para>
    /// <para>Source: Rennels and Hudson, Pipe Flow: A Practical and Comprehensive Guide (2012), chapter 15.</para>
    /// </remarks>
    /// <param name="angle">θ, above 0° and up to 180°; 180° for a return bend.</param>
    /// <param name="bendRatio">R/D, at least 0.5, where the inside of the bend has no radius left.</param>
    /// <param name="frictionFactor">f, Darcy's, greater than zero.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is outside its limits.</exception>
    public static double BendCoefficient(Angle angle, double bendRatio, double frictionFactor)
    {
        double theta = Require.Within(Require.Positive(angle.Si(), "Angle", Scale.Degrees, nameof(angle)), 0, Math.PI, "Angle", Scale.Degrees, nameof(angle));
        Require.Within(bendRatio, 0.5, double.MaxValue, "Bend ratio R/D", Scale.None, nameof(bendRatio));
        double f = Require.Positive(frictionFactor, "Friction factor", Scale.None, nameof(frictionFactor));
        double sine = Math.Sin(theta / 2);
        return (f * theta * bendRatio) + ((0.10 + (2.4 * f)) * sine)
            + (6.6 * f * (Math.Sqrt(sine) + sine) / Math.Pow(bendRatio, 4 * theta / Math.PI));
    }

    /// <summary>Chisholm's B of a bend.</summary>
    /// <remarks>
    /// <para>B = 1 + 2.2 / [K (2 + R/D)].</para>
    /// <para>K loss coefficient of this bend for one phase [-], R radius of its axis [m], D bore [m]. Published for 90°; at other angles
    /// B − 1 goes with 1/K, which is the same formula with the bend's own K.</para>
    /// <para>Range: smooth bends with straight tube behind them.</para>
    /// <para>Accuracy: none stated.</para>
    /// <para>Source: Chisholm, Int. J. Multiphase Flow 6(4), 363-367 (1980); Two-Phase Flow in Pipelines and Heat Exchangers (1983).</para>
    /// </remarks>
    /// <param name="lossCoefficient">K, greater than zero.</param>
    /// <param name="bendRatio">R/D, at least 0.5.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is outside its limits.</exception>
    public static double BendB(double lossCoefficient, double bendRatio)
    {
        Require.Positive(lossCoefficient, "Loss coefficient", Scale.None, nameof(lossCoefficient));
        Require.Within(bendRatio, 0.5, double.MaxValue, "Bend ratio R/D", Scale.None, nameof(bendRatio));
        return BendBCore(lossCoefficient, bendRatio);
    }

    /// <summary>K of an orifice plate as a restrictor at the inlet of a tube: the pressure that is lost for good.</summary>
    /// <remarks>
    /// <para>K = {√[1 − β⁴ (1 − C²)] / (C β²) − 1}².</para>
    /// <para>β = d/D diameter ratio [-], C discharge coefficient [-]; K is on the velocity in the tube.</para>
    /// <para>Range: liquid without flashing or cavitation, same tube before and behind the plate.</para>
    /// <para>Accuracy: that of C; about 0.6 for a sharp-edged plate at high Reynolds number.</para>
    /// <para>Source: ISO 5167-2:2003, clause 5.4, pressure loss coefficient.</para>
    /// </remarks>
    /// <param name="orifice">d, bore of the plate, smaller than that of the tube.</param>
    /// <param name="tube">D, bore of the tube.</param>
    /// <param name="dischargeCoefficient">C, above 0 and up to 1.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is outside its limits.</exception>
    public static double OrificeCoefficient(Length orifice, Length tube, double dischargeCoefficient)
    {
        double pipe = Require.Positive(tube.Si(), "Bore of the tube", Scale.Millimetres, nameof(tube));
        double bore = Require.Positive(orifice.Si(), "Bore of the orifice", Scale.Millimetres, nameof(orifice));
        Require.Below(bore, pipe, "Bore of the orifice", Scale.Millimetres, nameof(orifice));
        Require.Positive(dischargeCoefficient, "Discharge coefficient", Scale.None, nameof(dischargeCoefficient));
        double c = Require.Within(dischargeCoefficient, 0, 1, "Discharge coefficient", Scale.None, nameof(dischargeCoefficient));
        double square = bore / pipe * (bore / pipe);
        double root = (Fast.Sqrt(1 - (square * square * (1 - (c * c)))) / (c * square)) - 1;
        return root * root;
    }

    internal static double BendBCore(double lossCoefficient, double bendRatio) => 1 + (2.2 / (lossCoefficient * (2 + bendRatio)));
}
