using FsCheck;
using FsCheck.Xunit;
using TwoPhase.Uncertainty;

namespace TwoPhase.Tests.Uncertainty;

public class LinearReconciliationTests
{
    // Narasimhan and Jordache, Data Reconciliation and Gross Error Detection (2000): heat exchanger with bypass, six flows, four nodes, S = I.
    private static readonly double[,] Bypass = { { 1, -1, -1, 0, 0, 0 }, { 0, 1, 0, -1, 0, 0 }, { 0, 0, 1, 0, -1, 0 }, { 0, 0, 0, 1, 1, -1 } };
    private static readonly double[] BypassFlows = [101.91, 64.45, 34.65, 64.20, 36.44, 98.88];

    private static double[] Ones(int count) => [.. Enumerable.Repeat(1.0, count)];

    private static void AssertAll(double[] expected, IEnumerable<double> actual, double tolerance)
    {
        double[] values = [.. actual];
        Assert.Equal(expected.Length, values.Length);
        for (int i = 0; i < expected.Length; i++) Approx.Absolute(expected[i], values[i], tolerance, $"value {i}");
    }

    [Fact]
    public void Solve_ExchangerWithBypass_GivesTheBooksValues()
    {
        LinearReconciliation result = LinearReconciliation.Solve(BypassFlows, Ones(6), Bypass);

        AssertAll([100.22, 64.50, 35.72, 64.50, 35.72, 100.22], result.Adjusted, 0.005);    // the book's digits
        // Recomputed independently of this library, all digits.
        Approx.Absolute(6.40750, result.GlobalStatistic, 5e-6);
        Approx.Absolute(9.4877, result.GlobalCriticalValue(), 5e-5);
        Assert.True(result.PassesGlobalTest());
        Assert.Equal(4, result.DegreesOfFreedom);
        AssertAll([2.0698, -0.0612, -1.3105, -0.3674, 0.8818, -1.6412], result.MeasurementTests, 5e-5);
        AssertAll([1.6224, 0.1768, -1.2657, 1.0161], result.NodalTests, 5e-5);
        AssertAll([.. Enumerable.Repeat(Math.Sqrt(1 / 3.0), 6)], result.AdjustedUncertainties, 1e-12);
    }

    [Fact]
    public void Solve_ExchangerWithBiasOfFour_NamesTheStream()
    {
        double[] biased = (double[])BypassFlows.Clone();
        biased[1] = 68.45;
        LinearReconciliation result = LinearReconciliation.Solve(biased, Ones(6), Bypass);

        Approx.Absolute(16.674, result.GlobalStatistic, 5e-4);    // the book's digits
        Assert.False(result.PassesGlobalTest());
        AssertAll([100.88667, 65.83333, 35.05333], result.Adjusted.Take(3), 5e-6);
        Approx.Absolute(3.2047, result.MeasurementTests[1], 5e-5);
        Approx.Absolute(2.6310, LinearReconciliation.SimultaneousCriticalValue(6), 5e-5);
        Approx.Absolute(3.0052, result.NodalTests[1], 5e-5);
        Approx.Absolute(2.4909, LinearReconciliation.SimultaneousCriticalValue(4), 5e-5);
        Approx.Absolute(10.27042, result.Biases[1].Statistic, 5e-6);
        Approx.Absolute(3.925, result.Biases[1].Size, 5e-4);
        Approx.Absolute(6.04007, result.Biases[5].Statistic, 5e-6);
        Assert.Equal(1, result.Biases.Select((bias, j) => (bias.Statistic, j)).Max().j);
    }

