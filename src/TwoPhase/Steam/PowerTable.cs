namespace TwoPhase.Steam;

/// <summary>One term n a^I b^J of a backward equation, as a row of its printed table.</summary>
internal readonly record struct Term(int I, int J, double N);

/// <summary>
/// Sum over a printed table of terms. For backward equations only: they give starting values, so brevity counts; the
/// forward equations have their powers written out.
/// </summary>
internal static class PowerTable
{
    private const int Largest = 64;

    /// <summary>Σ n a^I b^J.</summary>
    public static double Sum(ReadOnlySpan<Term> terms, double a, double b)
    {
        Span<double> powersOfB = stackalloc double[Largest];
        int known = 0;
        powersOfB[0] = 1;
        double sum = 0;
        foreach (Term term in terms)
        {
            while (known < term.J)
            {
                powersOfB[known + 1] = powersOfB[known] * b;
                known++;
            }

            double power = term.J >= 0 ? powersOfB[term.J] : Power(b, term.J);
            sum += term.N * Power(a, term.I) * power;
        }

        return sum;
    }

    private static double Power(double x, int exponent)
    {
        double result = 1, factor = exponent < 0 ? 1 / x : x;
        for (int n = Math.Abs(exponent); n > 0; n >>= 1)
        {
            if ((n & 1) != 0) result *= factor;
            factor *= factor;
        }

        return result;
    }
}
