using TwoPhase.Dynamics;
using TwoPhase.Holdup;
using TwoPhase.Passes;
using TwoPhase.Slip;
using TwoPhase.Tests.Passes;
using TwoPhase.Tests.Support;
using UnitsNet;
using UnitsNet.Units;
using static TwoPhase.Tests.Dynamics.Simulations;

namespace TwoPhase.Tests.Dynamics;

public class PassSimulatorTests
{
    [Fact]
    public void Run_FiringStep_ReadsFalselyUntilTheWaterIsOut()
    {
        PassHistory history = Run(Still.StepFiring(Seconds(10), Ratio.FromPercent(106)), 900);
        TransientFigures figures = history.Figures(MassFraction.FromPercent(1));
        PassProfile before = SteadyState.Solve(MeteredPass, Start), after = SteadyState.Solve(MeteredPass, Start.WithAbsorbedHeat(Start.AbsorbedHeat * 1.06m));

        Assert.InRange(figures.PeakError!.Value.DecimalFractions, 0.05, 0.15);
        Assert.InRange(figures.TimeFalse.Seconds, 100, 600);
        Assert.InRange(figures.Settled!.Value.Seconds, 100, 700);
        Approx.Absolute(after.OutletQuality.DecimalFractions, history[^1].TrueQuality.DecimalFractions, 1e-5);
        Approx.Absolute(history[^1].TrueQuality.DecimalFractions, history[^1].IndicatedQuality!.Value.DecimalFractions, 1e-5);

        // What the steady solver says that the pass holds less, the simulator has pushed out.
        Approx.Relative(Held(before) - Held(after), figures.WaterPushedOut.Kilograms, 0.02);
    }

    // Header pressure down: stored water flashes, and the pass must come to hold what the steady solver says at the lower pressure.
    [Theory]
    [InlineData(-0.3), InlineData(0.3)]
    public void Run_HeaderPressureRamp_PushesOutWhatTheSteadySolverSays(double megapascals)
    {
        Pressure to = Start.OutletPressure + Pressure.FromMegapascals(megapascals);
        PassHistory history = Run(Still.RampOutletPressure(Seconds(10), Seconds(60), to), 1000);
        TransientFigures figures = history.Figures(MassFraction.FromPercent(1));
        double held = Held(SteadyState.Solve(MeteredPass, Start)) - Held(SteadyState.Solve(MeteredPass, Start.WithOutletPressure(to)));
        Approx.Relative(held, figures.WaterPushedOut.Kilograms, 0.02);
        Assert.InRange(figures.PeakError!.Value.DecimalFractions * -Math.Sign(megapascals), 0.05, 0.11);
        Approx.Absolute(0, history[^1].EnergyResidual, 1e-12);
    }

    // Independent model of the same pass: false peak 0.05 to 0.08, 9 to 13 kg pushed out, true quality within 0.010. With one even flux in
    // each half it is 0.090, 15 kg and 0.017: the boundary goes Δh′/q′ upstream, so what counts is the flux where boiling begins.
    [Fact]
    public void Run_HeaderPressureDown_FluxThatRisesToTheOnset_PushesOutWhatAnotherModelDoes()
    {
        PassConditions start = SteadyState.FindHeat(FittedPass, Start, MassFraction.FromPercent(78)).Conditions;
        TransientFigures figures = Run(new OperatingSchedule(start).RampOutletPressure(Seconds(10), Seconds(60), start.OutletPressure - Pressure.FromMegapascals(0.3)), 1000, pass: FittedPass).Figures(MassFraction.FromPercent(1));
        Assert.InRange(figures.PeakError!.Value.DecimalFractions, 0.05, 0.08);
        Assert.InRange(figures.WaterPushedOut.Kilograms, 9, 13);
        Approx.Absolute(0.78, figures.TrueQuality.Lowest.DecimalFractions, 0.0105);
        Approx.Absolute(0.78, figures.TrueQuality.Highest.DecimalFractions, 0.010);
    }

