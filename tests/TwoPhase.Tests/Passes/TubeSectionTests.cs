using TwoPhase.Passes;
using UnitsNet;

namespace TwoPhase.Tests.Passes;

public class TubeSectionTests
{
    private static readonly Length Bore = Length.FromMillimeters(77.9), Outside = Length.FromMillimeters(88.9);

    private static TubeSection Tubes => new("radiant", Bore, Outside, Length.FromMeters(20), tubesInSeries: 16);

    [Fact]
    public void Measures_SerpentineWithBends_FollowTheDrawing()
    {
        TubeSection section = Tubes.WithReturnBends(15, Length.FromMillimeters(152), 0.3);
        double length = (16 * 20) + (15 * Math.PI * 0.152), area = Math.PI / 4 * 0.0779 * 0.0779;
        Approx.Relative(length, section.FlowLength.Meters, 1e-14);
        Approx.Relative(area, section.FlowArea.SquareMeters, 1e-14);
        Approx.Relative(length * area, section.WaterVolume.CubicMeters, 1e-14);
        Approx.Relative(length * Math.PI * 0.0779, section.InsideSurface.SquareMeters, 1e-14);
        Approx.Relative(320 * Math.PI * 0.0889, section.OutsideSurface.SquareMeters, 1e-14, "bends lie outside the gas");
        Approx.Relative(length * Math.PI / 4 * ((0.0889 * 0.0889) - (0.0779 * 0.0779)) * 7850, section.MetalMass.Kilograms, 1e-14);
    }

    [Fact]
    public void Measures_ParallelTubesAndFins_AddUp()
    {
        TubeSection one = Tubes, two = Tubes.WithParallelTubes(2);
        Approx.Relative(2 * one.WaterVolume.CubicMeters, two.WaterVolume.CubicMeters, 1e-14);
        Approx.Relative(2 * one.MetalMass.Kilograms, two.MetalMass.Kilograms, 1e-14);
        Assert.Equal(one.FlowLength, two.FlowLength);
        TubeSection finned = one.WithFins(Area.FromSquareMeters(300), Mass.FromKilograms(900));
        Approx.Relative(one.OutsideSurface.SquareMeters + 300, finned.OutsideSurface.SquareMeters, 1e-14);
        Approx.Relative(one.MetalMass.Kilograms + 900, finned.MetalMass.Kilograms, 1e-14);
    }

    [Fact]
    public void WithScale_NarrowsTheBore_AndKeepsTheMetal()
    {
        TubeSection scaled = Tubes.WithScale(Length.FromMillimeters(1), ThermalConductivity.FromWattsPerMeterKelvin(1));
        Approx.Relative(Math.PI / 4 * 0.0759 * 0.0759, scaled.FlowArea.SquareMeters, 1e-13);
        Assert.Equal(Tubes.MetalMass, scaled.MetalMass);
    }

    [Fact]
    public void Rise_FromInclinationUnlessGiven()
    {
        Approx.Relative(160, Tubes.WithInclination(Angle.FromDegrees(30)).Rise.Meters, 1e-12);
        Approx.Relative(4.5, Tubes.WithRise(Length.FromMeters(4.5)).Rise.Meters, 1e-14);
        Assert.Equal(0, Tubes.Rise.Meters);
    }

    [Fact]
    public void Header_KeepsVolumeAndMetalGiven()
    {
        TubeSection header = TubeSection.Header("header", Length.FromMillimeters(200), Volume.FromLiters(90), Mass.FromKilograms(400), 1.5);
        Approx.Relative(0.09, header.WaterVolume.CubicMeters, 1e-14);
        Approx.Relative(400, header.MetalMass.Kilograms, 1e-14);
        Assert.False(header.IsHeated);
    }

    [Fact]
    public void Measures_InImperialUnits_AreTheSame()
    {
        var metric = new TubeSection("a", Length.FromMeters(0.0779), Length.FromMeters(0.0889), Length.FromMeters(6.096), 4);
        var imperial = new TubeSection("a", Length.FromInches(0.0779 / 0.0254), Length.FromInches(3.5), Length.FromFeet(20), 4);
        Approx.Relative(metric.WaterVolume.CubicMeters, imperial.WaterVolume.CubicMeters, 1e-14);
    }

    [Fact]
    public void Constructor_NegativeLength_NamesTheSection()
    {
        var error = Assert.Throws<ArgumentOutOfRangeException>(() => new TubeSection("convection bank", Bore, Outside, Length.FromMeters(-3)));
        Assert.Contains("Tube length of section 'convection bank' = -3 m must be greater than zero", error.Message, StringComparison.Ordinal);
        Assert.Equal("tubeLength", error.ParamName);
    }

    [Theory]
    [InlineData("outsideDiameter")]
    [InlineData("tubesInSeries")]
    [InlineData("thickness")]
    [InlineData("roughness")]
    [InlineData("rise")]
    [InlineData("frictionMultiplier")]
    public void BadMeasure_NamesParameterAndSection(string parameter)
    {
        Func<object> make = parameter switch
        {
            "outsideDiameter" => () => new TubeSection("s", Outside, Bore, Length.FromMeters(1)),
            "tubesInSeries" => () => new TubeSection("s", Bore, Outside, Length.FromMeters(1), 0),
            "thickness" => () => Named.WithScale(Length.FromMillimeters(40), ThermalConductivity.FromWattsPerMeterKelvin(1)),
            "roughness" => () => Named.WithRoughness(Length.FromMillimeters(40)),
            "rise" => () => Named.WithRise(Length.FromMeters(1.01)),
            _ => () => Named.WithRibs(0.9),
        };
        var error = Assert.Throws<ArgumentOutOfRangeException>(make);
        Assert.Equal(parameter, error.ParamName);
        Assert.Contains("section 's'", error.Message, StringComparison.Ordinal);
    }

    private static TubeSection Named => new("s", Bore, Outside, Length.FromMeters(1));
}
