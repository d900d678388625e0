using FsCheck;
using FsCheck.Fluent;
using FsCheck.Xunit;
using TwoPhase.Friction;
using TwoPhase.Passes;
using TwoPhase.Steam;
using UnitsNet;

namespace TwoPhase.Tests.Passes;

public class SteadyStatePropertyTests
{
    [Property(MaxTest = 100)]
    public FsCheck.Property Solve_AnyPass_ClosesEnergyAndMass() => Prop.ForAll(AnyPass.All(), any =>
    {
        PassConditions conditions = any.TellConditions(Told.Si);
        PassProfile profile = SteadyState.Solve(any.Tell(Told.Si), conditions);
        Approx.Absolute(0, profile.Audit.EnergyResidual, 1e-9);
        Approx.Absolute(0, profile.Audit.MassResidual, 1e-9);
        Assert.True(profile.Audit.GridError < 1e-6, profile.Audit.ToString());

        // The feed as the steam tables have it, plus the heat, is what leaves.
        double fed = SteamState.FromPressureTemperature(profile.Inlet.Pressure, conditions.FeedTemperature!.Value).SpecificEnthalpy.JoulesPerKilogram;
        Approx.Relative(fed + ((double)conditions.AbsorbedHeat.Watts / conditions.FeedFlow.KilogramsPerSecond), profile.Outlet.Enthalpy.JoulesPerKilogram, 1e-9);
    });

    [Property(MaxTest = 60)]
    public FsCheck.Property Solve_AnyPassInImperialUnits_IsTheSame() => Prop.ForAll(AnyPass.All(), any =>
    {
        PassProfile si = SteadyState.Solve(any.Tell(Told.Si), any.TellConditions(Told.Si)), imperial = SteadyState.Solve(any.Tell(Told.Imperial), any.TellConditions(Told.Imperial));
        Approx.Relative(si.Inlet.Pressure.Pascals, imperial.Inlet.Pressure.Pascals, 1e-9, "inlet pressure");
        Approx.Relative(si.Outlet.Enthalpy.JoulesPerKilogram, imperial.Outlet.Enthalpy.JoulesPerKilogram, 1e-9, "outlet enthalpy");
        Approx.Relative(si.Outlet.Density.KilogramsPerCubicMeter, imperial.Outlet.Density.KilogramsPerCubicMeter, 1e-9, "outlet density");
    });

    // Steam, not only the fluid of the closed forms: the halves have borders of their own, so that panels fall elsewhere.
    [Property(MaxTest = 30)]
    public bool Solve_SectionSplitAnywhere_ChangesNothing(byte cut, byte heat)
    {
        double first = 20 + cut;
        PassConditions conditions = ExamplePass.Conditions.WithAbsorbedHeat(Power.FromMegawatts(2 + (heat / 25.0)));
        SteadyOptions fine = SteadyOptions.Default.WithTolerance(1e-11);
        PassProfile whole = SteadyState.Solve(new Pass("1", [ExamplePass.Tubes("a", 671)]), conditions, null, fine);
        PassProfile split = SteadyState.Solve(new Pass("1", [ExamplePass.Tubes("a", first), ExamplePass.Tubes("b", 671 - first)]), conditions, null, fine);
        Approx.Relative(whole.Inlet.Pressure.Pascals, split.Inlet.Pressure.Pascals, 1e-9);
        Approx.Absolute(whole.PressureDrop.Friction.Pascals, split.PressureDrop.Friction.Pascals, 1e-9 * 9.6e6, "friction, as the audit counts: of the outlet pressure");
        return true;
    }

    // At 800 °C two regions of IAPWS-IF97 meet, and the volume steps by 1e-4: at this flow a node falls just there.
    [Fact]
    public void Solve_WhereRegionsOfTheFormulationMeet_StepsOver()
    {
        PassConditions conditions = ExamplePass.Conditions.WithFeedFlow(MassFlow.FromKilogramsPerSecond(0.5 * Math.Pow(12, 0.625) * 0.999));
        PassProfile profile = SteadyState.Solve(ExamplePass.Pass, conditions, null, SteadyOptions.Default.WithTolerance(1e-9));
        Assert.InRange(profile.Outlet.Temperature.DegreesCelsius, 800, 860);
        Assert.True(profile.Audit.GridError < 1e-8, profile.Audit.ToString());
    }

