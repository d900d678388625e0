using FsCheck.Xunit;
using TwoPhase.HeatTransfer;
using TwoPhase.Holdup;
using TwoPhase.Metering;
using TwoPhase.Passes;
using TwoPhase.Slip;
using TwoPhase.Tests.Passes;
using UnitsNet;

namespace TwoPhase.Tests.Holdup;

public class WaterHoldupTests
{
    private static readonly PassProfile Profile = SteadyState.FindHeat(ExamplePass.Pass, ExamplePass.Conditions, MassFraction.FromPercent(78));

    [Fact]
    public void Of_TypicalPass_AddsUp()
    {
        WaterHoldup holdup = WaterHoldup.Of(Profile);
        double total = holdup.Total.Kilograms;
        Approx.Relative(total, holdup.Liquid.Kilograms + holdup.Vapour.Kilograms, 1e-12);
        Approx.Relative(total, holdup.Sections.Sum(section => section.Total.Kilograms), 1e-12);
        Approx.Relative(total, holdup.UpstreamOfOnset.Kilograms + holdup.DownstreamOfOnset.Kilograms, 1e-12);
        Approx.Relative(total / 4.8, holdup.ResidenceTime.Seconds, 1e-12);
        Assert.Equal(["bank", "coil"], holdup.Sections.Select(section => section.Section));
    }

    [Fact]
    public void Of_ColdPass_IsFullOfLiquid()
    {
        PassProfile cold = SteadyState.Solve(ExamplePass.Pass, ExamplePass.Conditions.WithAbsorbedHeat(Power.Zero));
        WaterHoldup holdup = WaterHoldup.Of(cold);
        Assert.Equal(0, holdup.Vapour.Kilograms);
        Approx.Relative(1, holdup.LiquidShareOfVolume.DecimalFractions, 1e-12);
        Approx.Relative(holdup.Total.Kilograms, holdup.UpstreamOfOnset.Kilograms, 1e-15);
        double density = (cold.Inlet.Density.KilogramsPerCubicMeter + cold.Outlet.Density.KilogramsPerCubicMeter) / 2;
        Approx.Relative(density, holdup.Total.Kilograms / ExamplePass.Pass.WaterVolume.CubicMeters, 1e-7);
    }

    [Fact]
    public void OfEveryModel_FasterVapour_LeavesMoreLiquid()
    {
        IReadOnlyList<WaterHoldup> all = WaterHoldup.OfEveryModel(Profile);
        Assert.Equal(VoidFractionModel.All.Count, all.Count);
        double homogeneous = all.Single(holdup => holdup.Slip == VoidFractionModel.Homogeneous).Total.Kilograms;
        foreach (VoidFractionModel slip in new[] { VoidFractionModel.Zivi, VoidFractionModel.Smith, VoidFractionModel.Steiner, VoidFractionModel.Fauske })
        {
            Assert.True(WaterHoldup.Of(Profile, slip).Total.Kilograms > homogeneous, slip.Name);
        }
    }

    [Fact]
    public void Of_OwnSlipOfTheProfile_IsTheDefault() =>
        Assert.Equal(WaterHoldup.Of(Profile, VoidFractionModel.Steiner).Total.Kilograms, WaterHoldup.Of(Profile).Total.Kilograms);

    [Fact]
    public void Of_WithSubcooledVapour_HoldsALittleLess()
    {
        // Saha and Zuber with Levy's profile at 100 kW/m² move the holdup of such a pass by less than 1 %.
        WaterHoldup plain = WaterHoldup.Of(Profile), subcooled = WaterHoldup.Of(Profile, VoidFractionModel.Steiner, NetVapourModel.SahaZuber);
        Assert.InRange(subcooled.Total.Kilograms / plain.Total.Kilograms, 0.99, 0.9999);
        Assert.True(subcooled.UpstreamOfOnset < plain.UpstreamOfOnset);
        Assert.Same(NetVapourModel.SahaZuber, subcooled.Subcooled);
        Assert.Null(plain.Subcooled);
    }

    [Fact]
    public void Of_WithSubcooledVapour_ColdPass_IsFullOfLiquid()
    {
        PassProfile cold = SteadyState.Solve(ExamplePass.Pass, ExamplePass.Conditions.WithAbsorbedHeat(Power.Zero));
        Assert.Equal(WaterHoldup.Of(cold).Total.Kilograms, WaterHoldup.Of(cold, VoidFractionModel.Steiner, NetVapourModel.SahaZuber).Total.Kilograms);
    }

    [Fact]
    public void ReadingError_OfAHoldupThatLeavesEvenly_IsWhatAHomogeneousMeterReads()
    {
        PassProfile after = SteadyState.Solve(ExamplePass.Pass, Profile.Conditions with { RawAbsorbedHeat = Profile.Conditions.RawAbsorbedHeat * 1.001 });
        HoldupChange change = WaterHoldup.Of(Profile).ChangeTo(WaterHoldup.Of(after));
        Assert.True(change.Total.Kilograms < 0);

        // The same by the meter: what flows out makes the differential, the quality is read with what flows in. No expansibility
        // in the closed form, so a meter constant without any.
        const double seconds = 60;
        var meter = new QualityMeter(new SiteConstantMeter(Area.FromSquareMillimeters(1500)), WetSteamModel.Homogeneous);
        MassFlow outflow = MassFlow.FromKilogramsPerSecond(4.8 - (change.Total.Kilograms / seconds));
        Pressure differential = meter.Differential(outflow, Profile.Outlet.Pressure, Profile.OutletQuality);
        double indicated = meter.Quality(MassFlow.FromKilogramsPerSecond(4.8), Profile.Outlet.Pressure, differential).Quality.DecimalFractions;
        Approx.Relative(indicated - 0.78, change.ReadingError(Duration.FromSeconds(seconds)).DecimalFractions, 1e-3);
    }

    [Fact]
    public void ReadingError_ShorterThanTheWaterAllows_ThrowsNamingTheTime()
    {
        PassProfile colder = SteadyState.Solve(ExamplePass.Pass, Profile.Conditions with { RawAbsorbedHeat = Profile.Conditions.RawAbsorbedHeat * 0.8 });
        HoldupChange change = WaterHoldup.Of(Profile).ChangeTo(WaterHoldup.Of(colder));
        Assert.Contains("Time of the change = 1 s", Assert.Throws<ArgumentOutOfRangeException>(() => change.ReadingError(Duration.FromSeconds(1))).Message, StringComparison.Ordinal);
        Assert.Throws<ArgumentOutOfRangeException>(() => change.ReadingError(Duration.Zero));
    }

    [Property(MaxTest = 40)]
    public bool Total_MoreFiring_IsLess_MoreFlow_IsMore(byte heat, byte flow)
    {
        PassConditions conditions = ExamplePass.Conditions.WithAbsorbedHeat(Power.FromMegawatts(6 + (heat / 100.0))).WithFeedFlow(MassFlow.FromKilogramsPerSecond(4 + (flow / 255.0)));
        double here = Held(conditions);
        return Held(conditions with { RawAbsorbedHeat = conditions.RawAbsorbedHeat * 1.02 }) < here && Held(conditions with { RawFeedFlow = conditions.RawFeedFlow * 1.02 }) > here;

        static double Held(PassConditions conditions) => WaterHoldup.Of(SteadyState.Solve(ExamplePass.Pass, conditions)).Total.Kilograms;
    }
}
