using System.Globalization;
using TwoPhase.Metering;
using UnitsNet;

namespace TwoPhase.Dynamics;

/// <summary>What a run through a large event did: its history, the figures that matter, and what must be said with them.</summary>
public abstract class CourseReport
{
    // A flow is near another within this share, a quality within this; readings serve within a point.
    private protected const double NearFlow = 0.05, NearQuality = 0.005, Serves = 0.01;

    private protected CourseReport(PassHistory history, DifferentialPressureTransmitter? transmitter)
    {
        History = history;
        Figures = history.Figures(MassFraction.FromDecimalFractions(Serves));
        AtCeiling = transmitter is null ? [] : history.AtCeiling(transmitter);
    }

    /// <summary>The run.</summary>
    public PassHistory History { get; }

    /// <summary>The figures of the transient, the reading taken as good within 0.01.</summary>
    public TransientFigures Figures { get; }

    /// <summary>When the transmitter was at its ceiling; none when no transmitter was given.</summary>
    public IReadOnlyList<HistorySpan> AtCeiling { get; }

    /// <summary>What must be said with these numbers.</summary>
    public IReadOnlyList<string> Cautions =>
    [
        "This shows physics and is no procedure: purge, ignition, low-water-flow and high-temperature trips follow the plant's burner-management and boiler codes and licensed operators.",
        .. Warnings(),
        .. AtCeiling.Count > 0 ? [$"The transmitter is at its ceiling from {string.Join(", ", AtCeiling)}: it then shows less than there is."] : Array.Empty<string>(),
        .. History.End == SimulationEnd.Completed ? Array.Empty<string>() : [$"The run ended before its time. {History.EndReason}"],
    ];

    /// <summary>What this kind of event must say.</summary>
    private protected abstract IEnumerable<string> Warnings();

    private protected static string Text(Duration? time) => time is { } at ? at.Seconds.ToString("F0", CultureInfo.InvariantCulture) + " s" : "never";

    private protected static bool IsFlowNear(PassInstant row) => Math.Abs(row.RawOutletFlow - row.RawFeedFlow) <= NearFlow * row.RawFeedFlow;

    /// <summary>Time of a row; null for −1.</summary>
    private protected Duration? At(int row) => row < 0 ? null : History[row].Time;

    /// <summary>Index of the row at which something is largest.</summary>
    private protected int Peak(Func<PassInstant, double> of)
    {
        int peak = 0;
        for (int i = 1; i < History.Count; i++)
        {
            if (of(History[i]) > of(History[peak])) peak = i;
        }

        return peak;
    }
}
