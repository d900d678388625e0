using MathNet.Numerics.Distributions;
using MathNet.Numerics.Statistics;
using TwoPhase.Advisory;
using TwoPhase.Dynamics;
using TwoPhase.Metering;
using TwoPhase.Passes;
using TwoPhase.Slip;
using TwoPhase.Tests.Passes;
using UnitsNet;
using Xunit.Abstractions;
using static TwoPhase.Tests.Advisory.Plants;

namespace TwoPhase.Tests.Advisory;

/// <summary>Statistics of the estimators. With <c>TWOPHASE_LONG=1</c> they run for as long as the statements about them are: 30 days, 100 places, 200 repeats; some minutes.</summary>
public class EstimatorNumbersTests(ITestOutputHelper output)
{
    public static bool IsLong { get; } = Environment.GetEnvironmentVariable("TWOPHASE_LONG") == "1";

    private const double Interval = 10, DeadBand = 0.005, HalfHour = 1800;
    private const int Passes = 6;

    private static readonly Duration Silence = Duration.FromSeconds(600);

    private static readonly EstimatorOptions ByException = EstimatorOptions.Default.WithCells(20)
        .WithReporting(PassSignal.FeedFlow, TagReporting.ByException(MassFlow.FromKilogramsPerSecond(DeadBand * QuietPlant.Spans[0]), Silence))
        .WithReporting(PassSignal.FeedTemperature, TagReporting.ByException(TemperatureDelta.FromKelvins(DeadBand * QuietPlant.Spans[1]), Silence))
        .WithReporting(PassSignal.Firing, TagReporting.ByException(Ratio.FromPercent(DeadBand * QuietPlant.Spans[2]), Silence))
        .WithReporting(PassSignal.OutletPressure, TagReporting.ByException(Pressure.FromMegapascals(DeadBand * QuietPlant.Spans[3]), Silence))
        .WithReporting(PassSignal.Differential, TagReporting.ByException(Pressure.FromKilopascals(DeadBand * QuietPlant.Spans[4]), Silence));

    // Six passes, noise that lasts a minute (0.3 %) and an hour (0.3 %) beside the white, dead band 0.5 % of span, firing 2 % up and down in a day: nothing is called that is
    // not, and a step of 4 % in one differential is, within half an hour.
    [Fact]
    public void Update_QuietMonth_CallsNothingButTheStep()
    {
        double days = IsLong ? 30 : 2;
        int places = IsLong ? 100 : 6, called = 0, tried = 0, changes = 0;
        GeneratorEstimator estimator = New();
        QuietPlant[] plants = [.. Enumerable.Range(0, Passes).Select(i => Plant(i))];
        Trust[] trust = new Trust[Passes];
        double nextPlace = 7200, spacing = ((days * 86400) - 7200 - HalfHour) / places;
        while (plants[0].Time < days * 86400)
        {
            Update(estimator, plants);
            for (int i = 0; i < Passes; i++)
            {
                Trust now = estimator.Estimates[i].Trust;
                if (plants[0].Time > 3600 && now != trust[i]) changes++;
                trust[i] = now;
            }

            if (plants[0].Time < nextPlace) continue;
            nextPlace += spacing;
            tried++;
            if (IsCalled(estimator.Save(), plants[0].Time, pass: tried % Passes, step: tried % 2 == 0 ? 0.04 : -0.04, seed: 1000 * tried)) called++;
        }

        double perPassAndWeek = changes / (Passes * days / 7);
        output.WriteLine(FormattableString.Invariant($"{days} days: {changes} false changes of trust, {perPassAndWeek:F2} per pass and week; {called} of {tried} steps called within 30 min"));
        Assert.True(perPassAndWeek <= 1, $"{changes} false changes");
        Assert.True(called >= 0.95 * tried, $"{called} of {tried}");
    }

