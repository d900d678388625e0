using TwoPhase.Advisory;
using TwoPhase.Dynamics;
using TwoPhase.Limits;
using TwoPhase.Metering;
using TwoPhase.Passes;
using UnitsNet;
using static TwoPhase.Tests.Advisory.Plants;

namespace TwoPhase.Tests.Advisory;

public class GeneratorAdviceTests
{
    private const int Quiet = 900;
    private static readonly double[] Heats = [1.03, 0.99, 1.00];
    private static readonly SiteLimits Site = SiteLimits.Default.WithOutletQuality(MassFraction.FromPercent(85))
        .WithSolids(SolidsLimit.Silica(MassConcentration.FromMilligramsPerLiter(60), MassConcentration.FromMilligramsPerLiter(400)));

    private static readonly MassFraction Target = MassFraction.FromPercent(77);

    // Pass a stands 4 points above b: it goes first, alone, and no further than 3 %; a move settles before the next.
    [Fact]
    public void Of_PassesApart_MovesTheHottestAloneAndThenWaits()
    {
        GeneratorEstimator estimator = New();
        Assert.All(GeneratorAdvice.Of(estimator, Target, Site).Passes, pass => Assert.Null(pass.FlowTrim));
        Plant[] plants = Start3();
        Run(estimator, plants, Quiet);
        GeneratorAdvice advice = GeneratorAdvice.Of(estimator, Target, Site);
        PassAdvice next = advice.Next!;
        Assert.Equal("a", next.Pass);
        Assert.True(next.IsCapped);
        Approx.Relative(0.03, next.FlowTrim!.Value.DecimalFractions, 1e-12);
        Approx.Relative(-0.03, next.FiringTrim!.Value.DecimalFractions, 1e-12);
        Approx.Absolute(0.77, next.SetPoint!.Value.DecimalFractions, 1e-12);
        Assert.All(advice.Passes.Where(pass => pass != next), pass => Assert.Null(pass.FlowTrim ?? pass.FiringTrim));
        Assert.All(advice.Passes.Where(pass => pass != next), pass => Assert.Null(pass.Wait));

        // The move is made: nobody is moved while its water is on its way, and after the wait the reading is true again.
        plants[0].Flow = 1 + next.FlowTrim.Value.DecimalFractions;
        Run(estimator, plants, 30);
        Assert.Null(GeneratorAdvice.Of(estimator, Target, Site).Next);
        Assert.Equal(AdviceReason.Settling, GeneratorAdvice.Of(estimator, Target, Site).Passes[0].Reason);
        Run(estimator, plants, (int)next.Wait!.Value.Seconds - 30);
        double[] off = [.. Enumerable.Range(0, 60).Select(_ =>
        {
            Run(estimator, plants, 1);
            return estimator.Estimates[0].RawIndicated - plants[0].Truth;
        })];
        Approx.Absolute(0, off.Average(), 0.01, "reading after the wait");
    }

    // The trims are those of the steady state.
    [Fact]
    public void Of_NearTheTarget_TrimsToItExactly()
    {
        GeneratorEstimator estimator = New();
        Run(estimator, [new(0.99, 1), new(0.99, 2), new(0.99, 3)], Quiet);
        PassAdvice next = GeneratorAdvice.Of(estimator, MassFraction.FromPercent(75), Site).Next!;
        Assert.False(next.IsCapped);
        QualityEstimator pass = estimator.Estimators.First(candidate => candidate.Pass.Name == next.Pass);
        PassConditions now = pass.Conditions!.Value;
        Approx.Absolute(0.75, SteadyState.Solve(pass.Pass, now.WithFeedFlow(now.FeedFlow * (1 + next.FlowTrim!.Value.DecimalFractions))).OutletQuality.DecimalFractions, 1e-3);
        Approx.Absolute(0.75, SteadyState.Solve(pass.Pass, now with { RawAbsorbedHeat = now.RawAbsorbedHeat * (1 + next.FiringTrim!.Value.DecimalFractions) }).OutletQuality.DecimalFractions, 1e-3);
        Assert.Equal(0.85, next.Limits!.Site.OutletQuality.DecimalFractions);
        Assert.Contains(next.Limits, row => row.Kind == LimitKind.CriticalQuality);
        Assert.Contains(next.Limits, row => row.Kind == LimitKind.Solids && row.Status == LimitStatus.Within);
    }

