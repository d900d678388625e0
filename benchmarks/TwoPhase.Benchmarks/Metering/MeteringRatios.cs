using TwoPhase.Benchmarks.Ratios;
using TwoPhase.Metering;
using TwoPhase.Units;
using UnitsNet;
using UnitsNet.Units;

namespace TwoPhase.Benchmarks.Metering;

/// <summary>Quality from flow, pressure and differential: one sample, through the doors, and over columns.</summary>
internal sealed class MeteringRatios : IRatioSuite
{
    private const int Count = 1024, Samples = 1 << 22;

    private static readonly SiteConstantMeter Site = new(Area.FromSquareMillimeters(2870));
    private static readonly QualityMeter Lumped = new(Site, WetSteamModel.Homogeneous);
    private static readonly ClassicalVenturi Venturi = new(Length.FromMillimeters(77.9), Length.FromMillimeters(49), ConvergentFinish.Machined);
    private static readonly OrificePlate Orifice = new(Length.FromMillimeters(77.9), Length.FromMillimeters(49), OrificeTappings.Flange);

    private static readonly double[] Flow = Yardsticks.Fill(Samples, 4.5, 5, 1), Pressures = Yardsticks.Fill(Samples, 9.2e6, 10e6, 2), Differential = Yardsticks.Fill(Samples, 36e3, 42e3, 3), Quality = new double[Samples];
    private static readonly ReadingStatus[] Status = new ReadingStatus[Samples];
    private static readonly MassFlow[] SiFlows = [.. Flow.Take(Count).Select(value => MassFlow.FromKilogramsPerSecond(value))], PlantFlows = [.. Flow.Take(Count).Select(value => MassFlow.FromTonnesPerHour(value * 3.6))];
    private static readonly Pressure[] SiPressures = [.. Pressures.Take(Count).Select(value => Pressure.FromPascals(value))], PlantPressures = [.. Pressures.Take(Count).Select(value => Pressure.FromPoundsForcePerSquareInch(value / 6894.757))];
    private static readonly Pressure[] SiDifferentials = [.. Differential.Take(Count).Select(value => Pressure.FromPascals(value))], PlantDifferentials = [.. Differential.Take(Count).Select(value => Pressure.FromKilopascals(value / 1e3))];

    public string Name => "Metering";

    public IEnumerable<RatioCase> Cases()
    {
        yield return Single("homogeneous, constant, scalar core with checks", 0.8, i => Lumped.SampleCore(Flow[i], Pressures[i], Differential[i], out _));
        yield return Single("the same through the door, SI units", 6.8, i => Lumped.Quality(SiFlows[i], SiPressures[i], SiDifferentials[i]).QualityCore);
        yield return Single("the same through the door, t/h, psi, kPa", 6.8, i => Lumped.Quality(PlantFlows[i], PlantPressures[i], PlantDifferentials[i]).QualityCore);
        foreach (WetSteamModel model in WetSteamModel.All.Where(model => model != WetSteamModel.StevenOrifice))
        {
            var meter = new QualityMeter(Venturi, model);
            yield return Single(model.Name + " over a venturi", 40, i => meter.SampleCore(Flow[i], Pressures[i], Differential[i], out _));
        }

        var plate = new QualityMeter(Orifice, WetSteamModel.StevenOrifice);
        yield return Single(WetSteamModel.StevenOrifice.Name + " over an orifice", 40, i => plate.SampleCore(Flow[i], Pressures[i], Differential[i], out _));
        yield return new("homogeneous, constant, column of 4 million", Samples, () =>
        {
            Lumped.Quality(Column.Of(Flow, MassFlowUnit.KilogramPerSecond), Column.Of(Pressures, PressureUnit.Pascal), Column.Of(Differential, PressureUnit.Pascal), Quality, Status);
            return Quality[^1];
        })
        {
            Yardstick = Yardsticks.W,
            Target = 1.7,
        };
    }

    private static RatioCase Single(string what, double target, Func<int, double> call) => new(what, Count, () =>
    {
        double sum = 0;
        for (int i = 0; i < Count; i++) sum += call(i);
        return sum;
    })
    {
        Yardstick = Yardsticks.P,
        Target = target,
    };
}
