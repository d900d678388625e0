using TwoPhase.Metering;
using TwoPhase.Passes;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Advisory;

/// <summary>How a quality is estimated, by what each number means. Immutable; each <c>With…</c> method returns a changed copy.</summary>
public sealed class EstimatorOptions
{
    private const int FewestCells = 20, MostCells = 400;

    private TagReporting[] _reporting = [.. Enumerable.Repeat(TagReporting.Sampled, PassSignals.Count)];

    /// <summary>The defaults.</summary>
    public static EstimatorOptions Default { get; } = new();

    /// <summary>The correlations of the shadow.</summary>
    public PassModels Models { get; private set; } = PassModels.Default;

    /// <summary>Cells of the shadow: 60. Its cost goes with the square.</summary>
    public int Cells { get; private set; } = 60;

    /// <summary>The site's own limit of quality: 80 %, for plain bore (common practice, no source). The site must confirm it.</summary>
    public MassFraction QualityLimit => MassFraction.FromDecimalFractions(RawQualityLimit);

    /// <summary>How far a reading may be from the truth and still be believed: 2 points.</summary>
    public MassFraction Tolerance => MassFraction.FromDecimalFractions(RawTolerance);

    /// <summary>Noise of the differential from sample to sample, relative standard deviation: 0.6 %.</summary>
    public Ratio DifferentialNoise => Ratio.FromDecimalFractions(RawDifferentialNoise);

    /// <summary>Noise of the feed flow from sample to sample, relative standard deviation: 0.3 %. Counts where the flow is reported by exception.</summary>
    public Ratio FeedFlowNoise => Ratio.FromDecimalFractions(RawFlowNoise);

    /// <summary>How far the heat per firing is expected to wander in an hour, relative standard deviation: 0.25 %.</summary>
    public Ratio HeatWander => Ratio.FromDecimalFractions(RawHeatWander);

    /// <summary>Lasting change of the heat, or what a change of meter or feed flow looks like in it, beyond which plant and model disagree: 1.5 %.</summary>
    public Ratio DisagreementLimit => Ratio.FromDecimalFractions(RawDisagreementLimit);

    /// <summary>For how long the estimate goes on without an input before it no longer knows: 10 min.</summary>
    public Duration CoastTime => Duration.FromSeconds(RawCoastTime);

    /// <summary>For how long a sampled signal may stand unchanged before it is called frozen: 10 min. One reported by exception is judged by its own longest silence.</summary>
    public Duration LongestSilence => Duration.FromSeconds(RawLongestSilence);

    /// <summary>Lag of the feed-temperature sensor, made good by its trend: 12 s.</summary>
    public Duration FeedTemperatureLag => Duration.FromSeconds(RawFeedTemperatureLag);

    /// <summary>Lag of the differential behind the feed flow: 1 s.</summary>
    public Duration DifferentialLag => Duration.FromSeconds(RawDifferentialLag);

    /// <summary>What the instruments are uncertain by; null for feed flow 0.5 %, differential 0.5 %, pressure 20 kPa, and the element's and model's own.</summary>
    public MeteringUncertainty? Metering { get; private set; }

    internal double RawQualityLimit { get; private set; } = 0.80;

    internal double RawTolerance { get; private set; } = 0.02;

    internal double RawDifferentialNoise { get; private set; } = 0.006;

    internal double RawFlowNoise { get; private set; } = 0.003;

    internal double RawHeatWander { get; private set; } = 0.0025;

    internal double RawDisagreementLimit { get; private set; } = 0.015;

    internal double RawCoastTime { get; private set; } = 600;

    internal double RawLongestSilence { get; private set; } = 600;

    internal double RawFeedTemperatureLag { get; private set; } = 12;

    internal double RawDifferentialLag { get; private set; } = 1;

    /// <summary>With other correlations.</summary>
    /// <param name="models">The correlations.</param>
    public EstimatorOptions WithModels(PassModels models)
    {
        Require.NotNull(models, nameof(models));
        return Changed(copy => copy.Models = models);
    }

    /// <summary>With another number of cells.</summary>
    /// <param name="cells">20 to 400.</param>
    /// <exception cref="ArgumentOutOfRangeException">The number is outside its limits.</exception>
    public EstimatorOptions WithCells(int cells)
    {
        Require.Within(cells, FewestCells, MostCells, "Number of cells", Scale.None, nameof(cells));
        return Changed(copy => copy.Cells = cells);
    }

    /// <summary>With the site's own limit of quality.</summary>
    /// <param name="limit">0 to 1.</param>
    /// <exception cref="ArgumentOutOfRangeException">The limit is outside 0 to 1.</exception>
    public EstimatorOptions WithQualityLimit(MassFraction limit)
    {
        double value = Require.Within(limit.Si(), 0, 1, "Quality limit", Scale.None, nameof(limit));
        return Changed(copy => copy.RawQualityLimit = value);
    }

    /// <summary>With another tolerance.</summary>
    /// <param name="tolerance">Greater than zero.</param>
    /// <exception cref="ArgumentOutOfRangeException">The tolerance is not greater than zero.</exception>
    public EstimatorOptions WithTolerance(MassFraction tolerance)
    {
        double value = Require.Positive(tolerance.Si(), "Tolerance", Scale.None, nameof(tolerance));
        return Changed(copy => copy.RawTolerance = value);
    }

