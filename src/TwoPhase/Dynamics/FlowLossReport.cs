using System.Globalization;
using UnitsNet;

namespace TwoPhase.Dynamics;

/// <summary>What a loss of feed flow did, up to dryout: how much time there was, and what the instruments showed meanwhile.</summary>
public sealed class FlowLossReport : CourseReport
{
    internal FlowLossReport(FlowLoss course, PassHistory history)
        : base(history, course.Transmitter)
    {
        Course = course;
        PassInstant end = history[^1];
        DryoutReached = history.End == SimulationEnd.DryoutReached ? end.Time : null;
        int peak = Peak(row => row.RawOutletFlow);
        (PeakOutletFlow, TimeOfPeak) = (MassFlow.FromKilogramsPerSecond(history[peak].RawOutletFlow), history[peak].Time);
        BoiledOut = Mass.FromKilograms(history[0].RawHoldup - end.RawHoldup);
        Left = end.Holdup;
        QualityAtEnd = end.TrueQuality;
        IndicatedAtEnd = end.IndicatedQuality;
        HottestMetal = Temperature.FromKelvins(history.Max(row => row.RawHottestMetal));
    }

    /// <summary>The course that was run.</summary>
    public FlowLoss Course { get; }

    /// <summary>When the true quality at the outlet has reached dryout; null when it did not.</summary>
    public Duration? DryoutReached { get; }

    /// <summary>From the beginning of the loss to dryout; null when it was not reached.</summary>
    public Duration? TimeLeft => DryoutReached is { } at ? Duration.FromSeconds(at.Seconds - Course.FlowFalls.Seconds) : null;

    /// <summary>Largest outlet flow.</summary>
    public MassFlow PeakOutletFlow { get; }

    /// <summary>When the outlet flow was largest.</summary>
    public Duration TimeOfPeak { get; }

    /// <summary>Water that left beyond the feed.</summary>
    public Mass BoiledOut { get; }

    /// <summary>Water and steam in the pass at the end.</summary>
    public Mass Left { get; }

    /// <summary>True quality at the end.</summary>
    public MassFraction QualityAtEnd { get; }

    /// <summary>What the meter then indicates; null where nothing is indicated.</summary>
    public MassFraction? IndicatedAtEnd { get; }

    /// <summary>Hottest metal up to the end, mean over the tube wall: that of a wetted wall.</summary>
    public Temperature HottestMetal { get; }

    internal object ToDump() => ToString();

    /// <summary>Times and sizes in one line, invariant culture.</summary>
    public override string ToString() => string.Format(
        CultureInfo.InvariantCulture,
        "dryout {0}, {1} after the flow began to fall; {2:F0} kg boiled out, {3:F0} kg left",
        Text(DryoutReached),
        Text(TimeLeft),
        BoiledOut.Kilograms,
        Left.Kilograms);

    private protected override IEnumerable<string> Warnings()
    {
        yield return "No basis for a setting: the time to dryout here is that of the mean of one pass; tubes, flux and flow differ from place to place, and some dry out sooner.";
        if (DryoutReached is not null) yield return "The run stops at dryout. Beyond it the wall is no longer wetted and its temperature climbs fast: that is outside the model, and what is not shown here is the part that destroys tubes.";
    }
}
