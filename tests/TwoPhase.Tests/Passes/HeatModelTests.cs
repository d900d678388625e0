using FsCheck.Xunit;
using TwoPhase.Passes;
using UnitsNet;

namespace TwoPhase.Tests.Passes;

public class HeatModelTests
{
    private static readonly FuelGas Methane = new(Part(GasComponent.Methane, 1));

    // Invented, of the usual kind.
    private static readonly FuelGas NaturalGas = new(Part(GasComponent.Methane, 0.94), Part(GasComponent.Ethane, 0.03), Part(GasComponent.Propane, 0.01), Part(GasComponent.CarbonDioxide, 0.01), Part(GasComponent.Nitrogen, 0.01));

    private static readonly FiringConditions Full = Conditions(2500, 3, 180, 20);

    private static readonly HeatModel Model = new(NaturalGas, Full, Ratio.FromPercent(1.5), Ratio.FromPercent(41));

    // Combustion efficiency of natural gas, gross, by oxygen in the dry flue gas and by flue gas less air temperature (200 to 600 °F).
    // Source: U.S. Department of Energy, Steam Tip Sheet 4, Improve Your Boiler's Combustion Efficiency (2006). Gas, air and the
    // temperature of the heating value behind the table are not printed: the air is that of ASME PTC 4.1, 80 °F with 0.013 of water (from
    // memory). What is not known moves all entries alike, by 0.3 points; between them only the rounding of the table is left.
    [Fact]
    public void Burn_NaturalGas_HasThePrintedCombustionEfficiency()
    {
        (double Oxygen, double ExcessAir, double[] Printed)[] table =
        [
            (2, 9.5, [85.4, 83.1, 80.8, 78.4, 76.0]),
            (3, 15.0, [85.2, 82.8, 80.4, 77.9, 75.4]),
            (5, 28.1, [84.7, 82.1, 79.5, 76.7, 74.0]),
            (7, 44.9, [84.1, 81.2, 78.2, 75.2, 72.1]),
            (10, 81.6, [82.8, 79.3, 75.6, 71.9, 68.2]),
        ];
        FiringConditions standard = Full.WithAirTemperature(Temperature.FromDegreesFahrenheit(80)).WithAirHumidity(Ratio.FromDecimalFractions(0.013));
        var misses = new List<double>();
        foreach ((double oxygen, double excessAir, double[] printed) in table)
        {
            for (int i = 0; i < printed.Length; i++)
            {
                FiredHeat heat = Lossless(NaturalGas).Burn(standard.WithExcessOxygen(Ratio.FromPercent(oxygen)).WithStackTemperature(Temperature.FromDegreesFahrenheit(280 + (100 * i))));
                Approx.Absolute(excessAir, (double)heat.ExcessAir.Percent, 0.6);
                misses.Add((double)heat.Efficiency(HeatingBasis.Gross).Percent - printed[i]);
            }
        }

        Assert.All(misses, miss => Assert.InRange(miss, -0.4, 0.4));
        Assert.InRange(misses.Max() - misses.Min(), 0, 0.2);
    }

    // H2S + 3/2 O2 = H2O + SO2, CH4 + 2 O2 = CO2 + 2 H2O; oxygen in the gas is oxygen that the air need not bring.
    [Fact]
    public void OxygenNeed_SourGasWithOxygen_IsThatOfTheReactions() => Approx.Relative(
        (0.3 * 1.5) + (0.6 * 2) - 0.1, new FuelGas(Part(GasComponent.HydrogenSulphide, 0.3), Part(GasComponent.Methane, 0.6), Part(GasComponent.Oxygen, 0.1)).OxygenNeed, 1e-14);

