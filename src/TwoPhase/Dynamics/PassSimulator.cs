using TwoPhase.Numerics;
using TwoPhase.Passes;
using TwoPhase.Steam;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Dynamics;

/// <summary>A pass in time: what feed, heat and outlet pressure do to its quality, its holdup, and to what its meter indicates. One thread each.</summary>
/// <remarks>
/// <para>Mass, energy and metal energy in finite volumes along the pass, any slip model, flashing of the stored water included; the pressure
/// along the pass follows the friction of the moment through a lag. Starts at rest. Deterministic; work per second is bounded.</para>
/// <para>The outlet pressure is that at the outlet, or of the header behind the pass's <see cref="OutletLine"/>, which says whether a non-return
/// valve stands there and at which of its ends the meter stands.</para>
/// <para>Range: flow forwards everywhere, outlet pressure below the critical one. A run that stagnates or reverses ends there and says so.
/// Not modelled: waves of sound, flow instability, a wall that dries out, a feed interchanger.</para>
/// <para>Advisory only: it shows physics. It is no operating procedure and no safety function; those follow the plant's boiler and
/// burner-management codes and licensed operators.</para>
/// </remarks>
public sealed partial class PassSimulator
{
    private readonly Channel<SurfaceFluid> _channel;
    private readonly MeterChain _meter;
    private readonly SurfaceFluid _fluid = new(SteamSurface.Default);
    private double _time, _timeShut;

    /// <summary>A pass at rest.</summary>
    /// <param name="pass">The pass; its meter stands at the outlet unless the options name another.</param>
    /// <param name="initial">Conditions at the start.</param>
    /// <param name="options">How to simulate; null for the defaults.</param>
    /// <exception cref="ArgumentException">The pass has no section or a feed interchanger, or there is heat and no heated section.</exception>
    /// <exception cref="ArgumentOutOfRangeException">A condition is outside its limits, or leads outside the steam formulation.</exception>
    /// <exception cref="ConvergenceException">The pressure along the pass did not settle.</exception>
    public PassSimulator(Pass pass, PassConditions initial, SimulatorOptions? options = null)
    {
        Pass = Require.NotNull(pass, nameof(pass));
        Options = options ?? SimulatorOptions.Default;
        if (pass.Ducts.Length == 0) throw new ArgumentException($"Pass '{pass.Name}' has no section: its simulation needs its tubes.", nameof(pass));
        if (pass.Interchanger is not null) throw new ArgumentException($"Pass '{pass.Name}' has a feed interchanger, which the simulator does not model.", nameof(pass));
        Check(initial, nameof(initial));
        _channel = new(_fluid, pass.Ducts, Options.Models, Options.Cells) { MetalStores = Options.MetalStoresHeat, HeadLag = Options.RawPressureLag, HeatLags = Options.HeatLags, HasNonReturnValve = pass.OutletLine is { HasNonReturnValve: true } };
        while (pass.OutletLine is { IsMeterAtTubeEnd: true } && _channel.Cells[_channel.MeteredCell].Duct == pass.Sections.Count) _channel.MeteredCell--;
        _meter = new(Options.Meter ?? pass.Meter, Options.Lags);
        Conditions = initial;
        Rest(initial);
        Now = Look(0);
    }

    /// <summary>The pass.</summary>
    public Pass Pass { get; }

    /// <summary>How it is simulated.</summary>
    public SimulatorOptions Options { get; }

    /// <summary>The conditions last imposed.</summary>
    public PassConditions Conditions { get; private set; }

    /// <summary>The pass at the present instant.</summary>
    public PassInstant Now { get; private set; }

    /// <summary>Why the simulation cannot go on; <see cref="SimulationEnd.None"/> while it can.</summary>
    public SimulationEnd End { get; private set; }

    /// <summary>The end in words, with place and time; empty while the simulation can go on.</summary>
    public string EndReason { get; private set; } = "";

    /// <summary>Moves on under given conditions: feed flow, feed temperature and heat hold throughout, the outlet pressure goes evenly to its new value. The heat stays split as the last run left it.</summary>
    /// <param name="conditions">The conditions.</param>
    /// <param name="duration">How long, greater than zero.</param>
    /// <returns>The pass at the end of that time; where the run ended within it (see <see cref="End"/>), at the last instant before.</returns>
    /// <exception cref="ArgumentException">A condition is outside its limits.</exception>
    /// <exception cref="InvalidOperationException">The run has ended before.</exception>
    public PassInstant Advance(PassConditions conditions, Duration duration)
    {
        double seconds = Require.Positive(duration.Si(), "Duration", Scale.Seconds, nameof(duration));
        Check(conditions, nameof(conditions));
        return AdvanceCore(conditions, seconds);
    }

