namespace TwoPhase.Numerics;

/// <summary>A function of one variable as a struct, so that a root search allocates nothing and inlines it.</summary>
internal interface IScalarFunction
{
    double Value(double x);
}

/// <summary>What a root search ended with.</summary>
internal readonly struct RootResult(double x, double residual, int evaluations, bool converged)
{
    public double X { get; } = x;

    public double Residual { get; } = residual;

    public int Evaluations { get; } = evaluations;

    public bool Converged { get; } = converged;
}

/// <summary>
/// Root of a continuous function inside a bracket that the caller takes from physics; never widened. Our own rather than
/// Math.NET's because it stands in loops that must not allocate, and a delegate does.
/// </summary>
/// <remarks>Source: Chandrupatla, Advances in Engineering Software 28(3), 145-149 (1997): inverse quadratic steps where safe, else bisection.</remarks>
internal static class BracketedRoot
{
    public static RootResult TryFind<TFunction>(TFunction function, double low, double high, double tolerance, int maximumEvaluations = 100)
        where TFunction : struct, IScalarFunction =>
        TryFind(function, low, function.Value(low), high, function.Value(high), tolerance, maximumEvaluations);

    public static RootResult TryFind<TFunction>(TFunction function, double low, double atLow, double high, double atHigh, double tolerance, int maximumEvaluations = 100)
        where TFunction : struct, IScalarFunction
    {
        double a = high, fa = atHigh, b = low, fb = atLow, c = a, fc = fa;
        if (fa == 0) return new(a, 0, 2, true);
        if (fb == 0) return new(b, 0, 2, true);
        if (!(fa * fb < 0)) return new(double.NaN, Math.Abs(fa) < Math.Abs(fb) ? fa : fb, 2, false);

        double t = 0.5;
        for (int evaluations = 3; evaluations <= maximumEvaluations; evaluations++)
        {
            double x = a + (t * (b - a));
            double fx = function.Value(x);
            if (double.IsNaN(fx)) return new(x, fx, evaluations, false);
            if (Math.Sign(fx) == Math.Sign(fa))
            {
                (c, fc) = (a, fa);
            }
            else
            {
                (c, fc, b, fb) = (b, fb, a, fa);
            }

            (a, fa) = (x, fx);
            double best = Math.Abs(fa) < Math.Abs(fb) ? a : b;
            double residual = Math.Abs(fa) < Math.Abs(fb) ? fa : fb;
            double width = Math.Abs(b - a);
            double limit = tolerance + (2e-16 * Math.Abs(best));
            if (residual == 0 || width <= 2 * limit) return new(best, residual, evaluations, true);

            double tLimit = limit / width;
            double xi = (a - b) / (c - b), phi = (fa - fb) / (fc - fb);
            bool quadratic = phi * phi < xi && (1 - phi) * (1 - phi) < 1 - xi;
            t = quadratic
                ? (fa / (fb - fa) * (fc / (fb - fc))) + ((c - a) / (b - a) * (fa / (fc - fa)) * (fb / (fc - fb)))
                : 0.5;
            t = Fast.Clamp(t, tLimit, 1 - tLimit);
        }

        bool closerA = Math.Abs(fa) < Math.Abs(fb);
        return new(closerA ? a : b, closerA ? fa : fb, maximumEvaluations, false);
    }
}
