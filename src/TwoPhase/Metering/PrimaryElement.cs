using TwoPhase.Flow;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Metering;

/// <summary>A differential-pressure meter whose shape gives its constant: orifice plate, nozzle or Venturi tube to ISO 5167.</summary>
/// <remarks>
/// <para>ṁ = C ε E A √(2 ρ Δp), E = 1/√(1 − β⁴), A = π d²/4, β = d/D (ISO 5167-1:2003, 5.1).</para>
/// <para>Diameters are those at working temperature unless <see cref="MeasuredCold"/> says otherwise.</para>
/// <para>Uncertainties are relative and expanded with k = 2, as the standard prints them; they hold inside the limits of <see cref="Check(double)"/>,
/// with the straight lengths, the roughness and the edges that the standard asks for.</para>
/// </remarks>
public abstract partial class PrimaryElement : DifferentialPressureMeter
{
    private MeterGeometry _geometry;

    private protected PrimaryElement(Length pipe, Length throat, string throatName, string throatParameter)
    {
        double pipeDiameter = Require.Positive(pipe.Si(), "Pipe diameter", Scale.Millimetres, nameof(pipe));
        double throatDiameter = Require.Positive(throat.Si(), throatName, Scale.Millimetres, throatParameter);
        if (throatDiameter >= pipeDiameter)
            throw Require.OutOfRange(throatDiameter, throatName, Scale.Millimetres, throatParameter, $"must be below the pipe diameter {Scale.Millimetres.Text(pipeDiameter)}");
        _geometry = new MeterGeometry(pipeDiameter, throatDiameter);
    }

    /// <summary>D, bore of the pipe upstream of the element.</summary>
    public Length PipeDiameter => Length.FromMeters(_geometry.PipeDiameter);

    /// <summary>d, diameter of the throat, or the bore of an orifice plate.</summary>
    public Length ThroatDiameter => Length.FromMeters(_geometry.ThroatDiameter);

    /// <summary>β = d/D [-], between 0 and 1.</summary>
    public double DiameterRatio => _geometry.DiameterRatio;

    /// <summary>E = 1/√(1 − β⁴), velocity-of-approach factor [-].</summary>
    public double VelocityOfApproachFactor => _geometry.FlowArea / (Math.PI / 4 * _geometry.ThroatDiameter * _geometry.ThroatDiameter);

    /// <summary>C, discharge coefficient in single-phase flow [-].</summary>
    /// <param name="reynolds">Re, Reynolds number of the pipe 4 ṁ/(π D μ), greater than zero; infinity is the limit.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="reynolds"/> is not greater than zero.</exception>
    public double DischargeCoefficient(double reynolds) => _calibration * LawOf(_geometry).At(MeterArguments.Reynolds(reynolds, nameof(reynolds)));

    /// <summary>Relative expanded uncertainty (k = 2) of <see cref="DischargeCoefficient"/>.</summary>
    /// <param name="reynolds">Re, Reynolds number of the pipe, greater than zero.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="reynolds"/> is not greater than zero.</exception>
    public Ratio DischargeCoefficientUncertainty(double reynolds) =>
        Ratio.FromDecimalFractions(CoefficientUncertaintyCore(MeterArguments.Reynolds(reynolds, nameof(reynolds))));

    /// <summary>ε, expansibility factor [-]: 1 for a liquid, less for a gas or steam.</summary>
    /// <param name="pressure">p1, absolute pressure at the upstream tapping, greater than zero.</param>
    /// <param name="differential">Δp, greater than zero and below the pressure.</param>
    /// <param name="isentropicExponent">κ, above 1: w²/(p v) for steam, never cp/cv.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is outside its limits.</exception>
    public double Expansibility(Pressure pressure, Pressure differential, double isentropicExponent)
    {
        (double p, double dp) = MeterArguments.Pressures(pressure, differential);
        return ExpansibilityCore(_geometry, p, dp, MeterArguments.IsentropicExponent(isentropicExponent, nameof(isentropicExponent)));
    }

    /// <summary>Relative expanded uncertainty (k = 2) of <see cref="Expansibility"/>.</summary>
    /// <param name="pressure">p1, absolute pressure at the upstream tapping, greater than zero.</param>
    /// <param name="differential">Δp, greater than zero and below the pressure.</param>
    /// <param name="isentropicExponent">κ, above 1.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is outside its limits.</exception>
    public Ratio ExpansibilityUncertainty(Pressure pressure, Pressure differential, double isentropicExponent)
    {
        (double p, double dp) = MeterArguments.Pressures(pressure, differential);
        return Ratio.FromDecimalFractions(ExpansibilityUncertaintyCore(dp / p, MeterArguments.IsentropicExponent(isentropicExponent, nameof(isentropicExponent))));
    }

    /// <summary>Pressure that is not recovered downstream of the element.</summary>
    /// <param name="differential">Δp between the tappings, not negative.</param>
    /// <param name="reynolds">Re, Reynolds number of the pipe, greater than zero.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is outside its limits.</exception>
    public Pressure PermanentPressureLoss(Pressure differential, double reynolds)
    {
        double dp = Require.NotNegative(differential.Si(), "Differential pressure", Scale.Kilopascals, nameof(differential));
        return Pressure.FromPascals(dp * LossRatioCore(MeterArguments.Reynolds(reynolds, nameof(reynolds))));
    }

    /// <summary>Whether the element is used inside the limits of its standard: diameters, diameter ratio and Reynolds number.</summary>
    /// <param name="reynolds">Re, Reynolds number of the pipe, greater than zero.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="reynolds"/> is not greater than zero.</exception>
    public Applicability Check(double reynolds) => LimitsCore(_geometry, MeterArguments.Reynolds(reynolds, nameof(reynolds)));

    internal override MeterGeometry GeometryAt(double temperature) => Grown(temperature).WithFlowFactor(_calibration);

    internal sealed override Applicability CheckCore(in MeterGeometry geometry, double reynolds, double pressureRatio) =>
        LimitsCore(geometry, reynolds).Check(ApplicabilityLimits.PressureRatio, pressureRatio, 0.75, 1);

    private protected abstract double CoefficientUncertaintyCore(double reynolds);

    private protected abstract double ExpansibilityUncertaintyCore(double differentialRatio, double isentropicExponent);

    private protected abstract double LossRatioCore(double reynolds);

    private protected abstract Applicability LimitsCore(in MeterGeometry geometry, double reynolds);

    /// <summary>Loss of an element without diffuser over its differential, ISO 5167-2:2003, 5.4, eq. (7), and ISO 5167-3:2003, 5.1.8.</summary>
    private protected double LossWithoutDiffuser(double reynolds)
    {
        double c = LawOf(_geometry).At(reynolds), beta2 = DiameterRatio * DiameterRatio;
        double root = Math.Sqrt(1 - (beta2 * beta2 * (1 - (c * c))));
        return (root - (c * beta2)) / (root + (c * beta2));
    }
}
