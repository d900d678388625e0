using TwoPhase.Metering;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Advisory;

/// <summary>How well the instruments of a generator measure, for readings as they come: standard uncertainties, k = 1.</summary>
public sealed class GeneratorUncertainty
{
    /// <summary>Uncertainty of what the instruments say.</summary>
    /// <param name="passes">Of feed flow, differential, meter and pressure of every pass; the pressure counts for the header too.</param>
    /// <param name="totalFeed">Of the feed flow of all passes, relative.</param>
    /// <param name="separatorFlows">Of steam and water leaving the separator, relative.</param>
    /// <param name="feedTemperature">Of the feed temperature.</param>
    /// <exception cref="ArgumentOutOfRangeException">A value is not greater than zero.</exception>
    public GeneratorUncertainty(MeteringUncertainty passes, Ratio totalFeed, Ratio separatorFlows, TemperatureDelta feedTemperature)
    {
        Passes = Require.NotNull(passes, nameof(passes));
        TotalFeed = Require.Positive(totalFeed.Si(), "Uncertainty of the total feed", Scale.None, nameof(totalFeed));
        SeparatorFlows = Require.Positive(separatorFlows.Si(), "Uncertainty of the separator's flows", Scale.None, nameof(separatorFlows));
        FeedTemperature = Require.Positive(feedTemperature.Si(), "Uncertainty of the feed temperature", Scale.Kelvins, nameof(feedTemperature));
    }

    internal MeteringUncertainty Passes { get; }

    internal double TotalFeed { get; }

    internal double SeparatorFlows { get; }

    internal double FeedTemperature { get; }
}
