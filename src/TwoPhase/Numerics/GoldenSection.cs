namespace TwoPhase.Numerics;

/// <summary>Lowest value of a function with one valley inside a bracket that the caller takes from physics. Our own because Math.NET's widens the bracket.</summary>
/// <remarks>Source: Kiefer, Proc. Am. Math. Soc. 4, 502-506 (1953). A valley's flat bottom gives half of the digits.</remarks>
internal static class GoldenSection
{
    private const double Ratio = 0.6180339887498949;   // (√5 − 1)/2

    /// <summary>Where the function is lowest, to a tolerance; an end of the bracket when it falls all the way there.</summary>
    public static double Minimum(Func<double, double> function, double low, double high, double tolerance)
    {
        double left = low, right = high;
        double a = right - (Ratio * (right - left)), b = left + (Ratio * (right - left));
        double atA = function(a), atB = function(b);
        while (right - left > tolerance)
        {
            if (atA < atB)
            {
                (right, b, atB) = (b, a, atA);
                a = right - (Ratio * (right - left));
                atA = function(a);
            }
            else
            {
                (left, a, atA) = (a, b, atB);
                b = left + (Ratio * (right - left));
                atB = function(b);
            }
        }

        double middle = (left + right) / 2;
        return left == low && function(low) <= function(middle) ? low
            : right == high && function(high) <= function(middle) ? high
            : middle;
    }
}
