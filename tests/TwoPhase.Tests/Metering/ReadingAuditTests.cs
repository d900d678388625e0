using TwoPhase.Metering;
using UnitsNet;

namespace TwoPhase.Tests.Metering;

public class ReadingAuditTests
{
    private static readonly MassFlow Flow = MassFlow.FromKilogramsPerSecond(4.8);
    private static readonly Pressure Static = Pressure.FromMegapascals(10);
    private static readonly QualityMeter Meter = new(new ClassicalVenturi(Length.FromMillimeters(77.9), Length.FromMillimeters(49), ConvergentFinish.Machined), WetSteamModel.Homogeneous);
    private static readonly Pressure Differential = Meter.Differential(Flow, Static, MassFraction.FromDecimalFractions(0.78));

    private static AuditSetup Setup(FeedMeterPrinciple principle = FeedMeterPrinciple.Volumetric, double baseDensity = 922.8) => AuditSetup.Default
        .WithAtmosphericPressure(Pressure.FromKilopascals(100))
        .WithSpan(Pressure.FromPascals(Differential.Pascals / 0.66))
        .WithFeedMeter(new FeedFlowMeter(principle, Density.FromKilogramsPerCubicMeter(baseDensity)), Density.FromKilogramsPerCubicMeter(901.8));

    private static double Points(ReadingAudit audit, ReadingMistake mistake) =>
        100 * audit.Mistakes.Single(m => m.Mistake == mistake).Effect.DecimalFractions;

    // Sizes at 10 MPa and x = 0.78, computed independently of this library and printed to a tenth of a point; the tolerance is that digit.
    [Theory]
    [InlineData(ReadingMistake.GaugeForAbsolute, -1.0, 0.06)]
    [InlineData(ReadingMistake.HeaderPressure, -1.0, 0.06)]
    [InlineData(ReadingMistake.ColdBore, -1.2, 0.05)]
    [InlineData(ReadingMistake.ThroatScale, 0.8, 0.05)]
    [InlineData(ReadingMistake.FeedDensity, -3.9, 0.05)]
    [InlineData(ReadingMistake.FeedScale, -1.7095, 5e-3)]
    [InlineData(ReadingMistake.RootTwice, 19.9, 0.3)]      // 66 % of span read as 81 %, both rounded there
    [InlineData(ReadingMistake.RootMissing, -29, 0.5)]
    [InlineData(ReadingMistake.UnequalLegs, 2.0, 0.05)]
    [InlineData(ReadingMistake.WrongExponent, 0.24, 0.005)]
    [InlineData(ReadingMistake.MixedCoefficient, -3, 0.3)]
    public void Mistakes_ReferenceReading_HaveTheirSizes(ReadingMistake mistake, double points, double tolerance) =>
        Approx.Absolute(points, Points(ReadingAudit.Of(Meter, Flow, Static, Differential, Setup()), mistake), tolerance);

    [Theory]
    [InlineData(FeedMeterPrinciple.DifferentialPressure, 922.8, -2.0)]
    [InlineData(FeedMeterPrinciple.Volumetric, 1002.7, -16.6)]             // water of 20 °C at 10 MPa
    [InlineData(FeedMeterPrinciple.DifferentialPressure, 1002.7, -8.75)]   // printed −8.8
    public void FeedDensity_OtherRangings_HaveTheirSizes(FeedMeterPrinciple principle, double baseDensity, double points) =>
        Approx.Absolute(points, Points(ReadingAudit.Of(Meter, Flow, Static, Differential, Setup(principle, baseDensity)), ReadingMistake.FeedDensity), 0.05);

    [Fact]
    public void Mistakes_AreOrdered_LargestFirst()
    {
        ReadingAudit audit = ReadingAudit.Of(Meter, Flow, Static, Differential, Setup());
        double[] sizes = [.. audit.Mistakes.Select(m => Math.Abs(m.Effect.DecimalFractions))];
        Assert.Equal(sizes.OrderByDescending(size => size), sizes);
        Assert.Equal(ReadingMistake.RootMissing, audit.Mistakes[0].Mistake);
        Assert.EndsWith("pressurised.", audit.ToString(), StringComparison.Ordinal);
        Assert.All(audit.Mistakes, m => Assert.NotEmpty(m.Proof));
    }

    [Fact]
    public void Mistakes_WhatIsNotKnown_IsLeftOut()
    {
        QualityMeter site = new(SiteConstantMeter.FromReference(Flow, Density.FromKilogramsPerCubicMeter(66), Pressure.FromKilopascals(40)), WetSteamModel.Homogeneous);
        ReadingMistake[] found = [.. ReadingAudit.Of(site, Flow, Static, Pressure.FromKilopascals(40)).Mistakes.Select(m => m.Mistake)];
        Assert.Equal([ReadingMistake.FeedScale, ReadingMistake.GaugeForAbsolute, ReadingMistake.HeaderPressure, ReadingMistake.UnequalLegs], found.Order().ToArray().OrderBy(m => m.ToString(), StringComparer.Ordinal));
        Assert.DoesNotContain(ReadingAudit.Of(new QualityMeter(new ClassicalVenturi(Length.FromMillimeters(77.9), Length.FromMillimeters(49), ConvergentFinish.Machined).MeasuredCold(
            CoefficientOfThermalExpansion.FromPerKelvin(12e-6), CoefficientOfThermalExpansion.FromPerKelvin(12e-6), Temperature.FromDegreesCelsius(20)), WetSteamModel.Homogeneous), Flow, Static, Differential).Mistakes, m => m.Mistake == ReadingMistake.ColdBore);
    }

