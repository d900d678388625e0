using TwoPhase.Metering;
using TwoPhase.Units;

namespace TwoPhase.Passes;

public sealed partial class Pass
{
    /// <summary>The meter at the outlet; null when the pass has none of its own.</summary>
    public DifferentialPressureMeter? Meter { get; private set; }

    /// <summary>How the wet stream acts on the meter; homogeneous unless given.</summary>
    public WetSteamModel WetModel { get; private set; } = WetSteamModel.Homogeneous;

    /// <summary>The tags of the pass; empty unless given.</summary>
    public TagSet<PassSignal> Tags { get; private set; } = TagSet.OfPass;

    /// <summary>The pass with a meter at its outlet.</summary>
    /// <param name="meter">The meter.</param>
    /// <param name="model">How the wet stream acts on it; null for the homogeneous model.</param>
    public Pass WithMeter(DifferentialPressureMeter meter, WetSteamModel? model = null)
    {
        Require.NotNull(meter, nameof(meter));
        return Changed(pass => (pass.Meter, pass.WetModel) = (meter, model ?? WetSteamModel.Homogeneous));
    }

    /// <summary>The pass with its tags.</summary>
    /// <param name="tags">The tags.</param>
    public Pass WithTags(TagSet<PassSignal> tags)
    {
        Require.NotNull(tags, nameof(tags));
        return Changed(pass => pass.Tags = tags);
    }
}
