using System.Globalization;
using FsCheck;
using FsCheck.Fluent;
using FsCheck.Xunit;
using TwoPhase.Json;
using TwoPhase.Metering;
using TwoPhase.Passes;
using UnitsNet;

namespace TwoPhase.Tests.Json;

/// <summary>What a drawing gives goes into the document and comes out of it unchanged.</summary>
public class GeometryJsonTests
{
    [Property(MaxTest = 60)]
    public Property Write_AnyPass_ReadsBackTheSame() => Prop.ForAll(Passes().ToArbitrary(), pass =>
    {
        string written = GeneratorJson.Write(new SteamGenerator("G", [pass]));
        Pass back = GeneratorJson.Read(written).Passes[0];
        Assert.Equal(written, GeneratorJson.Write(new SteamGenerator("G", [back])));
        Assert.Equal(pass.Ducts.Length, back.Ducts.Length);
        for (int i = 0; i < pass.Ducts.Length; i++)
        {
            // Everything that the solvers read, to the last bit; the flux curve is a class of its own.
            Duct before = pass.Ducts[i], after = back.Ducts[i];
            Assert.Equal(before with { Flux = FluxCurve.Uniform }, after with { Flux = FluxCurve.Uniform });
            Assert.Equal(before.Flux.Position, after.Flux.Position);
            Assert.Equal(before.Flux.Flux, after.Flux.Flux);
        }
    });

    [Fact]
    public void Write_Interchanger_ReadsBackTheSame()
    {
        TubeSection[] sections = [.. new[] { "feed", "bank", "return" }.Select(name => new TubeSection(name, Length.FromMillimeters(77.9), Length.FromMillimeters(88.9), Length.FromMeters(100)))];
        Pass pass = new("P", [sections[0].AsUnheated(), sections[1], sections[2].AsUnheated()]);
        FeedInterchanger[] made =
        [
            FeedInterchanger.FromEffectiveness("feed", "return", 0.63).WithBypass(Ratio.FromPercent(7)),
            FeedInterchanger.FromSurface("feed", "return", HeatTransferCoefficient.FromWattsPerSquareMeterKelvin(1700.1), Area.FromSquareMeters(12.3)),
        ];
        foreach (FeedInterchanger interchanger in made)
        {
            FeedInterchanger back = GeneratorJson.Read(GeneratorJson.Write(new SteamGenerator("G", [pass.WithInterchanger(interchanger)]))).Passes[0].Interchanger!;
            Assert.Equal((interchanger.ColdSection, interchanger.HotSection, interchanger.WattsPerKelvin, interchanger.Effectiveness, interchanger.Bypass.DecimalFractions), (back.ColdSection, back.HotSection, back.WattsPerKelvin, back.Effectiveness, back.Bypass.DecimalFractions));
        }
    }

    [Fact]
    public void Write_Firing_ReadsBackTheSame()
    {
        FuelGas fuel = new(new FuelShare(GasComponent.Methane, Ratio.FromPercent(96.1)), new FuelShare(GasComponent.IsoButane, Ratio.FromPercent(3.9)));
        FiringConditions full = new FiringConditions(VolumeFlow.FromCubicMetersPerHour(2900.7), Ratio.FromPercent(3.1), Temperature.FromDegreesCelsius(191.3), Temperature.FromDegreesFahrenheit(51))
            .WithAirHumidity(Ratio.FromPercent(0.7));
        foreach (FuelGas gas in new[] { fuel, fuel.WithHeatingValue(EnergyDensity.FromMegajoulesPerCubicMeter(36.77), HeatingBasis.Net) })
        {
            var model = new HeatModel(gas, full, Ratio.FromPercent(1.1), Ratio.FromPercent(43));
            string written = GeneratorJson.Write(new SteamGenerator("G", [new Pass("P", [])]).WithFiring(model));
            SteamGenerator back = GeneratorJson.Read(written);
            Assert.Equal(model.Burn(full), back.Firing!.Burn(back.Firing.FullFiring));
            Assert.Equal(written, GeneratorJson.Write(back));
            Assert.Throws<NotSupportedException>(() => GeneratorJson.Write(back.WithFiring(model.WithSplit(_ => Ratio.FromPercent(40)))));
        }
    }