    // VDI 2048 Blatt 1, annex: steam turbine cycle, half-widths at 95 %. Results as printed in the guideline, from a public regression test.
    private static LinearReconciliation TurbineCycle(double feedHalfWidth1, double feedHalfWidth2)
    {
        double[] measured = [46.241, 45.668, 44.575, 44.319, 0.525, 69.978, 10.364, 3.744, 4.391, 18.498, 2.092];
        double[] halfWidths = [feedHalfWidth1, feedHalfWidth2, 0.535, 0.532, 0.105, 0.854, 0.168, 0.058, 0.058, 0.205, 0.272];
        double[,] covariance = new double[11, 11];
        for (int i = 0; i < 11; i++) covariance[i, i] = halfWidths[i] * halfWidths[i] / (1.96 * 1.96);
        covariance[0, 1] = covariance[1, 0] = 0.2 * Math.Sqrt(covariance[0, 0] * covariance[1, 1]);
        covariance[2, 3] = covariance[3, 2] = 0.4 * Math.Sqrt(covariance[2, 2] * covariance[3, 3]);
        double[,] balances =
        {
            { 1, 1, -1, -1, 0.4, 0, 0, 0, 0, 0, 0 },
            { 0, 0, 1, 1, -1, -1, -1, -1, -1, 0, 0 },
            { 0, 0, 0, 0, 0, 0, 1, 1, 1, -1, 0 },
        };
        return LinearReconciliation.Solve(measured, covariance, balances);
    }

    [Fact]
    public void Solve_TurbineCycleOfVdi2048_GivesThePrintedValues()
    {
        LinearReconciliation result = TurbineCycle(0.800, 0.790);

        AssertAll([44.964489, 44.417972, 44.925904, 44.667096, 0.526348, 70.553061, 10.375783, 3.745404, 4.392404, 18.513592, 2.092], result.Adjusted, 5.5e-7);
        AssertAll(
            [0.575627, 0.572818, 0.404463, 0.402919, 0.104623, 0.559873, 0.133003, 0.056695, 0.056695, 0.137103, 0.272],
            result.AdjustedUncertainties.Select(u => 1.96 * u),
            5.5e-7);
        Approx.Absolute(20.3096, result.GlobalStatistic, 5e-5);
        Approx.Absolute(7.8147, result.GlobalCriticalValue(), 5e-5);
        Approx.Absolute(89.277192, result.Adjusted[0] + result.Adjusted[1] - (0.2 * result.Adjusted[4]), 5.5e-7);
        Assert.True(result.AdjustmentTests[0] > 1.96);
        Assert.False(result.IsRedundant[10]);
        Assert.True(result.IsRedundant.Take(10).All(redundant => redundant));
    }

    [Fact]
    public void Solve_TurbineCycleWithWiderFeed_PassesTheTest()
    {
        LinearReconciliation result = TurbineCycle(2.5, 2.5);
        AssertAll([44.695957, 44.122957, 44.642627, 44.386086, 0.524499, 70.004962, 10.364203, 3.744024, 4.391024, 18.499251], result.Adjusted.Take(10), 5.5e-7);
        Approx.Absolute(2.53701, result.GlobalStatistic, 5e-6);
        Assert.True(result.PassesGlobalTest());
    }

    // Rosenberg, Mah and Iordache, Ind. Eng. Chem. Res. 26, 555-564 (1987): seven streams, four nodes, S = I; results recomputed independently.
    [Fact]
    public void Solve_SevenStreamRecycle_GivesTheRecomputedValues()
    {
        double[,] nodes = { { 1, -1, 0, 1, 0, 1, 0 }, { 0, 1, -1, 0, 0, 0, 0 }, { 0, 0, 1, -1, -1, 0, 0 }, { 0, 0, 0, 0, 1, -1, -1 } };
        LinearReconciliation result = LinearReconciliation.Solve([5.026, 14.722, 14.721, 4.968, 10.088, 5.131, 4.835], Ones(7), nodes);
        AssertAll([4.905, 14.7986, 14.7986, 4.8138, 9.9849, 5.0799, 4.905], result.Adjusted, 5e-5);
        Approx.Absolute(0.06848, result.GlobalStatistic, 5e-6);
    }