    /// <summary>With another noise of the differential.</summary>
    /// <param name="noise">Relative standard deviation, greater than zero.</param>
    /// <exception cref="ArgumentOutOfRangeException">The noise is not greater than zero.</exception>
    public EstimatorOptions WithDifferentialNoise(Ratio noise)
    {
        double value = Require.Positive(noise.Si(), "Noise of the differential", Scale.None, nameof(noise));
        return Changed(copy => copy.RawDifferentialNoise = value);
    }

    /// <summary>With another noise of the feed flow.</summary>
    /// <param name="noise">Relative standard deviation, greater than zero.</param>
    /// <exception cref="ArgumentOutOfRangeException">The noise is not greater than zero.</exception>
    public EstimatorOptions WithFeedFlowNoise(Ratio noise)
    {
        double value = Require.Positive(noise.Si(), "Noise of the feed flow", Scale.None, nameof(noise));
        return Changed(copy => copy.RawFlowNoise = value);
    }

    /// <summary>With another wander of the heat per firing.</summary>
    /// <param name="inAnHour">Relative standard deviation after an hour, greater than zero.</param>
    /// <exception cref="ArgumentOutOfRangeException">The wander is not greater than zero.</exception>
    public EstimatorOptions WithHeatWander(Ratio inAnHour)
    {
        double value = Require.Positive(inAnHour.Si(), "Wander of the heat", Scale.None, nameof(inAnHour));
        return Changed(copy => copy.RawHeatWander = value);
    }

    /// <summary>With another limit of disagreement.</summary>
    /// <param name="heat">Relative change of the heat, greater than zero.</param>
    /// <exception cref="ArgumentOutOfRangeException">The limit is not greater than zero.</exception>
    public EstimatorOptions WithDisagreementLimit(Ratio heat)
    {
        double value = Require.Positive(heat.Si(), "Disagreement limit", Scale.None, nameof(heat));
        return Changed(copy => copy.RawDisagreementLimit = value);
    }

    /// <summary>With another time to go on without an input.</summary>
    /// <param name="time">Greater than zero.</param>
    /// <exception cref="ArgumentOutOfRangeException">The time is not greater than zero.</exception>
    public EstimatorOptions WithCoastTime(Duration time)
    {
        double value = Require.Positive(time.Si(), "Coast time", Scale.Seconds, nameof(time));
        return Changed(copy => copy.RawCoastTime = value);
    }

    /// <summary>With another time after which an unchanged signal is called frozen.</summary>
    /// <param name="silence">Greater than zero.</param>
    /// <exception cref="ArgumentOutOfRangeException">The time is not greater than zero.</exception>
    public EstimatorOptions WithLongestSilence(Duration silence)
    {
        double value = Require.Positive(silence.Si(), "Longest silence", Scale.Seconds, nameof(silence));
        return Changed(copy => copy.RawLongestSilence = value);
    }

    /// <summary>How a signal's tag is reported; sampled unless given.</summary>
    /// <param name="signal">Which one.</param>
    public TagReporting Reporting(PassSignal signal) => (uint)signal < (uint)_reporting.Length ? _reporting[(int)signal] : TagReporting.Sampled;

    /// <summary>With a tag that is reported otherwise: by exception, with its dead band and longest silence.</summary>
    /// <param name="signal">Whose tag.</param>
    /// <param name="reporting">How it is reported.</param>
    /// <exception cref="ArgumentException">The dead band is of another quantity than the signal.</exception>
    public EstimatorOptions WithReporting(PassSignal signal, TagReporting reporting)
    {
        if (!Require.NotNull(reporting, nameof(reporting)).Fits(signal)) throw new ArgumentException($"A dead band of {reporting.DeadBand} is none of {signal}.", nameof(reporting));
        return Changed(copy =>
        {
            copy._reporting = [.. _reporting];
            copy._reporting[(int)signal] = reporting;
        });
    }

    /// <summary>With other lags of the sensors.</summary>
    /// <param name="feedTemperature">Lag of the feed-temperature sensor, zero or more.</param>
    /// <param name="differential">Lag of the differential behind the feed flow, zero or more.</param>
    /// <exception cref="ArgumentOutOfRangeException">A lag is negative.</exception>
    public EstimatorOptions WithSensorLags(Duration feedTemperature, Duration differential)
    {
        double warm = Require.NotNegative(feedTemperature.Si(), "Lag of the feed temperature", Scale.Seconds, nameof(feedTemperature));
        double pressure = Require.NotNegative(differential.Si(), "Lag of the differential", Scale.Seconds, nameof(differential));
        return Changed(copy => (copy.RawFeedTemperatureLag, copy.RawDifferentialLag) = (warm, pressure));
    }

    /// <summary>With what the instruments are uncertain by.</summary>
    /// <param name="metering">Their standard uncertainties.</param>
    public EstimatorOptions WithMetering(MeteringUncertainty metering)
    {
        Require.NotNull(metering, nameof(metering));
        return Changed(copy => copy.Metering = metering);
    }

    private EstimatorOptions Changed(Action<EstimatorOptions> change)
    {
        var copy = (EstimatorOptions)MemberwiseClone();
        change(copy);
        return copy;
    }
}
