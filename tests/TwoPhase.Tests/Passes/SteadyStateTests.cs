using TwoPhase.Flow;
using TwoPhase.Friction;
using TwoPhase.Numerics;
using TwoPhase.Passes;
using TwoPhase.Slip;
using TwoPhase.Steam;
using UnitsNet;

namespace TwoPhase.Tests.Passes;

public class SteadyStateTests
{
    [Fact]
    public void Solve_TypicalPass_ClosesMassAndEnergy()
    {
        PassProfile profile = SteadyState.Solve(ExamplePass.Pass, ExamplePass.Conditions);
        Approx.Absolute(0, profile.Audit.EnergyResidual, 1e-12);
        Approx.Absolute(0, profile.Audit.MassResidual, 1e-12);
        Assert.True(profile.Audit.GridError < 1e-8, profile.Audit.ToString());
        Approx.Relative(9.6e6, profile.Outlet.Pressure.Pascals, 1e-15);
        Approx.Absolute(171.85, profile.Inlet.Temperature.DegreesCelsius, 1e-5);
        double rise = profile.Outlet.Enthalpy.JoulesPerKilogram - profile.Inlet.Enthalpy.JoulesPerKilogram;
        Approx.Relative(8.2e6 / 4.8, rise, 1e-12);
    }

    [Fact]
    public void Solve_GridError_BoundsTheDistanceToAFinerGrid()
    {
        PassProfile fine = SteadyState.Solve(ExamplePass.Pass, ExamplePass.Conditions, null, SteadyOptions.Default.WithTolerance(1e-11));
        foreach (double tolerance in new[] { 1e-5, 1e-6, 1e-7, 1e-8 })
        {
            PassProfile profile = SteadyState.Solve(ExamplePass.Pass, ExamplePass.Conditions, null, SteadyOptions.Default.WithTolerance(tolerance));
            Assert.True(profile.Audit.GridError < tolerance);
            Assert.True(Math.Abs(profile.Inlet.Pressure.Pascals - fine.Inlet.Pressure.Pascals) <= profile.Audit.GridError * 9.6e6, $"{tolerance}");
        }
    }

    [Fact]
    public void Solve_ColdLine_FollowsDarcyWeisbach()
    {
        // Zero heat, subcooled: Δp = f L/D G²/(2ρ) with Colebrook's f. Density changes by 5e-4 along the line, so at mid pressure.
        Pass pass = new("1", [ExamplePass.Tubes("line", 300)]);
        PassProfile profile = SteadyState.Solve(pass, ExamplePass.Conditions.WithAbsorbedHeat(Power.Zero));
        double pressure = (profile.Inlet.Pressure.Pascals + profile.Outlet.Pressure.Pascals) / 2;
        SteamState water = SteamState.FromPressureEnthalpy(Pressure.FromPascals(pressure), profile.Inlet.Enthalpy);
        double area = Math.PI / 4 * 0.0779 * 0.0779, flux = 4.8 / area;
        double factor = FrictionFactor.Colebrook(flux * 0.0779 / water.DynamicViscosity!.Value.PascalSeconds, 46e-6 / 0.0779);
        Approx.Relative(factor * 300 / 0.0779 * flux * flux / (2 * water.Density.KilogramsPerCubicMeter), profile.PressureDrop.Friction.Pascals, 1e-7);
        Assert.Equal(0, profile.PressureDrop.Gravity.Pascals);
    }

    [Fact]
    public void Solve_VerticalColdLine_AddsTheWeightOfTheWater()
    {
        Pass pass = new("1", [ExamplePass.Tubes("riser", 30).WithInclination(Angle.FromDegrees(90))]);
        PassProfile profile = SteadyState.Solve(pass, ExamplePass.Conditions.WithAbsorbedHeat(Power.Zero), null, SteadyOptions.Default.WithoutFriction());
        double density = profile.Average(row => row.Density.KilogramsPerCubicMeter);
        Approx.Relative(density * 9.80665 * 30, profile.PressureDrop.Total.Pascals, 1e-6);
    }