    // A thread keeps its nodes for the next pass: nothing of the last one may show.
    [Fact]
    public void Solve_AfterAnotherPass_IsTheSameToTheLastDigit()
    {
        PassConditions other = ExamplePass.Conditions.WithFeedTemperature(Temperature.FromDegreesCelsius(172)).WithOutletPressure(Pressure.FromMegapascals(9));
        double first = SteadyState.Solve(ExamplePass.Pass, ExamplePass.Conditions).Inlet.Pressure.Pascals;
        foreach (double megawatts in new[] { 0, 5.5, 8.2, 12 })
        {
            SteadyState.Solve(ExamplePass.Pass, other.WithAbsorbedHeat(Power.FromMegawatts(megawatts)));
            Assert.Equal(first, SteadyState.Solve(ExamplePass.Pass, ExamplePass.Conditions).Inlet.Pressure.Pascals);
        }
    }

    // Water: Δp = K G²/(2 ρ). Wet steam: enthalpy stays, so the quality at the tube end follows from the pressure there.
    [Theory]
    [InlineData(0)]
    [InlineData(8.2)]
    public void Solve_OutletLine_LosesPressureAndKeepsEnthalpy(double megawatts)
    {
        var line = new OutletLine(Length.FromMillimeters(70), 4, Volume.FromLiters(60));
        PassConditions conditions = ExamplePass.Conditions.WithAbsorbedHeat(Power.FromMegawatts(megawatts));
        PassProfile profile = SteadyState.Solve(ExamplePass.Pass.WithOutletLine(line), conditions, null, SteadyOptions.Default.WithoutAcceleration());
        ProfilePoint end = profile.Last(row => row.Section == "coil"), outlet = profile.Outlet;
        Assert.Equal(conditions.OutletPressure, outlet.Pressure);
        Approx.Relative(end.Enthalpy.JoulesPerKilogram, outlet.Enthalpy.JoulesPerKilogram, 1e-14);
        double flux = 4.8 / (Math.PI / 4 * 0.07 * 0.07);
        double volume = (1 / SteamState.FromPressureEnthalpy(end.Pressure, end.Enthalpy).Density.KilogramsPerCubicMeter) + (1 / SteamState.FromPressureEnthalpy(outlet.Pressure, outlet.Enthalpy).Density.KilogramsPerCubicMeter);
        Approx.Relative(4 * flux * flux * volume / 4, end.Pressure.Pascals - outlet.Pressure.Pascals, 1e-5, "mean volume: it falls by 1 % along the line");
        Approx.Absolute(SteamState.FromPressureEnthalpy(end.Pressure, end.Enthalpy).EquilibriumQuality!.Value.DecimalFractions, end.EquilibriumQuality.DecimalFractions, 1e-9);
    }

    // Twelve bends in an unheated line: what twelve times LocalLoss says of one, at the quality in the middle.
    [Theory]
    [InlineData(-0.1)]
    [InlineData(0.3)]
    [InlineData(0.8)]
    public void Solve_ReturnBends_LoseByChisholmsB(double quality)
    {
        Saturation steam = Saturation.FromPressure(Pressure.FromMegapascals(9.6));
        SpecificEnergy enthalpy = SpecificEnergy.FromJoulesPerKilogram(steam.Liquid.SpecificEnthalpy.JoulesPerKilogram + (quality * steam.LatentHeat.JoulesPerKilogram));
        Pass pass = new("1", [ExamplePass.Tubes("line", 5).AsUnheated().WithReturnBends(12, Length.FromMillimeters(114), 0.3)]);
        PassProfile profile = SteadyState.Solve(pass, ExamplePass.Conditions.WithAbsorbedHeat(Power.Zero).WithFeedEnthalpy(enthalpy));
        int middle = profile.Count / 2;
        double one = quality > 0
            ? LocalLoss.Of(profile.FlowAt(middle), 0.3, LocalLoss.BendB(0.3, 114 / 77.9)).Pascals
            : LocalLoss.Of(profile[middle].MassFlux, profile[middle].Density, 0.3).Pascals;
        Approx.Relative(12 * one, profile.PressureDrop.Fittings.Pascals, 1e-4);
    }
}
