using System.Globalization;
using System.Text;
using MathNet.Numerics.Distributions;
using TwoPhase.Units;

namespace TwoPhase.Uncertainty;

/// <summary>A result with its standard uncertainty and what each input contributes to it, the largest first.</summary>
public sealed class UncertaintyBudget
{
    private UncertaintyBudget(double value, double standardUncertainty, double effectiveDegreesOfFreedom, IReadOnlyList<BudgetLine> lines)
    {
        Value = value;
        StandardUncertainty = standardUncertainty;
        EffectiveDegreesOfFreedom = effectiveDegreesOfFreedom;
        Lines = lines;
    }

    /// <summary>y, the result at the estimates of the inputs.</summary>
    public double Value { get; }

    /// <summary>u(y), one standard deviation (k = 1), in the unit of the result.</summary>
    public double StandardUncertainty { get; }

    /// <summary>
    /// ν of u(y) by Welch-Satterthwaite; infinity when every input's uncertainty is taken as known. That formula needs
    /// independent inputs: where inputs of finite ν are correlated, this is the least ν among the contributing inputs.
    /// </summary>
    public double EffectiveDegreesOfFreedom { get; }

    /// <summary>The contributions, the largest first.</summary>
    public IReadOnlyList<BudgetLine> Lines { get; }

    /// <summary>k for a coverage probability: quantile of Student's t at the effective degrees of freedom, 1.96 for 0.95 when they are infinite.</summary>
    /// <param name="coverageProbability">p, between 0 and 1; 0.95 by default.</param>
    public double CoverageFactor(double coverageProbability = 0.95)
    {
        double upper = 0.5 + (CoverageInterval.Probability(coverageProbability) / 2);
        return double.IsInfinity(EffectiveDegreesOfFreedom) ? Normal.InvCDF(0, 1, upper) : StudentT.InvCDF(0, 1, EffectiveDegreesOfFreedom, upper);
    }

    /// <summary>U = k·u(y) for a coverage probability.</summary>
    /// <param name="coverageProbability">p, between 0 and 1; 0.95 by default.</param>
    public double ExpandedUncertainty(double coverageProbability = 0.95) => CoverageFactor(coverageProbability) * StandardUncertainty;

    /// <summary>y ± U for a coverage probability.</summary>
    /// <param name="coverageProbability">p, between 0 and 1; 0.95 by default.</param>
    public CoverageInterval Interval(double coverageProbability = 0.95)
    {
        double expanded = ExpandedUncertainty(coverageProbability);
        return new(Value - expanded, Value + expanded, coverageProbability);
    }

    internal static UncertaintyBudget Combine(double value, UncertainInput[] inputs, double[] sensitivities, double[] contributions, double[,] correlation)
    {
        int count = inputs.Length;
        double[] variances = new double[count];   // each input's part of u²(y), its half of the correlation terms included
        for (int i = 0; i < count; i++)
            for (int j = 0; j < count; j++)
                variances[i] += contributions[i] * correlation[i, j] * contributions[j];

        double variance = Math.Max(variances.Sum(), 0);   // fully correlated terms may cancel to a negative rounding
        BudgetLine[] lines = new BudgetLine[count];
        for (int i = 0; i < count; i++)
            lines[i] = new(inputs[i], sensitivities[i], contributions[i], variance > 0 ? variances[i] / variance : 0);

        return new(
            value,
            Math.Sqrt(variance),
            WelchSatterthwaite(variance, inputs, contributions, correlation),
            Array.AsReadOnly([.. lines.OrderByDescending(line => Math.Abs(line.Contribution))]));
    }

    // JCGM 100:2008, G.4.1, equation (G.2b): ν = u⁴(y) / Σ (c u)⁴/ν.
    private static double WelchSatterthwaite(double variance, UncertainInput[] inputs, double[] contributions, double[,] correlation)
    {
        double sum = 0, least = double.PositiveInfinity;
        bool correlated = false;
        for (int i = 0; i < inputs.Length; i++)
        {
            double degrees = inputs[i].DegreesOfFreedom;
            if (double.IsInfinity(degrees) || contributions[i] == 0) continue;
            sum += contributions[i] * contributions[i] * contributions[i] * contributions[i] / degrees;
            least = Math.Min(least, degrees);
            for (int j = 0; j < inputs.Length; j++) correlated |= j != i && correlation[i, j] != 0;
        }

        return correlated ? least : sum > 0 ? variance * variance / sum : double.PositiveInfinity;
    }

    internal object ToDump() => ToString();

    /// <summary>The budget as a table: inputs with estimate, uncertainty, sensitivity, contribution and share of the variance.</summary>
    public override string ToString()
    {
        StringBuilder text = new();
        text.AppendFormat(CultureInfo.InvariantCulture, "{0:G6} ± {1:G3} (k = {2:F2}, 95 %)", Value, ExpandedUncertainty(), CoverageFactor()).AppendLine();
        text.AppendFormat(CultureInfo.InvariantCulture, "{0,-28} {1,14} {2,12} {3,12} {4,12} {5,7}", "input", "estimate", "u", "c", "c·u", "share").AppendLine();
        foreach (BudgetLine line in Lines) text.AppendLine(line.ToString());
        text.AppendFormat(CultureInfo.InvariantCulture, "{0,-28} {1,14:G6} {2,12:G4}", "result", Value, StandardUncertainty);
        return text.ToString();
    }
}
