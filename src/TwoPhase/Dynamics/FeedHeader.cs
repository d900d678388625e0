using TwoPhase.Numerics;

namespace TwoPhase.Dynamics;

/// <summary>The feed header during a run: its pressure, and what each valve passes at it.</summary>
internal sealed class FeedHeader
{
    private const double Tolerance = 1e-3;   // Pa

    private readonly FeedSupply _supply;
    private readonly PassRun[] _passes;
    private readonly double _start;
    private readonly double[] _conductances;

    public FeedHeader(FeedSupply supply, PassRun[] passes)
    {
        (_supply, _passes) = (supply, passes);
        _start = passes.Sum(static pass => pass.FeedFlow);
        _conductances = new double[passes.Length];
        Pressure = supply.RawPressure;
    }

    /// <summary>Pressure of the header now [Pa].</summary>
    public double Pressure { get; private set; }

    /// <summary>Finds the pressure for the next beat, and gives each valve its flow.</summary>
    public void Settle(double from, double to)
    {
        for (int i = 0; i < _passes.Length; i++) _conductances[i] = _passes[i].IsOnValve ? _passes[i].Conductance(from, to, Pressure) : 0;
        Pressure = _supply.KeepsTotal ? PressureForTotal(from, to) : _supply.PressureCurve.Mean(from, to);
        for (int i = 0; i < _passes.Length; i++)
        {
            if (_passes[i].IsOnValve) _passes[i].FeedFlow = Through(i, Pressure);
        }
    }

    private double Through(int i, double pressure) => _conductances[i] * Math.Sqrt(Math.Max(0, pressure - _passes[i].InletPressure));

    // What flow control takes is gone; the rest rises with the pressure, from none at the lowest inlet.
    private double PressureForTotal(double from, double to)
    {
        double wanted = _start * _supply.TotalCurve.Mean(from, to), low = double.PositiveInfinity, high = double.PositiveInfinity;
        for (int i = 0; i < _passes.Length; i++)
        {
            if (!_passes[i].IsOnValve) wanted -= _passes[i].Controlled(from, to);
        }

        for (int i = 0; i < _passes.Length; i++)
        {
            if (!(_conductances[i] > 0)) continue;
            double alone = wanted / _conductances[i];
            low = Math.Min(low, _passes[i].InletPressure);
            high = Math.Min(high, _passes[i].InletPressure + (alone * alone));
        }

        return wanted > 0 && !double.IsInfinity(low) ? BracketedRoot.TryFind(new Excess(this, wanted), low, high, Tolerance).X : Math.Min(low, Pressure);
    }

    private readonly struct Excess(FeedHeader header, double wanted) : IScalarFunction
    {
        public double Value(double x)
        {
            double sum = -wanted;
            for (int i = 0; i < header._passes.Length; i++) sum += header.Through(i, x);
            return sum;
        }
    }
}
