using MathNet.Numerics.Statistics;
using TwoPhase.Advisory;
using TwoPhase.Tests.Support;
using static TwoPhase.Tests.Advisory.Plants;

namespace TwoPhase.Tests.Advisory;

/// <summary>Histories of an independent model of the same pass, whose heat profile and slip differ from the estimator's.</summary>
public class ScenarioEstimateTests
{
    // The raw reading's errors are those stated with the files; the estimate's are what a coarse observer reaches, so this must do better.
    [Theory]
    [InlineData("steady", 0.0065, 0.001, 0.004)]
    [InlineData("firing-step-up", 0.024, 0.003, 0.015)]
    [InlineData("feed-warms", 0.025, 0.003, 0.013)]
    public void Update_ThroughATransient_FollowsTheTruth(string name, double raw, double rms, double worst)
    {
        Sample[] samples = Replay(name);
        Approx.Relative(raw, samples.Select(sample => sample.Indicated - sample.Truth).RootMeanSquare(), 0.05, "raw reading");
        double[] errors = [.. samples.Select(sample => sample.Estimate.RawQuality - sample.Truth)];
        Assert.True(errors.RootMeanSquare() <= rms, $"rms {errors.RootMeanSquare():F5}");
        Assert.True(errors.Select(Math.Abs).Max() <= worst, $"worst {errors.Select(Math.Abs).Max():F4}");
        Assert.DoesNotContain(samples, sample => sample.Estimate.Trust is Trust.Disagreement or Trust.InputFault or Trust.Unknown);

        double covered = samples.Average(sample => Math.Abs(sample.Estimate.RawQuality - sample.Truth) <= 2 * sample.Estimate.RawMotion ? 1.0 : 0);
        Assert.InRange(covered, 0.90, 1);
        Assert.True(samples.Average(sample => sample.Estimate.RawMotion) <= 2 * errors.RootMeanSquare(), "stated uncertainty");
    }

    // A false reading is called so, and a true one is not.
    [Theory]
    [InlineData("firing-step-up"), InlineData("feed-warms")]
    public void Update_WhileTheHoldupMoves_SaysThatTheReadingIsHigh(string name)
    {
        Sample[] samples = Replay(name);
        Assert.All(samples.Where(sample => sample.Estimate.Trust == Trust.Believable), sample => Assert.InRange(Math.Abs(sample.Indicated - sample.Truth), 0, 0.045));
        double high = samples.Count(sample => sample.Estimate.Trust == Trust.ReadsHigh), believed = samples.Count(sample => sample.Estimate.Trust == Trust.Believable);
        Assert.InRange(high, 200, 600);
        Assert.True(believed > 0.7 * (samples.Length - high), $"{believed} of {samples.Length}");
        Sample first = samples.First(sample => sample.Estimate.Trust == Trust.ReadsHigh);
        Assert.InRange(first.Estimate.ExpectedWait!.Value.Seconds, 100, 500);
        Assert.Equal(EstimateReasonKind.HoldupMotion, samples.Where(sample => sample.Estimate.Trust == Trust.ReadsHigh).Skip(20).First().Estimate.FirstReason.Kind);
    }

    // From one pass a drift of the meter and one of the heat look the same: both are called before they are half done, and the truth lies between the ends.
    [Theory]
    [InlineData("meter-drift"), InlineData("heat-drift")]
    public void Update_DriftOfMeterOrHeat_IsCalledAndHeldBetweenBothEnds(string name)
    {
        Sample[] samples = Replay(name);
        Assert.DoesNotContain(samples, sample => sample.Time < 600 && sample.Estimate.Trust == Trust.Disagreement);
        Assert.All(samples.Where(sample => sample.Time >= 1800), sample => Assert.Equal(Trust.Disagreement, sample.Estimate.Trust));
        Assert.NotNull(samples[^1].Estimate.DisagreesSince);
        double inside = samples.Average(sample => IsBetweenEnds(sample) ? 1.0 : 0);
        Assert.True(inside > 0.95, $"{inside:P1} between the ends");
        Sample last = samples[^1];
        (double right, double wrong) = name == "meter-drift" ? (last.Estimate.RawIfHeat, last.Estimate.RawIfMeter) : (last.Estimate.RawIfMeter, last.Estimate.RawIfHeat);
        Approx.Absolute(last.Truth, right, 0.004, "the end that is true");
        Assert.True(Math.Abs(wrong - last.Truth) > 0.05);
    }

    private static bool IsBetweenEnds(Sample sample)
    {
        double a = sample.Estimate.RawIfMeter, b = sample.Estimate.RawIfHeat, twice = 2 * sample.Estimate.RawEnds;
        return sample.Truth >= Math.Min(a, b) - twice && sample.Truth <= Math.Max(a, b) + twice;
    }

    private static Sample[] Replay(string name)
    {
        var estimator = new QualityEstimator(KnownPass, Meter);
        ReferenceTable table = ReferenceTable.Load($"Advisory/Data/{name}.csv");
        return
        [
            .. table.Rows.Select(row =>
            {
                QualityEstimate estimate = estimator.Update(Format.Read(Midnight.AddSeconds(row["time_s"]), row["feed_flow_kg_s"], row["feed_temperature_C"], row["firing_percent"], row["outlet_pressure_MPa_abs"], row["venturi_dp_kPa"]));
                return new Sample(row["time_s"], estimate, estimate.RawIndicated, row["quality_true"]);
            }).Where(sample => sample.Time >= 300),
        ];
    }

    private sealed record Sample(double Time, QualityEstimate Estimate, double Indicated, double Truth);
}
