using System.Globalization;
using TwoPhase.Metering;
using TwoPhase.Numerics;
using UnitsNet;

namespace TwoPhase.Advisory;

/// <summary>What is known of a pass after one reading: the quality that leaves it, how well, and whether the raw reading can be believed.</summary>
/// <remarks>Advisory only: it replaces no trip, no tube-skin thermocouple and no test; those follow the plant's codes and licensed operators.</remarks>
public readonly record struct QualityEstimate
{
    /// <summary>When.</summary>
    public DateTimeOffset Time { get; internal init; }

    /// <summary>The quality that the meter and the feed flow indicate; null where they give none.</summary>
    public MassFraction? IndicatedQuality => Fraction(RawIndicated);

    /// <summary>x̂, the quality that leaves the pass; null while nothing is known or the pass is not running.</summary>
    public MassFraction? Quality => Fraction(RawQuality);

    /// <summary>Standard uncertainty of x̂ from holdup motion and noise: what comparing passes and times needs.</summary>
    public MassFraction? Motion => Fraction(RawMotion);

    /// <summary>Standard uncertainty of x̂ with meter, wet-steam model, feed flow and pressure added: what a hard limit needs.</summary>
    public MassFraction? Absolute => Fraction(RawAbsolute);

    /// <summary>One-sided 95 % upper value of the quality: x̂ + 1.645 u, u the absolute uncertainty.</summary>
    public MassFraction? UpperQuality => Fraction(RawQuality + (1.645 * RawAbsolute));

    /// <summary>Site limit minus x̂; negative beyond it.</summary>
    public MassFraction? MarginToLimit => Fraction(RawLimit - RawQuality);

    /// <summary>1/(1 − x̂): how many times the solids of the feed are concentrated in the water that leaves; null at and above dryness.</summary>
    public double? SolidsConcentration => RawQuality < 1 ? 1 / (1 - RawQuality) : null;

    /// <summary>If the meter and the feed flow are right, and what changed is the heat; equals x̂ while plant and model agree.</summary>
    public MassFraction? QualityIfMeterIsRight => Fraction(RawIfMeter);

    /// <summary>If the heat is right, and what changed is the meter or the feed flow.</summary>
    public MassFraction? QualityIfHeatIsRight => Fraction(RawIfHeat);

    /// <summary>Standard uncertainty of either of the two, without the meter's own.</summary>
    public MassFraction? MotionOfEither => Fraction(RawEnds);

    /// <summary>Flow that leaves the pass.</summary>
    public MassFlow? OutletFlow => double.IsNaN(RawOutletFlow) ? null : MassFlow.FromKilogramsPerSecond((double)RawOutletFlow);

    /// <summary>Rate of change of the water held; negative while it is pushed out.</summary>
    public MassFlow? HoldupRate => double.IsNaN(RawHoldupRate) ? null : MassFlow.FromKilogramsPerSecond((double)RawHoldupRate);

    /// <summary>Water and steam held.</summary>
    public Mass? Holdup => double.IsNaN(RawHoldup) ? null : Mass.FromKilograms((double)RawHoldup);

    /// <summary>Distance from the inlet at which boiling begins; null for nowhere.</summary>
    public Length? BoilingOnset => double.IsNaN(RawOnset) ? null : Length.FromMeters((double)RawOnset);

    /// <summary>Absorbed heat per firing over that of the calibration, as the meter has it.</summary>
    public double? HeatFactor => double.IsNaN(RawHeatFactor) ? null : RawHeatFactor;

    /// <summary>Whether the raw reading can be believed.</summary>
    public Trust Trust { get; internal init; }

    /// <summary>How much longer, by the water's way through the pass, before the reading can be believed; null where time does not mend it.</summary>
    public Duration? ExpectedWait => double.IsNaN(RawWait) ? null : Duration.FromSeconds((double)RawWait);

    /// <summary>The input at fault; <see cref="PassSignal.None"/> for none.</summary>
    public PassSignal Fault { get; internal init; }

    /// <summary>Since when plant and model disagree; null while they agree.</summary>
    public DateTimeOffset? DisagreesSince { get; internal init; }

    /// <summary>What the pass is doing.</summary>
    public OperatingState State { get; internal init; }

    /// <summary>The largest reason why the reading is not the truth or the truth not well known.</summary>
    public EstimateReason FirstReason { get; internal init; }

    /// <summary>The second largest.</summary>
    public EstimateReason SecondReason { get; internal init; }

    /// <summary>The third largest.</summary>
    public EstimateReason ThirdReason { get; internal init; }

    internal Known RawIndicated { get; init; }

    internal Known RawQuality { get; init; }

    internal Known RawMotion { get; init; }

    internal Known RawAbsolute { get; init; }

    internal Known RawLimit { get; init; }

    internal Known RawIfMeter { get; init; }

    internal Known RawIfHeat { get; init; }

    internal Known RawEnds { get; init; }

    internal Known RawOutletFlow { get; init; }

    internal Known RawHoldupRate { get; init; }

    internal Known RawHoldup { get; init; }

    internal Known RawOnset { get; init; }

    internal Known RawHeatFactor { get; init; }

    internal Known RawWait { get; init; }

    /// <summary>One that knows nothing but the reading.</summary>
    internal static QualityEstimate Nothing(DateTimeOffset time, double indicated) => new() { Time = time, RawIndicated = indicated };

    private static MassFraction? Fraction(double value) => Fast.IsFinite(value) ? MassFraction.FromDecimalFractions(value) : null;

    internal object ToDump() => ToString();

    /// <summary>The estimate in a sentence, invariant culture.</summary>
    public override string ToString()
    {
        string reads = double.IsNaN(RawIndicated) ? "no reading" : string.Format(CultureInfo.InvariantCulture, "reads {0:F3}", (double)RawIndicated);
        string known = double.IsNaN(RawQuality) ? "not known" : string.Format(CultureInfo.InvariantCulture, "is {0:F3} ± {1:F3}", (double)RawQuality, 2 * RawMotion);
        string wait = double.IsNaN(RawWait) ? "" : string.Format(CultureInfo.InvariantCulture, " for about {0:F0} s", (double)RawWait);
        return string.Format(CultureInfo.InvariantCulture, "{0:HH:mm:ss}: {1}, {2}; {3}{4}", Time, reads, known, Trust == Trust.InputFault ? $"{Trust} ({Fault})" : Trust == Trust.NotRunning ? State : Trust, wait);
    }
}
