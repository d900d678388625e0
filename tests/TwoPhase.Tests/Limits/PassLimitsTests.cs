using FsCheck.Xunit;
using TwoPhase.Flow;
using TwoPhase.Limits;
using TwoPhase.Metering;
using TwoPhase.Passes;
using TwoPhase.Tests.Passes;
using UnitsNet;

namespace TwoPhase.Tests.Limits;

public class PassLimitsTests
{
    private static readonly PassProfile Profile = SteadyState.FindHeat(ExamplePass.Pass, ExamplePass.Conditions, MassFraction.FromPercent(78));

    private static readonly QualityMeter Meter = new(new ClassicalVenturi(Length.FromMillimeters(77.9), Length.FromMillimeters(49), ConvergentFinish.Machined), WetSteamModel.Homogeneous);

    private static readonly DifferentialPressureTransmitter Transmitter = new(Pressure.FromKilopascals(75), TransmitterCharacteristic.Linear);

    private static readonly SiteLimits Site = SiteLimits.Default
        .WithOutletQuality(MassFraction.FromPercent(80))
        .WithSolids(SolidsLimit.Dissolved(Milligrams(8000), Milligrams(50000)), SolidsLimit.Silica(Milligrams(50), Milligrams(300)))
        .WithMetalTemperature(Temperature.FromDegreesCelsius(400))
        .WithErosionFactor(150)
        .WithTransmitter(Transmitter)
        .WithFlowRange(MassFlow.FromKilogramsPerSecond(2), MassFlow.FromKilogramsPerSecond(7));

    // A radiant coil whose flux runs from 100 to 60 kW/m² over 335.5 m, behind a bank that takes the rest: healthy at 0.78 all over the trade (common practice, no source).
    private static PassProfile Healthy()
    {
        PassConditions conditions = ExamplePass.Conditions.WithOutletPressure(Pressure.FromMegapascals(10));
        double coil = 80e3 * Math.PI * 0.0779 * 335.5;
        Pass pass = ExamplePass.Pass.WithMeter(Meter);
        Power heat = SteadyState.FindHeat(pass, conditions, MassFraction.FromPercent(78)).Conditions.AbsorbedHeat;
        Ratio share = Ratio.FromDecimalFractions(coil / (double)heat.Watts);
        pass = pass.WithHeat(new(new SectionHeat("bank", Ratio.FromDecimalFractions(1 - share.DecimalFractions)), new SectionHeat("coil", share, new FluxPoint(Ratio.Zero, 1.25), new FluxPoint(Ratio.FromPercent(100), 0.75))));
        return SteadyState.FindHeat(pass, conditions, MassFraction.FromPercent(78));
    }

    [Fact]
    public void Of_HealthyPassAtSeventyEight_RaisesNoAlarm()
    {
        PassLimits limits = PassLimits.Of(Healthy(), Site);
        Assert.Empty(limits.Beyond);
        Assert.Equal(LimitStatus.Within, limits.Headline.Status);
        Approx.Absolute(0.02, ((MassFraction)limits.Headline.Margin!).DecimalFractions, 1e-9);
        Assert.All(limits, row => Assert.NotEqual(LimitStatus.NotApplicable, row.Status));
    }

    [Fact]
    public void Critical_HealthyPassAtSeventyEight_IsAnIndicatorOutsideItsRangeWithASmallRiseOfTheMetal()
    {
        PassLimits limits = PassLimits.Of(Healthy(), Site);
        CriticalIndicator critical = limits.Critical!;

        // Kon'kov at 60 to 100 kW/m², 10 MPa, 1000 kg/(m²·s), 78 mm: 0.56 to 0.67, against 0.78 run safely.
        Assert.InRange(critical.Mean.CriticalQuality.DecimalFractions, 0.56, 0.67);
        Assert.True(critical.Mean.IsReached);
        Assert.True(critical.Applicability.Exceeded.HasFlag(ApplicabilityLimits.Bore));
        Assert.InRange(critical.Mean.HotterBy.Kelvins, 10, 30);
        Assert.True(critical.Top.Position < critical.Mean.Position);
        Assert.True(critical.Bottom.CriticalQuality > critical.Mean.CriticalQuality);

        LimitFinding row = limits.First(row => row.Kind == LimitKind.CriticalQuality);
        Assert.Equal(LimitStatus.Indicator, row.Status);
        Assert.True(((MassFraction)row.Margin!).DecimalFractions < -0.1);
        Assert.Contains("outside its range: Bore", row.Reason, StringComparison.Ordinal);
        Assert.Contains("K hotter", row.Reason, StringComparison.Ordinal);
        Assert.Contains("no alarm", row.ToString(), StringComparison.Ordinal);
    }

