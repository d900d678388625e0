using System.Globalization;

namespace TwoPhase.Uncertainty;

/// <summary>The bias of one measurement that would explain the imbalances best, if that measurement alone were wrong.</summary>
/// <remarks>Source: Narasimhan and Mah, AIChE J. 33(9), 1514-1521 (1987), generalised likelihood ratio.</remarks>
public readonly record struct BiasEstimate
{
    internal BiasEstimate(double size, double standardUncertainty)
    {
        Size = size;
        StandardUncertainty = standardUncertainty;
    }

    /// <summary>b, measured minus true, in the unit of the measurement; 0 when no constraint sees the measurement.</summary>
    public double Size { get; }

    /// <summary>u(b), one standard deviation; infinity when no constraint sees the measurement.</summary>
    public double StandardUncertainty { get; }

    /// <summary>T = (b/u(b))²: by how much the global statistic falls if this bias is taken out. Chi-square with one degree of freedom when there is none.</summary>
    public double Statistic => Size / StandardUncertainty * (Size / StandardUncertainty);

    internal object ToDump() => ToString();

    /// <summary>The estimate in one line.</summary>
    public override string ToString() => string.Format(CultureInfo.InvariantCulture, "{0:G5} ± {1:G3} (k = 1), T = {2:G4}", Size, StandardUncertainty, Statistic);
}
