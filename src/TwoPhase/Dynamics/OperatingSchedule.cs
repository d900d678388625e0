using TwoPhase.Passes;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Dynamics;

/// <summary>What is done to a pass in time: feed flow, feed temperature, absorbed heat, its split along the pass and outlet pressure, each constant, in steps, in ramps, or from a column of history.</summary>
/// <remarks>Immutable; each method returns a changed copy. Changes of one quantity are added in the order of time. Times count from the start of the run.</remarks>
public sealed partial class OperatingSchedule
{
    private TimeCurve _flow, _temperature, _pressure, _heat;

    /// <summary>Nothing changes: the start of every other schedule.</summary>
    /// <param name="start">Conditions at the start.</param>
    public OperatingSchedule(PassConditions start)
    {
        Start = start;
        _flow = TimeCurve.Constant(Require.Positive(start.RawFeedFlow, "Feed flow", Scale.KilogramsPerSecond, nameof(start)));
        _temperature = TimeCurve.Constant(start.RawFeedTemperature);
        _pressure = TimeCurve.Constant(start.RawOutletPressure);
        _heat = TimeCurve.Constant(start.RawAbsorbedHeat);
    }

    /// <summary>Conditions at the start.</summary>
    public PassConditions Start { get; }

    /// <summary>Time of the last change.</summary>
    public Duration LastChange => Duration.FromSeconds(Math.Max(Math.Max(Math.Max(_flow.End, _temperature.End), Math.Max(_pressure.End, _heat.End)), _split.End));

    /// <summary>The conditions at a time; behind a step where one stands.</summary>
    /// <param name="time">Time since the start.</param>
    public PassConditions At(Duration time)
    {
        double t = time.Si();
        return Start with { RawFeedFlow = _flow.At(t), RawFeedTemperature = _temperature.At(t), RawOutletPressure = _pressure.At(t), RawAbsorbedHeat = _heat.At(t) };
    }

    /// <summary>A step of the feed flow.</summary>
    /// <param name="at">Time of the step.</param>
    /// <param name="to">Flow behind it, greater than zero.</param>
    public OperatingSchedule StepFeedFlow(Duration at, MassFlow to) => RampFeedFlow(at, Duration.Zero, to);

    /// <summary>A ramp of the feed flow.</summary>
    /// <param name="from">When it begins.</param>
    /// <param name="over">How long it takes; zero for a step.</param>
    /// <param name="to">Flow at its end, greater than zero.</param>
    /// <exception cref="ArgumentOutOfRangeException">It begins before the change before it ends, or a value is outside its limits.</exception>
    public OperatingSchedule RampFeedFlow(Duration from, Duration over, MassFlow to)
    {
        double value = Require.Positive(to.Si(), "Feed flow", Scale.KilogramsPerSecond, nameof(to));
        return Changed(copy => copy._flow = copy._flow.Ramp(from, over, value, "feed flow"));
    }

    /// <summary>A step of the feed temperature.</summary>
    /// <param name="at">Time of the step.</param>
    /// <param name="to">Temperature behind it.</param>
    public OperatingSchedule StepFeedTemperature(Duration at, Temperature to) => RampFeedTemperature(at, Duration.Zero, to);

    /// <summary>A ramp of the feed temperature.</summary>
    /// <param name="from">When it begins.</param>
    /// <param name="over">How long it takes; zero for a step.</param>
    /// <param name="to">Temperature at its end.</param>
    /// <exception cref="ArgumentException">The feed at the start is given by its enthalpy.</exception>
    /// <exception cref="ArgumentOutOfRangeException">It begins before the change before it ends, or a value is outside its limits.</exception>
    public OperatingSchedule RampFeedTemperature(Duration from, Duration over, Temperature to)
    {
        CheckFeed(nameof(to));
        double value = Require.Positive(to.Si(), "Feed temperature", Scale.Celsius, nameof(to));
        return Changed(copy => copy._temperature = copy._temperature.Ramp(from, over, value, "feed temperature"));
    }

