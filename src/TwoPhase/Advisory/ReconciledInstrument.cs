using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Advisory;

/// <summary>One row of the table of a reconciliation: a quantity, what was read, what it is after adjustment, and whether it fits.</summary>
public sealed class ReconciledInstrument
{
    private readonly Raw _raw;
    private readonly Lazy<double> _smallestBias;

    internal ReconciledInstrument(Instrument instrument, string name, InstrumentStanding standing, in Raw raw, IReadOnlyList<Instrument> equivalents, Lazy<double> smallestBias) =>
        (Instrument, Name, Standing, _raw, Equivalents, _smallestBias) = (instrument, name, standing, raw, equivalents, smallestBias);

    /// <summary>Which quantity.</summary>
    public Instrument Instrument { get; }

    /// <summary>The quantity in words, with the name of its pass.</summary>
    public string Name { get; }

    /// <summary>How it is known.</summary>
    public InstrumentStanding Standing { get; }

    /// <summary>What was read; null when not measured.</summary>
    public IQuantity? Measured => Level(_raw.Measured);

    /// <summary>Standard uncertainty of the reading (k = 1), shared errors included; null when not measured.</summary>
    public IQuantity? MeasuredUncertainty => Difference(_raw.MeasuredUncertainty);

    /// <summary>The value at which all balances close; null when it is not observable.</summary>
    public IQuantity? Adjusted => Level(_raw.Adjusted);

    /// <summary>Standard uncertainty of the adjusted value (k = 1); null when it is not observable.</summary>
    public IQuantity? AdjustedUncertainty => Difference(_raw.AdjustedUncertainty);

    /// <summary>Measurement test of greatest power, standard normal when nothing is wrong, positive where it reads high; null when not checked.</summary>
    public double? Test => double.IsNaN(_raw.Test) ? null : _raw.Test;

    /// <summary>Measured minus true that would explain the imbalances best, if this instrument alone were wrong; of one set aside, what it is off. Null when not checked.</summary>
    public IQuantity? Bias => Difference(_raw.Bias);

    /// <summary>Standard uncertainty of the bias (k = 1).</summary>
    public IQuantity? BiasUncertainty => Difference(_raw.BiasUncertainty);

    /// <summary>Smallest bias that would be found, alone and with a probability of 90 %, this instrument being named; null when none would. The first call draws tests by the thousand.</summary>
    public IQuantity? SmallestBias => Difference(_smallestBias.Value);

    /// <summary>Instruments that the balances can hardly tell from it: a bias of one looks like a bias of another.</summary>
    public IReadOnlyList<Instrument> Equivalents { get; }

    internal Raw Numbers => _raw;

    private IQuantity? Level(double value) => double.IsNaN(value) ? null : Instrument.Scale.Level(value);

    private IQuantity? Difference(double value) => double.IsNaN(value) ? null : Instrument.Scale.Difference(value);

    internal object ToDump() => ToString();

    /// <summary>The row, invariant culture.</summary>
    public override string ToString()
    {
        QuantityScale scale = Instrument.Scale;
        return string.Format(
            System.Globalization.CultureInfo.InvariantCulture,
            "{0,-26} {1,12} {2,10} {3,12} {4,10} {5,7:F2} {6,11} {7}",
            Name, Text(_raw.Measured, scale.LevelText), Text(_raw.MeasuredUncertainty, scale.SizeText), Text(_raw.Adjusted, scale.LevelText), Text(_raw.AdjustedUncertainty, scale.SizeText), Test, Text(_smallestBias.Value, scale.SizeText), Standing);
    }

    private static string Text(double value, Func<double, string> text) => double.IsNaN(value) ? "-" : text(value);

    /// <summary>The numbers of a row in SI, NaN where there is none.</summary>
    internal readonly record struct Raw(double Measured, double MeasuredUncertainty, double Adjusted, double AdjustedUncertainty, double Test, double Bias, double BiasUncertainty);
}
