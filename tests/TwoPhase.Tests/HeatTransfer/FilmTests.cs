using FsCheck.Xunit;
using TwoPhase.Flow;
using TwoPhase.HeatTransfer;
using TwoPhase.Steam;
using UnitsNet;

namespace TwoPhase.Tests.HeatTransfer;

public class FilmTests
{
    public static TheoryData<FilmModel> Models => [.. FilmModel.All];

    public static TheoryData<FilmModel> WetWallModels => [.. FilmModel.All.Where(model => !model.IsForDryWall)];

    [Fact]
    public void Chen_WorkedExampleOfCollierAndThome_AgreesWithinTheReadingOfTheCharts()
    {
        // Collier and Thome, Convective Boiling and Condensation, chapter 7, example 1, as carried by a public test file: water at
        // 1.186 bar, F = 4.25 and S = 0.435 read off Chen's charts; the fits for F and S differ from the charts by 2.5 % and 1.7 %.
        FlowState flow = new()
        {
            Pressure = 1.186e5,
            SaturationTemperature = 377.7,
            LiquidDensity = 955,
            VapourDensity = 0.691,
            LiquidViscosity = 2.725e-4,
            VapourViscosity = 1.365e-5,
            LiquidConductivity = 0.683,
            VapourConductivity = 0.025,
            LiquidHeatCapacity = 4210,
            VapourHeatCapacity = 2080,
            LatentHeat = 2.245e6,
            SurfaceTension = 0.058,
            MassFlux = 298,
            Bore = 0.0127,
            Quality = 0.05,
        };
        foreach ((double heatFlux, double expected) in new[] { (38.6e3, 13880.0), (192e3, 17310.0), (506e3, 22790.0) })
            Approx.Relative(expected, FilmModel.Chen.CoefficientCore(flow, heatFlux), 0.03);
    }

    // Points of Chen's charts as tabulated in the public source of FRAPTRAN (NUREG/CR-7023): 1/Xtt, F.
    [Theory]
    [InlineData(0.4, 1.63)]
    [InlineData(1, 2.75)]
    [InlineData(2, 4.30)]
    [InlineData(4, 6.75)]
    [InlineData(10, 12.10)]
    [InlineData(20, 22.00)]
    [InlineData(100, 76.0)]
    public void ChenEnhancement_PublishedChart_AgreesWithinItsReading(double inverseMartinelli, double f) =>
        Approx.Relative(f, FilmModel.ChenEnhancement(inverseMartinelli), 0.085);

    // As above: Re F^1.25, S.
    [Theory]
    [InlineData(1e4, 0.893)]
    [InlineData(2e4, 0.793)]
    [InlineData(4e4, 0.629)]
    [InlineData(1e5, 0.375)]
    [InlineData(3e5, 0.142)]
    public void ChenSuppression_PublishedChart_AgreesWithinItsReading(double twoPhaseReynolds, double s) =>
        Approx.Relative(s, FilmModel.ChenSuppression(twoPhaseReynolds), 0.085);

    // Water from Cao, Heat Transfer in Process Engineering (2009), and an example of Serth, as checked by the tests of the python library ht.
    [Theory]
    [InlineData(4.3, 3906 * 4.3, 4180, 0.688, 0.275e-3, 0.0588, 2.25e6, 958, 0.597, 3519.9239897462644)]
    [InlineData(13, 3906 * 13, 4180, 0.688, 0.275e-3, 0.0588, 2.25e6, 958, 0.597, 10524.54751261952)]
    [InlineData(16.2, 106300, 2730, 0.086, 156e-6, 0.0082, 272e3, 567, 18.09, 5512.279068294656)]
    public void ForsterZuber_WorkedExamples_MatchesHt(
        double superheat, double rise, double cp, double k, double mu, double sigma, double latent, double liquid, double vapour, double expected)
    {
        FlowState flow = new() { LiquidConductivity = k, LiquidHeatCapacity = cp, LiquidDensity = liquid, SurfaceTension = sigma, LiquidViscosity = mu, LatentHeat = latent, VapourDensity = vapour };
        Approx.Relative(expected, FilmModel.ForsterZuber(flow) * Math.Pow(superheat, 0.24) * Math.Pow(rise, 0.75), 1e-12);
    }

