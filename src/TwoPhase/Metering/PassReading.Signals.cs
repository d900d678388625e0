using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Metering;

public readonly partial struct PassReading
{
    private PassReading(DateTimeOffset time, in SignalSet signals, Temperature?[]? metal) => (Time, _signals, _metal) = (time, signals, metal);

    internal Signal this[PassSignal signal] => _signals.Get(signal);

    /// <summary>Same time and same signals.</summary>
    /// <param name="left">One reading.</param>
    /// <param name="right">The other reading.</param>
    public static bool operator ==(PassReading left, PassReading right) => left.Equals(right);

    /// <summary>Another time or another signal.</summary>
    /// <param name="left">One reading.</param>
    /// <param name="right">The other reading.</param>
    public static bool operator !=(PassReading left, PassReading right) => !left.Equals(right);

    /// <summary>Same time and same signals.</summary>
    /// <param name="other">The other reading.</param>
    public bool Equals(PassReading other)
    {
        if (Time != other.Time || !MetalTemperatures.Select(Kelvins).SequenceEqual(other.MetalTemperatures.Select(Kelvins))) return false;
        for (PassSignal signal = PassSignal.FeedFlow; (int)signal < PassSignals.Count; signal++)
        {
            if (!this[signal].Equals(other[signal])) return false;
        }

        return true;
    }

    /// <summary>Same time and same signals.</summary>
    /// <param name="obj">The other reading.</param>
    public override bool Equals(object? obj) => obj is PassReading other && Equals(other);

    /// <summary>Hash of time, flow and differential.</summary>
    public override int GetHashCode() => (Time, _signals.FeedFlow, _signals.Differential).GetHashCode();

    /// <summary>This reading with one signal read from an SI value, the pass's own; null or NaN is missing.</summary>
    internal PassReading With(PassSignal signal, double? si) =>
        With(signal, Signal.Read(si ?? double.NaN, PassSignals.Kind(signal), SignalSource.Pass));

    internal PassReading With(PassSignal signal, in Signal value)
    {
        SignalSet changed = _signals;
        changed.Set(signal, value);
        return new PassReading(Time, changed, _metal);
    }

    private static double? Kelvins(Temperature? temperature) => temperature?.Si();

    // Fields, not an array: a reading is made for every sample, and must not allocate.
    private struct SignalSet
    {
        public Signal FeedFlow;
        public Signal Differential;
        public Signal OutletPressure;
        public Signal InletPressure;
        public Signal OutletTemperature;
        public Signal FeedTemperature;
        public Signal Firing;
        public Signal FeedValve;

        public static SignalSet Missing
        {
            get
            {
                var nothing = Signal.Without(SignalStatus.Missing);
                return new()
                {
                    FeedFlow = nothing,
                    Differential = nothing,
                    OutletPressure = nothing,
                    InletPressure = nothing,
                    OutletTemperature = nothing,
                    FeedTemperature = nothing,
                    Firing = nothing,
                    FeedValve = nothing,
                };
            }
        }

        public readonly Signal Get(PassSignal signal) => signal switch
        {
            PassSignal.FeedFlow => FeedFlow,
            PassSignal.Differential => Differential,
            PassSignal.OutletPressure => OutletPressure,
            PassSignal.InletPressure => InletPressure,
            PassSignal.OutletTemperature => OutletTemperature,
            PassSignal.FeedTemperature => FeedTemperature,
            PassSignal.Firing => Firing,
            PassSignal.FeedValvePosition => FeedValve,
            _ => default,
        };

        public void Set(PassSignal signal, in Signal value)
        {
            switch (signal)
            {
                case PassSignal.FeedFlow: FeedFlow = value; break;
                case PassSignal.Differential: Differential = value; break;
                case PassSignal.OutletPressure: OutletPressure = value; break;
                case PassSignal.InletPressure: InletPressure = value; break;
                case PassSignal.OutletTemperature: OutletTemperature = value; break;
                case PassSignal.FeedTemperature: FeedTemperature = value; break;
                case PassSignal.Firing: Firing = value; break;
                case PassSignal.FeedValvePosition: FeedValve = value; break;
                default: throw new ArgumentOutOfRangeException(nameof(signal), signal, "This is no signal of a pass.");
            }
        }
    }
}
