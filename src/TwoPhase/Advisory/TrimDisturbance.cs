using TwoPhase.Dynamics;
using TwoPhase.Units;

namespace TwoPhase.Advisory;

/// <summary>Something that happens to a pass while its quality is trimmed.</summary>
public sealed class TrimDisturbance
{
    /// <summary>A disturbance.</summary>
    /// <param name="name">What to call it.</param>
    /// <param name="schedule">What happens; it leaves the feed flow alone. All disturbances of a study begin from the same conditions.</param>
    public TrimDisturbance(string name, OperatingSchedule schedule)
    {
        Name = Require.NotNull(name, nameof(name));
        Schedule = Require.NotNull(schedule, nameof(schedule));
    }

    /// <summary>What it is called.</summary>
    public string Name { get; }

    /// <summary>What happens.</summary>
    public OperatingSchedule Schedule { get; }
}