    [Fact]
    public void Effects_OutletQuality_FollowTheEnergyBalance()
    {
        // x = (h_in + Q/ṁ − h′)/hfg: +1 % of heat 1.29 points, +1 % of flow −1.28, +1 K of feed 0.33, at 10 MPa and 0.78 (by hand); here at 9.6 MPa.
        LimitFinding headline = PassLimits.Of(Profile, Site).Headline;
        Approx.Relative(-1.29, Points(headline, LimitInput.Heat), 0.03);
        Approx.Relative(1.28, Points(headline, LimitInput.FeedFlow), 0.03);
        Approx.Relative(-0.33, Points(headline, LimitInput.FeedTemperature), 0.03);
        Assert.Equal(LimitInput.Heat, headline.MovedMostBy);

        static double Points(LimitFinding row, LimitInput input) => ((MassFraction)row.Effects.Single(effect => effect.Input == input).Change!).DecimalFractions * 100;
    }

    [Fact]
    public void MovedMostBy_MetalTemperature_IsScale() =>
        Assert.Equal(LimitInput.Scale, Row(PassLimits.Of(Profile, Site), LimitKind.MetalTemperature).MovedMostBy);

    [Fact]
    public void MetalTemperature_OfThePass_IsTheHottestHeatedRow()
    {
        LimitFinding row = Row(PassLimits.Of(Profile, Site.WithFluxPeak(1.6)), LimitKind.MetalTemperature);
        double hottest = Enumerable.Range(0, Profile.Count).Max(i => Profile.WallAt(i, 1.6).Temperatures.OutsideMetal.Kelvins);
        Approx.Absolute(hottest, ((Temperature)row.Value!).Kelvins, 1e-9);
        Approx.Absolute(673.15 - hottest, ((TemperatureDelta)row.Margin!).Kelvins, 1e-9);
        Assert.Equal("coil", row.Section);
        Assert.Equal(LimitStatus.Beyond, Row(PassLimits.Of(Profile, Site.WithFluxPeak(1.6).WithMetalTemperature(Temperature.FromKelvins(hottest - 1))), LimitKind.MetalTemperature).Status);
    }

    [Fact]
    public void ErosionalVelocity_OfThePass_IsTheFormulaInItsOwnUnits()
    {
        // u = C/√ρ in ft/s and lb/ft³, API RP 14E equation 2.14; at the outlet, where G √v is greatest.
        LimitFinding row = Row(PassLimits.Of(Profile, Site), LimitKind.ErosionalVelocity);
        ProfilePoint outlet = Profile.Outlet;
        FlowState flow = Profile.FlowAt(Profile.Count - 1).State;
        double density = 1 / ((flow.Quality / flow.VapourDensity) + ((1 - flow.Quality) / flow.LiquidDensity));
        Approx.Relative(150 / Math.Sqrt(density / 16.018463), ((Speed)row.Limit!).FeetPerSecond, 1e-6);
        Approx.Relative(outlet.MassFlux.KilogramsPerSecondPerSquareMeter / density, ((Speed)row.Value!).MetersPerSecond, 1e-6);
        Approx.Absolute(671, row.Position!.Value.Meters, 1e-9);
    }

    [Fact]
    public void Differential_OfThePass_IsWhatTheMeterWouldShow()
    {
        PassProfile profile = SteadyState.FindHeat(ExamplePass.Pass.WithMeter(Meter), ExamplePass.Conditions, MassFraction.FromPercent(78));
        double shown = Meter.Differential(ExamplePass.Conditions.FeedFlow, profile.Outlet.Pressure, MassFraction.FromPercent(78)).Kilopascals;
        LimitFinding upper = Row(PassLimits.Of(profile, Site), LimitKind.Differential);
        Approx.Relative(shown, ((Pressure)upper.Value!).Kilopascals, 1e-9);
        Approx.Relative(75 - shown, ((Pressure)upper.Margin!).Kilopascals, 1e-9);

        LimitFinding beyond = Row(PassLimits.Of(profile, Site.WithTransmitter(new(Pressure.FromKilopascals(40), TransmitterCharacteristic.Linear))), LimitKind.Differential);
        Assert.Equal(LimitStatus.Beyond, beyond.Status);
        LimitFinding lower = Row(PassLimits.Of(SteadyState.FindHeat(profile.Pass, ExamplePass.Conditions.WithFeedFlow(MassFlow.FromKilogramsPerSecond(2)), MassFraction.FromPercent(78)), Site.WithTransmitter(Transmitter.WithLowCutoff(Ratio.FromPercent(5)))), LimitKind.Differential);
        Assert.Contains("lower end", lower.Reason, StringComparison.Ordinal);
        Approx.Relative(3.75, ((Pressure)lower.Limit!).Kilopascals, 1e-12);
    }