    // Kern, Process Heat Transfer (1950), example 19.3: 38 % absorbed with 25 % excess air; with 40 % and half as much fuel again, 31 %.
    [Fact]
    public void Burn_MoreAirAndFuel_SplitsAsInTheExampleOfKern()
    {
        FiringConditions full = Full.WithExcessOxygen(MethaneOxygen(0.25));
        FiredHeat any = new HeatModel(Methane, full, Ratio.Zero, Ratio.FromPercent(50)).Burn(full);
        double share = 1 - (0.38 * Watts(any.ReleasedNet) / Watts(any.Absorbed));
        var model = new HeatModel(Methane, full, Ratio.Zero, Ratio.FromDecimalFractions(share));
        Approx.Relative(0.38, RadiantShare(model.Burn(full)), 1e-12);
        FiredHeat more = model.Burn(model.AtFiring(Ratio.FromPercent(150)).WithExcessOxygen(MethaneOxygen(0.40)));
        Approx.Absolute(0.31, RadiantShare(more), 0.005);
        Approx.Absolute(1.22, Watts(more.Radiant) / (0.38 * Watts(any.ReleasedNet)), 0.01);
    }

    // CH4 + 2 O2: moles counted by hand. Dry flue gas 1 + A − 2 per mole, of which 2 e is oxygen.
    [Theory]
    [InlineData(0)]
    [InlineData(0.15)]
    [InlineData(0.8)]
    public void Burn_Methane_HasTheExcessAirCountedByHand(double excess) =>
        Approx.Absolute(excess, Lossless(Methane).Burn(Full.WithExcessOxygen(MethaneOxygen(excess))).ExcessAir.DecimalFractions, 1e-12);

    // Sensible heats of the flue gas at 227 °C [kJ/mol]: N2 5.911 (Borgnakke and Sonntag, table A.9), O2 6.084, CO2 8.305, H2O 6.925
    // (NIST-JANAF tables, from memory), Ar 2.5 R ΔT = 4.196. Methane without excess: 9.548 air, of it 7.456 N2, 0.0892 Ar, 0.003 CO2.
    [Fact]
    public void Burn_Methane_LosesInTheStackWhatTheTablesSay()
    {
        FiredHeat heat = Lossless(Methane).Burn(Conditions(2500, 0, 226.85, 25));
        double stack = (1.003 * 8.305) + (2 * 6.925) + (7.456 * 5.911) + (0.0892 * 4.196);
        Approx.Relative(stack / 802.55, Watts(heat.StackLoss) / Watts(heat.ReleasedNet), 3e-4);
        Approx.Absolute(0, Watts(heat.AirHeat), 1e-6);
    }

    // The same with a quarter more air: half a mole of oxygen is left over, and a quarter of the other gases comes on top.
    [Fact]
    public void Burn_MethaneWithExcess_CarriesTheRestOfTheAir()
    {
        Ratio oxygen = MethaneOxygen(0.25);
        FiredHeat without = Lossless(Methane).Burn(Conditions(2500, 0, 226.85, 25)), with = Lossless(Methane).Burn(Conditions(2500, 0, 226.85, 25).WithExcessOxygen(oxygen));
        double rest = (0.5 * 6.084) + (0.25 * ((7.456 * 5.911) + (0.0892 * 4.196) + (0.003 * 8.305)));
        Approx.Relative(rest / 802.55, (Watts(with.StackLoss) - Watts(without.StackLoss)) / Watts(with.ReleasedNet), 3e-4);
    }

    // ISO 6976: methane 890.58 kJ/mol at 25 °C; 23.6448 L/mol at 15 °C and 101.325 kPa as an ideal gas, Z = 1 − 0.04452².
    [Fact]
    public void HeatingValue_OfMethane_IsThatOfTheStandard()
    {
        Approx.Relative(890.58 / 23.6448 / (1 - (0.04452 * 0.04452)), Methane.HeatingValue(HeatingBasis.Gross).MegajoulesPerCubicMeter, 1e-5);
        Approx.Relative(802.554 / 890.58, Methane.HeatingValue(HeatingBasis.Net) / Methane.HeatingValue(HeatingBasis.Gross), 1e-9);
        Approx.Relative(16.04246, Methane.MolarMass.GramsPerMole, 1e-12);
    }

