using TwoPhase.Numerics;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Metering;

/// <summary>A differential as a transmitter has reported it, with its status.</summary>
public readonly record struct TransmitterReading
{
    private readonly double _differential;   // Pa; NaN when failed

    internal TransmitterReading(double differential, TransmitterStatus status)
    {
        _differential = differential;
        Status = status;
    }

    /// <summary>Δp between the tappings, head of the impulse lines taken out; null when the transmitter has failed.</summary>
    public Pressure? Differential => Status is TransmitterStatus.None or TransmitterStatus.Failed || !Fast.IsFinite(_differential) ? null : Pressure.FromPascals(_differential);

    /// <summary>Whether the differential can be believed, and if not, why.</summary>
    public TransmitterStatus Status { get; }

    internal object ToDump() => ToString();

    /// <summary>The reading in one line.</summary>
    public override string ToString() => Differential is null ? Status.ToString() : $"{Scale.Kilopascals.Text(_differential)} ({Status})";
}
