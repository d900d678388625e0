using TwoPhase.Metering;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Passes;

/// <summary>One reading of a quiet stretch: what goes into the pass and the quality that its meter reads.</summary>
public readonly record struct CalibrationSample
{
    /// <summary>A reading.</summary>
    /// <param name="feedFlow">Feed flow, greater than zero.</param>
    /// <param name="feedTemperature">Feed temperature.</param>
    /// <param name="firing">Firing, 100 % at design, greater than zero.</param>
    /// <param name="outletPressure">Absolute outlet pressure.</param>
    /// <param name="quality">Quality at the outlet, as the meter reads it; at rest the reading is right.</param>
    /// <param name="inletPressure">Absolute inlet pressure where it is measured.</param>
    /// <exception cref="ArgumentOutOfRangeException">A value is outside its limits.</exception>
    public CalibrationSample(MassFlow feedFlow, Temperature feedTemperature, Ratio firing, Pressure outletPressure, MassFraction quality, Pressure? inletPressure = null)
    {
        FeedFlow = Require.Positive(feedFlow.Si(), "Feed flow", Scale.KilogramsPerSecond, nameof(feedFlow));
        FeedTemperature = Require.Positive(feedTemperature.Si(), "Feed temperature", Scale.Celsius, nameof(feedTemperature));
        Firing = Require.Positive(firing.Si(), "Firing", Scale.None, nameof(firing));
        OutletPressure = Require.Positive(outletPressure.Si(), "Outlet pressure", Scale.Megapascals, nameof(outletPressure));
        Quality = Require.Finite(quality.Si(), "Quality", Scale.None, nameof(quality));
        InletPressure = inletPressure is { } inlet ? Require.Positive(inlet.Si(), "Inlet pressure", Scale.Megapascals, nameof(inletPressure)) : double.NaN;
        if (InletPressure <= OutletPressure) throw Require.OutOfRange(InletPressure, "Inlet pressure", Scale.Megapascals, nameof(inletPressure), $"must exceed the outlet pressure, {Scale.Megapascals.Text(OutletPressure)}");
    }

    /// <summary>A reading with the quality that a meter makes of its differential.</summary>
    /// <param name="meter">The meter at the outlet.</param>
    /// <param name="feedFlow">Feed flow.</param>
    /// <param name="feedTemperature">Feed temperature.</param>
    /// <param name="firing">Firing, 100 % at design.</param>
    /// <param name="outletPressure">Absolute outlet pressure.</param>
    /// <param name="differential">Differential of the meter.</param>
    /// <param name="inletPressure">Absolute inlet pressure where it is measured.</param>
    public static CalibrationSample FromDifferential(QualityMeter meter, MassFlow feedFlow, Temperature feedTemperature, Ratio firing, Pressure outletPressure, Pressure differential, Pressure? inletPressure = null) =>
        new(feedFlow, feedTemperature, firing, outletPressure, Require.NotNull(meter, nameof(meter)).Quality(feedFlow, outletPressure, differential).Quality, inletPressure);

    internal double FeedFlow { get; }

    internal double FeedTemperature { get; }

    internal double Firing { get; }

    internal double OutletPressure { get; }

    internal double Quality { get; }

    internal double InletPressure { get; }
}
