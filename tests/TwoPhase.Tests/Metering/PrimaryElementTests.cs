using TwoPhase.Flow;
using TwoPhase.Metering;
using UnitsNet;

namespace TwoPhase.Tests.Metering;

/// <summary>Coefficients and expansibilities of every element against the printed tables of ISO 5167 and an independent grid.</summary>
public class PrimaryElementTests
{
    public static TheoryData<string, string, double, double, double, double, double, double, double> Printed => Rows("Metering/Data/iso5167-printed.csv", "printed");

    public static TheoryData<string, string, double, double, double, double, double, double, double> Grid => Rows("Metering/Data/iso5167-grid.csv", "value");

    [Theory, MemberData(nameof(Printed))]
    public void Element_PrintedTables_MatchesTheLastDigit(string kind, string taps, double pipe, double beta, double reynolds, double p1, double p2, double kappa, double printed) =>
        Approx.Absolute(printed, Value(kind, taps, pipe, beta, reynolds, p1, p2, kappa), 0.51e-4, kind);

    [Theory, MemberData(nameof(Grid))]
    public void Element_IndependentGrid_Agrees(string kind, string taps, double pipe, double beta, double reynolds, double p1, double p2, double kappa, double value) =>
        Approx.Relative(value, Value(kind, taps, pipe, beta, reynolds, p1, p2, kappa), 1e-11, kind);

    public static TheoryData<string, string, double, double, double, double, double, double, double, double> Flows
    {
        get
        {
            var data = new TheoryData<string, string, double, double, double, double, double, double, double, double>();
            foreach (var row in ReferenceTable.Load("Metering/Data/single-phase-flow.csv").Rows)
                data.Add(row.Text("kind"), row.Text("taps"), row["D_m"], row["d_m"], row["rho_kg_m3"], row["mu_Pa_s"], row["kappa"], row["p1_Pa"], row["p2_Pa"], row["m_kg_s"]);
            return data;
        }
    }

    // The reference solves for flow to about 1e-11.
    [Theory, MemberData(nameof(Flows))]
    public void GasFlow_IndependentLibrary_Agrees(string kind, string taps, double pipe, double throat, double density, double viscosity, double kappa, double p1, double p2, double flow)
    {
        MassFlow actual = Element(kind, taps, pipe, throat / pipe).GasFlow(
            Density.FromKilogramsPerCubicMeter(density), DynamicViscosity.FromPascalSeconds(viscosity), Pressure.FromPascals(p1), Pressure.FromPascals(p1 - p2), kappa);
        Approx.Relative(flow, actual.KilogramsPerSecond, 1e-9, kind);
    }

    // ISO/TR 11583:2012, examples 1 and 2.
    [Fact]
    public void Expansibility_PrintedExample_HasItsSixDigits() =>
        Approx.Absolute(0.994236, new ClassicalVenturi(Length.FromMillimeters(100), Length.FromMillimeters(60), ConvergentFinish.Machined).Expansibility(Pressure.FromBars(60), Pressure.FromBars(0.5), 1.3), 5e-7);

    // Worked example in the tests of the open-source library fluids: water through an orifice with D and D/2 tappings, expansibility for κ = 1.33 applied.
    [Fact]
    public void GasFlow_WorkedExample_Agrees()
    {
        var plate = new OrificePlate(Length.FromMeters(0.07366), Length.FromMeters(0.05), OrificeTappings.DiameterAndHalf);
        MassFlow flow = plate.GasFlow(Density.FromKilogramsPerCubicMeter(999.1), DynamicViscosity.FromPascalSeconds(0.0011), Pressure.FromKilopascals(200), Pressure.FromKilopascals(17), 1.33);
        Approx.Relative(7.702338035732167, flow.KilogramsPerSecond, 1e-10);
    }

