using TwoPhase.Dynamics;
using TwoPhase.Metering;
using TwoPhase.Passes;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Advisory;

/// <summary>
/// A quality trim around a simulated pass: moves the feed flow by the raw, the corrected or a blended quality, with feed-forward on firing and feed temperature,
/// and shows what that does to the true quality. One thread each.
/// </summary>
/// <remarks>
/// <para>A study tool, not a controller configuration: nothing here is fit to be entered into a control system. It makes no claim that one source controls
/// better than another: the raw reading is false while the holdup moves, but it moves at once and so carries lead; the corrected value is true and comes late. Which
/// matters more depends on the disturbance, the tuning and how well the estimator knows the pass: see <see cref="TrimStudy"/>.</para>
/// <para>A controlled variable needs a fallback for when it cannot be believed. Here the trim then holds and the flow follows its feed-forward alone
/// (<see cref="TrimStatus.Holding"/>); what a plant does is for its own engineers, who design, review and test it by the codes that bind them.</para>
/// <para>Unless told otherwise the estimator knows the pass as well as the simulator does, which no plant's estimator does.</para>
/// </remarks>
public sealed class TrimLoop
{
    // For so long the estimator watches the pass at rest before the loop closes [s].
    private const double Watch = 3600;

    // A simulated instrument that stands still is no frozen one.
    private static readonly Duration Forever = Duration.FromDays(1000);

    private static readonly DateTimeOffset Midnight = new(2000, 1, 1, 0, 0, 0, TimeSpan.Zero);

    private readonly PassConditions _start;
    private readonly double _outletEnthalpy, _startEnthalpy;
    private FlowTrim _trim;
    private double _laggedEnthalpy;

    /// <summary>A loop around a pass at rest.</summary>
    /// <param name="pass">The pass, with its meter.</param>
    /// <param name="initial">Conditions at the start, the feed given by its temperature, heat above zero.</param>
    /// <param name="source">What the trim is fed with.</param>
    /// <param name="settings">How it moves the flow; null for the defaults.</param>
    /// <param name="options">How the pass is simulated; null for the defaults.</param>
    /// <param name="knownAs">The pass as the estimator knows it; null for as it is.</param>
    /// <exception cref="ArgumentException">The pass cannot be simulated, has no meter, no heat, or its feed is given by its enthalpy.</exception>
    public TrimLoop(Pass pass, PassConditions initial, TrimSource source, TrimSettings? settings = null, SimulatorOptions? options = null, Pass? knownAs = null)
    {
        Simulator = new(pass, initial, options);
        (Source, Settings, _start) = (source, settings ?? TrimSettings.Default, initial);
        Require.Positive(initial.RawAbsorbedHeat, "Absorbed heat", Scale.Megawatts, nameof(initial));
        if (initial.IsFeedByEnthalpy) throw new ArgumentException("The feed is given by its enthalpy; the feed-forward goes by its temperature.", nameof(initial));
        QualityMeter meter = Simulator.Options.Meter ?? pass.Meter ?? throw new ArgumentException($"Pass '{pass.Name}' has no meter to trim by.", nameof(pass));
        _startEnthalpy = _laggedEnthalpy = FeedEnthalpy(initial);
        _outletEnthalpy = _startEnthalpy + (initial.RawAbsorbedHeat / initial.RawFeedFlow);
        _trim = new(Settings, initial.RawFeedFlow);
        if (source is TrimSource.Corrected or TrimSource.Blended) Estimator = new(knownAs ?? pass, meter, ExactEstimator(Simulator.Options));
        Now = Look(TrimStatus.None, WatchAtRest());
    }

    /// <summary>The pass.</summary>
    public PassSimulator Simulator { get; }

    /// <summary>What the trim is fed with.</summary>
    public TrimSource Source { get; }

    /// <summary>How it moves the flow.</summary>
    public TrimSettings Settings { get; }

    /// <summary>Who says what the corrected value is; null where none is needed.</summary>
    public QualityEstimator? Estimator { get; }

    /// <summary>The present instant.</summary>
    public TrimInstant Now { get; private set; }

    /// <summary>One interval: moves the feed flow by what is known now, and simulates the pass through it.</summary>
    /// <param name="imposed">What else is imposed meanwhile; its feed flow is not looked at.</param>
    /// <returns>The end of the interval; the instant before where the run ended within it (see <see cref="PassSimulator.End"/>).</returns>
    /// <exception cref="ArgumentException">A condition is outside its limits.</exception>
    /// <exception cref="InvalidOperationException">The run has ended before.</exception>
    public TrimInstant Advance(PassConditions imposed)
    {
        double flow = NextFlow(out TrimStatus status);
        Simulator.Advance(imposed with { RawFeedFlow = flow }, Settings.Interval);
        return Settle(status);
    }

