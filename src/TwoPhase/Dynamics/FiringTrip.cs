using TwoPhase.Metering;
using TwoPhase.Passes;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Dynamics;

/// <summary>A trip of the firing as physics has it: the fire goes out, the feed flows on and fills the pass with water again, which quenches it.</summary>
/// <remarks>
/// <para>Shows what happens to a pass and is no procedure; trips follow the plant's burner-management and boiler codes and licensed operators.</para>
/// <para>The outlet pressure holds. What refractory and gas still give is in the <see cref="SimulatorOptions.HeatLags"/> of the simulation.</para>
/// </remarks>
public sealed class FiringTrip
{
    // A minute before, so that a picture shows what was.
    private const double Before = 60;

    private readonly double _after;

    /// <summary>A trip from given conditions.</summary>
    /// <param name="running">Conditions before it.</param>
    /// <param name="after">How long it is followed; half an hour unless given.</param>
    /// <param name="transmitter">The transmitter over the meter, so that the report says when it is at its ceiling; none unless given.</param>
    /// <exception cref="ArgumentOutOfRangeException">Feed flow, heat or length is not greater than zero.</exception>
    public FiringTrip(PassConditions running, Duration? after = null, DifferentialPressureTransmitter? transmitter = null)
    {
        Require.Positive(running.RawFeedFlow, "Feed flow", Scale.KilogramsPerSecond, nameof(running));
        Require.Positive(running.RawAbsorbedHeat, "Absorbed heat", Scale.Megawatts, nameof(running));
        (Running, Transmitter) = (running, transmitter);
        _after = after is { } given ? Require.Positive(given.Si(), "Time after the trip", Scale.Seconds, nameof(after)) : 1800;
    }

    /// <summary>Conditions before it.</summary>
    public PassConditions Running { get; }

    /// <summary>When the fire goes out.</summary>
    public Duration FireOut { get; } = Duration.FromSeconds(Before);

    /// <summary>Length of the whole run.</summary>
    public Duration Length => Duration.FromSeconds(Before + _after);

    /// <summary>The transmitter over the meter; null when none was given.</summary>
    public DifferentialPressureTransmitter? Transmitter { get; }

    /// <summary>The course as a schedule.</summary>
    public OperatingSchedule Schedule => new OperatingSchedule(Running).StepAbsorbedHeat(FireOut, Power.Zero);

    /// <summary>Runs it.</summary>
    /// <param name="pass">The pass.</param>
    /// <param name="options">How to simulate; null for the defaults.</param>
    /// <exception cref="ArgumentException">The pass cannot be simulated, or a condition is outside its limits.</exception>
    public FiringTripReport Run(Pass pass, SimulatorOptions? options = null) => new(this, new PassSimulator(pass, Running, options).Run(Schedule, Length));
}