    // A better known pass may stand nearer to the limit: equal margin in standard uncertainties, not in points.
    [Fact]
    public void Of_PassThatIsAnchored_MayStandNearerToTheLimit()
    {
        GeneratorEstimator estimator = New();
        Plant[] plants = [new(1, 1), new(1, 2), new(1, 3)];
        Run(estimator, plants, Quiet);
        Assert.True(estimator.Estimators[1].Anchor(MassFraction.FromDecimalFractions(plants[1].Truth), MassFraction.FromDecimalFractions(0.006)));
        Run(estimator, plants, 200);
        GeneratorAdvice advice = GeneratorAdvice.Of(estimator, MassFraction.FromPercent(99), Site);
        for (int i = 0; i < 3; i++) Approx.Relative(1.644854, (0.85 - advice.Passes[i].SetPoint!.Value.DecimalFractions) / estimator.Estimates[i].RawAbsolute, 1e-6);
        Assert.True(advice.Passes[1].SetPoint!.Value.DecimalFractions > advice.Passes[0].SetPoint!.Value.DecimalFractions + 0.01);
        SiteLimits strict = Site.WithSolids(SolidsLimit.Silica(MassConcentration.FromMilligramsPerLiter(60), MassConcentration.FromMilligramsPerLiter(60.1)));
        Assert.All(GeneratorAdvice.Of(estimator, Target, strict).Passes, pass => Assert.Equal(AdviceReason.NoRoom, pass.Reason));
    }

    // A meter that drifts is not corrected by moving the pass.
    [Fact]
    public void Of_PassInDisagreement_IsNotMoved()
    {
        GeneratorEstimator estimator = New();
        Plant[] plants = [new(1, 1), new(1, 2), new(1, 3) { Meter = t => 1 - (0.08 * Math.Min(1, Math.Max(0, (t - 400) / 800.0))) }];
        Run(estimator, plants, 1500);
        GeneratorAdvice advice = GeneratorAdvice.Of(estimator, MassFraction.FromPercent(75), Site);
        Assert.Equal(AdviceReason.NotBelievable, advice.Passes[2].Reason);
        Assert.Null(advice.Passes[2].FlowTrim);
        Assert.NotNull(advice.Next);
        Assert.Throws<ArgumentOutOfRangeException>(() => GeneratorAdvice.Of(estimator, MassFraction.FromPercent(100)));
    }

    // 1.645 for one-sided 95 %: JCGM 100:2008, table G.1 (two-sided 90 %).
    [Fact]
    public void Below_UsualConfidence_KeepsTheTabulatedMultiple()
    {
        Approx.Absolute(0.80 - (1.645 * 0.02), GuardBand.Below(MassFraction.FromPercent(80), MassFraction.FromDecimalFractions(0.02), Ratio.FromPercent(95)).DecimalFractions, 1e-5);
        Assert.Equal(0.80, GuardBand.Below(MassFraction.FromPercent(80), MassFraction.FromDecimalFractions(0.02), Ratio.FromPercent(50)).DecimalFractions, 12);
        Assert.Throws<ArgumentOutOfRangeException>(() => GuardBand.Below(MassFraction.FromPercent(80), MassFraction.Zero, Ratio.FromPercent(100)));
        Assert.Throws<ArgumentOutOfRangeException>(() => GuardBand.Below(MassFraction.FromPercent(180), MassFraction.Zero, Ratio.FromPercent(95)));
    }

    private static GeneratorEstimator New() => new(new SteamGenerator("three", [Named("a"), Named("b"), Named("c")]), EstimatorOptions.Default.WithCells(30));

    private static Plant[] Start3() => [.. Heats.Select((heat, i) => new Plant(heat, i + 1))];

    private static void Run(GeneratorEstimator estimator, Plant[] plants, int seconds)
    {
        for (int t = 0; t < seconds; t++) estimator.Update(new GeneratorReading(Midnight.AddSeconds(plants[0].Time), [.. plants.Select(plant => plant.Next())]));
    }

    /// <summary>A simulated pass whose flow can be moved.</summary>
    private sealed class Plant(double heat, int seed)
    {
        private readonly PassSimulator _simulator = new(KnownPass, Start with { RawAbsorbedHeat = heat * Start.RawAbsorbedHeat }, SimulatorOptions.Default.WithMeter(Plants.Meter));
        private readonly MathNet.Numerics.Distributions.Normal _noise = new(0, 1, new Random(seed));

        public double Flow { get; set; } = 1;

        public Func<int, double> Meter { get; set; } = static _ => 1;

        public int Time { get; private set; }

        public double Truth { get; private set; }

        public PassReading Next()
        {
            PassInstant now = _simulator.Advance(Start with { RawFeedFlow = Flow * Start.RawFeedFlow, RawAbsorbedHeat = heat * Start.RawAbsorbedHeat }, Duration.FromSeconds(1));
            Truth = now.TrueQuality.DecimalFractions;
            return Format.Read(Midnight.AddSeconds(Time++), Flow * Start.RawFeedFlow * (1 + (0.003 * _noise.Sample())), Start.RawFeedTemperature - 273.15, 100, Start.RawOutletPressure * 1e-6, now.Differential!.Value.Kilopascals * Meter(Time) * (1 + (0.005 * _noise.Sample())));
        }
    }
}
