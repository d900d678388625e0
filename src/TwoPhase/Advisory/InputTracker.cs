using TwoPhase.Numerics;

namespace TwoPhase.Advisory;

/// <summary>One instrument's signal as it comes: last good value, how long it is silent or unchanged, and its smoothed level and trend. SI.</summary>
/// <remarks>
/// Level and trend are Brown's double exponential smoothing (Brown, Smoothing, Forecasting and Prediction, 1963): two first-order lags in a
/// row, s₁ and s₂; level 2s₁ − s₂ and trend (s₁ − s₂)/τ, so that a ramp is followed without a lag.
/// </remarks>
internal struct InputTracker
{
    // A value this far from the last, over what the signal may move from one to the next, is taken for a spike until it has come again.
    private const int SpikesBelieved = 4;

    private double _smooth1, _smooth2, _goodAt, _changedAt;
    private int _spikes;

    public InputTracker(double smoothing, double mayMove) => (Smoothing, MayMove, Value) = (smoothing, mayMove, double.NaN);

    /// <summary>τ of the smoothing [s], and the largest step from one sample to the next that is believed at once.</summary>
    public double Smoothing { get; private set; }

    public double MayMove { get; private set; }

    /// <summary>Last good value; NaN before the first.</summary>
    public double Value { get; private set; }

    public readonly double Level => (2 * _smooth1) - _smooth2;

    public readonly double Trend => Smoothing > 0 ? (_smooth1 - _smooth2) / Smoothing : 0;

    public readonly bool IsKnown => !double.IsNaN(Value);

    /// <summary>Takes a sample, NaN for none; true when it is used.</summary>
    public bool Accept(double value, double now, double elapsed)
    {
        if (double.IsNaN(value)) return false;
        if (IsKnown && Math.Abs(value - Value) > MayMove && ++_spikes < SpikesBelieved) return false;
        if (!IsKnown || _spikes >= SpikesBelieved) (_smooth1, _smooth2) = (value, value);
        _spikes = 0;
        if (value != Value) _changedAt = now;
        (Value, _goodAt) = (value, now);
        double share = Smoothing > 0 ? 1 - Math.Exp(-elapsed / Smoothing) : 1;
        _smooth1 += share * (value - _smooth1);
        _smooth2 += share * (_smooth1 - _smooth2);
        return true;
    }

    /// <summary>How long no good value has come [s].</summary>
    public readonly double Silent(double now) => now - _goodAt;

    /// <summary>How long the value has not changed [s].</summary>
    public readonly double Unchanged(double now) => now - _changedAt;

    /// <summary>The clock of the readings has been set by so much [s].</summary>
    public void Shift(double by) => (_goodAt, _changedAt) = (_goodAt + by, _changedAt + by);

    public readonly void Save(StateWriter to)
    {
        to.Add(Value);
        to.Add(_smooth1);
        to.Add(_smooth2);
        to.Add(_goodAt);
        to.Add(_changedAt);
        to.Add(_spikes);
    }

    public void Load(StateReader from) =>
        (Value, _smooth1, _smooth2, _goodAt, _changedAt, _spikes) = (from.Next(), from.Next(), from.Next(), from.Next(), from.Next(), (int)from.Next());
}