    // Serth and Heenan, AIChE J. 32(5), 733-742 (1986): steam metering of a plant, 28 flows and 11 nodes; data from a public benchmark set, statistics recomputed independently.
    [Fact]
    public void Solve_SteamMeteringOfAPlant_GivesTheRecomputedValues()
    {
        double[] flows = [0.875, 0.989, 108.426, 107.799, 50.149, 110.327, 2.201, 165.779, 0.821, 51.779, 14.757, 67.183, 107.734, 89.855, 58.554, 23.258, 31.879, 15.843, 7.920, 10.130, 91.047, 5.555, 2.471, 44.687, 81.656, 82.839, 70.685, 72.913];
        double[] uncertainties = [0.022, 0.025, 2.796, 2.749, 1.332, 2.807, 0.058, 4.101, 0.021, 1.310, 0.372, 1.682, 2.782, 2.297, 1.500, 0.591, 0.818, 0.406, 0.196, 0.263, 2.183, 0.136, 0.065, 1.166, 2.137, 2.033, 1.770, 1.806];
        int[][] into = [[1, 2, 4], [7, 8], [5], [10, 11], [3, 13], [6], [14, 18], [15, 22], [12, 16], [19, 23, 27], [20, 26, 28]];
        int[][] outOf = [[3], [5, 6, 9], [1, 10], [12], [11, 14, 15, 16, 17], [2, 13], [7, 19, 20, 21], [18, 23, 24], [22, 25], [26], [8]];
        double[,] nodes = new double[11, 28];
        for (int i = 0; i < 11; i++)
        {
            foreach (int j in into[i]) nodes[i, j - 1] = 1;
            foreach (int j in outOf[i]) nodes[i, j - 1] = -1;
        }

        LinearReconciliation result = LinearReconciliation.Solve(flows, uncertainties, nodes);
        AssertAll([1.237, 6.683, -2.505, -0.647, -2.143, 1.604, -5.6, 1.108, 3.23, -1.763, 0.103], Enumerable.Range(0, 11).Select(i => Enumerable.Range(0, 28).Sum(j => nodes[i, j] * flows[j])), 5e-4);
        Approx.Absolute(10.68569, result.GlobalStatistic, 5e-6);
        Approx.Absolute(19.6751, result.GlobalCriticalValue(), 5e-5);
        Approx.Absolute(2.5125, result.MeasurementTests.Max(Math.Abs), 5e-5);
        Assert.Equal(7, 1 + result.MeasurementTests.Select((z, j) => (Math.Abs(z), j)).Max().j);
    }

    [Fact]
    public void Solve_UnmeasuredStream_IsTheLimitOfInfiniteUncertainty()
    {
        // The bypass with its stream 3 not measured, against the same stream measured with no confidence at all.
        double[,] measured = { { 1, -1, 0, 0, 0 }, { 0, 1, -1, 0, 0 }, { 0, 0, 0, -1, 0 }, { 0, 0, 1, 1, -1 } };
        double[,] unmeasured = { { -1 }, { 0 }, { 1 }, { 0 } };
        double[] flows = [101.91, 64.45, 64.20, 36.44, 98.88];
        double[,] unit = new double[5, 5];
        for (int i = 0; i < 5; i++) unit[i, i] = 1;
        LinearReconciliation result = LinearReconciliation.Solve(flows, unit, measured, null, unmeasured);
        LinearReconciliation limit = LinearReconciliation.Solve([101.91, 64.45, 0, 64.20, 36.44, 98.88], [1, 1, 1e3, 1, 1, 1], Bypass);

        AssertAll([limit.Adjusted[0], limit.Adjusted[1], limit.Adjusted[3], limit.Adjusted[4], limit.Adjusted[5]], result.Adjusted, 1e-4);
        Approx.Absolute(limit.Adjusted[2], result.Unmeasured[0]!.Value, 1e-4);
        Approx.Absolute(limit.AdjustedUncertainties[2], result.UnmeasuredUncertainties[0]!.Value, 1e-4);
        Assert.Equal(3, result.DegreesOfFreedom);
    }

