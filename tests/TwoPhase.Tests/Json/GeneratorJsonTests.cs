using TwoPhase.Json;
using TwoPhase.Metering;
using TwoPhase.Passes;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Tests.Json;

public class GeneratorJsonTests
{
    // Invented.
    private const string Sample = """
        {
          // A remark may stand anywhere.
          "name": "Otter Ridge 1",
          "note": "invented",
          "history": { "time": "t" },
          "site": { "atmosphericPressure": "93 kPa(a)", "baseTemperature": "15 degC" },
          "tags": { "firing": "OR-FIR [%]", "headerPressure": "OR-PH [kPa(g)]" },
          "passes": [
            {
              "name": "north",
              "heatAtFullFiring": "8.4 MW",
              "sections": [
                { "name": "bank", "bore": "77.9 mm", "outsideDiameter": "88.9 mm", "tubeLength": "18 m", "tubesInSeries": 18, "zone": "convective" },
                { "name": "coil", "bore": "77.9 mm", "outsideDiameter": "3.5 in", "tubeLength": "330 m" },
              ],
              "meter": { "kind": "classicalVenturi", "pipe": "77.9 mm", "throat": "49.0 mm", "finish": "machined" },
              "wetModel": "James",
              "tags": { "feedFlow": "OR-F1 [m3/d]", "differential": "OR-D1 [% of 75 kPa]", "outletPressure": "OR-P1" }
            },
            { "name": "south", "meter": { "kind": "siteConstant", "k": "2500 mm2" } }
          ]
        }
        """;

    [Fact]
    public void Read_Sample_GivesTheGenerator()
    {
        SteamGenerator generator = GeneratorJson.Read(Sample);
        Pass north = generator.Passes[0], south = generator.Passes[1];
        Assert.Equal(("Otter Ridge 1", "north", "south"), (generator.Name, north.Name, south.Name));
        Assert.Equal(93, generator.Basis.AtmosphericPressure!.Value.Kilopascals);
        Assert.Equal("OR-PH", generator.Tags[GeneratorSignal.HeaderPressure]!.Name);
        ClassicalVenturi venturi = Assert.IsType<ClassicalVenturi>(north.Meter!.Meter);
        Approx.Relative(0.049 / 0.0779, venturi.DiameterRatio, 1e-12);
        Assert.Equal("James", north.Meter.Model.Name);
        Assert.Equal("Homogeneous", south.Meter!.Model.Name);
        Assert.Equal(8.4e6, (double)north.HeatAtFullFiring!.Value.Watts);
        Assert.Equal((HeatZone.Convective, 18), (north.Sections[0].Zone, north.Sections[0].TubesInSeries));
        Approx.Relative(0.0889, north.Sections[1].OutsideDiameter.Meters, 1e-12);
        Approx.Relative(2.5e-3, Assert.IsType<SiteConstantMeter>(south.Meter.Meter).K.SquareMeters, 1e-12);
        Assert.Empty(south.Sections);
        var format = new ReadingFormat(TagSet.OfPass.With(PassSignal.FeedFlow, north.Tags[PassSignal.FeedFlow]!), generator.Basis);
        Approx.Relative(999.1026 / 86400, format.Add(default, PassSignal.FeedFlow, 1).FeedFlow!.Value.KilogramsPerSecond, 1e-6);
    }

    [Fact]
    public void Write_ThenRead_IsTheSameDocumentInACommaCulture() => Culture.Run("de-DE", () =>
    {
        string written = GeneratorJson.Write(GeneratorJson.Read(Sample));
        Assert.Equal(written, GeneratorJson.Write(GeneratorJson.Read(written)));
        Assert.Contains("\"throat\": \"49 mm\"", written, StringComparison.Ordinal);
        Assert.Contains("OR-D1 [% of 75 kPa]", written, StringComparison.Ordinal);
    });

    [Fact]
    public void Write_EveryElement_ReadsBackAsItself()
    {
        Length pipe = Length.FromMillimeters(77.9), throat = Length.FromMillimeters(45.2);
        DifferentialPressureMeter[] meters =
        [
            new ClassicalVenturi(pipe, throat, ConvergentFinish.AsCast), new ClassicalVenturi(pipe, throat, ConvergentFinish.RoughWelded),
            new OrificePlate(pipe, throat, OrificeTappings.Flange), new OrificePlate(pipe, throat, OrificeTappings.DiameterAndHalf),
            new Isa1932Nozzle(pipe, throat), new LongRadiusNozzle(pipe, throat), new VenturiNozzle(pipe, throat), new SiteConstantMeter(Area.FromSquareMillimeters(1234.5)),
        ];
        foreach (DifferentialPressureMeter meter in meters)
        {
            DifferentialPressureMeter back = GeneratorJson.Read(GeneratorJson.Write(new SteamGenerator("G", [new Pass("P", []).WithMeter(new(meter, WetSteamModel.Homogeneous))]))).Passes[0].Meter!.Meter;
            Assert.Equal((meter.GetType(), meter.Name), (back.GetType(), back.Name));
            if (meter is PrimaryElement element) Assert.Equal((element.PipeDiameter.Meters, element.ThroatDiameter.Meters), (((PrimaryElement)back).PipeDiameter.Meters, ((PrimaryElement)back).ThroatDiameter.Meters));
        }
    }