    [Fact]
    public void Solve_AdiabaticFlashing_KeepsEnthalpyAndFollowsTheSaturationLine()
    {
        // Liquid close to saturation enters an unheated line and flashes as it loses pressure.
        Pass pass = new("1", [ExamplePass.Tubes("line", 400).AsUnheated()]);
        PassConditions conditions = ExamplePass.Conditions.WithAbsorbedHeat(Power.Zero).WithOutletPressure(Pressure.FromMegapascals(5)).WithFeedFlow(MassFlow.FromKilogramsPerSecond(12))
            .WithFeedEnthalpy(SpecificEnergy.FromKilojoulesPerKilogram(1170));
        PassProfile profile = SteadyState.Solve(pass, conditions);
        Assert.True(profile.Inlet.EquilibriumQuality.DecimalFractions < 0);
        Assert.All(profile, row => Approx.Relative(1170e3, row.Enthalpy.JoulesPerKilogram, 1e-14));
        foreach (ProfilePoint row in profile.Where(row => row.EquilibriumQuality.DecimalFractions > 0))
        {
            SteamState state = SteamState.FromPressureEnthalpy(row.Pressure, row.Enthalpy);
            Approx.Absolute(state.EquilibriumQuality!.Value.DecimalFractions, row.EquilibriumQuality.DecimalFractions, 1e-9);
            Approx.Relative(state.Temperature.Kelvins, row.Temperature.Kelvins, 1e-9);
        }

        Assert.Contains(profile, row => Math.Abs(row.EquilibriumQuality.DecimalFractions) < 1e-10);
    }

    [Theory]
    [InlineData(0)]
    [InlineData(2)]
    [InlineData(8.2)]
    [InlineData(10.5)]
    [InlineData(13)]
    public void Solve_FromColdToSuperheated_ClosesAndOrdersItsRows(double megawatts)
    {
        PassProfile profile = SteadyState.Solve(ExamplePass.Pass, ExamplePass.Conditions.WithAbsorbedHeat(Power.FromMegawatts(megawatts)));
        Approx.Absolute(0, profile.Audit.EnergyResidual, 1e-12);
        Assert.True(profile.Audit.GridError < 1e-7, profile.Audit.ToString());
        for (int i = 1; i < profile.Count; i++)
        {
            Assert.True(profile[i].Position >= profile[i - 1].Position);
            Assert.True(profile[i].Pressure <= profile[i - 1].Pressure);
            SteamState state = SteamState.FromPressureEnthalpy(profile[i].Pressure, profile[i].Enthalpy);
            Approx.Relative(state.Temperature.Kelvins, profile[i].Temperature.Kelvins, 1e-9);
        }
    }

    [Fact]
    public void Solve_MomentumOfTheRows_AddsUpToThePressureDrop()
    {
        PassProfile profile = SteadyState.Solve(ExamplePass.Pass, ExamplePass.Conditions);
        double before = Flux(profile.Inlet), after = Flux(profile.Outlet);
        Approx.Relative(after - before, profile.PressureDrop.Acceleration.Pascals, 1e-5);

        static double Flux(ProfilePoint row) => row.MassFlux.KilogramsPerSecondPerSquareMeter
            * ((row.Quality.DecimalFractions * (row.VapourVelocity?.MetersPerSecond ?? 0)) + ((1 - row.Quality.DecimalFractions) * (row.LiquidVelocity?.MetersPerSecond ?? 0)));
    }

    [Fact]
    public void FindHeat_ThenSolve_GivesTheWantedQuality()
    {
        PassProfile found = SteadyState.FindHeat(ExamplePass.Pass, ExamplePass.Conditions, MassFraction.FromPercent(78));
        Approx.Absolute(0.78, found.OutletQuality.DecimalFractions, 1e-12);
        PassProfile again = SteadyState.Solve(ExamplePass.Pass, found.Conditions);
        Approx.Absolute(0.78, again.OutletQuality.DecimalFractions, 1e-9);
    }

    [Fact]
    public void FindFlow_ThenSolve_GivesTheWantedQuality()
    {
        PassProfile found = SteadyState.FindFlow(ExamplePass.Pass, ExamplePass.Conditions, MassFraction.FromPercent(70));
        Assert.True(found.Conditions.FeedFlow > ExamplePass.Conditions.FeedFlow);
        Approx.Absolute(0.70, SteadyState.Solve(ExamplePass.Pass, found.Conditions).OutletQuality.DecimalFractions, 1e-9);
    }

