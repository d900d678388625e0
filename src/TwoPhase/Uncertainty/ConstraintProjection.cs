using MathNet.Numerics.LinearAlgebra;

namespace TwoPhase.Uncertainty;

/// <summary>Constraints A y + B z = c with the unmeasured z eliminated, and the way back to z.</summary>
internal sealed class ConstraintProjection
{
    private const double RankTolerance = 1e-10;

    private readonly Matrix<double> _a;
    private readonly Vector<double> _c;
    private readonly Matrix<double>? _back;   // B⁺

    public ConstraintProjection(Matrix<double> a, Vector<double> c, Matrix<double>? b)
    {
        (_a, _c) = (a, c);
        IsObservable = [];
        (Constraints, RightHandSide) = (a, c);
        if (b is null) return;

        var svd = b.Svd(computeVectors: true);
        double cut = RankTolerance * svd.S.Maximum();
        int rank = svd.S.Count(value => value > cut);
        _back = Matrix<double>.Build.Dense(b.ColumnCount, b.RowCount);
        for (int k = 0; k < rank; k++)
            _back += svd.VT.Row(k).OuterProduct(svd.U.Column(k)) / svd.S[k];

        // A quantity is observable when no vector of the null space of B moves it.
        IsObservable = [.. Enumerable.Range(0, b.ColumnCount).Select(j => Enumerable.Range(rank, b.ColumnCount - rank).All(k => Math.Abs(svd.VT[k, j]) < 1e-8))];
        if (rank == b.RowCount) (Constraints, RightHandSide) = (null, null);
        else
        {
            Matrix<double> leftNull = svd.U.SubMatrix(0, b.RowCount, rank, b.RowCount - rank).Transpose();
            (Constraints, RightHandSide) = (leftNull * a, leftNull * c);
        }
    }

    /// <summary>G; null when the unmeasured quantities take up every constraint.</summary>
    public Matrix<double>? Constraints { get; }

    public Vector<double>? RightHandSide { get; }

    public bool[] IsObservable { get; }

    /// <summary>The unmeasured of least norm; those that are not observable might be others.</summary>
    public double[] Nearest(Vector<double> adjusted) => _back is null ? [] : (_back * (_c - (_a * adjusted))).ToArray();

    public double?[] UnmeasuredUncertainties(Matrix<double> adjustedCovariance)
    {
        if (_back is null) return [];
        Matrix<double> gain = _back * _a;
        return Observable((gain * adjustedCovariance * gain.Transpose()).Diagonal().Map(value => Math.Sqrt(Math.Max(value, 0))));
    }

    /// <summary>Null in the place of each that is not observable.</summary>
    public double?[] Observable(IEnumerable<double> values) => [.. values.Select((value, j) => IsObservable[j] ? value : (double?)null)];
}
