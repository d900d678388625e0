using TwoPhase.Metering;
using TwoPhase.Passes;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Dynamics;

/// <summary>
/// A light-off as physics has it: a pass full of liquid, cold or warm, is held at low fire and then fired up; it begins to boil, at its outlet
/// unless colder water still stands before it, the steam throws out the water downstream, and the pass comes to rest with wet steam.
/// </summary>
/// <remarks>
/// <para>Shows what a given course of firing does. It is no start-up procedure and proposes no course: purge, ignition, low-water-flow and
/// high-temperature trips follow the plant's burner-management and boiler codes and licensed operators.</para>
/// <para>Feed flow and outlet pressure hold throughout, any pressure: at low pressure the surge is the larger one, since a little steam takes more room.</para>
/// <para>At low pressure, and where cold water is driven out by much hotter feed, flow and pressure may push each other until the flow turns back
/// somewhere: the run then ends there and says where. Of 18 courses of an invented pass filled with cold water 17 ended so at 0.6 MPa, 10 at 1 MPa and none at
/// 2 MPa; fewer with less fire while it begins to boil. Near such an end it hangs on the number of cells, since the inertia of the water is not in the model.</para>
/// <para>Immutable; each <c>With…</c> method returns a changed copy.</para>
/// </remarks>
public sealed class LightOff
{
    // Water of different temperatures lies in the pass in slugs that the default of a pass at work is too coarse for.
    private const int Cells = 160;

    private readonly double _lowFire, _hold, _ramp;

    // A minute of flow without fire, so that a picture shows what was before; half an hour for the pass to come to rest.
    private double _ignition = 60, _settling = 1800;
    private Temperature? _water;

    /// <summary>A light-off towards given conditions.</summary>
    /// <param name="running">Conditions at its end: feed, outlet pressure, and the heat of full course.</param>
    /// <param name="lowFire">Heat at low fire over that of the running pass, 0 to 1.</param>
    /// <param name="hold">How long it is held there.</param>
    /// <param name="ramp">How long the way from there to the running heat takes, in a straight line.</param>
    /// <exception cref="ArgumentOutOfRangeException">A value is outside its limits.</exception>
    public LightOff(PassConditions running, Ratio lowFire, Duration hold, Duration ramp)
    {
        Require.Positive(running.RawFeedFlow, "Feed flow", Scale.KilogramsPerSecond, nameof(running));
        Require.Positive(running.RawAbsorbedHeat, "Absorbed heat", Scale.Megawatts, nameof(running));
        Running = running;
        _lowFire = Require.Within(lowFire.Si(), 0, 1, "Low fire over running", Scale.None, nameof(lowFire));
        _hold = Require.NotNegative(hold.Si(), "Hold at low fire", Scale.Seconds, nameof(hold));
        _ramp = Require.NotNegative(ramp.Si(), "Firing ramp", Scale.Seconds, nameof(ramp));
    }

    /// <summary>Conditions at the end.</summary>
    public PassConditions Running { get; }

    /// <summary>When the fire comes: water flows through the unheated pass before.</summary>
    public Duration Ignition => Duration.FromSeconds(_ignition);

    /// <summary>When low fire ends and the firing begins to rise.</summary>
    public Duration RampBegins => Duration.FromSeconds(_ignition + _hold);

    /// <summary>When the firing has reached that of the running pass.</summary>
    public Duration RampEnds => Duration.FromSeconds(_ignition + _hold + _ramp);

    /// <summary>Length of the whole run.</summary>
    public Duration Length => Duration.FromSeconds(_ignition + _hold + _ramp + _settling);

    /// <summary>The transmitter over the meter; null when none was given.</summary>
    public DifferentialPressureTransmitter? Transmitter { get; private set; }

    /// <summary>The course as a schedule.</summary>
    /// <exception cref="ArgumentException">The water in the pass has a temperature of its own, and the feed is given by its enthalpy.</exception>
    public OperatingSchedule Schedule
    {
        get
        {
            PassConditions cold = Running.WithAbsorbedHeat(Power.Zero);
            OperatingSchedule schedule = _water is { } water && Running.FeedTemperature is { } feed
                ? new OperatingSchedule(cold.WithFeedTemperature(water)).StepFeedTemperature(Duration.Zero, feed)
                : new OperatingSchedule(cold);
            return schedule.StepAbsorbedHeat(Ignition, Power.FromWatts(_lowFire * Running.RawAbsorbedHeat)).RampAbsorbedHeat(RampBegins, Duration.FromSeconds(_ramp), Running.AbsorbedHeat);
        }
    }

    /// <summary>With water and metal of another temperature than the feed's before it begins: a cold pass.</summary>
    /// <param name="temperature">Temperature of what fills the pass, that of liquid.</param>
    /// <exception cref="ArgumentException">The feed is given by its enthalpy.</exception>
    public LightOff WithWaterTemperature(Temperature temperature)
    {
        Require.Positive(temperature.Si(), "Water temperature", Scale.Celsius, nameof(temperature));
        if (Running.IsFeedByEnthalpy) throw new ArgumentException("The feed is given by its enthalpy, so the water in the pass cannot have another temperature.", nameof(temperature));
        return Changed(copy => copy._water = temperature);
    }

    /// <summary>With another time of flow without fire before it begins.</summary>
    /// <param name="at">Zero or more.</param>
    /// <exception cref="ArgumentOutOfRangeException">The time is negative.</exception>
    public LightOff WithIgnition(Duration at)
    {
        double seconds = Require.NotNegative(at.Si(), "Time of ignition", Scale.Seconds, nameof(at));
        return Changed(copy => copy._ignition = seconds);
    }

    /// <summary>With another time after the ramp, in which the pass comes to rest.</summary>
    /// <param name="settling">Greater than zero.</param>
    /// <exception cref="ArgumentOutOfRangeException">The time is not greater than zero.</exception>
    public LightOff WithSettling(Duration settling)
    {
        double seconds = Require.Positive(settling.Si(), "Time to settle", Scale.Seconds, nameof(settling));
        return Changed(copy => copy._settling = seconds);
    }

    /// <summary>With a transmitter over the meter, so that the report says when it is at its ceiling.</summary>
    /// <param name="transmitter">The transmitter as it is set up.</param>
    public LightOff WithTransmitter(DifferentialPressureTransmitter transmitter)
    {
        Require.NotNull(transmitter, nameof(transmitter));
        return Changed(copy => copy.Transmitter = transmitter);
    }

    /// <summary>Runs it.</summary>
    /// <param name="pass">The pass.</param>
    /// <param name="options">How to simulate; null for the defaults with 160 cells.</param>
    /// <exception cref="ArgumentException">The pass cannot be simulated, or a condition is outside its limits.</exception>
    public LightOffReport Run(Pass pass, SimulatorOptions? options = null)
    {
        OperatingSchedule schedule = Schedule;
        return new(this, new PassSimulator(pass, schedule.Start, options ?? SimulatorOptions.Default.WithCells(Cells)).Run(schedule, Length));
    }

    private LightOff Changed(Action<LightOff> change)
    {
        var copy = (LightOff)MemberwiseClone();
        change(copy);
        return copy;
    }
}
