using TwoPhase.Benchmarks.Ratios;
using TwoPhase.Dynamics;
using TwoPhase.Metering;
using TwoPhase.Passes;
using TwoPhase.Slip;
using TwoPhase.Steam;
using UnitsNet;

namespace TwoPhase.Benchmarks.Dynamics;

/// <summary>A pass in time: a plant second through the door, and one inner step of one cell.</summary>
internal sealed class DynamicsRatios : IRatioSuite
{
    private const int Seconds = 60;

    private static readonly Pass Pass = new Pass("1", [Tubes("bank").AsConvective(), Tubes("coil")])
        .WithConvectiveShare(Ratio.FromPercent(41))
        .WithMeter(new(new ClassicalVenturi(Length.FromMillimeters(77.9), Length.FromMillimeters(49), ConvergentFinish.Machined), WetSteamModel.Homogeneous));

    private static readonly PassConditions Start = new(MassFlow.FromKilogramsPerSecond(4.8), Temperature.FromDegreesCelsius(171.85), Pressure.FromMegapascals(9.6), Power.FromMegawatts(8.2));
    private static readonly SimulatorOptions Default = SimulatorOptions.Default, Homogeneous = Default.WithModels(new(VoidFractionModel.Homogeneous));

    public string Name => "Dynamics";

    public IEnumerable<RatioCase> Cases()
    {
        yield return Second("a plant second, default", Default);
        yield return Second("a plant second, homogeneous, no metal", Homogeneous.WithoutMetal());
        yield return Second("a plant second, default, 160 cells", Default.WithCells(160));
        yield return Second("a plant second, default, 320 cells", Default.WithCells(320));
        yield return Step("an inner step of a cell, default", Default);
        yield return Step("an inner step of a cell, homogeneous, no metal", Homogeneous.WithoutMetal());
    }

    // Firing up for a minute, then down: never at rest, never far from where it began.
    private static RatioCase Second(string what, SimulatorOptions options)
    {
        var simulator = new PassSimulator(Pass, Start, options);
        PassConditions up = Start.WithAbsorbedHeat(Start.AbsorbedHeat * 1.02m), down = Start.WithAbsorbedHeat(Start.AbsorbedHeat * 0.98m);
        var second = Duration.FromSeconds(1);
        bool turn = false;
        return new(what, Seconds, () =>
        {
            turn = !turn;
            double sum = 0;
            for (int i = 0; i < Seconds; i++) sum += simulator.Advance(turn ? up : down, second).RawOutletFlow;
            return sum;
        })
        {
            Yardstick = Yardsticks.P,
        };
    }

    private static RatioCase Step(string what, SimulatorOptions options)
    {
        const int steps = 100;
        var channel = new Channel<SurfaceFluid>(new(SteamSurface.Default), Pass.Ducts, options.Models, options.Cells) { MetalStores = options.MetalStoresHeat, Heat = Start.RawAbsorbedHeat, FeedEnthalpy = 730e3 };
        channel.Rest(Start.RawFeedFlow, Start.RawOutletPressure);
        channel.Advance(1, Start.RawFeedFlow, Start.RawOutletPressure);
        bool turn = false;
        return new(what, steps * channel.Cells.Length, () =>
        {
            turn = !turn;
            double step = 0.7 / (1.1 * channel.CourantRate), feedFlow = Start.RawFeedFlow * (turn ? 1.01 : 0.99);
            for (int i = 0; i < steps; i++) channel.Step(step, feedFlow, Start.RawOutletPressure);
            return channel.Outlet.Outflow;
        })
        {
            Yardstick = Yardsticks.P,
            Target = 5,
        };
    }

    private static TubeSection Tubes(string name) => new TubeSection(name, Length.FromMillimeters(77.9), Length.FromMillimeters(88.9), Length.FromMeters(335.5)).WithRoughness(Length.FromMicrometers(46));
}