    [Theory]
    [InlineData("\"methane\": 1", "\"methane\": 0.9", "$.firing.fuel", "must sum to 1")]
    [InlineData("\"methane\": 1", "\"phlogiston\": 1", "$.firing.fuel.phlogiston", "'phlogiston' is none of methane")]
    [InlineData("\"gross\"", "\"dry\"", "$.firing.heatingBasis", "'dry' is none of gross, net")]
    [InlineData(", \"heatingBasis\": \"gross\"", "", "$.firing.heatingBasis", "is missing")]
    [InlineData("\"heatingValue\": \"38 MJ/Sm3\", ", "", "$.firing.heatingValue", "is missing")]
    [InlineData("\"excessOxygen\": 0.03", "\"excessOxygen\": 3", "$.firing", "Excess oxygen = 3 must be below")]
    [InlineData("190 degC", "190 kPa", "$.firing.stackTemperature", "temperature")]
    [InlineData("2900 Sm3/h", "2900 m3/h", "$.firing.fuelFlow", "standard gas volume")]
    public void Read_FaultOfFiring_HasItsPath(string right, string wrong, string path, string why)
    {
        const string sample = """
            { "name": "G", "passes": [{ "name": "P" }], "firing": { "fuel": { "methane": 1 }, "heatingValue": "38 MJ/Sm3", "heatingBasis": "gross", "fuelFlow": "2900 Sm3/h",
              "excessOxygen": 0.03, "stackTemperature": "190 degC", "airTemperature": "15 degC", "shellLoss": 0.012, "convectiveShare": 0.41 } }
            """;
        Assert.NotNull(GeneratorJson.Read(sample).Firing);
        DocumentException error = Assert.Throws<DocumentException>(() => GeneratorJson.Read(sample.Replace(right, wrong, StringComparison.Ordinal)));
        Assert.Equal(path, error.Path);
        Assert.Contains(why, error.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Write_MeterMeasuredColdAndCalibrated_ReadsBackTheSame()
    {
        CoefficientOfThermalExpansion steel = CoefficientOfThermalExpansion.FromPerKelvin(12e-6), austenitic = CoefficientOfThermalExpansion.FromPerKelvin(16e-6);
        PrimaryElement element = new ClassicalVenturi(Length.FromMillimeters(77.9), Length.FromMillimeters(49), ConvergentFinish.Machined)
            .MeasuredCold(steel, austenitic, Temperature.FromDegreesCelsius(20)).Calibrated(0.991);
        Pass pass = new Pass("P", []).WithMeter(new QualityMeter(element, WetSteamModel.Homogeneous).WithModelUncertainty(Ratio.FromPercent(1.2)));
        QualityMeter back = GeneratorJson.Read(GeneratorJson.Write(new SteamGenerator("G", [pass]))).Passes[0].Meter!;
        MassFlow flow = MassFlow.FromKilogramsPerSecond(4.8);
        Pressure pressure = Pressure.FromMegapascals(9.6), differential = Pressure.FromKilopascals(41.6);
        Assert.Equal(pass.Meter!.Quality(flow, pressure, differential), back.Quality(flow, pressure, differential));
        Assert.Equal(0.012, back.ModelUncertainty.DecimalFractions);
    }

    [Theory]
    [InlineData("\"roughness\": \"0.046 mm\"", "\"roughness\": \"-1 mm\"", "$.passes[0].sections[0].roughness", "Roughness of section 'bank'")]
    [InlineData("\"roughness\": \"0.046 mm\"", "\"roughness\": \"46 kPa\"", "$.passes[0].sections[0].roughness", "length")]
    [InlineData("\"count\": 17", "\"count\": -17", "$.passes[0].sections[0].returnBends", "Return bends of section 'bank' = -17")]
    [InlineData("\"share\": 0.41", "\"share\": 0.51", "$.passes[0].heat", "sum to")]
    [InlineData("\"section\": \"coil\"", "\"section\": \"foil\"", "$.passes[0].heat", "has no section 'foil'")]
    [InlineData("\"volume\": \"0.08 m3\"", "\"volume\": \"0 m3\"", "$.passes[0].outletLine", "Volume of the outlet line")]
    [InlineData("\"thickness\"", "\"thikness\"", "$.passes[0].sections[1].scale", "thikness")]
    [InlineData("\"lossCoefficient\": 3, ", "", "$.passes[0].outletLine.lossCoefficient", "is missing")]
    [InlineData("\"at\": 0, ", "", "$.passes[0].heat[1].shape[0].at", "is missing")]
    public void Read_FaultOfGeometry_HasItsPath(string right, string wrong, string path, string why)
    {
        Assert.Contains(right, Sample, StringComparison.Ordinal);
        DocumentException error = Assert.Throws<DocumentException>(() => GeneratorJson.Read(Sample.Replace(right, wrong, StringComparison.Ordinal)));
        Assert.StartsWith(path, error.Path, StringComparison.Ordinal);
        Assert.Contains(why, error.Message, StringComparison.Ordinal);
    }

    // Invented.
    private const string Sample = """
        {
          "name": "G",
          "passes": [{
            "name": "1",
            "sections": [
              { "name": "bank", "bore": "77.9 mm", "outsideDiameter": "88.9 mm", "tubeLength": "18 m", "tubesInSeries": 18, "zone": "convective", "roughness": "0.046 mm",
                "returnBends": { "count": 17, "radius": "120 mm", "lossCoefficient": 0.3 }, "fins": { "surface": "350 m2", "metal": "900 kg" } },
              { "name": "coil", "bore": "77.9 mm", "outsideDiameter": "88.9 mm", "tubeLength": "330 m", "scale": { "thickness": "0.2 mm", "conductivity": "1.5 W/(m.K)" } }
            ],
            "heat": [{ "section": "bank", "share": 0.41 }, { "section": "coil", "share": 0.59, "shape": [{ "at": 0, "flux": 1.3 }, { "at": 1, "flux": 0.7 }] }],
            "outletLine": { "bore": "73.7 mm", "lossCoefficient": 3, "volume": "0.08 m3" }
          }]
        }
        """;

    private static Gen<Pass> Passes() =>
        from count in Gen.Choose(1, 4)
        from sections in Gen.ArrayOf(Sections(), count)
        from line in Gen.Elements<OutletLine?>(null, new OutletLine(Length.FromMillimeters(73.7), 3.3, Volume.FromCubicMeters(0.081)), new OutletLine(Length.FromMillimeters(73.7), 3.3, Volume.FromCubicMeters(0.081)).WithNonReturnValve().WithMeterAtTubeEnd())
        from weights in Gen.ArrayOf(Gen.Choose(1, 97), count)
        select Made([.. sections.Select((make, i) => make(i.ToString(CultureInfo.InvariantCulture)))], line, weights);

    private static Pass Made(TubeSection[] sections, OutletLine? line, int[] weights)
    {
        var pass = new Pass("1", sections);
        if (line is not null) pass = pass.WithOutletLine(line);
        double sum = sections.Select((section, i) => section.IsHeated ? weights[i] : 0.0).Sum();
        return sum == 0 ? pass : pass.WithHeat(new([.. sections.Select((section, i) => (section, i)).Where(item => item.section.IsHeated)
            .Select(item => new SectionHeat(item.section.Name, Ratio.FromDecimalFractions(weights[item.i] / sum), Shape(weights[item.i])))]));
    }

    private static FluxPoint[] Shape(int weight) => weight % 3 == 0 ? [] : [new(Ratio.Zero, 1 + (weight / 7.0)), new(Ratio.FromDecimalFractions(weight / 100.0), 2), new(Ratio.FromDecimalFractions(1), 0.3)];

    private static Gen<Func<string, TubeSection>> Sections() =>
        from digits in Gen.ArrayOf(Gen.Choose(1, 999), 12)
        from flags in Gen.Choose(0, 511)
        select (Func<string, TubeSection>)(name => Section(name, digits, flags));

    private static TubeSection Section(string name, int[] n, int flags)
    {
        var section = new TubeSection(name, Length.FromMillimeters(50 + (n[0] / 30.0)), Length.FromMillimeters(90 + (n[1] / 17.0)), Length.FromMeters(n[2] / 11.0), 1 + (n[3] % 20));
        if ((flags & 1) != 0) section = section.WithReturnBends(n[4] % 19, Length.FromMillimeters(n[5] / 3.0), n[6] / 999.0);
        if ((flags & 2) != 0) section = section.WithInclination(Angle.FromDegrees((n[7] % 181) - 90 + (n[8] / 1000.0 % 0.5)));
        if ((flags & 4) != 0) section = section.WithScale(Length.FromMillimeters(n[8] / 333.0), ThermalConductivity.FromWattsPerMeterKelvin(n[9] / 321.0)).WithRoughness(Length.FromMicrometers(n[10] / 7.0));
        if ((flags & 8) != 0) section = section.WithFins(Area.FromSquareMeters(n[11] / 3.0), Mass.FromKilograms(n[0] / 1.7));
        if ((flags & 16) != 0) section = section.WithRibs(1 + (n[1] / 999.0)).WithLossCoefficient(n[2] / 77.0);
        if (n[2] % 3 == 0) section = section.WithFrictionFactor(0.5 + (n[1] / 777.0));
        if ((flags & 32) != 0) section = section.WithParallelTubes(1 + (n[3] % 5)).WithMetalMass(Mass.FromPounds(n[4]));
        if ((flags & 64) != 0) section = section.WithMetal(new("own", Density.FromKilogramsPerCubicMeter(7000 + n[5]), SpecificEntropy.FromJoulesPerKilogramKelvin(400 + (n[6] / 9.0)), ThermalConductivity.FromWattsPerMeterKelvin(10 + (n[7] / 17.0))));
        section = (flags & 128) != 0 ? section.AsConvective() : (flags & 256) != 0 ? section.AsUnheated() : section;
        return n[9] % 4 == 0 ? section.WithRise(Length.FromMeters((n[10] - 500) / 999.0 * 0.09)) : section;
    }
}
