namespace TwoPhase.Uncertainty;

/// <summary>A balance between quantities: a number that is zero at their true values.</summary>
/// <param name="imbalance">The number, of all quantities; divided by what is usual, so that it is of the order of 1 when nothing fits.</param>
/// <param name="quantities">Indices of the quantities that it looks at.</param>
internal sealed class Balance(Func<double[], double> imbalance, params int[] quantities)
{
    private const double Step = 1e-3;   // of the scale of a quantity

    public double At(double[] values) => imbalance(values);

    /// <summary>Slopes by each quantity in units of its scale. By four points: exact but for rounding where quantities are multiplied.</summary>
    public double[] Slopes(double[] values, double[] scales)
    {
        double[] slopes = new double[values.Length], moved = (double[])values.Clone();
        foreach (int i in quantities)
        {
            slopes[i] = ((8 * (Moved(1) - Moved(-1))) - (Moved(2) - Moved(-2))) / (12 * Step);
            moved[i] = values[i];

            double Moved(int steps)
            {
                moved[i] = values[i] + (steps * Step * scales[i]);
                return imbalance(moved);
            }
        }

        return slopes;
    }
}
