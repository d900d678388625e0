using TwoPhase.Dynamics;
using TwoPhase.Metering;
using TwoPhase.Passes;
using UnitsNet;

namespace LargeMoves;

/// <summary>An invented pass with a venturi at its outlet.</summary>
internal static class Plant
{
    private const double FeedFlow = 4.7, FeedTemperature = 165, Quality = 78;

    private static readonly QualityMeter Meter = new(new ClassicalVenturi(Length.FromMillimeters(77.9), Length.FromMillimeters(48), ConvergentFinish.Machined), WetSteamModel.Homogeneous);

    public static Pass Pass { get; } = new Pass("1", [Tubes("bank").AsConvective(), Tubes("coil")]).WithConvectiveShare(Ratio.FromPercent(42)).WithMeter(Meter);

    /// <summary>At work behind a header.</summary>
    public static PassConditions Running(double megapascals) => SteadyState.FindHeat(
        Pass,
        new(MassFlow.FromKilogramsPerSecond(FeedFlow), Temperature.FromDegreesCelsius(FeedTemperature), Pressure.FromMegapascals(megapascals), Power.Zero),
        MassFraction.FromPercent(Quality)).Conditions;

    /// <summary>A transmitter with a quarter to spare over what the meter makes at work.</summary>
    public static DifferentialPressureTransmitter Transmitter(PassConditions running) =>
        new(Meter.Differential(running.FeedFlow, running.OutletPressure, MassFraction.FromPercent(Quality)) * 1.25, TransmitterCharacteristic.Linear);

    private static TubeSection Tubes(string name) =>
        new TubeSection(name, Length.FromMillimeters(77.9), Length.FromMillimeters(88.9), Length.FromMeters(330)).WithRoughness(Length.FromMicrometers(46));
}
