using TwoPhase.Flow;
using TwoPhase.Metering;
using TwoPhase.Units;
using UnitsNet;
using UnitsNet.Units;

namespace TwoPhase.Tests.Metering;

/// <summary>Bad input, one test a kind: an exception that names value, unit and limit at the doors; NaN and a status in columns.</summary>
public class QualityMeterInputTests
{
    private static readonly QualityMeter Meter = new(new ClassicalVenturi(Length.FromMillimeters(77.9), Length.FromMillimeters(49), ConvergentFinish.Machined), WetSteamModel.ReaderHarrisGraham);
    private static readonly MassFlow Flow = MassFlow.FromKilogramsPerSecond(4.8);
    private static readonly Pressure Static = Pressure.FromMegapascals(10), Difference = Pressure.FromKilopascals(40);
    private static readonly MassFraction Wet = MassFraction.FromDecimalFractions(0.8);

    [Theory]
    [InlineData(0)]
    [InlineData(-1.5)]
    public void Flow_NotPositive_Throws(double flow)
    {
        MassFlow bad = MassFlow.FromKilogramsPerSecond(flow);
        Expect($"Mass flow = {flow.ToString(System.Globalization.CultureInfo.InvariantCulture)} kg/s must be greater than zero", "flow", () => Meter.Quality(bad, Static, Difference));
        Expect("must be greater than zero", "flow", () => Meter.Differential(bad, Static, Wet));
    }

    [Theory]
    [InlineData(-0.1)]
    [InlineData(0)]
    [InlineData(0.0005)]
    [InlineData(22.1)]
    public void Pressure_OffTheSaturationLine_Throws(double megapascals)
    {
        Pressure bad = Pressure.FromMegapascals(megapascals);
        const string limits = "must lie between 0.0006112";
        Expect(limits, "pressure", () => Meter.Quality(Flow, bad, Difference));
        Expect(limits, "pressure", () => Meter.Differential(Flow, bad, Wet));
        Expect("22.064 MPa", "pressure", () => Meter.TotalFlow(bad, Wet, Difference));
    }

    [Theory]
    [InlineData(0)]
    [InlineData(-40)]
    public void Differential_NotPositive_Throws(double kilopascals)
    {
        Pressure bad = Pressure.FromKilopascals(kilopascals);
        Expect("Differential pressure = ", "differential", () => Meter.Quality(Flow, Static, bad));
        Expect("must be greater than zero", "differential", () => Meter.TotalFlow(Static, Wet, bad));
    }

    [Fact]
    public void Differential_NotBelowStaticPressure_AsksWhetherTheyWereSwapped()
    {
        Expect("were the two swapped?", "differential", () => Meter.Quality(Flow, Difference, Static));
        Expect("Differential pressure = 10000 kPa is not below the static pressure 40 kPa", "differential", () => Meter.TotalFlow(Difference, Wet, Static));
    }

    [Theory]
    [InlineData(80, "per cent")]
    [InlineData(-3, "no effective volume")]
    public void Quality_WhereNoneCanBe_Throws(double quality, string message)
    {
        MassFraction bad = MassFraction.FromDecimalFractions(quality);
        Expect(message, "quality", () => Meter.Differential(Flow, Static, bad));
        Expect(message, "quality", () => Meter.TotalFlow(Static, bad, Difference));
    }

    [Fact]
    public void Flow_BeyondChoking_ThrowsNamingFlowAndCeiling() =>
        Expect("Mass flow = 48 kg/s would need a differential above 3200 kPa", "flow", () => Meter.Differential(MassFlow.FromKilogramsPerSecond(48), Static, Wet));

    [Fact]
    public void Columns_EveryKindOfBadSample_GivesNaNAndItsStatusAndGoesOn()
    {
        double[] flow = [4.8, double.NaN, 0, -1, double.PositiveInfinity, 4.8, 4.8, 4.8, 4.8, 4.8, 4.8, 4.8];
        double[] pressure = [10, 10, 10, 10, 10, double.NaN, -1, 25, 10, 10, 0.04, 10];
        double[] differential = [40, 40, 40, 40, 40, 40, 40, 40, double.NaN, -2, 45, 40];
        ReadingStatus[] expected =
        [
            ReadingStatus.WetSteam, ReadingStatus.Missing, ReadingStatus.FlowOutOfRange, ReadingStatus.FlowOutOfRange, ReadingStatus.FlowOutOfRange, ReadingStatus.Missing,
            ReadingStatus.PressureOutOfRange, ReadingStatus.PressureOutOfRange, ReadingStatus.Missing, ReadingStatus.DifferentialOutOfRange, ReadingStatus.DifferentialOutOfRange, ReadingStatus.WetSteam,
        ];
        foreach (QualityMeter meter in new[] { Meter, new QualityMeter(QualityMeterTests.SiteConstant(), WetSteamModel.Homogeneous), new QualityMeter(QualityMeterTests.SiteConstant(), WetSteamModel.Murdock) })
        {
            var quality = new double[flow.Length];
            var status = new ReadingStatus[flow.Length];
            var applicability = new Applicability[flow.Length];
            meter.Quality(Column.Of(flow, MassFlowUnit.KilogramPerSecond), Column.Of(pressure, PressureUnit.Megapascal), Column.Of(differential, PressureUnit.Kilopascal), quality, status);
            Assert.Equal(expected, status);
            Assert.Equal(expected.Select(s => s != ReadingStatus.WetSteam), quality.Select(double.IsNaN));
            Assert.Equal(quality[0], quality[^1]);
            Assert.Equal(meter.Quality(Flow, Static, Difference).Quality.DecimalFractions, quality[0], 12);

            double[] again = new double[flow.Length];
            meter.Quality(Column.Of(flow, MassFlowUnit.KilogramPerSecond), Column.Of(pressure, PressureUnit.Megapascal), Column.Of(differential, PressureUnit.Kilopascal), again, status, applicability);
            Assert.Equal(expected, status);
            Assert.Equal(quality.Select(x => double.IsNaN(x) ? -9 : Math.Round(x, 12)), again.Select(x => double.IsNaN(x) ? -9 : Math.Round(x, 12)));
            Assert.Equal(meter.Quality(Flow, Static, Difference).Applicability, applicability[0]);
            Assert.Equal(default, applicability[1]);
        }
    }

