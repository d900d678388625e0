using MathNet.Numerics.Statistics;
using TwoPhase.Advisory;
using TwoPhase.Dynamics;
using TwoPhase.Metering;
using TwoPhase.Passes;
using TwoPhase.Slip;
using TwoPhase.Tests.Passes;
using TwoPhase.Tests.Support;
using UnitsNet;
using static TwoPhase.Tests.Advisory.Plants;

namespace TwoPhase.Tests.Advisory;

public class QualityEstimatorTests
{
    private static readonly (PassReading Reading, double Truth)[] Quiet = [.. Readings(Still, 900, 1)];

    // An app shows what its variable holds before the first reading came.
    [Fact]
    public void Default_OfAnEstimate_KnowsNothing()
    {
        QualityEstimate nothing = default;
        Assert.Null(nothing.Quality);
        Assert.Null(nothing.IndicatedQuality);
        Assert.Null(nothing.UpperQuality);
        Assert.Null(nothing.SolidsConcentration);
        Assert.Null(nothing.OutletFlow);
        Assert.Null(nothing.ExpectedWait);
        Assert.Equal("00:00:00: no reading, not known; Unknown", nothing.ToString());
    }

    [Fact]
    public void Update_FirstMinute_KnowsNothingAndSaysSo()
    {
        var estimator = new QualityEstimator(KnownPass, Meter);
        QualityEstimate first = estimator.Update(Quiet[0].Reading);
        Assert.Equal(Trust.Unknown, first.Trust);
        Assert.Null(first.Quality);
        Assert.NotNull(first.IndicatedQuality);
        QualityEstimate later = Run(estimator, Quiet.Skip(1).Take(120)).Last();
        Assert.Equal(Trust.Settling, later.Trust);
        Assert.NotNull(later.Quality);
        Assert.InRange(later.ExpectedWait!.Value.Seconds, 60, 400);
    }

    [Fact]
    public void Update_QuietReadings_AreBelieved()
    {
        QualityEstimate last = Run(new QualityEstimator(KnownPass, Meter), Quiet).Last();
        Assert.Equal(Trust.Believable, last.Trust);
        Assert.Equal(OperatingState.Running, last.State);
        Approx.Absolute(0.78, last.RawQuality, 0.002);
        Approx.Absolute(0.02, last.MarginToLimit!.Value.DecimalFractions, 0.002);
        Approx.Relative(1 / (1 - last.RawQuality), last.SolidsConcentration!.Value, 1e-12);
        Approx.Relative(last.RawQuality + (1.645 * last.RawAbsolute), last.UpperQuality!.Value.DecimalFractions, 1e-12);
        Approx.Relative(Start.RawAbsorbedHeat / 8.4e6, last.HeatFactor!.Value, 0.003);
        Assert.InRange<double>(last.RawAbsolute, 0.015, 0.04);
        Assert.True(last.RawMotion < 0.001);
    }

    // At rest what leaves is what is fed, the holdup stands, and the two ends of a disagreement that is none are the estimate itself.
    [Fact]
    public void Update_AtRest_HasTheFiguresOfTheSteadyState()
    {
        QualityEstimate last = Run(new QualityEstimator(KnownPass, Meter), Quiet).Last();
        PassProfile rest = SteadyState.Solve(KnownPass, Start);
        Approx.Relative(Start.RawFeedFlow, last.OutletFlow!.Value.KilogramsPerSecond, 0.01);
        Approx.Absolute(0, last.HoldupRate!.Value.KilogramsPerSecond, 0.02 * Start.RawFeedFlow);
        Approx.Relative(TwoPhase.Holdup.WaterHoldup.Of(rest).Total.Kilograms, last.Holdup!.Value.Kilograms, 0.02);
        Approx.Relative(rest.First(point => point.EquilibriumQuality.DecimalFractions >= 0).Position.Meters, last.BoilingOnset!.Value.Meters, 0.02);
        Approx.Absolute(0.78, last.QualityIfMeterIsRight!.Value.DecimalFractions, 0.005);
        Approx.Absolute(0.78, last.QualityIfHeatIsRight!.Value.DecimalFractions, 0.005);
        Assert.True(last.MotionOfEither!.Value.DecimalFractions >= last.Motion!.Value.DecimalFractions);
    }

    [Fact]
    public void Update_SameReadings_GivesTheSameBits() =>
        Assert.Equal(Run(new QualityEstimator(KnownPass, Meter), Quiet.Take(200)), Run(new QualityEstimator(KnownPass, Meter), Quiet.Take(200)));

