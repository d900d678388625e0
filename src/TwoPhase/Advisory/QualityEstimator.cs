using TwoPhase.Metering;
using TwoPhase.Numerics;
using TwoPhase.Passes;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Advisory;

/// <summary>
/// The true outlet quality of one pass, live: runs the pass's own dynamics beside the plant, holds them to the measured differential, and
/// says whether the raw reading can be believed. One thread each; readings as they come.
/// </summary>
/// <remarks>
/// <para>The shadow (<see cref="Dynamics.PassSimulator"/>'s equations) gets the measured feed flow, feed temperature, outlet pressure and firing. Its heat
/// is firing times heat at full firing times exp(a); a is found by a Kalman filter from ln(Δp/Δp̂), slowly, and not at all
/// while the holdup moves, so that a false reading teaches nothing. What the estimate follows in the end is the meter; what it never
/// follows is the holdup's motion.</para>
/// <para>A lasting change of a against its long-time base is heat, meter or feed flow: not separable from one pass. Both ends are then given, and
/// the estimate stands between them. A test by solids or separator tells them apart: <see cref="Anchor"/>.</para>
/// <para>No reading throws, whatever it holds; nothing is allocated per reading. Advisory only: no safety function.</para>
/// </remarks>
public sealed partial class QualityEstimator
{
    // Rest is taken from so many seconds of readings, of which so many must give a quality.
    private const double WarmUp = 60;
    private const int FewestReadings = 5;

    // How fast the shadow's heat is brought to what is wanted [s].
    private const double SteerTime = 20;

    // Smoothing of pressure, feed temperature and of what is compared with the tolerance [s].
    private const double PressureSmoothing = 12, TemperatureSmoothing = 10, TrustSmoothing = 10;

    // Smoothing of flow and differential for the comparison with an independent test [s].
    private const double TestSmoothing = 30;

    // How far a flow and a differential at rest wander in an hour, where they are reported by exception.
    private const double FlowWander = 0.002, DifferentialWander = 0.01;

    private readonly ShadowPass _shadow;
    private readonly double _fullHeat;
    private readonly WarmUpMeans _warm = new();
    private readonly SkewFinder _skew = new();
    private InputTracker _flow, _temperature, _pressure, _firing, _differential;
    private HeatTracker _heat;
    private OperatingStateFinder _state;
    private Clock _clock;
    private double _heatInShadow, _learntHeat, _running, _error, _motion, _laggedDifferential, _meterFactor, _gainVariance, _moved, _disagreesSince;
    private Trust _trust;
    private QualityEstimate _last = QualityEstimate.Nothing(default, double.NaN);

    /// <summary>An estimator that has seen nothing yet.</summary>
    /// <param name="pass">The pass: its tubes, its heat shares and, if known, its heat at full firing.</param>
    /// <param name="meter">The meter at its outlet.</param>
    /// <param name="options">How; null for the defaults.</param>
    /// <exception cref="ArgumentException">The pass has no section, no heated section, or a feed interchanger.</exception>
    public QualityEstimator(Pass pass, QualityMeter meter, EstimatorOptions? options = null)
    {
        Pass = Require.NotNull(pass, nameof(pass));
        Meter = Require.NotNull(meter, nameof(meter));
        Options = options ?? EstimatorOptions.Default;
        if (pass.Ducts.Length == 0 || pass.Heat is null) throw new ArgumentException($"Pass '{pass.Name}' has no heated section: an estimate needs its tubes.", nameof(pass));
        if (pass.Interchanger is not null) throw new ArgumentException($"Pass '{pass.Name}' has a feed interchanger, which the shadow does not model.", nameof(pass));
        _shadow = new(pass, meter, Options.Models, Options.Cells);
        _fullHeat = pass.HeatAtFullFiring?.Si() ?? double.NaN;
        _heat = new(Options.RawDifferentialNoise, Options.RawHeatWander);
        _flow = new(TestSmoothing, 0.5, Options.Reporting(PassSignal.FeedFlow), Options.RawLongestSilence, Options.RawFlowNoise, FlowWander);
        _temperature = new(TemperatureSmoothing, 40, Options.Reporting(PassSignal.FeedTemperature), double.PositiveInfinity);
        _pressure = new(PressureSmoothing, 1e6, Options.Reporting(PassSignal.OutletPressure), double.PositiveInfinity);
        _firing = new(0, 2, Options.Reporting(PassSignal.Firing), double.PositiveInfinity);
        _differential = new(TestSmoothing, 1, Options.Reporting(PassSignal.Differential), Options.RawLongestSilence, Options.RawDifferentialNoise, DifferentialWander);
        double uncertainty = MeterBudget.LogDifferential(meter, Options);
        _gainVariance = uncertainty * uncertainty;
        _disagreesSince = double.NaN;
    }

    /// <summary>The pass.</summary>
    public Pass Pass { get; }

    /// <summary>The meter at its outlet.</summary>
    public QualityMeter Meter { get; }

    /// <summary>How it estimates.</summary>
    public EstimatorOptions Options { get; }

