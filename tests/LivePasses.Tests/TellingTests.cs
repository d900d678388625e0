using LivePasses.Live;
using TwoPhase.Advisory;
using TwoPhase.Metering;
using TwoPhase.Passes;
using UnitsNet;

namespace LivePasses.Tests;

/// <summary>The words, on estimates that a real estimator gives.</summary>
public class TellingTests
{
    private static readonly DateTimeOffset Noon = new(2031, 3, 9, 12, 0, 0, TimeSpan.Zero);
    private static readonly SteamGenerator Generator = Rig.Usual(0).Generator;

    [Fact]
    public void Sentence_AtRest_BelievesTheReading() => Assert.Matches("^Pass 1 reads 0\\.7\\d; believe it\\.$", SentenceAfter(1800, 1));

    [Fact]
    public void Sentence_JustBegun_SaysSo() => Assert.Equal("Pass 1 reads 0.74; its true quality is not known yet.", SentenceAfter(10, 1));

    [Fact]
    public void Sentence_DifferentialGone_NamesIt() => Assert.Matches("^Pass 1 has no good differential; 0\\.7\\d by the model alone, for a while\\.$", SentenceAfter(1800, double.NaN, 60));

    [Fact]
    public void Sentence_DifferentialOff_GivesBothEnds() => Assert.Matches("^Pass 1 reads 0\\.\\d\\d; 0\\.\\d\\d if its meter is right, 0\\.\\d\\d if its heat is\\. Heat, meter or feed flow: not separable\\.$", SentenceAfter(1800, 0.9, 1800));

    [Fact]
    public void Sentence_FireOut_GivesNoQuality() => Assert.Equal("Pass 1 has no quality now: tripped.", SentenceAfter(1800, 1, 120, firing: 0));

    [Fact]
    public void Silence_SaysSinceWhen() => Assert.Equal("Pass 1 has no tags since 2031-03-09 12:00:00 UTC; its quality is not known.", Telling.Silence("Pass 1", Noon));

    [Fact]
    public void Cautions_UpperValueAboveTheLimit_SaySo()
    {
        QualityEstimate estimate = After(1800, 1, 0, 0.92);
        Assert.Contains("95 % upper value", Assert.Single(Telling.Cautions(estimate, estimate.Quality!.Value.DecimalFractions + 0.001)), StringComparison.Ordinal);
        Assert.Contains("is above the site's limit", Assert.Single(Telling.Cautions(estimate, estimate.Quality!.Value.DecimalFractions - 0.001)), StringComparison.Ordinal);
        Assert.Empty(Telling.Cautions(estimate, 1));
    }

    private static string SentenceAfter(int seconds, double meter, int then = 0, double firing = 0.92) => Telling.Sentence("Pass 1", After(seconds, meter, then, firing), default);

    private static QualityEstimate After(int seconds, double meter, int then, double firing)
    {
        Pass pass = Generator.Passes[0];
        var estimator = new QualityEstimator(pass, pass.Meter!);
        var random = new Random(1);
        Pressure differential = pass.Meter!.Differential(MassFlow.FromKilogramsPerSecond(4.42), Pressure.FromMegapascals(9.6), MassFraction.FromDecimalFractions(0.74));
        QualityEstimate estimate = default;
        for (int i = 0; i < seconds + then; i++)
        {
            bool late = i >= seconds;
            PassReading reading = new PassReading(Noon.AddSeconds(i), MassFlow.FromKilogramsPerSecond(4.42 * (1 + (0.001 * (random.NextDouble() - 0.5)))), late && double.IsNaN(meter) ? null : differential * ((late ? meter : 1) + (0.002 * (random.NextDouble() - 0.5))))
                .WithOutletPressure(Pressure.FromMegapascals(9.6)).WithFeedTemperature(Temperature.FromKelvins(445)).WithFiring(Ratio.FromDecimalFractions(late ? firing : 0.92));
            estimate = estimator.Update(reading);
        }

        return estimate;
    }
}
