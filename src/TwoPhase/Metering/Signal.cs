using TwoPhase.Numerics;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Metering;

/// <summary>One measured value in SI with its status and source. Reading a value never throws: what cannot be is a status.</summary>
internal readonly struct Signal : IEquatable<Signal>
{
    private readonly double _value;

    private Signal(double value, SignalStatus status, SignalSource source) => (_value, Status, Source) = (value, status, source);

    public SignalStatus Status { get; }

    public SignalSource Source { get; }

    public bool IsGood => Status == SignalStatus.Good;

    /// <summary>SI value; NaN unless the status is good.</summary>
    public double Si => IsGood ? _value : double.NaN;

    public MassFlow? MassFlow => IsGood ? UnitsNet.MassFlow.FromKilogramsPerSecond(_value) : null;

    public VolumeFlow? VolumeFlow => IsGood ? UnitsNet.VolumeFlow.FromCubicMetersPerSecond(_value) : null;

    public Pressure? Pressure => IsGood ? UnitsNet.Pressure.FromPascals(_value) : null;

    public Temperature? Temperature => IsGood ? UnitsNet.Temperature.FromKelvins(_value) : null;

    public Ratio? Ratio => IsGood ? UnitsNet.Ratio.FromDecimalFractions(_value) : null;

    public MassConcentration? Concentration => IsGood ? MassConcentration.FromKilogramsPerCubicMeter(_value) : null;

    public static Signal Without(SignalStatus status) => new(double.NaN, status, SignalSource.None);

    /// <summary>NaN is a missing value; one that the kind cannot have is out of range.</summary>
    public static Signal Read(double si, UnitKind kind, SignalSource source)
    {
        if (double.IsNaN(si)) return Without(SignalStatus.Missing);
        (double low, double high) = Plausible(kind);
        return si >= low && si <= high && Fast.IsFinite(si) ? new(si, SignalStatus.Good, source) : Without(SignalStatus.OutOfRange);
    }

    public bool Equals(Signal other) => Si.Equals(other.Si) && Status == other.Status && Source == other.Source;

    public override bool Equals(object? obj) => obj is Signal other && Equals(other);

    public override int GetHashCode() => (Si, Status, Source).GetHashCode();

    // Wide enough for any steam generator and its light-off, narrow enough to catch an open circuit or a wrong unit by a thousand.
    private static (double Low, double High) Plausible(UnitKind kind) => kind switch
    {
        UnitKind.MassFlow => (0, 1e3),
        UnitKind.StandardGasFlow => (0, 1e3),
        UnitKind.PressureDifference => (0, 10e6),
        UnitKind.AbsolutePressure => (1, 100e6),
        UnitKind.Temperature => (233.15, 2500),
        UnitKind.Ratio => (-0.1, 2),
        UnitKind.Density => (0, 1e3),
        _ => (double.NegativeInfinity, double.PositiveInfinity),
    };
}