    [Theory]
    [InlineData(4.3, 1558.1435442153575)]
    [InlineData(9.1, 7138.700876530947)]
    [InlineData(13, 14727.09551225091)]
    public void CooperPoolBoiling_WaterAtOneAtmosphere_MatchesHt(double superheat, double expected) =>
        // Tests of the python library ht, which has pc = 22.048 MPa and M = 18.02: three parts in ten thousand.
        Approx.Relative(expected, FilmModel.CooperPoolBoiling(101325, expected * superheat), 3e-4);

    [Fact]
    public void DougallRohsenow_RoundNumbers_MatchesIndependentArithmetic()
    {
        // From the tests of a public thermal-hydraulics library: h = 1682.620551668 W/(m²·K).
        FlowState flow = new() { MassFlux = 500, Bore = 0.01, Quality = 0.5, VapourDensity = 20, LiquidDensity = 800, VapourViscosity = 2e-5, VapourConductivity = 0.06, VapourHeatCapacity = 3000 };
        Approx.Relative(1682.620551668, FilmModel.DougallRohsenow.CoefficientCore(flow, 1e5), 1e-12);
    }

    [Fact]
    public void Coefficient_TenMegapascals_MatchesIndependentArithmetic()
    {
        // Recomputed in Python from the formulas as printed. The plain Steiner-Taborek law [(1 − x)^1.5 + 1.9 x^0.6 (ρl/ρg)^0.35]^1.1 gives
        // 36744 (Petukhov's friction factor); the Heat Atlas form, which also joins the vapour's end, 36279.
        FlowState flow = HeatTransferFlows.TenMegapascals(0.5);
        Approx.Relative(28631, FilmModel.GungorWinterton1986.CoefficientCore(flow, 150e3), 2e-5);
        Approx.Relative(28910, FilmModel.GungorWinterton1987.CoefficientCore(flow, 150e3), 2e-5);
        Approx.Relative(36278.69943985031, FilmModel.SteinerTaborek.CoefficientCore(flow, 150e3), 1e-9);
        Approx.Relative(36744, FilmModel.SteinerTaborek.CoefficientCore(flow, 150e3), 0.015);
    }

    [Fact]
    public void Chen_TenMegapascals_MatchesSaturationLineOfIf97()
    {
        // 30796.39 with psat(T) of IAPWS-IF97 (python3-iapws 1.5.2); 30788 with a straight line for Δp; wall superheat 4.871 K.
        Approx.Relative(30796.388303, FilmModel.Chen.CoefficientCore(HeatTransferFlows.TenMegapascals(0.5), 150e3), 1.5e-5);
    }

    [Theory, MemberData(nameof(Models))]
    public void Coefficient_AtBothEndsAndEveryPressure_IsFiniteAndPositive(FilmModel model)
    {
        foreach (double pressure in new[] { 0.5e6, 2e6, 10e6, 16e6, 20e6, 22e6, 22.06e6 })
            foreach (double quality in new[] { 0, 1e-12, 1e-3, 0.5, 1 - 1e-3, 1 - 1e-12, 1 })
                foreach (double heatFlux in new[] { 0, 1e-12, 1, 1e5, 1e6 })
                {
                    double h = model.CoefficientCore(FlowStates.At(pressure, quality, 1000, 0.078, 0), heatFlux);
                    Assert.True(h is > 0 and < 1e9, $"{model}: h = {h} at p = {pressure}, x = {quality}, q = {heatFlux}");
                }
    }

    [Theory, MemberData(nameof(WetWallModels))]
    public void Coefficient_DrySteam_IsNotBelowTheVapours(FilmModel model)
    {
        FlowState flow = FlowStates.At(10e6, 1, 1000, 0.078, 0);
        double vapour = model == FilmModel.SteinerTaborek
            ? SinglePhaseFilm.GnielinskiCore(SinglePhase.Vapour(flow, 1000))
            : SinglePhaseFilm.DittusBoelterCore(SinglePhase.Vapour(flow, 1000));
        Approx.Relative(vapour, model.CoefficientCore(flow, 0), 1e-12);
    }