    // Stack and air at 25 °C and a casing that loses nothing: all of the net heat is absorbed.
    [Fact]
    public void Burn_ColdStack_AbsorbsTheNetHeat()
    {
        FiredHeat heat = Lossless(NaturalGas).Burn(Conditions(2500, 3, 25, 25));
        Approx.Relative(Watts(heat.ReleasedNet), Watts(heat.Absorbed), 1e-12);
        Approx.Relative(1, heat.Efficiency(HeatingBasis.Net).DecimalFractions, 1e-12);
        Approx.Relative(2500 / 3600.0 * NaturalGas.HeatingValue(HeatingBasis.Net).JoulesPerCubicMeter, Watts(heat.ReleasedNet), 1e-12);
    }

    [Fact]
    public void Burn_MeasuredHeatingValue_IsTheSameOnEitherBasis()
    {
        EnergyDensity gross = EnergyDensity.FromMegajoulesPerCubicMeter(39), net = NaturalGas.WithHeatingValue(gross, HeatingBasis.Gross).HeatingValue(HeatingBasis.Net);
        Assert.InRange(net.MegajoulesPerCubicMeter, 34.5, 36);
        Approx.Relative(
            Watts(Lossless(NaturalGas.WithHeatingValue(gross, HeatingBasis.Gross)).Burn(Full).Absorbed),
            Watts(Lossless(NaturalGas.WithHeatingValue(net, HeatingBasis.Net)).Burn(Full).Absorbed),
            1e-12);
    }

    [Fact]
    public void Burn_FullFiring_HasTheShareAndTheShellLossGiven()
    {
        FiredHeat heat = Model.Burn(Model.FullFiring);
        Approx.Relative(0.41, heat.ConvectiveShare.DecimalFractions, 1e-12);
        Approx.Relative(0.015 * Watts(heat.ReleasedNet), Watts(heat.ShellLoss), 1e-12);
        Approx.Relative(Watts(heat.Absorbed), Watts(heat.Radiant) + Watts(heat.Convective), 1e-12);
        Approx.Relative(Watts(heat.ShellLoss), Watts(Model.Burn(Model.AtFiring(Ratio.FromPercent(60))).ShellLoss), 1e-12, "the casing is as hot");
    }

    [Property]
    public bool Burn_AnyFire_ClosesEnergyAndLosesMoreWithMoreAirOrHotterStack(ushort fuel, byte oxygen, byte above, sbyte air, byte humidity)
    {
        FiringConditions conditions = Conditions(1 + fuel, oxygen / 15.0, Math.Max(-60, (int)air) + 10 + above, Math.Max(-60, (int)air)).WithAirHumidity(Ratio.FromDecimalFractions(humidity / 2000.0));
        FiredHeat heat = Model.Burn(conditions);
        Approx.Absolute(Watts(heat.ReleasedNet) + Watts(heat.AirHeat), Watts(heat.Absorbed) + Watts(heat.StackLoss) + Watts(heat.ShellLoss), 1e-9 * Watts(heat.ReleasedNet));
        Assert.InRange(heat.ConvectiveShare.DecimalFractions, 0, 1);
        bool none = Watts(heat.Absorbed) == 0;
        Assert.True(none || Model.Burn(conditions.WithExcessOxygen(conditions.ExcessOxygen + Ratio.FromPercent(1))).Absorbed < heat.Absorbed, "air");
        Assert.True(none || Model.Burn(conditions.WithStackTemperature(conditions.StackTemperature + TemperatureDelta.FromKelvins(10))).Absorbed < heat.Absorbed, "stack");
        return true;
    }

    [Fact]
    public void Burn_MoreFiringOrAir_SendsHeatToTheBank()
    {
        double[] shares = [.. new[] { 40, 70, 100, 110 }.Select(firing => Model.Burn(Model.AtFiring(Ratio.FromPercent(firing))).ConvectiveShare.DecimalFractions)];
        Assert.Equal(shares.Order(), shares);
        Assert.True(Model.Burn(Full.WithExcessOxygen(Ratio.FromPercent(5))).ConvectiveShare > Model.Burn(Full).ConvectiveShare);
    }

