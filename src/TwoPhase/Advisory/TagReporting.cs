using TwoPhase.Metering;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Advisory;

/// <summary>How the historian or the control system hands on a tag: every sample, or only what differs from what it handed on last.</summary>
/// <remarks>
/// A value reported by exception stands for all values within the dead band about it until the next report, and a report must come after the
/// longest silence at the latest. A value that is missing from a reading is then the last one still; one called bad is not.
/// </remarks>
public sealed class TagReporting
{
    // What a report may be late by before the tag is called frozen.
    private const double Patience = 1.5;

    // A sampled signal missing for less than this is held [s]; longer, it is a fault.
    private const double SampledHold = 15;

    private TagReporting()
    {
    }

    /// <summary>Every sample is handed on.</summary>
    public static TagReporting Sampled { get; } = new();

    /// <summary>Whether it is reported by exception.</summary>
    public bool IsByException => RawDeadBand > 0;

    /// <summary>How far the value must be from the last report to be reported; null when sampled.</summary>
    public IQuantity? DeadBand => Quantity?.Difference(RawDeadBand);

    /// <summary>After how long without a report the value is reported whatever it is; null when sampled.</summary>
    public Duration? LongestSilence => IsByException ? Duration.FromSeconds(RawLongestSilence) : null;

    internal UnitKind Kind { get; private init; }

    internal double RawDeadBand { get; private init; }

    internal double RawLongestSilence { get; private init; }

    /// <summary>How long a missing value may be taken for the last one [s].</summary>
    internal double RawHold => IsByException ? Patience * RawLongestSilence : SampledHold;

    private QuantityScale? Quantity { get; init; }

    /// <summary>A flow that is reported by exception.</summary>
    /// <param name="deadBand">As a flow: a share of the span is given as that share times the span.</param>
    /// <param name="longestSilence">Time between two reports at most.</param>
    /// <exception cref="ArgumentOutOfRangeException">Either is not greater than zero.</exception>
    public static TagReporting ByException(MassFlow deadBand, Duration longestSilence) => Of(UnitKind.MassFlow, QuantityScale.Flow, Require.Positive(deadBand.Si(), "Dead band", Scale.KilogramsPerSecond, nameof(deadBand)), longestSilence);

    /// <summary>A temperature that is reported by exception.</summary>
    /// <param name="deadBand">As a difference of temperature.</param>
    /// <param name="longestSilence">Time between two reports at most.</param>
    /// <exception cref="ArgumentOutOfRangeException">Either is not greater than zero.</exception>
    public static TagReporting ByException(TemperatureDelta deadBand, Duration longestSilence) => Of(UnitKind.Temperature, QuantityScale.Temperature, Require.Positive(deadBand.Si(), "Dead band", Scale.Kelvins, nameof(deadBand)), longestSilence);

    /// <summary>A pressure or a differential that is reported by exception.</summary>
    /// <param name="deadBand">As a pressure.</param>
    /// <param name="longestSilence">Time between two reports at most.</param>
    /// <exception cref="ArgumentOutOfRangeException">Either is not greater than zero.</exception>
    public static TagReporting ByException(Pressure deadBand, Duration longestSilence) => Of(UnitKind.PressureDifference, QuantityScale.Differential, Require.Positive(deadBand.Si(), "Dead band", Scale.Kilopascals, nameof(deadBand)), longestSilence);

    /// <summary>A share, such as the firing, that is reported by exception.</summary>
    /// <param name="deadBand">As a share.</param>
    /// <param name="longestSilence">Time between two reports at most.</param>
    /// <exception cref="ArgumentOutOfRangeException">Either is not greater than zero.</exception>
    public static TagReporting ByException(Ratio deadBand, Duration longestSilence) => Of(UnitKind.Ratio, QuantityScale.Ratio, Require.Positive(deadBand.Si(), "Dead band", Scale.None, nameof(deadBand)), longestSilence);

    /// <summary>Whether a dead band of this kind can be one of a signal.</summary>
    internal bool Fits(PassSignal signal) => !IsByException || Kind == (PassSignals.Kind(signal) is UnitKind.AbsolutePressure ? UnitKind.PressureDifference : PassSignals.Kind(signal));

    private static TagReporting Of(UnitKind kind, QuantityScale quantity, double deadBand, Duration longestSilence) => new()
    {
        Kind = kind,
        Quantity = quantity,
        RawDeadBand = deadBand,
        RawLongestSilence = Require.Positive(longestSilence.Si(), "Longest silence", Scale.Seconds, nameof(longestSilence)),
    };

    internal object ToDump() => ToString();

    /// <summary>How it is reported, invariant culture.</summary>
    public override string ToString() => IsByException ? FormattableString.Invariant($"by exception: {Quantity!.SizeText(RawDeadBand)}, at the latest after {RawLongestSilence:F0} s") : "sampled";
}
