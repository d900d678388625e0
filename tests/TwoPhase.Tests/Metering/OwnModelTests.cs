using TwoPhase.Flow;
using TwoPhase.Metering;
using TwoPhase.Units;
using UnitsNet;
using UnitsNet.Units;

namespace TwoPhase.Tests.Metering;

/// <summary>A wet-steam model of one's own: one class, in every direction and in columns. (Outside this assembly, which sees the internals, the override is plain "protected".)</summary>
public class OwnModelTests
{
    private static readonly MassFlow Flow = MassFlow.FromKilogramsPerSecond(4.8);
    private static readonly Pressure Static = Pressure.FromMegapascals(10);

    /// <summary>An invented model: a slip ratio of 1.2 in Chisholm's form.</summary>
    private sealed class ConstantSlip : WetSteamModel
    {
        public override string Name => "Slip of 1.2";

        protected internal override double EffectiveDensityCore(in MeterState meter, double quality)
        {
            double root = Math.Sqrt(meter.LiquidDensity / meter.VapourDensity);
            return DensityFromChisholm(meter, quality, (root / 1.2) + (1.2 / root));
        }
    }

    /// <summary>An invented model whose differential passes a peak at x = 0.7 and comes back to it.</summary>
    private sealed class Humped : WetSteamModel
    {
        public override string Name => "Humped";

        protected internal override double EffectiveDensityCore(in MeterState meter, double quality) => meter.VapourDensity / (0.2 + (quality * (1.4 - quality)));
    }

    /// <summary>Homogeneous, rising, and counting how often it is asked.</summary>
    private sealed class Counting : WetSteamModel
    {
        public int Asked { get; set; }

        public override string Name => "Counting";

        protected internal override DifferentialTrend Trend => DifferentialTrend.Rising;

        protected internal override double EffectiveDensityCore(in MeterState meter, double quality)
        {
            Asked++;
            return DensityFromChisholm(meter, quality, (1.1 * Math.Sqrt(meter.LiquidDensity / meter.VapourDensity)) + Math.Sqrt(meter.VapourDensity / meter.LiquidDensity));
        }
    }

    private sealed class Broken : WetSteamModel
    {
        public override string Name => "Broken";

        protected internal override double EffectiveDensityCore(in MeterState meter, double quality) => double.NaN;
    }

    [Fact]
    public void OwnModel_EveryDirection_Inverts()
    {
        foreach (DifferentialPressureMeter element in new DifferentialPressureMeter[] { new OrificePlate(Length.FromMillimeters(80), Length.FromMillimeters(50), OrificeTappings.Corner), SiteConstantMeter.FromReference(Flow, Density.FromKilogramsPerCubicMeter(70), Pressure.FromKilopascals(40)) })
        {
            var meter = new QualityMeter(element, new ConstantSlip());
            for (double x = 0.02; x < 1; x += 0.07)
            {
                MassFraction quality = MassFraction.FromDecimalFractions(x);
                Pressure differential = meter.Differential(Flow, Static, quality);
                QualityReading reading = meter.Quality(Flow, Static, differential);
                Approx.Absolute(x, reading.Quality.DecimalFractions, 1e-10);
                Assert.Equal(ApplicabilityLimits.None, reading.Applicability.Exceeded & ApplicabilityLimits.SecondRoot);
                Approx.Relative(4.8, meter.TotalFlow(Static, quality, differential).KilogramsPerSecond, 2e-12);
            }
        }
    }

    // The short way of the search is there to ask a model seldom: a search between brackets asks two to three times as often.
    [Fact]
    public void OwnModel_UsualReading_IsAskedSeldom()
    {
        var model = new Counting();
        var meter = new QualityMeter(SiteConstantMeter.FromReference(Flow, Density.FromKilogramsPerCubicMeter(70), Pressure.FromKilopascals(40)), model);
        for (double x = 0.3; x < 0.95; x += 0.05)
        {
            Pressure differential = meter.Differential(Flow, Static, MassFraction.FromDecimalFractions(x));
            model.Asked = 0;
            Approx.Absolute(x, meter.Quality(Flow, Static, differential).Quality.DecimalFractions, 1e-10);
            Assert.InRange(model.Asked, 3, 7);
        }
    }

    [Fact]
    public void OwnModel_WithTwoRoots_GivesTheLowerAndTellsTheOther()
    {
        var meter = new QualityMeter(SiteConstantMeter.FromReference(Flow, Density.FromKilogramsPerCubicMeter(70), Pressure.FromKilopascals(40)), new Humped());
        Pressure differential = meter.Differential(Flow, Static, MassFraction.FromDecimalFractions(0.9));
        QualityReading reading = meter.Quality(Flow, Static, differential);
        Approx.Absolute(0.5, reading.Quality.DecimalFractions, 1e-10);
        Assert.Equal(ApplicabilityLimits.SecondRoot, reading.Applicability.Exceeded);
        Approx.Absolute(0.9, reading.Applicability.FirstValue, 1e-10);
        Assert.Equal(ReadingStatus.SuperheatedOutlet, meter.Quality(Flow, Static, differential * 2).Status);
        Assert.Equal(ReadingStatus.SubcooledOutlet, meter.Quality(Flow, Static, differential * 0.2).Status);
    }

    [Fact]
    public void OwnModel_WithoutFiniteDensity_SaysSo()
    {
        var meter = new QualityMeter(SiteConstantMeter.FromReference(Flow, Density.FromKilogramsPerCubicMeter(70), Pressure.FromKilopascals(40)), new Broken());
        var error = Assert.Throws<TwoPhase.Numerics.ConvergenceException>(() => meter.Quality(Flow, Static, Pressure.FromKilopascals(40)));
        Assert.Contains("'Broken'", error.Message, StringComparison.Ordinal);
        Assert.Throws<TwoPhase.Numerics.ConvergenceException>(() => meter.Differential(Flow, Static, MassFraction.FromPercent(80)));
        Assert.Throws<TwoPhase.Numerics.ConvergenceException>(() => meter.TotalFlow(Static, MassFraction.FromPercent(80), Pressure.FromKilopascals(40)));
        double[] quality = new double[1];
        var status = new ReadingStatus[1];
        meter.Quality(Column.Of([4.8], MassFlowUnit.KilogramPerSecond), Column.Of([10.0], PressureUnit.Megapascal), Column.Of([40.0], PressureUnit.Kilopascal), quality, status);
        Assert.Equal(ReadingStatus.NotSolved, status[0]);
        Assert.True(double.IsNaN(quality[0]));
    }
}
