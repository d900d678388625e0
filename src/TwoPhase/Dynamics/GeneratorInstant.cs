using System.Globalization;
using UnitsNet;

namespace TwoPhase.Dynamics;

/// <summary>All passes of a generator together at one instant of a simulation.</summary>
public readonly record struct GeneratorInstant
{
    /// <summary>Time since the start of the simulation.</summary>
    public Duration Time => Duration.FromSeconds(RawTime);

    /// <summary>Feed flow of all passes.</summary>
    public MassFlow FeedFlow => MassFlow.FromKilogramsPerSecond(RawFeedFlow);

    /// <summary>What leaves all passes.</summary>
    public MassFlow OutletFlow => MassFlow.FromKilogramsPerSecond(RawOutletFlow);

    /// <summary>Vapour in what leaves, by the true qualities.</summary>
    public MassFlow SteamFlow => MassFlow.FromKilogramsPerSecond(RawSteamFlow);

    /// <summary>True quality of what leaves: the vapour's share.</summary>
    public MassFraction TrueQuality => MassFraction.FromDecimalFractions(RawTrueQuality);

    /// <summary>The qualities that the meters indicate, weighted with the feed flows as a plant does; null where a pass indicates none.</summary>
    public MassFraction? IndicatedQuality => double.IsNaN(RawIndicatedQuality) ? null : MassFraction.FromDecimalFractions(RawIndicatedQuality);

    /// <summary>Lowest and highest true quality among the passes.</summary>
    public (MassFraction Lowest, MassFraction Highest) PassQuality => (MassFraction.FromDecimalFractions(RawLowest), MassFraction.FromDecimalFractions(RawHighest));

    /// <summary>Water and steam held in all passes.</summary>
    public Mass Holdup => Mass.FromKilograms(RawHoldup);

    /// <summary>Absolute pressure of the feed header; null without one.</summary>
    public Pressure? FeedPressure => double.IsNaN(RawFeedPressure) ? null : Pressure.FromPascals(RawFeedPressure);

    internal double RawTime { get; init; }

    internal double RawFeedFlow { get; init; }

    internal double RawOutletFlow { get; init; }

    internal double RawSteamFlow { get; init; }

    internal double RawTrueQuality => RawSteamFlow / RawOutletFlow;

    internal double RawIndicatedQuality { get; init; }

    internal double RawLowest { get; init; }

    internal double RawHighest { get; init; }

    internal double RawHoldup { get; init; }

    internal double RawFeedPressure { get; init; }

    internal object ToDump() => ToString();

    /// <summary>The instant in engineering units, invariant culture.</summary>
    public override string ToString() => string.Format(
        CultureInfo.InvariantCulture,
        "{0:G6} s: {1:F3} kg/s in, {2:F3} kg/s out, quality {3:F4} ({4:F4} to {5:F4}), holdup {6:F1} kg",
        RawTime,
        RawFeedFlow,
        RawOutletFlow,
        RawTrueQuality,
        RawLowest,
        RawHighest,
        RawHoldup);

    /// <summary>The sum over the rows of all passes at one time.</summary>
    internal static GeneratorInstant Of(IReadOnlyList<PassInstant> rows, double feedPressure) => new()
    {
        RawTime = rows[0].RawTime,
        RawFeedFlow = rows.Sum(static row => row.RawFeedFlow),
        RawOutletFlow = rows.Sum(static row => row.RawOutletFlow),
        RawSteamFlow = rows.Sum(static row => row.RawOutletFlow * Math.Min(1, Math.Max(0, row.RawTrueQuality))),
        RawIndicatedQuality = rows.Sum(static row => row.RawFeedFlow * row.RawIndicatedQuality) / rows.Sum(static row => row.RawFeedFlow),
        RawLowest = rows.Min(static row => row.RawTrueQuality),
        RawHighest = rows.Max(static row => row.RawTrueQuality),
        RawHoldup = rows.Sum(static row => row.RawHoldup),
        RawFeedPressure = feedPressure,
    };
}
