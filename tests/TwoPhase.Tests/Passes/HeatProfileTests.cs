using TwoPhase.Passes;
using UnitsNet;

namespace TwoPhase.Tests.Passes;

public class HeatProfileTests
{
    private static readonly TubeSection Bank = Section("bank", 20).AsConvective(), Coil = Section("coil", 30), Line = Section("line", 5).AsUnheated();

    [Fact]
    public void Even_SharesByOutsideSurface()
    {
        var profile = HeatProfile.Even([Bank, Line, Coil]);
        Approx.Relative(0.4, profile.Find("bank")!.Share.DecimalFractions, 1e-14);
        Approx.Relative(0.6, profile.Find("coil")!.Share.DecimalFractions, 1e-14);
        Assert.Null(profile.Find("line"));
    }

    [Fact]
    public void Constructor_SharesThatDoNotSumToOne_NamesSectionsAndSum()
    {
        var error = Assert.Throws<ArgumentException>(() => new HeatProfile(Share("bank", 0.41), Share("coil", 0.6)));
        Assert.Contains("sum to 1.01; they must sum to 1: 'bank' 0.41, 'coil' 0.6", error.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Constructor_SectionTwice_Throws() =>
        Assert.Contains("'bank' has two", Assert.Throws<ArgumentException>(() => new HeatProfile(Share("bank", 0.5), Share("bank", 0.5))).Message, StringComparison.Ordinal);

    [Fact]
    public void Shape_IsScaledToMeanOne_AndCumulates()
    {
        var curve = new SectionHeat("coil", Ratio.FromPercent(100), Point(0, 1), Point(0.5, 3), Point(1, 0)).Curve;
        // Trapezia by hand: 0.5 * (1 + 3) / 2 + 0.5 * (3 + 0) / 2 = 1.75.
        Approx.Relative(3 / 1.75, curve.Flux[1], 1e-14);
        Approx.Relative(1 / 1.75, curve.Cumulated(0.5), 1e-14);
        Approx.Relative(0.25 * (1 + 2) / 2 / 1.75, curve.Cumulated(0.25), 1e-14);
        Approx.Relative(1, curve.Cumulated(1), 1e-14);
        Approx.Relative((1 + (0.25 * (3 + 1.5) / 2)) / 1.75, curve.Cumulated(0.75), 1e-14);
    }

    // A flux of (1 + 4s)/2 up to the middle and its mirror image: the integral by hand is s/2 + s².
    [Fact]
    public void Solve_PeakedFlux_HasTheEnthalpyOfItsIntegral()
    {
        Pass pass = new Pass("1", [ExamplePass.Tubes("tubes", 500)]).WithHeat(new(new SectionHeat("tubes", Ratio.FromPercent(100), Point(0, 1), Point(0.5, 3), Point(1, 1))));
        PassProfile profile = SteadyState.Solve(pass, ExamplePass.Conditions);
        double feed = profile.Inlet.Enthalpy.JoulesPerKilogram;
        Assert.True(profile.Count > 40);
        foreach (ProfilePoint point in profile)
        {
            double s = point.Position.Meters / 500, near = Math.Min(s, 1 - s), integral = (near / 2) + (near * near);
            Approx.Relative(feed + (8.2e6 / 4.8 * (s <= 0.5 ? integral : 1 - integral)), point.Enthalpy.JoulesPerKilogram, 1e-10);
        }
    }

    [Theory]
    [InlineData(0.1, 1)]
    [InlineData(0, 0.9)]
    public void Shape_NotFromInletToOutlet_NamesTheSection(double from, double to) =>
        Assert.Contains("'coil'", Assert.Throws<ArgumentException>(() => new SectionHeat("coil", Ratio.FromPercent(100), Point(from, 1), Point(to, 1))).Message, StringComparison.Ordinal);

    [Fact]
    public void WithConvectiveShare_KeepsProportionsAndSum()
    {
        Pass pass = new Pass("1", [Bank, Line, Coil]).WithConvectiveShare(Ratio.FromPercent(43));
        Approx.Relative(0.43, pass.Heat!.Find("bank")!.Share.DecimalFractions, 1e-12);
        Approx.Relative(0.57, pass.Heat!.Find("coil")!.Share.DecimalFractions, 1e-12);
    }

    [Fact]
    public void WithHeat_UnheatedOrUnknownSection_IsNamed()
    {
        var pass = new Pass("1", [Bank, Line, Coil]);
        Assert.Contains("'line' of pass '1' is not heated", Assert.Throws<ArgumentException>(() => pass.WithHeat(new(Share("line", 1)))).Message, StringComparison.Ordinal);
        Assert.Contains("no section 'lien'; it has 'bank', 'line', 'coil'", Assert.Throws<ArgumentException>(() => pass.WithHeat(new(Share("lien", 1)))).Message, StringComparison.Ordinal);
    }

    private static SectionHeat Share(string section, double share) => new(section, Ratio.FromDecimalFractions(share));

    private static FluxPoint Point(double position, double flux) => new(Ratio.FromDecimalFractions(position), flux);

    private static TubeSection Section(string name, double length) => new(name, Length.FromMillimeters(77.9), Length.FromMillimeters(88.9), Length.FromMeters(length));
}
