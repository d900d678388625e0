namespace TwoPhase.Metering;

public sealed partial class QualityMeter
{
    /// <summary>Quality at a raw reading; NaN where there is none.</summary>
    internal double QualityOrNaN(double flow, double pressure, double differential) => SampleCore(flow, pressure, differential, out _);

    /// <summary>The coefficient that a mixed-up calculation would use over the right one: wet for a model with the dry C, dry for one that brings its own; null where there is no wet one.</summary>
    internal double? OtherCoefficient(in RawReading raw)
    {
        if (Meter is not ClassicalVenturi) return null;
        MeterSteam steam = MeterSteam.At(raw.Pressure, expansion: true, transport: true);
        MeterGeometry geometry = Meter.GeometryAt(steam.Temperature);
        MeterState state = State(geometry, steam, raw.Flow, raw.Pressure, raw.Differential);
        double x = Numerics.Fast.Clamp(ReadCore(raw.Flow, raw.Pressure, raw.Differential).QualityCore, 0.01, 1);
        double dry = state.DischargeCoefficient, used = Model.DischargeCoefficientCore(state, x);
        return used == dry ? WetSteamModel.ReaderHarrisGraham.DischargeCoefficientCore(state, x) / dry : dry / used;
    }
}