    /// <summary>By how much the differential's tag comes later than that of the feed flow (earlier when negative), as two moves of the flow or more have shown it; null until then.</summary>
    /// <remarks>Reported, not made good. Beyond some seconds every move of the flow makes the raw reading jump, and the historian's clocks or filters want looking at.</remarks>
    public Duration? DifferentialSkew => double.IsNaN(_skew.Skew) ? null : Duration.FromSeconds(_skew.Skew);

    /// <summary>Whether there is a base to have a gap against.</summary>
    internal bool KnowsGap => _shadow.Runs && _heat.Learnt > 0;

    /// <summary>Lasting change against the base, as a change of heat.</summary>
    internal double Gap => _heat.Gap;

    /// <summary>∂ln Δp/∂ln Q.</summary>
    internal double DifferentialByHeat => _shadow.QualityByHeat / _shadow.QualityByDifferential;

    /// <summary>M/ṁ [s], the water's way through the pass.</summary>
    internal double Residence => _shadow.Residence;

    /// <summary>What the pass stands at, with the heat that gives the estimated quality at rest; null while nothing is known.</summary>
    internal PassConditions? Conditions => _shadow.Runs
        ? new(MassFlow.FromKilogramsPerSecond(FeedFlow), Temperature.FromKelvins(_temperature.Level), Pressure.FromPascals(_pressure.Level), Power.FromWatts(Math.Max(0, HeatAtRest(_shadow.Quality))))
        : null;

    /// <summary>Feed flow over the present one with which a quality leaves at rest, at the present heat.</summary>
    internal double FlowFor(double quality) => HeatAtRest(_shadow.Quality) / HeatAtRest(quality);

    private double HeatAtRest(double quality) => _shadow.HeatFor(quality, FeedFlow, _temperature.Level, _pressure.Level);

    /// <summary>Takes one reading. Never throws for what it holds; a reading no newer than the last changes nothing.</summary>
    /// <param name="reading">The reading; pressures absolute, firing as a share of full firing.</param>
    /// <returns>What is known after it.</returns>
    public QualityEstimate Update(in PassReading reading) => Update(reading, OperatingState.Unknown);

    /// <summary>Takes one reading, and what the plant itself says of its state.</summary>
    /// <param name="reading">The reading.</param>
    /// <param name="state">What the pass is doing; <see cref="OperatingState.Unknown"/> to find it from the reading.</param>
    /// <returns>What is known after it.</returns>
    public QualityEstimate Update(in PassReading reading, OperatingState state)
    {
        double before = _clock.Now;
        if (!_clock.Take(reading.Time, out double now, out double shift)) return _last;
        if (shift != 0) ShiftClock(shift);
        double elapsed = Math.Max(0, double.IsNaN(before) ? 0 : now - (before + shift));
        Take(reading, now, elapsed);
        OperatingState found = FindState(state);
        if (found is not (OperatingState.Running or OperatingState.Turndown or OperatingState.Unknown)) _shadow.Stop();
        else Move(now, elapsed);
        return _last = Judge(reading.Time, now, elapsed, found);
    }

    private void Take(in PassReading reading, double now, double elapsed)
    {
        Take(ref _flow, reading[PassSignal.FeedFlow], isLog: true, now, elapsed);
        Take(ref _temperature, reading[PassSignal.FeedTemperature], isLog: false, now, elapsed);
        Take(ref _pressure, reading[PassSignal.OutletPressure], isLog: false, now, elapsed);
        Take(ref _firing, reading[PassSignal.Firing], isLog: false, now, elapsed);
        Take(ref _differential, reading[PassSignal.Differential], isLog: true, now, elapsed);
    }

    private static void Take(ref InputTracker tracker, in Signal signal, bool isLog, double now, double elapsed) =>
        tracker.Accept(isLog ? Log(signal.Si) : signal.Si, signal.Status == SignalStatus.Missing, now, elapsed);

    // Flow and differential go by their logarithm, so that a spike is a spike at any load.
    private static double Log(double value) => value > 0 ? Math.Log(value) : double.NaN;

    private double FeedFlow => Math.Exp(_flow.Believed);

    private OperatingState FindState(OperatingState given)
    {
        if (!_flow.IsKnown) return OperatingState.Unknown;
        OperatingState found = _state.Next(Firing, FeedFlow / _shadow.Area, RestingQuality());
        return given == OperatingState.Unknown ? found : given;
    }

    // What firing and feed would give at rest; by the meter where no heat is known yet.
    private double RestingQuality()
    {
        double full = double.IsNaN(_fullHeat) ? _learntHeat : _fullHeat;
        if (full > 0 && _temperature.IsKnown && _pressure.IsKnown) return _shadow.RestingQuality(full * Firing, FeedFlow, _temperature.Believed, _pressure.Believed);
        return Meter.QualityOrNaN(FeedFlow, _pressure.Believed, Math.Exp(_differential.Believed));
    }

