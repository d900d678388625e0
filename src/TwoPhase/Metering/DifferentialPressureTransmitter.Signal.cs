using TwoPhase.Numerics;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Metering;

public sealed partial class DifferentialPressureTransmitter
{
    private const double ZeroMilliamperes = 4, SpanMilliamperes = 16;
    private const double LowestSignal = (3.8 - ZeroMilliamperes) / SpanMilliamperes, HighestSignal = (20.5 - ZeroMilliamperes) / SpanMilliamperes;
    private const double LowFailure = (3.6 - ZeroMilliamperes) / SpanMilliamperes, HighFailure = (21 - ZeroMilliamperes) / SpanMilliamperes;
    private const double CeilingShare = 0.98;

    /// <summary>The differential that an output current means. Never throws for what the instrument says.</summary>
    /// <param name="current">The output, 4 mA to 20 mA and a little beyond.</param>
    public TransmitterReading Read(ElectricCurrent current) => ReadSignal((current.Milliamperes - ZeroMilliamperes) / SpanMilliamperes);

    /// <summary>The differential that an output in per cent of its span means. Never throws for what the instrument says.</summary>
    /// <param name="output">The output, 0 to 1 and a little beyond.</param>
    public TransmitterReading Read(Ratio output) => ReadSignal(output.Si());

    /// <summary>The output current at a differential, saturated where the transmitter saturates.</summary>
    /// <param name="differential">Δp between the tappings.</param>
    public ElectricCurrent Current(Pressure differential) =>
        ElectricCurrent.FromMilliamperes(ZeroMilliamperes + (SpanMilliamperes * Signal(differential.Si())));

    /// <summary>The output at a differential as a share of its span, saturated where the transmitter saturates.</summary>
    /// <param name="differential">Δp between the tappings.</param>
    public Ratio Output(Pressure differential) => Ratio.FromDecimalFractions(Signal(differential.Si()));

    // Share of the output span, from share of the differential span; below zero a root transmitter goes on linearly.
    private double Signal(double differential)
    {
        double share = (differential + _head - _lower) / (_upper - _lower);
        if (Math.Abs(share) < _cutoff) share = 0;
        double signal = Characteristic == TransmitterCharacteristic.SquareRoot && share > 0 ? Math.Sqrt(share) : share;
        return Fast.Clamp(signal, LowestSignal, HighestSignal);
    }

    private TransmitterReading ReadSignal(double signal)
    {
        if (!(signal > LowFailure && signal < HighFailure)) return new(double.NaN, TransmitterStatus.Failed);
        double share = Characteristic == TransmitterCharacteristic.SquareRoot && signal > 0 ? signal * signal : signal;
        return new(_lower + (share * (_upper - _lower)) - _head, StatusOf(signal, share));
    }

    private TransmitterStatus StatusOf(double signal, double share) =>
        signal >= HighestSignal || share > CeilingShare ? TransmitterStatus.AtCeiling
        : signal <= LowestSignal || share < -_cutoff ? TransmitterStatus.AtFloor
        : _cutoff > 0 && share < _cutoff ? TransmitterStatus.BelowCutoff
        : share < 0 ? TransmitterStatus.AtFloor
        : TransmitterStatus.Good;
}
