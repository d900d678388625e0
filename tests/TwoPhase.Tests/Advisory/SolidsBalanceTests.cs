using FsCheck;
using FsCheck.Xunit;
using TwoPhase.Advisory;
using TwoPhase.Uncertainty;
using UnitsNet;

namespace TwoPhase.Tests.Advisory;

public class SolidsBalanceTests
{
    private static MassConcentration Milligrams(double perLitre) => MassConcentration.FromMilligramsPerLiter(perLitre);

    private static SolidsBalance Of(double feed, double water, double relative = 0) => new(Milligrams(feed), Milligrams(feed * relative), Milligrams(water), Milligrams(water * relative));

    private static double Quality(SolidsBalance balance) => balance.Quality.Value.DecimalFractions;

    // 43.8 % from 10 MPa to the atmosphere, concentrated 1.78 times: recomputed independently; by hand from the printed steam tables (1407.87 − 419.06)/2256.47.
    [Fact]
    public void LetDownHot_FromTenMegapascals_FlashesFourTenthsAndMore()
    {
        WaterSample sample = WaterSample.LetDownHot(Pressure.FromMegapascals(10), Pressure.FromAtmospheres(1));
        Approx.Absolute(0.438, sample.FlashedShare.DecimalFractions, 5e-4);
        Approx.Absolute(1.78, sample.ConcentrationFactor, 5e-3);
        Assert.Equal(0, WaterSample.LetDownFrom(Temperature.FromDegreesCelsius(60), Pressure.FromMegapascals(10), Pressure.FromAtmospheres(1)).FlashedShare.DecimalFractions);
        Assert.InRange(WaterSample.LetDownFrom(Temperature.FromDegreesCelsius(150), Pressure.FromMegapascals(10), Pressure.FromAtmospheres(1)).FlashedShare.DecimalFractions, 0.09, 0.10);
        Assert.Equal(1, WaterSample.CooledAtPressure.ConcentrationFactor);
        Assert.Throws<ArgumentOutOfRangeException>(() => WaterSample.LetDownHot(Pressure.FromMegapascals(1), Pressure.FromMegapascals(2)));
        Assert.Throws<ArgumentOutOfRangeException>(() => WaterSample.LetDownFrom(Temperature.FromDegreesCelsius(320), Pressure.FromMegapascals(10), Pressure.FromAtmospheres(1)));
    }

    // Concentration 4, 5, 10, 20 times at 75, 80, 90, 95 %: Fanaritis and Kimmel, J. Pet. Tech. 17(4), 409-416 (1965) for the first two, the rest the same balance.
    [Theory]
    [InlineData(4, 0.75)]
    [InlineData(5, 0.80)]
    [InlineData(10, 0.90)]
    [InlineData(20, 0.95)]
    public void Quality_ConcentratedSoManyTimes_IsTheUsualOne(double times, double quality)
    {
        Approx.Absolute(quality, Quality(Of(400, 400 * times)), 1e-12);
        UncertainValue<MassFraction> x = new(MassFraction.FromDecimalFractions(quality), MassFraction.FromDecimalFractions(0.01));
        PassSolids solids = Of(400, 2000).OutletOf(x);
        Approx.Relative(times, solids.Factor, 1e-12);
        Approx.Relative(400 * times, solids.Concentration.Value.MilligramsPerLiter, 1e-9);
        Approx.Relative(times * times * 0.01, solids.FactorUncertainty, 1e-3);   // d(1/(1 − x)) = dx/(1 − x)²
    }

    // u(x) = (1 − x) u(ratio): 3 % of the ratio is 0.6 points at 80 %, recomputed independently.
    [Fact]
    public void Quality_RatioGoodToThreePerCent_IsGoodToSixTenthsOfAPoint()
    {
        SolidsBalance balance = Of(400, 2000, 0.03 / Math.Sqrt(2));
        Approx.Absolute(0.006, balance.Quality.StandardUncertainty.DecimalFractions, 1e-5);
        Assert.Equal(2, balance.Budget.Lines.Count(line => line.ShareOfVariance > 0.4));
    }

    [Fact]
    public void Quality_SampleLetDownHot_ReadsTooDryUnlessSaid()
    {
        WaterSample hot = WaterSample.LetDownHot(Pressure.FromMegapascals(10), Pressure.FromAtmospheres(1));
        SolidsBalance asAnalysed = Of(400, 2000 * hot.ConcentrationFactor);
        Approx.Absolute(1 - (0.2 / 1.78), Quality(asAnalysed), 5e-4);
        Approx.Absolute(0.80, Quality(asAnalysed.WithSample(hot)), 1e-12);
    }

