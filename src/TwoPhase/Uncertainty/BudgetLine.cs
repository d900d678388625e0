using System.Globalization;

namespace TwoPhase.Uncertainty;

/// <summary>What one input contributes to the uncertainty of a result.</summary>
public readonly struct BudgetLine : IEquatable<BudgetLine>
{
    internal BudgetLine(UncertainInput input, double sensitivity, double contribution, double share)
    {
        Input = input;
        Sensitivity = sensitivity;
        Contribution = contribution;
        ShareOfVariance = share;
    }

    /// <summary>The input; null in a default line.</summary>
    public UncertainInput Input { get; }

    /// <summary>c = ∂y/∂x, in units of the result per unit of the input.</summary>
    public double Sensitivity { get; }

    /// <summary>c·u(x), in units of the result, with its sign: what one standard deviation more of this input does to the result.</summary>
    public double Contribution { get; }

    /// <summary>Part of u²(y) that belongs to this input, its half of the correlation terms included. All parts add up to 1; one may be negative.</summary>
    public double ShareOfVariance { get; }

    /// <inheritdoc/>
    public bool Equals(BudgetLine other) =>
        ReferenceEquals(Input, other.Input) && Sensitivity.Equals(other.Sensitivity)
        && Contribution.Equals(other.Contribution) && ShareOfVariance.Equals(other.ShareOfVariance);

    /// <inheritdoc/>
    public override bool Equals(object? obj) => obj is BudgetLine other && Equals(other);

    /// <inheritdoc/>
    public override int GetHashCode() => Contribution.GetHashCode();

    /// <summary>Whether two lines are the same.</summary>
    public static bool operator ==(BudgetLine left, BudgetLine right) => left.Equals(right);

    /// <summary>Whether two lines differ.</summary>
    public static bool operator !=(BudgetLine left, BudgetLine right) => !left.Equals(right);

    internal object ToDump() => ToString();

    /// <summary>The line of a table.</summary>
    public override string ToString() => Input is null ? "" : string.Format(
        CultureInfo.InvariantCulture,
        "{0,-28} {1,14:G6} {2,12:G4} {3,12:G4} {4,12:G3} {5,6:F1}%",
        Input.Unit.Length == 0 ? Input.Name : $"{Input.Name} [{Input.Unit}]",
        Input.Estimate,
        Input.StandardUncertainty,
        Sensitivity,
        Contribution,
        100 * ShareOfVariance);
}