    [Fact]
    public void Update_EachReading_AllocatesNothing()
    {
        var estimator = new QualityEstimator(KnownPass, Meter);
        Run(estimator, Quiet.Take(400));
        int next = 400;
        Assert.Equal(0, AllocationProbe.Bytes(() =>
        {
            for (int i = 0; i < 10; i++) estimator.Update(Quiet[next++].Reading);
        }));
    }

    [Fact]
    public void Restore_InATransient_GoesOnWithoutABump()
    {
        (PassReading Reading, double Truth)[] readings = [.. Readings(Still.StepFiring(Duration.FromSeconds(400), Ratio.FromPercent(106)), 700, 2)];
        var whole = new QualityEstimator(KnownPass, Meter);
        Run(whole, readings.Take(500));
        EstimatorState state = EstimatorState.Parse(whole.Save().ToString());
        var second = new QualityEstimator(KnownPass, Meter);
        second.Restore(state);
        Assert.Equal(Run(whole, readings.Skip(500)), Run(second, readings.Skip(500)));
    }

    [Fact]
    public void Update_LateReadingAfterARestore_SaysThatNothingIsKnown()
    {
        var whole = new QualityEstimator(KnownPass, Meter);
        Run(whole, Quiet.Take(200));
        var second = new QualityEstimator(KnownPass, Meter);
        second.Restore(whole.Save());
        QualityEstimate late = second.Update(Quiet.Take(200).Last().Reading);
        Assert.Equal((null, null, null, Trust.Unknown), (late.Quality, late.IndicatedQuality, late.UpperQuality, late.Trust));
        Assert.NotNull(second.Update(Quiet.Skip(200).First().Reading).Quality);
    }

    [Fact]
    public void Restore_StateOfAnother_ThrowsSayingWhy()
    {
        var estimator = new QualityEstimator(KnownPass, Meter, EstimatorOptions.Default.WithCells(40));
        Assert.Contains("number of cells", Assert.Throws<FormatException>(() => estimator.Restore(new QualityEstimator(KnownPass, Meter).Save())).Message, StringComparison.Ordinal);
        Assert.Contains("no 'clock.known'", Assert.Throws<FormatException>(() => estimator.Restore(EstimatorState.Parse("""{"version":2,"fields":{}}"""))).Message, StringComparison.Ordinal);
        Assert.Contains("version 7", Assert.Throws<FormatException>(() => EstimatorState.Parse("""{"version":7,"fields":{}}""")).Message, StringComparison.Ordinal);
        foreach (string bad in (string[])["", "1 2 3", "{}", """{"version":2}""", """{"version":2,"fields":{"a":1}}""", """{"version":2,"fields":{"a":["x"]}}"""]) Assert.Throws<FormatException>(() => EstimatorState.Parse(bad));
    }

    [Theory]
    [InlineData(PassSignal.FeedFlow), InlineData(PassSignal.FeedTemperature), InlineData(PassSignal.OutletPressure), InlineData(PassSignal.Firing), InlineData(PassSignal.Differential)]
    public void Update_SignalMissing_NamesItCoastsAndThenNoLongerKnows(PassSignal signal)
    {
        var estimator = new QualityEstimator(KnownPass, Meter, EstimatorOptions.Default.WithCoastTime(Duration.FromSeconds(120)));
        Run(estimator, Quiet.Take(500));
        QualityEstimate[] without = Run(estimator, Quiet.Skip(500).Take(200).Select(row => (row.Reading.Without(signal, SignalStatus.Bad), row.Truth)));
        Assert.Equal(Trust.InputFault, without[30].Trust);
        Assert.Equal(signal, without[30].Fault);
        Approx.Absolute(0.78, without[30].RawQuality, 0.004);
        Assert.Equal(Trust.Unknown, without[150].Trust);
        Assert.Null(without[150].Quality);
        Assert.Equal(signal, without[150].Fault);
    }

    [Fact]
    public void Update_FrozenDifferential_IsAFault()
    {
        var estimator = new QualityEstimator(KnownPass, Meter, EstimatorOptions.Default.WithLongestSilence(Duration.FromSeconds(60)));
        QualityEstimate[] estimates = Run(estimator, Quiet.Select((row, i) => (i < 500 ? row.Reading : row.Reading.With(PassSignal.Differential, Quiet[499].Reading.Differential!.Value.Pascals), row.Truth)));
        Assert.NotEqual(Trust.InputFault, estimates[540].Trust);
        Assert.Equal(Trust.InputFault, estimates[570].Trust);
        Assert.Equal(PassSignal.Differential, estimates[570].Fault);
    }

