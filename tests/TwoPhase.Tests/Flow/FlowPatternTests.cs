using FsCheck.Xunit;
using TwoPhase.Flow;

namespace TwoPhase.Tests.Flow;

public class FlowPatternTests
{
    private static readonly Dictionary<string, FlowRegime> Regimes = new()
    {
        ["annular"] = FlowRegime.Annular,
        ["intermittent"] = FlowRegime.Intermittent,
        ["stratified wavy"] = FlowRegime.StratifiedWavy,
        ["stratified smooth"] = FlowRegime.StratifiedSmooth,
        ["bubbly"] = FlowRegime.DispersedBubble,
    };

    private static FlowState TenMegapascals(double quality, double massFlux, double inclination = 0) =>
        ReferencePoint.At(quality) with { MassFlux = massFlux, Inclination = inclination };

    [Fact]
    public void Of_SaturatedSteamGrid_MatchesIndependentProgram()
    {
        foreach (ReferenceTable.Row row in ReferenceTable.Load("Flow/Data/taitel-dukler.csv").Rows)
        {
            FlowState flow = new()
            {
                LiquidDensity = row["rhol_kg_m3"],
                VapourDensity = row["rhog_kg_m3"],
                LiquidViscosity = row["mul_Pa_s"],
                VapourViscosity = row["mug_Pa_s"],
                Quality = row["x"],
                MassFlux = row["G_kg_m2s"],
                Bore = row["D_m"],
            };
            FlowPattern pattern = FlowPattern.Core(flow);
            Approx.Relative(row["X"], pattern.MartinelliParameter, 1e-9, "X");
            Approx.Relative(row["T"], pattern.DispersionParameter, 1e-9, "T");
            Approx.Relative(row["F"], pattern.Froude, 1e-9, "F");
            Approx.Relative(row["K"], pattern.WaveParameter, 1e-9, "K");
            Approx.Relative(row["hL_over_D"], pattern.Level, 1e-9, "level");
            Approx.Relative(row["F_boundary_A"], pattern.StratificationFroude, 1e-9, "F border");
            Approx.Relative(row["K_boundary_C"], pattern.WaveBoundary, 1e-9, "K border");
            Approx.Relative(row["T_boundary_D"], pattern.DispersionBoundary, 1e-9, "T border");
            if (row["ln_margin"] >= 0.02) Assert.Equal(Regimes[row.Text("regime_TD1976")], pattern.Regime);
        }
    }

    // Points read off the published figure of the stratified border, as python3-fluids digitised it (F against X, G chosen to give X).
    [Theory]
    [InlineData(0.015096, 1.3799)]
    [InlineData(0.14045, 0.771)]
    [InlineData(0.36203, 0.4973)]
    [InlineData(0.9332, 0.23909)]
    [InlineData(1.7179, 0.14167)]
    [InlineData(10.06, 0.016031)]
    public void StratificationFroude_PublishedCurve_AgreesWithinTheWidthOfTheLine(double x, double froude)
    {
        // X falls as quality rises, at any flux: bisect on ln((1 − x)/x).
        double low = -15, high = 15;
        for (int i = 0; i < 60; i++)
        {
            double middle = (low + high) / 2;
            if (FlowPattern.Core(TenMegapascals(1 / (1 + Math.Exp(middle)), 5000)).MartinelliParameter < x) low = middle;
            else high = middle;
        }

        FlowPattern pattern = FlowPattern.Core(TenMegapascals(1 / (1 + Math.Exp(low)), 5000));
        Approx.Relative(x, pattern.MartinelliParameter, 1e-9);
        Approx.Relative(froude, pattern.StratificationFroude, 0.07);
    }

    [Fact]
    public void Of_WorkedExampleOfFluids_MatchesItsGroups()
    {
        // python3-fluids 1.0.22, Taitel_Dukler_regime(m=0.6, x=0.112, rhol=915.12, rhog=2.67, mul=180E-6, mug=14E-6, sigma=0.0487, D=0.05).
        FlowState flow = new()
        {
            LiquidDensity = 915.12,
            VapourDensity = 2.67,
            LiquidViscosity = 180e-6,
            VapourViscosity = 14e-6,
            Quality = 0.112,
            MassFlux = 0.6 / (Math.PI / 4 * 0.05 * 0.05),
            Bore = 0.05,
        };
        FlowPattern pattern = FlowPattern.Core(flow);
        Assert.Equal(FlowRegime.Annular, pattern.Regime);
        Approx.Relative(0.4505119, pattern.MartinelliParameter, 2e-7);
        Approx.Relative(0.990225, pattern.Froude, 2e-6);
        Approx.Relative(271.8628, pattern.WaveParameter, 2e-6);
        Approx.Relative(0.04144055, pattern.DispersionParameter, 2e-7);
    }

