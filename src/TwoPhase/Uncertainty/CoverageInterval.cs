using System.Globalization;
using TwoPhase.Units;

namespace TwoPhase.Uncertainty;

/// <summary>An interval that holds the true value with a stated probability.</summary>
public readonly record struct CoverageInterval
{
    internal CoverageInterval(double low, double high, double coverageProbability)
    {
        Low = low;
        High = high;
        CoverageProbability = coverageProbability;
    }

    /// <summary>Lower end, in the unit of the result.</summary>
    public double Low { get; }

    /// <summary>Upper end, in the unit of the result.</summary>
    public double High { get; }

    /// <summary>p, between 0 and 1.</summary>
    public double CoverageProbability { get; }

    /// <summary>High − low.</summary>
    public double Width => High - Low;

    /// <summary>Whether a value lies inside, ends included.</summary>
    /// <param name="value">The value, in the unit of the result.</param>
    public bool Contains(double value) => value >= Low && value <= High;

    internal object ToDump() => ToString();

    /// <summary>The interval in one line.</summary>
    public override string ToString() =>
        string.Format(CultureInfo.InvariantCulture, "[{0:G6}, {1:G6}] ({2:G4} %)", Low, High, 100 * CoverageProbability);

    internal static double Probability(double coverageProbability) => coverageProbability > 0 && coverageProbability < 1
        ? coverageProbability
        : throw Require.OutOfRange(coverageProbability, "Coverage probability p", Scale.None, nameof(coverageProbability), "must lie between 0 and 1, both excluded");
}