    [Fact]
    public void Update_SpikesAndLateReadings_ChangeNothing()
    {
        QualityEstimator clean = new(KnownPass, Meter), spiked = new(KnownPass, Meter);
        Run(clean, Quiet.Take(500));
        Run(spiked, Quiet.Take(400));
        spiked.Update(Quiet[10].Reading);
        PassReading wild = Format.Read(Midnight.AddSeconds(400.5), 48, 500, 900, 3, 4000);
        spiked.Update(wild);
        Run(spiked, Quiet.Skip(400).Take(100));
        Approx.Absolute(clean.Update(Quiet[500].Reading).RawQuality, spiked.Update(Quiet[500].Reading).RawQuality, 2e-4);
    }

    [Fact]
    public void Update_ClockSetBack_GoesOn()
    {
        var estimator = new QualityEstimator(KnownPass, Meter);
        Run(estimator, Quiet.Take(500));
        QualityEstimate last = default;
        foreach ((PassReading reading, _) in Quiet.Skip(500).Take(60))
        {
            PassReading back = Format.Read(reading.Time.AddHours(-1), reading.FeedFlow!.Value.KilogramsPerSecond, reading.FeedTemperature!.Value.DegreesCelsius, 100, reading.OutletPressure!.Value.Megapascals, reading.Differential!.Value.Kilopascals);
            last = estimator.Update(back);
        }

        Assert.Equal(Trust.Believable, last.Trust);
        Approx.Absolute(0.78, last.RawQuality, 0.002);
    }

    [Fact]
    public void Update_AfterALongGap_BeginsAnewAndKeepsItsBase()
    {
        var estimator = new QualityEstimator(KnownPass, Meter);
        Run(estimator, Quiet.Take(500));
        double factor = estimator.Update(Quiet[500].Reading).HeatFactor!.Value;
        QualityEstimate[] after = Run(estimator, Quiet.Skip(501).Take(200).Select(row => (Later(row.Reading, 7200), row.Truth)));
        Assert.Equal(Trust.Unknown, after[0].Trust);
        Assert.Null(after[0].Quality);
        Assert.Equal(Trust.Settling, after[120].Trust);
        Approx.Relative(factor, after[150].HeatFactor!.Value, 0.005);
    }

    // Header pressure down by 0.3 MPa in a minute: the reading is off by several points, the estimate by less than one and a half.
    [Fact]
    public void Update_HeaderPressureFalls_StaysNearTheTruth()
    {
        (PassReading Reading, double Truth)[] readings = [.. Readings(Still.RampOutletPressure(Duration.FromSeconds(400), Duration.FromSeconds(60), Pressure.FromMegapascals(9.3)), 900, 3, Other(43), PassModels.Default.WithSlip(VoidFractionModel.Zivi))];
        QualityEstimate[] estimates = Run(new QualityEstimator(KnownPass, Meter), readings);
        for (int t = 300; t < estimates.Length; t++) Approx.Absolute(readings[t].Truth, estimates[t].RawQuality, 0.015, $"{t} s");
        Assert.True(Enumerable.Range(400, 100).Max(t => Math.Abs(estimates[t].RawIndicated - readings[t].Truth)) > 0.05);
    }

    // Plants that are not the estimator's: slip, heat split, tube volume, metal. Better than the reading in every transient, and in rest no worse than its noise.
    [Theory]
    [InlineData("firing", 0.94, "Zivi", 43), InlineData("firing", 1.06, "Homogeneous", 39), InlineData("flow", 0.95, "Smith", 44), InlineData("flow", 1.05, "Homogeneous", 38), InlineData("feed", 12, "Zivi", 41)]
    public void Update_PlantThatIsAnother_BeatsTheReading(string what, double size, string slip, double convective)
    {
        Duration at = Duration.FromSeconds(400);
        OperatingSchedule schedule = what switch
        {
            "firing" => Still.StepFiring(at, Ratio.FromDecimalFractions(size)),
            "flow" => Still.StepFeedFlow(at, Start.FeedFlow * size),
            _ => Still.RampFeedTemperature(at, Duration.FromSeconds(120), Start.FeedTemperature!.Value + TemperatureDelta.FromKelvins(size)),
        };
        VoidFractionModel model = VoidFractionModel.All.First(candidate => candidate.Name.StartsWith(slip, StringComparison.Ordinal));
        (PassReading Reading, double Truth)[] readings = [.. Readings(schedule, 1200, 4, Other(convective), PassModels.Default.WithSlip(model))];
        QualityEstimate[] estimates = Run(new QualityEstimator(KnownPass, Meter), readings);
        double Rms(int from, int to, Func<QualityEstimate, double> of) => Enumerable.Range(from, to - from).Select(t => of(estimates[t]) - readings[t].Truth).RootMeanSquare();
        double moving = Rms(400, 900, estimate => estimate.RawQuality), reading = Rms(400, 900, estimate => estimate.RawIndicated);
        Assert.True(moving < 0.5 * reading, $"{moving:F4} against {reading:F4}");
        Assert.True(Rms(1000, 1200, estimate => estimate.RawQuality) < 0.005, $"at rest {Rms(1000, 1200, estimate => estimate.RawQuality):F4}");
    }

