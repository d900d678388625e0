using TwoPhase.Metering;
using TwoPhase.Units;

namespace TwoPhase.Passes;

public sealed partial class Pass
{
    /// <summary>The meter at the outlet with the wet-steam model over it; null when the pass has no meter of its own.</summary>
    public QualityMeter? Meter { get; private set; }

    /// <summary>The tags of the pass; empty unless given.</summary>
    public TagSet<PassSignal> Tags { get; private set; } = TagSet.OfPass;

    /// <summary>The pass with a meter at its outlet.</summary>
    /// <param name="meter">The meter and the wet-steam model over it.</param>
    public Pass WithMeter(QualityMeter meter)
    {
        Require.NotNull(meter, nameof(meter));
        return Changed(pass => pass.Meter = meter);
    }

    /// <summary>The pass with its tags.</summary>
    /// <param name="tags">The tags.</param>
    public Pass WithTags(TagSet<PassSignal> tags)
    {
        Require.NotNull(tags, nameof(tags));
        return Changed(pass => pass.Tags = tags);
    }
}
