using TwoPhase.Flow;
using UnitsNet;

namespace TwoPhase.Metering;

/// <summary>Square-edged concentric orifice plate to ISO 5167-2, with the coefficient of Reader-Harris and Gallagher (1998).</summary>
/// <remarks>
/// <para>C = 0.5961 + 0.0261 β² − 0.216 β⁸ + 0.000521 (10⁶ β/Re)^0.7 + (0.0188 + 0.0063 A) β^3.5 (10⁶/Re)^0.3
/// + (0.043 + 0.080 e^(−10 L1) − 0.123 e^(−7 L1)) (1 − 0.11 A) β⁴/(1 − β⁴) − 0.031 (M2 − 0.8 M2^1.1) β^1.3, and
/// + 0.011 (0.75 − β)(2.8 − D/25.4 mm) for D below 71.12 mm; A = (19000 β/Re)^0.8, M2 = 2 L2/(1 − β).</para>
/// <para>L1, L2 distances of the tappings over D [-]: 0 and 0 at the corners; 1 and 0.47 at D and D/2; 25.4 mm/D for flange tappings. Re pipe Reynolds number [-].</para>
/// <para>Range: d ≥ 12.5 mm, 50 mm ≤ D ≤ 1000 mm, 0.1 ≤ β ≤ 0.75; Re ≥ 5000 for β ≤ 0.56 and ≥ 16000 β² above (corner, D and D/2); Re ≥ 5000 and
/// ≥ 170 β² D/mm (flange); p2/p1 ≥ 0.75.</para>
/// <para>Accuracy: with k = 2, C (0.7 − β) % below β = 0.2, 0.5 % to 0.6, (1.667 β − 0.5) % above; more for D below 71.12 mm, 0.9 (0.75 − β)(2.8 − D/25.4 mm) %,
/// and 0.5 % more for β above 0.5 with Re below 10⁴; ε 3.5 Δp/(κ p1) %.</para>
/// <para>Source: ISO 5167-2:2003, 5.3 and 5.4.</para>
/// </remarks>
public sealed class OrificePlate : PrimaryElement
{
    private const double Inch = 0.0254, SmallPipe = 0.07112;

    private static readonly double NineteenThousand = Math.Pow(19000 / 1e6, 0.8);   // of A, once 10⁶/Re is taken out

    /// <summary>A square-edged orifice plate.</summary>
    /// <param name="pipe">D, bore of the pipe, greater than zero.</param>
    /// <param name="bore">d, bore of the plate, greater than zero and below that of the pipe.</param>
    /// <param name="tappings">Where the pressure is taken.</param>
    /// <exception cref="ArgumentOutOfRangeException">A diameter is outside its limits, or the tappings are none of the three.</exception>
    public OrificePlate(Length pipe, Length bore, OrificeTappings tappings)
        : base(pipe, bore, "Orifice bore", nameof(bore)) =>
        Tappings = tappings is OrificeTappings.Corner or OrificeTappings.DiameterAndHalf or OrificeTappings.Flange
            ? tappings
            : throw new ArgumentOutOfRangeException(nameof(tappings), tappings, "The tappings must be one of the three of ISO 5167-2.");

    /// <inheritdoc/>
    public override string Name => "orifice plate";

    /// <summary>Where the pressure is taken.</summary>
    public OrificeTappings Tappings { get; }

    internal override bool CoefficientDependsOnReynolds => true;

    internal override CoefficientLaw LawOf(in MeterGeometry geometry)
    {
        double b = geometry.DiameterRatio, b2 = b * b, b4 = b2 * b2, b35 = b2 * b * Math.Sqrt(b);
        double tenth = Math.Pow(b, 0.1), b03 = tenth * tenth * tenth, b07 = b03 * b03 * tenth;   // β^0.1, β^0.3, β^0.7
        double pipe = geometry.PipeDiameter;
        (double l1, double l2) = Tappings switch
        {
            OrificeTappings.Corner => (0.0, 0.0),
            OrificeTappings.DiameterAndHalf => (1.0, 0.47),
            _ => (Inch / pipe, Inch / pipe),
        };
        double a = NineteenThousand * tenth * b07, m2 = 2 * l2 / (1 - b);   // A over (10⁶/Re)^0.8
        double upstream = (0.043 + (0.080 * Math.Exp(-10 * l1)) - (0.123 * Math.Exp(-7 * l1))) * b4 / (1 - b4);
        double downstream = -0.031 * (m2 - (0.8 * Math.Pow(m2, 1.1))) * b * b03;
        double small = pipe < SmallPipe ? 0.011 * (0.75 - b) * (2.8 - (pipe / Inch)) : 0;
        return CoefficientLaw.Tenths(
            0.5961 + (0.0261 * b2) - (0.216 * b4 * b4) + upstream + downstream + small,
            0.0188 * b35,
            0.000521 * b07,
            -0.11 * upstream * a,
            0.0063 * a * b35);
    }

    internal override double ExpansibilityCore(in MeterGeometry geometry, double pressure, double differential, double isentropicExponent) =>
        Metering.Expansibility.Orifice(geometry.DiameterRatio, pressure, differential, isentropicExponent);

    private protected override double CoefficientUncertaintyCore(double reynolds)
    {
        double b = DiameterRatio, pipe = PipeDiameter.Meters;
        double percent = b < 0.2 ? 0.7 - b : b <= 0.6 ? 0.5 : (1.667 * b) - 0.5;
        if (pipe < SmallPipe) percent += 0.9 * (0.75 - b) * (2.8 - (pipe / Inch));
        if (b > 0.5 && reynolds < 1e4) percent += 0.5;
        return percent / 100;
    }

    private protected override double ExpansibilityUncertaintyCore(double differentialRatio, double isentropicExponent) =>
        3.5 / 100 * differentialRatio / isentropicExponent;

    private protected override double LossRatioCore(double reynolds) => LossWithoutDiffuser(reynolds);

    private protected override Applicability LimitsCore(in MeterGeometry geometry, double reynolds)
    {
        double b = geometry.DiameterRatio;
        double lowestReynolds = Tappings == OrificeTappings.Flange
            ? Math.Max(5000, 170 * b * b * geometry.PipeDiameter * 1e3)
            : b <= 0.56 ? 5000 : 16000 * b * b;
        return Applicability.Inside
            .Check(ApplicabilityLimits.Reynolds, reynolds, lowestReynolds, double.PositiveInfinity)
            .Check(ApplicabilityLimits.DiameterRatio, b, 0.1, 0.75)
            .Check(ApplicabilityLimits.Bore, geometry.PipeDiameter, 0.050, 1.000)
            .Check(ApplicabilityLimits.ThroatDiameter, geometry.ThroatDiameter, 0.0125, double.PositiveInfinity);
    }
}