    // The tags of flow and differential come by different ways: the clocks or filters between them are 15 s apart.
    [Theory]
    [InlineData(15), InlineData(-15), InlineData(0)]
    public void DifferentialSkew_AfterTwoMovesOfTheFlow_IsFound(int skew)
    {
        OperatingSchedule moves = Still.StepFeedFlow(Duration.FromSeconds(400), Start.FeedFlow * 0.95).StepFeedFlow(Duration.FromSeconds(900), Start.FeedFlow);
        (PassReading Reading, double Truth)[] readings = [.. Readings(moves, 1100, 7)];
        var estimator = new QualityEstimator(KnownPass, Meter);
        for (int t = 20; t < readings.Length - 20; t++)
        {
            estimator.Update(readings[t].Reading.With(PassSignal.Differential, readings[t - skew].Reading.Differential!.Value.Pascals));
            if (t < 850) Assert.Null(estimator.DifferentialSkew);
        }

        Approx.Absolute(skew, estimator.DifferentialSkew!.Value.Seconds, 3);
    }

    [Fact]
    public void Anchor_OneGoodTest_NarrowsTheAbsoluteUncertainty()
    {
        var estimator = new QualityEstimator(KnownPass, Meter);
        QualityEstimate before = Run(estimator, Quiet.Take(600)).Last();
        Assert.True(estimator.Anchor(MassFraction.FromDecimalFractions(0.770), MassFraction.FromDecimalFractions(0.006)));
        QualityEstimate after = Run(estimator, Quiet.Skip(600)).Last();
        Assert.True(after.RawAbsolute < 0.007, $"{after.RawAbsolute:F4}");

        // Bayes for two normal laws: the test weighs by the inverse of the variances.
        double meter = before.RawAbsolute * before.RawAbsolute, test = 0.006 * 0.006;
        Approx.Absolute(before.RawQuality + ((0.770 - before.RawQuality) * meter / (meter + test)), after.RawQuality, 0.002);
        Assert.Equal(Trust.Believable, after.Trust);
        Assert.Throws<ArgumentOutOfRangeException>(() => estimator.Anchor(MassFraction.FromDecimalFractions(1.2), MassFraction.FromDecimalFractions(0.006)));
        Assert.Throws<ArgumentOutOfRangeException>(() => estimator.Anchor(MassFraction.FromDecimalFractions(0.77), MassFraction.Zero));
    }

    [Theory]
    [InlineData(true), InlineData(false)]
    public void Anchor_WhileTheyDisagree_TellsWhich(bool meterDrifts)
    {
        Func<double, double> drift = t => t < 400 ? 1 : 1 - (0.08 * Math.Min(1, (t - 400) / 800));
        (PassReading Reading, double Truth)[] readings = [.. Readings(Still, 1700, 5, heat: meterDrifts ? null : t => 1 - ((1 - drift(t)) / 2), meter: meterDrifts ? drift : null)];
        var estimator = new QualityEstimator(KnownPass, Meter);
        QualityEstimate apart = Run(estimator, readings.Take(1500)).Last();
        Assert.Equal(Trust.Disagreement, apart.Trust);
        Assert.True(estimator.Anchor(MassFraction.FromDecimalFractions(readings[1499].Truth), MassFraction.FromDecimalFractions(0.004)));
        QualityEstimate after = Run(estimator, readings.Skip(1500)).Last();
        Assert.Null(after.DisagreesSince);
        Approx.Absolute(readings[^1].Truth, after.RawQuality, 0.006);
    }

