using TwoPhase.Steam;
using TwoPhase.Units;
using UnitsNet;
using UnitsNet.Units;

namespace TwoPhase.Tests.Steam;

public class SaturationColumnsTests
{
    // Across the foot of the table, the seam at 16.529 MPa and up to the critical point.
    private static readonly double[] Bars = [.. Enumerable.Range(0, 3000).Select(i => 0.007 * Math.Pow(220.64 / 0.007, i / 2999.0) * (1 - 1e-15))];

    [Fact]
    public void FromPressure_Column_AgreesWithSinglePressures()
    {
        double[] ts = new double[Bars.Length], hl = new double[Bars.Length], hg = new double[Bars.Length], vl = new double[Bars.Length], vg = new double[Bars.Length];
        var status = new SaturationStatus[Bars.Length];

        Saturation.FromPressure(
            Column.Of(Bars, PressureUnit.Bar),
            Column.Into(ts, TemperatureUnit.Kelvin),
            Column.Into(hl, SpecificEnergyUnit.KilojoulePerKilogram),
            Column.Into(hg, SpecificEnergyUnit.JoulePerKilogram),
            Column.Into(vl, SpecificVolumeUnit.CubicMeterPerKilogram),
            Column.Into(vg, SpecificVolumeUnit.CubicMeterPerKilogram),
            status);

        for (int i = 0; i < Bars.Length; i++)
        {
            SaturationCore exact = SaturationLine.AtPressure(Pressure.FromBars(Bars[i]).Si());
            Assert.Equal(SaturationStatus.Saturated, status[i]);
            Approx.Relative(exact.Temperature, ts[i], 1e-12);

            // A last bit of p is a last bit of T; beside the critical point that is far more in h and v.
            double tolerance = Bars[i] < 215 ? 1e-12 : 1e-6;
            Approx.Relative(exact.Liquid.Enthalpy / 1e3, hl[i], tolerance);
            Approx.Relative(exact.Vapour.Enthalpy, hg[i], tolerance);
            Approx.Relative(exact.Liquid.SpecificVolume, vl[i], tolerance);
            Approx.Relative(exact.Vapour.SpecificVolume, vg[i], tolerance);
        }
    }

    // R7-97(2012), Table 36: Ts at 0.1, 1 and 10 MPa.
    [Fact]
    public void FromPressure_PublishedPressures_MatchesPrintedTemperatures()
    {
        double[] ts = new double[3];
        Saturation.FromPressure(Column.Of([0.1, 1, 10], PressureUnit.Megapascal), Column.Into(ts, TemperatureUnit.Kelvin), default, default, default, default, new SaturationStatus[3]);

        Approx.Absolute(0.372755919e3, ts[0], 0.5e-6);
        Approx.Absolute(0.453035632e3, ts[1], 0.5e-6);
        Approx.Absolute(0.584149488e3, ts[2], 0.5e-6);
    }

    [Fact]
    public void FromPressure_BadSamples_GiveNaNAndStatusAndTheNextGoesOn()
    {
        double[] pressures = [double.NaN, 10, -1, 0, 500, double.PositiveInfinity, 5], ts = new double[7], vg = new double[7];
        var status = new SaturationStatus[7];

        Saturation.FromPressure(
            Column.Of(pressures, PressureUnit.Megapascal),
            Column.Into(ts, TemperatureUnit.DegreeCelsius),
            default,
            default,
            default,
            Column.Into(vg, SpecificVolumeUnit.CubicMeterPerKilogram),
            status);

        Assert.Equal(
            [SaturationStatus.Missing, SaturationStatus.Saturated, SaturationStatus.OutOfRange, SaturationStatus.OutOfRange, SaturationStatus.OutOfRange, SaturationStatus.Missing, SaturationStatus.Saturated],
            status);
        for (int i = 0; i < 7; i++)
        {
            Assert.Equal(status[i] != SaturationStatus.Saturated, double.IsNaN(ts[i]));
            Assert.Equal(status[i] != SaturationStatus.Saturated, double.IsNaN(vg[i]));
        }
    }

    // What the cells of columns are laid from: ours, so that the formulation is the outside check.
    [Fact]
    public void Series_AnyPressureOfTheTable_AgreesWithTheFormulation()
    {
        for (int i = 0; i <= 20000; i++)
        {
            double p = Math.Min(SaturationTable.LowestPressure * Math.Pow(SaturationTable.HighestPressure / SaturationTable.LowestPressure, i / 20000.0), SaturationTable.HighestPressure);
            SaturationCore exact = SaturationLine.AtPressure(p);
            Approx.Relative(exact.Temperature, SaturationSeries.At(SaturatedProperty.Temperature, p), 5e-13);
            Approx.Relative(exact.Liquid.Enthalpy, SaturationSeries.At(SaturatedProperty.LiquidEnthalpy, p), 5e-13);
            Approx.Relative(exact.Vapour.Enthalpy, SaturationSeries.At(SaturatedProperty.VapourEnthalpy, p), 5e-13);
            Approx.Relative(exact.Liquid.SpecificVolume, SaturationSeries.At(SaturatedProperty.LiquidVolume, p), 5e-13);
            Approx.Relative(exact.Vapour.SpecificVolume, SaturationSeries.At(SaturatedProperty.VapourVolume, p), 5e-13);
        }
    }

    [Fact]
    public void FromPressure_NumberThatNoUnitHas_Throws()
    {
        ArgumentOutOfRangeException error = Assert.Throws<ArgumentOutOfRangeException>(() => Saturation.FromPressure(
            Column.Of([1], (PressureUnit)9999), Column.Into(new double[1], TemperatureUnit.Kelvin), default, default, default, default, new SaturationStatus[1]));
        Assert.Contains("9999", error.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void FromPressure_ColumnOfAnotherLength_ThrowsNamingIt()
    {
        ArgumentException error = Assert.Throws<ArgumentException>(() => Saturation.FromPressure(
            Column.Of([1, 2], PressureUnit.Megapascal), Column.Into(new double[3], TemperatureUnit.Kelvin), default, default, default, default, new SaturationStatus[2]));
        Assert.Equal("temperature", error.ParamName);
        Assert.Equal("status", Assert.Throws<ArgumentException>(() => Saturation.FromPressure(
            Column.Of([1, 2], PressureUnit.Megapascal), default, default, default, default, default, default)).ParamName);
    }

    [Fact]
    public void FromPressure_Column_AllocatesNothing()
    {
        double[] pressures = [1, 5, 9], volumes = new double[3];
        var status = new SaturationStatus[3];
        Assert.Equal(0, AllocationProbe.Bytes(() => Saturation.FromPressure(
            Column.Of(pressures, PressureUnit.Megapascal), default, default, default, Column.Into(volumes, SpecificVolumeUnit.CubicMeterPerKilogram), default, status)));
    }
}
