using FsCheck.Xunit;
using TwoPhase.Boiling;
using TwoPhase.Passes;
using TwoPhase.Steam;
using TwoPhase.Tests.Passes;
using UnitsNet;

namespace TwoPhase.Tests.Boiling;

public class BoilingOnsetTests
{
    private static readonly PassProfile Profile = SteadyState.Solve(ExamplePass.Pass, ExamplePass.Conditions);

    [Fact]
    public void Of_TypicalPass_StandsWhereTheFlowIsSaturated()
    {
        BoilingOnset onset = BoilingOnset.Of(Profile)!;
        Saturation steam = Saturation.FromPressure(onset.Pressure);
        Approx.Relative(steam.Temperature.Kelvins, onset.Temperature.Kelvins, 1e-9);

        // Even heat in the bank: 41 % of 8.2 MW over 335.5 m into 4.8 kg/s, so the place follows from the enthalpies alone.
        double perMetre = 0.41 * 8.2e6 / 335.5 / 4.8;
        double expected = (steam.Liquid.SpecificEnthalpy.JoulesPerKilogram - Profile.Inlet.Enthalpy.JoulesPerKilogram) / perMetre;
        Approx.Relative(expected, onset.Position.Meters, 1e-9);
        Assert.Equal("bank", onset.Section);
        Assert.False(onset.IsAtInlet);
    }

    [Fact]
    public void Shares_OneBoreAndEvenTubes_AreAllTheSame()
    {
        BoilingOnset onset = BoilingOnset.Of(Profile)!;
        Approx.Relative(onset.Position.Meters / 671, onset.ShareOfLength.DecimalFractions, 1e-12);
        Approx.Relative(onset.ShareOfLength.DecimalFractions, onset.ShareOfVolume.DecimalFractions, 1e-12);
        Approx.Relative(onset.ShareOfLength.DecimalFractions, onset.ShareOfSurface!.Value.DecimalFractions, 1e-12);
    }

    [Fact]
    public void Of_PassThatNowhereBoils_IsNull() =>
        Assert.Null(BoilingOnset.Of(SteadyState.Solve(ExamplePass.Pass, ExamplePass.Conditions.WithAbsorbedHeat(Power.FromMegawatts(1)))));

    [Fact]
    public void Of_FlashingFeed_IsAtTheInlet()
    {
        PassProfile wet = SteadyState.Solve(ExamplePass.Pass, ExamplePass.Conditions.WithFeedEnthalpy(SpecificEnergy.FromKilojoulesPerKilogram(1600)).WithAbsorbedHeat(Power.FromMegawatts(4)));
        BoilingOnset onset = BoilingOnset.Of(wet)!;
        Assert.True(onset.IsAtInlet);
        Assert.Equal(0, onset.Position.Meters);
        Assert.Null(onset.Sensitivity());
    }

    [Fact]
    public void Sensitivity_TypicalPass_FollowsTheEnergyBalance()
    {
        // z = ṁ (h′ − h_in)/q′ at nearly fixed h′: −1 % of z per % of heat, +1 % per % of flow, −cp ṁ/q′ per K. The pressure at the
        // onset moves too (friction grows with heat and flow), and h′ with it: a tenth of the effect.
        BoilingOnset onset = BoilingOnset.Of(Profile)!;
        OnsetSensitivity moves = onset.Sensitivity()!.Value;
        double z = onset.Position.Meters;
        Approx.Relative(-z / 100, moves.PerPercentOfHeat.Meters, 0.12);
        Approx.Relative(z / 100, moves.PerPercentOfFlow.Meters, 0.12);
        Approx.Relative(-4370 * 4.8 / (0.41 * 8.2e6 / 335.5), moves.PerKelvinOfFeed.Meters, 0.12);
        Assert.True(moves.PerTenthOfMegapascal.Meters > 0);
    }

    [Property(MaxTest = 40)]
    public bool Of_MoreFiringOrLessFlow_MovesUpstream(byte heat, byte flow)
    {
        PassConditions conditions = ExamplePass.Conditions.WithAbsorbedHeat(Power.FromMegawatts(6 + (heat / 100.0))).WithFeedFlow(MassFlow.FromKilogramsPerSecond(4 + (flow / 255.0)));
        double here = Position(conditions);
        return Position(conditions with { RawAbsorbedHeat = conditions.RawAbsorbedHeat * 1.02 }) < here && Position(conditions with { RawFeedFlow = conditions.RawFeedFlow * 1.02 }) > here;

        static double Position(PassConditions conditions) => BoilingOnset.Of(SteadyState.Solve(ExamplePass.Pass, conditions))!.Position.Meters;
    }
}
