using System.Collections;
using TwoPhase.Units;

namespace TwoPhase.Metering;

/// <summary>Which tag carries which signal. Immutable.</summary>
/// <typeparam name="TSignal"><see cref="PassSignal"/> or <see cref="GeneratorSignal"/>.</typeparam>
public sealed class TagSet<TSignal> : IEnumerable<KeyValuePair<TSignal, Tag>>
    where TSignal : struct, Enum
{
    private readonly SortedDictionary<TSignal, Tag> _tags;

    private TagSet(SortedDictionary<TSignal, Tag> tags) => _tags = tags;

    internal static TagSet<TSignal> Empty { get; } = new([]);

    /// <summary>How many signals have a tag.</summary>
    public int Count => _tags.Count;

    /// <summary>The tag of a signal; null when it has none.</summary>
    /// <param name="signal">The signal.</param>
    public Tag? this[TSignal signal] => _tags.TryGetValue(signal, out Tag? tag) ? tag : null;

    /// <summary>These tags with one more, or with another for a signal that had one.</summary>
    /// <param name="signal">The signal.</param>
    /// <param name="tag">Its tag.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="signal"/> is no signal.</exception>
    public TagSet<TSignal> With(TSignal signal, Tag tag)
    {
        Require.NotNull(tag, nameof(tag));
        _ = SignalKinds.Of(signal);
        return new TagSet<TSignal>(new(_tags) { [signal] = tag });
    }

    /// <summary>The tags in the order of their signals.</summary>
    public IEnumerator<KeyValuePair<TSignal, Tag>> GetEnumerator() => _tags.GetEnumerator();

    IEnumerator IEnumerable.GetEnumerator() => GetEnumerator();
}

/// <summary>Makes sets of tags.</summary>
public static class TagSet
{
    /// <summary>No tags of a pass yet.</summary>
    public static TagSet<PassSignal> OfPass => TagSet<PassSignal>.Empty;

    /// <summary>No tags of a generator yet.</summary>
    public static TagSet<GeneratorSignal> OfGenerator => TagSet<GeneratorSignal>.Empty;
}

internal static class SignalKinds
{
    public static UnitKind Of<TSignal>(TSignal signal)
        where TSignal : struct, Enum => signal switch
        {
            PassSignal pass => PassSignals.Kind(pass),
            GeneratorSignal generator => GeneratorSignals.Kind(generator),
            _ => throw new ArgumentOutOfRangeException(nameof(signal), signal, "This is no signal."),
        };
}
