namespace TwoPhase.Metering;

/// <summary>How the output of a differential-pressure transmitter follows the differential.</summary>
public enum TransmitterCharacteristic
{
    /// <summary>Output in proportion to the differential; the root is extracted downstream, once.</summary>
    Linear,

    /// <summary>Output in proportion to the root of the differential, as to flow; nothing downstream may extract it again.</summary>
    SquareRoot,
}
