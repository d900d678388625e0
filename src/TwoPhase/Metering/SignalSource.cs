namespace TwoPhase.Metering;

/// <summary>Whose tag a value came from.</summary>
public enum SignalSource
{
    /// <summary>Nobody's: there is no value.</summary>
    None,

    /// <summary>The pass's own tag.</summary>
    Pass,

    /// <summary>A tag that the passes of the generator share.</summary>
    Generator,
}