    [Fact]
    public void Solids_OfThePass_AreLimitsOfQuality()
    {
        PassLimits limits = PassLimits.Of(Profile, Site);
        LimitFinding silica = limits.Single(row => row.Name == "silica");
        Approx.Relative(1 - (50.0 / 300), ((MassFraction)silica.Limit!).DecimalFractions, 1e-12);
        Approx.Relative(1 / 0.22, limits.ConcentrationFactor!.Value, 1e-9);
        Assert.Contains("227.3 mg/L of 300 mg/L", silica.Reason, StringComparison.Ordinal);
    }

    [Fact]
    public void Stratification_QuarterLoad_IsNear_AndBelowItTheTopRunsDry()
    {
        // At full load the margin is the factor by which flow may fall, so it must be spent at about that factor.
        double full = Margin(4.8), factor = full + 1;
        Assert.InRange(factor, 4, 8);
        Assert.InRange(Margin(4.8 / factor), -0.15, 0.15);
        Assert.Equal(LimitStatus.Beyond, Row(PassLimits.Of(At(4.8 / factor / 1.3), Site), LimitKind.Stratification).Status);

        static PassProfile At(double flow) => SteadyState.FindHeat(ExamplePass.Pass, ExamplePass.Conditions.WithFeedFlow(MassFlow.FromKilogramsPerSecond(flow)), MassFraction.FromPercent(78));
        static double Margin(double flow) => ((Ratio)Row(PassLimits.Of(At(flow), Site), LimitKind.Stratification).Margin!).DecimalFractions;
    }

    [Fact]
    public void Of_SiteThatGivesNothing_SaysWhyEachLimitDoesNotApply()
    {
        PassLimits limits = PassLimits.Of(Profile);
        Approx.Absolute(0.80, ((MassFraction)limits.Headline.Limit!).DecimalFractions, 1e-15);
        Assert.Contains("not confirmed", limits.Headline.Reason, StringComparison.Ordinal);
        foreach ((LimitKind kind, string why) in new[] { (LimitKind.Solids, "no limit of dissolved solids"), (LimitKind.MetalTemperature, "no limit of metal temperature"), (LimitKind.ErosionalVelocity, "no factor C"), (LimitKind.Differential, "no meter"), (LimitKind.FeedFlow, "no range of feed flow") })
        {
            LimitFinding row = Row(limits, kind);
            Assert.Equal(LimitStatus.NotApplicable, row.Status);
            Assert.Contains(why, row.Reason, StringComparison.Ordinal);
            Assert.Contains("not applicable", row.ToString(), StringComparison.Ordinal);
            Assert.Null(row.Margin);
            Assert.Null(row.Section);
            Assert.Empty(row.Effects);
            Assert.Equal(LimitInput.None, row.MovedMostBy);
        }
    }

    [Fact]
    public void Of_ColdPass_HasNoDryoutAndNoStratification()
    {
        PassLimits limits = PassLimits.Of(SteadyState.Solve(ExamplePass.Pass, ExamplePass.Conditions.WithAbsorbedHeat(Power.Zero)), Site);
        Assert.Null(limits.Critical);
        LimitFinding differential = Row(PassLimits.Of(SteadyState.Solve(ExamplePass.Pass.WithMeter(Meter), ExamplePass.Conditions.WithAbsorbedHeat(Power.Zero)), Site), LimitKind.Differential);
        Assert.Contains("subcooled", differential.Reason, StringComparison.Ordinal);
        Assert.Equal(LimitStatus.NotApplicable, Row(limits, LimitKind.Stratification).Status);
        Assert.Contains("no section takes heat", Row(limits, LimitKind.MetalTemperature).Reason, StringComparison.Ordinal);
        Assert.Equal(3, limits.Count(row => row.Kind == LimitKind.CriticalQuality && row.Status == LimitStatus.NotApplicable));
    }

