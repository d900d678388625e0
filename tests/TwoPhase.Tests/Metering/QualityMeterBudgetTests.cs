using TwoPhase.Metering;
using TwoPhase.Uncertainty;
using UnitsNet;

namespace TwoPhase.Tests.Metering;

public class QualityMeterBudgetTests
{
    // Saturated steam at 9.6182184 MPa as python3-iapws 1.5.2 has it (basic equations of IF97; slopes along the saturation line).
    private const double P = 9618218.4, Vl = 0.00143930190699, Vg = 0.0189159163292, LiquidSlope = -1.67169182311e-05, VapourSlope = 6.69856424569e-06;
    private const double M = 4.8, X = 0.78, PipeD = 0.0779, ThroatD = 0.049;
    private static readonly double Beta4 = Math.Pow(ThroatD / PipeD, 4);

    private static readonly MassFlow Flow = MassFlow.FromKilogramsPerSecond(M);
    private static readonly Pressure Static = Pressure.FromPascals(P);
    private static readonly QualityMeter Venturi = new(new ClassicalVenturi(Length.FromMeters(PipeD), Length.FromMeters(ThroatD), ConvergentFinish.Machined), WetSteamModel.Homogeneous);

    private static MeteringUncertainty Instruments() => new MeteringUncertainty(Ratio.FromPercent(0.5), Pressure.FromKilopascals(0.2), Pressure.FromKilopascals(40))
        .WithDischargeCoefficient(Ratio.FromPercent(0.5)).WithExpansibility(Ratio.FromPercent(0.05));

    // Every contribution by hand from dx = W (dlnΔp − 2 dlnṁ + 2 dln(C ε E A)) and from v = vl + x (vg − vl).
    [Fact]
    public void QualityWithUncertainty_OneVenturiReading_IsTheBudgetByHand()
    {
        Pressure dp = Venturi.Differential(Flow, Static, MassFraction.FromDecimalFractions(X));
        UncertainQuality result = Venturi.QualityWithUncertainty(Flow, Static, dp, Instruments());

        double v = Vl + (X * (Vg - Vl)), w = v / (Vg - Vl);
        double epsilonShare = ExpansibilitySlope(dp.Pascals);                        // ε falls a little as Δp rises
        double vlSlope = -LiquidSlope * Vl * Vl, vgSlope = -VapourSlope * Vg * Vg;     // dv/dp = −v² dρ/dp
        double perPascal = -((vlSlope * (1 - X)) + (vgSlope * X)) / (Vg - Vl);         // volume at fixed Δp and ṁ is fixed
        Dictionary<string, double> byHand = new()
        {
            ["WetModel"] = w * 0.03,
            ["FeedFlow"] = -2 * w * 0.005,
            ["DischargeCoefficient"] = 2 * w * 0.005,
            ["Differential"] = w * (1 + (2 * epsilonShare)) * 200 / dp.Pascals,
            ["Pressure"] = perPascal * 40e3,
            ["ThroatDiameter"] = w * 4 / (1 - Beta4) * 0.0005,
            ["PipeDiameter"] = -w * 4 * Beta4 / (1 - Beta4) * 0.002,
            ["VapourDensity"] = X * Vg / (Vg - Vl) * 0.0005,
            ["Expansibility"] = 2 * w * 0.0005,
            ["LiquidDensity"] = (1 - X) * Vl / (Vg - Vl) * 0.000125,
        };

        Approx.Absolute(X, result.Quality.DecimalFractions, 1e-10);
        // Left out by hand: ε moves with pressure (10 % of a small term) and with β; hence the tolerances.
        foreach (BudgetLine line in result.Budget.Lines)
        {
            double tolerance = line.Input.Name switch { "Pressure" => 0.03, "ThroatDiameter" or "PipeDiameter" => 0.01, "Differential" => 1e-4, _ => 1e-6 };
            Approx.Relative(byHand[line.Input.Name], line.Contribution, tolerance, line.Input.Name);
        }

        Assert.Equal(byHand.Count, result.Budget.Lines.Count);
        Assert.Equal("WetModel", result.Budget.Lines[0].Input.Name);
        double combined = Math.Sqrt(byHand.Values.Sum(c => c * c));
        Approx.Relative(combined, result.StandardUncertainty.DecimalFractions, 1e-3);
        Approx.Relative(1.959964 * combined, result.ExpandedUncertainty().DecimalFractions, 1e-3);
    }

