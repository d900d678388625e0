using TwoPhase.Passes;
using TwoPhase.Steam;
using UnitsNet;

namespace TwoPhase.Tests.Passes;

public class FeedInterchangerTests
{
    private static readonly Pass Bare = new("1", [ExamplePass.Tubes("feed", 40).AsUnheated(), ExamplePass.Tubes("bank", 300).AsConvective(), ExamplePass.Tubes("return", 40).AsUnheated(), ExamplePass.Tubes("coil", 330)]);

    private static readonly PassConditions Conditions = ExamplePass.Conditions.WithFeedTemperature(Temperature.FromDegreesCelsius(120));

    // The definition of a counterflow exchanger: Q = UA ΔTlm, and both sides change by Q over their flow.
    [Fact]
    public void Solve_Conductance_MovesConductanceTimesLogarithmicMean()
    {
        Pass pass = Bare.WithInterchanger(FeedInterchanger.FromSurface("feed", "return", HeatTransferCoefficient.FromWattsPerSquareMeterKelvin(1500), Area.FromSquareMeters(8)).WithBypass(Ratio.FromPercent(20)));
        PassProfile profile = SteadyState.Solve(pass, Conditions);
        (ProfilePoint coldIn, ProfilePoint coldOut) = Ends(profile, "feed");
        (ProfilePoint hotIn, ProfilePoint hotOut) = Ends(profile, "return");
        double first = hotIn.Temperature.Kelvins - coldOut.Temperature.Kelvins, second = hotOut.Temperature.Kelvins - coldIn.Temperature.Kelvins, moved = (double)profile.InterchangerHeat.Watts;
        Approx.Relative(12000 * (first - second) / Math.Log(first / second), moved, 1e-7);
        Approx.Relative(moved / (4.8 * 0.8), coldOut.Enthalpy.JoulesPerKilogram - coldIn.Enthalpy.JoulesPerKilogram, 1e-9);
        Approx.Relative(moved / 4.8, hotIn.Enthalpy.JoulesPerKilogram - hotOut.Enthalpy.JoulesPerKilogram, 1e-9);
        Approx.Absolute(0, profile.Audit.EnergyResidual, 1e-9);
        Approx.Absolute(0, profile.Audit.MassResidual, 1e-12);
    }

    // The definition of effectiveness: what is moved over what would be, were the cold side heated to where the hot side enters.
    [Fact]
    public void Solve_Effectiveness_MovesThatShareOfTheMost()
    {
        PassProfile profile = SteadyState.Solve(Bare.WithInterchanger(FeedInterchanger.FromEffectiveness("feed", "return", 0.4)), Conditions);
        ProfilePoint coldIn = Ends(profile, "feed").In, hotIn = Ends(profile, "return").In;
        double most = SteamState.FromPressureTemperature(coldIn.Pressure, hotIn.Temperature).SpecificEnthalpy.JoulesPerKilogram - coldIn.Enthalpy.JoulesPerKilogram;
        Approx.Relative(0.4 * 4.8 * most, (double)profile.InterchangerHeat.Watts, 1e-6);
    }

    // Heat moved inside the pass does not leave it: what the fire gives is the whole rise from inlet to outlet.
    [Fact]
    public void Solve_Interchanger_LeavesTheRiseAsItIs()
    {
        PassProfile profile = SteadyState.Solve(Bare.WithInterchanger(FeedInterchanger.FromEffectiveness("feed", "return", 0.4)), Conditions);
        Approx.Relative(8.2e6 / 4.8, profile.Outlet.Enthalpy.JoulesPerKilogram - profile.Inlet.Enthalpy.JoulesPerKilogram, 1e-9);
    }

    private static (ProfilePoint In, ProfilePoint Out) Ends(PassProfile profile, string section) => (profile.First(row => row.Section == section), profile.Last(row => row.Section == section));
}
