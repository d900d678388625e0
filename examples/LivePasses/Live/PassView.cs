using TwoPhase.Advisory;
using TwoPhase.Passes;

namespace LivePasses.Live;

/// <summary>One pass as it is published: the estimate in plain words, every number with its unit.</summary>
internal sealed record PassView
{
    private const string Fraction = "kg/kg";

    public required string Pass { get; init; }

    public required DateTimeOffset? Time { get; init; }

    /// <summary>Everything in one sentence.</summary>
    public required string Sentence { get; init; }

    /// <summary>Whether the raw reading can be believed, one word.</summary>
    public required string Trust { get; init; }

    public required string OperatingState { get; init; }

    public required IReadOnlyList<string> Cautions { get; init; }

    public required IReadOnlyList<string> Reasons { get; init; }

    public required Quantity IndicatedQuality { get; init; }

    public required Quantity Quality { get; init; }

    /// <summary>Twice the standard uncertainty that holdup motion and noise leave.</summary>
    public required Quantity QualityWithinMotion { get; init; }

    /// <summary>One-sided 95 % upper value; what a limit is held against.</summary>
    public required Quantity UpperQuality { get; init; }

    public required Quantity QualityIfMeterIsRight { get; init; }

    public required Quantity QualityIfHeatIsRight { get; init; }

    public required Quantity FeedFlow { get; init; }

    public required Quantity OutletFlow { get; init; }

    public required Quantity Holdup { get; init; }

    public required Quantity BoilingOnset { get; init; }

    public required Quantity ExpectedWait { get; init; }

    /// <summary>A pass of which no tag arrives.</summary>
    /// <param name="pass">The pass.</param>
    /// <param name="nothing">What an estimator says that has seen nothing.</param>
    /// <param name="last">When the last tag came; null before the first.</param>
    public static PassView Silent(Pass pass, in QualityEstimate nothing, DateTimeOffset? last) => Of(pass, nothing, default, double.NaN, 1) with
    {
        Time = last,
        Sentence = Telling.Silence(pass.Name, last),
        Trust = "no tags",
        Cautions = [Telling.Lost],
    };

    public static PassView Of(Pass pass, in QualityEstimate estimate, in PassShift shift, double feedFlow, double limit) => new()
    {
        Pass = pass.Name,
        Time = estimate.Time,
        Sentence = Telling.Sentence(pass.Name, estimate, shift),
        Trust = Telling.Trust(estimate.Trust),
        OperatingState = Telling.State(estimate.State),
        Cautions = Telling.Cautions(estimate, limit),
        Reasons = [.. new[] { estimate.FirstReason, estimate.SecondReason, estimate.ThirdReason }.Where(static reason => reason.Kind != EstimateReasonKind.None).Select(Telling.Reason)],
        IndicatedQuality = Quantity.Of(estimate.IndicatedQuality?.DecimalFractions, Fraction, 4),
        Quality = Quantity.Of(estimate.Quality?.DecimalFractions, Fraction, 4),
        QualityWithinMotion = Quantity.Of(2 * estimate.Motion?.DecimalFractions, Fraction, 4),
        UpperQuality = Quantity.Of(estimate.UpperQuality?.DecimalFractions, Fraction, 4),
        QualityIfMeterIsRight = Quantity.Of(estimate.QualityIfMeterIsRight?.DecimalFractions, Fraction, 4),
        QualityIfHeatIsRight = Quantity.Of(estimate.QualityIfHeatIsRight?.DecimalFractions, Fraction, 4),
        FeedFlow = Quantity.Of(feedFlow, "kg/s", 3),
        OutletFlow = Quantity.Of(estimate.OutletFlow?.KilogramsPerSecond, "kg/s", 3),
        Holdup = Quantity.Of(estimate.Holdup?.Kilograms, "kg", 1),
        BoilingOnset = Quantity.Of(estimate.BoilingOnset?.Meters, "m", 1),
        ExpectedWait = Quantity.Of(estimate.ExpectedWait?.Seconds, "s", 0),
    };
}