    // dlnε/dlnΔp from the standard's expansibility itself, half a per cent to either side.
    private static double ExpansibilitySlope(double dp)
    {
        ClassicalVenturi venturi = (ClassicalVenturi)Venturi.Meter;
        double At(double differential) => Math.Log(venturi.Expansibility(Static, Pressure.FromPascals(differential), 474.770468882 * 474.770468882 / (P * Vg)));
        return (At(dp * 1.005) - At(dp * 0.995)) / Math.Log(1.005 / 0.995);
    }

    [Fact]
    public void SimulateQuality_OneVenturiReading_AgreesWithTheBudgetWithinSampling()
    {
        const int trials = 20_000;
        Pressure dp = Venturi.Differential(Flow, Static, MassFraction.FromDecimalFractions(X));
        UncertainQuality budget = Venturi.QualityWithUncertainty(Flow, Static, dp, Instruments());
        MonteCarloResult drawn = Venturi.SimulateQuality(Flow, Static, dp, Instruments(), trials);

        double u = budget.StandardUncertainty.DecimalFractions;
        // Sampling error, and the second order of 1/ṁ² (3 W u²ṁ) that the law of propagation leaves out.
        Approx.Absolute(X, drawn.Mean, (4 * u / Math.Sqrt(trials)) + (4 * 0.005 * 0.005));
        Approx.Relative(u, drawn.StandardUncertainty, 4 / Math.Sqrt(2.0 * trials));
        Approx.Relative(2 * budget.ExpandedUncertainty().DecimalFractions, drawn.SymmetricInterval().Width, 0.03);
    }

    // dx/dlnΔp at 10 MPa, x = 0.78, r = ρg/ρl = 0.08055, ε apart, by hand: homogeneous v/(vg − vl) = 0.8676; James vJ/(1.5 √x (vg − vl)) = 0.5861;
    // Chisholm f/f′ with f = x² + Cc √r x (1 − x) + r (1 − x)² = 0.6392; Lin (x + θ (1 − x) √r)/(2 (1 − θ √r)) = 0.5876. One fluid, one reading, and
    // the models differ by a third in what an error of the transmitter does.
    [Theory]
    [InlineData("Homogeneous", 0.8676)]
    [InlineData("James", 0.5861)]
    [InlineData("Chisholm", 0.6392)]
    [InlineData("Lin", 0.5876)]
    public void QualityFunction_EachModel_HasItsSensitivity(string name, double expected)
    {
        WetSteamModel model = WetSteamModel.All.First(m => m.Name.StartsWith(name, StringComparison.Ordinal));
        QualityMeter meter = new(Venturi.Meter, model);
        Pressure p = Pressure.FromMegapascals(10), dp = meter.Differential(Flow, p, MassFraction.FromDecimalFractions(X));
        UncertaintyBudget budget = meter.QualityFunction(Flow, p, dp, Instruments()).Propagate();
        BudgetLine Line(MeteringInput input) => budget.Lines.Single(line => line.Input.Name == input.ToString());

        Approx.Relative(expected, Line(MeteringInput.Differential).Sensitivity * dp.Kilopascals, 0.008);   // ε takes up to 0.7 % of Δp back
        Approx.Relative(-2 * expected, Line(MeteringInput.FeedFlow).Sensitivity * M, 2e-3);
    }

