using TwoPhase.Metering;
using TwoPhase.Units;
using UnitsNet;
using UnitsNet.Units;

namespace TwoPhase.Tests.Metering;

/// <summary>The fast ways of a meter of known constant against the formulation itself.</summary>
public class LumpedHomogeneousTests
{
    private const int Count = 20_011;

    private static readonly SiteConstantMeter Site = QualityMeterTests.SiteConstant();
    private static readonly QualityMeter Meter = new(Site, WetSteamModel.Homogeneous);

    [Fact]
    public void Quality_ColumnOverTheSaturationLine_IsTheFormulationsWithin2e11()
    {
        (double[] flow, double[] pressure, double[] differential) = Samples(0.05, 20.5);
        double[] quality = new double[Count];
        var status = new ReadingStatus[Count];
        Meter.Quality(Column.Of(flow, MassFlowUnit.TonnePerHour), Column.Of(pressure, PressureUnit.Megapascal), Column.Of(differential, PressureUnit.Kilopascal), quality, status);
        for (int i = 0; i < Count; i++)
        {
            double exact = Exact(flow[i] / 3.6, pressure[i] * 1e6, differential[i] * 1e3);
            Approx.Absolute(exact, quality[i], 2e-11 * Math.Max(1, Math.Abs(exact)), $"{pressure[i]} MPa");
            Assert.Equal(exact < 0 ? ReadingStatus.SubcooledOutlet : exact > 1 ? ReadingStatus.SuperheatedOutlet : ReadingStatus.WetSteam, status[i]);
        }
    }

    [Fact]
    public void Quality_OneSample_IsTheFormulationsWithin1e11()
    {
        (double[] flow, double[] pressure, double[] differential) = Samples(0.3, 16.5);
        for (int i = 0; i < 500; i++)
        {
            QualityReading reading = Meter.Quality(MassFlow.FromTonnesPerHour(flow[i]), Pressure.FromMegapascals(pressure[i]), Pressure.FromKilopascals(differential[i]));
            double exact = Exact(flow[i] / 3.6, pressure[i] * 1e6, differential[i] * 1e3);
            Approx.Absolute(exact, reading.Quality.DecimalFractions, 1e-11 * Math.Max(1, Math.Abs(exact)));
            Approx.Relative(flow[i] * flow[i] / (3.6 * 3.6 * Site.K.SquareMeters * Site.K.SquareMeters * differential[i] * 1e3), reading.EffectiveDensity.KilogramsPerCubicMeter, 1e-12);
            Assert.True(reading.Applicability.IsInside);
        }
    }

    // A sample answers the same to the last bit wherever it stands: in a full register, among the rest, beside bad neighbours, or through the door.
    [Fact]
    public void Quality_ColumnOfAnyLength_IsThatOfTheDoor()
    {
        (double[] flow, double[] pressure, double[] differential) = Samples(0.05, 20.5);
        for (int length = 0; length <= 21; length++)
        {
            double[] m = flow[..length], quality = new double[length];
            for (int bad = length % 4; bad < length; bad += 5) m[bad] = -m[bad];
            var status = new ReadingStatus[length];
            Meter.Quality(Column.Of(m, MassFlowUnit.TonnePerHour), Column.Of(pressure.AsSpan(0, length), PressureUnit.Megapascal), Column.Of(differential.AsSpan(0, length), PressureUnit.Kilopascal), quality, status);
            for (int i = 0; i < length; i++)
            {
                double alone = Meter.SampleCore(m[i] * (1 / 3.6), pressure[i] * 1e6, differential[i] * 1e3, out ReadingStatus aloneStatus);
                Assert.Equal(BitConverter.DoubleToInt64Bits(alone), BitConverter.DoubleToInt64Bits(quality[i]));
                Assert.Equal(aloneStatus, status[i]);
                Assert.Equal(m[i] < 0, double.IsNaN(quality[i]));
            }
        }
    }

    // Every combination of what no instrument should send: the status of the column is the first reason that applies, and only a quality is a number.
    [Fact]
    public void Quality_ColumnOfExtremes_TellsTheFirstReason()
    {
        double[] kinds = [double.NaN, double.NegativeInfinity, -1, -0.0, 0, 5e-324, 1e-200, 611, 612, 65535, 65536, 10e6, 16.6e6, 20e6, 22.064e6, 23e6, 1e200, double.MaxValue, double.PositiveInfinity];
        var all = (from m in kinds from p in kinds from dp in kinds select (m, p, dp)).ToArray();
        double[] quality = new double[all.Length];
        var status = new ReadingStatus[all.Length];
        Meter.Quality(Column.Of(all.Select(a => a.m).ToArray(), MassFlowUnit.KilogramPerSecond), Column.Of(all.Select(a => a.p).ToArray(), PressureUnit.Pascal), Column.Of(all.Select(a => a.dp).ToArray(), PressureUnit.Pascal), quality, status);
        for (int i = 0; i < all.Length; i++)
        {
            (double m, double p, double dp) = all[i];
            ReadingStatus expected = double.IsNaN(m) || double.IsNaN(p) || double.IsNaN(dp) ? ReadingStatus.Missing
                : !(m > 0) || double.IsInfinity(m) ? ReadingStatus.FlowOutOfRange
                : !(p >= 611.213 && p <= 22.064e6) ? ReadingStatus.PressureOutOfRange
                : !(dp > 0 && dp < p) ? ReadingStatus.DifferentialOutOfRange
                : quality[i] < 0 ? ReadingStatus.SubcooledOutlet
                : quality[i] <= 1 ? ReadingStatus.WetSteam
                : quality[i] > 1 ? ReadingStatus.SuperheatedOutlet
                : ReadingStatus.NotSolved;
            Assert.Equal(expected, status[i]);
            Assert.Equal(status[i] is not (ReadingStatus.WetSteam or ReadingStatus.SubcooledOutlet or ReadingStatus.SuperheatedOutlet), double.IsNaN(quality[i]));
        }
    }

