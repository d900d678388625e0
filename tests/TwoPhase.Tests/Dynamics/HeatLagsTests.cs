using TwoPhase.Dynamics;
using TwoPhase.Passes;
using TwoPhase.Tests.Support;
using UnitsNet;
using UnitsNet.Units;
using static TwoPhase.Tests.Dynamics.Simulations;

namespace TwoPhase.Tests.Dynamics;

/// <summary>Heat that follows the fire through two first-order lags, whose step response is known in closed form.</summary>
public class HeatLagsTests
{
    private const double Gas = 12, Share = 0.1, Refractory = 600;

    private static readonly SimulatorOptions Lagging = SimulatorOptions.Default.WithHeatLags(new(Seconds(Gas), Ratio.FromDecimalFractions(Share), Seconds(Refractory)));

    [Theory]
    [InlineData(1.06), InlineData(0)]
    public void Run_FiringStep_HeatFollowsTheClosedForm(double size)
    {
        PassHistory history = Run(Still.StepFiring(Seconds(10), Ratio.FromDecimalFractions(size)), 300, Lagging);
        double[] heat = history.Values(nameof(PassInstant.AbsorbedHeat), PowerUnit.Watt);
        double before = Start.RawAbsorbedHeat, step = (size - 1) * before;
        Approx.Relative(before, heat[10], 1e-12);
        for (int t = 11; t <= 300; t++)
        {
            // Mean over the last second of 1 − (1 − f) e^(−t/τg) − f e^(−t/τr).
            double Left(double lag) => lag * (Math.Exp(-(t - 11) / lag) - Math.Exp(-(t - 10) / lag));
            Approx.Relative(before + (step * (1 - ((1 - Share) * Left(Gas)) - (Share * Left(Refractory)))), heat[t], 1e-9, $"{t} s");
        }

        Approx.Absolute(0, history[^1].EnergyResidual, 1e-12);
    }

    [Fact]
    public void Advance_InOnePortionOrMany_IsTheSame()
    {
        PassConditions start = Start.WithFeedEnthalpy(SteadyState.Solve(MeteredPass, Start).Inlet.Enthalpy), other = start.WithAbsorbedHeat(Start.AbsorbedHeat * 1.05m);
        PassSimulator one = new(MeteredPass, start, Lagging), many = new(MeteredPass, start, Lagging);
        one.Advance(other, Seconds(60));
        for (int i = 0; i < 60; i++) many.Advance(other, Seconds(1));
        Approx.Relative(one.Now.OutletFlow.KilogramsPerSecond, many.Now.OutletFlow.KilogramsPerSecond, 1e-12);
        Approx.Relative(one.Now.RawAbsorbedHeat, many.Now.RawAbsorbedHeat, 1e-12);
    }

    [Fact]
    public void Run_WithoutLags_HeatIsThatOfTheFire()
    {
        PassHistory history = Run(Still.StepFiring(Seconds(10), Ratio.FromPercent(106)), 12);
        Approx.Relative(Start.RawAbsorbedHeat, history[10].RawAbsorbedHeat, 1e-15);
        Approx.Relative(Start.RawAbsorbedHeat * 1.06, history[11].RawAbsorbedHeat, 1e-15);
    }

    // The outlet flow cannot peak before the heat comes.
    [Fact]
    public void Run_FiringStepBehindLags_ReadsLessFalselyAndLater()
    {
        OperatingSchedule step = Still.StepFiring(Seconds(10), Ratio.FromPercent(106));
        TransientFigures quick = Run(step, 900).Figures(MassFraction.FromPercent(1)), slow = Run(step, 900, SimulatorOptions.Default.WithHeatLags(new(Seconds(60)))).Figures(MassFraction.FromPercent(1));
        Assert.True(slow.PeakError!.Value < quick.PeakError!.Value);
        Assert.True(slow.TimeOfPeakError!.Value > quick.TimeOfPeakError!.Value);
        Approx.Relative(quick.WaterPushedOut.Kilograms, slow.WaterPushedOut.Kilograms, 0.01);
    }

    [Fact]
    public void New_OutsideItsLimits_ThrowsNamingTheValue()
    {
        Assert.Contains("-1 s", Assert.Throws<ArgumentOutOfRangeException>(() => new HeatLags(Seconds(-1))).Message, StringComparison.Ordinal);
        Assert.Contains("1.2", Assert.Throws<ArgumentOutOfRangeException>(() => new HeatLags(Seconds(1), Ratio.FromPercent(120), Seconds(9))).Message, StringComparison.Ordinal);
        Assert.Contains("refractory", Assert.Throws<ArgumentOutOfRangeException>(() => new HeatLags(Seconds(1), Ratio.FromPercent(20), Seconds(-9))).Message, StringComparison.Ordinal);
    }
}
