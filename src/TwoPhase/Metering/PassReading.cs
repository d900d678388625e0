using System.Globalization;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Metering;

/// <summary>What one pass's instruments said at one time, each value with its status. Immutable; each <c>With…</c> returns a changed copy.</summary>
/// <remarks>
/// A value that is missing or cannot be is null beside its status; nothing here throws for what an instrument says. Pressures are absolute.
/// </remarks>
public readonly partial struct PassReading : IEquatable<PassReading>
{
    private readonly SignalSet _signals;
    private readonly Temperature?[]? _metal;

    /// <summary>A reading of the two values that every quality needs.</summary>
    /// <param name="time">When.</param>
    /// <param name="feedFlow">Feed flow; null when missing.</param>
    /// <param name="differential">Differential pressure of the outlet meter; null when missing.</param>
    public PassReading(DateTimeOffset time, MassFlow? feedFlow, Pressure? differential)
        : this(time)
    {
        _signals.FeedFlow = Signal.Read(feedFlow?.Si() ?? double.NaN, UnitKind.MassFlow, SignalSource.Pass);
        _signals.Differential = Signal.Read(differential?.Si() ?? double.NaN, UnitKind.PressureDifference, SignalSource.Pass);
    }

    internal PassReading(DateTimeOffset time)
        : this(time, SignalSet.Missing, null)
    {
    }

    /// <summary>When.</summary>
    public DateTimeOffset Time { get; }

    /// <summary>ṁ [kg/s], feed flow into the pass.</summary>
    public MassFlow? FeedFlow => _signals.FeedFlow.MassFlow;

    /// <summary>Δp [Pa], differential pressure of the outlet meter.</summary>
    public Pressure? Differential => _signals.Differential.Pressure;

    /// <summary>p [Pa], absolute pressure at the outlet meter.</summary>
    public Pressure? OutletPressure => _signals.OutletPressure.Pressure;

    /// <summary>Absolute pressure at the inlet of the pass.</summary>
    public Pressure? InletPressure => _signals.InletPressure.Pressure;

    /// <summary>Temperature of the wet steam at the outlet.</summary>
    public Temperature? OutletTemperature => _signals.OutletTemperature.Temperature;

    /// <summary>Temperature of the feed water.</summary>
    public Temperature? FeedTemperature => _signals.FeedTemperature.Temperature;

    /// <summary>Firing, as a share of full firing.</summary>
    public Ratio? Firing => _signals.Firing.Ratio;

    /// <summary>Opening of the feed valve.</summary>
    public Ratio? FeedValvePosition => _signals.FeedValve.Ratio;

    /// <summary>Metal temperatures in the order of their tags, null where one is missing; empty when none is measured.</summary>
    public IReadOnlyList<Temperature?> MetalTemperatures => _metal ?? [];

    /// <summary>Whether flow, differential and outlet pressure are all good, so that a quality can be inferred.</summary>
    public bool GivesQuality => _signals.FeedFlow.IsGood && _signals.Differential.IsGood && _signals.OutletPressure.IsGood;

    /// <summary>Status of one signal.</summary>
    /// <param name="signal">Which one.</param>
    public SignalStatus Status(PassSignal signal) => this[signal].Status;

    /// <summary>Whose tag a signal came from.</summary>
    /// <param name="signal">Which one.</param>
    public SignalSource Source(PassSignal signal) => this[signal].Source;

    /// <summary>This reading with another outlet pressure.</summary>
    /// <param name="pressure">Absolute pressure at the meter; null when missing.</param>
    public PassReading WithOutletPressure(Pressure? pressure) => With(PassSignal.OutletPressure, pressure?.Si());

    /// <summary>This reading with another inlet pressure.</summary>
    /// <param name="pressure">Absolute pressure; null when missing.</param>
    public PassReading WithInletPressure(Pressure? pressure) => With(PassSignal.InletPressure, pressure?.Si());

    /// <summary>This reading with another outlet temperature.</summary>
    /// <param name="temperature">Temperature; null when missing.</param>
    public PassReading WithOutletTemperature(Temperature? temperature) => With(PassSignal.OutletTemperature, temperature?.Si());

    /// <summary>This reading with another feed temperature.</summary>
    /// <param name="temperature">Temperature; null when missing.</param>
    public PassReading WithFeedTemperature(Temperature? temperature) => With(PassSignal.FeedTemperature, temperature?.Si());

    /// <summary>This reading with another firing.</summary>
    /// <param name="firing">Share of full firing; null when missing.</param>
    public PassReading WithFiring(Ratio? firing) => With(PassSignal.Firing, firing?.Si());

    /// <summary>This reading with another opening of the feed valve.</summary>
    /// <param name="position">Opening; null when missing.</param>
    public PassReading WithFeedValvePosition(Ratio? position) => With(PassSignal.FeedValvePosition, position?.Si());

    /// <summary>This reading with its metal temperatures.</summary>
    /// <param name="temperatures">One for each tag; null where one is missing.</param>
    public PassReading WithMetalTemperatures(IEnumerable<Temperature?> temperatures) =>
        new(Time, _signals, [.. Require.NotNull(temperatures, nameof(temperatures))]);

    /// <summary>This reading with one signal taken out and the reason in its place.</summary>
    /// <param name="signal">Which one.</param>
    /// <param name="status">The reason: missing, bad or out of range.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="status"/> is good: give the value instead.</exception>
    public PassReading Without(PassSignal signal, SignalStatus status) =>
        status == SignalStatus.Good ? throw new ArgumentOutOfRangeException(nameof(status), status, "A signal is taken out with the reason, not as good.") : With(signal, Signal.Without(status));

    internal object ToDump() => ToString();

    /// <summary>The time and the values that are there; invariant.</summary>
    public override string ToString() => string.Format(
        CultureInfo.InvariantCulture,
        "{0:yyyy-MM-dd HH:mm:ss zzz}: flow {1}, outlet pressure {2}, differential {3}",
        Time, Text(_signals.FeedFlow, Scale.KilogramsPerSecond), Text(_signals.OutletPressure, Scale.Megapascals), Text(_signals.Differential, Scale.Kilopascals));

    private static string Text(in Signal signal, Scale scale) => signal.IsGood ? scale.Text(signal.Si) : signal.Status.ToString();
}
