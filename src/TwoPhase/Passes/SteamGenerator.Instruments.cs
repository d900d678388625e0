using TwoPhase.Metering;
using TwoPhase.Units;

namespace TwoPhase.Passes;

public sealed partial class SteamGenerator
{
    /// <summary>The tags that the passes share; empty unless given.</summary>
    public TagSet<GeneratorSignal> Tags { get; private set; } = TagSet.OfGenerator;

    /// <summary>What the site leaves unsaid in its unit texts; nothing unless given.</summary>
    public UnitBasis Basis { get; private set; } = UnitBasis.None;

    /// <summary>The tags that a pass is read by: its own, and for feed temperature, firing and outlet pressure those of the generator where it has none.</summary>
    /// <param name="pass">The pass.</param>
    public TagSet<PassSignal> TagsOf(Pass pass)
    {
        TagSet<PassSignal> tags = Require.NotNull(pass, nameof(pass)).Tags;
        foreach ((PassSignal own, GeneratorSignal shared) in GeneratorSignals.SharedWithPasses)
        {
            if (tags[own] is null && Tags[shared] is { } tag) tags = tags.With(own, tag);
        }

        return tags;
    }

    /// <summary>The generator with the tags that its passes share.</summary>
    /// <param name="tags">The tags.</param>
    public SteamGenerator WithTags(TagSet<GeneratorSignal> tags)
    {
        var copy = (SteamGenerator)MemberwiseClone();
        copy.Tags = Require.NotNull(tags, nameof(tags));
        return copy;
    }

    /// <summary>The generator with the basis of its unit texts.</summary>
    /// <param name="basis">The basis.</param>
    public SteamGenerator WithBasis(UnitBasis basis)
    {
        var copy = (SteamGenerator)MemberwiseClone();
        copy.Basis = Require.NotNull(basis, nameof(basis));
        return copy;
    }
}
