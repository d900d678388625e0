using FsCheck.Xunit;
using TwoPhase.Flow;
using TwoPhase.HeatTransfer;
using UnitsNet;

namespace TwoPhase.Tests.HeatTransfer;

public class OnsetTests
{
    // Forward form q = 1082 p^1.156 (1.8 ΔT)^(2.16/p^0.0234), p in bar, evaluated in Python: 1 atm, 10 K: 564 002 W/m²; 100 bar, 2 K: 2.66125 MW/m².
    [Theory]
    [InlineData(1.013, 564002, 10)]
    [InlineData(100, 2.66125e6, 2)]
    [InlineData(100, 1e5, 0.36830)]
    public void BerglesRohsenow_ForwardForm_ComesBack(double bar, double heatFlux, double superheat) =>
        Approx.Relative(superheat, OnsetModel.BerglesRohsenow.SuperheatCore(new FlowState { Pressure = bar * 1e5 }, heatFlux), 2e-5);

    [Fact]
    public void DavisAnderson_TenMegapascals_MatchesIndependentArithmeticAndTheOtherModel()
    {
        // kl hfg ρg / (8 σ Ts) = 7.0564e5 W/(m²·K²), in Python; 2 % from Bergles and Rohsenow's graph there.
        FlowState flow = HeatTransferFlows.TenMegapascals(0);
        double superheat = OnsetModel.DavisAnderson.SuperheatCore(flow, 1e5);
        Approx.Relative(0.37645, superheat, 2e-5);
        Approx.Relative(superheat, OnsetModel.BerglesRohsenow.SuperheatCore(flow, 1e5), 0.025);
    }

    [Property]
    public bool Superheat_MoreHeatOrLessPressure_IsMore(byte pressure, ushort heat)
    {
        double p = 0.5e6 + (pressure * 19e6 / 255), q = 100 + (20 * heat);
        FlowState flow = FlowStates.At(p, 0, 1000, 0.078, 0), higher = FlowStates.At(p * 1.05, 0, 1000, 0.078, 0);
        return OnsetModel.All.All(model => model.SuperheatCore(flow, q * 1.1) > model.SuperheatCore(flow, q) && model.SuperheatCore(higher, q) < model.SuperheatCore(flow, q));
    }

    [Fact]
    public void BulkTemperature_EvaporatorTube_LiesBelowSaturationByTheFilmDropLessTheSuperheat()
    {
        TwoPhaseFlow flow = new(HeatTransferFlows.TenMegapascals(0));
        Temperature bulk = OnsetModel.DavisAnderson.BulkTemperature(flow, HeatFlux.FromKilowattsPerSquareMeter(100), HeatTransferCoefficient.FromWattsPerSquareMeterKelvin(9000));
        Approx.Absolute(584.15 + 0.37645 - (100e3 / 9000), bulk.Kelvins, 1e-5);
        Assert.Equal(0, OnsetModel.DavisAnderson.Superheat(flow, HeatFlux.Zero).Kelvins);
    }

    [Fact]
    public void SahaZuber_BothBranches_MatchIndependentArithmetic()
    {
        FlowState fast = new() { MassFlux = 1007, Bore = 0.0779, LiquidHeatCapacity = 5800, LiquidConductivity = 0.545, LatentHeat = 1.3176e6 };
        FlowState slow = new() { MassFlux = 100, Bore = 0.01, LiquidHeatCapacity = 4600, LiquidConductivity = 0.6, LatentHeat = 1.3176e6 };
        Approx.Relative(15292.95, NetVapourModel.SahaZuber.SubcoolingCore(fast, 1e5), 1e-6);
        Approx.Relative(16866.67, NetVapourModel.SahaZuber.SubcoolingCore(slow, 1e5), 1e-6);
    }

    [Fact]
    public void SahaZuber_BorderOfTheBranches_IsContinuous()
    {
        FlowState flow = new() { MassFlux = 1000, Bore = 0.07, LiquidHeatCapacity = 1000, LiquidConductivity = 1 };   // Pe = 70 000
        Approx.Relative(
            NetVapourModel.SahaZuber.SubcoolingCore(flow with { MassFlux = 1000 * (1 - 1e-9) }, 1e5),
            NetVapourModel.SahaZuber.SubcoolingCore(flow with { MassFlux = 1000 * (1 + 1e-9) }, 1e5),
            3e-9);
    }

    [Theory]
    [InlineData(0, 0.00426986)]
    [InlineData(0.02, 0.02076218)]
    [InlineData(0.05, 0.05005748)]
    public void LevyTrueQuality_AboveDeparture_MatchesIndependentArithmetic(double equilibrium, double expected) =>
        Approx.Relative(expected, NetVapourModel.LevyTrueQuality(equilibrium, -0.011606671), 2e-6);

    [Property]
    public bool LevyTrueQuality_AnyEquilibrium_StartsAtZeroWithoutSlopeAndRises(ushort step, byte departure)
    {
        double xd = -(1 + departure) / 2000.0, xe = xd + (step / 65536.0 * 0.3);
        double x = NetVapourModel.LevyTrueQuality(xe, xd);
        return x >= Math.Max(0, xe) && NetVapourModel.LevyTrueQuality(xe + 1e-6, xd) > x
            && NetVapourModel.LevyTrueQuality(xd - 1e-3, xd) == 0 && NetVapourModel.LevyTrueQuality(xd * (1 - 1e-6), xd) < 1e-11 * -xd;
    }

    [Fact]
    public void TrueQuality_PublicDoor_JoinsDepartureAndProfile()
    {
        TwoPhaseFlow flow = new(HeatTransferFlows.TenMegapascals(0));
        HeatFlux q = HeatFlux.FromKilowattsPerSquareMeter(100);
        double xd = NetVapourModel.SahaZuber.DepartureQuality(flow, q).DecimalFractions;
        Approx.Relative(-0.0116, xd, 2e-3);   // about 2.5 K of subcooling at 10 MPa, 100 kW/m² and 1007 kg/(m²·s)
        Approx.Relative(-xd * 1.3176e6, NetVapourModel.SahaZuber.Subcooling(flow, q).JoulesPerKilogram, 1e-12);
        Approx.Relative(-xd / Math.E, NetVapourModel.SahaZuber.TrueQuality(flow, q, MassFraction.Zero).DecimalFractions, 1e-12);
        Assert.Equal(ApplicabilityLimits.HeatFlux, NetVapourModel.SahaZuber.Check(flow, q).Exceeded);
    }

    [Fact]
    public void Cores_InALoop_AllocateNothing()
    {
        FlowState flow = HeatTransferFlows.TenMegapascals(0);
        double sum = 0;
        foreach (OnsetModel model in OnsetModel.All) Assert.Equal(0, AllocationProbe.Bytes(() => sum += model.SuperheatCore(flow, 1e5)));
        Assert.Equal(0, AllocationProbe.Bytes(() => sum += NetVapourModel.SahaZuber.DepartureCore(flow, 1e5)));
        Assert.True(sum != 0);
    }
}
