using MathNet.Numerics.Distributions;
using TwoPhase.Metering;
using UnitsNet;

namespace TwoPhase.Tests.Metering;

public class MeterFitTests
{
    private static readonly SiteConstantMeter Site = SiteConstantMeter.FromReference(MassFlow.FromKilogramsPerSecond(4.8), Density.FromKilogramsPerCubicMeter(66), Pressure.FromKilopascals(40));
    private static readonly ClassicalVenturi Venturi = new(Length.FromMillimeters(77.9), Length.FromMillimeters(49), ConvergentFinish.Machined);

    // Invented tests of a pass: flows and qualities over its range, differentials by a known meter, references with a known scatter.
    private static List<ReferenceReading> Readings(QualityMeter truth, double scatter, int count, int seed = 3, double lowQuality = 0.65, double highQuality = 0.85)
    {
        Normal noise = new(0, 1, new Random(seed));
        List<ReferenceReading> readings = [];
        for (int i = 0; i < count; i++)
        {
            double share = count == 1 ? 0 : i / (count - 1.0);
            MassFlow flow = MassFlow.FromKilogramsPerSecond(3 + (2.2 * ((i * 7 % count) / (double)count)));
            Pressure pressure = Pressure.FromMegapascals(9 + share);
            double x = lowQuality + ((highQuality - lowQuality) * share);
            readings.Add(new(flow, pressure, truth.Differential(flow, pressure, MassFraction.FromDecimalFractions(x)), MassFraction.FromDecimalFractions(x + (scatter * noise.Sample()))));
        }

        return readings;
    }

    [Fact]
    public void LumpedConstant_ExactReadings_FindsTheConstant()
    {
        MeterFit fit = MeterFit.LumpedConstant(WetSteamModel.Homogeneous, Readings(new QualityMeter(Site, WetSteamModel.Homogeneous), 0, 8));
        Approx.Relative(Site.K.SquareMeters, fit.Value, 1e-10);
        Assert.Equal(FitWarnings.None, fit.Warnings);
        Assert.All(fit.Residuals, residual => Approx.Absolute(0, residual.DecimalFractions, 1e-9));
        Approx.Relative(Site.K.SquareMeters, ((SiteConstantMeter)fit.Meter.Meter).K.SquareMeters, 1e-10);
    }

    [Fact]
    public void DischargeCoefficient_ElementWithAnotherOne_FindsIt()
    {
        QualityMeter truth = new(Venturi.Calibrated(1.01), WetSteamModel.Homogeneous);
        MeterFit fit = MeterFit.DischargeCoefficient(new QualityMeter(Venturi, WetSteamModel.Homogeneous), Readings(truth, 0, 6));
        Approx.Relative(1.01 * 0.995, fit.Value, 1e-9);
        Approx.Relative(1.01 * 0.995, ((PrimaryElement)fit.Meter.Meter).DischargeCoefficient(1e6), 1e-9);
        // Fitted once more from the calibrated meter: the same.
        Approx.Relative(fit.Value, MeterFit.DischargeCoefficient(fit.Meter, Readings(truth, 0, 6)).Value, 1e-9);
    }

    // A slip exponent: OR² = 1 + (rⁿ + r⁻ⁿ) X + X², n between all slip and none.
    [Fact]
    public void OneParameter_ExponentOfAModel_IsFound()
    {
        QualityMeter Of(double n) => new(Venturi, new ExponentModel(n));
        MeterFit fit = MeterFit.OneParameter("n [-]", Of, 0.2, 0.6, Readings(Of(0.43), 0, 8));
        Approx.Absolute(0.43, fit.Value, 1e-7);
        Assert.Equal(FitWarnings.None, fit.Warnings);
    }

    // The interval covers the truth as often as it says: 300 repeats at 95 %, four standard errors.
    [Fact]
    public void Interval_ManyNoisyTests_CoversTheTruthAsOftenAsItSays()
    {
        const int repeats = 300;
        QualityMeter truth = new(Site, WetSteamModel.Homogeneous);
        int covered = Enumerable.Range(0, repeats).Count(seed => MeterFit.LumpedConstant(WetSteamModel.Homogeneous, Readings(truth, 0.01, 6, seed)).Interval().Contains(Site.K.SquareMeters));
        Approx.Absolute(0.95, covered / (double)repeats, 4 * Math.Sqrt(0.95 * 0.05 / repeats));
    }