    // The same library: permanent loss of a plate with C = 0.61512, here held by its formula at the coefficient of the plate itself.
    [Fact]
    public void PermanentPressureLoss_Orifice_IsNearOneMinusBetaToTheNineteenTenths()
    {
        var plate = new OrificePlate(Length.FromMillimeters(100), Length.FromMillimeters(60), OrificeTappings.Corner);
        double ratio = plate.PermanentPressureLoss(Pressure.FromKilopascals(100), 1e6).Kilopascals / 100;
        Approx.Absolute(1 - Math.Pow(0.6, 1.9), ratio, 0.01);   // ISO 5167-2:2003, 5.4, the approximate form
    }

    // Borda and Carnot: a jet of the throat's area that fills the pipe again loses (1 - β²)² of its velocity head, which is (1 - β²)/(1 + β²) of the
    // differential where C is 1. What C lacks is friction before the throat, which changes nothing, or a jet narrower than the throat: Cβ² in place of β².
    [Theory]
    [InlineData(0.4)]
    [InlineData(0.6)]
    [InlineData(0.75)]
    public void PermanentPressureLoss_Nozzles_IsThatOfASuddenEnlargement(double beta)
    {
        Length pipe = Length.FromMillimeters(100), throat = beta * pipe;
        foreach (PrimaryElement nozzle in new PrimaryElement[] { new Isa1932Nozzle(pipe, throat), new LongRadiusNozzle(pipe, throat) })
        {
            double loss = nozzle.PermanentPressureLoss(Pressure.FromKilopascals(100), 1e6).Kilopascals / 100, full = beta * beta, narrow = full * nozzle.DischargeCoefficient(1e6);
            Assert.InRange(loss, (1 - full) / (1 + full), (1 - narrow) / (1 + narrow));
        }
    }

    // ISO 5167-3:2003, 5.1.7.2, 5.2.7.2 and 5.3.5.2: per cent of the expansibility.
    [Fact]
    public void ExpansibilityUncertainty_Nozzles_IsTheStandards()
    {
        Length pipe = Length.FromMillimeters(100), throat = Length.FromMillimeters(60);
        Pressure pressure = Pressure.FromMegapascals(2), differential = Pressure.FromKilopascals(100);
        Approx.Relative(2 * 0.05, 100 * ShareOf(new Isa1932Nozzle(pipe, throat)), 1e-12);
        Approx.Relative(2 * 0.05, 100 * ShareOf(new LongRadiusNozzle(pipe, throat)), 1e-12);
        Approx.Relative((4 + (100 * Math.Pow(0.6, 8))) * 0.05, 100 * ShareOf(new VenturiNozzle(pipe, throat)), 1e-12);
        double ShareOf(PrimaryElement element) => element.ExpansibilityUncertainty(pressure, differential, 1.3).DecimalFractions;
    }

    // ISO 5167-2:2003, 5.3.1: 5000 up to β = 0.56 and 16 000 β² beyond for corner and D-D/2 tappings; the greater of 5000 and 170 β² D (mm) for flange tappings.
    [Theory]
    [InlineData(OrificeTappings.Corner, 0.4, 5000)]
    [InlineData(OrificeTappings.DiameterAndHalf, 0.56, 5000)]
    [InlineData(OrificeTappings.Corner, 0.7, 7840)]
    [InlineData(OrificeTappings.DiameterAndHalf, 0.6, 5760)]
    [InlineData(OrificeTappings.Flange, 0.5, 5000)]
    [InlineData(OrificeTappings.Flange, 0.7, 8330)]
    public void Check_Orifice_HasTheStandardsLowestReynoldsNumber(OrificeTappings tappings, double beta, double lowest)
    {
        var plate = new OrificePlate(Length.FromMillimeters(100), beta * Length.FromMillimeters(100), tappings);
        Assert.True(plate.Check(lowest * 1.001).IsInside);
        Assert.Equal(ApplicabilityLimits.Reynolds, plate.Check(lowest * 0.999).Exceeded);
    }

    [Fact]
    public void VelocityOfApproachFactor_BetaOfSixTenths_IsItsDefinition() =>
        Approx.Relative(1 / Math.Sqrt(1 - Math.Pow(0.6, 4)), new OrificePlate(Length.FromMillimeters(100), Length.FromMillimeters(60), OrificeTappings.Corner).VelocityOfApproachFactor, 1e-12);