    [Fact]
    public void Read_EveryWetModel_IsFoundByItsName()
    {
        foreach (WetSteamModel model in WetSteamModel.All)
        {
            Pass pass = new Pass("P", []).WithMeter(new(new OrificePlate(Length.FromMillimeters(80), Length.FromMillimeters(45), OrificeTappings.Flange), model));
            Assert.Same(model, GeneratorJson.Read(GeneratorJson.Write(new SteamGenerator("G", [pass]))).Passes[0].Meter!.Model);
        }
    }

    [Theory]
    [InlineData("\"49.0 mm\"", "\"49.0 kg\"", "$.passes[0].meter.throat", "length")]
    [InlineData("\"49.0 mm\"", "\"49,0 mm\"", "$.passes[0].meter.throat", "comma")]
    [InlineData("\"49.0 mm\"", "\"84.0 mm\"", "$.passes[0].meter.throat", "84 mm")]
    [InlineData("\"49.0 mm\"", "null", "$.passes[0].meter.throat", "is missing")]
    [InlineData("\"49.0 mm\"", "49.0", "$.passes[0].meter.throat", "line 16")]
    [InlineData("\"machined\"", "\"polished\"", "$.passes[0].meter.finish", "roughWelded")]
    [InlineData("\"classicalVenturi\"", "\"pitot\"", "$.passes[0].meter.kind", "orificePlate")]
    [InlineData("\"James\"", "\"Nobody\"", "$.passes[0].wetModel", "Homogeneous")]
    [InlineData("\"James\"", "\"Chisholm\"", "$.passes[0].wetModel", "more than one")]
    [InlineData("\"2500 mm2\" }", "\"2500 mm2\" }, \"wetModel\": \"Reader-Harris and Graham\"", "$.passes[1].wetModel", "needs the diameters")]
    [InlineData("OR-F1 [m3/d]", "OR-F1 [Mlb/h]", "$.passes[0].tags.feedFlow", "two meanings")]
    [InlineData("OR-D1 [% of 75 kPa]", "OR-D1 [%]", "$.passes[0].tags.differential", "OR-D1")]
    [InlineData("OR-PH [kPa(g)]", "OR-PH [kPa]", "$.tags.headerPressure", "gauge or absolute")]
    [InlineData("\"firing\"", "\"fireing\"", "$.tags.fireing", "fuelGasFlow")]
    [InlineData("\"firing\"", "\"none\"", "$.tags.none", "tags.none")]
    [InlineData("93 kPa(a)", "9300 kPa(a)", "$.site.atmosphericPressure", "9300 kPa")]
    [InlineData("93 kPa(a)", "93 kPa", "$.site.atmosphericPressure", "gauge or absolute")]
    [InlineData("15 degC", "150 degC", "$.site.baseTemperature", "150 °C")]
    [InlineData("\"south\"", "\"north\"", "$.passes", "two passes named 'north'")]
    [InlineData("\"south\"", "\"\"", "$.passes[1]", "needs a name")]
    [InlineData("\"2500 mm2\"", "\"-2500 mm2\"", "$.passes[1].meter.k", "-2500 mm²")]
    [InlineData("\"convective\"", "\"kitchen\"", "$.passes[0].sections[0].zone", "radiant")]
    [InlineData("3.5 in", "2.5 in", "$.passes[0].sections[1]", "bore")]
    [InlineData("\"bore\"", "\"boar\"", "$.passes[0].sections[0]", "boar")]
    public void Read_Fault_HasItsPathInOneLine(string right, string wrong, string path, string why)
    {
        DocumentException error = Assert.Throws<DocumentException>(() => GeneratorJson.Read(Sample.Replace(right, wrong, StringComparison.Ordinal)));
        Assert.StartsWith(path, error.Path, StringComparison.Ordinal);
        Assert.Contains(path, error.Message, StringComparison.Ordinal);
        Assert.Contains(why, error.Message, StringComparison.Ordinal);
        Assert.DoesNotContain('\n', error.Message);
        Assert.DoesNotContain("Parameter", error.Message, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("")]
    [InlineData("null")]
    [InlineData("[]")]
    [InlineData("{")]
    [InlineData("no json\n")]
    [InlineData("{ \"name\": \"x\" }")]
    [InlineData("{ \"name\": \"x\", \"passes\": [] }")]
    [InlineData("{ \"name\": \"x\", \"passes\": [null] }")]
    [InlineData("{ \"name\": \"x\", \"passes\": [{ \"name\": \"p\", \"sections\": [null] }] }")]
    [InlineData("{ \"name\": \"x\", \"passes\": [{ \"name\": \"p\", \"tags\": { \"feedFlow\": null } }] }")]
    [InlineData("\u0000")]
    public void Read_NoGenerator_ThrowsDocumentException(string json)
    {
        DocumentException error = Assert.Throws<DocumentException>(() => GeneratorJson.Read(json));
        Assert.DoesNotContain('\n', error.Message);
    }

    [Fact]
    public void Read_BrokenText_SaysLineAndColumn()
    {
        DocumentException error = Assert.Throws<DocumentException>(() => GeneratorJson.Read("{\n  \"name\": \"x\"\n  \"passes\": []\n}"));
        Assert.Contains("line 3, column", error.Message, StringComparison.Ordinal);
    }

}
