using TwoPhase.Numerics;

namespace TwoPhase.Metering;

/// <summary>C of one shape of meter over the Reynolds number: whatever depends on the shape alone is worked out once, so that a search pays one power a step.</summary>
/// <remarks>C = c0 + c1 q + c3 q³ + c7 q⁷ + c8 q⁸ + c11 q¹¹, q = (10⁶/Re)^e: the powers 0.3, 0.7, 0.8 and 1.1 of the orifice plate with e = 0.1, the one power of a nozzle as e itself.</remarks>
internal readonly struct CoefficientLaw
{
    private readonly double _exponent;

    private CoefficientLaw(double limit, double exponent) => (Limit, _exponent) = (limit, exponent);

    /// <summary>Whether no Reynolds number changes C.</summary>
    public bool IsConstant => _exponent == 0;

    /// <summary>C at an infinite Reynolds number.</summary>
    public double Limit { get; }

    private double First { get; init; }

    private double Third { get; init; }

    private double Seventh { get; init; }

    private double Eighth { get; init; }

    private double Eleventh { get; init; }

    /// <summary>C that no Reynolds number changes.</summary>
    public static CoefficientLaw Constant(double coefficient) => new(coefficient, 0);

    /// <summary>C = constant + factor (10⁶/Re)^exponent.</summary>
    public static CoefficientLaw Power(double constant, double factor, double exponent) => new(constant, exponent) { First = factor };

    /// <summary>C = constant + third m^0.3 + seventh m^0.7 + eighth m^0.8 + eleventh m^1.1, m = 10⁶/Re.</summary>
    public static CoefficientLaw Tenths(double constant, double third, double seventh, double eighth, double eleventh) =>
        new(constant, 0.1) { Third = third, Seventh = seventh, Eighth = eighth, Eleventh = eleventh };

    /// <summary>C at a Reynolds number of the pipe; infinity is the limit.</summary>
    public double At(double reynolds) => Over(0, reynolds, 0).Value;

    /// <summary>C at a quality over which the Reynolds number runs in a straight line, and its slope in that quality.</summary>
    public Sloped Over(double quality, double reynoldsAtZero, double reynoldsSlope)
    {
        if (IsConstant) return new(Limit, 0);
        double reynolds = reynoldsAtZero + (reynoldsSlope * quality);
        double q = Math.Pow(reynolds * 1e-6, -_exponent), q3 = q * q * q, q7 = q3 * q3 * q, q8 = q7 * q;
        double first = First * q, third = Third * q3, seventh = Seventh * q7, eighth = Eighth * q8, eleventh = Eleventh * q8 * q3;
        double steepness = first + (3 * third) + (7 * seventh) + (8 * eighth) + (11 * eleventh);
        return new(Limit + first + third + seventh + eighth + eleventh, -_exponent * steepness * reynoldsSlope / reynolds);
    }
}