    // A loop at rest written out forwards: what enters, what is recycled, what the steam carries; the balance must find its quality again.
    [Property]
    public void Quality_AnyLoopAtRest_IsFoundAgain(PositiveInt seed)
    {
        System.Random random = new(seed.Get);
        double x = 0.5 + (0.4 * random.NextDouble()), recycle = 0.1 * random.NextDouble(), carried = 0.02 * random.NextDouble(), makeUp = 100 + (900 * random.NextDouble()), heavier = 1 + (0.04 * random.NextDouble());
        WaterSample letDown = WaterSample.LetDownFrom(Temperature.FromDegreesCelsius(110 + (150 * random.NextDouble())), Pressure.FromMegapascals(9), Pressure.FromMegapascals(0.12));
        WaterSample sample = random.Next(2) == 0 ? WaterSample.CooledAtPressure : WaterSample.LetDownHot(Pressure.FromMegapascals(9), Pressure.FromMegapascals(0.11));
        // (1 − r) w₀ + r w/(1 − y) = w (1 − x + x k), by mass.
        double water = (1 - recycle) * makeUp / (1 - x + (x * carried) - (recycle * letDown.ConcentrationFactor));
        if (water <= 0) return;   // more recycled than leaves
        double entering = ((1 - recycle) * makeUp) + (recycle * water * letDown.ConcentrationFactor);

        SolidsBalance balance = Of(makeUp, water * sample.ConcentrationFactor * heavier).WithSample(sample).WithDensities(Density.FromKilogramsPerCubicMeter(1000 / heavier), Density.FromKilogramsPerCubicMeter(1000))
            .WithRecycle(Ratio.FromDecimalFractions(recycle), Ratio.FromPercent(0.5), letDown).WithCarryOver(Ratio.FromDecimalFractions(carried), Ratio.FromPercent(0.1));
        Approx.Absolute(x, Quality(balance), 1e-10);
        Assert.True(balance.Quality.StandardUncertainty.DecimalFractions > 0);

        // Counted by volume of the cooled outlet water, as the sample cooled at pressure is.
        PassSolids solids = balance.OutletOf(new(MassFraction.FromDecimalFractions(x), MassFraction.FromDecimalFractions(0.01)));
        Approx.Relative(heavier * water, solids.Concentration.Value.MilligramsPerLiter, 1e-9);
        Approx.Relative(heavier * entering / (1 - x + (x * carried)), solids.Concentration.Value.MilligramsPerLiter, 1e-9);
    }

    // From 80 to 82 % the concentration rises by 11 %; a mean of 80 % with a pass 4 points above it means 6.25 times in that pass. By hand.
    [Fact]
    public void OutletOf_HotterPass_IsConcentratedTheMore()
    {
        static UncertainValue<MassFraction> At(double x) => new(MassFraction.FromDecimalFractions(x), MassFraction.FromDecimalFractions(0.005));
        SolidsBalance balance = Of(400, 2000, 0.01);
        Approx.Absolute(1.11, balance.OutletOf(At(0.82)).Factor / balance.OutletOf(At(0.80)).Factor, 5e-3);
        Approx.Absolute(6.25, balance.OutletOf(At(0.84)).Factor, 1e-12);
        Approx.Relative(Math.Sqrt((0.01 * 0.01) + (0.005 * 0.005 / (0.16 * 0.16))), balance.OutletOf(At(0.84)).Concentration.StandardUncertainty.MilligramsPerLiter / 2500, 1e-3);
        Assert.Throws<ArgumentOutOfRangeException>(() => balance.OutletOf(At(1)));
    }

    [Fact]
    public void Budget_AgainstMonteCarlo_HasTheSameSpread()
    {
        SolidsBalance balance = Of(400, 2100, 0.02).WithRecycle(Ratio.FromPercent(5), Ratio.FromPercent(1), WaterSample.CooledAtPressure);
        System.Random random = new(4);
        MathNet.Numerics.Distributions.Normal one = new(0, 1, random);
        double[] draws = [.. Enumerable.Range(0, 20000).Select(_ =>
        {
            double r = 0.05 + (0.01 * one.Sample()), ratio = 400 * (1 + (0.02 * one.Sample())) / (2100 * (1 + (0.02 * one.Sample())));
            return 1 - ((1 - r) * ratio) - r;
        })];
        Approx.Relative(MathNet.Numerics.Statistics.Statistics.StandardDeviation(draws), balance.Quality.StandardUncertainty.DecimalFractions, 0.02);
    }

    [Fact]
    public void Constructor_BadInput_ThrowsSayingWhich()
    {
        Assert.Contains("Concentration of the feed = 0 mg/L", Assert.Throws<ArgumentOutOfRangeException>(() => Of(0, 100)).Message, StringComparison.Ordinal);
        Assert.Throws<ArgumentOutOfRangeException>(() => Of(100, 500).WithRecycle(Ratio.FromPercent(100), Ratio.Zero, WaterSample.CooledAtPressure));
        Assert.Throws<ArgumentOutOfRangeException>(() => Of(100, 500).WithCarryOver(Ratio.FromPercent(-1), Ratio.Zero));
        Assert.Throws<ArgumentOutOfRangeException>(() => new SolidsTransport(Duration.FromSeconds(-1), Duration.Zero, Duration.Zero));
    }
}