    private void Move(double now, double elapsed)
    {
        if (!_shadow.Runs)
        {
            WarmUpTo(now, elapsed);
            return;
        }

        if (elapsed > Options.RawCoastTime) _shadow.Stop();
        _shadow.Advance(Inputs(), elapsed);
        if (!_shadow.Runs || elapsed <= 0) return;
        _running += elapsed;
        Compare(now, elapsed);
    }

    private double Firing => _firing.IsKnown ? _firing.Believed : 1;

    private ImposedInputs Inputs() => new(
        FeedFlow,
        _temperature.Level + (Options.RawFeedTemperatureLag * _temperature.Trend),
        _pressure.Level,
        Firing * _learntHeat * Math.Exp(_heatInShadow));

    private void Compare(double now, double elapsed)
    {
        double share = 1 - Math.Exp(-elapsed / TrustSmoothing), away = Math.Log(_shadow.OutletFlow) - _flow.Believed;
        if (Fast.IsFinite(away)) _motion += share * (away - _motion);
        _laggedDifferential += (Options.RawDifferentialLag > 0 ? 1 - Math.Exp(-elapsed / Options.RawDifferentialLag) : 1) * (Math.Log(_shadow.Differential) - _laggedDifferential);
        bool measured = _differential.IsCurrent(now) && Fast.IsFinite(_laggedDifferential);
        Doubt();
        if (measured) Learn(elapsed);
        else _heat.Coast(elapsed);
        if (measured) _skew.Take(now, _flow.Value, _laggedDifferential, _differential.Value);
        Steer(elapsed);
    }

    // A report of firing or feed temperature is off by up to half its dead band, which looks like heat until the differential has shown how much.
    private void Doubt()
    {
        double heat = 0;
        if (_firing.IsFresh) heat += Square(_firing.Band / _firing.Value);
        if (_temperature.IsFresh && _temperature.Band > 0) heat += Square(_temperature.Band * _shadow.HeatByFeedTemperature(_temperature.Value));
        _heat.Doubt(heat / 12);

        static double Square(double value) => value * value;
    }

    private void Learn(double elapsed)
    {
        // Where nothing was reported, all that is known is that it lies within the dead band.
        double band = _differential.IsFresh ? 0 : _differential.Band;
        _heat.Update(elapsed, _differential.Value - _meterFactor - _laggedDifferential, band, DifferentialByHeat, _heatInShadow, 2 * _motion, Options.RawDisagreementLimit);
        if (double.IsNaN(_disagreesSince)) _heat.LearnBase(elapsed);
    }

    // The shadow runs with what the meter says; where plant and model disagree, half way between both.
    private void Steer(double elapsed)
    {
        double wanted = double.IsNaN(_disagreesSince) ? _heat.Factor : (_heat.Factor + _heat.Base) / 2;
        _heatInShadow += (1 - Math.Exp(-elapsed / SteerTime)) * (wanted - _heatInShadow);
    }

    private void WarmUpTo(double now, double elapsed)
    {
        if (Fault(now) != PassSignal.None || !_differential.IsCurrent(now) || !_temperature.IsKnown || !_pressure.IsKnown) return;
        _warm.Add(elapsed, FeedFlow, _temperature.Believed, _pressure.Believed, Firing, Math.Exp(_differential.Believed));
        if (_warm.Seconds < WarmUp || _warm.Count < FewestReadings) return;
        double indicated = Meter.QualityOrNaN(_warm.Flow, _warm.Pressure, _warm.Differential * Math.Exp(-_meterFactor));
        double heat = _shadow.HeatFor(indicated, _warm.Flow, _warm.Temperature, _warm.Pressure);
        var inputs = new ImposedInputs(_warm.Flow, _warm.Temperature, _warm.Pressure, heat);
        if (_shadow.Accepts(inputs)) _shadow.Start(inputs);
        if (_shadow.Runs) Begin(heat / _warm.Firing, _warm.Count);
        _warm.Clear();
    }

    private void Begin(double heatPerFiring, int readings)
    {
        // A heat already learnt stays the base: a gap in the readings is no new plant.
        bool first = !(_learntHeat > 0);
        if (first) _learntHeat = double.IsNaN(_fullHeat) ? heatPerFiring : _fullHeat;
        double factor = Math.Log(heatPerFiring / _learntHeat), noise = Options.RawDifferentialNoise;
        double known = _heat.Base, learnt = _heat.Learnt;
        _heat.Start(factor, (noise * noise / readings) + 1e-8);
        if (!first && learnt > 0) _heat.KeepBase(known, learnt);
        (_heatInShadow, _running, _error, _motion, _stir, _linger) = (factor, 0, 0, 0, 0, 0);
        _laggedDifferential = Math.Log(_shadow.Differential);
        (_moved, _lastMoving, _disagreesSince) = (double.NaN, double.NegativeInfinity, double.NaN);
    }

    private void ShiftClock(double by)
    {
        _flow.Shift(by);
        _temperature.Shift(by);
        _pressure.Shift(by);
        _firing.Shift(by);
        _differential.Shift(by);
        _skew.Restart();
        _disagreesSince += by;
        _moved += by;
        _lastMoving += by;
    }
}
