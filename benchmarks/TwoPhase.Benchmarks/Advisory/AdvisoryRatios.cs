using TwoPhase.Advisory;
using TwoPhase.Benchmarks.Ratios;
using TwoPhase.Metering;
using TwoPhase.Passes;
using UnitsNet;
using UnitsNet.Units;

namespace TwoPhase.Benchmarks.Advisory;

/// <summary>An estimator's sample of one pass.</summary>
internal sealed class AdvisoryRatios : IRatioSuite
{
    private const int Samples = 60;

    private static readonly QualityMeter Meter = new(new ClassicalVenturi(Length.FromMillimeters(77.9), Length.FromMillimeters(49), ConvergentFinish.Machined), WetSteamModel.Homogeneous);

    private static readonly Pass Pass = new Pass("1", [Tubes("bank").AsConvective(), Tubes("coil")]).WithConvectiveShare(Ratio.FromPercent(41)).WithHeatAtFullFiring(Power.FromMegawatts(8.2));

    private static readonly ReadingFormat Format = new(MassFlowUnit.KilogramPerSecond, TemperatureUnit.DegreeCelsius, RatioUnit.Percent, PressureUnit.Megapascal, PressureUnit.Kilopascal);

    public string Name => "Advisory";

    public IEnumerable<RatioCase> Cases()
    {
        EstimatorOptions byException = EstimatorOptions.Default.WithReporting(PassSignal.Differential, TagReporting.ByException(Pressure.FromKilopascals(0.5), Duration.FromSeconds(600)));
        yield return Sample("a sample a second, default", EstimatorOptions.Default, 1) with { Target = 5000 };
        yield return Sample("the same, differential by exception", byException, 1);
        yield return Sample("the same, 30 cells", EstimatorOptions.Default.WithCells(30), 1);
        yield return Sample("a sample each ten seconds, default", EstimatorOptions.Default, 10);
    }

    // Noise of the readings is all that moves; flow and differential swing a little, so that nothing stands frozen.
    private static RatioCase Sample(string what, EstimatorOptions options, double interval)
    {
        var estimator = new QualityEstimator(Pass, Meter, options);
        DateTimeOffset time = new(2026, 1, 1, 0, 0, 0, TimeSpan.Zero);
        int count = 0;
        PassReading Next() => Format.Read(time = time.AddSeconds(interval), 4.8 * (1 + (0.003 * Math.Sin(++count))), 171.85, 100, 9.6, 41 * (1 + (0.005 * Math.Sin(7.3 * count))));
        for (int i = 0; i < 200; i++) estimator.Update(Next());
        if (estimator.Update(Next()).Quality is null) throw new InvalidOperationException("The estimator does not run.");
        return new(what, Samples, () =>
        {
            double sum = 0;
            for (int i = 0; i < Samples; i++) sum += estimator.Update(Next()).RawQuality;
            return sum;
        })
        {
            Yardstick = Yardsticks.P,
        };
    }

    private static TubeSection Tubes(string name) => new TubeSection(name, Length.FromMillimeters(77.9), Length.FromMillimeters(88.9), Length.FromMeters(335.5)).WithRoughness(Length.FromMicrometers(46));
}
