using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Advisory;

/// <summary>An instrument that may be the faulty one, and by how much it would be wrong.</summary>
public sealed class Suspect
{
    private readonly double _bias, _uncertainty;

    internal Suspect(Instrument instrument, string name, double bias, double uncertainty, double test, double relativeLikelihood) =>
        (Instrument, Name, _bias, _uncertainty, Test, RelativeLikelihood) = (instrument, name, bias, uncertainty, test, relativeLikelihood);

    /// <summary>Which instrument.</summary>
    public Instrument Instrument { get; }

    /// <summary>The instrument in words, with the name of its pass.</summary>
    public string Name { get; }

    /// <summary>Measured minus true, if it is the one.</summary>
    public IQuantity Bias => Instrument.Scale.Difference(_bias);

    /// <summary>Standard uncertainty of the bias (k = 1).</summary>
    public IQuantity BiasUncertainty => Instrument.Scale.Difference(_uncertainty);

    /// <summary>Its measurement test.</summary>
    public double Test { get; }

    /// <summary>How well its fault explains the measurements against that of the first suspect, 1/20 to 1.</summary>
    public double RelativeLikelihood { get; }

    internal (double Bias, double Uncertainty) Raw => (_bias, _uncertainty);

    internal object ToDump() => ToString();

    /// <summary>The instrument and its bias, invariant culture.</summary>
    public override string ToString()
    {
        QuantityScale scale = Instrument.Scale;
        return FormattableString.Invariant($"{Name} reads {scale.SizeText(Math.Abs(_bias))} {(_bias > 0 ? "high" : "low")}, ± {scale.SizeText(_uncertainty)} (k = 1)");
    }
}