    // The result may take the place of an input.
    [Fact]
    public void Quality_ColumnInPlace_IsTheSame()
    {
        (double[] flow, double[] pressure, double[] differential) = Samples(5, 12);
        double[] quality = new double[Count];
        var status = new ReadingStatus[Count];
        Meter.Quality(Column.Of(flow, MassFlowUnit.TonnePerHour), Column.Of(pressure, PressureUnit.Megapascal), Column.Of(differential, PressureUnit.Kilopascal), quality, status);
        Meter.Quality(Column.Of(flow, MassFlowUnit.TonnePerHour), Column.Of(pressure, PressureUnit.Megapascal), Column.Of(differential, PressureUnit.Kilopascal), flow, status);
        Assert.Equal(quality, flow);
    }

    // One bad sample in a block of good ones spoils nothing but itself, wherever it stands.
    [Theory]
    [InlineData(double.NaN, 10, 40, ReadingStatus.Missing)]
    [InlineData(-17, 10, 40, ReadingStatus.FlowOutOfRange)]
    [InlineData(double.PositiveInfinity, 10, 40, ReadingStatus.FlowOutOfRange)]
    [InlineData(17, double.NaN, 40, ReadingStatus.Missing)]
    [InlineData(17, 23, 40, ReadingStatus.PressureOutOfRange)]
    [InlineData(17, 0, 40, ReadingStatus.PressureOutOfRange)]
    [InlineData(17, 10, -1, ReadingStatus.DifferentialOutOfRange)]
    [InlineData(17, 10, 12_000, ReadingStatus.DifferentialOutOfRange)]
    [InlineData(17, 10, double.NaN, ReadingStatus.Missing)]
    public void Quality_BadSampleInAColumn_SpoilsOnlyItself(double badFlow, double badPressure, double badDifferential, ReadingStatus why)
    {
        (double[] flow, double[] pressure, double[] differential) = Samples(5, 12);
        (flow, pressure, differential) = (flow[..333], pressure[..333], differential[..333]);
        foreach (int at in new[] { 0, 1, 2, 3, 4, 95, 200, 331, 332 })
        {
            double[] m = (double[])flow.Clone(), p = (double[])pressure.Clone(), dp = (double[])differential.Clone(), quality = new double[333];
            (m[at], p[at], dp[at]) = (badFlow, badPressure, badDifferential);
            var status = new ReadingStatus[333];
            Meter.Quality(Column.Of(m, MassFlowUnit.TonnePerHour), Column.Of(p, PressureUnit.Megapascal), Column.Of(dp, PressureUnit.Kilopascal), quality, status);
            Assert.Equal(why, status[at]);
            for (int i = 0; i < 333; i++)
            {
                Assert.Equal(i == at, double.IsNaN(quality[i]));
                if (i != at) Approx.Absolute(Exact(m[i] / 3.6, p[i] * 1e6, dp[i] * 1e3), quality[i], 1e-9);
            }
        }
    }

    [Fact]
    public void Quality_Column_AllocatesNothing()
    {
        (double[] flow, double[] pressure, double[] differential) = Samples(5, 12);
        double[] quality = new double[Count];
        var status = new ReadingStatus[Count];
        Assert.Equal(0, AllocationProbe.Bytes(() => Meter.Quality(Column.Of(flow, MassFlowUnit.TonnePerHour), Column.Of(pressure, PressureUnit.Megapascal), Column.Of(differential, PressureUnit.Kilopascal), quality, status)));
    }

    private static double Exact(double flow, double pressure, double differential)
    {
        var steam = TwoPhase.Steam.SaturationLine.AtPressure(pressure);
        double k = Site.K.SquareMeters, volume = k * k * differential / (flow * flow);
        return (volume - steam.Liquid.SpecificVolume) / (steam.Vapour.SpecificVolume - steam.Liquid.SpecificVolume);
    }

    private static (double[] Flow, double[] Pressure, double[] Differential) Samples(double lowest, double highest)
    {
        var random = new Random(7);
        double[] flow = new double[Count], pressure = new double[Count], differential = new double[Count];
        for (int i = 0; i < Count; i++)
        {
            (flow[i], pressure[i]) = (12 + (8 * random.NextDouble()), lowest + ((highest - lowest) * random.NextDouble()));

            // A differential that makes a quality around 0.2 to 1, a few outside.
            var steam = TwoPhase.Steam.SaturationLine.AtPressure(pressure[i] * 1e6);
            double x = random.NextDouble() < 0.02 ? (random.NextDouble() * 1.6) - 0.02 : 0.2 + (0.8 * random.NextDouble()), k = Site.K.SquareMeters, m = flow[i] / 3.6;
            double volume = steam.Liquid.SpecificVolume + (x * (steam.Vapour.SpecificVolume - steam.Liquid.SpecificVolume));
            differential[i] = Math.Min(Math.Max(volume, 1e-4) * m * m / (k * k) / 1e3, 900 * pressure[i]);
        }

        return (flow, pressure, differential);
    }
}
