using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Dynamics;

/// <summary>A quantity in time, SI: straight between knots, constant outside them; two knots at one time are a step. Immutable.</summary>
internal sealed class TimeCurve
{
    private readonly double[] _times, _values;

    private TimeCurve(double[] times, double[] values) => (_times, _values) = (times, values);

    /// <summary>Time of the last change [s].</summary>
    public double End => _times[^1];

    public static TimeCurve Constant(double value) => new([0], [value]);

    /// <summary>Through samples; those that are not finite are left out, so that the curve runs straight across a gap.</summary>
    public static TimeCurve Through(ReadOnlySpan<double> times, LinearMap toSeconds, ReadOnlySpan<double> values, LinearMap toSi, string quantity, string parameter)
    {
        if (times.Length != values.Length) throw new ArgumentException(FormattableString.Invariant($"{quantity} has {values.Length} samples and {times.Length} times."), parameter);
        List<double> knots = new(times.Length), heights = new(times.Length);
        for (int i = 0; i < times.Length; i++)
        {
            double time = toSeconds.Map(times[i]), value = toSi.Map(values[i]);
            if (!Numerics.Fast.IsFinite(time) || !Numerics.Fast.IsFinite(value)) continue;
            if (knots.Count > 0 && time < knots[^1]) throw Require.OutOfRange(time, $"Time of {quantity}", Scale.Seconds, parameter, $"must not lie before the sample at {Scale.Seconds.Text(knots[^1])}");
            knots.Add(time);
            heights.Add(value);
        }

        return knots.Count > 0 ? new([.. knots], [.. heights]) : throw new ArgumentException($"{quantity} has no sample that is a number.", parameter);
    }

    /// <summary>The curve that goes straight to a value between two times, and stays there.</summary>
    public TimeCurve Then(double from, double to, double value, string quantity, string parameter) => from >= End
        ? new([.. _times, from, to], [.. _values, _values[^1], value])
        : throw Require.OutOfRange(from, $"Start of a change of {quantity}", Scale.Seconds, parameter, $"must not lie before the end of the change before it, {Scale.Seconds.Text(End)}");

    /// <summary>The curve with a value in place of every knot that has none.</summary>
    public TimeCurve StartingAt(double value) => new(_times, Array.ConvertAll(_values, knot => double.IsNaN(knot) ? value : knot));

    /// <summary>The curve with a ramp that a user asks for.</summary>
    public TimeCurve Ramp(Duration from, Duration over, double value, string quantity)
    {
        double start = Require.NotNegative(from.Si(), $"Start of a change of {quantity}", Scale.Seconds, nameof(from));
        return Then(start, start + Require.NotNegative(over.Si(), $"Length of a change of {quantity}", Scale.Seconds, nameof(over)), value, quantity, nameof(from));
    }

    /// <summary>The value at a time; behind a step where one stands.</summary>
    public double At(double time)
    {
        int after = After(time);
        if (after == 0) return _values[0];
        return after == _times.Length ? _values[^1] : Between(after, time);
    }

    /// <summary>The curve behind a lag of first order that had settled on its first value, as in a mixed vessel.</summary>
    public double Lagged(double time, double lag)
    {
        if (!(lag > 0)) return At(time);
        double held = _values[0];
        for (int i = 1; i <= _times.Length && _times[i - 1] < time; i++)
        {
            bool isLast = i == _times.Length;
            double span = (isLast ? time : Math.Min(_times[i], time)) - _times[i - 1];
            if (span == 0) continue;   // a step
            double slope = isLast ? 0 : (_values[i] - _values[i - 1]) / (_times[i] - _times[i - 1]), behind = slope * lag;
            held = _values[i - 1] + (slope * span) - behind + ((held - _values[i - 1] + behind) * Math.Exp(-span / lag));
        }

        return held;
    }

    /// <summary>The mean over an interval: what a flow must be to bring the same mass.</summary>
    public double Mean(double from, double to)
    {
        double sum = 0, time = from, value = At(from);
        for (int i = After(from); i < _times.Length && _times[i] < to; i++)
        {
            sum += (_times[i] - time) * (value + _values[i]) / 2;
            (time, value) = (_times[i], _values[i]);
        }

        int last = After(to, strictly: false);
        double end = last == 0 ? _values[0] : last == _times.Length ? _values[^1] : Between(last, to);
        return (sum + ((to - time) * (value + end) / 2)) / (to - from);
    }

    public (double Low, double High) Range() => (_values.Min(), _values.Max());

    // Index of the first knot behind a time, or at it.
    private int After(double time, bool strictly = true)
    {
        int low = 0, high = _times.Length;
        while (low < high)
        {
            int middle = (low + high) / 2;
            if (_times[middle] < time || (strictly && _times[middle] == time)) low = middle + 1;
            else high = middle;
        }

        return low;
    }

    private double Between(int after, double time)
    {
        double share = (time - _times[after - 1]) / (_times[after] - _times[after - 1]);
        return _values[after - 1] + (share * (_values[after] - _values[after - 1]));
    }
}