    [Fact]
    public void Columns_OfUnequalLength_ThrowNamingTheColumn()
    {
        double[] three = [4.8, 4.8, 4.8], two = [10, 10];
        var quality = new double[3];
        var status = new ReadingStatus[3];
        Assert.Equal("pressure", Assert.Throws<ArgumentException>(() => Meter.Quality(Column.Of(three, MassFlowUnit.KilogramPerSecond), Column.Of(two, PressureUnit.Megapascal), Column.Of(three, PressureUnit.Kilopascal), quality, status)).ParamName);
        Assert.Equal("status", Assert.Throws<ArgumentException>(() => Meter.Quality(Column.Of(three, MassFlowUnit.KilogramPerSecond), Column.Of(three, PressureUnit.Megapascal), Column.Of(three, PressureUnit.Kilopascal), quality, status.AsSpan(1))).ParamName);
        Assert.Equal("applicability", Assert.Throws<ArgumentException>(() => Meter.Quality(Column.Of(three, MassFlowUnit.KilogramPerSecond), Column.Of(three, PressureUnit.Megapascal), Column.Of(three, PressureUnit.Kilopascal), quality, status, new Applicability[2])).ParamName);
    }

    // The same instant in plant units and in SI: 4.8 kg/s, 10 MPa, 40 kPa.
    [Fact]
    public void Columns_InPlantUnits_AgreeWithTheSingleDoor()
    {
        double[] quality = new double[1];
        ReadingStatus[] status = new ReadingStatus[1];
        Meter.Quality(Column.Of([4.8 * 3600 / 0.45359237], MassFlowUnit.PoundPerHour), Column.Of([10e6 / 6894.757293168361], PressureUnit.PoundForcePerSquareInch), Column.Of([400.0], PressureUnit.Millibar), quality, status);
        Approx.Absolute(Meter.Quality(Flow, Static, Difference).Quality.DecimalFractions, quality[0], 1e-12);
    }

    [Fact]
    public void Doors_OnceWarm_AllocateNothing()
    {
        double[] flow = [.. Enumerable.Repeat(38000.0, 50)], pressure = [.. Enumerable.Repeat(1450.0, 50)], differential = [.. Enumerable.Range(0, 50).Select(i => 20.0 + i)], quality = new double[50];
        var status = new ReadingStatus[50];
        var applicability = new Applicability[50];
        MassFlow poundsPerHour = MassFlow.FromPoundsPerHour(38000);
        Pressure psi = Pressure.FromPoundsForcePerSquareInch(1450);
        foreach (QualityMeter meter in new[] { Meter, new QualityMeter(QualityMeterTests.SiteConstant(), WetSteamModel.Homogeneous), new QualityMeter(new OrificePlate(Length.FromMillimeters(77.9), Length.FromMillimeters(49), OrificeTappings.Flange), WetSteamModel.StevenOrifice) })
        {
            Assert.Equal(0, AllocationProbe.Bytes(() => meter.Quality(poundsPerHour, psi, Difference)));
            Assert.Equal(0, AllocationProbe.Bytes(() => meter.Differential(poundsPerHour, psi, Wet)));
            Assert.Equal(0, AllocationProbe.Bytes(() => meter.TotalFlow(psi, Wet, Difference)));
            Assert.Equal(0, AllocationProbe.Bytes(() => meter.Quality(Column.Of(flow, MassFlowUnit.PoundPerHour), Column.Of(pressure, PressureUnit.PoundForcePerSquareInch), Column.Of(differential, PressureUnit.Kilopascal), quality, status)));
            Assert.Equal(0, AllocationProbe.Bytes(() => meter.Quality(Column.Of(flow, MassFlowUnit.PoundPerHour), Column.Of(pressure, PressureUnit.PoundForcePerSquareInch), Column.Of(differential, PressureUnit.Kilopascal), quality, status, applicability)));
        }
    }

    private static void Expect(string message, string parameter, Func<object> call)
    {
        ArgumentOutOfRangeException error = Assert.Throws<ArgumentOutOfRangeException>(call);
        Assert.Contains(message, error.Message, StringComparison.Ordinal);
        Assert.Equal(parameter, error.ParamName);
    }
}
