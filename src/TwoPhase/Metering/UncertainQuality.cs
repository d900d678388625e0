using System.Globalization;
using TwoPhase.Uncertainty;
using UnitsNet;

namespace TwoPhase.Metering;

/// <summary>A quality with its uncertainty, and which input the uncertainty comes from.</summary>
public sealed class UncertainQuality
{
    internal UncertainQuality(QualityReading reading, UncertaintyBudget budget)
    {
        Reading = reading;
        Budget = budget;
    }

    /// <summary>The reading, with status and applicability. The uncertainty holds inside the published limits only.</summary>
    public QualityReading Reading { get; }

    /// <summary>x, steam quality.</summary>
    public MassFraction Quality => Reading.Quality;

    /// <summary>u(x), one standard deviation (k = 1).</summary>
    public MassFraction StandardUncertainty => MassFraction.FromDecimalFractions(Budget.StandardUncertainty);

    /// <summary>The contributions in kg/kg of quality, the largest first: the instrument to improve stands on top.</summary>
    public UncertaintyBudget Budget { get; }

    /// <summary>U(x) = k·u(x) for a coverage probability.</summary>
    /// <param name="coverageProbability">p, between 0 and 1; 0.95 by default.</param>
    public MassFraction ExpandedUncertainty(double coverageProbability = 0.95) => MassFraction.FromDecimalFractions(Budget.ExpandedUncertainty(coverageProbability));

    internal object ToDump() => ToString();

    /// <summary>The quality in one line and the budget as a table.</summary>
    public override string ToString() => string.Format(
        CultureInfo.InvariantCulture, "quality {0:F4} ± {1:F4} (95 %)", Budget.Value, Budget.ExpandedUncertainty()) + Environment.NewLine + Budget;
}