    [Fact]
    public void QualityWithUncertainty_SiteConstant_NeedsNoGeometry()
    {
        QualityMeter site = new(SiteConstantMeter.FromReference(Flow, Density.FromKilogramsPerCubicMeter(66), Pressure.FromKilopascals(40)), WetSteamModel.Homogeneous);
        UncertainQuality result = site.QualityWithUncertainty(Flow, Static, Pressure.FromKilopascals(40), new MeteringUncertainty(Ratio.FromPercent(0.5), Pressure.FromKilopascals(0.2), Pressure.FromKilopascals(40)));
        Assert.Contains(result.Budget.Lines, line => line.Input.Name == nameof(MeteringInput.MeterConstant));
        Assert.DoesNotContain(result.Budget.Lines, line => line.Input.Name == nameof(MeteringInput.PipeDiameter));
        Assert.StartsWith("quality 0.", result.ToString(), StringComparison.Ordinal);
    }

    [Fact]
    public void QualityFunction_CalibratedElement_StartsFromTheReading()
    {
        QualityMeter calibrated = new(((PrimaryElement)Venturi.Meter).Calibrated(1.02), WetSteamModel.ReaderHarrisGraham);
        Pressure dp = calibrated.Differential(Flow, Static, MassFraction.FromDecimalFractions(X));
        Approx.Absolute(X, calibrated.QualityFunction(Flow, Static, dp, Instruments()).Propagate().Value, 1e-10);
        Approx.Relative(1.02 * 0.995, ((PrimaryElement)calibrated.Meter).DischargeCoefficient(1e6), 1e-15);
    }

    [Fact]
    public void QualityWithUncertainty_ModelsOwnUncertainty_IsNeverLeftOut()
    {
        Pressure dp = Venturi.Differential(Flow, Static, MassFraction.FromDecimalFractions(X));
        MeteringUncertainty perfect = new MeteringUncertainty(Ratio.Zero, Pressure.Zero, Pressure.Zero).WithDischargeCoefficient(Ratio.Zero).WithExpansibility(Ratio.Zero).WithDiameters(Ratio.Zero, Ratio.Zero).WithDensities(Ratio.Zero, Ratio.Zero);
        double w = (Vl + (X * (Vg - Vl))) / (Vg - Vl);
        Approx.Relative(0.03 * w, Venturi.QualityWithUncertainty(Flow, Static, dp, perfect).StandardUncertainty.DecimalFractions, 1e-6);
        Approx.Relative(0.01 * w, Venturi.WithModelUncertainty(Ratio.FromPercent(1)).QualityWithUncertainty(Flow, Static, dp, perfect).StandardUncertainty.DecimalFractions, 1e-6);
    }

    [Fact]
    public void QualityWithUncertainty_CorrelatedFlowAndDifferential_Cancels()
    {
        // Δp +2 % and ṁ +1 % together leave the quality where it is, apart from ε.
        Pressure dp = Venturi.Differential(Flow, Static, MassFraction.FromDecimalFractions(X));
        MeteringUncertainty uncertainty = new MeteringUncertainty(Ratio.FromPercent(1), Pressure.FromPascals(0.02 * dp.Pascals), Pressure.Zero);
        UncertaintyBudget free = Venturi.QualityFunction(Flow, Static, dp, uncertainty).Propagate();
        UncertaintyBudget tied = Venturi.QualityFunction(Flow, Static, dp, uncertainty.WithCorrelation(MeteringInput.FeedFlow, MeteringInput.Differential, 1)).Propagate();
        double parts = free.Lines.Where(l => l.Input.Name is "FeedFlow" or "Differential").Sum(l => l.Contribution * l.Contribution);
        Approx.Absolute(Math.Sqrt((free.StandardUncertainty * free.StandardUncertainty) - parts), tied.StandardUncertainty, 2e-5);
    }

    [Fact]
    public void Uncertainty_Negative_ThrowsNamingTheValue()
    {
        Assert.Contains("-0.01", Assert.Throws<ArgumentOutOfRangeException>(() => new MeteringUncertainty(Ratio.FromPercent(-1), Pressure.Zero, Pressure.Zero)).Message, StringComparison.Ordinal);
        Assert.Throws<ArgumentOutOfRangeException>(() => Instruments().WithCorrelation(MeteringInput.FeedFlow, MeteringInput.Pressure, 2));
        Assert.Throws<ArgumentNullException>(() => Venturi.QualityWithUncertainty(Flow, Static, Pressure.FromKilopascals(40), null!));
    }
}
