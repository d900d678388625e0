using TwoPhase.Flow;
using TwoPhase.HeatTransfer;

namespace TwoPhase.Tests.HeatTransfer;

public class CriticalQualityTests
{
    // Recomputed in Python from the formula as printed; they hold the arithmetic, not the coefficients.
    [Theory]
    [InlineData(100, 1007, 0.0779, 100, 0.60471)]
    [InlineData(300, 1500, 0.0779, 60, 0.52677)]
    [InlineData(400, 1200, 0.015, 150, 0.36173)]
    public void Konkov_AwayFromTheBorders_MatchesIndependentArithmetic(double kilowatts, double massFlux, double bore, double bar, double expected)
    {
        FlowState flow = new() { Pressure = bar * 1e5, MassFlux = massFlux, Bore = bore };
        Approx.Absolute(expected, CriticalQualityModel.Konkov.MeanCore(flow, kilowatts * 1e3), 5e-6);
    }

    // The inverse form q_cr = c' x^-8 G^-2.664 (1000 D)^-0.56 exp(b' p), coefficients from memory: the two forms were published
    // together, so they bear each other out.
    [Theory]
    [InlineData(1.8447e8, 0.1372, 15)]
    [InlineData(2.0048e10, -0.0204, 60)]
    [InlineData(1.1853e12, -0.0636, 150)]
    public void Konkov_OverThePublishedInverse_ComesBack(double c, double b, double bar)
    {
        FlowState flow = new() { Pressure = bar * 1e5, MassFlux = 1000, Bore = 0.02 };
        double x = CriticalQualityModel.Konkov.MeanCore(flow, 200e3);
        double kilowatts = c * Math.Pow(x, -8) * Math.Pow(1000, -2.664) * Math.Pow(20, -0.56) * Math.Exp(b * bar);
        Approx.Relative(200, kilowatts, 3e-3);
    }

    [Fact]
    public void KeferKohlerKastner_TenMegapascals_MatchesIndependentArithmetic()
    {
        // Recomputed in Python with g = 9.81 m/s²; the library has 9.80665.
        FlowState flow = HeatTransferFlows.TenMegapascals(0.5) with { MassFlux = 1007 };
        double mean = CriticalQualityModel.KeferKohlerKastner.MeanCore(flow, 100e3);
        double spread = CriticalQualityModel.KeferKohlerKastner.SpreadCore(flow, mean);
        Approx.Absolute(0.36005, mean - (spread / 2), 1e-4);
        Approx.Absolute(0.84937, mean + (spread / 2), 1e-4);
    }
}
