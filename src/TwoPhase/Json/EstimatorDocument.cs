using TwoPhase.Advisory;

namespace TwoPhase.Json;

/// <summary>A saved state: <c>{ "version": 2, "fields": { "clock.now": [63…], "heat.factor": [0.01] } }</c>.</summary>
internal sealed class EstimatorDocument
{
    // Changes with every change of what is saved.
    private const int Written = 2;

    public int? Version { get; set; }

    /// <summary>Names and numbers, as the estimator lists them; NaN and infinities as texts.</summary>
    public Dictionary<string, double[]>? Fields { get; set; }

    public static EstimatorDocument Of(EstimatorState state)
    {
        Dictionary<string, double[]> fields = [];
        foreach (KeyValuePair<string, double[]> field in state.Fields) fields.Add(field.Key, field.Value);
        return new() { Version = Written, Fields = fields };
    }

    public EstimatorState Read()
    {
        if (Version != Written) throw new DocumentException("$.version", FormattableString.Invariant($"a state of version {Version} is not of this library, which writes version {Written}"), null);
        if (Fields is null) throw new DocumentException("$.fields", "is missing", null);
        return new(Fields);
    }
}
