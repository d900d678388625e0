using TwoPhase.Numerics;
using TwoPhase.Units;

namespace TwoPhase.Uncertainty;

/// <summary>Measurements adjusted to balances that are not linear, such as flow times enthalpy: linearised at the adjusted values and solved again until they stay.</summary>
/// <remarks>
/// <para>At the end f(ŷ, ẑ) = 0, and every test is that of the balances linearised there: of a straight line through the solution, not through the readings.</para>
/// <para>Range: errors over which the balances are nearly straight. Where quantities are not determined, those values are taken that lie nearest to the start.</para>
/// <para>Accuracy: values to 1e-10 of their scale.</para>
/// <para>Source: Knepper and Gorman, AIChE J. 26(2), 260-264 (1980); Pai and Fisher, AIChE J. 34(5), 873-876 (1988), with the slopes renewed at every step.</para>
/// </remarks>
internal sealed class NonlinearReconciliation
{
    private const int MostSteps = 60;
    private const double Settled = 1e-10, LongestMove = 0.2;   // in units of the scales; a longer step would leave what the slopes are good for

    private readonly double[] _values, _scales;
    private readonly int[] _place;   // among the measured, or the complement of that among the unmeasured

    private NonlinearReconciliation(double[] values, double[] scales, int[] place, LinearReconciliation linear) => (_values, _scales, _place, Linear) = (values, scales, place, linear);

    /// <summary>The balances linearised at the solution; every quantity in units of its scale, the measured ones as differences from it.</summary>
    public LinearReconciliation Linear { get; }

    /// <summary>The value of a quantity: adjusted, inferred, or where it is not determined one that the balances allow.</summary>
    public double this[int quantity] => _values[quantity];

    /// <param name="start">A first guess of every quantity; the nearer the better.</param>
    /// <param name="scales">What is a usual size of each, greater than zero.</param>
    /// <param name="measured">Indices of the measured quantities.</param>
    /// <param name="readings">What was measured, in that order.</param>
    /// <param name="covariance">Covariance of the readings.</param>
    /// <param name="balances">The balances.</param>
    /// <exception cref="ConvergenceException">The values did not settle.</exception>
    public static NonlinearReconciliation Solve(double[] start, double[] scales, int[] measured, double[] readings, double[,] covariance, IReadOnlyList<Balance> balances)
    {
        double[] values = (double[])start.Clone();
        int[] unmeasured = [.. Enumerable.Range(0, start.Length).Except(measured)];
        double[,] scaled = new double[measured.Length, measured.Length];
        for (int i = 0; i < measured.Length; i++)
            for (int j = 0; j < measured.Length; j++) scaled[i, j] = covariance[i, j] / (scales[measured[i]] * scales[measured[j]]);

        double change = double.NaN;
        for (int step = 1; step <= MostSteps; step++)
        {
            double[][] slopes = [.. balances.Select(balance => balance.Slopes(values, scales))];
            double[] imbalances = [.. balances.Select(balance => -balance.At(values))];
            if (!imbalances.All(Fast.IsFinite) || !slopes.All(row => row.All(Fast.IsFinite))) throw Unsettled(step, change);
            LinearReconciliation linear = LinearReconciliation.Solve(
                [.. measured.Select((quantity, i) => (readings[i] - values[quantity]) / scales[quantity])],
                scaled,
                Columns(slopes, measured),
                imbalances,
                Columns(slopes, unmeasured));

            change = Math.Max(linear.Adjusted.Max(Math.Abs), linear.NearestUnmeasured.Select(Math.Abs).DefaultIfEmpty().Max());
            double share = Math.Min(1, LongestMove / change);
            for (int i = 0; i < measured.Length; i++) values[measured[i]] += share * linear.Adjusted[i] * scales[measured[i]];
            for (int i = 0; i < unmeasured.Length; i++) values[unmeasured[i]] += share * linear.NearestUnmeasured[i] * scales[unmeasured[i]];
            if (change <= Settled) return new(values, scales, Places(measured, unmeasured), linear);
        }

        throw Unsettled(MostSteps, change);
    }

    /// <summary>Index among the measured; null where a quantity is not measured.</summary>
    public int? Measurement(int quantity) => _place[quantity] >= 0 ? _place[quantity] : null;

    /// <summary>Whether measurements and balances determine it.</summary>
    public bool IsDetermined(int quantity) => _place[quantity] >= 0 || Linear.Unmeasured[~_place[quantity]] is not null;

    /// <summary>Standard uncertainty of the adjusted or inferred value; NaN where it is not determined.</summary>
    public double Uncertainty(int quantity) =>
        _scales[quantity] * (_place[quantity] >= 0 ? Linear.AdjustedUncertainties[_place[quantity]] : Linear.UnmeasuredUncertainties[~_place[quantity]] ?? double.NaN);

    private static ConvergenceException Unsettled(int step, double change) =>
        new($"The reconciliation has not settled after {step} steps; the last moved a value by {Scale.None.Text(change, "G3")} of its scale. The readings are far from any state that the balances allow.");

    private static double[,] Columns(double[][] slopes, int[] quantities)
    {
        double[,] columns = new double[slopes.Length, quantities.Length];
        for (int i = 0; i < slopes.Length; i++)
            for (int j = 0; j < quantities.Length; j++) columns[i, j] = slopes[i][quantities[j]];
        return columns;
    }

    private static int[] Places(int[] measured, int[] unmeasured)
    {
        int[] places = new int[measured.Length + unmeasured.Length];
        for (int i = 0; i < measured.Length; i++) places[measured[i]] = i;
        for (int i = 0; i < unmeasured.Length; i++) places[unmeasured[i]] = ~i;
        return places;
    }
}
