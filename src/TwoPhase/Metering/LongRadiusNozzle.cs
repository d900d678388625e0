using TwoPhase.Flow;
using UnitsNet;

namespace TwoPhase.Metering;

/// <summary>Long-radius nozzle, of high or low ratio, to ISO 5167-3.</summary>
/// <remarks>
/// <para>C = 0.9965 − 0.00653 √(10⁶ β/Re), β diameter ratio [-], Re pipe Reynolds number [-].</para>
/// <para>Range: 50 mm ≤ D ≤ 630 mm, 0.2 ≤ β ≤ 0.8, 10⁴ ≤ Re ≤ 10⁷; p2/p1 ≥ 0.75.</para>
/// <para>Accuracy: with k = 2, C 2 %; ε 2 Δp/p1 %.</para>
/// <para>Source: ISO 5167-3:2003, 5.2.</para>
/// </remarks>
public sealed class LongRadiusNozzle : PrimaryElement
{
    /// <summary>A long-radius nozzle.</summary>
    /// <param name="pipe">D, bore of the pipe, greater than zero.</param>
    /// <param name="throat">d, diameter of the throat, greater than zero and below the bore.</param>
    /// <exception cref="ArgumentOutOfRangeException">A diameter is outside its limits.</exception>
    public LongRadiusNozzle(Length pipe, Length throat)
        : base(pipe, throat, "Throat diameter", nameof(throat))
    {
    }

    /// <inheritdoc/>
    public override string Name => "long-radius nozzle";

    internal override bool CoefficientDependsOnReynolds => true;

    internal override CoefficientLaw LawOf(in MeterGeometry geometry) =>
        CoefficientLaw.Power(0.9965, -0.00653 * Math.Sqrt(geometry.DiameterRatio), 0.5);

    internal override double ExpansibilityCore(in MeterGeometry geometry, double pressure, double differential, double isentropicExponent) =>
        Metering.Expansibility.Nozzle(geometry.DiameterRatio, pressure, differential, isentropicExponent);

    private protected override double CoefficientUncertaintyCore(double reynolds) => 0.02;

    private protected override double ExpansibilityUncertaintyCore(double differentialRatio, double isentropicExponent) => 0.02 * differentialRatio;

    private protected override double LossRatioCore(double reynolds) => LossWithoutDiffuser(reynolds);

    private protected override Applicability LimitsCore(in MeterGeometry geometry, double reynolds) => Applicability.Inside
        .Check(ApplicabilityLimits.Reynolds, reynolds, 1e4, 1e7)
        .Check(ApplicabilityLimits.DiameterRatio, geometry.DiameterRatio, 0.2, 0.8)
        .Check(ApplicabilityLimits.Bore, geometry.PipeDiameter, 0.050, 0.630);
}
