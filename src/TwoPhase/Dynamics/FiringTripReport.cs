using System.Globalization;
using UnitsNet;

namespace TwoPhase.Dynamics;

/// <summary>What a trip of the firing did: how far the outlet flow fell, how long the pass took to fill, how fast it cooled.</summary>
public sealed class FiringTripReport : CourseReport
{
    // A rate of cooling is the mean over this [s]: what a thermometer in a pocket could follow.
    private const double Window = 60;

    internal FiringTripReport(FiringTrip course, PassHistory history)
        : base(history, course.Transmitter)
    {
        Course = course;
        int lowest = Peak(row => -row.RawOutletFlow), wet = history.FirstForGood(row => row.RawTrueQuality < 0), still = history.FirstForGood(row => row.BoilingOnset is null), back = history.FirstForGood(IsFlowNear);
        TimeOfLowest = At(lowest);
        LowestOutletFlow = MassFlow.FromKilogramsPerSecond(history[lowest].RawOutletFlow);
        SteamEnds = At(wet);
        Quenched = At(still);
        FlowIsBack = At(back);
        Refilled = Mass.FromKilograms(history[^1].RawHoldup - history[0].RawHoldup);
        OutletCooling = Cooling(row => row.RawOutletTemperature);
        MetalCooling = Cooling(row => row.RawHottestMetal);
    }

    /// <summary>The course that was run.</summary>
    public FiringTrip Course { get; }

    /// <summary>When the outlet flow is smallest.</summary>
    public Duration? TimeOfLowest { get; }

    /// <summary>Smallest outlet flow: far below the feed flow, since what comes in fills the pass.</summary>
    public MassFlow LowestOutletFlow { get; }

    /// <summary>From when on no steam leaves; null when some still does at the end.</summary>
    public Duration? SteamEnds { get; }

    /// <summary>From when on nothing boils in the pass; null when something still does at the end.</summary>
    public Duration? Quenched { get; }

    /// <summary>From when on the outlet flow is the feed flow within 5 %; null when not by the end.</summary>
    public Duration? FlowIsBack { get; }

    /// <summary>Water that the pass took up from start to end.</summary>
    public Mass Refilled { get; }

    /// <summary>Fastest cooling of what leaves, mean over a minute.</summary>
    public TemperatureChangeRate OutletCooling { get; }

    /// <summary>Fastest cooling of the hottest metal, mean over a minute and over the tube wall.</summary>
    public TemperatureChangeRate MetalCooling { get; }

    internal object ToDump() => ToString();

    /// <summary>Times and sizes in one line, invariant culture.</summary>
    public override string ToString() => string.Format(
        CultureInfo.InvariantCulture,
        "outlet flow down to {0:F2} kg/s at {1}, no steam from {2}, quenched {3}, {4:F0} kg taken up, outlet cools by {5:F0} K/min",
        LowestOutletFlow.KilogramsPerSecond,
        Text(TimeOfLowest),
        Text(SteamEnds),
        Text(Quenched),
        Refilled.Kilograms,
        OutletCooling.DegreesCelsiusPerMinute);

    private protected override IEnumerable<string> Warnings()
    {
        yield return "While the pass fills, less leaves than the feed brings: the reading is low and says nothing of the quality, nor is the flow lost.";
        yield return "Metal that cools fast is strained: what it may take is in the plant's limits for its materials and welds.";
    }

    private TemperatureChangeRate Cooling(Func<PassInstant, double> of)
    {
        double most = 0;
        for (int from = 0, to = 1; to < History.Count; to++)
        {
            while (History[to].RawTime - History[from].RawTime > Window) from++;
            if (History[to].RawTime - History[from].RawTime < Window) continue;
            most = Math.Max(most, (of(History[from]) - of(History[to])) / Window);
        }

        return TemperatureChangeRate.FromDegreesCelsiusPerSecond(most);
    }
}