    [Fact]
    public void Run_HeaderPressureUpAndDown_MirrorEachOther()
    {
        TransientFigures Ramp(double megapascals) => Run(Still.RampOutletPressure(Seconds(10), Seconds(60), Start.OutletPressure + Pressure.FromMegapascals(megapascals)), 400).Figures(MassFraction.FromPercent(1));
        TransientFigures down = Ramp(-0.3), up = Ramp(0.3);
        Approx.Relative(down.PeakError!.Value.DecimalFractions, -up.PeakError!.Value.DecimalFractions, 0.1);
        Approx.Relative(down.WaterPushedOut.Kilograms, -up.WaterPushedOut.Kilograms, 0.1);
    }

    // The trade's rule in one line: indicated − true = W ((ṁout/ṁin)² − 1) for a homogeneous meter, whatever moves and whatever the slip.
    [Theory]
    [InlineData("flow"), InlineData("firing"), InlineData("feed"), InlineData("pressure")]
    public void Run_AnyTransient_ObeysTheAreaRule(string what)
    {
        OperatingSchedule schedule = what switch
        {
            "flow" => Still.RampFeedFlow(Seconds(10), Seconds(20), Start.FeedFlow * 0.95),
            "firing" => Still.StepFiring(Seconds(10), Ratio.FromPercent(95)),
            "feed" => Still.RampFeedTemperature(Seconds(10), Seconds(100), Temperature.FromDegreesCelsius(182)),
            _ => Still.RampOutletPressure(Seconds(10), Seconds(60), Pressure.FromMegapascals(9.5)),
        };
        TransientFigures figures = Run(schedule, 900, Homogeneous).Figures(MassFraction.FromPercent(1));
        Approx.Relative(figures.AreaByOutletFlow, figures.AreaUnderError, 1e-6);
        Approx.Relative(figures.AreaByHoldup, figures.AreaUnderError, 0.1);
    }

    // The feed by its enthalpy: by its temperature it follows the inlet pressure from call to call, by a millionth.
    [Fact]
    public void Advance_InOnePortionOrMany_IsTheSame()
    {
        PassConditions start = Start.WithFeedEnthalpy(SteadyState.Solve(MeteredPass, Start).Inlet.Enthalpy), other = start.WithAbsorbedHeat(Start.AbsorbedHeat * 1.05m).WithFeedFlow(Start.FeedFlow * 0.98);
        PassSimulator one = new(MeteredPass, start), many = new(MeteredPass, start), bits = new(MeteredPass, start);
        one.Advance(other, Seconds(60));
        for (int i = 0; i < 60; i++) many.Advance(other, Seconds(1));
        for (int i = 0; i < 200; i++) bits.Advance(other, Seconds(0.3));
        Approx.Relative(one.Now.OutletFlow.KilogramsPerSecond, many.Now.OutletFlow.KilogramsPerSecond, 1e-12);
        Approx.Relative(one.Now.Holdup.Kilograms, bits.Now.Holdup.Kilograms, 1e-4);
        Approx.Absolute(one.Now.TrueQuality.DecimalFractions, bits.Now.TrueQuality.DecimalFractions, 1e-3);
    }

    [Fact]
    public void Run_Twice_GivesTheSameBits() =>
        Assert.Equal(Run(Still.StepFiring(Seconds(5), Ratio.FromPercent(104)), 60).ToList(), Run(Still.StepFiring(Seconds(5), Ratio.FromPercent(104)), 60).ToList());