    [Fact]
    public void PermanentPressureLoss_WithDiffuser_IsWithinTheStandardsRange()
    {
        foreach (PrimaryElement element in new PrimaryElement[]
        {
            new ClassicalVenturi(Length.FromMillimeters(100), Length.FromMillimeters(60), ConvergentFinish.Machined),
            new VenturiNozzle(Length.FromMillimeters(100), Length.FromMillimeters(60)),
        })
            Assert.InRange(element.PermanentPressureLoss(Pressure.FromKilopascals(100), 1e6).Kilopascals, 5, 20);   // ISO 5167-4:2003, 5.9; -3, 5.3.6
    }

    [Theory]
    [InlineData(ConvergentFinish.AsCast, 0.984, 0.7, 2e6)]
    [InlineData(ConvergentFinish.Machined, 0.995, 1.0, 1e6)]
    [InlineData(ConvergentFinish.RoughWelded, 0.985, 1.5, 2e6)]
    public void ClassicalVenturi_EachFinish_HasCoefficientUncertaintyAndReynoldsLimit(ConvergentFinish finish, double coefficient, double percent, double highest)
    {
        var venturi = new ClassicalVenturi(Length.FromMillimeters(220), Length.FromMillimeters(120), finish);
        Assert.Equal(coefficient, venturi.DischargeCoefficient(5e5));
        Approx.Relative(percent, venturi.DischargeCoefficientUncertainty(highest).Percent, 1e-12);
        Assert.True(venturi.Check(highest).IsInside);
        Applicability beyond = venturi.Check(highest * 1.01);
        Assert.Equal(ApplicabilityLimits.Reynolds, beyond.Exceeded);
        Assert.Equal(highest, beyond.FirstHigh);
        Assert.True(venturi.DischargeCoefficientUncertainty(highest * 1.01).Percent > percent);
    }

    // ISO 5167-2:2003, 5.3.3: the steps of the uncertainty; ISO 5167-3:2003, 5.1.7, 5.2.7, 5.3.5.
    [Fact]
    public void DischargeCoefficientUncertainty_EachElement_IsThatOfTheStandard()
    {
        Length d200 = Length.FromMillimeters(200);
        Approx.Relative(0.55, new OrificePlate(d200, Length.FromMillimeters(30), OrificeTappings.Corner).DischargeCoefficientUncertainty(1e6).Percent, 1e-12);
        Approx.Relative(0.5, new OrificePlate(d200, Length.FromMillimeters(100), OrificeTappings.Corner).DischargeCoefficientUncertainty(1e6).Percent, 1e-12);
        Approx.Relative((1.667 * 0.7) - 0.5, new OrificePlate(d200, Length.FromMillimeters(140), OrificeTappings.Corner).DischargeCoefficientUncertainty(1e6).Percent, 1e-12);
        Approx.Relative(0.8, new Isa1932Nozzle(d200, Length.FromMillimeters(100)).DischargeCoefficientUncertainty(1e6).Percent, 1e-12);
        Approx.Relative(1.0, new Isa1932Nozzle(d200, Length.FromMillimeters(140)).DischargeCoefficientUncertainty(1e6).Percent, 1e-12);
        Approx.Relative(2.0, new LongRadiusNozzle(d200, Length.FromMillimeters(100)).DischargeCoefficientUncertainty(1e6).Percent, 1e-12);
        Approx.Relative(1.2 + (1.5 / 16), new VenturiNozzle(d200, Length.FromMillimeters(100)).DischargeCoefficientUncertainty(1e6).Percent, 1e-12);
    }

