using TwoPhase.Dynamics;
using TwoPhase.Numerics;
using TwoPhase.Passes;
using TwoPhase.Steam;
using TwoPhase.Tests.Support;
using UnitsNet;
using static TwoPhase.Tests.Dynamics.Simulations;

namespace TwoPhase.Tests.Dynamics;

/// <summary>Boiling water that drives colder water out before it.</summary>
public class CollapseTests
{
    // Three times what the base case lacks: the water in the channel would boil after 545 s and needs 458 s to the outlet.
    private const double Cold = 3 * UniformChannel.Lacking;

    // The new feed boils from 182 s on and has driven the last cold liquid out at 253 s, by when nine times the feed flow leaves. A front that is some
    // cells wide boils that much later, and what leaves grows by 3 % a second.
    [Theory]
    [InlineData(150, 1e-9), InlineData(200, 0.06), InlineData(220, 0.06), InlineData(240, 0.06), InlineData(250, 0.06)]
    public void Advance_BoilingWaterBehindASlug_DrivesItOutAsTheClosedFormSays(double seconds, double tolerance)
    {
        Channel<ConstantDensityFluid> channel = Slug(320);
        Assert.True(channel.Advance(seconds, Channels.Flow, Channels.Pressure));
        Approx.Relative(UniformChannel.ColdSlug(UniformChannel.Lacking, seconds).MassFlux, Channels.Answer(channel).MassFlux, tolerance);
        Approx.Absolute(0, channel.MassResidual, 1e-12);
        Approx.Absolute(0, channel.EnergyResidual, 1e-12);
    }

    [Fact]
    public void Advance_FourTimesTheCells_ComesNearerToTheClosedFormAtFirstOrder() => Assert.InRange(WorstError(80) / WorstError(320), 3, 8);

    // In blows, one for each cell that fills, the flow would go up and down by a third and more.
    [Fact]
    public void Advance_FrontWalksFromCellToCell_FlowRisesEvenly()
    {
        Channel<ConstantDensityFluid> channel = Slug(80);
        Assert.True(channel.Advance(205, Channels.Flow, Channels.Pressure));
        double before = channel.Outlet.Outflow;
        for (int t = 206; t <= 248; t++)
        {
            Assert.True(channel.Advance(1, Channels.Flow, Channels.Pressure));
            Assert.InRange(channel.Outlet.Outflow / before, 0.99, 1.09);
            before = channel.Outlet.Outflow;
        }
    }

    // Pass full of cold water, header at 2 MPa, hot feed: it boils far up, and the run comes to its end all the same.
    [Fact]
    public void Run_ColdPassWithHotFeed_BoilsBehindTheColdWater()
    {
        LightOffReport report = ColdPass().Run(MeteredPass);
        Assert.Equal(SimulationEnd.Completed, report.History.End);
        Assert.InRange(report.SteamAtOutlet!.Value.Seconds - report.FirstBoiling!.Value.Seconds, 60, 200);
        Assert.InRange(report.History.First(row => row.BoilingOnset is not null).BoilingOnset!.Value.Meters, 350, 500);
        Assert.All(report.History, row => Approx.Absolute(0, row.MassResidual, 1e-9));
        Assert.All(report.History, row => Approx.Absolute(0, row.EnergyResidual, 1e-9));
    }

    [Fact]
    public void Advance_WhileSteamCollapses_AllocatesNothing()
    {
        OperatingSchedule schedule = ColdPass().Schedule;
        var simulator = new PassSimulator(MeteredPass, schedule.Start);
        for (int t = 0; t < 610; t++) simulator.Advance(schedule.Over(t, t + 1), Seconds(1));
        Assert.NotNull(simulator.Now.BoilingOnset);
        Assert.True(simulator.Now.TrueQuality.DecimalFractions < -0.2);
        PassConditions conditions = simulator.Conditions;
        Assert.Equal(0, AllocationProbe.Bytes(() => simulator.Advance(conditions, Seconds(1))));
    }

    // A run that is taken up again goes on as if nothing had been, while steam runs into cold water and while a fire that has gone out lets cold water in.
    [Theory]
    [InlineData(true), InlineData(false)]
    public void Load_InTheMidstOfALargeMove_GoesOnToTheBit(bool lightOff)
    {
        const double pressure = 2e6, flow = 4.8, hot = 850e3, cold = 90e3;
        Channel<SurfaceFluid> Make() => new(new(SteamSurface.Default), MeteredPass.Ducts, PassModels.Default, 40);
        Channel<SurfaceFluid> first = Make(), second = Make();
        (first.FeedEnthalpy, first.Heat) = lightOff ? (cold, 0) : (hot, 8e6);
        Assert.True(first.Rest(flow, pressure));
        (first.FeedEnthalpy, first.Heat) = lightOff ? (hot, 4e6) : (cold, 0);
        for (int t = 0; lightOff ? first.Cells.ToArray().All(cell => cell.Boundary != Boundary.Collapse) : t < 60; t++) Assert.True(first.Advance(1, flow, pressure) && t < 1000);

        var saved = new StateWriter();
        first.Save(saved);
        second.Load(new(saved.ToArray()));
        for (int t = 0; t < 30; t++)
        {
            Assert.True(first.Advance(1, flow, pressure));
            Assert.True(second.Advance(1, flow, pressure));
            Assert.Equal(first.MeteredFlow, second.MeteredFlow);
            Assert.Equal(first.Cells.ToArray().Select(cell => cell.Energy), second.Cells.ToArray().Select(cell => cell.Energy));
            Assert.Equal(first.Cells.ToArray().Select(cell => cell.Wall), second.Cells.ToArray().Select(cell => cell.Wall));
        }
    }

    private static LightOff ColdPass()
    {
        PassConditions end = SteadyState.FindHeat(MeteredPass, Start.WithOutletPressure(Pressure.FromMegapascals(2)), MassFraction.FromPercent(78)).Conditions;
        return new LightOff(end, Ratio.FromPercent(20), Seconds(600), Seconds(300)).WithWaterTemperature(Temperature.FromDegreesCelsius(20));
    }

    private static Channel<ConstantDensityFluid> Slug(int cells)
    {
        Channel<ConstantDensityFluid> channel = Channels.Uniform(cells, lacking: Cold);
        channel.FeedEnthalpy = ConstantDensityFluid.Subcooled(UniformChannel.Lacking);
        return channel;
    }

    private static double WorstError(int cells)
    {
        Channel<ConstantDensityFluid> channel = Slug(cells);
        Assert.True(channel.Advance(210, Channels.Flow, Channels.Pressure));
        double worst = 0;
        for (int t = 210; t < 245; t += 5)
        {
            worst = Math.Max(worst, Math.Abs((Channels.Answer(channel).MassFlux / UniformChannel.ColdSlug(UniformChannel.Lacking, t).MassFlux) - 1));
            Assert.True(channel.Advance(5, Channels.Flow, Channels.Pressure));
        }

        return worst;
    }
}
