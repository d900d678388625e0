using TwoPhase.Numerics;

namespace TwoPhase.Advisory;

/// <summary>One instrument's signal as it comes: last good value, how long it is silent or unchanged, and its smoothed level and trend. SI.</summary>
/// <remarks>
/// Level and trend are Brown's double exponential smoothing (Brown, Smoothing, Forecasting and Prediction, 1963): two first-order lags in a
/// row, s₁ and s₂; level 2s₁ − s₂ and trend (s₁ − s₂)/τ, so that a ramp is followed without a lag.
/// <para>A signal reported by exception stands anywhere within the dead band b of the last report v. One of little noise that was seen on its way is taken b/2 further on it;
/// one of noise σ is the mean m of a random walk: m ← m + P/(P + σ²)·(E − m), E the report, or while there is none the mean of a normal number within v ± b (<see cref="TruncatedNormal"/>).</para>
/// </remarks>
internal struct InputTracker
{
    // A value this far from the last, over what the signal may move from one to the next, is taken for a spike until it has come again.
    private const int SpikesBelieved = 4;

    // Further than this over what the filter foresees, in standard deviations, a report may be a move; one that leaps over so many dead bands is no ramp.
    private const double IsMove = 4, IsLeap = 2;

    private readonly double _smoothing, _mayMove, _hold, _longestUnchanged, _deadBand, _noise, _wander;
    private readonly bool _byException, _isLog;
    private double _value, _believed, _variance, _smooth1, _smooth2, _goodAt, _changedAt;
    private int _spikes;

    /// <summary>A signal not yet seen: τ of the smoothing [s]; the largest step from one sample to the next that is believed at once; how it is reported; how long a sampled one may stand unchanged [s].</summary>
    public InputTracker(double smoothing, double mayMove, TagReporting reporting, double longestUnchanged)
    {
        (_smoothing, _mayMove, _value, _believed) = (smoothing, mayMove, double.NaN, double.NaN);
        (_byException, _deadBand) = (reporting.IsByException, reporting.RawDeadBand);
        _hold = reporting.RawHold;
        _longestUnchanged = _byException && longestUnchanged < double.PositiveInfinity ? _hold : longestUnchanged;
    }

    /// <summary>The same for a signal taken by its logarithm, with its noise from sample to sample and its wander in an hour.</summary>
    public InputTracker(double smoothing, double mayMove, TagReporting reporting, double longestUnchanged, double noise, double wander)
        : this(smoothing, mayMove, reporting, longestUnchanged) => (_isLog, _noise, _wander) = (true, noise, wander * wander / 3600);

    /// <summary>Last good value as it was handed on; NaN before the first.</summary>
    public readonly double Value => _value;

    /// <summary>Where the signal most likely is: the value, unless it is reported by exception.</summary>
    public readonly double Believed => _believed;

    /// <summary>Variance of <see cref="Believed"/>, of a signal of which the noise is known and which is reported by exception; 0 for others.</summary>
    public readonly double Variance => _byException ? _variance : 0;

    /// <summary>How far from a report the signal may be by the dead band; 0 when sampled.</summary>
    public readonly double Band => _isLog ? _deadBand / Math.Exp(_value) : _deadBand;

    public readonly double Level => (2 * _smooth1) - _smooth2;

    public readonly double Trend => _smoothing > 0 ? (_smooth1 - _smooth2) / _smoothing : 0;

    public readonly bool IsKnown => !double.IsNaN(_value);

    /// <summary>Whether the value is one of this sample, and not one that stands for it since the last report.</summary>
    public bool IsFresh { get; private set; }

    /// <summary>Takes a sample, NaN for none; a value that is only missing is, by exception, the last one still.</summary>
    public void Accept(double value, bool isMissing, double now, double elapsed)
    {
        IsFresh = false;
        if (double.IsNaN(value))
        {
            if (!_byException || !isMissing || !IsKnown) return;
            Believe(_value, elapsed);
            Smooth(elapsed);
            return;
        }

        if (IsKnown && Math.Abs(value - _value) > _mayMove && ++_spikes < SpikesBelieved) return;
        if (!IsKnown || _spikes >= SpikesBelieved) (_believed, _variance, _smooth1, _smooth2) = (value, _noise * _noise, value, value);
        _spikes = 0;
        IsFresh = !_byException || value != _value;
        Believe(value, elapsed);
        if (value != _value) _changedAt = now;
        (_value, _goodAt) = (value, now);
        Smooth(elapsed);
    }

    /// <summary>Whether it can be used now.</summary>
    public readonly bool IsCurrent(double now) => IsKnown && now - _goodAt <= (_byException ? _hold : 0);

    /// <summary>Whether it is missing for longer than it is held, or stands unchanged for longer than it can.</summary>
    public readonly bool IsGone(double now) => !IsKnown || now - _goodAt > _hold || now - _changedAt > _longestUnchanged;

    /// <summary>How long it has been of no use [s].</summary>
    public readonly double Silence(double now) => IsKnown ? Math.Max(now - _goodAt - (_byException ? _hold : 0), now - _changedAt - _longestUnchanged) : double.PositiveInfinity;

    /// <summary>The clock of the readings has been set by so much [s].</summary>
    public void Shift(double by) => (_goodAt, _changedAt) = (_goodAt + by, _changedAt + by);

    public void List(StateFields state)
    {
        state.Number("value", ref _value);
        state.Number("believed", ref _believed);
        state.Number("variance", ref _variance);
        state.Number("smooth", ref _smooth1);
        state.Number("smooth twice", ref _smooth2);
        state.Number("good at", ref _goodAt);
        state.Number("changed at", ref _changedAt);
        state.Number("spikes", ref _spikes);
    }

    // Before the new value takes the place of the last.
    private void Believe(double value, double elapsed)
    {
        if (!_byException) _believed = value;
        else if (_noise > 0) Filter(value, elapsed);
        else if (IsFresh) _believed = value + Onwards(value - _value);
    }

    private readonly double Onwards(double change) => double.IsNaN(change) || Math.Abs(change) < _deadBand || Math.Abs(change) > IsLeap * _deadBand ? 0 : Math.Sign(change) * _deadBand / 2;

    private void Filter(double value, double elapsed)
    {
        _variance += _wander * elapsed;
        double spread = Math.Sqrt(_variance + (_noise * _noise)), off = value - _believed, told = 1;
        // A wild report, or a move: the next sample shows which, whether it stays by that report or not.
        if (IsFresh && Math.Abs(off) > IsMove * spread)
        {
            _variance += off * off / 4;
            return;
        }

        if (!IsFresh)
        {
            double band = Band;
            (double mean, double variance) = TruncatedNormal.Between((off - band) / spread, (off + band) / spread);
            (off, told) = (mean * spread, 1 - Math.Min(1, variance));
        }

        double gain = _variance / (spread * spread);
        _believed += gain * off;
        _variance *= 1 - (gain * told);
    }

    private void Smooth(double elapsed)
    {
        double share = _smoothing > 0 ? 1 - Math.Exp(-elapsed / _smoothing) : 1;
        _smooth1 += share * (_believed - _smooth1);
        _smooth2 += share * (_smooth1 - _smooth2);
    }
}
