using MathNet.Numerics.Statistics;
using TwoPhase.Advisory;

namespace TrueQuality;

/// <summary>One trial with what the estimator made of it, from 300 s on.</summary>
internal sealed class Outcome
{
    public const int From = 300;

    private Outcome(Trial trial, QualityEstimate[] estimates, double[] truth) => (Trial, Estimates, Truth) = (trial, estimates, truth);

    public Trial Trial { get; }

    public IReadOnlyList<QualityEstimate> Estimates { get; }

    public double[] Truth { get; }

    public double ReadingRms => Errors(Indicated).RootMeanSquare();

    public double EstimateRms => Errors(Estimated).RootMeanSquare();

    public double ReadingWorst => Errors(Indicated).Select(Math.Abs).Max();

    public double EstimateWorst => Errors(Estimated).Select(Math.Abs).Max();

    /// <summary>Share of the time in which the truth is within two standard uncertainties.</summary>
    public double Covered => Enumerable.Range(From, Truth.Length - From).Average(t => Math.Abs(Estimated(t) - Truth[t]) <= 2 * Estimates[t].Motion!.Value.DecimalFractions ? 1.0 : 0);

    /// <summary>When it first said that plant and model disagree [s]; null for never.</summary>
    public int? DisagreesFrom => Enumerable.Range(From, Truth.Length - From).Cast<int?>().FirstOrDefault(t => Estimates[t!.Value].Trust == Trust.Disagreement);

    /// <summary>For how long it called the reading false [s].</summary>
    public int CalledFalse => Estimates.Count(static estimate => estimate.Trust is Trust.ReadsHigh or Trust.ReadsLow);

    public static Outcome Of(Trial trial)
    {
        var estimator = new QualityEstimator(Plant.KnownPass, Plant.Meter);
        List<QualityEstimate> estimates = new(trial.Seconds);
        List<double> truth = new(trial.Seconds);
        foreach ((TwoPhase.Metering.PassReading reading, double quality) in Plant.Run(trial))
        {
            estimates.Add(estimator.Update(reading));
            truth.Add(quality);
        }

        return new(trial, [.. estimates], [.. truth]);
    }

    public double Indicated(int t) => Estimates[t].IndicatedQuality?.DecimalFractions ?? double.NaN;

    public double Estimated(int t) => Estimates[t].Quality?.DecimalFractions ?? double.NaN;

    /// <summary>One end of the pair, where plant and model disagree.</summary>
    public double End(int t, bool meterIsRight)
    {
        QualityEstimate estimate = Estimates[t];
        return estimate.Trust != Trust.Disagreement ? double.NaN : (meterIsRight ? estimate.QualityIfMeterIsRight : estimate.QualityIfHeatIsRight)!.Value.DecimalFractions;
    }

    private double[] Errors(Func<int, double> of) => [.. Enumerable.Range(From, Truth.Length - From).Select(t => of(t) - Truth[t])];
}