    // Halving the cells changes outlet flow and quality by half a per cent of their change on the mean, and nowhere by more than two and a half, from
    // two seconds after the change on and until its front comes out.
    [Theory]
    [InlineData("flow down"), InlineData("flow up"), InlineData("ramp"), InlineData("firing"), InlineData("pressure")]
    public void Run_TwiceTheCells_ChangesLittle(string what)
    {
        OperatingSchedule schedule = what switch
        {
            "flow down" => Still.StepFeedFlow(Seconds(10), Start.FeedFlow * 0.9),
            "flow up" => Still.StepFeedFlow(Seconds(10), Start.FeedFlow * 1.2),
            "ramp" => Still.RampFeedFlow(Seconds(10), Seconds(30), Start.FeedFlow * 0.9),
            "firing" => Still.StepFiring(Seconds(10), Ratio.FromPercent(106)),
            _ => Still.RampOutletPressure(Seconds(10), Seconds(60), Pressure.FromMegapascals(9.3)),
        };
        PassHistory coarse = Run(schedule, 320), fine = Run(schedule, 320, SimulatorOptions.Default.WithCells(160));
        Compare(static row => row.OutletFlow.KilogramsPerSecond);
        Compare(static row => row.TrueQuality.DecimalFractions);

        void Compare(Func<PassInstant, double> of)
        {
            double effect = fine.Max(row => Math.Abs(of(row) - of(fine[0])));
            double[] off = [.. coarse.Zip(fine).Skip(12).Select(pair => Math.Abs(of(pair.First) - of(pair.Second)) / effect)];
            Assert.True(off.Average() < 0.005 && off.Max() < 0.025, $"{what}: {off.Average():P2} mean, {off.Max():P2} worst at {12 + Array.IndexOf(off, off.Max())} s");
        }
    }

    // Smooth: no second of a ramp or step of a fifth leaves a kink in the outlet flow that the next does not share.
    [Theory]
    [InlineData(0.8), InlineData(1.2)]
    public void Run_FlowStepOfAFifth_StaysSmooth(double size)
    {
        PassHistory history = Run(Still.StepFeedFlow(Seconds(10), Start.FeedFlow * size), 280);
        double[] flow = history.Values(nameof(PassInstant.OutletFlow), MassFlowUnit.KilogramPerSecond);
        for (int t = 20; t < flow.Length - 1; t++) Approx.Absolute(0, flow[t + 1] - (2 * flow[t]) + flow[t - 1], 0.005 * Start.FeedFlow.KilogramsPerSecond * Math.Abs(1 - size), $"{t} s");
    }

    [Fact]
    public void Advance_EveryInstant_AllocatesNothing()
    {
        var simulator = new PassSimulator(MeteredPass, Start);
        PassConditions up = Start.WithAbsorbedHeat(Start.AbsorbedHeat * 1.02m), down = Start.WithOutletPressure(Pressure.FromMegapascals(9.55));
        bool turn = false;
        Assert.Equal(0, AllocationProbe.Bytes(() => simulator.Advance((turn = !turn) ? up : down, Seconds(10))));
    }

    [Fact]
    public void Run_FlowThatTurnsBack_EndsWithItsHistoryAndTheReason()
    {
        // Outlet pressure up by 6 MPa in five seconds: the steam in the pass gives way faster than feed comes in.
        PassHistory history = Run(Still.RampOutletPressure(Seconds(10), Seconds(5), Pressure.FromMegapascals(15.6)), 60);
        Assert.Equal(SimulationEnd.FlowStagnated, history.End);
        Assert.InRange(history.Count, 10, 16);
        Assert.Contains("section", history.EndReason, StringComparison.Ordinal);
        Assert.Contains("stagnated or reversed", history.EndReason, StringComparison.Ordinal);

        var simulator = new PassSimulator(MeteredPass, Start);
        simulator.Run(Still.RampOutletPressure(Seconds(10), Seconds(5), Pressure.FromMegapascals(15.6)), Seconds(60));
        Assert.Equal(SimulationEnd.FlowStagnated, simulator.End);
        Assert.Throws<InvalidOperationException>(() => simulator.Advance(Start, Seconds(1)));
    }

    [Fact]
    public void Run_WholeTime_SaysCompleted()
    {
        PassHistory history = Run(Still, 30);
        Assert.Equal(SimulationEnd.Completed, history.End);
        Assert.Equal("", history.EndReason);
        Assert.Equal(31, history.Count);
        Assert.Equal(30, history[^1].Time.Seconds);
    }

    [Fact]
    public void Run_WithoutMeter_IndicatesNothing()
    {
        PassInstant row = Run(Still, 5, pass: ExamplePass.Pass)[^1];
        Assert.Null(row.IndicatedQuality);
        Assert.Null(row.ReadingError);
        Assert.Null(row.Differential);
        Assert.Null(Run(Still, 5, pass: ExamplePass.Pass).Figures(MassFraction.FromPercent(1)).PeakError);
    }

