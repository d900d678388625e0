using TwoPhase.Metering;
using TwoPhase.Passes;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Tests.Passes;

public class PassInstrumentsTests
{
    [Fact]
    public void Pass_WithoutSections_ReadsButDoesNotSolve()
    {
        Pass pass = new Pass("bare", []).WithMeter(new(new SiteConstantMeter(Area.FromSquareMillimeters(2800)), WetSteamModel.Homogeneous));
        Assert.Equal(0, pass.FlowLength.Meters);
        Assert.NotNull(pass.Meter);
        var conditions = new PassConditions(MassFlow.FromKilogramsPerSecond(4.8), Temperature.FromKelvins(445), Pressure.FromMegapascals(9.6), Power.FromMegawatts(8));
        ArgumentException error = Assert.Throws<ArgumentException>(() => SteadyState.Solve(pass, conditions));
        Assert.Contains("Pass 'bare' has no section", error.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void TagsOf_PassWithoutItsOwn_HasThoseOfTheGenerator()
    {
        var own = new Pass("own", []).WithTags(TagSet.OfPass.With(PassSignal.FeedFlow, new Tag("A", "kg/s")).With(PassSignal.OutletPressure, new Tag("P", "MPa(a)")));
        SteamGenerator generator = new SteamGenerator("G", [own, new Pass("none", [])])
            .WithTags(TagSet.OfGenerator.With(GeneratorSignal.Firing, new Tag("F", "%")).With(GeneratorSignal.HeaderPressure, new Tag("H", "MPa(a)")).With(GeneratorSignal.TotalFeed, new Tag("T", "t/h")));
        Assert.Equal(["FeedFlow: A [kg/s]", "OutletPressure: P [MPa(a)]", "Firing: F [%]"], Texts(own));
        Assert.Equal(["OutletPressure: H [MPa(a)]", "Firing: F [%]"], Texts(generator.Passes[1]));

        IEnumerable<string> Texts(Pass pass) => generator.TagsOf(pass).Select(static entry => $"{entry.Key}: {entry.Value}");
    }

    [Fact]
    public void With_TagsAndBasis_LeaveTheOriginalAlone()
    {
        var plain = new SteamGenerator("G", [new Pass("P", [])]);
        SteamGenerator changed = plain.WithTags(TagSet.OfGenerator.With(GeneratorSignal.Firing, new Tag("F", "%"))).WithBasis(UnitBasis.None.WithAtmosphericPressure(Pressure.FromKilopascals(93)));
        Assert.Equal((0, 1), (plain.Tags.Count, changed.Tags.Count));
        Assert.Null(plain.Basis.AtmosphericPressure);
        Assert.Equal(93, changed.Basis.AtmosphericPressure!.Value.Kilopascals);
        Assert.Equal(1, plain.Passes[0].WithTags(TagSet.OfPass.With(PassSignal.FeedFlow, new Tag("A", "kg/s"))).Tags.Count);
    }
}