    [Fact]
    public void Burn_NoFuel_GivesNoHeat()
    {
        FiredHeat out0 = Model.Burn(Model.AtFiring(Ratio.Zero));
        Assert.Equal((0, 0, 0, 0), (Watts(out0.Absorbed), Watts(out0.ReleasedGross), Watts(out0.ShellLoss), out0.ConvectiveShare.DecimalFractions));
        Assert.Equal(Ratio.Zero, out0.Efficiency(HeatingBasis.Net));
    }

    [Fact]
    public void Burn_SplitOfOnesOwn_IsTaken()
    {
        HeatModel model = Model.WithSplit(conditions => Ratio.FromDecimalFractions(0.3 + (2 * conditions.ExcessOxygen.DecimalFractions)));
        Approx.Relative(0.36, model.Burn(Full).ConvectiveShare.DecimalFractions, 1e-12);
        Assert.Contains("Convective share of the split law = 1.3 must lie between 0 and 1", Assert.Throws<ArgumentOutOfRangeException>(() => Model.WithSplit(_ => Ratio.FromPercent(130)).Burn(Full)).Message, StringComparison.Ordinal);
    }

    // A stack of methane with dry air and no excess holds 2 mol of water in 10.55: 0.1896 of 101.325 kPa,
    // 19.21 kPa. The steam tables have 19.04 kPa at 59 °C and 19.95 kPa at 60 °C.
    [Fact]
    public void WaterDewPoint_OfMethane_IsThatOfItsWater()
    {
        FiredHeat heat = Lossless(Methane).Burn(Conditions(2500, 0, 180, 20));
        Approx.Absolute(59.19, heat.WaterDewPoint!.Value.DegreesCelsius, 0.02);
        Assert.Null(Lossless(new(Part(GasComponent.CarbonMonoxide, 1))).Burn(Full).WaterDewPoint);
    }

    [Fact]
    public void Absorbed_FeedsTheSteadyStateOfAPass()
    {
        FiredHeat heat = Model.Burn(Model.AtFiring(Ratio.FromPercent(40)));
        PassProfile profile = SteadyState.Solve(ExamplePass.Pass.WithConvectiveShare(heat.ConvectiveShare), ExamplePass.Conditions.WithAbsorbedHeat(heat.Absorbed));
        Approx.Relative(
            Watts(heat.Convective) / ExamplePass.Conditions.FeedFlow.KilogramsPerSecond,
            profile.Last(row => row.Section == "bank").Enthalpy.JoulesPerKilogram - profile.Inlet.Enthalpy.JoulesPerKilogram,
            1e-9);
    }

    [Fact]
    public void Burn_AllocatesNothing()
    {
        Model.Burn(Full);
        long before = GC.GetAllocatedBytesForCurrentThread();
        for (int i = 0; i < 100; i++) Model.Burn(Full);
        Assert.Equal(0, GC.GetAllocatedBytesForCurrentThread() - before);
    }

