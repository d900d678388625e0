namespace TwoPhase.Steam;

/// <summary>What a state of water is.</summary>
public enum SteamPhase
{
    /// <summary>Nothing: the state was never computed.</summary>
    None = 0,

    /// <summary>Liquid water: below saturation temperature, or below critical temperature at supercritical pressure.</summary>
    Liquid = 1,

    /// <summary>Wet steam: liquid and vapour together, the end points saturated liquid and saturated vapour included.</summary>
    Wet = 2,

    /// <summary>Vapour: above saturation temperature, or above critical temperature at subcritical pressure.</summary>
    Vapour = 3,

    /// <summary>Above both critical temperature and critical pressure.</summary>
    Supercritical = 4,
}
