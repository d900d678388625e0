using TwoPhase.Metering;
using TwoPhase.Units;

namespace TwoPhase.Passes;

public sealed partial class SteamGenerator
{
    /// <summary>The tags that the passes share; empty unless given.</summary>
    public TagSet<GeneratorSignal> Tags { get; private set; } = TagSet.OfGenerator;

    /// <summary>What the site leaves unsaid in its unit texts; nothing unless given.</summary>
    public UnitBasis Basis { get; private set; } = UnitBasis.None;

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
