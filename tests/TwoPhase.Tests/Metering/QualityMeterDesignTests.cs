using TwoPhase.Metering;
using UnitsNet;

namespace TwoPhase.Tests.Metering;

/// <summary>Comparison of models, sizing and the range of a span.</summary>
public class QualityMeterDesignTests
{
    private static readonly ClassicalVenturi Venturi = new(Length.FromMillimeters(77.9), Length.FromMillimeters(49), ConvergentFinish.Machined);
    private static readonly MassFlow Flow = MassFlow.FromKilogramsPerSecond(4.8);
    private static readonly Pressure TenMegapascals = Pressure.FromMegapascals(10);
    private static readonly MassFraction Design = MassFraction.FromDecimalFractions(0.78);

    // 0.73 to 0.91: evaluated with another program.
    [Fact]
    public void CompareModels_OneReading_ShowsTheKnownSpread()
    {
        var meter = new QualityMeter(Venturi, WetSteamModel.Homogeneous);
        ModelComparison all = meter.CompareModels(Flow, TenMegapascals, meter.Differential(Flow, TenMegapascals, Design));
        Assert.Equal(WetSteamModel.All, all.Answers.Select(answer => answer.Model));
        Approx.Absolute(0.73245, all.Lowest.DecimalFractions, 5e-4);
        Approx.Absolute(0.90861, all.Highest.DecimalFractions, 5e-4);
        Approx.Absolute(0.90861 - 0.73245, all.Spread.DecimalFractions, 5e-4);
        Assert.Contains("de Leeuw", all.ToString(), StringComparison.Ordinal);
    }

    [Fact]
    public void CompareModels_OverAConstant_PassesOverModelsThatNeedGeometry()
    {
        var meter = new QualityMeter(QualityMeterTests.SiteConstant(), WetSteamModel.Homogeneous);
        ModelComparison some = meter.CompareModels(Flow, TenMegapascals, Pressure.FromKilopascals(40));
        Assert.DoesNotContain(some.Answers, answer => answer.Model.NeedsGeometry);
        Assert.Contains("None of the models", Assert.Throws<ArgumentException>(() => meter.CompareModels(Flow, TenMegapascals, Pressure.FromKilopascals(40), [WetSteamModel.DeLeeuw])).Message, StringComparison.Ordinal);
    }

    [Fact]
    public void ThroatFor_EveryElement_GivesTheWantedDifferential()
    {
        Length pipe = Length.FromMillimeters(77.9), any = Length.FromMillimeters(30);
        CoefficientOfThermalExpansion steel = CoefficientOfThermalExpansion.FromPerKelvin(12e-6);
        PrimaryElement[] elements =
        [
            new ClassicalVenturi(pipe, any, ConvergentFinish.Machined), new OrificePlate(pipe, any, OrificeTappings.Flange), new Isa1932Nozzle(pipe, any),
            new LongRadiusNozzle(pipe, any), new VenturiNozzle(pipe, any), new ClassicalVenturi(pipe, any, ConvergentFinish.Machined).MeasuredCold(steel, steel, Temperature.FromDegreesCelsius(20)),
        ];
        foreach (PrimaryElement element in elements)
            foreach (WetSteamModel model in new[] { WetSteamModel.Homogeneous, WetSteamModel.ReaderHarrisGraham })
            {
                Length throat = new QualityMeter(element, model).ThroatFor(Flow, TenMegapascals, Design, Pressure.FromKilopascals(40));
                Assert.InRange(throat.Millimeters, 40, 65);
                var sized = new QualityMeter(element.WithThroat(throat), model);
                Approx.Relative(40, sized.Differential(Flow, TenMegapascals, Design).Kilopascals, 1e-9);
            }
    }

    [Fact]
    public void Ranges_LowestAboveHighest_AreRefused()
    {
        var meter = new QualityMeter(Venturi, WetSteamModel.Homogeneous);
        Pressure low = Pressure.FromKilopascals(10), high = Pressure.FromKilopascals(60);
        Assert.True(meter.FlowRange(TenMegapascals, Design, low, high).Lowest < meter.FlowRange(TenMegapascals, Design, low, high).Highest);
        Assert.Throws<ArgumentOutOfRangeException>(() => meter.FlowRange(TenMegapascals, Design, high, low));
        Assert.Throws<ArgumentOutOfRangeException>(() => meter.QualityRange(Flow, TenMegapascals, high, low));
    }

    [Fact]
    public void ThroatFor_WhatNoThroatGives_SaysSo()
    {
        var meter = new QualityMeter(Venturi, WetSteamModel.Homogeneous);
        Assert.Contains("is given by no throat", Assert.Throws<ArgumentOutOfRangeException>(() => meter.ThroatFor(Flow, TenMegapascals, Design, Pressure.FromPascals(1))).Message, StringComparison.Ordinal);
        Assert.Throws<InvalidOperationException>(() => new QualityMeter(QualityMeterTests.SiteConstant(), WetSteamModel.Homogeneous).ThroatFor(Flow, TenMegapascals, Design, Pressure.FromKilopascals(40)));
    }

    // Flow goes with the root of the differential where no expansibility, Froude or Reynolds number enters: a tenfold span is a flow range of √10.
    [Fact]
    public void Ranges_OfASpan_AreWhatTheTwoEndsRead()
    {
        var meter = new QualityMeter(QualityMeterTests.SiteConstant(), WetSteamModel.Homogeneous);
        Pressure low = Pressure.FromKilopascals(7.5), high = Pressure.FromKilopascals(75);
        (MassFlow lowest, MassFlow highest) = meter.FlowRange(TenMegapascals, Design, low, high);
        Approx.Relative(Math.Sqrt(10), highest / lowest, 1e-12);
        (QualityReading wettest, QualityReading driest) = meter.QualityRange(Flow, TenMegapascals, low, high);
        Assert.Equal(ReadingStatus.WetSteam, wettest.Status);
        Assert.Equal(ReadingStatus.SuperheatedOutlet, driest.Status);
        Assert.Throws<ArgumentOutOfRangeException>(() => meter.FlowRange(TenMegapascals, Design, high, low));
    }
}