    [Fact]
    public void Level_WhereThePaperPutsIntermittentFlow_IsHalfTheBore()
    {
        // The paper prints X = 1.6 for hL/D = 0.5; the balance solved to round-off in Python gives 1.58386.
        static double Level(double quality) => FlowPattern.Core(TenMegapascals(quality, 5000)).Level;
        double low = 1e-4, high = 0.9;
        for (int i = 0; i < 60; i++)
        {
            double middle = (low + high) / 2;
            if (Level(middle) > 0.5) low = middle;
            else high = middle;
        }

        Approx.Relative(1.58386, FlowPattern.Core(TenMegapascals(low, 5000)).MartinelliParameter, 3e-6);
    }

    [Theory]
    [InlineData(0.5, 3.07526)]
    [InlineData(0.78, 4.79741)]
    public void Of_EvaporatorPassInLoad_IsAnnularAndFarFromStratifying(double quality, double froude)
    {
        // Recomputed in Python, g = 9.81 m/s².
        FlowPattern pattern = FlowPattern.Core(TenMegapascals(quality, 1007.109));
        Assert.Equal(FlowRegime.Annular, pattern.Regime);
        Approx.Relative(froude, pattern.Froude, 3e-4);
        Assert.True(pattern.StratificationMargin > 4);
    }

    [Fact]
    public void Of_QuarterLoadAtLowQuality_HasADryTop()
    {
        FlowPattern pattern = FlowPattern.Core(TenMegapascals(0.03, 100));
        Assert.True(pattern.IsStratified);
        Assert.True(pattern.StratificationMargin < 1);
    }

    [Fact]
    public void Of_OnePhaseOnly_SaysSo()
    {
        FlowPattern liquid = FlowPattern.Core(TenMegapascals(0, 1000)), vapour = FlowPattern.Core(TenMegapascals(1, 1000));
        Assert.Equal(FlowRegime.Liquid, liquid.Regime);
        Assert.Equal(1, liquid.Level);
        Assert.Equal(0, liquid.StratificationMargin);
        Assert.Equal(FlowRegime.Vapour, vapour.Regime);
        Assert.Equal(0, vapour.Level);
        Assert.Equal(double.PositiveInfinity, vapour.StratificationMargin);
    }

    [Fact]
    public void Of_SteepTube_IsFlagged()
    {
        Assert.True(FlowPattern.Core(TenMegapascals(0.5, 1000, 0.17)).Applicability.IsInside);
        Assert.Equal(ApplicabilityLimits.Inclination, FlowPattern.Core(TenMegapascals(0.5, 1000, 0.18)).Applicability.Exceeded);
        Assert.NotEqual(FlowRegime.None, FlowPattern.Core(TenMegapascals(0.5, 1000, Math.PI / 2)).Regime);
    }

    [Fact]
    public void Of_Downhill_StratifiesSoonerThanUphill()
    {
        // Gravity drives the liquid downhill: a thinner, faster layer and a wider vapour space.
        FlowPattern down = FlowPattern.Core(TenMegapascals(0.1, 300, -0.05)), level = FlowPattern.Core(TenMegapascals(0.1, 300)), up = FlowPattern.Core(TenMegapascals(0.1, 300, 0.05));
        Assert.True(down.Level < level.Level && level.Level < up.Level);
        Assert.True(down.StratificationMargin < level.StratificationMargin && level.StratificationMargin < up.StratificationMargin);
    }

    [Fact]
    public void Of_InALoop_AllocatesNothing()
    {
        FlowState flow = TenMegapascals(0.4, 800, 0.02);
        double sum = 0;
        Assert.Equal(0, AllocationProbe.Bytes(() => sum += FlowPattern.Core(flow).StratificationMargin));
        Assert.True(sum > 0);
    }

    [Property]
    public bool Of_AnyQualityFluxAndSlope_IsDecidedAndFinite(ushort quality, ushort flux, sbyte slope)
    {
        FlowPattern pattern = FlowPattern.Core(TenMegapascals((quality + 1) / 65537.0, 10 + (flux / 16.0), slope * Math.PI / 256));
        return pattern.Level is > 0 and < 1 && pattern.StratificationMargin is > 0 and < double.PositiveInfinity
            && pattern.Regime is not (FlowRegime.None or FlowRegime.Liquid or FlowRegime.Vapour);
    }

    [Property]
    public bool StratificationMargin_AtOneQuality_RisesWithFlow(ushort quality, ushort flux)
    {
        double x = 0.01 + (quality / 70000.0), massFlux = 200 + (flux / 20.0);
        return FlowPattern.Core(TenMegapascals(x, massFlux * 1.1)).StratificationMargin > FlowPattern.Core(TenMegapascals(x, massFlux)).StratificationMargin;
    }
}
