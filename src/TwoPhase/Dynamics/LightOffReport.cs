using System.Globalization;
using TwoPhase.Numerics;
using TwoPhase.Steam;
using UnitsNet;

namespace TwoPhase.Dynamics;

/// <summary>What a light-off did: when, how much water left, and what the equipment downstream must take.</summary>
public sealed class LightOffReport : CourseReport
{
    internal LightOffReport(LightOff course, PassHistory history)
        : base(history, course.Transmitter)
    {
        Course = course;
        int boils = history.FirstRow(row => row.BoilingOnset is not null), peak = Peak(row => row.RawOutletFlow), wettest = Peak(Liquid), over = history.FirstForGood(IsFlowNear);
        double end = history[^1].RawTrueQuality, half = history.Max(row => row.RawOnset) / 2;
        FirstBoiling = At(boils);
        SteamAtOutlet = At(history.FirstRow(row => row.RawTrueQuality > 0));
        TimeOfPeak = At(peak);
        DownstreamHalfBoils = At(history.FirstRow(row => row.RawOnset <= half));
        SurgeOver = boils < 0 || over < boils ? null : At(over);
        Steady = Fast.IsFinite(end) ? At(history.FirstForGood(row => Math.Abs(row.RawTrueQuality - end) <= NearQuality && IsFlowNear(row))) : null;
        PeakOutletFlow = MassFlow.FromKilogramsPerSecond(history[peak].RawOutletFlow);
        PeakLiquidFlow = VolumeFlow.FromCubicMetersPerSecond(Liquid(history[wettest]) * BoilingVolume(history[wettest]));
        double surge = boils < 0 ? 0 : history[boils].RawHoldup - history[over < boils ? history.Count - 1 : over].RawHoldup;
        MassSurge = Mass.FromKilograms(surge);
        VolumeSurge = Volume.FromCubicMeters(surge * BoilingVolume(history[^1]));
        SwollenOut = Mass.FromKilograms(history[0].RawHoldup - history[boils < 0 ? history.Count - 1 : boils].RawHoldup);
    }

    /// <summary>The course that was run.</summary>
    public LightOff Course { get; }

    /// <summary>When the pass first boils: at its outlet, or further up where colder water still stands before it; null when it does not.</summary>
    public Duration? FirstBoiling { get; }

    /// <summary>When the first steam leaves; null when none does.</summary>
    public Duration? SteamAtOutlet { get; }

    /// <summary>When the outlet flow is largest.</summary>
    public Duration? TimeOfPeak { get; }

    /// <summary>When the boiling boundary passes half of its way in; null when it does not come so far.</summary>
    public Duration? DownstreamHalfBoils { get; }

    /// <summary>From when on the outlet flow is the feed flow within 5 %; null before first boiling, or when not by the end.</summary>
    public Duration? SurgeOver { get; }

    /// <summary>From when on the true quality is that of the end within 0.005; null when the flow has not come to rest by then.</summary>
    public Duration? Steady { get; }

    /// <summary>From when on the reading is true within 0.01; null when it is not by the end.</summary>
    public Duration? ReadingServes => Figures.Settled;

    /// <summary>Largest outlet flow.</summary>
    public MassFlow PeakOutletFlow { get; }

    /// <summary>Largest flow of liquid at the outlet, as a volume of boiling water at the pressure there.</summary>
    public VolumeFlow PeakLiquidFlow { get; }

    /// <summary>Water that left beyond the feed from first boiling until the surge was over, or to the end of the run.</summary>
    public Mass MassSurge { get; }

    /// <summary>The same as a volume of boiling water at the outlet pressure: what the equipment downstream must find room for, or drain, on top of the running flow.</summary>
    public Volume VolumeSurge { get; }

    /// <summary>Water that left beyond the feed before first boiling, since warm water needs more room.</summary>
    public Mass SwollenOut { get; }

    internal object ToDump() => ToString();

    /// <summary>Times and surge in one line, invariant culture.</summary>
    public override string ToString() => string.Format(
        CultureInfo.InvariantCulture,
        "first boiling {0}, peak {1:F2} kg/s at {2}, surge over {3}: {4:F0} kg, {5:F2} m³; steady {6}",
        Text(FirstBoiling),
        PeakOutletFlow.KilogramsPerSecond,
        Text(TimeOfPeak),
        Text(SurgeOver),
        MassSurge.Kilograms,
        VolumeSurge.CubicMeters,
        Text(Steady));

    private protected override IEnumerable<string> Warnings()
    {
        if (FirstBoiling is not null) yield return "Until the surge is over the meter is read with a feed flow that is not its flow: what it indicates is no quality.";
    }

    private static double Liquid(PassInstant row) => row.RawOutletFlow * (1 - Fast.Clamp(row.RawTrueQuality, 0, 1));

    private static double BoilingVolume(in PassInstant row) => SaturationTable.Phases(row.RawOutletPressure).LiquidVolume;
}
