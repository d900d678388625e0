using TwoPhase.Metering;
using TwoPhase.Numerics;

namespace TwoPhase.Advisory;

// From what the shadow and the heat tracker say to what can be believed.
public sealed partial class QualityEstimator
{
    // Share of the false reading by which the shadow's quality may be off and how long that lasts [s]; what lingers of it until the heat is
    // learnt anew; and what is never known better.
    private const double MotionShare = 0.08, StirTime = 90, LingerShare = 0.02, LingerTime = 900, Floor = 3e-4;

    // A state of trust is left at this part of what it is entered at, and motion must last, and be over, for so long [s], so that it does not flicker.
    private const double Leave = 0.6, Persist = 30;

    // What of the reading's error is not the holdup's motion must last so long to count [s]: noise that lasts a minute, or a report that stands for some, is no false reading.
    private const double NoiseTime = 300;

    private double _stir, _linger, _lastMoving = double.NegativeInfinity;

    private QualityEstimate Judge(DateTimeOffset time, double now, double elapsed, OperatingState state)
    {
        double indicated = Indicated(now);
        PassSignal fault = Fault(now);
        bool lost = fault != PassSignal.None && SilenceOf(fault, now) > Options.RawCoastTime;
        if (lost) _shadow.Stop();
        QualityEstimate nothing = QualityEstimate.Nothing(time, indicated) with { State = state, Fault = fault, RawLimit = Options.RawQualityLimit };
        if (state is not (OperatingState.Running or OperatingState.Turndown or OperatingState.Unknown)) return nothing with { Trust = _trust = Trust.NotRunning };
        if (!_shadow.Runs) return nothing with { Trust = _trust = fault != PassSignal.None && !lost ? Trust.InputFault : Trust.Unknown };
        return Known(nothing, indicated, fault, now, elapsed);
    }

    private QualityEstimate Known(in QualityEstimate nothing, double indicated, PassSignal fault, double now, double elapsed)
    {
        double byHeat = _shadow.QualityByHeat, byDifferential = _shadow.QualityByDifferential;
        double quality = _shadow.Quality, motion = 2 * _motion * byDifferential, gap = _heat.Gap * byHeat;
        _stir = Math.Max(Math.Abs(motion), _stir * Math.Exp(-elapsed / StirTime));
        _linger = Math.Max(Math.Abs(motion), _linger * Math.Exp(-elapsed / LingerTime));
        if (Fast.IsFinite(indicated)) _error += (1 - Math.Exp(-elapsed / NoiseTime)) * (indicated - quality - motion - _error);
        WatchDisagreement(now);
        bool apart = !double.IsNaN(_disagreesSince);
        double half = apart ? gap / 2 : 0;
        double byStir = Math.Max(MotionShare * _stir, LingerShare * _linger), tracked = byHeat * byHeat * _heat.Variance, ends = Math.Sqrt(tracked + (byStir * byStir));

        // The quality is the work of the heat of a whole residence, so noise of the heat that is shorter than that leaves the less of it.
        // A flow that is known from few reports is off for longer than that, and the meter does not show it.
        double noise = (tracked * _heat.Memory / (_heat.Memory + _shadow.Residence)) + (4 * byDifferential * byDifferential * _flow.Variance);
        double spread = Math.Sqrt(noise + (byStir * byStir) + (Floor * Floor) + (half * half));
        double meter = byDifferential * Math.Sqrt(_gainVariance);
        _trust = Decide(fault, motion, now);
        var reasons = Reasons.Sorted(
            new(EstimateReasonKind.HoldupMotion, motion),
            new(EstimateReasonKind.ShiftAgainstBase, gap),
            new(EstimateReasonKind.Noise, Fast.IsFinite(indicated) ? indicated - quality - motion : 0),
            new(EstimateReasonKind.MeterAndFeed, meter));
        return nothing with
        {
            RawQuality = quality,
            RawMotion = spread,
            RawAbsolute = Math.Sqrt((spread * spread) + (meter * meter)),
            RawIfMeter = quality + (byHeat * (_heat.Factor - _heatInShadow)),
            RawIfHeat = quality + (byHeat * (_heat.Base - _heatInShadow)),
            RawEnds = ends,
            RawOutletFlow = _shadow.OutletFlow,
            RawHoldupRate = FeedFlow - _shadow.OutletFlow,
            RawHoldup = _shadow.Holdup,
            RawOnset = _shadow.Onset,
            RawHeatFactor = Math.Exp(_heat.Factor),
            RawWait = _trust is Trust.Settling or Trust.ReadsHigh or Trust.ReadsLow ? Wait(now) : double.NaN,
            Trust = _trust,
            DisagreesSince = apart ? Clock.TimeOf(_disagreesSince) : null,
            FirstReason = reasons.First,
            SecondReason = reasons.Second,
            ThirdReason = reasons.Third,
        };
    }

    private Trust Decide(PassSignal fault, double motion, double now)
    {
        if (fault != PassSignal.None) return Trust.InputFault;
        if (!double.IsNaN(_disagreesSince)) return Trust.Disagreement;
        double tolerance = Options.RawTolerance;
        bool wasFalse = _trust is Trust.ReadsHigh or Trust.ReadsLow, wasMoving = wasFalse || _trust == Trust.Settling;
        bool moves = Math.Abs(motion) > tolerance / 2 * (wasMoving ? Leave : 1);
        if (!moves) _moved = double.NaN;
        else if (double.IsNaN(_moved)) _moved = now;
        if (now - _moved > Persist) _lastMoving = now;
        double error = motion + _error;
        if (Math.Abs(error) > tolerance * (wasFalse ? Leave : 1)) return error > 0 ? Trust.ReadsHigh : Trust.ReadsLow;
        return now - _lastMoving < Persist || _running < _shadow.Residence ? Trust.Settling : Trust.Believable;
    }

    // By the water's way through the pass since it began to move, or since the shadow began.
    private double Wait(double now) =>
        Math.Max(TrustSmoothing, _shadow.Residence - (double.IsNaN(_moved) ? _running : now - _moved));

    private void WatchDisagreement(double now)
    {
        double limit = Math.Max(Options.RawDisagreementLimit, 3 * Math.Sqrt(_heat.Variance)), gap = Math.Abs(_heat.Gap);
        if (double.IsNaN(_disagreesSince) && gap > limit) _disagreesSince = now;
        else if (gap < limit / 2) _disagreesSince = double.NaN;
    }

    private double Indicated(double now) => !_flow.IsCurrent(now) || !_differential.IsCurrent(now) || !_pressure.IsKnown
        ? double.NaN
        : Meter.QualityOrNaN(Math.Exp(_flow.Value), _pressure.Value, Math.Exp(_differential.Value - _meterFactor));

    private PassSignal Fault(double now)
    {
        if (_flow.IsGone(now)) return PassSignal.FeedFlow;
        if (_pressure.IsGone(now)) return PassSignal.OutletPressure;
        if (_temperature.IsGone(now)) return PassSignal.FeedTemperature;
        if (_firing.IsKnown && _firing.IsGone(now)) return PassSignal.Firing;
        return _differential.IsGone(now) ? PassSignal.Differential : PassSignal.None;
    }

    // How long the estimate has gone on without a signal; a frozen one counts from when it was called so.
    private double SilenceOf(PassSignal signal, double now) => signal switch
    {
        PassSignal.FeedFlow => _flow.Silence(now),
        PassSignal.OutletPressure => _pressure.Silence(now),
        PassSignal.FeedTemperature => _temperature.Silence(now),
        PassSignal.Firing => _firing.Silence(now),
        _ => _differential.Silence(now),
    };
}
