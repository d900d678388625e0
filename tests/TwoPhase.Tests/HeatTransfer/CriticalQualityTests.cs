using FsCheck.Xunit;
using TwoPhase.Flow;
using TwoPhase.HeatTransfer;
using UnitsNet;

namespace TwoPhase.Tests.HeatTransfer;

public class CriticalQualityTests
{
    private static readonly HeatFlux Flux = HeatFlux.FromKilowattsPerSquareMeter(100);

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
    public void Konkov_AgainstTheLookUpTable_FallsOnItsCliff()
    {
        // The critical-heat-flux table of Groeneveld et al. (2007), 10 MPa, 1000 kg/(m²·s), 8 mm: 1183 kW/m² at x = 0.5, 356 at 0.6, 156 at 0.7.
        FlowState flow = new() { Pressure = 10e6, MassFlux = 1000, Bore = 0.008 };
        Assert.InRange(CriticalQualityModel.Konkov.MeanCore(flow, 356e3), 0.5, 0.7);
    }

    // The steps of the fits where they meet, 0.749/0.754 at 29.4 bar and 0.633/0.621 at 98 bar (q 200, G 1000, D 20 mm, in Python), are ramps here.
    [Theory]
    [InlineData(29.4, 0.74903, 0.75422)]
    [InlineData(98, 0.63318, 0.62111)]
    public void Konkov_AcrossABorder_IsContinuousAndAsPublishedOnePerCentAway(double bar, double below, double above)
    {
        double At(double p) => CriticalQualityModel.Konkov.MeanCore(new FlowState { Pressure = p * 1e5, MassFlux = 1000, Bore = 0.02 }, 200e3);
        Approx.Relative(Math.Sqrt(below * above), At(bar), 2e-5);
        double slope = bar < 50 ? 0.01715 : -0.00255, beyond = bar < 50 ? -0.00255 : -0.00795;
        Approx.Relative(below * Math.Exp(-slope * 0.02 * bar), At(bar * 0.98), 2e-5);
        Approx.Relative(above * Math.Exp(beyond * 0.02 * bar), At(bar * 1.02), 2e-5);
        for (double p = bar * 0.98; p < bar * 1.02; p += 0.01) Assert.True(Math.Abs(At(p + 0.01) - At(p)) < 2e-3 * At(p));
    }

    [Fact]
    public void KeferKohlerKastner_TenMegapascals_MatchesIndependentArithmetic()
    {
        // Recomputed in Python with g = 9.81 m/s²; the library has 9.80665.
        FlowState flow = HeatTransferFlows.TenMegapascals(0.5) with { MassFlux = 1007 };
        CriticalQuality critical = CriticalQualityModel.KeferKohlerKastner.Critical(new TwoPhaseFlow(flow), Flux);
        Approx.Absolute(0.60471, critical.Mean.DecimalFractions, 5e-6);
        Approx.Absolute(0.36005, critical.Top.DecimalFractions, 1e-4);
        Approx.Absolute(0.84937, critical.Bottom.DecimalFractions, 1e-4);
    }

    [Fact]
    public void KeferKohlerKastner_VerticalTube_HasNoSpread()
    {
        FlowState flow = HeatTransferFlows.TenMegapascals(0.5) with { Inclination = Math.PI / 2 };
        CriticalQuality critical = CriticalQualityModel.KeferKohlerKastner.Critical(new TwoPhaseFlow(flow), Flux);
        Approx.Absolute(critical.Mean.DecimalFractions, critical.Top.DecimalFractions, 1e-12);
        Assert.Equal(CriticalQualityModel.Konkov.Critical(new TwoPhaseFlow(flow), Flux).Mean.DecimalFractions, critical.Mean.DecimalFractions);
    }

    [Property]
    public bool Mean_MoreHeatOrFlow_DriesSooner(byte pressure, ushort flux, ushort heat)
    {
        FlowState flow = FlowStates.At(0.5e6 + (pressure * 19.5e6 / 255), 0.5, 200 + (flux / 20.0), 0.02, 0);
        double q = 1000 + (20 * heat);
        return CriticalQualityModel.All.All(model =>
            model.MeanCore(flow, q * 1.01) < model.MeanCore(flow, q)
            && model.MeanCore(flow with { MassFlux = flow.MassFlux * 1.01 }, q) < model.MeanCore(flow, q));
    }

    [Property]
    public bool Spread_SteeperOrFasterTube_IsLess(byte angle, ushort flux)
    {
        double inclination = angle * 1.55 / 255;
        FlowState flow = FlowStates.At(10e6, 0.5, 200 + (flux / 20.0), 0.0243, inclination), steeper = flow with { Inclination = inclination + 0.01 }, down = flow with { Inclination = -inclination };
        CriticalQualityModel model = CriticalQualityModel.KeferKohlerKastner;
        double spread = model.SpreadCore(flow, 0.6);
        return spread is > 0 and < 4 && model.SpreadCore(steeper, 0.6) < spread && model.SpreadCore(down, 0.6) == spread
            && model.SpreadCore(flow with { MassFlux = flow.MassFlux * 1.1 }, 0.6) < spread;
    }

    [Fact]
    public void Critical_UnheatedCore_IsNeverDry()
    {
        FlowState flow = HeatTransferFlows.TenMegapascals(0.5);
        double mean = CriticalQualityModel.KeferKohlerKastner.MeanCore(flow, 0);
        Assert.Equal(double.PositiveInfinity, mean);
        Assert.Equal(0, CriticalQualityModel.KeferKohlerKastner.SpreadCore(flow, mean));
    }

    [Fact]
    public void Critical_EvaporatorTube_IsAnIndicatorOnly()
    {
        // 78 mm is far outside 4 to 32 mm, and outside the 24.3 mm of the inclined tubes.
        FlowState wide = HeatTransferFlows.TenMegapascals(0.5), narrow = wide with { Bore = 0.0243 };
        foreach (CriticalQualityModel model in CriticalQualityModel.All)
        {
            CriticalQuality far = model.Critical(new TwoPhaseFlow(wide), Flux), near = model.Critical(new TwoPhaseFlow(narrow), Flux);
            Assert.True(far.IsIndicatorOnly);
            Assert.Equal(ApplicabilityLimits.Bore, far.Applicability.Exceeded);
            Assert.False(near.IsIndicatorOnly);
            Assert.Contains("indicator only", far.ToString(), StringComparison.Ordinal);
        }

        Assert.True(default(CriticalQuality).IsIndicatorOnly);
    }

    [Fact]
    public void Critical_ZeroHeatFlux_ThrowsNamingTheValue()
    {
        TwoPhaseFlow flow = new(HeatTransferFlows.TenMegapascals(0.5));
        ArgumentOutOfRangeException error = Assert.Throws<ArgumentOutOfRangeException>(() => CriticalQualityModel.Konkov.Critical(flow, HeatFlux.Zero));
        Assert.Equal("heatFlux", error.ParamName);
        Assert.Contains("0 kW/m²", error.Message, StringComparison.Ordinal);
        Assert.Throws<ArgumentNullException>(() => CriticalQualityModel.KeferKohlerKastnerAbout(null!));
    }

    [Fact]
    public void Critical_InALoop_AllocatesNothing()
    {
        TwoPhaseFlow flow = new(HeatTransferFlows.TenMegapascals(0.5));
        int indicators = 0;
        foreach (CriticalQualityModel model in CriticalQualityModel.All)
            Assert.Equal(0, AllocationProbe.Bytes(() => indicators += model.Critical(flow, Flux).IsIndicatorOnly ? 1 : 0));
        Assert.True(indicators > 0);
    }
}
