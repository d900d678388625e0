using TwoPhase.Dynamics;
using TwoPhase.Metering;
using TwoPhase.Passes;
using TwoPhase.Slip;
using UnitsNet;
using UnitsNet.Units;

namespace TrueQuality;

/// <summary>An invented pass, as its user knows it, and the plant behind it, which is somewhat another: slip, heat split and bore differ.</summary>
internal sealed class Plant
{
    private const int Seed = 20260301;

    private static readonly ReadingFormat Format = new(MassFlowUnit.KilogramPerSecond, TemperatureUnit.DegreeCelsius, RatioUnit.Percent, PressureUnit.Megapascal, PressureUnit.Kilopascal);
    private static readonly PassConditions Design = new(MassFlow.FromKilogramsPerSecond(4.6), Temperature.FromDegreesCelsius(168), Pressure.FromMegapascals(9.2), Power.FromMegawatts(8));
    private static readonly DateTimeOffset Start = new(2026, 3, 1, 8, 0, 0, TimeSpan.Zero);

    /// <summary>The meter at the outlet; homogeneous wet steam, as the plant is too.</summary>
    public static QualityMeter Meter { get; } = new(new ClassicalVenturi(Length.FromMillimeters(77.9), Length.FromMillimeters(48), ConvergentFinish.Machined), WetSteamModel.Homogeneous);

    /// <summary>The pass as drawn, its heat known to some per cent.</summary>
    public static Pass KnownPass { get; } = PassOf(77.9, 42).WithMeter(Meter).WithHeatAtFullFiring(Power.FromMegawatts(8.3));

    private static Pass Truth { get; } = PassOf(79.0, 40).WithMeter(Meter);

    /// <summary>Readings of a trial, a second apart, each with the quality that left the pass.</summary>
    public static IEnumerable<(PassReading Reading, double TrueQuality)> Run(Trial trial)
    {
        var random = new Random(Seed);
        PassConditions rest = SteadyState.FindHeat(Truth, Design, MassFraction.FromPercent(77)).Conditions;
        OperatingSchedule schedule = trial.Schedule(new OperatingSchedule(rest));
        var simulator = new PassSimulator(Truth, rest, SimulatorOptions.Default.WithModels(PassModels.Default.WithSlip(VoidFractionModel.Zivi)));
        for (int second = 0; second < trial.Seconds; second++)
        {
            PassConditions now = schedule.At(Duration.FromSeconds(second + 1));
            PassConditions imposed = now.WithAbsorbedHeat(now.AbsorbedHeat * (decimal)trial.Heat(second));
            PassInstant instant = simulator.Advance(imposed, Duration.FromSeconds(1));
            yield return (Format.Read(
                Start.AddSeconds(second),
                now.FeedFlow.KilogramsPerSecond * (1 + (0.003 * Noise(random))),
                now.FeedTemperature!.Value.DegreesCelsius + (0.1 * Noise(random)),
                100 * (double)(now.AbsorbedHeat / rest.AbsorbedHeat),
                now.OutletPressure.Megapascals + (0.003 * Noise(random)),
                instant.Differential!.Value.Kilopascals * trial.Meter(second) * (1 + (0.005 * Noise(random)))), instant.TrueQuality.DecimalFractions);
        }
    }

    private static double Noise(Random random) => MathNet.Numerics.Distributions.Normal.Sample(random, 0, 1);

    private static Pass PassOf(double bore, double convective) => new Pass("1", [Tubes("bank", bore).AsConvective(), Tubes("coil", bore)]).WithConvectiveShare(Ratio.FromPercent(convective));

    private static TubeSection Tubes(string name, double bore) =>
        new TubeSection(name, Length.FromMillimeters(bore), Length.FromMillimeters(88.9), Length.FromMeters(330)).WithRoughness(Length.FromMicrometers(46));
}