    [Fact]
    public void Solve_AllocatesNothingButTheProfile()
    {
        int rows = SteadyState.Solve(ExamplePass.Pass, ExamplePass.Conditions).Count;
        long bytes = AllocationProbe.Bytes(() => SteadyState.Solve(ExamplePass.Pass, ExamplePass.Conditions));
        long profile = (rows * (long)System.Runtime.CompilerServices.Unsafe.SizeOf<PassNode>()) + 24;
        Assert.InRange(bytes - profile, 0, 400);
    }

    [Fact]
    public void Solve_OutletPressureAboveCritical_NamesSectionValueAndLimit()
    {
        var error = Assert.Throws<ArgumentOutOfRangeException>(() => SteadyState.Solve(ExamplePass.Pass, ExamplePass.Conditions.WithOutletPressure(Pressure.FromMegapascals(23))));
        Assert.Contains("Outlet pressure of section 'coil' = 23 MPa must be below 22.064 MPa", error.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Solve_HeatBeyondTheFormulation_NamesSectionAndHeat()
    {
        var error = Assert.Throws<ArgumentOutOfRangeException>(() => SteadyState.Solve(ExamplePass.Pass, ExamplePass.Conditions.WithAbsorbedHeat(Power.FromMegawatts(40))));
        Assert.Contains("Absorbed heat = 40 MW brings the outlet of section 'coil' to", error.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Solve_PassThatCannotCarryTheFlow_NamesTheSection()
    {
        PassConditions conditions = ExamplePass.Conditions.WithFeedFlow(MassFlow.FromKilogramsPerSecond(25)).WithAbsorbedHeat(Power.FromMegawatts(28)).WithOutletPressure(Pressure.FromMegapascals(19.5));
        var error = Assert.Throws<ConvergenceException>(() => SteadyState.Solve(ExamplePass.Pass, conditions));
        Assert.Contains("section '", error.Message, StringComparison.Ordinal);
        Assert.Contains("critical pressure", error.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Solve_ChokedOutlet_SaysSo()
    {
        PassConditions conditions = ExamplePass.Conditions.WithOutletPressure(Pressure.FromKilopascals(150));
        Assert.Contains("chokes", Assert.Throws<ConvergenceException>(() => SteadyState.Solve(ExamplePass.Pass, conditions)).Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Solve_HeatWithoutHeatedSection_Throws() =>
        Assert.Contains("no section of pass '1' is heated", Assert.Throws<ArgumentException>(() => SteadyState.Solve(new Pass("1", [ExamplePass.Tubes("line", 10).AsUnheated()]), ExamplePass.Conditions)).Message, StringComparison.Ordinal);

    [Fact]
    public void FindHeat_FeedBeyondTheWantedQuality_Throws() =>
        Assert.Throws<ArgumentOutOfRangeException>(() => SteadyState.FindHeat(ExamplePass.Pass, ExamplePass.Conditions, MassFraction.FromDecimalFractions(-0.9)));

    [Theory]
    [MemberData(nameof(Pairs))]
    public void Solve_EveryCorrelation_Closes(string slip, string friction)
    {
        PassModels models = new(VoidFractionModel.All.Single(model => model.Name == slip), FrictionModel.All.Single(model => model.Name == friction));
        PassProfile profile = SteadyState.Solve(ExamplePass.Pass, ExamplePass.Conditions, models);
        Approx.Absolute(0, profile.Audit.EnergyResidual, 1e-12);
        Assert.InRange(profile.PressureDrop.Total.Kilopascals, 200, 2500);
    }

    public static TheoryData<string, string> Pairs
    {
        get
        {
            var data = new TheoryData<string, string>();
            foreach (VoidFractionModel slip in VoidFractionModel.All.Where(slip => slip != VoidFractionModel.Steiner)) data.Add(slip.Name, FrictionModel.MullerSteinhagenHeck.Name);
            foreach (FrictionModel friction in FrictionModel.All) data.Add(VoidFractionModel.Steiner.Name, friction.Name);
            return data;
        }
    }
}
