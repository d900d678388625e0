using MathNet.Numerics.Distributions;
using TwoPhase.Uncertainty;

namespace TwoPhase.Tests.Uncertainty;

/// <summary>The examples of JCGM 101:2008, clause 9. Printed results from memory; closed forms beside them where there are any.</summary>
public class MeasurementFunctionMonteCarloTests
{
    private const int Trials = 100_000;
    private static readonly double Root3 = Math.Sqrt(3);

    private static MeasurementFunction Sum(params UncertainInput[] inputs) => new(v => v[0] + v[1] + v[2] + v[3], inputs);

    private static UncertainInput Rectangular(string name, double standardUncertainty) =>
        UncertainInput.FromBounds(name, -Root3 * standardUncertainty, Root3 * standardUncertainty);

    // 9.2.2: four standard normal inputs; u = 2.0, [−3.92, 3.92] by both methods.
    [Fact]
    public void Simulate_FourNormalInputs_AgreesWithTheLawOfPropagation()
    {
        MeasurementFunction sum = Sum([.. "abcd".Select(c => new UncertainInput(c.ToString(), 0, 1))]);
        MonteCarloResult drawn = sum.Simulate(Trials);
        UncertaintyBudget budget = sum.Propagate();

        Approx.Relative(2, budget.StandardUncertainty, 1e-9);
        Approx.Absolute(0, drawn.Mean, 4 * 2 / Math.Sqrt(Trials));
        Approx.Relative(2, drawn.StandardUncertainty, 4 / Math.Sqrt(2.0 * Trials));
        Approx.Absolute(-3.92, drawn.SymmetricInterval().Low, EndTolerance(2));
        Approx.Absolute(3.92, drawn.SymmetricInterval().High, EndTolerance(2));
        Approx.Absolute(2 * 3.92, drawn.ShortestInterval().Width, 2 * EndTolerance(2));
    }

    // 9.2.3: four rectangular inputs of u = 1; the ends are ±2√3·(2 − (3/5)^¼) = ±3.88 exactly, where the law of propagation says ±3.92.
    [Fact]
    public void Simulate_FourRectangularInputs_GivesTheExactInterval()
    {
        MeasurementFunction sum = Sum([.. "abcd".Select(c => Rectangular(c.ToString(), 1))]);
        double exact = 2 * Root3 * (2 - Math.Pow(0.6, 0.25));
        Approx.Absolute(3.88, exact, 0.005);

        CoverageInterval interval = sum.Simulate(Trials).SymmetricInterval();
        Approx.Absolute(-exact, interval.Low, EndTolerance(2));
        Approx.Absolute(exact, interval.High, EndTolerance(2));
        Approx.Absolute(3.92, sum.Propagate().ExpandedUncertainty(), 0.005);
    }

    // 9.2.4: one rectangular input of u = 10 beside three of u = 1; printed u = 10.1, [−17.0, 17.0] against ±19.9.
    [Fact]
    public void Simulate_OneDominantRectangularInput_IsNarrowerThanTheLawOfPropagation()
    {
        MeasurementFunction sum = Sum(Rectangular("a", 1), Rectangular("b", 1), Rectangular("c", 1), Rectangular("d", 10));
        MonteCarloResult drawn = sum.Simulate(Trials);
        Approx.Absolute(10.1, drawn.StandardUncertainty, 0.05);
        Approx.Absolute(17.0, drawn.SymmetricInterval().High, 0.1);
        Approx.Absolute(-17.0, drawn.SymmetricInterval().Low, 0.1);
        Approx.Absolute(19.9, sum.Propagate().ExpandedUncertainty(), 0.05);
    }

    // 9.3: mass calibration, in mg. Printed: law of propagation (first order) 1.2340, u 0.0539; Monte Carlo 1.2341, u 0.0754, [1.0834, 1.3825].
    [Fact]
    public void Simulate_MassCalibration_SeesTheProductThatTheLawOfPropagationMisses()
    {
        MeasurementFunction mass = new(
            v => ((v["mRc"] + v["δmRc"]) * (1 + ((v["ρa"] - 1.2) * ((1 / v["ρW"]) - (1 / v["ρR"]))))) - 100_000,
            new UncertainInput("mRc", 100_000, 0.050),
            new UncertainInput("δmRc", 1.234, 0.020),
            UncertainInput.FromBounds("ρa", 1.10, 1.30),
            UncertainInput.FromBounds("ρW", 7000, 9000),
            UncertainInput.FromBounds("ρR", 7950, 8050));

        UncertaintyBudget budget = mass.Propagate();
        Approx.Absolute(1.2340, budget.Value, 1e-6);
        Approx.Absolute(0.0539, budget.StandardUncertainty, 5e-5);
        MonteCarloResult drawn = mass.Simulate(Trials);
        Approx.Absolute(1.2341, drawn.Mean, 5e-4);
        Approx.Absolute(0.0754, drawn.StandardUncertainty, 4e-4);
        Approx.Absolute(1.0834, drawn.SymmetricInterval().Low, 0.002);
        Approx.Absolute(1.3825, drawn.SymmetricInterval().High, 0.002);
    }

