using TwoPhase.Dynamics;
using UnitsNet;

namespace TrueQuality;

/// <summary>Something that happens to the invented plant.</summary>
/// <param name="File">Name of its picture.</param>
/// <param name="Name">What.</param>
/// <param name="Seconds">How long it is watched.</param>
/// <param name="Schedule">What is done to the pass.</param>
internal sealed record Trial(string File, string Name, int Seconds, Func<OperatingSchedule, OperatingSchedule> Schedule)
{
    private const double Begin = 600, Length = 2400;

    /// <summary>Factor on the heat that no instrument sees.</summary>
    public Func<double, double> Heat { get; init; } = static _ => 1;

    /// <summary>Factor on the differential: a meter that drifts.</summary>
    public Func<double, double> Meter { get; init; } = static _ => 1;

    public static Trial[] All { get; } =
    [
        new("nothing", "nothing happens", 1800, static still => still),
        new("firing-up", "firing +6 % at once", 1800, static still => still.StepFiring(At(600), Ratio.FromPercent(106))),
        new("feed-down", "feed flow -5 % at once", 1800, static still => still.StepFeedFlow(At(600), still.Start.FeedFlow * 0.95)),
        new("feed-warms", "feed 12 K warmer in 5 min", 2400, static still => still.RampFeedTemperature(At(600), At(300), still.Start.FeedTemperature!.Value + TemperatureDelta.FromKelvins(12))),
        new("header-falls", "header -0.3 MPa in 1 min", 1800, static still => still.RampOutletPressure(At(600), At(60), still.Start.OutletPressure - Pressure.FromMegapascals(0.3))),
        new("meter-drifts", "meter drifts by -10 %", 3600, static still => still) { Meter = static t => 1 - (0.10 * Drift(t)) },
        new("heat-drifts", "heat drifts by -5 %", 3600, static still => still) { Heat = static t => 1 - (0.05 * Drift(t)) },
    ];

    private static Duration At(double seconds) => Duration.FromSeconds(seconds);

    private static double Drift(double t) => Math.Clamp((t - Begin) / Length, 0, 1);
}
