using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Metering;

/// <summary>A differential-pressure transmitter as it is set up: what its output means, and what output a differential gives.</summary>
/// <remarks>
/// <para>Share of span s = (Δp + head − lower)/(upper − lower); output 4 mA + 16 mA · s when linear, 4 mA + 16 mA · √s with root.</para>
/// <para>Outputs saturate at 3.8 mA and 20.5 mA; 3.6 mA and below, 21 mA and above mean a failed transmitter (NAMUR NE 43; values from memory).</para>
/// <para>Immutable; <c>With…</c> returns a changed copy.</para>
/// </remarks>
public sealed partial class DifferentialPressureTransmitter
{
    private readonly double _lower, _upper;   // Pa
    private readonly double _cutoff;          // share of span
    private readonly double _head;            // Pa

    /// <summary>A transmitter ranged from zero.</summary>
    /// <param name="span">Differential at 20 mA, greater than zero.</param>
    /// <param name="characteristic">Linear, or with the root extracted in the transmitter.</param>
    public DifferentialPressureTransmitter(Pressure span, TransmitterCharacteristic characteristic)
        : this(Pressure.Zero, span, characteristic)
    {
    }

    /// <summary>A transmitter with a range.</summary>
    /// <param name="lower">Differential at 4 mA; zero, or negative where the legs are biased.</param>
    /// <param name="upper">Differential at 20 mA, above the lower.</param>
    /// <param name="characteristic">Linear, or with the root extracted in the transmitter.</param>
    /// <exception cref="ArgumentOutOfRangeException">The range is not in order.</exception>
    public DifferentialPressureTransmitter(Pressure lower, Pressure upper, TransmitterCharacteristic characteristic)
        : this(lower.Si(), upper.Si(), characteristic, 0, 0)
    {
        Require.Finite(_lower, "Lower end of the range", Scale.Kilopascals, nameof(lower));
        Require.Finite(_upper, "Upper end of the range", Scale.Kilopascals, nameof(upper));
        if (_upper <= _lower) throw Require.OutOfRange(_upper, "Upper end of the range", Scale.Kilopascals, nameof(upper), $"must be above the lower end, {Scale.Kilopascals.Text(_lower)}");
    }

    private DifferentialPressureTransmitter(double lower, double upper, TransmitterCharacteristic characteristic, double cutoff, double head)
    {
        if (characteristic is not (TransmitterCharacteristic.Linear or TransmitterCharacteristic.SquareRoot))
            throw new ArgumentOutOfRangeException(nameof(characteristic), characteristic, "The characteristic must be linear or square root.");
        (_lower, _upper, Characteristic, _cutoff, _head) = (lower, upper, characteristic, cutoff, head);
    }

    /// <summary>Differential at 4 mA.</summary>
    public Pressure Lower => Pressure.FromPascals(_lower);

    /// <summary>Differential at 20 mA.</summary>
    public Pressure Upper => Pressure.FromPascals(_upper);

    /// <summary>Upper less lower end.</summary>
    public Pressure Span => Pressure.FromPascals(_upper - _lower);

    /// <summary>Linear, or with the root extracted in the transmitter.</summary>
    public TransmitterCharacteristic Characteristic { get; }

    /// <summary>Share of the differential span below which the output is held at zero.</summary>
    public Ratio LowCutoff => Ratio.FromDecimalFractions(_cutoff);

    /// <summary>What the legs add to the differential at the transmitter; see <see cref="ImpulseLines.Head"/>.</summary>
    public Pressure ImpulseLineHead => Pressure.FromPascals(_head);

    /// <summary>The same transmitter with a low cut-off.</summary>
    /// <param name="shareOfSpan">Share of the differential span, not of the root of it; 0 up to below 0.5.</param>
    public DifferentialPressureTransmitter WithLowCutoff(Ratio shareOfSpan) =>
        new(_lower, _upper, Characteristic, Require.Within(shareOfSpan.Si(), 0, 0.5, "Low cut-off", Scale.None, nameof(shareOfSpan)), _head);

    /// <summary>The same transmitter with a head of unequal or unequally warm legs that its zero does not take out.</summary>
    /// <param name="head">What the legs add to the differential at the transmitter, of either sign.</param>
    public DifferentialPressureTransmitter WithImpulseLineHead(Pressure head) =>
        new(_lower, _upper, Characteristic, _cutoff, Require.Finite(head.Si(), "Head of the impulse lines", Scale.Kilopascals, nameof(head)));

    internal object ToDump() => ToString();

    /// <summary>The range and the characteristic.</summary>
    public override string ToString() =>
        $"{Scale.Kilopascals.Text(_lower)} to {Scale.Kilopascals.Text(_upper)}, {(Characteristic == TransmitterCharacteristic.Linear ? "linear" : "square root")}";
}