    /// <summary>Runs through a schedule and keeps a row for every <see cref="SimulatorOptions.Sampling"/>, the present instant first.</summary>
    /// <param name="schedule">The schedule; its times count from the present instant.</param>
    /// <param name="duration">How long.</param>
    /// <returns>The history; where the flow stagnates before the time is over it ends there and says so.</returns>
    /// <exception cref="ArgumentException">A condition is outside its limits.</exception>
    /// <exception cref="InvalidOperationException">The run has ended before.</exception>
    public PassHistory Run(OperatingSchedule schedule, Duration duration) => RunToDryout(schedule, duration, double.PositiveInfinity);

    /// <summary>Runs through a schedule until a true quality is reached at the outlet.</summary>
    internal PassHistory RunToDryout(OperatingSchedule schedule, Duration duration, double dryout)
    {
        Require.NotNull(schedule, nameof(schedule));
        double seconds = Require.Positive(duration.Si(), "Duration", Scale.Seconds, nameof(duration));
        int count = (int)Math.Ceiling((seconds / Options.RawSampling) - 1e-9);
        HeatSplit.Factors split = schedule.Split.For(Pass, nameof(schedule));
        var rows = new List<PassInstant>(count + 1) { Now };
        for (int i = 0; i < count && End == SimulationEnd.None; i++)
        {
            double from = i * Options.RawSampling, to = Math.Min(seconds, from + Options.RawSampling);
            PassConditions conditions = schedule.Over(from, to);
            PassInstant row = Advance(conditions, split, from, to);
            if (End != SimulationEnd.None) break;
            rows.Add(row);
            if (row.RawTrueQuality >= dryout) (End, EndReason) = (SimulationEnd.DryoutReached, FormattableString.Invariant($"Pass '{Pass.Name}' dries out at its outlet at {_time:G6} s, with a true quality of {row.RawTrueQuality:F3}."));
        }

        return new(rows, End == SimulationEnd.None ? SimulationEnd.Completed : End, EndReason);
    }

    /// <summary>ρ of the feed at a pressure in front of the pass [kg/m³].</summary>
    internal double FeedDensity(in PassConditions conditions, double pressure) =>
        1 / _fluid.At(pressure, FeedEnthalpy(conditions, pressure), _fluid.Saturated(pressure)).SpecificVolume;

    /// <summary>Moves on through a part of a schedule.</summary>
    internal PassInstant Advance(in PassConditions conditions, HeatSplit.Factors split, double from, double to)
    {
        Check(conditions, "schedule");
        _channel.Split(split.Over(from, to));
        return AdvanceCore(conditions, to - from);
    }

    internal void StopForLackOfFeed() =>
        (End, EndReason) = (SimulationEnd.FlowStagnated, FormattableString.Invariant($"The feed of pass '{Pass.Name}' came to a stand at {_time:G6} s: its valve passes nothing."));

    private PassInstant AdvanceCore(in PassConditions conditions, double seconds)
    {
        if (End != SimulationEnd.None) throw new InvalidOperationException($"The simulation has ended: {EndReason}");
        (_channel.Heat, _channel.FeedEnthalpy) = (conditions.RawAbsorbedHeat, FeedEnthalpy(conditions, _channel.InletPressure));
        Conditions = conditions;
        if (!_channel.Advance(seconds, conditions.RawFeedFlow, conditions.RawOutletPressure))
        {
            Stop();
            return Now;
        }

        _time += seconds;
        return Now = Look(seconds);
    }

    private void Stop()
    {
        Cell cell = _channel.Cells[_channel.Stagnant];
        bool lost = !Fast.IsFinite(cell.Temperature) || cell.Temperature <= 0;
        End = lost ? SimulationEnd.OutsideFormulation : SimulationEnd.FlowStagnated;
        string what = lost ? "the water left the range of the steam formulation" : "the flow stagnated or reversed";
        EndReason = FormattableString.Invariant($"In section '{Pass.Ducts[cell.Duct].Name}' {cell.Start:F0} m from the inlet {what}, within {_channel.Time - _time:G3} s after {_time:G6} s.");
        if (!lost) EndReason += " The model follows no flow backwards, and leaves out the inertia that may carry it past such a moment: a real pass may go on, and how is not known. More cells show whether the end hangs on the grid.";
    }
}
