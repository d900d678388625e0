namespace TwoPhase.Metering;

/// <summary>One mistake of the catalogue: words, usual size, and what it does as a function of its size.</summary>
/// <param name="mistake">Which.</param>
/// <param name="description">In words.</param>
/// <param name="proof">How it is proved.</param>
/// <param name="distort">The distortion at a size; null where the mistake cannot be made at this meter.</param>
internal sealed class MistakeEntry(ReadingMistake mistake, string description, string proof, Func<AuditedReading, double, ReadingDistortion?> distort)
{
    public ReadingMistake Mistake => mistake;

    public string Description => description;

    public string Proof => proof;

    /// <summary>Unit of the size; empty for a mistake that is there or not.</summary>
    public string Unit { get; init; } = "";

    public double UsualAmount { get; init; } = 1;

    /// <summary>Sizes that are thinkable, for explaining an offset.</summary>
    public double LeastAmount { get; init; } = 1;

    public double GreatestAmount { get; init; } = 1;

    public string Source { get; init; } = "equations of meter and model";

    public bool IsSized => GreatestAmount > LeastAmount;

    public ReadingDistortion? Distortion(AuditedReading reading, double amount) => distort(reading, amount);
}