    [Fact]
    public void Solve_UnmeasuredPair_IsReportedAsNotObservable()
    {
        // y1 = z1 + z2 and y1 = y2: the split z1, z2 cannot be known, y can be checked.
        LinearReconciliation result = LinearReconciliation.Solve([10.2, 9.8], new double[,] { { 1, 0 }, { 0, 1 } }, new double[,] { { 1, 0 }, { 1, -1 } }, null, new double[,] { { -1, -1 }, { 0, 0 } });
        AssertAll([10, 10], result.Adjusted, 1e-12);
        Assert.All(result.Unmeasured, Assert.Null);
        Assert.All(result.UnmeasuredUncertainties, Assert.Null);
        Assert.Equal(1, result.DegreesOfFreedom);
        Approx.Absolute(1, Math.Abs(result.TestCorrelation(0, 1)), 1e-12);
    }

    // Any four-node network, any uncertainties: balances close, no value gets less certain, and what is adjusted once stays when adjusted again.
    [Property]
    public void Solve_AnyUncertainties_ClosesTheBalancesAndNeverLosesCertainty(PositiveInt seed)
    {
        Random random = new(seed.Get);
        double[] flows = [.. BypassFlows.Select(flow => flow * (0.8 + (0.4 * random.NextDouble())))];
        double[] uncertainties = [.. Enumerable.Range(0, 6).Select(_ => Math.Exp(4 * (random.NextDouble() - 0.5)))];
        LinearReconciliation result = LinearReconciliation.Solve(flows, uncertainties, Bypass);
        LinearReconciliation again = LinearReconciliation.Solve([.. result.Adjusted], uncertainties, Bypass);
        for (int i = 0; i < 4; i++) Approx.Absolute(0, Enumerable.Range(0, 6).Sum(j => Bypass[i, j] * result.Adjusted[j]), 1e-9);
        for (int j = 0; j < 6; j++) Assert.True(result.AdjustedUncertainties[j] <= uncertainties[j] * (1 + 1e-12));
        AssertAll([.. result.Adjusted], again.Adjusted, 1e-9);
        Approx.Absolute(0, again.GlobalStatistic, 1e-12);
    }

    [Fact]
    public void Solve_NoRedundancy_LeavesEverythingAsMeasured()
    {
        LinearReconciliation result = LinearReconciliation.Solve([10], new double[,] { { 1 } }, new double[,] { { 1 } }, null, new double[,] { { -1 } });
        Assert.Equal(10, result.Adjusted[0]);
        Approx.Absolute(10, result.Unmeasured[0]!.Value, 1e-12);
        Approx.Absolute(1, result.UnmeasuredUncertainties[0]!.Value, 1e-12);
        Assert.Equal(0, result.DegreesOfFreedom);
        Assert.False(result.IsRedundant[0]);
        Assert.True(result.PassesGlobalTest());
        Assert.Equal(double.PositiveInfinity, result.Biases[0].StandardUncertainty);
    }

    [Fact]
    public void Solve_RepeatedConstraint_ChangesNothing()
    {
        double[,] twice = new double[5, 6];
        for (int i = 0; i < 5; i++)
            for (int j = 0; j < 6; j++) twice[i, j] = 1e6 * Bypass[i % 4, j];    // scaled as well: a balance in watts is no heavier than one in kg/s
        LinearReconciliation once = LinearReconciliation.Solve(BypassFlows, Ones(6), Bypass), result = LinearReconciliation.Solve(BypassFlows, Ones(6), twice);
        AssertAll([.. once.Adjusted], result.Adjusted, 1e-9);
        Assert.Equal(4, result.DegreesOfFreedom);
        Approx.Absolute(once.GlobalStatistic, result.GlobalStatistic, 1e-9);
    }