    [Fact]
    public void Values_OutsideTheirLimits_ThrowNamingThem()
    {
        Says("Excess oxygen = 0.21 must be below 0.209476", () => Full.WithExcessOxygen(Ratio.FromPercent(21)));
        Says("Excess oxygen = -0.01 must not be negative", () => Full.WithExcessOxygen(Ratio.FromPercent(-1)));
        Says("Stack temperature = 800 °C must lie between -73.15 °C and 726.85 °C", () => Full.WithStackTemperature(Temperature.FromDegreesCelsius(800)));
        Says("Air temperature = -100 °C", () => Full.WithAirTemperature(Temperature.FromDegreesCelsius(-100)));
        Says("Air humidity = 0.5 must lie between 0 and 0.2", () => Full.WithAirHumidity(Ratio.FromPercent(50)));
        Says("Fuel flow = -1 m³/s must not be negative", () => Full.WithFuelFlow(VolumeFlow.FromCubicMetersPerSecond(-1)));
        Says("Fuel flow at full firing = 0 m³/s must be greater than zero", () => new HeatModel(Methane, Full.WithFuelFlow(VolumeFlow.Zero), Ratio.Zero, Ratio.FromPercent(40)));
        Says("Convective share = 1 must lie between 0 and 1", () => new HeatModel(Methane, Full, Ratio.Zero, Ratio.FromPercent(100)));
        Says("Shell loss = -0.01 must not be negative", () => new HeatModel(Methane, Full, Ratio.FromPercent(-1), Ratio.FromPercent(40)));
        Says("Losses at full firing = ", () => new HeatModel(Methane, Full, Ratio.FromPercent(100), Ratio.FromPercent(40)));
        Says("Firing = -0.1 must not be negative", () => Model.AtFiring(Ratio.FromPercent(-10)));
        Says("The firing conditions are empty", () => Model.Burn(default));
        Says("Shares of the fuel gas sum to 0.9; they must sum to 1: Methane 0.9", () => new FuelGas(Part(GasComponent.Methane, 0.9)));
        Says("two shares of Methane", () => new FuelGas(Part(GasComponent.Methane, 0.5), Part(GasComponent.Methane, 0.5)));
        Says("needs no air to burn: Nitrogen 1", () => new FuelGas(Part(GasComponent.Nitrogen, 1)));
        Says("None is no component of a fuel gas", () => Part(GasComponent.None, 1));
        Says("Share of Methane = 1.1 must lie between 0 and 1", () => Part(GasComponent.Methane, 1.1));
        Says("None is no basis of a heating value", () => Methane.HeatingValue(HeatingBasis.None));
        Says("None is no basis of an efficiency", () => Model.Burn(Full).Efficiency(HeatingBasis.None));
        Says("Heating value = 0 MJ/m³ must be greater than zero", () => Methane.WithHeatingValue(EnergyDensity.Zero, HeatingBasis.Net));
        Says("Gross heating value = 1 MJ/m³ must exceed 3.73", () => Methane.WithHeatingValue(EnergyDensity.FromMegajoulesPerCubicMeter(1), HeatingBasis.Gross));
    }

    [Fact]
    public void Texts_AreInvariant()
    {
        Assert.Equal("2500 Sm³/h, 3 % O2, stack 180 °C, air 20 °C", Full.ToString());
        Assert.Matches(@"^\d+\.\d+ MW absorbed, 41\.0 % of it by convection, 8\d\.\d % of the gross release$", Model.Burn(Full).ToString());
        Assert.StartsWith("Methane 0.94, Ethane 0.03", NaturalGas.ToString(), StringComparison.Ordinal);
    }

    private static void Says(string what, Func<object> make) => Assert.Contains(what, Assert.ThrowsAny<ArgumentException>(make).Message, StringComparison.Ordinal);

    private static FuelShare Part(GasComponent component, double share) => new(component, Ratio.FromDecimalFractions(share));

    private static FiringConditions Conditions(double perHour, double oxygen, double stack, double air) =>
        new(VolumeFlow.FromCubicMetersPerHour(perHour), Ratio.FromPercent(oxygen), Temperature.FromDegreesCelsius(stack), Temperature.FromDegreesCelsius(air));

    private static HeatModel Lossless(FuelGas fuel) => new(fuel, Full, Ratio.Zero, Ratio.FromPercent(41));

    private static Ratio MethaneOxygen(double excess) => Ratio.FromDecimalFractions(2 * excess / (((1 + excess) * 2 / 0.209476) - 1));

    private static double RadiantShare(FiredHeat heat) => Watts(heat.Radiant) / Watts(heat.ReleasedNet);

    private static double Watts(Power power) => (double)power.Watts;
}