    [Fact]
    public void DougallRohsenow_DrySteam_IsDittusBoelter()
    {
        FlowState flow = FlowStates.At(10e6, 1, 1000, 0.078, 0);
        Assert.Equal(SinglePhaseFilm.DittusBoelterCore(SinglePhase.Vapour(flow, 1000)), FilmModel.DougallRohsenow.CoefficientCore(flow, 1e5));
    }

    [Theory, MemberData(nameof(WetWallModels))]
    public void Coefficient_SaturatedLiquidUnheated_IsTheLiquids(FilmModel model)
    {
        FlowState flow = FlowStates.At(10e6, 0, 1000, 0.078, 0);
        double liquid = model == FilmModel.SteinerTaborek
            ? SinglePhaseFilm.GnielinskiCore(SinglePhase.Liquid(flow, 1000))
            : SinglePhaseFilm.DittusBoelterCore(SinglePhase.Liquid(flow, 1000));
        Approx.Relative(liquid, model.CoefficientCore(flow, 0), 1e-12);
    }

    [Property]
    public bool SurfaceTemperature_HeatedWall_LiesAboveSaturation(byte pressure, ushort quality, ushort flux, ushort heat)
    {
        FlowState state = AnyFlow(pressure, quality, flux);
        TwoPhaseFlow flow = new(state);
        HeatFlux q = HeatFlux.FromWattsPerSquareMeter(1000 + (10 * heat));
        return FilmModel.All.All(model => model.SurfaceTemperature(flow, q).Kelvins > state.SaturationTemperature);
    }

    [Property]
    public bool Coefficient_SmallStepOfQualityOrHeat_MovesLittle(byte pressure, ushort quality, ushort flux, ushort heat)
    {
        FlowState flow = AnyFlow(pressure, quality, flux);
        FlowState beside = flow with { Quality = flow.Quality + 1e-7 };
        double q = 1000 + (10 * heat);
        return FilmModel.All.All(model =>
        {
            double h = model.CoefficientCore(flow, q);
            return Math.Abs(model.CoefficientCore(beside, q) - h) < 1e-3 * h && Math.Abs(model.CoefficientCore(flow, q * (1 + 1e-7)) - h) < 1e-6 * h;
        });
    }

    [Property]
    public bool Coefficient_MoreHeat_NeverBoilsWorse(byte pressure, ushort quality, ushort flux, ushort heat)
    {
        FlowState flow = AnyFlow(pressure, quality, flux);
        double q = 1000 + (10 * heat);
        return FilmModel.All.Where(model => model != FilmModel.GungorWinterton1986)   // there more enhancement suppresses more: not monotone
            .All(model => model.CoefficientCore(flow, q * 1.5) >= model.CoefficientCore(flow, q) * (1 - 1e-12));
    }

    [Property]
    public bool Chen_SolvedSuperheat_SatisfiesItsEquation(byte pressure, ushort quality, ushort heat)
    {
        FlowState flow = AnyFlow(pressure, quality, 20000);
        double q = 1 + (20 * heat), h = FilmModel.Chen.CoefficientCore(flow, q), superheat = q / h;
        double wet = 1 - flow.Quality;
        SinglePhase liquid = SinglePhase.Liquid(flow, flow.MassFlux * wet);
        double inverse = Math.Pow(flow.Quality / wet, 0.9) * Math.Sqrt(flow.LiquidDensity / flow.VapourDensity) * Math.Pow(flow.VapourViscosity / flow.LiquidViscosity, 0.1);
        double f = FilmModel.ChenEnhancement(inverse), s = FilmModel.ChenSuppression(liquid.Reynolds * Math.Pow(f, 1.25));
        double rise = SaturationLine.AtTemperature(flow.SaturationTemperature + superheat).Pressure - flow.Pressure;
        double expected = (f * SinglePhaseFilm.DittusBoelterCore(liquid)) + (s * FilmModel.ForsterZuber(flow) * Math.Pow(superheat, 0.24) * Math.Pow(rise, 0.75));

        // IF97's saturation line against Clausius and Clapeyron with properties at Ts: 1 % of Δp at 20 K, and it counts by S only.
        return Math.Abs(h / expected - 1) < 0.01 || h <= SinglePhaseFilm.DittusBoelterCore(SinglePhase.Vapour(flow, flow.MassFlux)) * (1 + 1e-12);
    }

