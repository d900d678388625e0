using TwoPhase.Advisory;
using TwoPhase.Holdup;
using TwoPhase.Passes;
using TwoPhase.Slip;
using TwoPhase.Tests.Passes;
using TwoPhase.Uncertainty;
using TwoPhase.Units;
using UnitsNet;
using UnitsNet.Units;

namespace TwoPhase.Tests.Advisory;

public class SolidsTransportTests
{
    private static readonly PassProfile Profile = SteadyState.FindHeat(ExamplePass.Pass, ExamplePass.Conditions, MassFraction.FromPercent(78));

    [Fact]
    public void Through_BothPhasesAtOneVelocity_IsTheResidenceTime()
    {
        PassProfile homogeneous = SteadyState.Solve(ExamplePass.Pass, Profile.Conditions, new PassModels(VoidFractionModel.Homogeneous));
        Approx.Relative(WaterHoldup.Of(homogeneous).ResidenceTime.Seconds, SolidsTransport.Through(homogeneous, Duration.Zero, Duration.Zero).Delay.Seconds, 1e-9);
    }

    [Fact]
    public void Through_ColdPass_IsThatOfPlugFlow()
    {
        PassProfile cold = SteadyState.Solve(ExamplePass.Pass, ExamplePass.Conditions.WithAbsorbedHeat(Power.Zero));
        SolidsTransport transport = SolidsTransport.Through(cold, Duration.FromSeconds(30), Duration.FromSeconds(20));
        Approx.Relative(30 + (WaterHoldup.Of(cold).Total.Kilograms / 4.8), transport.Delay.Seconds, 1e-9);
        Approx.Absolute(0, transport.DelayUncertainty.Seconds, 1e-9);
    }

    [Fact]
    public void Through_VapourAhead_TakesTheLiquidLonger()
    {
        SolidsTransport transport = SolidsTransport.Through(Profile, Duration.Zero, Duration.Zero);
        Assert.True(transport.Delay.Seconds > WaterHoldup.Of(Profile).ResidenceTime.Seconds);
        Assert.InRange(transport.DelayUncertainty.Seconds, 5, 0.5 * transport.Delay.Seconds);
    }

    // Plug flow, then a mixed vessel: the answers to a step and to a ramp are 1 − exp(−t/τ) and the ramp τ late; any textbook of process control.
    [Fact]
    public void FeedBehind_StepAndRamp_AnswersAsADelayAndAMixedVessel()
    {
        SolidsTransport transport = new(Duration.FromSeconds(200), Duration.FromSeconds(10), Duration.FromSeconds(60));
        double[] stepTimes = [0, 100, 100, 5000], step = [400, 400, 500, 500], rampTimes = [0, 5000], ramp = [400, 900];
        Approx.Relative(400, Feed(transport, stepTimes, step, 299).Value.MilligramsPerLiter, 1e-12);
        Approx.Relative(500 - (100 * Math.Exp(-1.5)), Feed(transport, stepTimes, step, 390).Value.MilligramsPerLiter, 1e-12);
        UncertainValue<MassConcentration> late = Feed(transport, rampTimes, ramp, 4000);
        Approx.Relative(400 + (0.1 * (4000 - 200 - 60)), late.Value.MilligramsPerLiter, 1e-9);
        Approx.Relative(0.1 * 10, late.StandardUncertainty.MilligramsPerLiter, 1e-9);
        Approx.Relative(400 + (0.1 * (4000 - 200)), Feed(new(Duration.FromSeconds(200), Duration.Zero, Duration.Zero), rampTimes, ramp, 4000).Value.MilligramsPerLiter, 1e-12);
        Approx.Relative(500, Feed(transport, stepTimes, step, 9000).Value.MilligramsPerLiter, 1e-12);
    }

    private static UncertainValue<MassConcentration> Feed(SolidsTransport transport, double[] times, double[] milligrams, double at) =>
        transport.FeedBehind(Column.Of(times, DurationUnit.Second), Column.Of(milligrams, MassConcentrationUnit.MilligramPerLiter), Duration.FromSeconds(at));
}
