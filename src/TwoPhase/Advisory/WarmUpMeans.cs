using TwoPhase.Numerics;

namespace TwoPhase.Advisory;

/// <summary>Means of the readings from which a shadow begins.</summary>
internal sealed class WarmUpMeans
{
    private double _seconds, _flow, _temperature, _pressure, _firing, _root;
    private int _count;

    public double Seconds => _seconds;

    public int Count => _count;

    public double Flow => _flow / _count;

    public double Temperature => _temperature / _count;

    public double Pressure => _pressure / _count;

    public double Firing => _firing / _count;

    /// <summary>Square of the mean root, since flow goes with the root.</summary>
    public double Differential => _root / _count * (_root / _count);

    public void Add(double elapsed, double flow, double temperature, double pressure, double firing, double differential)
    {
        if (_count > 0) _seconds += elapsed;
        _count++;
        _flow += flow;
        _temperature += temperature;
        _pressure += pressure;
        _firing += firing;
        _root += Math.Sqrt(differential);
    }

    public void Clear() => (_seconds, _count, _flow, _temperature, _pressure, _firing, _root) = (0, 0, 0, 0, 0, 0, 0);

    public void List(StateFields state)
    {
        state.Number("seconds", ref _seconds);
        state.Number("count", ref _count);
        state.Number("flow", ref _flow);
        state.Number("temperature", ref _temperature);
        state.Number("pressure", ref _pressure);
        state.Number("firing", ref _firing);
        state.Number("root of differential", ref _root);
    }
}