    // A wet coefficient fits a model that brings its own; the mistake there has the other sign.
    [Fact]
    public void MixedCoefficient_ModelWithItsOwn_GoesTheOtherWay()
    {
        QualityMeter wet = new(Meter.Meter, WetSteamModel.ReaderHarrisGraham);
        Pressure differential = wet.Differential(Flow, Static, MassFraction.FromDecimalFractions(0.78));
        Approx.Absolute(3, Points(ReadingAudit.Of(wet, Flow, Static, differential), ReadingMistake.MixedCoefficient), 0.3);
    }

    [Fact]
    public void Orifice_HasItsOwnMistakes()
    {
        QualityMeter orifice = new(new OrificePlate(Length.FromMillimeters(77.9), Length.FromMillimeters(50), OrificeTappings.Corner), WetSteamModel.Homogeneous);
        ReadingAudit audit = ReadingAudit.Of(orifice, Flow, Static, orifice.Differential(Flow, Static, MassFraction.FromDecimalFractions(0.78)));
        // Hole of 3 mm in 50 mm: bore + 0.198 %, differential − 0.198 % · 4/(1 − β⁴) = −0.95 %, times W = 0.8676.
        Approx.Absolute(-0.82, Points(audit, ReadingMistake.DrainHole), 0.02);
        Approx.Absolute(-8.68, Points(audit, ReadingMistake.PlateReversedOrWorn), 0.1);
        Assert.Contains("no source", audit.Mistakes.Single(m => m.Mistake == ReadingMistake.PlateReversedOrWorn).Source, StringComparison.Ordinal);
    }

    // Every mistake, made on a true reading: the audit of what is then indicated finds it, in its size.
    [Fact]
    public void Explaining_MistakeThatWasMade_IsAmongTheExplanations()
    {
        ReadingAudit right = ReadingAudit.Of(Meter, Flow, Static, Differential, Setup());
        AuditedReading truth = new(Meter, new RawReading(Flow.KilogramsPerSecond, Static.Pascals, Differential.Pascals), Setup());
        int made = 0;
        foreach (MistakeEntry entry in MistakeCatalogue.Entries)
        {
            if (entry.Distortion(truth, entry.UsualAmount) is not { } distortion) continue;
            RawReading wrong = distortion.Apply(truth.Raw);
            ReadingAudit audit = ReadingAudit.Of(Meter, MassFlow.FromKilogramsPerSecond(wrong.Flow), Pressure.FromPascals(wrong.Pressure), Pressure.FromPascals(wrong.Differential), Setup());
            double offset = audit.Reading.Quality.DecimalFractions - 0.78;
            SuspectedMistake? found = audit.Explaining(MassFraction.FromDecimalFractions(offset), MassFraction.FromDecimalFractions(0.002)).SingleOrDefault(m => m.Mistake == entry.Mistake);
            Assert.True(found is not null, entry.Description);
            Approx.Relative(entry.UsualAmount, found.Amount, 0.02, entry.Description);    // density in the legs and ε are taken at the reading that is wrong
            made++;
        }

        Assert.Equal(right.Mistakes.Count, made);
    }

    [Fact]
    public void Explaining_OffsetThatNothingMakes_IsEmpty()
    {
        ReadingAudit audit = ReadingAudit.Of(Meter, Flow, Static, Differential, Setup());
        Assert.DoesNotContain(audit.Explaining(MassFraction.FromDecimalFractions(0.9), MassFraction.FromDecimalFractions(0.001)), m => m.Unit.Length == 0);
        Assert.Throws<ArgumentOutOfRangeException>(() => audit.Explaining(MassFraction.Zero, MassFraction.FromDecimalFractions(0.01)));
        Assert.Throws<ArgumentOutOfRangeException>(() => audit.Explaining(MassFraction.FromDecimalFractions(0.1), MassFraction.Zero));
    }

    [Fact]
    public void AtCeiling_DifferentialAtTheEndOfTheSpan_IsSaid()
    {
        Assert.True(ReadingAudit.Of(Meter, Flow, Static, Differential, AuditSetup.Default.WithSpan(Differential)).AtCeiling);
        Assert.False(ReadingAudit.Of(Meter, Flow, Static, Differential, Setup()).AtCeiling);
        Assert.False(ReadingAudit.Of(Meter, Flow, Static, Differential).AtCeiling);
    }

    [Fact]
    public void Setup_Impossible_ThrowsNamingTheValue()
    {
        Assert.Contains("5 kPa", Assert.Throws<ArgumentOutOfRangeException>(() => AuditSetup.Default.WithAtmosphericPressure(Pressure.FromKilopascals(5))).Message, StringComparison.Ordinal);
        Assert.Throws<ArgumentOutOfRangeException>(() => AuditSetup.Default.WithSpan(Pressure.Zero));
        Assert.Throws<ArgumentOutOfRangeException>(() => AuditSetup.Default.WithExpansion(CoefficientOfThermalExpansion.FromPerKelvin(1)));
        Assert.Throws<ArgumentNullException>(() => ReadingAudit.Of(null!, Flow, Static, Differential));
    }
}
