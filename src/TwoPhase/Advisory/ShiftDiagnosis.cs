using TwoPhase.Passes;
using TwoPhase.Steam;
using TwoPhase.Units;

namespace TwoPhase.Advisory;

/// <summary>What the shift of one pass against its base may be: each cause with the quality that it would mean, and how well it explains what else is measured.</summary>
/// <remarks>
/// <para>Each cause explains the outlet meter by itself. Heat: the meter's quality. Meter: the quality of the heat as it was. Feed flow and leak: the flow at which the heat as it was gives the measured
/// differential; the leak is taken to be at the inlet. Each then foretells the witnesses, and χ² = Σ((measured − foretold)/u)²; likelihood exp(−χ²/2) against the best. u: pressure drop
/// 1.5 %, metal excess 5 %, outlet temperature 1 K, the others as given.</para>
/// <para>A cause is named when no other is likelier than one twentieth of it. Without witnesses none is.</para>
/// <para>Source: likelihood of normal errors; the balances of a pass at rest.</para>
/// <para>A leak is dangerous, and this is no leak detection: while it is among the likely causes, take its quality for the true one, and follow the plant's procedure.</para>
/// </remarks>
public sealed class ShiftDiagnosis
{
    private const double Unlikely = 0.05, DropUncertainty = 0.015, MetalUncertainty = 0.05, TemperatureUncertainty = 1;

    private ShiftDiagnosis(IReadOnlyList<ShiftCandidate> candidates, IReadOnlyList<ShiftWitness> witnesses, bool isPressureDoubtful)
    {
        (Candidates, Witnesses, IsOutletPressureDoubtful) = (candidates, witnesses, isPressureDoubtful);
        Named = candidates.Count > 1 && candidates[1].RelativeLikelihood >= Unlikely || candidates.Count == 0 ? ShiftCause.None : candidates[0].Cause;
    }

    /// <summary>The causes, the likeliest first.</summary>
    public IReadOnlyList<ShiftCandidate> Candidates { get; }

    /// <summary>The cause, where the witnesses leave one; else <see cref="ShiftCause.None"/>: not separable.</summary>
    public ShiftCause Named { get; }

    /// <summary>The witnesses that were used.</summary>
    public IReadOnlyList<ShiftWitness> Witnesses { get; }

    /// <summary>Whether the outlet temperature is none that boiling water has at the outlet pressure: the pressure tag is in doubt, and with it all that follows.</summary>
    public bool IsOutletPressureDoubtful { get; }

    /// <summary>The highest quality among causes that are not unlikely: what safety counts with.</summary>
    public UnitsNet.MassFraction HighestQuality => UnitsNet.MassFraction.FromDecimalFractions(Candidates.Where(one => one.RelativeLikelihood >= Unlikely).Select(one => one.RawQuality).DefaultIfEmpty(1).Max());