    [Fact]
    public void Solve_CorrelatedErrors_MeasurementTestSquaredIsTheLikelihoodRatio()
    {
        LinearReconciliation result = TurbineCycle(0.8, 0.79);
        for (int j = 0; j < 10; j++) Approx.Relative(result.Biases[j].Statistic, result.MeasurementTests[j] * result.MeasurementTests[j], 1e-12);
    }

    [Fact]
    public void Solve_BiasTakenOut_LowersTheGlobalStatisticByItsOwn()
    {
        double[] corrected = (double[])BypassFlows.Clone();
        LinearReconciliation before = LinearReconciliation.Solve(BypassFlows, Ones(6), Bypass);
        corrected[0] -= before.Biases[0].Size;
        Approx.Absolute(before.GlobalStatistic - before.Biases[0].Statistic, LinearReconciliation.Solve(corrected, Ones(6), Bypass).GlobalStatistic, 1e-9);
    }

    [Fact]
    public void Solve_ManyNoisySets_RejectsAboutTheStatedShare()
    {
        double[] truth = [100, 64, 36, 64, 36, 100];
        System.Random random = new(5);
        MathNet.Numerics.Distributions.Normal noise = new(0, 1, random);
        int global = 0, single = 0;
        const int sets = 2000;
        double critical = LinearReconciliation.SimultaneousCriticalValue(6);
        for (int n = 0; n < sets; n++)
        {
            LinearReconciliation result = LinearReconciliation.Solve([.. truth.Select(flow => flow + noise.Sample())], Ones(6), Bypass);
            if (!result.PassesGlobalTest()) global++;
            if (result.MeasurementTests.Any(z => Math.Abs(z) > critical)) single++;
        }

        double tolerance = 4 * Math.Sqrt(0.05 * 0.95 / sets);
        Approx.Absolute(0.05, global / (double)sets, tolerance);
        Assert.True(single / (double)sets <= 0.05 + tolerance);   // Šidák's level is a bound when tests are correlated
    }

    [Fact]
    public void Solve_BadInput_ThrowsSayingWhich()
    {
        double[,] sum = { { 1, -1 } };
        double[,] unit = { { 1, 0 }, { 0, 1 } };
        Assert.Contains("columns", Assert.Throws<ArgumentException>(() => LinearReconciliation.Solve([1, 2, 3], new double[3, 3], sum)).Message, StringComparison.Ordinal);
        Assert.Contains("Value 1 is NaN", Assert.Throws<ArgumentException>(() => LinearReconciliation.Solve([1, double.NaN], unit, sum)).Message, StringComparison.Ordinal);
        Assert.Throws<ArgumentException>(() => LinearReconciliation.Solve([1, 2], unit, sum, [1, 2]));
        Assert.Throws<ArgumentException>(() => LinearReconciliation.Solve([1, 2], unit, sum, null, new double[2, 1]));
        Assert.Contains("Covariance of measurements 0 and 1", Assert.Throws<ArgumentException>(() => LinearReconciliation.Solve([1, 2], new double[,] { { 1, 2 }, { 2, 1 } }, sum)).Message, StringComparison.Ordinal);
        Assert.Throws<ArgumentOutOfRangeException>(() => LinearReconciliation.Solve([1, 2], [1, -1], sum));
        Assert.Contains("contradict", Assert.Throws<ArgumentException>(() => LinearReconciliation.Solve([1, 2], unit, new double[,] { { 1, -1 }, { 1, -1 } }, [0, 1])).Message, StringComparison.Ordinal);
        Assert.Throws<ArgumentOutOfRangeException>(() => LinearReconciliation.SimultaneousCriticalValue(0));
        Assert.Throws<ArgumentOutOfRangeException>(() => LinearReconciliation.Solve([1, 2], unit, sum).GlobalCriticalValue(1));
    }
}