    // Whatever a control system or a historian may deliver: no exception, nothing that is not a number afterwards, and back within the settling time.
    [Fact]
    public void Update_HostileSamples_NeverThrowAndRecover()
    {
        var random = new Random(6);
        double[] wild = [double.NaN, double.PositiveInfinity, double.NegativeInfinity, -1, 0, 1e-300, 1e300, 4.8, 172, 9.6, 41, 100, -273.15, 1e6];
        var estimator = new QualityEstimator(KnownPass, Meter, EstimatorOptions.Default.WithCells(20));
        Run(estimator, Quiet.Take(200));
        int samples = int.Parse(Environment.GetEnvironmentVariable("TWOPHASE_FUZZ") ?? "100000", System.Globalization.CultureInfo.InvariantCulture);
        for (int i = 0; i < samples; i++)
        {
            DateTimeOffset time = random.Next(100) switch
            {
                0 => DateTimeOffset.MinValue,
                1 => DateTimeOffset.MaxValue,
                2 => Midnight.AddDays(random.Next(-1000, 1000)),
                _ => Midnight.AddSeconds(200 + (i * 0.1)),
            };
            double Any(double usual) => random.Next(3) == 0 ? wild[random.Next(wild.Length)] : usual * (0.5 + random.NextDouble());
            QualityEstimate estimate = estimator.Update(Format.Read(time, Any(4.8), Any(172), Any(100), Any(9.6), Any(41)));
            Assert.False(double.IsInfinity(estimate.RawQuality));
        }

        QualityEstimate[] after = Run(estimator, Quiet.Select(row => (Later(row.Reading, 1e9), row.Truth)));
        Assert.Equal(Trust.Believable, after[^1].Trust);
        Approx.Absolute(0.78, after[^1].RawQuality, 0.01);
    }

    [Fact]
    public void Update_FireOutAndFeedOff_NameTheState()
    {
        var estimator = new QualityEstimator(KnownPass, Meter);
        PassReading At(double second, double flow, double firing) => Format.Read(Midnight.AddSeconds(second), flow, 172, firing, 9.6, 41);
        Assert.Equal(OperatingState.Off, estimator.Update(At(0, 1e-6, 0)).State);
        Assert.Equal(OperatingState.Filling, new QualityEstimator(KnownPass, Meter).Update(At(0, 4.8, 0)).State);
        Run(estimator, Quiet.Skip(2).Take(300));
        QualityEstimate trip = estimator.Update(At(400, 4.8, 0));
        Assert.Equal(OperatingState.Trip, trip.State);
        Assert.Equal(Trust.NotRunning, trip.Trust);
        Assert.Null(trip.Quality);
        Assert.Equal(OperatingState.Turndown, new QualityEstimator(KnownPass, Meter).Update(At(0, 2.0, 42)).State);
        Assert.Equal(OperatingState.LowFireHold, new QualityEstimator(KnownPass, Meter).Update(At(0, 4.8, 20)).State);
        Assert.Equal(OperatingState.Running, new QualityEstimator(KnownPass, Meter).Update(At(0, 4.8, 20), OperatingState.Running).State);
    }

    [Fact]
    public void New_WhatCannotBeEstimated_ThrowsSayingWhy()
    {
        Assert.Contains("heated section", Assert.Throws<ArgumentException>(() => new QualityEstimator(new Pass("1", []), Meter)).Message, StringComparison.Ordinal);
        Assert.Throws<ArgumentNullException>(() => new QualityEstimator(KnownPass, null!));
        Assert.Throws<ArgumentOutOfRangeException>(() => EstimatorOptions.Default.WithCells(5));
        Assert.Throws<ArgumentOutOfRangeException>(() => EstimatorOptions.Default.WithQualityLimit(MassFraction.FromPercent(120)));
        Assert.Throws<ArgumentOutOfRangeException>(() => EstimatorOptions.Default.WithTolerance(MassFraction.Zero));
    }

    // Another heat split, a tenth more bore area and less of the metal: a plant that its user knows only roughly.
    private static Pass Other(double convective) => new Pass("1", [Tubes("bank", 335.5).AsConvective(), Tubes("coil", 335.5)]).WithConvectiveShare(Ratio.FromPercent(convective));

    private static TubeSection Tubes(string name, double metres) =>
        new TubeSection(name, Length.FromMillimeters(81.7), Length.FromMillimeters(89.5), Length.FromMeters(metres)).WithRoughness(Length.FromMicrometers(46));

    private static PassReading Later(in PassReading reading, double seconds) => Format.Read(
        reading.Time.AddSeconds(seconds), reading.FeedFlow!.Value.KilogramsPerSecond, reading.FeedTemperature!.Value.DegreesCelsius, 100, reading.OutletPressure!.Value.Megapascals, reading.Differential!.Value.Kilopascals);

    private static QualityEstimate[] Run(QualityEstimator estimator, IEnumerable<(PassReading Reading, double Truth)> readings) => [.. readings.Select(row => estimator.Update(row.Reading))];
}