    /// <summary>Runs through a schedule of everything but the feed flow.</summary>
    /// <param name="schedule">The schedule; its times count from the present instant.</param>
    /// <param name="duration">How long.</param>
    /// <exception cref="ArgumentException">The schedule moves the feed flow, or a condition is outside its limits.</exception>
    /// <exception cref="InvalidOperationException">The run has ended before.</exception>
    public TrimHistory Run(OperatingSchedule schedule, Duration duration)
    {
        Require.NotNull(schedule, nameof(schedule));
        if (schedule.MovesFeedFlow) throw new ArgumentException("The schedule moves the feed flow, which is the trim's to move.", nameof(schedule));
        double seconds = Require.Positive(duration.Si(), "Duration", Scale.Seconds, nameof(duration)), interval = Settings.RawInterval;
        HeatSplit.Factors split = schedule.Split.For(Simulator.Pass, nameof(schedule));
        var rows = new List<TrimInstant> { Now };
        for (int i = 0; i < Math.Ceiling((seconds / interval) - 1e-9) && Simulator.End == SimulationEnd.None; i++)
        {
            double flow = NextFlow(out TrimStatus status), from = i * interval, to = from + interval;
            Simulator.Advance(schedule.Over(from, to) with { RawFeedFlow = flow }, split, from, to);
            if (Simulator.End == SimulationEnd.None) rows.Add(Settle(status));
        }

        return new(rows, Simulator.End == SimulationEnd.None ? SimulationEnd.Completed : Simulator.End, Simulator.EndReason);
    }

    // The estimator reads the meter itself, without the lags of the simulated instruments.
    private static EstimatorOptions ExactEstimator(SimulatorOptions options) => EstimatorOptions.Default
        .WithModels(options.Models).WithSensorLags(Duration.Zero, Duration.Zero).WithLongestSilence(Forever);

    private double NextFlow(out TrimStatus status)
    {
        double flow = _trim.Next(Now.RawValue, FeedForward(Simulator.Conditions), out status);
        if (Source == TrimSource.None && status == TrimStatus.Holding) status = TrimStatus.None;
        return flow;
    }

    private double FeedForward(in PassConditions measured)
    {
        double fire = (measured.RawAbsorbedHeat / _start.RawAbsorbedHeat) - 1;
        double lag = Settings.RawTemperatureLag, share = lag > 0 ? 1 - Math.Exp(-Settings.RawInterval / lag) : 1;
        _laggedEnthalpy += share * (FeedEnthalpy(measured) - _laggedEnthalpy);
        double feed = ((_outletEnthalpy - _startEnthalpy) / (_outletEnthalpy - _laggedEnthalpy)) - 1;
        return _start.RawFeedFlow * (1 + (Settings.RawFiringShare * fire)) * (1 + (Settings.RawTemperatureShare * feed));
    }

    // At the pressure of the start: the feed-forward is to follow the temperature alone.
    private double FeedEnthalpy(in PassConditions conditions) => default(SteamFluid).LiquidEnthalpy(_start.RawOutletPressure, conditions.RawFeedTemperature);

    private TrimInstant Settle(TrimStatus status)
    {
        if (Simulator.End != SimulationEnd.None) return Now;
        return Now = Look(status, Estimator?.Update(Reading(Simulator.Now.RawTime)) ?? default);
    }

    private QualityEstimate WatchAtRest()
    {
        QualityEstimate last = default;
        for (double time = -Watch; Estimator is not null && time <= 0; time += Settings.RawInterval) last = Estimator.Update(Reading(time));
        return last;
    }

    private TrimInstant Look(TrimStatus status, in QualityEstimate estimate) => new()
    {
        Pass = Simulator.Now,
        RawValue = Value(estimate),
        RawSetPoint = _trim.SetPoint,
        Status = status,
        Trust = estimate.Trust,
    };

    private double Value(in QualityEstimate estimate)
    {
        double raw = Simulator.Now.RawIndicatedQuality, corrected = IsKnown(estimate.Trust) ? estimate.RawQuality : double.NaN;
        return Source switch
        {
            TrimSource.Raw => raw,
            TrimSource.Corrected => corrected,
            TrimSource.Blended => (Settings.RawRawShare * raw) + ((1 - Settings.RawRawShare) * corrected),
            _ => double.NaN,
        };
    }

    private static bool IsKnown(Trust trust) => trust is Trust.Believable or Trust.Settling or Trust.ReadsHigh or Trust.ReadsLow;

    private PassReading Reading(double time)
    {
        PassConditions conditions = Simulator.Conditions;
        double full = Simulator.Pass.HeatAtFullFiring?.Si() ?? _start.RawAbsorbedHeat;
        return new PassReading(Midnight.AddSeconds(time), conditions.FeedFlow, Simulator.Now.Differential)
            .WithOutletPressure(Simulator.Now.OutletPressure)
            .WithFeedTemperature(conditions.FeedTemperature)
            .WithFiring(Ratio.FromDecimalFractions(conditions.RawAbsorbedHeat / full));
    }
}
