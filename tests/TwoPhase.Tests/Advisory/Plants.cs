using MathNet.Numerics.Distributions;
using TwoPhase.Advisory;
using TwoPhase.Dynamics;
using TwoPhase.Metering;
using TwoPhase.Passes;
using TwoPhase.Tests.Passes;
using UnitsNet;
using UnitsNet.Units;

namespace TwoPhase.Tests.Advisory;

/// <summary>The invented pass as its user knows it, and plants that differ from that.</summary>
internal static class Plants
{
    public static readonly DateTimeOffset Midnight = new(2026, 1, 1, 0, 0, 0, TimeSpan.Zero);

    // C E A √2 of the venturi of the data files: C 0.995, pipe 77.9 mm, throat 49.0 mm, expansibility taken as 1.
    public static QualityMeter Meter { get; } = new(
        new SiteConstantMeter(Area.FromSquareMillimeters(0.995 * Math.PI / 4 * 49 * 49 * Math.Sqrt(2) / Math.Sqrt(1 - Math.Pow(49 / 77.9, 4)))), WetSteamModel.Homogeneous);

    /// <summary>Design heat known to some per cent, as a user has it.</summary>
    public static Pass KnownPass { get; } = Named("1");

    public static ReadingFormat Format { get; } = new(MassFlowUnit.KilogramPerSecond, TemperatureUnit.DegreeCelsius, RatioUnit.Percent, PressureUnit.Megapascal, PressureUnit.Kilopascal);

    public static PassConditions Start { get; } = SteadyState.FindHeat(KnownPass, ExamplePass.Conditions, MassFraction.FromPercent(78)).Conditions;

    public static OperatingSchedule Still => new(Start);

    public static Pass Named(string name) => new Pass(name, [ExamplePass.Tubes("bank", 335.5).AsConvective(), ExamplePass.Tubes("coil", 335.5)])
        .WithConvectiveShare(Ratio.FromPercent(41)).WithMeter(Meter).WithHeatAtFullFiring(Power.FromMegawatts(8.4));

    /// <summary>Readings of a simulated plant, a second apart, with the noise of good instruments; heat and differential can be made to drift.</summary>
    public static IEnumerable<(PassReading Reading, double Truth)> Readings(OperatingSchedule schedule, int seconds, int seed, Pass? plant = null, PassModels? models = null, Func<double, double>? heat = null, Func<double, double>? meter = null)
    {
        var noise = new Normal(0, 1, new Random(seed));
        var simulator = new PassSimulator(plant ?? KnownPass, schedule.Start, SimulatorOptions.Default.WithMeter(Meter).WithModels(models ?? PassModels.Default));
        for (int t = 0; t < seconds; t++)
        {
            PassConditions wanted = schedule.At(Duration.FromSeconds(t + 1));
            double factor = heat?.Invoke(t) ?? 1;
            PassInstant now = simulator.Advance(wanted with { RawAbsorbedHeat = wanted.RawAbsorbedHeat * factor }, Duration.FromSeconds(1));
            PassReading reading = Format.Read(
                Midnight.AddSeconds(t),
                wanted.RawFeedFlow * (1 + (0.003 * noise.Sample())),
                wanted.RawFeedTemperature - 273.15 + (0.1 * noise.Sample()),
                100 * wanted.RawAbsorbedHeat / schedule.Start.RawAbsorbedHeat,
                (wanted.RawOutletPressure * 1e-6) + (0.003 * noise.Sample()),
                now.Differential!.Value.Kilopascals * (meter?.Invoke(t) ?? 1) * (1 + (0.005 * noise.Sample())));
            yield return (reading, now.TrueQuality.DecimalFractions);
        }
    }
}