    // By hand for the homogeneous model: x = k² Δp/ṁ² /(vg − vl) − vl/(vg − vl) is linear in k², so least squares is a regression through the origin in k².
    [Fact]
    public void StandardUncertainty_HomogeneousModel_IsThatOfLinearRegression()
    {
        List<ReferenceReading> readings = Readings(new QualityMeter(Site, WetSteamModel.Homogeneous), 0.01, 12);
        MeterFit fit = MeterFit.LumpedConstant(WetSteamModel.Homogeneous, readings);

        double sxx = 0, sxy = 0, k2 = Site.K.SquareMeters * Site.K.SquareMeters;
        double[] slopes = new double[readings.Count], offsets = new double[readings.Count];
        for (int i = 0; i < readings.Count; i++)
        {
            double At(double square) => new QualityMeter(new SiteConstantMeter(Area.FromSquareMeters(Math.Sqrt(square))), WetSteamModel.Homogeneous).Quality(readings[i].Flow, readings[i].Pressure, readings[i].Differential).Quality.DecimalFractions;
            slopes[i] = (At(1.1 * k2) - At(0.9 * k2)) / (0.2 * k2);
            offsets[i] = readings[i].Quality.DecimalFractions - (At(k2) - (slopes[i] * k2));
            sxx += slopes[i] * slopes[i];
            sxy += slopes[i] * offsets[i];
        }

        double best = sxy / sxx;
        double s = Math.Sqrt(Enumerable.Range(0, slopes.Length).Sum(i => Math.Pow(offsets[i] - (best * slopes[i]), 2)) / (slopes.Length - 1));
        Approx.Relative(Math.Sqrt(best), fit.Value, 1e-7);
        Approx.Relative(s, fit.ResidualDeviation.DecimalFractions, 1e-6);
        Approx.Relative(s / Math.Sqrt(sxx) / (2 * Math.Sqrt(best)), fit.StandardUncertainty, 1e-4);
    }

    // Homogeneous: dx = W dlnΔp, W = v/(vg − vl), so a scatter s of quality is s/W of the differential; the parameter adds its part, 1/n of the variance.
    [Fact]
    public void Meter_AfterAFit_CarriesTheScatterAsModelUncertainty()
    {
        QualityMeter truth = new(Site, WetSteamModel.Homogeneous);
        List<ReferenceReading> readings = Readings(truth, 0.02, 20);
        MeterFit fit = MeterFit.LumpedConstant(WetSteamModel.Homogeneous, readings);
        double w = readings.Average(r =>
        {
            TwoPhase.Steam.Saturation steam = TwoPhase.Steam.Saturation.FromPressure(r.Pressure);
            double vl = steam.Liquid.SpecificVolume.CubicMetersPerKilogram, vg = steam.Vapour.SpecificVolume.CubicMetersPerKilogram;
            return fit.Meter.Quality(r.Flow, r.Pressure, r.Differential).Quality.DecimalFractions + (vl / (vg - vl));
        });
        Approx.Relative(fit.ResidualDeviation.DecimalFractions * Math.Sqrt(1 + (1.0 / 20)) / w, fit.Meter.ModelUncertainty.DecimalFractions, 2e-3);
        Assert.Equal(0.5, MeterFit.LumpedConstant(WetSteamModel.Homogeneous, Readings(truth, 0, 6)).Meter.ModelUncertainty.Percent, 9);   // never zero
    }

    [Fact]
    public void Warnings_DataThatCannotTell_SaySo()
    {
        QualityMeter Of(double n) => new(Venturi, new ExponentModel(n));
        Assert.True(MeterFit.LumpedConstant(WetSteamModel.Homogeneous, Readings(new QualityMeter(Site, WetSteamModel.Homogeneous), 0.06, 3)).Warnings.HasFlag(FitWarnings.NotDetermined | FitWarnings.FewReadings));
        // Almost dry steam carries next to no information on slip.
        Assert.True(MeterFit.OneParameter("n [-]", Of, 0.2, 0.6, Readings(Of(0.43), 0.01, 6, lowQuality: 0.94, highQuality: 0.96)).Warnings.HasFlag(FitWarnings.NotDetermined));
        Assert.True(MeterFit.OneParameter("n [-]", Of, 0.2, 0.35, Readings(Of(0.43), 0.001, 6)).Warnings.HasFlag(FitWarnings.AtLimit));
    }