    [Fact]
    public void ExpansibilityUncertainty_EachElement_IsThatOfTheStandard()
    {
        Length pipe = Length.FromMillimeters(100), throat = Length.FromMillimeters(50);
        Pressure p = Pressure.FromMegapascals(10), dp = Pressure.FromKilopascals(200);
        Approx.Relative(3.5 * 0.02 / 1.25, new OrificePlate(pipe, throat, OrificeTappings.Flange).ExpansibilityUncertainty(p, dp, 1.25).Percent, 1e-12);
        Approx.Relative(2 * 0.02, new LongRadiusNozzle(pipe, throat).ExpansibilityUncertainty(p, dp, 1.25).Percent, 1e-12);
        Approx.Relative((4 + (100 / 256.0)) * 0.02, new ClassicalVenturi(pipe, throat, ConvergentFinish.Machined).ExpansibilityUncertainty(p, dp, 1.25).Percent, 1e-12);
    }

    [Fact]
    public void Check_SmallOrifice_NamesEveryLimit()
    {
        Applicability found = new OrificePlate(Length.FromMillimeters(40), Length.FromMillimeters(10), OrificeTappings.Corner).Check(1000);
        Assert.Equal(ApplicabilityLimits.Reynolds | ApplicabilityLimits.Bore | ApplicabilityLimits.ThroatDiameter, found.Exceeded);
        Assert.Equal((1000.0, 5000.0), (found.FirstValue, found.FirstLow));
    }

