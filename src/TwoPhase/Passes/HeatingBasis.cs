namespace TwoPhase.Passes;

/// <summary>Whether a heating value counts the heat that the water of combustion gives when it condenses.</summary>
public enum HeatingBasis
{
    /// <summary>Not said; no door takes it.</summary>
    None = 0,

    /// <summary>Gross or higher: the water is liquid at the end.</summary>
    Gross,

    /// <summary>Net or lower: the water stays vapour, as in a stack above its dew point.</summary>
    Net,
}