    [Fact]
    public void Warnings_WrongModel_ShowsATrend()
    {
        // Readings of a meter with an unnoticed zero error: no constant makes up for it at every load.
        List<ReferenceReading> readings = [.. Readings(new QualityMeter(Site, WetSteamModel.Homogeneous), 0.002, 12).Select(r =>
            new ReferenceReading(r.Flow, r.Pressure, Pressure.FromPascals(r.Differential.Pascals + 1500), r.Quality))];
        Assert.True(MeterFit.LumpedConstant(WetSteamModel.Homogeneous, readings).Warnings.HasFlag(FitWarnings.Trend));
    }

    [Fact]
    public void LumpedConstant_UnequalReferences_FollowsTheBetterOnes()
    {
        QualityMeter truth = new(Site, WetSteamModel.Homogeneous);
        List<ReferenceReading> readings = Readings(truth, 0, 6);
        ReferenceReading first = readings[0];
        readings[0] = new(first.Flow, first.Pressure, first.Differential, MassFraction.FromDecimalFractions(first.Quality.DecimalFractions + 0.1), MassFraction.FromDecimalFractions(10));
        Approx.Relative(Site.K.SquareMeters, MeterFit.LumpedConstant(WetSteamModel.Homogeneous, readings).Value, 1e-6);
    }

    [Fact]
    public void OneParameter_ValueAtTheEnd_NeverLeavesTheRange()
    {
        QualityMeter truth = new(Venturi, new ExponentModel(0.43));
        MeterFit fit = MeterFit.OneParameter("n [-]", n => n is >= 0.2 and <= 0.35 ? new QualityMeter(Venturi, new ExponentModel(n)) : throw new InvalidOperationException("outside"), 0.2, 0.35, Readings(truth, 0, 5));
        Assert.Equal(0.35, fit.Value);
        Assert.True(fit.Warnings.HasFlag(FitWarnings.AtLimit));
    }

    // Chisholm's coefficient with n = 1/2 is that of flow with one velocity.
    [Fact]
    public void ChisholmCoefficient_OfOneHalf_IsHomogeneous()
    {
        QualityMeter own = new(Venturi, new ExponentModel(0.5)), homogeneous = new(Venturi, WetSteamModel.Homogeneous);
        foreach (ReferenceReading point in Readings(homogeneous, 0, 4))
            Approx.Relative(homogeneous.Differential(point.Flow, point.Pressure, point.Quality).Pascals, own.Differential(point.Flow, point.Pressure, point.Quality).Pascals, 1e-12);
    }

    [Fact]
    public void Warnings_FourReadings_AreNotFew() =>
        Assert.False(MeterFit.LumpedConstant(WetSteamModel.Homogeneous, Readings(new QualityMeter(Site, WetSteamModel.Homogeneous), 0.002, 4)).Warnings.HasFlag(FitWarnings.FewReadings));

    [Fact]
    public void Fit_BadInput_Throws()
    {
        List<ReferenceReading> readings = Readings(new QualityMeter(Site, WetSteamModel.Homogeneous), 0, 2);
        Assert.Throws<ArgumentException>(() => MeterFit.LumpedConstant(WetSteamModel.Homogeneous, readings.Take(1)));
        Assert.Throws<ArgumentException>(() => MeterFit.DischargeCoefficient(new QualityMeter(Site, WetSteamModel.Homogeneous), readings));
        Assert.Throws<ArgumentOutOfRangeException>(() => MeterFit.OneParameter("n", _ => new QualityMeter(Site, WetSteamModel.Homogeneous), 1, 0, readings));
        Assert.Contains("swapped", Assert.Throws<ArgumentOutOfRangeException>(() => new ReferenceReading(readings[0].Flow, readings[0].Differential, readings[0].Pressure, readings[0].Quality)).Message, StringComparison.Ordinal);
        Assert.Throws<ArgumentOutOfRangeException>(() => new ReferenceReading(readings[0].Flow, readings[0].Pressure, readings[0].Differential, MassFraction.FromPercent(120)));
        Assert.Throws<ArgumentOutOfRangeException>(() => Venturi.Calibrated(0));
    }

    private sealed class ExponentModel(double exponent) : WetSteamModel
    {
        public override string Name => "exponent";

        protected internal override double EffectiveDensityCore(in MeterState meter, double quality) =>
            DensityFromChisholm(meter, quality, ChisholmCoefficient(meter, exponent));
    }
}