    // Steady readings with white noise: no more than one sample in 10⁵ is not believed.
    [Fact]
    public void Update_SteadyRepeats_RaisesNoFalseAlarm()
    {
        int repeats = IsLong ? 200 : 20, alarms = 0, samples = 0;
        for (int seed = 0; seed < repeats; seed++)
        {
            var estimator = new QualityEstimator(KnownPass, Meter, EstimatorOptions.Default.WithCells(20));
            QuietPlant plant = new(seed, 1);
            for (int t = 0; t < 1500; t++)
            {
                Trust trust = estimator.Update(plant.Next()).Trust;
                if (t < 500) continue;
                samples++;
                if (trust != Trust.Believable) alarms++;
            }
        }

        output.WriteLine($"{alarms} alarms in {samples} samples");
        Assert.True(alarms <= samples / 1e5, $"{alarms} of {samples}");
    }

    // Hidden biases drawn from the stated priors: the truth lies within twice the absolute uncertainty as often as two standard deviations of a normal law say, 95 %.
    [Fact]
    public void Absolute_HiddenBiases_CoversTheTruth()
    {
        int repeats = IsLong ? 2000 : 200, covered = 0;
        Normal normal = new(0, 1, new Random(11));
        for (int seed = 0; seed < repeats; seed++)
        {
            var estimator = new QualityEstimator(KnownPass, Meter, EstimatorOptions.Default.WithCells(20));

            // The defaults: feed flow 0.5 %, differential 0.5 %, pressure 20 kPa, wet model 3 % of the differential.
            QuietPlant plant = new(seed, 5) { Bias = ((0.005 * normal.Sample()) + (0.03 * normal.Sample()), 0.005 * normal.Sample(), 0.02 * normal.Sample()) };
            QualityEstimate last = default;
            for (int t = 0; t < 100; t++) last = estimator.Update(plant.Next());
            if (Math.Abs(last.RawQuality - plant.Truth) <= 2 * last.RawAbsolute) covered++;
        }

        output.WriteLine($"{covered} of {repeats} within twice the absolute uncertainty");
        Assert.InRange(covered / (double)repeats, 0.91, 0.99);
    }

    // A swing at a fixed ratio of fuel to water shows nothing of the meter's constant, and nothing is claimed.
    [Fact]
    public void Absolute_AfterASwingOfLoad_IsNoSmaller()
    {
        var estimator = new QualityEstimator(KnownPass, Meter, EstimatorOptions.Default.WithCells(30));
        OperatingSchedule swing = Still;
        foreach ((double at, double load) in new[] { (700.0, 0.75), (1500.0, 1.0) })
        {
            for (int i = 1; i <= 10; i++)
            {
                double before = at == 700 ? 1 : 0.75, now = before + ((load - before) * i / 10);
                Duration when = Duration.FromSeconds(at + (30 * i));
                swing = swing.StepFeedFlow(when, Start.FeedFlow * now).StepFiring(when, Ratio.FromDecimalFractions(now));
            }
        }

        QualityEstimate[] estimates = [.. Readings(swing, 2700, 9).Select(row => estimator.Update(row.Reading))];
        double before_ = Meter_(estimates[650]), after = Meter_(estimates[^1]);
        Assert.True(after >= 0.9 * before_, $"{after:F4} against {before_:F4}");
        Assert.Equal(Trust.Believable, estimates[^1].Trust);

        static double Meter_(QualityEstimate estimate) => Math.Sqrt((estimate.RawAbsolute * estimate.RawAbsolute) - (estimate.RawMotion * estimate.RawMotion));
    }

