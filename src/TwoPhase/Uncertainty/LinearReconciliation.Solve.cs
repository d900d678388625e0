using MathNet.Numerics.LinearAlgebra;
using TwoPhase.Numerics;
using TwoPhase.Units;

namespace TwoPhase.Uncertainty;

public sealed partial class LinearReconciliation
{
    private const double Negligible = 1e-10;        // of a column, of a variance
    private const double RankTolerance = 1e-13;     // of the largest eigenvalue: uncertainties may differ by some 10⁵

    private LinearReconciliation(Vector<double> measured, Matrix<double> covariance, ConstraintProjection projection, Matrix<double> all)
    {
        int count = measured.Count;
        Vector<double> adjusted = measured;
        _adjustedCovariance = covariance;
        _information = Matrix<double>.Build.Dense(count, count);
        Vector<double> forces = Vector<double>.Build.Dense(count);   // Gᵀ V⁻¹ r
        Imbalances = [];
        NodalTests = [];
        IsRedundant = new bool[count];

        if (projection.Constraints is { } g)
        {
            Vector<double> imbalance = (g * measured) - projection.RightHandSide;
            Matrix<double> v = g * covariance * g.Transpose();
            var (inverse, rank) = PseudoInverse(v, imbalance);
            Matrix<double> gain = covariance * g.Transpose() * inverse;
            forces = g.Transpose() * inverse * imbalance;
            _information = g.Transpose() * inverse * g;
            adjusted = measured - (gain * imbalance);
            // The same as S − S Gᵀ V⁻¹ G S, in the form that rounding cannot turn negative.
            Matrix<double> left = Matrix<double>.Build.DenseIdentity(count) - (gain * g);
            _adjustedCovariance = left * covariance * left.Transpose();
            GlobalStatistic = imbalance * inverse * imbalance;
            DegreesOfFreedom = rank;
            Imbalances = imbalance.ToArray();
            NodalTests = [.. imbalance.Select((r, i) => v[i, i] > 0 ? r / Math.Sqrt(v[i, i]) : 0)];
            IsRedundant = [.. Enumerable.Range(0, count).Select(j => g.Column(j).L2Norm() > Negligible * all.Column(j).L2Norm())];
        }

        Adjusted = adjusted.ToArray();
        Adjustments = (adjusted - measured).ToArray();
        AdjustedUncertainties = _adjustedCovariance.Diagonal().Map(variance => Math.Sqrt(Math.Max(variance, 0))).ToArray();
        MeasurementTests = [.. Enumerable.Range(0, count).Select(j => IsRedundant[j] ? forces[j] / Math.Sqrt(_information[j, j]) : 0)];
        Biases = [.. Enumerable.Range(0, count).Select(j => IsRedundant[j] ? new BiasEstimate(forces[j] / _information[j, j], 1 / Math.Sqrt(_information[j, j])) : new BiasEstimate(0, double.PositiveInfinity))];
        AdjustmentTests = [.. Enumerable.Range(0, count).Select(j => AdjustmentTest(Adjustments[j], covariance[j, j], _adjustedCovariance[j, j]))];
        NearestUnmeasured = projection.Nearest(adjusted);
        Unmeasured = projection.Observable(NearestUnmeasured);
        UnmeasuredUncertainties = projection.UnmeasuredUncertainties(_adjustedCovariance);
    }

    /// <summary>Adjusts measurements to constraints A y = 0 in which everything is measured, errors independent.</summary>
    /// <param name="measured">y.</param>
    /// <param name="standardUncertainties">Standard uncertainties of y, k = 1, not negative; 0 for a value that must not be moved.</param>
    /// <param name="constraints">A, one row for each constraint, one column for each measurement.</param>
    public static LinearReconciliation Solve(double[] measured, double[] standardUncertainties, double[,] constraints)
    {
        Require.NotNull(standardUncertainties, nameof(standardUncertainties));
        double[,] covariance = new double[standardUncertainties.Length, standardUncertainties.Length];
        for (int i = 0; i < standardUncertainties.Length; i++)
        {
            double u = Require.NotNegative(standardUncertainties[i], $"Standard uncertainty of measurement {i}", Scale.None, nameof(standardUncertainties));
            covariance[i, i] = u * u;
        }

        return Solve(measured, covariance, constraints);
    }

