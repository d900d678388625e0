using TwoPhase.Units;

namespace TwoPhase.Metering;

/// <summary>The units of the tags that the passes of a generator share; as <see cref="ReadingFormat"/> is for one pass.</summary>
public sealed class GeneratorFormat
{
    private readonly LinearMap?[] _maps = new LinearMap?[GeneratorSignals.Count];

    /// <summary>A format from the tags of a generator.</summary>
    /// <param name="tags">The tags, each with its unit.</param>
    /// <param name="basis">What the site agreed; null for nothing.</param>
    /// <exception cref="FormatException">A tag's unit is none of its signal, has two meanings or leaves out its basis; the message names the tag.</exception>
    public GeneratorFormat(TagSet<GeneratorSignal> tags, UnitBasis? basis = null)
    {
        foreach (KeyValuePair<GeneratorSignal, Tag> entry in Require.NotNull(tags, nameof(tags)))
        {
            _maps[(int)entry.Key] = entry.Value.Map(GeneratorSignals.Kind(entry.Key), basis ?? UnitBasis.None);
        }
    }

    /// <summary>A reading with one more raw number read into it. Never throws for a number; a signal without a tag stays missing.</summary>
    /// <param name="reading">The reading so far.</param>
    /// <param name="signal">What the number is of.</param>
    /// <param name="raw">The number in the tag's unit; NaN when missing.</param>
    public GeneratorReading Add(GeneratorReading reading, GeneratorSignal signal, double raw) =>
        (uint)signal < (uint)_maps.Length && _maps[(int)signal] is { } map ? Require.NotNull(reading, nameof(reading)).With(signal, map.Map(raw)) : reading;
}
