using FsCheck;
using FsCheck.Fluent;
using FsCheck.Xunit;
using TwoPhase.Dynamics;
using TwoPhase.Holdup;
using TwoPhase.Metering;
using TwoPhase.Passes;
using TwoPhase.Steam;
using TwoPhase.Tests.Support;
using UnitsNet;
using static TwoPhase.Tests.Dynamics.Simulations;

namespace TwoPhase.Tests.Dynamics;

public class LightOffTests
{
    private const double Volume = Math.PI / 4 * 0.0779 * 0.0779 * 671;

    // The tubes of the invented pass: 88.9 mm outside, 77.9 mm inside, 7850 kg/m³ and 550 J/(kg·K) at 200 °C (common practice, no source).
    private const double Metal = Math.PI / 4 * ((0.0889 * 0.0889) - (0.0779 * 0.0779)) * 671 * 7850 * 550;

    private static readonly LightOffReport High = Warm(9.6).Run(MeteredPass), Low = Warm(2).Run(MeteredPass);

    // By hand. What leaves at t took up the heat of the time it was in the pass, half of that before in the mean: it boils when the heat of
    // half a passage ago suffices for the feed. A passage is (M + C/cp)/ṁ, since the metal must be warmed too.
    [Theory]
    [InlineData(9.6), InlineData(14)]
    public void Run_FirstBoiling_IsWhenTheEnergyBalanceSays(double megapascals)
    {
        LightOff course = Warm(megapascals);
        LightOffReport report = megapascals == 9.6 ? High : course.Run(MeteredPass);
        var pressure = Pressure.FromMegapascals(megapascals);
        double feed = SteamState.FromPressureTemperature(pressure, Start.FeedTemperature!.Value).SpecificEnthalpy.JoulesPerKilogram, boiling = Saturation.FromPressure(pressure).Liquid.SpecificEnthalpy.JoulesPerKilogram;
        double flow = Start.FeedFlow.KilogramsPerSecond, full = (double)course.Running.AbsorbedHeat.Watts, wanted = flow * (boiling - feed);
        double rampAt = course.RampBegins.Seconds + ((wanted / full) - 0.2) / 0.8 * (course.RampEnds - course.RampBegins).Seconds;
        SteamState middle = SteamState.FromPressureEnthalpy(pressure, SpecificEnergy.FromJoulesPerKilogram((feed + boiling) / 2));
        double heated = (Volume * middle.Density.KilogramsPerCubicMeter) + (Metal / middle.IsobaricHeatCapacity!.Value.JoulesPerKilogramKelvin);
        Approx.Relative(rampAt + (heated / flow / 2), report.FirstBoiling!.Value.Seconds, 0.05);
        Assert.Equal(report.FirstBoiling, report.SteamAtOutlet);
    }

    [Theory]
    [InlineData(true), InlineData(false)]
    public void Run_MassSurge_IsWhatIsBetweenLiquidAndSteadyHoldup(bool high)
    {
        LightOffReport report = high ? High : Low;
        PassInstant boils = report.History.First(row => row.BoilingOnset is not null);
        SteamState middle = SteamState.FromPressureEnthalpy(boils.OutletPressure, SpecificEnergy.FromJoulesPerKilogram((SteamState.FromPressureTemperature(boils.OutletPressure, Start.FeedTemperature!.Value).SpecificEnthalpy.JoulesPerKilogram + Saturation.FromPressure(boils.OutletPressure).Liquid.SpecificEnthalpy.JoulesPerKilogram) / 2));
        Approx.Relative(Volume * middle.Density.KilogramsPerCubicMeter, boils.Holdup.Kilograms, 0.02, "liquid");
        double steady = WaterHoldup.Of(SteadyState.Solve(MeteredPass, report.Course.Running)).Total.Kilograms;
        Approx.Relative(boils.Holdup.Kilograms - steady, report.MassSurge.Kilograms, 0.03, "surge");
        Approx.Relative(report.MassSurge.Kilograms / Saturation.FromPressure(boils.OutletPressure).Liquid.Density.KilogramsPerCubicMeter, report.VolumeSurge.CubicMeters, 1e-6, "volume");
    }

    // A little steam takes more room at low pressure (common practice, no source).
    [Fact]
    public void Run_AtTwoMegapascals_SurgesNearlyTwiceAsMuch() => Assert.InRange(Low.MassSurge / High.MassSurge, 1.6, 2.0);

    [Fact]
    public void Run_Events_ComeInTheirOrder()
    {
        foreach (LightOffReport report in new[] { High, Low })
        {
            Duration?[] times = [report.Course.Ignition, report.FirstBoiling, report.TimeOfPeak, report.DownstreamHalfBoils, report.SurgeOver, report.Steady, report.Course.Length];
            Assert.All(times.Zip(times.Skip(1)), pair => Assert.True(pair.First < pair.Second, $"{pair.First} {pair.Second}"));
            Assert.True(report.PeakOutletFlow > report.Course.Running.FeedFlow * 1.3);
            Assert.Contains("burner-management", report.Cautions[0], StringComparison.Ordinal);
        }
    }

