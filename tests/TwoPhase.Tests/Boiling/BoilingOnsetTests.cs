using FsCheck.Xunit;
using TwoPhase.Boiling;
using TwoPhase.HeatTransfer;
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

    [Fact]
    public void NetVapour_EvenHeat_LiesUpstreamByTheSubcoolingOfSahaAndZuber()
    {
        // Pe = 8e5, so h′ − hd = 154 q/G, and dz = 154 (q/G) ṁ/q′ = 154 (D/4): 3.0 m for any even heat in a round tube, less
        // what the pressure falls by over them (h′ with it), which is a per cent.
        BoilingOnset onset = BoilingOnset.Of(Profile)!, net = BoilingOnset.NetVapour(Profile)!;
        Assert.Equal(OnsetDefinition.NetVapour, net.Definition);
        Approx.Relative(154 * 0.0779 / 4, onset.Position.Meters - net.Position.Meters, 0.02);
        Approx.Relative(net.Position.Meters / 671, net.ShareOfVolume.DecimalFractions, 1e-9);
        Assert.True(net.Pressure > onset.Pressure);
    }

    [Fact]
    public void FirstBubbles_EvenHeat_StandWhereTheWallHasTheSuperheatTheyNeed()
    {
        BoilingOnset bubbles = BoilingOnset.FirstBubbles(Profile)!;
        HeatFlux flux = HeatFlux.FromWattsPerSquareMeter(0.41 * 8.2e6 / (335.5 * Math.PI * 0.0779));
        SteamState water = SteamState.FromPressureTemperature(bubbles.Pressure, bubbles.Temperature);
        double film = SinglePhaseFilm.Gnielinski(water, Profile.Inlet.MassFlux, Length.FromMillimeters(77.9)).WattsPerSquareMeterKelvin;
        double superheat = OnsetModel.Default.Superheat(Profile.FlowAt(0), flux).Kelvins;
        double saturation = Saturation.FromPressure(bubbles.Pressure).Temperature.Kelvins;
        Approx.Absolute(saturation + superheat, bubbles.Temperature.Kelvins + (flux.WattsPerSquareMeter / film), 0.05);
        Assert.True(bubbles.Position < BoilingOnset.NetVapour(Profile)!.Position);
        Assert.Contains("bubbles from", bubbles.ToString(), StringComparison.Ordinal);
    }

    [Fact]
    public void Of_UnheatedLineThatFlashes_HasOneOnsetOnly()
    {
        Pass pass = new("1", [ExamplePass.Tubes("line", 400).AsUnheated()]);
        PassProfile flashing = SteadyState.Solve(pass, ExamplePass.Conditions.WithAbsorbedHeat(Power.Zero).WithOutletPressure(Pressure.FromMegapascals(5)).WithFeedFlow(MassFlow.FromKilogramsPerSecond(12)).WithFeedEnthalpy(SpecificEnergy.FromKilojoulesPerKilogram(1170)));
        Length onset = BoilingOnset.Of(flashing)!.Position;
        Assert.Equal(onset.Meters, BoilingOnset.FirstBubbles(flashing)!.Position.Meters, 1e-6);
        Assert.Equal(onset.Meters, BoilingOnset.NetVapour(flashing)!.Position.Meters, 1e-6);
    }

    [Fact]
    public void FirstBubbles_PassThatNowhereBoils_IsNullWhereTheWallIsCool()
    {
        PassProfile cool = SteadyState.Solve(ExamplePass.Pass, ExamplePass.Conditions.WithAbsorbedHeat(Power.FromMegawatts(1)));
        Assert.Null(BoilingOnset.FirstBubbles(cool));
        Assert.Null(BoilingOnset.NetVapour(cool));
    }

    [Fact]
    public void Sensitivity_OfFirstBubbles_IsThatOfTheirOwnPlace()
    {
        OnsetSensitivity bubbles = BoilingOnset.FirstBubbles(Profile)!.Sensitivity()!.Value;
        Approx.Relative(BoilingOnset.Of(Profile)!.Sensitivity()!.Value.PerKelvinOfFeed.Meters, bubbles.PerKelvinOfFeed.Meters, 0.1);
        Assert.True(bubbles.PerPercentOfHeat.Meters < 0);
    }

    [Property(MaxTest = 20)]
    public bool Onsets_AnyPass_StandInOrder(byte heat, byte flow)
    {
        PassProfile profile = SteadyState.Solve(ExamplePass.Pass, ExamplePass.Conditions.WithAbsorbedHeat(Power.FromMegawatts(6 + (heat / 100.0))).WithFeedFlow(MassFlow.FromKilogramsPerSecond(3 + (flow / 100.0))));
        double bubbles = BoilingOnset.FirstBubbles(profile)!.Position.Meters, net = BoilingOnset.NetVapour(profile)!.Position.Meters, onset = BoilingOnset.Of(profile)!.Position.Meters;
        return bubbles < net && net < onset;
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
