using TwoPhase.Numerics;

namespace TwoPhase.Advisory;

/// <summary>The times of readings in seconds: tells late readings, which are passed over, from a clock that has been set.</summary>
internal struct Clock
{
    // So many readings in a row before the last time, each after the one before it, are a clock that has been set back.
    private const int Backward = 3;

    private double _candidate;
    private int _late;
    private bool _known;

    private double _now;

    /// <summary>Time of the last reading taken [s]; NaN before the first.</summary>
    public readonly double Now => _known ? _now : double.NaN;

    /// <summary>Whether a reading is to be taken; by how much the clock has been set, if it has.</summary>
    public bool Take(DateTimeOffset time, out double now, out double shift)
    {
        now = time.UtcTicks * 1e-7;
        shift = 0;
        if (_known && now <= _now)
        {
            _late = now > _candidate ? _late + 1 : 1;
            _candidate = now;
            if (_late < Backward) return false;
            shift = now - _now;
        }

        (_now, _late, _candidate, _known) = (now, 0, double.NegativeInfinity, true);
        return true;
    }

    public static DateTimeOffset TimeOf(double seconds) => new(Math.Max(0, Math.Min(DateTimeOffset.MaxValue.UtcTicks, (long)(seconds * 1e7))), TimeSpan.Zero);

    public void List(StateFields state)
    {
        state.Flag("known", ref _known);
        state.Number("now", ref _now);
        state.Number("late", ref _late);
        state.Number("candidate", ref _candidate);
    }
}