    /// <summary>Adjusts measurements to constraints A y + B z = c.</summary>
    /// <param name="measured">y.</param>
    /// <param name="covariance">S, covariance of the errors of y: symmetric, no negative variance.</param>
    /// <param name="constraints">A, one row for each constraint, one column for each measurement.</param>
    /// <param name="rightHandSide">c, one for each constraint; zeros when null.</param>
    /// <param name="unmeasured">B, one row for each constraint, one column for each unmeasured quantity; null when everything is measured.</param>
    /// <exception cref="ArgumentException">Sizes do not match, S is not a covariance matrix, or constraints contradict each other.</exception>
    public static LinearReconciliation Solve(double[] measured, double[,] covariance, double[,] constraints, double[]? rightHandSide = null, double[,]? unmeasured = null)
    {
        Vector<double> y = Vector<double>.Build.DenseOfArray(Finite(Require.NotNull(measured, nameof(measured)), nameof(measured)));
        Matrix<double> a = Matrix<double>.Build.DenseOfArray(Require.NotNull(constraints, nameof(constraints)));
        Matrix<double> s = Covariance(Require.NotNull(covariance, nameof(covariance)), y.Count);
        Vector<double> c = rightHandSide is null ? Vector<double>.Build.Dense(a.RowCount) : Vector<double>.Build.DenseOfArray(Finite(rightHandSide, nameof(rightHandSide)));
        Matrix<double>? b = unmeasured is null || unmeasured.GetLength(1) == 0 ? null : Matrix<double>.Build.DenseOfArray(unmeasured);
        Match(a.ColumnCount, y.Count, "columns for the measurements", nameof(constraints));
        Match(c.Count, a.RowCount, "values for the constraints", nameof(rightHandSide));
        Match(b?.RowCount ?? a.RowCount, a.RowCount, "rows for the constraints", nameof(unmeasured));
        return new(y, s, new ConstraintProjection(a, c, b), a);
    }

    // Of V scaled to a unit diagonal, so that balances in kg/s and in watts weigh the same in the decision on rank.
    private static (Matrix<double> Inverse, int Rank) PseudoInverse(Matrix<double> v, Vector<double> imbalance)
    {
        Vector<double> scale = v.Diagonal().Map(variance => variance > 0 ? 1 / Math.Sqrt(variance) : 1);
        Matrix<double> scaling = Matrix<double>.Build.DenseOfDiagonalVector(scale);
        var spectrum = (scaling * v * scaling).Evd(Symmetricity.Symmetric);
        Vector<double> scaled = scaling * imbalance;
        double cut = RankTolerance * Math.Max(spectrum.EigenValues.Max(value => value.Real), double.Epsilon);

        Matrix<double> inverse = Matrix<double>.Build.Dense(v.RowCount, v.ColumnCount);
        int rank = 0;
        for (int k = 0; k < v.RowCount; k++)
        {
            Vector<double> direction = spectrum.EigenVectors.Column(k);
            if (spectrum.EigenValues[k].Real > cut)
            {
                inverse += direction.OuterProduct(direction) / spectrum.EigenValues[k].Real;
                rank++;
            }
            else if (Math.Abs(direction * scaled) > 1e-6 * (1 + scaled.L2Norm()))
            {
                throw new ArgumentException($"The constraints contradict each other: whatever is adjusted, constraint {direction.AbsoluteMaximumIndex()} stays off by {Scale.None.Text(imbalance[direction.AbsoluteMaximumIndex()], "G4")}.");
            }
        }

        return (scaling * inverse * scaling, rank);
    }

    private static double AdjustmentTest(double adjustment, double before, double after)
    {
        double variance = before - after;
        return variance > Negligible * before ? Math.Abs(adjustment) / Math.Sqrt(variance) : 0;
    }

    private static Matrix<double> Covariance(double[,] covariance, int count)
    {
        Match(covariance.GetLength(0), count, "rows for the measurements", nameof(covariance));
        Match(covariance.GetLength(1), count, "columns for the measurements", nameof(covariance));
        Matrix<double> s = Matrix<double>.Build.DenseOfArray(covariance);
        Matrix<double> correlation = Matrix<double>.Build.DenseIdentity(count);
        for (int i = 0; i < count; i++)
        {
            Require.NotNegative(s[i, i], $"Variance of measurement {i}", Scale.None, nameof(covariance));
            for (int j = 0; j < i; j++)
            {
                double limit = Math.Sqrt(s[i, i] * s[j, j]);
                correlation[i, j] = correlation[j, i] = limit > 0 ? s[i, j] / limit : 0;
                if (!(Math.Abs(s[i, j]) <= limit * (1 + 1e-9) && Math.Abs(s[i, j] - s[j, i]) <= 1e-9 * limit))
                    throw new ArgumentException($"Covariance of measurements {j} and {i} is {Scale.None.Text(s[i, j])} and {Scale.None.Text(s[j, i])}; both must be the same and at most {Scale.None.Text(limit)} in size.", nameof(covariance));
            }
        }

        double least = correlation.Evd(Symmetricity.Symmetric).EigenValues.Min(value => value.Real);
        return least > -1e-9 ? s : throw new ArgumentException($"The covariances contradict each other: their correlation matrix has an eigenvalue of {Scale.None.Text(least, "G3")}.", nameof(covariance));
    }

    private static double[] Finite(double[] values, string parameter)
    {
        int bad = Array.FindIndex(values, value => !Fast.IsFinite(value));
        return bad < 0 ? values : throw new ArgumentException($"Value {bad} is {Scale.None.Text(values[bad])}; it must be a finite number.", parameter);
    }

    private static void Match(int actual, int expected, string what, string parameter)
    {
        if (actual != expected) throw new ArgumentException($"There are {actual} {what}; there must be {expected}.", parameter);
    }
}
