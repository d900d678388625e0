using TwoPhase.Limits;
using TwoPhase.Metering;
using TwoPhase.Passes;
using TwoPhase.Tests.Passes;
using UnitsNet;

namespace TwoPhase.Tests.Limits;

public class SiteLimitsTests
{
    // Common practice, no source: four times at 75 %, five at 80, ten at 90, twenty at 95.
    [Theory]
    [InlineData(0, 1)]
    [InlineData(75, 4)]
    [InlineData(80, 5)]
    [InlineData(90, 10)]
    [InlineData(95, 20)]
    public void ConcentrationAt_Quality_IsWhatTheTradeCounts(double percent, double factor) =>
        Approx.Relative(10 * factor, Silica.ConcentrationAt(MassFraction.FromPercent(percent)).MilligramsPerLiter, 1e-12);

    [Fact]
    public void GreatestQuality_ThenConcentration_IsTheLimit()
    {
        Approx.Relative(0.8, Silica.GreatestQuality.DecimalFractions, 1e-12);
        Approx.Relative(50, Silica.ConcentrationAt(Silica.GreatestQuality).MilligramsPerLiter, 1e-12);
        Assert.True(SolidsLimit.Hardness(Milligrams(2), Milligrams(1)).GreatestQuality.DecimalFractions < 0);
    }

    [Fact]
    public void ConcentrationAt_NoWaterLeft_ThrowsNamingTheQuality() =>
        Assert.Contains("Quality x = 1 must be below 1", Assert.Throws<ArgumentOutOfRangeException>(() => Silica.ConcentrationAt(MassFraction.FromPercent(100))).Message, StringComparison.Ordinal);

    [Fact]
    public void SolidsLimit_MeaninglessConcentrations_ThrowNamingThem()
    {
        Assert.Contains("Feed concentration of 'silica' = -1 mg/L", Assert.Throws<ArgumentOutOfRangeException>(() => SolidsLimit.Silica(Milligrams(-1), Milligrams(10))).Message, StringComparison.Ordinal);
        Assert.Contains("Limit of 'silica' = 0 mg/L", Assert.Throws<ArgumentOutOfRangeException>(() => SolidsLimit.Silica(Milligrams(1), Milligrams(0))).Message, StringComparison.Ordinal);
        Assert.Throws<ArgumentException>(() => new SolidsLimit(" ", Milligrams(1), Milligrams(10)));
    }

    [Fact]
    public void Default_OfTheSite_IsEightyPerCentNotConfirmed()
    {
        Approx.Absolute(0.8, SiteLimits.Default.OutletQuality.DecimalFractions, 1e-15);
        Assert.False(SiteLimits.Default.IsOutletQualityConfirmed);
        Assert.True(SiteLimits.Default.WithOutletQuality(MassFraction.FromPercent(80)).IsOutletQualityConfirmed);
        Assert.False(SiteLimits.Default.IsOutletQualityConfirmed);
        Assert.Null(SiteLimits.Default.ErosionFactor);
        Assert.Null(SiteLimits.Default.MetalTemperature);
    }

    [Theory]
    [InlineData(0)]
    [InlineData(80)]
    [InlineData(-0.1)]
    public void WithOutletQuality_NoQuality_ThrowsNamingIt(double quality) =>
        Assert.Contains("Limit of outlet quality", Assert.Throws<ArgumentOutOfRangeException>(() => SiteLimits.Default.WithOutletQuality(MassFraction.FromDecimalFractions(quality))).Message, StringComparison.Ordinal);

    [Fact]
    public void With_MeaninglessLimits_ThrowNamingThem()
    {
        SiteLimits site = SiteLimits.Default;
        Assert.Contains("Flux peak = 6", Assert.Throws<ArgumentOutOfRangeException>(() => site.WithFluxPeak(6)).Message, StringComparison.Ordinal);
        Assert.Contains("Erosion factor C = 0", Assert.Throws<ArgumentOutOfRangeException>(() => site.WithErosionFactor(0)).Message, StringComparison.Ordinal);
        Assert.Contains("Highest flow = 2 kg/s must be above the lowest, 3 kg/s", Assert.Throws<ArgumentOutOfRangeException>(() => site.WithFlowRange(MassFlow.FromKilogramsPerSecond(3), MassFlow.FromKilogramsPerSecond(2))).Message, StringComparison.Ordinal);
        Assert.Contains("Limit of metal temperature", Assert.Throws<ArgumentOutOfRangeException>(() => site.WithMetalTemperature(Temperature.FromKelvins(0))).Message, StringComparison.Ordinal);
        Assert.Throws<ArgumentNullException>(() => site.WithTransmitter(null!));
        Assert.Throws<ArgumentNullException>(() => site.WithSolids(null!));
    }

    [Fact]
    public void With_OfTheSite_IsReadBack()
    {
        SiteLimits site = SiteLimits.Default
            .WithSolids(Silica)
            .WithFluxPeak(1.7)
            .WithFlowRange(MassFlow.FromTonnesPerHour(7.2), MassFlow.FromTonnesPerHour(18))
            .WithTransmitter(new DifferentialPressureTransmitter(Pressure.FromKilopascals(75), TransmitterCharacteristic.Linear).WithLowCutoff(Ratio.FromPercent(2)));
        Assert.Equal(1.7, site.FluxPeak);
        Approx.Relative(2, site.LowestFlow!.Value.KilogramsPerSecond, 1e-12);
        Approx.Relative(5, site.HighestFlow!.Value.KilogramsPerSecond, 1e-12);
        Approx.Relative(1.5, site.LowestDifferential!.Value.Kilopascals, 1e-12);
        Approx.Relative(75, site.HighestDifferential!.Value.Kilopascals, 1e-12);
        Assert.Equal(["silica: 10 mg/L in the feed, 50 mg/L at the outlet"], site.Solids.Select(solids => solids.ToString()));
    }

    [Fact]
    public void WithAddedScale_OfThePass_ScalesWhatIsHeated()
    {
        Pass pass = new("1", [ExamplePass.Tubes("line", 10).AsUnheated(), ExamplePass.Tubes("coil", 300).WithScale(Length.FromMillimeters(0.2), ThermalConductivity.FromWattsPerMeterKelvin(0.7))]);
        Pass scaled = pass.WithAddedScale(Length.FromMillimeters(0.1));
        Assert.Equal(0, scaled.Sections[0].ScaleThickness.Millimeters);
        Approx.Relative(0.3, scaled.Sections[1].ScaleThickness.Millimeters, 1e-12);
        Approx.Relative(0.7, scaled.Sections[1].ScaleConductivity.WattsPerMeterKelvin, 1e-12);
        Assert.Contains("Scale of section 'coil'", Assert.Throws<ArgumentOutOfRangeException>(() => pass.WithAddedScale(Length.FromMillimeters(39))).Message, StringComparison.Ordinal);
    }

    private static SolidsLimit Silica => SolidsLimit.Silica(Milligrams(10), Milligrams(50));

    private static MassConcentration Milligrams(double value) => MassConcentration.FromMilligramsPerLiter(value);
}
