namespace TwoPhase.Advisory;

/// <summary>
/// Everything that an estimator needs to go on where it stood, after a restart or on another machine: named numbers, which have a JSON document.
/// </summary>
/// <remarks>Good for the same pass, meter and options in the same version of the library.</remarks>
public sealed class EstimatorState
{
    internal EstimatorState(IEnumerable<KeyValuePair<string, double[]>> fields) => Fields = [.. fields];

    /// <summary>The fields in the order in which they were listed; NaN and infinities among their numbers.</summary>
    internal IReadOnlyList<KeyValuePair<string, double[]>> Fields { get; }

    /// <summary>How much it holds, invariant culture.</summary>
    public override string ToString() => FormattableString.Invariant($"{Fields.Count} fields, {Fields.Sum(field => field.Value.Length)} numbers");
}
