using System.Runtime.CompilerServices;

namespace TwoPhase.Numerics;

/// <summary>
/// The polynomial through values at nodes of a cell, in powers of s from −1 to 1. The nodes are the zeros of a Chebyshev polynomial,
/// stretched until the outer two are the ends, so that neighbouring cells meet.
/// </summary>
internal sealed class ChebyshevCell
{
    // By power, then node; one row after the other, since an array of two dimensions is slower to reach, and to compile.
    private readonly double[] _coefficientByNode;

    public ChebyshevCell(int degree)
    {
        int count = degree + 1;
        Nodes = new double[count];
        for (int k = 0; k < count; k++) Nodes[k] = -Math.Cos(Math.PI * ((2 * k) + 1) / (2 * count)) / Math.Cos(Math.PI / (2 * count));
        if (degree % 2 == 0) Nodes[degree / 2] = 0;
        Nodes[degree] = 1;
        _coefficientByNode = Lagrange(Nodes);
    }

    /// <summary>Where values are wanted, rising from −1 to 1.</summary>
    public double[] Nodes { get; }

    /// <summary>What the value at a node adds to the coefficient of s^power.</summary>
    public double Weight(int power, int node) => _coefficientByNode[(power * Nodes.Length) + node];

    /// <summary>Adds a value at a node to the coefficients of one function, which stand in the order of powers.</summary>
    [MethodImpl(Fast.Hot)]
    public void Add(ref double coefficients, int node, double value)
    {
        for (int power = 0; power < Nodes.Length; power++) Unsafe.Add(ref coefficients, power) += Weight(power, node) * value;
    }

    // Column k holds the coefficients of the Lagrange polynomial Π (s − sj) / (sk − sj).
    private static double[] Lagrange(double[] nodes)
    {
        int count = nodes.Length;
        var result = new double[count * count];
        for (int k = 0; k < count; k++)
        {
            result[k] = 1;
            int degree = 0;
            for (int j = 0; j < count; j++)
            {
                if (j == k) continue;
                double scale = 1 / (nodes[k] - nodes[j]);
                degree++;
                for (int power = degree; power >= 0; power--)
                    result[(power * count) + k] = scale * ((power > 0 ? result[((power - 1) * count) + k] : 0) - (nodes[j] * result[(power * count) + k]));
            }
        }

        return result;
    }
}
