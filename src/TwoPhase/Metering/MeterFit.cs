using System.Globalization;
using MathNet.Numerics.Distributions;
using TwoPhase.Uncertainty;
using UnitsNet;

namespace TwoPhase.Metering;

/// <summary>One parameter of a meter fitted to reference qualities, with its interval and what the fit leaves.</summary>
/// <remarks>An error that all references share, such as a separator that passes water, does not show in the residuals: it goes into the parameter. Add it to the uncertainty.</remarks>
public sealed partial class MeterFit
{
    private MeterFit(string parameter, double value, double standardUncertainty, double[] residuals, double deviation, FitWarnings warnings, QualityMeter meter)
    {
        Parameter = parameter;
        Value = value;
        StandardUncertainty = standardUncertainty;
        Residuals = Array.AsReadOnly(Array.ConvertAll(residuals, residual => MassFraction.FromDecimalFractions(residual)));
        ResidualDeviation = MassFraction.FromDecimalFractions(deviation);
        Warnings = warnings;
        Meter = meter;
    }

    /// <summary>What was fitted, with its unit.</summary>
    public string Parameter { get; }

    /// <summary>The best value: k in m², C and most model parameters without unit.</summary>
    public double Value { get; }

    /// <summary>Standard uncertainty of <see cref="Value"/> (k = 1) from the scatter of the residuals.</summary>
    public double StandardUncertainty { get; }

    /// <summary>Readings less one.</summary>
    public int DegreesOfFreedom => Residuals.Count - 1;

    /// <summary>Quality by the fitted meter less the reference, reading by reading.</summary>
    public IReadOnlyList<MassFraction> Residuals { get; }

    /// <summary>Standard deviation of the residuals about the fit: how far one reading is from its reference, by both of their errors.</summary>
    public MassFraction ResidualDeviation { get; }

    /// <summary>What the fit must be read with.</summary>
    public FitWarnings Warnings { get; }

    /// <summary>The meter with the parameter at its best value. Its <see cref="QualityMeter.ModelUncertainty"/> is what scatter and parameter leave, at least 0.5 %: in a budget take constant or coefficient as exact beside it.</summary>
    public QualityMeter Meter { get; }

    /// <summary>Confidence interval of the parameter, by Student's t.</summary>
    /// <param name="probability">Confidence, between 0 and 1; 0.95 by default.</param>
    public CoverageInterval Interval(double probability = 0.95)
    {
        double half = StudentT.InvCDF(0, 1, DegreesOfFreedom, 0.5 + (CoverageInterval.Probability(probability) / 2)) * StandardUncertainty;
        return new(Value - half, Value + half, probability);
    }

    internal object ToDump() => ToString();

    /// <summary>The fit in one line.</summary>
    public override string ToString() => string.Format(
        CultureInfo.InvariantCulture,
        "{0} = {1:G6}, {2}; {3} readings, residual deviation {4:F4}{5}",
        Parameter, Value, Interval(), Residuals.Count, ResidualDeviation.DecimalFractions, Warnings == FitWarnings.None ? "" : ", " + Warnings);
}
