using System.Globalization;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Metering;

/// <summary>One common mistake at one reading: its size and what it does to the quality. A suspicion, not an instruction.</summary>
public sealed class SuspectedMistake
{
    private readonly MistakeEntry _entry;
    private readonly double _effect;

    internal SuspectedMistake(MistakeEntry entry, double amount, double effect)
    {
        _entry = entry;
        Amount = amount;
        _effect = effect;
    }

    /// <summary>Which mistake.</summary>
    public ReadingMistake Mistake => _entry.Mistake;

    /// <summary>The mistake in words.</summary>
    public string Description => _entry.Description;

    /// <summary>Its size, in <see cref="Unit"/>; 1 where it is there or not.</summary>
    public double Amount { get; }

    /// <summary>Unit of <see cref="Amount"/>; empty where the mistake is there or not.</summary>
    public string Unit => _entry.Unit;

    /// <summary>Indicated less true quality if this mistake alone is made: positive when the reading is too high.</summary>
    public MassFraction Effect => MassFraction.FromDecimalFractions(_effect);

    /// <summary>How the suspicion is proved. Always on the instrument and under the site's work permit.</summary>
    public string Proof => _entry.Proof;

    /// <summary>Where the size of the effect comes from, where not from the equations of meter and model.</summary>
    public string Source => _entry.Source;

    internal double EffectCore => _effect;

    internal object ToDump() => ToString();

    /// <summary>The suspicion in one line.</summary>
    public override string ToString() => string.Format(
        CultureInfo.InvariantCulture, "{0}{1}: {2:+0.00;-0.00} points of quality", Description, Unit.Length == 0 ? "" : $" ({Scale.None.Text(Amount, "G3")} {Unit})", 100 * _effect);
}