    // 9.4: comparison loss Y = X₁² + X₂², u = 0.005, in units of 1e-6. Mean x₁² + 2u² and variance 4u²x₁² + 4u⁴(1 + r²) are exact; the shortest
    // intervals are the printed ones.
    [Theory]
    [InlineData(0, 0, 0, 150)]
    [InlineData(0.010, 0, 0, 367)]
    [InlineData(0.050, 0, 1590, 3543)]
    [InlineData(0, 0.9, 0, 185)]
    [InlineData(0.010, 0.9, 13, 398)]
    [InlineData(0.050, 0.9, 1628, 3555)]
    public void Simulate_ComparisonLoss_GivesMomentsAndShortestInterval(double x1, double r, double low, double high)
    {
        const double u = 0.005;
        MeasurementFunction loss = new(v => (v[0] * v[0]) + (v[1] * v[1]), new UncertainInput("X1", x1, u), new UncertainInput("X2", 0, u));
        MonteCarloResult drawn = loss.WithCorrelation("X1", "X2", r).Simulate(Trials);

        double deviation = Math.Sqrt((4 * u * u * x1 * x1) + (4 * u * u * u * u * (1 + (r * r))));
        Approx.Absolute((x1 * x1) + (2 * u * u), drawn.Mean, 4 * deviation / Math.Sqrt(Trials));
        Approx.Relative(deviation, drawn.StandardUncertainty, 0.02);
        Approx.Absolute(low * 1e-6, drawn.ShortestInterval().Low, 0.06 * deviation);
        Approx.Absolute(high * 1e-6, drawn.ShortestInterval().High, 0.06 * deviation);
    }

    [Fact]
    public void Simulate_SameSeed_GivesTheSameInSerialAndInParallel()
    {
        MeasurementFunction product = new(
            v => v["a"] * v["b"] / v["c"],
            new UncertainInput("a", 3, 0.1),
            new UncertainInput("b", 2, 0.1).WithDegreesOfFreedom(5),
            UncertainInput.FromDistribution("c", new Triangular(1, 2, 1.5)));
        MonteCarloResult serial = product.Simulate(30_000, seed: 7), parallel = product.Simulate(30_000, seed: 7, parallel: true);
        Assert.Equal(serial.Sorted, parallel.Sorted);
        Assert.NotEqual(serial.Mean, product.Simulate(30_000, seed: 8).Mean);
    }

    [Fact]
    public async Task Simulate_OneDistributionInManyRuns_IsNotDisturbed()
    {
        MeasurementFunction shared = new(v => v[0], UncertainInput.FromDistribution("x", new LogNormal(0, 0.3)));
        double alone = shared.Simulate(20_000).Mean;
        double[] together = await Task.WhenAll(Enumerable.Range(0, 8).Select(_ => Task.Run(() => shared.Simulate(20_000).Mean)));
        Assert.All(together, mean => Assert.Equal(alone, mean));
    }

    [Fact]
    public void Simulate_FullyCorrelatedInputs_CancelInTheDifference()
    {
        MeasurementFunction difference = new(v => v["a"] - v["b"], new UncertainInput("a", 3, 0.1), new UncertainInput("b", 2, 0.1));
        MonteCarloResult drawn = difference.WithCorrelation("a", "b", 1).Simulate(1000);
        Approx.Absolute(0, drawn.StandardUncertainty, 1e-9);
        Approx.Absolute(1, drawn.Mean, 1e-9);
    }

    [Fact]
    public void Simulate_FewObservations_DrawsStudentsT()
    {
        // Variance of t is ν/(ν − 2): 5/3 of the squared scale for ν = 5.
        MonteCarloResult drawn = new MeasurementFunction(v => v[0], new UncertainInput("x", 0, 1).WithDegreesOfFreedom(5)).Simulate(Trials);
        Approx.Relative(Math.Sqrt(5.0 / 3), drawn.StandardUncertainty, 0.02);
        Approx.Absolute(2.571, drawn.SymmetricInterval().High, 0.05);   // t95(5), JCGM 100:2008, table G.2: 2.57
    }

    [Fact]
    public void SimulateUntilSettled_MoreDigits_TakesMoreTrials()
    {
        MeasurementFunction sum = Sum([.. "abcd".Select(c => Rectangular(c.ToString(), 1))]);
        MonteCarloResult one = sum.SimulateUntilSettled(1), two = sum.SimulateUntilSettled(2);
        Assert.True(one.Settled && two.Settled);
        Assert.True(two.Trials > one.Trials);
        Approx.Absolute(2.0, two.StandardUncertainty, 0.05);
        Assert.False(sum.SimulateUntilSettled(3, mostTrials: 20_000).Settled);
    }

    [Fact]
    public void Simulate_BadInput_Throws()
    {
        UncertainInput x = new("x", 1, 0.1), bounded = UncertainInput.FromBounds("y", 0, 1);
        Assert.Throws<ArgumentOutOfRangeException>(() => new MeasurementFunction(v => v[0], x).Simulate(10));
        Assert.Throws<ArgumentOutOfRangeException>(() => new MeasurementFunction(v => v[0], x).SimulateUntilSettled(0));
        Assert.Contains("y", Assert.Throws<ArgumentException>(() => new MeasurementFunction(v => v[0] + v[1], x, bounded).WithCorrelation("x", "y", 0.5).Simulate()).Message, StringComparison.Ordinal);
        MeasurementFunction root = new(v => Math.Sqrt(v[0]), new UncertainInput("x", 0, 1));
        Assert.Throws<ArithmeticException>(() => root.Simulate());
        Assert.Throws<ArithmeticException>(() => root.Simulate(parallel: true));
    }

    // Four standard errors of a 97.5 % quantile of a normal result: u·√(p(1 − p)/M)/φ(1.96).
    private static double EndTolerance(double u) => 0.005 + (4 * u * Math.Sqrt(0.025 * 0.975 / Trials) / 0.0584);
}
