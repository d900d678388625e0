using TwoPhase.Flow;
using UnitsNet;

namespace TwoPhase.Metering;

/// <summary>ISA 1932 nozzle to ISO 5167-3.</summary>
/// <remarks>
/// <para>C = 0.9900 − 0.2262 β^4.1 − (0.00175 β² − 0.0033 β^4.15)(10⁶/Re)^1.15, β diameter ratio [-], Re pipe Reynolds number [-].</para>
/// <para>Range: 50 mm ≤ D ≤ 500 mm, 0.3 ≤ β ≤ 0.8; 7·10⁴ ≤ Re ≤ 10⁷ for β below 0.44, 2·10⁴ ≤ Re ≤ 10⁷ above; p2/p1 ≥ 0.75.</para>
/// <para>Accuracy: with k = 2, C 0.8 % for β ≤ 0.6, (2 β − 0.4) % above; ε 2 Δp/p1 %.</para>
/// <para>Source: ISO 5167-3:2003, 5.1.</para>
/// </remarks>
public sealed class Isa1932Nozzle : PrimaryElement
{
    /// <summary>An ISA 1932 nozzle.</summary>
    /// <param name="pipe">D, bore of the pipe, greater than zero.</param>
    /// <param name="throat">d, diameter of the throat, greater than zero and below the bore.</param>
    /// <exception cref="ArgumentOutOfRangeException">A diameter is outside its limits.</exception>
    public Isa1932Nozzle(Length pipe, Length throat)
        : base(pipe, throat, "Throat diameter", nameof(throat))
    {
    }

    /// <inheritdoc/>
    public override string Name => "ISA 1932 nozzle";

    internal override bool CoefficientDependsOnReynolds => true;

    internal override CoefficientLaw LawOf(in MeterGeometry geometry)
    {
        double b = geometry.DiameterRatio;
        return CoefficientLaw.Power(0.9900 - (0.2262 * Math.Pow(b, 4.1)), (0.0033 * Math.Pow(b, 4.15)) - (0.00175 * b * b), 1.15);
    }

    internal override double ExpansibilityCore(in MeterGeometry geometry, double pressure, double differential, double isentropicExponent) =>
        Metering.Expansibility.Nozzle(geometry.DiameterRatio, pressure, differential, isentropicExponent);

    private protected override double CoefficientUncertaintyCore(double reynolds) => DiameterRatio <= 0.6 ? 0.008 : ((2 * DiameterRatio) - 0.4) / 100;

    private protected override double ExpansibilityUncertaintyCore(double differentialRatio, double isentropicExponent) => 0.02 * differentialRatio;

    private protected override double LossRatioCore(double reynolds) => LossWithoutDiffuser(reynolds);

    private protected override Applicability LimitsCore(in MeterGeometry geometry, double reynolds) => Applicability.Inside
        .Check(ApplicabilityLimits.Reynolds, reynolds, geometry.DiameterRatio < 0.44 ? 7e4 : 2e4, 1e7)
        .Check(ApplicabilityLimits.DiameterRatio, geometry.DiameterRatio, 0.3, 0.8)
        .Check(ApplicabilityLimits.Bore, geometry.PipeDiameter, 0.050, 0.500);
}
