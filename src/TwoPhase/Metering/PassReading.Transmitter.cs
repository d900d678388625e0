namespace TwoPhase.Metering;

public readonly partial struct PassReading
{
    /// <summary>This reading with the differential that a transmitter reports; one at an end of its range is taken out as saturated, one that failed as bad.</summary>
    /// <param name="reading">What the transmitter reports.</param>
    public PassReading WithDifferential(TransmitterReading reading) => reading.Status switch
    {
        TransmitterStatus.Good => With(PassSignal.Differential, reading.Differential?.Pascals),
        TransmitterStatus.None => Without(PassSignal.Differential, SignalStatus.Missing),
        TransmitterStatus.Failed => Without(PassSignal.Differential, SignalStatus.Bad),
        _ => Without(PassSignal.Differential, SignalStatus.Saturated),
    };
}
