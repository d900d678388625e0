namespace TwoPhase.Advisory;

/// <summary>Means of the readings from which a shadow begins.</summary>
internal sealed class WarmUpMeans
{
    private double _flow, _temperature, _pressure, _firing, _root;

    public double Seconds { get; private set; }

    public int Count { get; private set; }

    public double Flow => _flow / Count;

    public double Temperature => _temperature / Count;

    public double Pressure => _pressure / Count;

    public double Firing => _firing / Count;

    /// <summary>Square of the mean root, since flow goes with the root.</summary>
    public double Differential => _root / Count * (_root / Count);

    public void Add(double elapsed, double flow, double temperature, double pressure, double firing, double differential)
    {
        if (Count > 0) Seconds += elapsed;
        Count++;
        _flow += flow;
        _temperature += temperature;
        _pressure += pressure;
        _firing += firing;
        _root += Math.Sqrt(differential);
    }

    public void Clear() => (Seconds, Count, _flow, _temperature, _pressure, _firing, _root) = (0, 0, 0, 0, 0, 0, 0);
}