    [Fact]
    public void Run_LaggingInstruments_SpikeOnAFlowStep()
    {
        // Domain rule: unequal filters make a spike of the reading for a second or two, and nothing once the step is old.
        SimulatorOptions lagging = SimulatorOptions.Default.WithLags(new(feedFlow: Seconds(1), differential: Seconds(6)));
        OperatingSchedule schedule = Still.StepFeedFlow(Seconds(10), Start.FeedFlow * 0.95);
        PassHistory quick = Run(schedule, 60), slow = Run(schedule, 60, lagging);
        double At(PassHistory history, int second) => history[second].IndicatedQuality!.Value.DecimalFractions;
        Assert.True(Math.Abs(At(slow, 12) - At(quick, 12)) > 0.01);
        Approx.Absolute(At(quick, 60), At(slow, 60), 0.002);
    }

    [Fact]
    public void Run_MetalThatStores_DelaysAFeedFront()
    {
        OperatingSchedule schedule = Still.StepFeedTemperature(Seconds(1), Temperature.FromDegreesCelsius(181.85));
        double Dip(SimulatorOptions options) => Run(schedule, 600, options).OrderBy(row => row.TrueQuality.DecimalFractions).First().Time.Seconds;
        Assert.True(Dip(SimulatorOptions.Default) > Dip(SimulatorOptions.Default.WithoutMetal()) + 20);
    }

    [Fact]
    public void New_WhatCannotBeSimulated_ThrowsSayingWhy()
    {
        Assert.Contains("no section", Assert.Throws<ArgumentException>(() => new PassSimulator(new Pass("1", []), Start)).Message, StringComparison.Ordinal);
        Pass exchanger = new Pass("1", [ExamplePass.Tubes("cold", 20).AsUnheated(), ExamplePass.Tubes("bank", 300).AsConvective(), ExamplePass.Tubes("hot", 20).AsUnheated(), ExamplePass.Tubes("coil", 300)])
            .WithInterchanger(FeedInterchanger.FromEffectiveness("cold", "hot", 0.4));
        Assert.Contains("interchanger", Assert.Throws<ArgumentException>(() => new PassSimulator(exchanger, Start)).Message, StringComparison.Ordinal);
        Assert.Throws<ArgumentOutOfRangeException>(() => new PassSimulator(MeteredPass, Start.WithFeedTemperature(Temperature.FromDegreesCelsius(340))));
        Assert.Throws<ArgumentOutOfRangeException>(() => new PassSimulator(MeteredPass, Start.WithOutletPressure(Pressure.FromMegapascals(23))));
        Assert.Throws<ArgumentOutOfRangeException>(() => new PassSimulator(MeteredPass, default));
        Assert.Throws<ArgumentOutOfRangeException>(() => new PassSimulator(MeteredPass, Start).Advance(Start, Duration.Zero));
    }

    [Theory]
    [InlineData("Steiner"), InlineData("Homogeneous")]
    public void Run_LiquidOnly_PassesTheFeedThrough(string slip)
    {
        VoidFractionModel model = VoidFractionModel.All.First(candidate => candidate.Name.StartsWith(slip, StringComparison.Ordinal));
        OperatingSchedule cold = new OperatingSchedule(Start.WithAbsorbedHeat(Power.Zero)).StepFeedFlow(Seconds(5), Start.FeedFlow * 1.2);
        PassHistory history = Run(cold, 60, SimulatorOptions.Default.WithModels(new(model)));
        Approx.Relative(Start.FeedFlow.KilogramsPerSecond * 1.2, history[^1].OutletFlow.KilogramsPerSecond, 1e-3);
        Assert.Null(history[^1].BoilingOnset);
        Assert.Null(history[^1].IndicatedQuality);
    }

    private static double Held(PassProfile profile) => WaterHoldup.Of(profile).Total.Kilograms;
}
