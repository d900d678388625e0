namespace TwoPhase.Metering;

/// <summary>What the output of a transmitter says about itself.</summary>
public enum TransmitterStatus
{
    /// <summary>Nothing was read; the status of a default value.</summary>
    None,

    /// <summary>Inside the range, clear of its ends.</summary>
    Good,

    /// <summary>Zero, or below the low cut-off: the true differential is somewhere between zero and the cut-off.</summary>
    BelowCutoff,

    /// <summary>Below the range or at the lower end of the output: the true differential may be lower still.</summary>
    AtFloor,

    /// <summary>Above 98 % of the span or at the upper end of the output: the true differential may be higher, and a quality from it capped.</summary>
    AtCeiling,

    /// <summary>The output is one that the transmitter gives on purpose when it has failed, or that it cannot give; there is no differential.</summary>
    Failed,
}