    [Fact]
    public void GungorWinterton_SlowHorizontalFlow_IsPoorerThanVertical()
    {
        FlowState horizontal = FlowStates.At(8e6, 0.2, 100, 0.078, 0), vertical = horizontal with { Inclination = Math.PI / 2 };
        foreach (FilmModel model in new[] { FilmModel.GungorWinterton1986, FilmModel.GungorWinterton1987 })
        {
            Assert.True(model.CoefficientCore(horizontal, 1e5) < model.CoefficientCore(vertical, 1e5));
            Assert.Equal(model.CoefficientCore(horizontal with { MassFlux = 1000 }, 1e5), model.CoefficientCore(vertical with { MassFlux = 1000 }, 1e5));
        }
    }

    [Fact]
    public void Coefficient_EveryModel_AllocatesNothing()
    {
        FlowState flow = FlowStates.At(10e6, 0.5, 1000, 0.078, 0);
        double sum = 0;
        foreach (FilmModel model in FilmModel.All) Assert.Equal(0, AllocationProbe.Bytes(() => sum += model.CoefficientCore(flow, 1e5)));
        Assert.True(sum > 0);
    }

    [Fact]
    public void Coefficient_PublicDoor_EqualsTheCore()
    {
        FlowState state = FlowStates.At(10e6, 0.5, 1000, 0.078, 0);
        TwoPhaseFlow flow = new(Saturation.FromPressure(Pressure.FromMegapascals(10)), MassFraction.FromPercent(50), MassFlux.FromKilogramsPerSecondPerSquareMeter(1000), Length.FromMillimeters(78), Angle.Zero);
        HeatFlux q = HeatFlux.FromKilowattsPerSquareMeter(100);
        foreach (FilmModel model in FilmModel.All)
        {
            Approx.Relative(model.CoefficientCore(state, 1e5), model.Coefficient(flow, q).WattsPerSquareMeterKelvin, 1e-12);
            Approx.Relative(state.SaturationTemperature + (1e5 / model.CoefficientCore(state, 1e5)), model.SurfaceTemperature(flow, q).Kelvins, 1e-12);
        }
    }

    [Fact]
    public void Coefficient_NegativeHeatFlux_ThrowsNamingTheValue()
    {
        TwoPhaseFlow flow = new(FlowStates.At(10e6, 0.5, 1000, 0.078, 0));
        ArgumentOutOfRangeException error = Assert.Throws<ArgumentOutOfRangeException>(() => FilmModel.Chen.Coefficient(flow, HeatFlux.FromKilowattsPerSquareMeter(-5)));
        Assert.Equal("heatFlux", error.ParamName);
        Assert.Contains("-5 kW/m²", error.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Check_WideTube_IsFlaggedByEveryModelFromNarrowData()
    {
        TwoPhaseFlow flow = new(FlowStates.At(10e6, 0.5, 1000, 0.078, Math.PI / 2));
        HeatFlux q = HeatFlux.FromKilowattsPerSquareMeter(100);
        foreach (FilmModel model in new[] { FilmModel.GungorWinterton1986, FilmModel.GungorWinterton1987, FilmModel.SteinerTaborek })
            Assert.Equal(ApplicabilityLimits.Bore, model.Check(flow, q).Exceeded);
        Assert.Equal(ApplicabilityLimits.Pressure, FilmModel.Chen.Check(flow, q).Exceeded);
        Assert.True(FilmModel.GungorWinterton1986.Check(new TwoPhaseFlow(FlowStates.At(10e6, 0.5, 1000, 0.02, 0)), q).IsInside);
    }

    private static FlowState AnyFlow(byte pressure, ushort quality, ushort flux) =>
        FlowStates.At(0.5e6 + (pressure * 19.5e6 / 255), quality / 65536.0, 150 + (flux / 30.0), 0.078, 0);
}
