using FsCheck;
using FsCheck.Xunit;
using TwoPhase.Numerics;
using TwoPhase.Uncertainty;

namespace TwoPhase.Tests.Uncertainty;

public class NonlinearReconciliationTests
{
    private static double[,] Diagonal(double[] uncertainties)
    {
        double[,] covariance = new double[uncertainties.Length, uncertainties.Length];
        for (int i = 0; i < uncertainties.Length; i++) covariance[i, i] = uncertainties[i] * uncertainties[i];
        return covariance;
    }

    // Pai and Fisher, AIChE J. 34(5), 873-876 (1988): five measured, three unmeasured, six equations; data and solution as a public benchmark set prints them.
    [Fact]
    public void Solve_FiveMeasuredThreeNot_GivesThePublishedSolution()
    {
        int[] all = [.. Enumerable.Range(0, 8)];
        Balance[] balances =
        [
            new(v => (0.5 * v[0] * v[0]) - (0.7 * v[1]) + (v[2] * v[5]) + (v[1] * v[1] * v[5] * v[6]) + (2 * v[2] * v[7] * v[7]) - 255.8, all),
            new(v => v[0] - (2 * v[1]) + (3 * v[0] * v[2]) - (2 * v[1] * v[5]) - (v[1] * v[6] * v[7]) + 111.2, all),
            new(v => (v[2] * v[5]) - v[0] + (3 * v[1]) + (v[0] * v[6]) - (v[2] * Math.Sqrt(v[7])) - 33.57, all),
            new(v => v[3] - v[0] - (v[2] * v[2]) + v[6] + (3 * v[7]), all),
            new(v => v[4] - (2 * v[2] * v[6] * v[7]), all),
            new(v => (2 * v[0]) + (v[1] * v[2] * v[5]) + v[6] - v[7] - 126.6, all),
        ];
        double[] readings = [4.4, 5.5, 1.7, 1.6, 5.0];
        NonlinearReconciliation result = NonlinearReconciliation.Solve([.. readings, 11, 0.6, 2], [.. Enumerable.Repeat(1.0, 8)], [0, 1, 2, 3, 4], readings, Diagonal([1, 1, 1, 1, 1]), balances);

        double[] printed = [4.5124, 5.5819, 1.9260, 1.4560, 4.8545, 11.070, 0.61467, 2.0504];
        double[] half = [5e-5, 5e-5, 5e-5, 5e-5, 5e-5, 5e-4, 5e-6, 5e-5];
        for (int i = 0; i < 8; i++) Approx.Absolute(printed[i], result[i], 1.01 * half[i], $"value {i}");
        Assert.All(balances, balance => Approx.Absolute(0, balance.At([.. all.Select(i => result[i])]), 1e-9));
        Assert.Equal(3, result.Linear.DegreesOfFreedom);
    }

