using TwoPhase.Flow;
using UnitsNet;

namespace TwoPhase.Metering;

/// <summary>Venturi nozzle to ISO 5167-3: the inlet of an ISA 1932 nozzle, a cylindrical throat and a divergent.</summary>
/// <remarks>
/// <para>C = 0.9858 − 0.196 β^4.5, β diameter ratio [-].</para>
/// <para>Range: 65 mm ≤ D ≤ 500 mm, d ≥ 50 mm, 0.316 ≤ β ≤ 0.775, 1.5·10⁵ ≤ Re ≤ 2·10⁶; p2/p1 ≥ 0.75.</para>
/// <para>Accuracy: with k = 2, C (1.2 + 1.5 β⁴) %; ε (4 + 100 β⁸) Δp/p1 %. The permanent loss is the upper end of the 5 % to 20 % that the standard gives.</para>
/// <para>Source: ISO 5167-3:2003, 5.3.</para>
/// </remarks>
public sealed class VenturiNozzle : PrimaryElement
{
    /// <summary>A Venturi nozzle.</summary>
    /// <param name="pipe">D, bore of the pipe, greater than zero.</param>
    /// <param name="throat">d, diameter of the throat, greater than zero and below the bore.</param>
    /// <exception cref="ArgumentOutOfRangeException">A diameter is outside its limits.</exception>
    public VenturiNozzle(Length pipe, Length throat)
        : base(pipe, throat, "Throat diameter", nameof(throat))
    {
    }

    /// <inheritdoc/>
    public override string Name => "Venturi nozzle";

    internal override CoefficientLaw LawOf(in MeterGeometry geometry)
    {
        double b2 = geometry.DiameterRatio * geometry.DiameterRatio;
        return CoefficientLaw.Constant(0.9858 - (0.196 * b2 * b2 * Math.Sqrt(geometry.DiameterRatio)));
    }

    internal override double ExpansibilityCore(in MeterGeometry geometry, double pressure, double differential, double isentropicExponent) =>
        Metering.Expansibility.Nozzle(geometry.DiameterRatio, pressure, differential, isentropicExponent);

    private protected override double CoefficientUncertaintyCore(double reynolds) => (1.2 + (1.5 * Math.Pow(DiameterRatio, 4))) / 100;

    private protected override double ExpansibilityUncertaintyCore(double differentialRatio, double isentropicExponent) =>
        (4 + (100 * Math.Pow(DiameterRatio, 8))) / 100 * differentialRatio;

    private protected override double LossRatioCore(double reynolds) => 0.20;

    private protected override Applicability LimitsCore(in MeterGeometry geometry, double reynolds) => Applicability.Inside
        .Check(ApplicabilityLimits.Reynolds, reynolds, 1.5e5, 2e6)
        .Check(ApplicabilityLimits.DiameterRatio, geometry.DiameterRatio, 0.316, 0.775)
        .Check(ApplicabilityLimits.Bore, geometry.PipeDiameter, 0.065, 0.500)
        .Check(ApplicabilityLimits.ThroatDiameter, geometry.ThroatDiameter, 0.050, double.PositiveInfinity);
}
