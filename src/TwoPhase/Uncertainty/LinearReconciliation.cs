using MathNet.Numerics.Distributions;
using MathNet.Numerics.LinearAlgebra;
using TwoPhase.Units;

namespace TwoPhase.Uncertainty;

/// <summary>
/// Measurements adjusted so that linear balances close, each by as much as its uncertainty allows, and tests of which
/// measurement is at odds with the rest.
/// </summary>
/// <remarks>
/// <para>Constraints A y + B z = c; y measured with covariance S, z not measured. z is eliminated by projection: G = P A, with P B = 0.
/// Then r = G y − P c, V = G S Gᵀ, ŷ = y − S Gᵀ V⁻¹ r, cov(ŷ) = S − S Gᵀ V⁻¹ G S.</para>
/// <para>Range: any rank. Constraints that repeat others are harmless; those that contradict others are refused.</para>
/// <para>Accuracy: exact but for rounding, for linear constraints. Bilinear ones (flow times quality) are linearised and solved again.</para>
/// <para>Source: Narasimhan and Jordache, Data Reconciliation and Gross Error Detection (2000), chapters 3, 7; VDI 2048 Blatt 1; projection
/// after Crowe, Garcia Campos and Hrymak, AIChE J. 29(6), 881-888 (1983).</para>
/// </remarks>
public sealed partial class LinearReconciliation
{
    private readonly Matrix<double> _adjustedCovariance;
    private readonly Matrix<double> _information;   // Gᵀ V⁻¹ G: of it every test of a measurement is made

    /// <summary>ŷ, the measurements after adjustment.</summary>
    public IReadOnlyList<double> Adjusted { get; }

    /// <summary>ŷ − y.</summary>
    public IReadOnlyList<double> Adjustments { get; }

    /// <summary>Standard uncertainties of the adjusted values, k = 1.</summary>
    public IReadOnlyList<double> AdjustedUncertainties { get; }

    /// <summary>True where the other measurements and the balances check this one; false where its adjusted value is the measured one whatever it is.</summary>
    public IReadOnlyList<bool> IsRedundant { get; }

    /// <summary>z, the unmeasured quantities; null where the measurements do not determine one.</summary>
    public IReadOnlyList<double?> Unmeasured { get; }

    /// <summary>z of least norm, for a step from a guess: a quantity that is not determined then moves as little as the constraints allow.</summary>
    internal IReadOnlyList<double> NearestUnmeasured { get; }

    /// <summary>Standard uncertainties of the unmeasured quantities, k = 1; null where they are not determined.</summary>
    public IReadOnlyList<double?> UnmeasuredUncertainties { get; }

    /// <summary>r, the imbalance of each constraint as measured, unmeasured quantities eliminated.</summary>
    public IReadOnlyList<double> Imbalances { get; }

    /// <summary>Nodal tests z = r/√V, one for each imbalance: standard normal when nothing is wrong. Source: Mah, Stanley and Downing, Ind. Eng. Chem. Process Des. Dev. 15, 175-183 (1976).</summary>
    public IReadOnlyList<double> NodalTests { get; }

    /// <summary>
    /// Measurement tests of maximum power, positive where the measurement reads high against the rest: standard normal when
    /// nothing is wrong; 0 where not redundant. Source: Mah and Tamhane, AIChE J. 28(5), 828-830 (1982).
    /// </summary>
    public IReadOnlyList<double> MeasurementTests { get; }

    /// <summary>Adjustment over its own standard deviation, |ŷ − y|/√(S − cov ŷ): the test of single measurements in VDI 2048 Blatt 1; 0 where not adjusted. The same as <see cref="MeasurementTests"/> in size when S is diagonal.</summary>
    public IReadOnlyList<double> AdjustmentTests { get; }

    /// <summary>The bias of each measurement that would explain the imbalances, were it the only one that is wrong.</summary>
    public IReadOnlyList<BiasEstimate> Biases { get; }

    /// <summary>rᵀ V⁻¹ r: chi-square with <see cref="DegreesOfFreedom"/> when nothing is wrong.</summary>
    public double GlobalStatistic { get; }

    /// <summary>Number of independent constraints that check the measurements.</summary>
    public int DegreesOfFreedom { get; }

    /// <summary>Covariance of two adjusted values.</summary>
    /// <param name="first">Index of one measurement.</param>
    /// <param name="second">Index of another, or the same for the variance.</param>
    public double AdjustedCovariance(int first, int second) => _adjustedCovariance[first, second];

    /// <summary>
    /// Correlation of the tests of two measurements: ±1 when the balances cannot tell a bias of one from a bias of the
    /// other, 0 when either is not redundant.
    /// </summary>
    /// <param name="first">Index of one measurement.</param>
    /// <param name="second">Index of another.</param>
    public double TestCorrelation(int first, int second) => IsRedundant[first] && IsRedundant[second]
        ? _information[first, second] / Math.Sqrt(_information[first, first] * _information[second, second])
        : 0;

    /// <summary>What <see cref="GlobalStatistic"/> stays below with probability 1 − significance when nothing is wrong; 0 without redundancy.</summary>
    /// <param name="significance">α, chance of a false alarm; 0.05 by default.</param>
    public double GlobalCriticalValue(double significance = 0.05) =>
        DegreesOfFreedom == 0 ? 0 : ChiSquared.InvCDF(DegreesOfFreedom, 1 - Significance(significance));

    /// <summary>Whether the measurements as a whole agree with the balances.</summary>
    /// <param name="significance">α, chance of a false alarm; 0.05 by default.</param>
    public bool PassesGlobalTest(double significance = 0.05) => GlobalStatistic <= GlobalCriticalValue(significance);

    /// <summary>What the largest of several two-sided normal tests stays below with probability 1 − significance when nothing is wrong.</summary>
    /// <remarks>Source: Šidák, J. Am. Stat. Assoc. 62, 626-633 (1967): each test at 1 − (1 − α)^(1/n).</remarks>
    /// <param name="tests">n, number of tests looked at together, at least 1.</param>
    /// <param name="significance">α, chance of a false alarm in any of them; 0.05 by default.</param>
    public static double SimultaneousCriticalValue(int tests, double significance = 0.05)
    {
        Require.Positive(tests, "Number of tests", Scale.None, nameof(tests));
        double each = 1 - Math.Pow(1 - Significance(significance), 1.0 / tests);
        return Normal.InvCDF(0, 1, 1 - (each / 2));
    }

    private static double Significance(double significance) => significance > 0 && significance < 1
        ? significance
        : throw Require.OutOfRange(significance, "Significance α", Scale.None, nameof(significance), "must lie between 0 and 1, both excluded");
}