    [Fact]
    public void Of_VerticalTube_DoesNotStratify()
    {
        Pass pass = new("1", [ExamplePass.Tubes("riser", 300).WithInclination(Angle.FromDegrees(90))]);
        PassLimits limits = PassLimits.Of(SteadyState.FindHeat(pass, ExamplePass.Conditions, MassFraction.FromPercent(60)), Site);
        Assert.Contains("within 10°", Row(limits, LimitKind.Stratification).Reason, StringComparison.Ordinal);
        Approx.Relative(limits.Critical!.Mean.CriticalQuality.DecimalFractions, limits.Critical.Top.CriticalQuality.DecimalFractions, 1e-9);
    }

    [Fact]
    public void Of_SuperheatedOutlet_IsBeyondQualityAndSolidsAndDoesNotThrow()
    {
        PassProfile dry = SteadyState.FindHeat(ExamplePass.Pass.WithMeter(Meter), ExamplePass.Conditions, MassFraction.FromPercent(106));
        PassLimits limits = PassLimits.Of(dry, Site);
        Assert.Equal(LimitStatus.Beyond, limits.Headline.Status);
        Assert.Null(limits.ConcentrationFactor);
        Assert.Contains("no water is left", limits.Single(row => row.Name == "silica").Reason, StringComparison.Ordinal);
        Assert.All(limits, row => Assert.NotEqual(LimitStatus.None, row.Status));
    }

    [Fact]
    public void Effects_StepOutOfTheFormulation_AreEmptyNotThrown()
    {
        PassProfile near = SteadyState.FindHeat(ExamplePass.Pass, ExamplePass.Conditions.WithOutletPressure(Pressure.FromMegapascals(21.5)).WithFeedFlow(MassFlow.FromKilogramsPerSecond(3)), MassFraction.FromPercent(60));
        LimitEffect pressure = PassLimits.Of(near, Site).Headline.Effects.Single(effect => effect.Input == LimitInput.OutletPressure);
        PassProfile? moved = null;
        try
        {
            moved = SteadyState.Solve(near.Pass, near.Conditions.WithOutletPressure(near.Conditions.OutletPressure + Pressure.FromMegapascals(0.1)));
        }
        catch (TwoPhase.Numerics.ConvergenceException)
        {
        }

        Assert.Equal(moved is null, pressure.Change is null);
    }

    [Property(MaxTest = 15)]
    public bool Margins_AnyPass_MoveTheRightWay(byte heat, byte flow, byte pressure)
    {
        PassConditions at = ExamplePass.Conditions.WithAbsorbedHeat(Power.FromMegawatts(7 + (heat / 128.0))).WithFeedFlow(MassFlow.FromKilogramsPerSecond(4.5 + (flow / 255.0))).WithOutletPressure(Pressure.FromMegapascals(7 + (pressure / 64.0)));
        PassLimits limits = PassLimits.Of(SteadyState.Solve(ExamplePass.Pass.WithMeter(Meter), at), Site);
        double Effect(LimitFinding row, LimitInput input) => row.Effects.Single(effect => effect.Input == input).RawChange;
        LimitFinding metal = Row(limits, LimitKind.MetalTemperature), erosion = Row(limits, LimitKind.ErosionalVelocity), differential = Row(limits, LimitKind.Differential), dryout = Row(limits, LimitKind.CriticalQuality), silica = limits.Single(row => row.Name == "silica");
        bool lowerEnd = differential.Reason.StartsWith("lower", StringComparison.Ordinal);
        return Effect(limits.Headline, LimitInput.Heat) < 0 && Effect(limits.Headline, LimitInput.FeedFlow) > 0
            && Effect(silica, LimitInput.Heat) < 0 && Effect(silica, LimitInput.FeedTemperature) < 0
            && Effect(dryout, LimitInput.Heat) < 0
            && Effect(metal, LimitInput.Scale) < 0 && Effect(metal, LimitInput.OutletPressure) < 0 && Effect(metal, LimitInput.Heat) < 0
            && Effect(erosion, LimitInput.OutletPressure) > 0 && Effect(erosion, LimitInput.Heat) < 0
            && (Effect(differential, LimitInput.Heat) < 0) != lowerEnd;
    }

    [Fact]
    public void Of_NoProfile_Throws() => Assert.Throws<ArgumentNullException>(() => PassLimits.Of(null!));

    private static MassConcentration Milligrams(double value) => MassConcentration.FromMilligramsPerLiter(value);

    private static LimitFinding Row(PassLimits limits, LimitKind kind) => limits.First(row => row.Kind == kind);
}
