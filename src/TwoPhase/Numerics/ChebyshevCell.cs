namespace TwoPhase.Numerics;

/// <summary>
/// The polynomial through values at the Chebyshev-Lobatto nodes of a cell, in powers of s from −1 to 1. Both ends are nodes, so
/// that neighbouring cells meet.
/// </summary>
internal sealed class ChebyshevCell
{
    private readonly double[,] _coefficientByNode;

    public ChebyshevCell(int degree)
    {
        Nodes = new double[degree + 1];
        for (int k = 0; k <= degree; k++) Nodes[k] = -Math.Cos(Math.PI * k / degree);
        if (degree % 2 == 0) Nodes[degree / 2] = 0;
        _coefficientByNode = Lagrange(Nodes);
    }

    /// <summary>Where values are wanted, rising from −1 to 1.</summary>
    public double[] Nodes { get; }

    /// <summary>What the value at a node adds to the coefficient of s^power.</summary>
    public double Weight(int power, int node) => _coefficientByNode[power, node];

    // Column k holds the coefficients of the Lagrange polynomial Π (s − sj) / (sk − sj).
    private static double[,] Lagrange(double[] nodes)
    {
        int count = nodes.Length;
        var result = new double[count, count];
        for (int k = 0; k < count; k++)
        {
            result[0, k] = 1;
            int degree = 0;
            for (int j = 0; j < count; j++)
            {
                if (j == k) continue;
                double scale = 1 / (nodes[k] - nodes[j]);
                degree++;
                for (int power = degree; power >= 0; power--)
                    result[power, k] = scale * ((power > 0 ? result[power - 1, k] : 0) - (nodes[j] * result[power, k]));
            }
        }

        return result;
    }
}
