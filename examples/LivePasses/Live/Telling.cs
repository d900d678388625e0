using System.Globalization;
using TwoPhase.Advisory;
using TwoPhase.Metering;
using UnitsNet;

namespace LivePasses.Live;

/// <summary>Estimates in words.</summary>
internal static class Telling
{
    /// <summary>What is said where nothing is known.</summary>
    public const string Lost = "Nothing measured stands behind this pass now: go by what the plant's procedures name for a lost quality.";

    // Shorter waits are not counted out [s].
    private const double LeastWait = 15;

    /// <summary>What a pass reads, what it is, and whether to believe it.</summary>
    public static string Sentence(string pass, in QualityEstimate estimate, in PassShift shift)
    {
        string reads = estimate.IndicatedQuality is { } indicated ? $"reads {Two(indicated)}" : "gives no reading";
        string known = estimate.Quality is { } quality ? $", is {Two(quality)}" : "";
        return $"{pass} " + estimate.Trust switch
        {
            TwoPhase.Advisory.Trust.Believable => $"{reads}; believe it.",
            TwoPhase.Advisory.Trust.ReadsHigh or TwoPhase.Advisory.Trust.ReadsLow => $"{reads}{known}; believe it {When(estimate)}.",
            TwoPhase.Advisory.Trust.Settling => $"{reads}{known}; believe it {When(estimate)}.",
            TwoPhase.Advisory.Trust.Disagreement => $"{reads}; {Two(estimate.QualityIfMeterIsRight)} if its meter is right, {Two(estimate.QualityIfHeatIsRight)} if its heat is. {Origin(shift)}",
            TwoPhase.Advisory.Trust.InputFault => $"has no good {Signal(estimate.Fault)}; " + (estimate.Quality is { } carried ? $"{Two(carried)} by the model alone, for a while." : "its quality is not known."),
            TwoPhase.Advisory.Trust.NotRunning => $"has no quality now: {State(estimate.State)}.",
            _ => $"{reads}; its true quality is not known yet.",
        };
    }

    /// <summary>A pass of which nothing arrives.</summary>
    public static string Silence(string pass, DateTimeOffset? last) =>
        $"{pass} has no tags" + (last is { } time ? string.Create(CultureInfo.InvariantCulture, $" since {time.UtcDateTime:yyyy-MM-dd HH:mm:ss} UTC") : " yet") + "; its quality is not known.";

    public static string Trust(Trust trust) => trust switch
    {
        TwoPhase.Advisory.Trust.Believable => "believe it",
        TwoPhase.Advisory.Trust.Settling => "settling",
        TwoPhase.Advisory.Trust.ReadsHigh => "reads high",
        TwoPhase.Advisory.Trust.ReadsLow => "reads low",
        TwoPhase.Advisory.Trust.InputFault => "input fault",
        TwoPhase.Advisory.Trust.Disagreement => "plant and model disagree",
        TwoPhase.Advisory.Trust.NotRunning => "not running",
        _ => "not known",
    };

    public static string State(OperatingState state) => state switch
    {
        OperatingState.Off => "off",
        OperatingState.Filling => "filling",
        OperatingState.Purge => "purge",
        OperatingState.LowFireHold => "held at low fire",
        OperatingState.LightOff => "lighting off",
        OperatingState.Running => "running",
        OperatingState.Turndown => "turned down",
        OperatingState.Trip => "tripped",
        OperatingState.Draining => "draining",
        _ => "state not known",
    };

    public static string Reason(EstimateReason reason) => string.Create(CultureInfo.InvariantCulture, $"{reason.Size.DecimalFractions:+0.000;-0.000} ") + reason.Kind switch
    {
        EstimateReasonKind.HoldupMotion => "water pushed out or held back",
        EstimateReasonKind.ShiftAgainstBase => "shift of heat, meter or feed flow",
        EstimateReasonKind.Noise => "noise of this sample",
        _ => "meter, wet-steam model and feed flow, unknown sign",
    };

    /// <summary>What to keep in mind before acting on the numbers.</summary>
    public static IReadOnlyList<string> Cautions(in QualityEstimate estimate, double limit)
    {
        List<string> cautions = [];
        if (estimate.Quality is { } quality && quality.DecimalFractions > limit)
            cautions.Add(string.Create(CultureInfo.InvariantCulture, $"Its estimated quality is above the site's limit of {limit:0.00}."));
        else if (estimate.UpperQuality is { } upper && upper.DecimalFractions > limit)
            cautions.Add(string.Create(CultureInfo.InvariantCulture, $"It may be above the limit of {limit:0.00}: its 95 % upper value is {upper.DecimalFractions:0.00}."));
        if (estimate.Trust == TwoPhase.Advisory.Trust.ReadsLow)
            cautions.Add("A reading that is too low invites a cut of the feed, which is the dangerous move.");
        if (estimate.Trust == TwoPhase.Advisory.Trust.Disagreement && estimate.QualityIfHeatIsRight > estimate.QualityIfMeterIsRight)
            cautions.Add("The reading may have fallen while the quality has not, or has risen: a leak, or a meter that drifts low, looks like this, and with a leak the quality is above both numbers. Do not cut the feed on this reading alone.");
        if (estimate.Trust == TwoPhase.Advisory.Trust.InputFault)
            cautions.Add("An input is missing: the model carries this number, and not for long. Have ready what the plant's procedures name for a lost quality.");
        if (estimate.Trust == TwoPhase.Advisory.Trust.Unknown) cautions.Add(Lost);
        return cautions;
    }

    private static string Origin(in PassShift shift) => shift.Origin switch
    {
        ShiftOrigin.Common => "All passes show it: heat, or a tag they share.",
        ShiftOrigin.ThisPass => "This pass alone: its meter, its feed flow or its share of the heat.",
        _ => "Heat, meter or feed flow: not separable.",
    };

    private static string Signal(PassSignal signal) => signal switch
    {
        PassSignal.FeedFlow => "feed flow",
        PassSignal.Differential => "differential",
        PassSignal.OutletPressure => "outlet pressure",
        PassSignal.FeedTemperature => "feed temperature",
        PassSignal.Firing => "firing",
        _ => "input",
    };

    // A wait that has run down without an end to the motion is no wait: something still moves the water.
    private static string When(in QualityEstimate estimate) => estimate.ExpectedWait is { Seconds: > LeastWait } wait
        ? string.Create(CultureInfo.InvariantCulture, $"in about {Math.Round(wait.Seconds / 10) * 10:0} s")
        : "once the water in it has come to rest";

    private static string Two(MassFraction? quality) => quality is { } value ? value.DecimalFractions.ToString("0.00", CultureInfo.InvariantCulture) : "unknown";
}
