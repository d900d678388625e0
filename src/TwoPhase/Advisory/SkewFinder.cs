using TwoPhase.Numerics;

namespace TwoPhase.Advisory;

/// <summary>By how much the differential comes later than the feed flow, from how it answers when the flow moves.</summary>
/// <remarks>
/// <para>About each move of the flow, y = ln Δp as measured and ŷ that of the shadow, which is fed with the measured flow: s minimises Σ(y(t + s) − ŷ(t) − c)² over all moves, c
/// the mean of the difference about each; between whole seconds by the parabola through the least sum and its neighbours. It is said when a skew a good way off to either
/// side is less likely by more than three standard deviations. Source: least squares, written here.</para>
/// <para>Range: ±30 s, readings at most a few seconds apart. Accuracy: an answer begins with some tenths of the move, so noise of half a per cent leaves a second or two after two moves of 5 %.</para>
/// </remarks>
internal sealed class SkewFinder
{
    private const int Furthest = 30, Lags = (2 * Furthest) + 1, Before = 40, After = 110, Window = Before + After, Ring = 256;

    // A move of ln ṁ over so many seconds; how many moves are needed; how far off a skew is that must be unlikely [s], and how much so (in χ²).
    private const double Move = 0.02, Unlikely = 9;
    private const int Over = 12, MovesNeeded = 2, Off = 6;

    private readonly double[] _flow = new double[Ring], _foreseen = new double[Ring], _measured = new double[Ring], _sums = new double[Lags];
    private double _next = double.NaN;
    private int _count, _moves, _pending = -1;

    /// <summary>s [s]; NaN until enough moves have shown it.</summary>
    public double Skew { get; private set; } = double.NaN;

    /// <summary>Takes what flow and differential are now, and the differential foreseen, all as logarithms.</summary>
    public void Take(double now, double flow, double foreseen, double measured)
    {
        bool goesOn = now - _next < Furthest;
        if (!goesOn) (_next, _count, _pending) = (now, 0, -1);
        for (; _next <= now; _next++)
        {
            int at = _count % Ring;
            (_flow[at], _foreseen[at], _measured[at]) = (flow, foreseen, measured);
            if (_pending < 0 && _count > Before + Furthest && Math.Abs(flow - At(_flow, _count - Over)) > Move) _pending = _count;
            if (_pending >= 0 && _count == _pending + After + Furthest) Count();
            if (++_count >= 4 * Ring) (_count, _pending) = (_count - (2 * Ring), _pending < 0 ? -1 : _pending - (2 * Ring));   // the same places in the ring
        }
    }

    /// <summary>The clock of the readings has been set.</summary>
    public void Restart() => _next = double.NaN;

    public void List(StateFields state)
    {
        state.Numbers("flow", _flow);
        state.Numbers("foreseen", _foreseen);
        state.Numbers("measured", _measured);
        state.Numbers("sums", _sums);
        state.Number("next", ref _next);
        state.Number("count", ref _count);
        state.Number("moves", ref _moves);
        state.Number("pending", ref _pending);
        Skew = Best();
    }

    private static double At(double[] ring, int count) => ring[count % Ring];

    private void Count()
    {
        for (int lag = -Furthest; lag <= Furthest; lag++)
        {
            double sum = 0, squares = 0;
            for (int t = _pending - Before; t < _pending + After; t++)
            {
                double off = At(_measured, t + lag) - At(_foreseen, t);
                sum += off;
                squares += off * off;
            }

            _sums[lag + Furthest] += squares - (sum * sum / Window);
        }

        _moves++;
        _pending = -1;
        Skew = Best();
    }

    private double Best()
    {
        if (_moves < MovesNeeded) return double.NaN;
        int best = 0;
        for (int i = 1; i < Lags; i++)
        {
            if (_sums[i] < _sums[best]) best = i;
        }

        double least = _sums[best], variance = least / (_moves * (Window - 1));
        if (best == 0 || best == Lags - 1 || !Stands(best - Off) || !Stands(best + Off)) return double.NaN;
        double before = _sums[best - 1], after = _sums[best + 1];
        return best - Furthest + ((before - after) / (2 * (before - (2 * least) + after)));

        bool Stands(int i) => i < 0 || i >= Lags || _sums[i] - least > Unlikely * variance;
    }
}