    // Swartz, Data reconciliation for generalized flowsheet applications, ACS 197th National Meeting (1989): the redundant part of a heat exchanger network,
    // flows and temperatures from a public benchmark set. The published result is not at hand, so the solution is held to what makes one: balances that
    // close, and Lagrange multipliers that explain every adjustment, with the slopes written out by hand.
    [Fact]
    public void Solve_HeatExchangerNetwork_MeetsTheConditionsOfALeastSquare()
    {
        // 0-2 flows of the split stream, together and each branch, 3 of the hot stream; 4 temperature at the split, 5, 6 where the branches end, 7 where they are mixed, 8, 9 of the hot stream.
        static double Cold(double t) => -6.8909 + (0.0991 * t) + (1.1081e-4 * t * t);
        static double ColdSlope(double t) => 0.0991 + (2 * 1.1081e-4 * t);
        static double Hot(double t) => -11.4172 + (0.1229 * t) + (7.94e-5 * t * t);
        static double HotSlope(double t) => 0.1229 + (2 * 7.94e-5 * t);
        Balance[] balances =
        [
            new(v => (v[0] - v[1] - v[2]) / 1000, 0, 1, 2),
            new(v => ((v[2] * (Cold(v[6]) - Cold(v[4]))) - (v[3] * (Hot(v[8]) - Hot(v[9])))) / 1e5, 2, 3, 4, 6, 8, 9),
            new(v => ((v[1] * Cold(v[5])) + (v[2] * Cold(v[6])) - (v[0] * Cold(v[7]))) / 1e5, 0, 1, 2, 5, 6, 7),
        ];
        double[] readings = [1000, 401.70, 552.70, 680.10, 481.78, 616.31, 619.00, 614.92, 667.84, 558.34];
        double[] uncertainties = [20, 0.02 * 401.70, 0.02 * 552.70, 0.02 * 680.10, 0.75, 0.75, 0.75, 0.75, 0.75, 0.75];
        NonlinearReconciliation result = NonlinearReconciliation.Solve(readings, readings, [.. Enumerable.Range(0, 10)], readings, Diagonal(uncertainties), balances);

        double[] v = [.. Enumerable.Range(0, 10).Select(i => result[i])];
        Assert.All(balances, balance => Approx.Absolute(0, balance.At(v), 1e-10));
        double[] force = [.. v.Select((value, i) => (readings[i] - value) / (uncertainties[i] * uncertainties[i]))];
        double total = force[3] / -(Hot(v[8]) - Hot(v[9])), mixed = force[5] / (v[1] * ColdSlope(v[5])), split = force[1] + (-mixed * Cold(v[5]));   // multipliers of exchanger, mixer, and minus that of the splitter
        double[] expected =
        [
            -split - (mixed * Cold(v[7])),
            split + (mixed * Cold(v[5])),
            split + (total * (Cold(v[6]) - Cold(v[4]))) + (mixed * Cold(v[6])),
            -total * (Hot(v[8]) - Hot(v[9])),
            -total * v[2] * ColdSlope(v[4]),
            mixed * v[1] * ColdSlope(v[5]),
            (total + mixed) * v[2] * ColdSlope(v[6]),
            -mixed * v[0] * ColdSlope(v[7]),
            -total * v[3] * HotSlope(v[8]),
            total * v[3] * HotSlope(v[9]),
        ];
        for (int i = 0; i < 10; i++) Approx.Relative(expected[i], force[i], 1e-6, $"force on value {i}");
        Approx.Relative(force.Select((f, i) => f * f * uncertainties[i] * uncertainties[i]).Sum(), result.Linear.GlobalStatistic, 1e-9);
    }

    // A product and its factors, relative errors: the logarithms are a linear problem, solved in closed form to first order in the errors.
    [Property]
    public void Solve_Product_SharesTheImbalanceByRelativeVariance(PositiveInt seed)
    {
        Random random = new(seed.Get);
        double[] truth = [1 + random.NextDouble(), 2 + random.NextDouble(), 0];
        truth[2] = truth[0] * truth[1];
        double[] relative = [.. truth.Select(_ => 1e-5 * (0.1 + random.NextDouble()))];
        double[] readings = [.. truth.Select((value, i) => value * (1 + (relative[i] * ((2 * random.NextDouble()) - 1))))];
        Balance[] balances = [new(v => (v[0] * v[1]) - v[2], 0, 1, 2)];
        NonlinearReconciliation result = NonlinearReconciliation.Solve(readings, truth, [0, 1, 2], readings, Diagonal([.. truth.Select((value, i) => value * relative[i])]), balances);

        double imbalance = Math.Log(readings[0] * readings[1] / readings[2]), total = relative.Sum(u => u * u);
        for (int i = 0; i < 3; i++)
        {
            double sign = i == 2 ? 1 : -1;
            Approx.Absolute(sign * imbalance * relative[i] * relative[i] / total, Math.Log(result[i] / readings[i]), 1e-9);
        }

        Approx.Relative(imbalance * imbalance / total, result.Linear.GlobalStatistic, 1e-3);
    }

    [Fact]
    public void Solve_NotDetermined_StaysNearTheGuess()
    {
        // y = z1 z2: neither factor is known; from (3, 3) the nearest pair is (2, 2).
        NonlinearReconciliation result = NonlinearReconciliation.Solve([4, 3, 3], [1, 1, 1], [0], [4.0], Diagonal([0.1]), [new(v => v[0] - (v[1] * v[2]), 0, 1, 2)]);
        Approx.Relative(2, result[1], 1e-9);
        Approx.Relative(2, result[2], 1e-9);
        Assert.False(result.IsDetermined(1));
        Assert.Equal(double.NaN, result.Uncertainty(2));
        Assert.True(result.IsDetermined(0));
        Assert.Null(result.Measurement(1));
    }

    [Fact]
    public void Solve_WithoutAnyPossibleState_SaysThatItDoesNotSettle() =>
        Assert.Throws<ConvergenceException>(() => NonlinearReconciliation.Solve([1, 1], [1, 1], [0, 1], [1.0, 1.0], Diagonal([1, 1]), [new(v => 1 + (v[0] * v[0]) + (v[1] * v[1]), 0, 1)]));
}