    // Plants that are not the estimator's: any slip, heat split, a tenth of volume, a third of metal, other lags; any move. The estimate beats the reading in each, and at rest is
    // worse than the reading by no more than its noise.
    [Fact]
    public void Update_RandomPlantAndMove_BeatsTheReading()
    {
        int repeats = IsLong ? 100 : 8;
        for (int seed = 0; seed < repeats; seed++)
        {
            Random random = new(100 + seed);
            double Any(double low, double high) => low + ((high - low) * random.NextDouble());
            Pass plant = Other(Any(0.9, 1.1), Any(0.7, 1.3), Any(37, 45));
            VoidFractionModel slip = VoidFractionModel.All[random.Next(VoidFractionModel.All.Count)];
            int move = random.Next(4);
            double size = (random.Next(2) == 0 ? -1 : 1) * Any(0.6, 1);
            Duration at = Duration.FromSeconds(400);
            OperatingSchedule schedule = move switch
            {
                0 => Still.StepFiring(at, Ratio.FromDecimalFractions(1 + (0.06 * size))),
                1 => Still.StepFeedFlow(at, Start.FeedFlow * (1 + (0.05 * size))),
                2 => Still.RampFeedTemperature(at, Duration.FromSeconds(120), Start.FeedTemperature!.Value + TemperatureDelta.FromKelvins(12 * size)),
                _ => Still.RampOutletPressure(at, Duration.FromSeconds(60), Start.OutletPressure + Pressure.FromMegapascals(0.3 * size)),
            };
            int late = random.Next(3);
            (PassReading Reading, double Truth)[] readings = [.. Readings(schedule, 1200, seed, plant, PassModels.Default.WithSlip(slip))];
            var estimator = new QualityEstimator(KnownPass, Meter);
            double[] errors = new double[readings.Length], raw = new double[readings.Length];
            for (int t = late; t < readings.Length; t++)
            {
                // The differential is some seconds late.
                QualityEstimate estimate = estimator.Update(readings[t].Reading.With(PassSignal.Differential, readings[t - late].Reading.Differential!.Value.Pascals));
                (errors[t], raw[t]) = (estimate.RawQuality - readings[t].Truth, estimate.RawIndicated - readings[t].Truth);
            }

            double moving = errors[400..900].RootMeanSquare(), reading = raw[400..900].RootMeanSquare(), rest = errors[1000..].RootMeanSquare(), noise = raw[200..390].RootMeanSquare();
            string what = FormattableString.Invariant($"seed {seed}, {slip.Name}, move {move} of {size:F2}: moving {moving:F4} against {reading:F4}, at rest {rest:F4} against {noise:F4}");
            output.WriteLine(what);
            Assert.True(moving < reading, what);
            Assert.True(rest < raw[1000..].RootMeanSquare() + noise, what);
        }
    }

    private static Pass Other(double volume, double metal, double convective)
    {
        double bore = 77.9 * Math.Sqrt(volume), outside = Math.Sqrt((bore * bore) + (metal * ((88.9 * 88.9) - (77.9 * 77.9))));
        TubeSection Tubes(string name) => new TubeSection(name, Length.FromMillimeters(bore), Length.FromMillimeters(outside), Length.FromMeters(335.5)).WithRoughness(Length.FromMicrometers(46));
        return new Pass("1", [Tubes("bank").AsConvective(), Tubes("coil")]).WithConvectiveShare(Ratio.FromPercent(convective));
    }

    private static GeneratorEstimator New() => new(new SteamGenerator("six", Enumerable.Range(0, Passes).Select(i => Named($"{i + 1}"))), ByException);

    private static QuietPlant Plant(int seed) => new(seed, Interval, 0.003, 0.003, DeadBand, 0.02);

    private static void Update(GeneratorEstimator estimator, QuietPlant[] plants)
    {
        DateTimeOffset time = Midnight.AddSeconds(plants[0].Time);
        estimator.Update(new GeneratorReading(time, [.. plants.Select(plant => plant.Next())]));
    }

    // The same generator taken up from its state, with plants of the same kind and a step in one of them.
    private static bool IsCalled(EstimatorState state, double from, int pass, double step, int seed)
    {
        GeneratorEstimator estimator = New();
        estimator.Restore(state);
        QuietPlant[] plants = [.. Enumerable.Range(0, Passes).Select(i => Plant(seed + i))];
        while (plants[0].Time < HalfHour)
        {
            plants[pass].Bias = (step, 0, 0);
            estimator.Update(new GeneratorReading(Midnight.AddSeconds(from + plants[0].Time), [.. plants.Select(plant => plant.Next()).Select(reading => At(reading, from))]));
            if (estimator.Shifts[pass].Origin == ShiftOrigin.ThisPass) return true;
        }

        return false;
    }

    private static PassReading At(in PassReading reading, double from) => Format.Read(
        reading.Time.AddSeconds(from), reading.FeedFlow!.Value.KilogramsPerSecond, reading.FeedTemperature!.Value.DegreesCelsius, reading.Firing!.Value.Percent, reading.OutletPressure!.Value.Megapascals, reading.Differential!.Value.Kilopascals);
}