    [Fact]
    public void Run_ToTheEnd_ComesToTheSteadyStateAndClosesItsBooks()
    {
        foreach (LightOffReport report in new[] { High, Low })
        {
            Assert.Equal(SimulationEnd.Completed, report.History.End);
            Approx.Absolute(0.78, report.History[^1].TrueQuality.DecimalFractions, 1e-3);
            double gone = report.History[0].Holdup.Kilograms - report.History[^1].Holdup.Kilograms;
            Approx.Relative(gone, (report.SwollenOut + report.MassSurge).Kilograms, 0.02);
            Assert.All(report.History, row => Approx.Absolute(0, row.MassResidual, 1e-9));
            Assert.All(report.History, row => Approx.Absolute(0, row.EnergyResidual, 1e-9));
        }
    }

    [Fact]
    public void Run_WithoutLowFire_DoesNotBoilBeforeTheRamp()
    {
        LightOffReport report = new LightOff(Running(2), Ratio.Zero, Seconds(1200), Seconds(600)).Run(MeteredPass);
        Assert.True(report.FirstBoiling > report.Course.RampBegins);
        Approx.Relative(report.History[0].Holdup.Kilograms, report.History.Last(row => row.Time <= report.Course.RampBegins).Holdup.Kilograms, 1e-9);
    }

    [Fact]
    public void Run_HeatThatDoesNotSuffice_NeverBoils()
    {
        LightOffReport report = new LightOff(Start.WithAbsorbedHeat(Start.AbsorbedHeat * 0.3m), Ratio.FromPercent(20), Seconds(300), Seconds(300)).Run(MeteredPass);
        Assert.Null(report.FirstBoiling);
        Assert.Null(report.SteamAtOutlet);
        Assert.Null(report.SurgeOver);
        Assert.Equal(0, report.MassSurge.Kilograms);
        Assert.True(report.SwollenOut.Kilograms > 100);
    }

    [Fact]
    public void Run_TransmitterTooSmallForTheSurge_SaysWhenItIsAtItsCeiling()
    {
        Pressure largest = High.History.Where(row => row.Differential is not null).Max(row => row.Differential!.Value);
        LightOffReport small = Warm(9.6).WithTransmitter(new(largest * 0.8, TransmitterCharacteristic.Linear)).Run(MeteredPass), wide = Warm(9.6).WithTransmitter(new(largest * 1.1, TransmitterCharacteristic.Linear)).Run(MeteredPass);
        HistorySpan span = Assert.Single(small.AtCeiling);
        Assert.True(span.To > span.From);
        Assert.Contains(small.Cautions, caution => caution.Contains($"ceiling from {span}", StringComparison.Ordinal));
        Assert.Empty(wide.AtCeiling);
    }

    [Property(MaxTest = 12)]
    public FsCheck.Property Run_AnyCourse_EndsAtRest() => Prop.ForAll(Gen.ArrayOf(Gen.Choose(0, 1000).Select(value => value / 1000.0), 4).ToArbitrary(), choice =>
    {
        LightOff course = new LightOff(Running(5 + (9 * choice[0])), Ratio.FromDecimalFractions(0.4 * choice[1]), Seconds(900 * choice[2]), Seconds(200 + (1200 * choice[3]))).WithWaterTemperature(Temperature.FromDegreesCelsius(20 + (150 * choice[1])));
        LightOffReport report = course.Run(MeteredPass, SimulatorOptions.Default.WithCells(40));
        Assert.Equal(SimulationEnd.Completed, report.History.End);
        Approx.Absolute(0.78, report.History[^1].TrueQuality.DecimalFractions, 5e-3);
        Assert.InRange(report.MassSurge.Kilograms, 300, 2000);
        Assert.True(report.FirstBoiling < report.SurgeOver && report.SurgeOver <= report.Steady);
        Assert.All(report.History, row => Approx.Absolute(0, row.EnergyResidual, 1e-9));
    });

    [Fact]
    public void Constructor_BadInput_ThrowsNamingTheValue()
    {
        Assert.Contains("1.2", Assert.Throws<ArgumentOutOfRangeException>(() => new LightOff(Start, Ratio.FromPercent(120), Seconds(1), Seconds(1))).Message, StringComparison.Ordinal);
        Assert.Contains("-5", Assert.Throws<ArgumentOutOfRangeException>(() => new LightOff(Start, Ratio.FromPercent(20), Seconds(-5), Seconds(1))).Message, StringComparison.Ordinal);
        Assert.Throws<ArgumentOutOfRangeException>(() => Warm(9.6).WithSettling(Duration.Zero));
        Assert.Throws<ArgumentOutOfRangeException>(() => Warm(9.6).WithWaterTemperature(Temperature.FromDegreesCelsius(400)).Run(MeteredPass));
    }

    private static PassConditions Running(double megapascals) =>
        SteadyState.FindHeat(MeteredPass, Start.WithOutletPressure(Pressure.FromMegapascals(megapascals)), MassFraction.FromPercent(78)).Conditions;

    private static LightOff Warm(double megapascals) => new(Running(megapascals), Ratio.FromPercent(20), Seconds(600), Seconds(1200));
}
