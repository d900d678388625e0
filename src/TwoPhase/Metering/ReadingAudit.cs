using System.Text;
using TwoPhase.Numerics;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Metering;

/// <summary>What each common mistake would do to one reading of quality, the largest first, and which one would explain an offset.</summary>
/// <remarks>
/// <para>Every line is a suspicion, not an instruction: prove it on the instrument, under the site's work permit and by licensed people.
/// Impulse lines and condensate pots are hot and pressurised.</para>
/// <para>Mistakes are taken one at a time. An error of area, coefficient or expansibility acts as the square of itself on the differential.</para>
/// </remarks>
public sealed class ReadingAudit
{
    private const double CeilingShare = 0.98;

    private readonly AuditedReading _reading;
    private readonly double _quality;

    private ReadingAudit(AuditedReading reading, QualityReading quality)
    {
        _reading = reading;
        _quality = quality.QualityCore;
        Reading = quality;
        Mistakes = [.. MistakeCatalogue.Entries
            .Select(entry => Made(entry, entry.UsualAmount))
            .OfType<SuspectedMistake>()
            .OrderByDescending(mistake => Math.Abs(mistake.EffectCore))];
    }

    /// <summary>The reading as it stands.</summary>
    public QualityReading Reading { get; }

    /// <summary>Each mistake in its usual size, as if this reading were right and the mistake were then made, the largest first.</summary>
    public IReadOnlyList<SuspectedMistake> Mistakes { get; }

    /// <summary>Whether the differential is above 98 % of its span: the quality may be capped and the true one higher. False when the span is not known.</summary>
    public bool AtCeiling => _reading.Setup.SpanCore is { } span && _reading.Raw.Differential > CeilingShare * span;

    /// <summary>Audits one reading.</summary>
    /// <param name="meter">The meter and its model.</param>
    /// <param name="flow">ṁ, total mass flow through the meter.</param>
    /// <param name="pressure">p, absolute static pressure at the upstream tapping.</param>
    /// <param name="differential">Δp.</param>
    /// <param name="setup">What is known of the surroundings; null for nothing.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is outside its limits.</exception>
    public static ReadingAudit Of(QualityMeter meter, MassFlow flow, Pressure pressure, Pressure differential, AuditSetup? setup = null)
    {
        QualityReading reading = Require.NotNull(meter, nameof(meter)).Quality(flow, pressure, differential);
        return new(new AuditedReading(meter, new RawReading(flow.Si(), pressure.Si(), differential.Si()), setup ?? AuditSetup.Default), reading);
    }

    /// <summary>
    /// The mistakes that, each alone, would explain why this reading is off: those with a size in the size it takes, those that are
    /// there or not where they come within the tolerance. Nearest to their usual size first.
    /// </summary>
    /// <param name="offset">Indicated less true quality, for example against a separator test; not zero.</param>
    /// <param name="tolerance">How near an unsized mistake must come; the uncertainty of the comparison. Greater than zero.</param>
    public IReadOnlyList<SuspectedMistake> Explaining(MassFraction offset, MassFraction tolerance)
    {
        double wanted = Require.Finite(offset.Si(), "Offset", Scale.None, nameof(offset));
        double near = Require.Positive(tolerance.Si(), "Tolerance", Scale.None, nameof(tolerance));
        if (wanted == 0) throw Require.OutOfRange(wanted, "Offset", Scale.None, nameof(offset), "must not be zero: there is nothing to explain");
        return [.. MistakeCatalogue.Entries
            .Select(entry => entry.IsSized ? Sized(entry, wanted) : Whole(entry, wanted, near))
            .OfType<SuspectedMistake>()
            .OrderBy(mistake => Math.Abs(Math.Log(Math.Abs(mistake.Amount) / Math.Abs(Usual(mistake.Mistake)))))];
    }

    internal object ToDump() => ToString();

    /// <summary>The reading and its suspicions, one a line, with the caution.</summary>
    public override string ToString()
    {
        StringBuilder text = new();
        text.AppendLine(Reading.ToString());
        if (AtCeiling) text.AppendLine("differential above 98 % of its span: the quality may be capped");
        foreach (SuspectedMistake mistake in Mistakes) text.AppendLine(mistake.ToString());
        text.Append("Suspicions, not instructions: prove them on the instrument under the site's work permit; impulse lines and condensate pots are hot and pressurised.");
        return text.ToString();
    }

    private static double Usual(ReadingMistake mistake) => MistakeCatalogue.Entries.First(entry => entry.Mistake == mistake).UsualAmount;

    private SuspectedMistake? Made(MistakeEntry entry, double amount) =>
        entry.Distortion(_reading, amount) is { } distortion && _reading.Quality(distortion.Apply(_reading.Raw)) is var x && !double.IsNaN(x)
            ? new(entry, amount, x - _quality)
            : null;

    // What is too much in the reading if the mistake is in it: taking it back gives the true quality.
    private double Excess(MistakeEntry entry, double amount) =>
        entry.Distortion(_reading, amount) is { } distortion ? _quality - _reading.Quality(distortion.Undo(_reading.Raw)) : double.NaN;

    private SuspectedMistake? Whole(MistakeEntry entry, double wanted, double near)
    {
        double excess = Excess(entry, entry.UsualAmount);
        return Math.Abs(excess - wanted) <= near ? new(entry, entry.UsualAmount, excess) : null;
    }

    private SuspectedMistake? Sized(MistakeEntry entry, double wanted)
    {
        // From nothing to the greatest size in the direction that goes the right way, shortened while the reading leaves the possible.
        foreach (double end in new[] { entry.GreatestAmount, entry.LeastAmount })
        {
            double limit = end;
            for (int halvings = 0; limit != 0 && halvings < 6 && double.IsNaN(Excess(entry, limit)); halvings++) limit /= 2;
            if (limit == 0 || !((Excess(entry, limit) - wanted) * -wanted <= 0)) continue;
            var balance = new ExcessBalance(this, entry, wanted);
            RootResult result = BracketedRoot.TryFind(balance, Math.Min(limit, 0), Math.Max(limit, 0), 1e-9 * Math.Abs(limit));
            if (result.Converged) return new(entry, result.X, wanted);
        }

        return null;
    }

    private readonly struct ExcessBalance(ReadingAudit audit, MistakeEntry entry, double wanted) : IScalarFunction
    {
        public double Value(double x) => audit.Excess(entry, x) - wanted;
    }
}