    // Carbon steel of 12e-6/K, 290 K hotter: area +0.70 %, a figure of the trade.
    [Fact]
    public void MeasuredCold_HotSteel_GrowsByItsCoefficient()
    {
        CoefficientOfThermalExpansion steel = CoefficientOfThermalExpansion.FromPerKelvin(12e-6);
        Temperature cold = Temperature.FromDegreesCelsius(20);
        var bored = new ClassicalVenturi(Length.FromMillimeters(77.9), Length.FromMillimeters(49), ConvergentFinish.Machined);
        PrimaryElement hot = bored.MeasuredCold(steel, steel, cold).HotAt(Temperature.FromDegreesCelsius(310));
        Approx.Relative(49 * (1 + (12e-6 * 290)), hot.ThroatDiameter.Millimeters, 1e-12);
        Approx.Relative(bored.DiameterRatio, hot.DiameterRatio, 1e-14);
        Assert.False(hot.IsMeasuredCold);
        Assert.IsType<ClassicalVenturi>(hot);
        MassFlow Flow(PrimaryElement element, Temperature? t) => element.LiquidFlow(Density.FromKilogramsPerCubicMeter(700), DynamicViscosity.FromPascalSeconds(8e-5), Pressure.FromKilopascals(20), t);
        Approx.Relative(Flow(hot, null).KilogramsPerSecond, Flow(bored.MeasuredCold(steel, steel, cold), Temperature.FromDegreesCelsius(310)).KilogramsPerSecond, 1e-14);
        var error = Assert.Throws<ArgumentException>(() => Flow(bored.MeasuredCold(steel, steel, cold), null));
        Assert.Contains("working temperature", error.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void SiteConstantMeter_FromReference_ReturnsTheReference()
    {
        SiteConstantMeter meter = SiteConstantMeter.FromReference(MassFlow.FromKilogramsPerSecond(5), Density.FromKilogramsPerCubicMeter(60), Pressure.FromKilopascals(75));
        Approx.Relative(5 / Math.Sqrt(60 * 75e3), meter.K.SquareMeters, 1e-15);
        Approx.Relative(5, meter.LiquidFlow(Density.FromKilogramsPerCubicMeter(60), DynamicViscosity.FromPascalSeconds(1e-4), Pressure.FromKilopascals(75)).KilogramsPerSecond, 1e-14);
    }

    [Fact]
    public void Constructor_MeaninglessDiameters_ThrowNamingValueAndLimit()
    {
        var wide = Assert.Throws<ArgumentOutOfRangeException>(() => new ClassicalVenturi(Length.FromMillimeters(50), Length.FromMillimeters(60), ConvergentFinish.Machined));
        Assert.Contains("Throat diameter = 60 mm must be below the pipe diameter 50 mm", wide.Message, StringComparison.Ordinal);
        Assert.Equal("throat", wide.ParamName);
        Assert.Equal("bore", Assert.Throws<ArgumentOutOfRangeException>(() => new OrificePlate(Length.FromMillimeters(50), Length.Zero, OrificeTappings.Corner)).ParamName);
        Assert.Throws<ArgumentOutOfRangeException>(() => new SiteConstantMeter(Area.FromSquareMillimeters(-1)));
        Assert.Throws<ArgumentOutOfRangeException>(() => new ClassicalVenturi(Length.FromMillimeters(50), Length.FromMillimeters(30), (ConvergentFinish)7));
        Assert.Throws<ArgumentOutOfRangeException>(() => new OrificePlate(Length.FromMillimeters(50), Length.FromMillimeters(30), (OrificeTappings)7));
    }

    [Fact]
    public void Expansibility_DifferentialAboveStaticPressure_AsksWhetherTheyWereSwapped()
    {
        var venturi = new ClassicalVenturi(Length.FromMillimeters(100), Length.FromMillimeters(60), ConvergentFinish.Machined);
        var error = Assert.Throws<ArgumentOutOfRangeException>(() => venturi.Expansibility(Pressure.FromKilopascals(40), Pressure.FromMegapascals(10), 1.3));
        Assert.Contains("were the two swapped?", error.Message, StringComparison.Ordinal);
    }

    // ε → 1 with the differential, without loss of digits: the slope stays that of the second-order expansion.
    [Fact]
    public void Expansibility_TinyDifferential_KeepsItsDigits()
    {
        var venturi = new ClassicalVenturi(Length.FromMillimeters(100), Length.FromMillimeters(60), ConvergentFinish.Machined);
        double Slope(double dp) => (1 - venturi.Expansibility(Pressure.FromPascals(1e7), Pressure.FromPascals(dp), 1.25)) / dp;
        Approx.Relative(Slope(1000), Slope(10), 2e-4);
    }

    private static TheoryData<string, string, double, double, double, double, double, double, double> Rows(string path, string column)
    {
        var data = new TheoryData<string, string, double, double, double, double, double, double, double>();
        foreach (var row in ReferenceTable.Load(path).Rows)
            data.Add(row.Text("kind"), row.Text("taps"), row["D_m"], double.IsNaN(row["D_m"]) || path.Contains("printed", StringComparison.Ordinal) ? row["beta"] : row["d_m"] / row["D_m"], row.Text("Re_D") is "inf" or "" ? double.PositiveInfinity : row["Re_D"], row["p1_Pa"], row["p2_Pa"], row["kappa"], row[column]);
        return data;
    }

    private static double Value(string kind, string taps, double pipe, double beta, double reynolds, double p1, double p2, double kappa) =>
        kind.EndsWith("_C", StringComparison.Ordinal)
            ? Element(kind[..^2], taps, pipe, beta).DischargeCoefficient(reynolds)
            : Element(kind == "orifice_eps" ? "orifice" : "isa1932", "corner", 0.1, beta).Expansibility(Pressure.FromPascals(p1), Pressure.FromPascals(p1 - p2), kappa);

    private static PrimaryElement Element(string kind, string taps, double pipe, double beta)
    {
        Length bore = Length.FromMeters(pipe), throat = Length.FromMeters(pipe * beta);
        return kind switch
        {
            "orifice" => new OrificePlate(bore, throat, taps == "corner" ? OrificeTappings.Corner : taps == "flange" ? OrificeTappings.Flange : OrificeTappings.DiameterAndHalf),
            "isa1932" => new Isa1932Nozzle(bore, throat),
            "long_radius" => new LongRadiusNozzle(bore, throat),
            "venturi_nozzle" => new VenturiNozzle(bore, throat),
            "venturi_machined" or "venturi_machined_convergent" => new ClassicalVenturi(bore, throat, ConvergentFinish.Machined),
            "venturi_as_cast" => new ClassicalVenturi(bore, throat, ConvergentFinish.AsCast),
            "venturi_welded" or "venturi_rough_welded" => new ClassicalVenturi(bore, throat, ConvergentFinish.RoughWelded),
            _ => throw new ArgumentException(kind),
        };
    }
}