    /// <summary>The causes of the shift of a pass, as its generator's estimator has it.</summary>
    /// <param name="estimator">The estimator, after its last reading.</param>
    /// <param name="pass">Index of the pass.</param>
    /// <param name="witnesses">What else is measured; null for nothing.</param>
    /// <returns>Null while the pass is not known, or moves.</returns>
    /// <exception cref="ArgumentOutOfRangeException">There is no such pass.</exception>
    public static ShiftDiagnosis? Of(GeneratorEstimator estimator, int pass, ShiftWitnesses? witnesses = null)
    {
        Require.Within(pass, 0, Require.NotNull(estimator, nameof(estimator)).Estimators.Count - 1, "Pass", Scale.None, nameof(pass));
        witnesses ??= ShiftWitnesses.None;
        QualityEstimator shifted = estimator.Estimators[pass];
        if (!shifted.IsAtRest || shifted.Conditions is not { } now) return null;
        Others others = Others.Of(estimator, pass);
        (ShiftCause Cause, double Quality, double Flow, double Heat)[] causes = [.. shifted.Explanations().Where(one => Numerics.Fast.IsFinite(one.Quality) && Numerics.Fast.IsFinite(one.Flow))];
        List<ShiftWitness> used = [];
        double[] misfits = [.. causes.Select(_ => 0.0)];

        Weigh(ShiftWitness.PressureDrop, MeasuredDrop(), cause => Math.Log(HealthFigures.ModelDrop(shifted, now with { RawFeedFlow = cause.Flow, RawAbsorbedHeat = cause.Heat })), DropUncertainty);
        Weigh(ShiftWitness.MetalTemperature, MeasuredMetal(), cause => Math.Log(cause.Heat), MetalUncertainty);
        Weigh(ShiftWitness.SeparatorQuality, witnesses.SeparatorQuality.Value, cause => (others.Steam + (cause.Flow * cause.Quality)) / (others.Flow + cause.Flow), witnesses.SeparatorQuality.Uncertainty);
        Weigh(ShiftWitness.SeparatorFlow, witnesses.SeparatorFlow.Value, cause => others.Flow + cause.Flow, witnesses.SeparatorFlow.Uncertainty);
        Weigh(ShiftWitness.TotalFeed, witnesses.TotalFeed.Value, cause => others.Flow + (cause.Cause == ShiftCause.FeedFlow ? cause.Flow : now.RawFeedFlow), witnesses.TotalFeed.Uncertainty);

        double boils = SaturationLine.Temperature(now.RawOutletPressure);
        if (!double.IsNaN(witnesses.OutletTemperature)) used.Add(ShiftWitness.OutletTemperature);
        double best = misfits.DefaultIfEmpty(0).Min();
        return new([.. causes.Select((cause, i) => new ShiftCandidate(cause.Cause, cause.Quality, cause.Flow, Math.Exp((best - misfits[i]) / 2))).OrderByDescending(one => one.RelativeLikelihood)], used, Math.Abs(witnesses.OutletTemperature - boils) > 3 * TemperatureUncertainty);

        // What the model would have to give now, were friction and wall as they were.
        double MeasuredDrop() => Math.Log((witnesses.Now?.RawFriction ?? double.NaN) / (witnesses.Baseline?.RawFriction ?? double.NaN) * HealthFigures.ModelDrop(shifted, now));
        double MeasuredMetal() => Math.Log((witnesses.Now?.RawMetal ?? double.NaN) / (witnesses.Baseline?.RawMetal ?? double.NaN) * now.RawAbsorbedHeat);

        void Weigh(ShiftWitness witness, double measured, Func<(ShiftCause Cause, double Quality, double Flow, double Heat), double> foretold, double uncertainty)
        {
            if (double.IsNaN(measured)) return;
            used.Add(witness);
            for (int i = 0; i < causes.Length; i++)
            {
                double off = (measured - foretold(causes[i])) / uncertainty;
                misfits[i] += double.IsNaN(off) ? 0 : off * off;
            }
        }
    }

    /// <summary>What the other passes give, as they are estimated [kg/s].</summary>
    private readonly record struct Others(double Flow, double Steam)
    {
        public static Others Of(GeneratorEstimator estimator, int pass)
        {
            double flow = 0, steam = 0;
            for (int i = 0; i < estimator.Estimators.Count; i++)
            {
                if (i == pass) continue;
                double own = estimator.Estimators[i].Conditions?.RawFeedFlow ?? double.NaN;
                flow += own;
                steam += own * estimator.Estimates[i].RawQuality;
            }

            return new(flow, steam);
        }
    }

    internal object ToDump() => ToString();

    /// <summary>The causes in lines, invariant culture.</summary>
    public override string ToString() => $"{(Named == ShiftCause.None ? "not separable" : Named)} by {(Witnesses.Count == 0 ? "no witness" : string.Join(", ", Witnesses))}{string.Concat(Candidates.Select(one => Environment.NewLine + one))}";
}
