namespace TwoPhase.Uncertainty;

public sealed partial class MeasurementFunction
{
    /// <summary>The result with its uncertainty budget, by the law of propagation of uncertainty.</summary>
    /// <remarks>
    /// <para>u²(y) = Σᵢ Σⱼ cᵢ cⱼ rᵢⱼ u(xᵢ) u(xⱼ), c = ∂f/∂x at the estimates, r correlation coefficient, u standard uncertainty.</para>
    /// <para>Range: a function that is nearly linear over a few u; where it is not, <see cref="Simulate"/> shows by how much.</para>
    /// <para>Accuracy: coefficients by central differences of fourth order; those given are taken as they are.</para>
    /// <para>Source: JCGM 100:2008 (GUM), 5.1.2 and 5.2.2, equations (10) and (13); ISO 5168:2005, clause 8.</para>
    /// </remarks>
    /// <exception cref="ArithmeticException">The function gives no finite number near the estimates.</exception>
    public UncertaintyBudget Propagate()
    {
        double[] estimates = Estimates();
        double value = Evaluate(estimates);
        double[] sensitivities = new double[_inputs.Length];
        double[] contributions = new double[_inputs.Length];
        for (int i = 0; i < _inputs.Length; i++)
        {
            sensitivities[i] = _givenSensitivities[i] ?? CentralDifference(estimates, i);
            contributions[i] = sensitivities[i] * _inputs[i].StandardUncertainty;
        }

        return UncertaintyBudget.Combine(value, _inputs, sensitivities, contributions, _correlation);
    }

    // Two central differences, h and h/2, extrapolated: what is left of the truncation is of order h⁴. The step is small against
    // the uncertainty, so that it stays where the result is meant to hold, and large against the rounding of x.
    private double CentralDifference(double[] estimates, int index)
    {
        const double ofUncertainty = 0.02, ofEstimate = 6e-6;
        double x = estimates[index], u = _inputs[index].StandardUncertainty;
        double step = Math.Max(ofUncertainty * u, ofEstimate * (x == 0 && u == 0 ? 1 : Math.Abs(x)));
        double[] values = (double[])estimates.Clone();
        double wide = Slope(step), narrow = Slope(step / 2);
        return narrow + ((narrow - wide) / 3);

        double Slope(double h)
        {
            double high = values[index] = x + h;
            double atHigh = Evaluate(values);
            double low = values[index] = x - h;
            return (atHigh - Evaluate(values)) / (high - low);
        }
    }
}
