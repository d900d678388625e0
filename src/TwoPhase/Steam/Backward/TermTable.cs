using System.Runtime.CompilerServices;
using TwoPhase.Numerics;

namespace TwoPhase.Steam.Backward;

/// <summary>
/// A printed table of terms i: I, J, n and its sum Σ n·a^I·b^J with integer powers: the form of every backward equation.
/// These give starting values that the forward equations polish, so brevity counts more than the last nanosecond.
/// </summary>
internal sealed class TermTable
{
    private readonly sbyte[] _i;
    private readonly sbyte[] _j;
    private readonly double[] _n;
    private readonly Range _powersOfA;
    private readonly Range _powersOfB;

    public TermTable(sbyte[] i, sbyte[] j, double[] n)
    {
        if (i.Length != n.Length || j.Length != n.Length) throw new ArgumentException("A term is missing a part.", nameof(n));
        (_i, _j, _n) = (i, j, n);
        _powersOfA = Range.Of(i);
        _powersOfB = Range.Of(j);
    }

    /// <summary>Σ n·a^I·b^J.</summary>
    [MethodImpl(Fast.Hot)]
    public double Sum(double a, double b)
    {
        Span<double> powersOfA = stackalloc double[_powersOfA.Count], powersOfB = stackalloc double[_powersOfB.Count];
        _powersOfA.Fill(powersOfA, a);
        _powersOfB.Fill(powersOfB, b);
        double sum = 0;
        for (int k = 0; k < _n.Length; k++)
            sum += _n[k] * powersOfA[_i[k] - _powersOfA.Least] * powersOfB[_j[k] - _powersOfB.Least];
        return sum;
    }

    /// <summary>The exponents that occur, zero among them.</summary>
    private readonly struct Range(int least, int most)
    {
        public int Least { get; } = least;

        public int Count => most - Least + 1;

        public static Range Of(sbyte[] exponents) => new(Math.Min((int)exponents.Min(), 0), Math.Max((int)exponents.Max(), 0));

        // Each power is the product of two of about half its exponent: short chains, and less round-off than one long one.
        [MethodImpl(Fast.Hot)]
        public void Fill(Span<double> powers, double x)
        {
            Span<double> up = powers.Slice(-Least);
            up[0] = 1;
            if (up.Length > 1) up[1] = x;
            for (int k = 2; k < up.Length; k++) up[k] = up[k >> 1] * up[k - (k >> 1)];
            if (Least == 0) return;

            powers[-Least - 1] = 1 / x;
            for (int k = 2; k <= -Least; k++) powers[-Least - k] = powers[-Least - (k >> 1)] * powers[-Least - k + (k >> 1)];
        }
    }
}
