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
    public void Quality_ColumnOverTheRangeOfPlants_IsTheFormulationsWithin2e10()
    {
        (double[] flow, double[] pressure, double[] differential) = Samples(0.3, 20.5);
        double[] quality = new double[Count];
        var status = new ReadingStatus[Count];
        Meter.Quality(Column.Of(flow, MassFlowUnit.TonnePerHour), Column.Of(pressure, PressureUnit.Megapascal), Column.Of(differential, PressureUnit.Kilopascal), quality, status);
        for (int i = 0; i < Count; i++)
        {
            double exact = Exact(flow[i] / 3.6, pressure[i] * 1e6, differential[i] * 1e3);
            Approx.Absolute(exact, quality[i], 2e-10 * Math.Max(1, Math.Abs(exact)), $"{pressure[i]} MPa");
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
        foreach (int at in new[] { 0, 1, 31, 32, 95, 200, 331, 332 })
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
