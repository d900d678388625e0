using TwoPhase.Metering;
using TwoPhase.Passes;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Dynamics;

/// <summary>A loss of feed flow with the fire on, as physics has it, up to dryout: beyond that the model has nothing to say, and the run stops.</summary>
/// <remarks>
/// <para>Shows how much time the water in the tubes gives, and no more. It is no basis for a setting: low-water-flow and high-temperature trips
/// follow the plant's burner-management and boiler codes and licensed operators.</para>
/// <para>Heat and outlet pressure hold. Firing that answers the loss is a schedule of one's own.</para>
/// </remarks>
public sealed class FlowLoss
{
    private const double Before = 60;

    private readonly double _left, _over, _dryout, _longest;

    /// <summary>A loss of flow from given conditions.</summary>
    /// <param name="running">Conditions before it.</param>
    /// <param name="left">Feed flow that is left over that before, greater than 0 and less than 1.</param>
    /// <param name="over">How long the flow takes to fall, in a straight line; zero for at once.</param>
    /// <param name="dryout">True quality at the outlet that counts as dryout and ends the run, up to 1; 0.95 unless given, by when the walls of most passes are dry (common practice, no source).</param>
    /// <param name="longest">How long it is followed at most; an hour unless given.</param>
    /// <param name="transmitter">The transmitter over the meter, so that the report says when it is at its ceiling; none unless given.</param>
    /// <exception cref="ArgumentOutOfRangeException">A value is outside its limits.</exception>
    public FlowLoss(PassConditions running, Ratio left, Duration over, MassFraction? dryout = null, Duration? longest = null, DifferentialPressureTransmitter? transmitter = null)
    {
        Require.Positive(running.RawFeedFlow, "Feed flow", Scale.KilogramsPerSecond, nameof(running));
        Require.Positive(running.RawAbsorbedHeat, "Absorbed heat", Scale.Megawatts, nameof(running));
        (Running, Transmitter) = (running, transmitter);
        _left = Require.Below(Require.Positive(left.Si(), "Feed flow left", Scale.None, nameof(left)), 1, "Feed flow left", Scale.None, nameof(left));
        _over = Require.NotNegative(over.Si(), "Fall of the feed flow", Scale.Seconds, nameof(over));
        _dryout = dryout is { } quality ? Require.Within(Require.Positive(quality.Si(), "Quality at dryout", Scale.None, nameof(dryout)), 0, 1, "Quality at dryout", Scale.None, nameof(dryout)) : 0.95;
        _longest = longest is { } given ? Require.Positive(given.Si(), "Time after the loss", Scale.Seconds, nameof(longest)) : 3600;
    }

    /// <summary>Conditions before it.</summary>
    public PassConditions Running { get; }

    /// <summary>When the flow begins to fall.</summary>
    public Duration FlowFalls { get; } = Duration.FromSeconds(Before);

    /// <summary>True quality at the outlet that counts as dryout.</summary>
    public MassFraction Dryout => MassFraction.FromDecimalFractions(_dryout);

    /// <summary>Longest run.</summary>
    public Duration Length => Duration.FromSeconds(Before + _longest);

    /// <summary>The transmitter over the meter; null when none was given.</summary>
    public DifferentialPressureTransmitter? Transmitter { get; }

    /// <summary>The course as a schedule.</summary>
    public OperatingSchedule Schedule => new OperatingSchedule(Running).RampFeedFlow(FlowFalls, Duration.FromSeconds(_over), Running.FeedFlow * _left);

    /// <summary>Runs it, up to dryout.</summary>
    /// <param name="pass">The pass.</param>
    /// <param name="options">How to simulate; null for the defaults.</param>
    /// <exception cref="ArgumentException">The pass cannot be simulated, a condition is outside its limits, or the pass is dry before the loss.</exception>
    public FlowLossReport Run(Pass pass, SimulatorOptions? options = null)
    {
        var simulator = new PassSimulator(pass, Running, options);
        double quality = simulator.Now.RawTrueQuality;
        if (!(quality < _dryout)) throw new ArgumentException(FormattableString.Invariant($"Pass '{pass.Name}' leaves with a true quality of {quality:G4} before the loss, at or above the {_dryout:G4} that counts as dryout."), nameof(pass));
        return new(this, simulator.RunToDryout(Schedule, Length, _dryout));
    }
}