    /// <summary>A step of the outlet pressure; a run spreads it over one of its steps.</summary>
    /// <param name="at">Time of the step.</param>
    /// <param name="to">Absolute pressure behind it.</param>
    public OperatingSchedule StepOutletPressure(Duration at, Pressure to) => RampOutletPressure(at, Duration.Zero, to);

    /// <summary>A ramp of the outlet pressure.</summary>
    /// <param name="from">When it begins.</param>
    /// <param name="over">How long it takes; zero for a step.</param>
    /// <param name="to">Absolute pressure at its end.</param>
    /// <exception cref="ArgumentOutOfRangeException">It begins before the change before it ends, or a value is outside its limits.</exception>
    public OperatingSchedule RampOutletPressure(Duration from, Duration over, Pressure to)
    {
        double value = Require.Positive(to.Si(), "Outlet pressure", Scale.Megapascals, nameof(to));
        return Changed(copy => copy._pressure = copy._pressure.Ramp(from, over, value, "outlet pressure"));
    }

    /// <summary>A step of the absorbed heat.</summary>
    /// <param name="at">Time of the step.</param>
    /// <param name="to">Heat behind it, zero or more.</param>
    public OperatingSchedule StepAbsorbedHeat(Duration at, Power to) => RampAbsorbedHeat(at, Duration.Zero, to);

    /// <summary>A ramp of the absorbed heat.</summary>
    /// <param name="from">When it begins.</param>
    /// <param name="over">How long it takes; zero for a step.</param>
    /// <param name="to">Heat at its end, zero or more.</param>
    /// <exception cref="ArgumentOutOfRangeException">It begins before the change before it ends, or a value is outside its limits.</exception>
    public OperatingSchedule RampAbsorbedHeat(Duration from, Duration over, Power to)
    {
        double value = Require.NotNegative(to.Si(), "Absorbed heat", Scale.Megawatts, nameof(to));
        return Changed(copy => copy._heat = copy._heat.Ramp(from, over, value, "absorbed heat"));
    }

    /// <summary>A step of the firing, the heat taken as proportional to it.</summary>
    /// <param name="at">Time of the step.</param>
    /// <param name="ofStart">Firing behind it over that at the start: 106 % for six per cent more.</param>
    public OperatingSchedule StepFiring(Duration at, Ratio ofStart) => RampFiring(at, Duration.Zero, ofStart);

    /// <summary>A ramp of the firing, the heat taken as proportional to it.</summary>
    /// <param name="from">When it begins.</param>
    /// <param name="over">How long it takes; zero for a step.</param>
    /// <param name="ofStart">Firing at its end over that at the start.</param>
    /// <exception cref="ArgumentOutOfRangeException">It begins before the change before it ends, or a value is outside its limits.</exception>
    public OperatingSchedule RampFiring(Duration from, Duration over, Ratio ofStart)
    {
        double value = Require.NotNegative(ofStart.Si(), "Firing over that at the start", Scale.None, nameof(ofStart)) * Start.RawAbsorbedHeat;
        return Changed(copy => copy._heat = copy._heat.Ramp(from, over, value, "absorbed heat"));
    }

    /// <summary>Whether the feed flow ever changes.</summary>
    internal bool MovesFeedFlow => _flow.Range() != (Start.RawFeedFlow, Start.RawFeedFlow);

    /// <summary>Means over an interval, which keep mass and heat whole, and the pressure at its end.</summary>
    internal PassConditions Over(double from, double to) => Start with
    {
        RawFeedFlow = _flow.Mean(from, to),
        RawFeedTemperature = _temperature.Mean(from, to),
        RawOutletPressure = _pressure.At(to),
        RawAbsorbedHeat = _heat.Mean(from, to),
    };

    private void CheckFeed(string parameter)
    {
        if (Start.IsFeedByEnthalpy) throw new ArgumentException("The feed at the start is given by its enthalpy, so its temperature cannot be changed.", parameter);
    }

    private OperatingSchedule Changed(Action<OperatingSchedule> change)
    {
        var copy = (OperatingSchedule)MemberwiseClone();
        change(copy);
        return copy;
    }
}
