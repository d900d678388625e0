namespace TwoPhase.Advisory;

/// <summary>What a generator, or one of its passes, is doing. Only <see cref="Running"/> and <see cref="Turndown"/> have a quality.</summary>
public enum OperatingState
{
    /// <summary>Not yet known.</summary>
    Unknown = 0,

    /// <summary>Neither fire nor feed.</summary>
    Off = 1,

    /// <summary>Feed without fire, before any fire.</summary>
    Filling = 2,

    /// <summary>Air through the furnace before the fire; only ever given, since no water-side instrument shows it.</summary>
    Purge = 3,

    /// <summary>Low fire on a pass that holds liquid to its outlet.</summary>
    LowFireHold = 4,

    /// <summary>More than low fire, and the outlet not yet wet steam.</summary>
    LightOff = 5,

    /// <summary>Wet steam at more than half of full firing.</summary>
    Running = 6,

    /// <summary>Wet steam at less than half of full firing.</summary>
    Turndown = 7,

    /// <summary>The fire has gone out with feed still on.</summary>
    Trip = 8,

    /// <summary>No feed and no fire after running.</summary>
    Draining = 9,
}
