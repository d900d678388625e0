using MathNet.Numerics.Statistics;
using TwoPhase.Dynamics;
using TwoPhase.Passes;
using TwoPhase.Slip;
using TwoPhase.Uncertainty;
using TwoPhase.Units;
using UnitsNet;
using UnitsNet.Units;

namespace TwoPhase.Advisory;

/// <summary>How long what is dissolved takes from the feed sample to the water sample: through pipes and passes, then mixed in the water that stands in the separator.</summary>
/// <remarks>
/// <para>Solids ride with the liquid: delay of a pass = ∫ (1 − α)·ρl/(1 − x)·A dz/ṁ, A area, α void fraction, x quality. With both phases at one velocity that is the residence time; where the
/// vapour slips ahead the liquid takes longer. The water of the separator mixes with time constant M/W, M what stands there, W what leaves.</para>
/// <para>Range: at rest, up to the place where the pass runs dry. Accuracy: that of the slip model; the spread of the published ones is taken as the standard uncertainty.</para>
/// <para>Source: balance of a conserved species, written here.</para>
/// </remarks>
public sealed class SolidsTransport
{
    private readonly double _delay, _delayUncertainty, _mixing;

    /// <summary>A delay and a mixing that are known.</summary>
    /// <param name="delay">From feed sample to separator, zero or more.</param>
    /// <param name="delayUncertainty">Standard uncertainty of the delay.</param>
    /// <param name="mixing">Time constant of the separator's water, zero or more.</param>
    public SolidsTransport(Duration delay, Duration delayUncertainty, Duration mixing)
    {
        _delay = Require.NotNegative(delay.Si(), "Delay", Scale.Seconds, nameof(delay));
        _delayUncertainty = Require.NotNegative(delayUncertainty.Si(), "Uncertainty of the delay", Scale.Seconds, nameof(delayUncertainty));
        _mixing = Require.NotNegative(mixing.Si(), "Time constant of mixing", Scale.Seconds, nameof(mixing));
    }

    /// <summary>Time through pipes and passes.</summary>
    public Duration Delay => Duration.FromSeconds(_delay);

    /// <summary>Standard uncertainty of the delay.</summary>
    public Duration DelayUncertainty => Duration.FromSeconds(_delayUncertainty);

    /// <summary>Time constant of the separator's water.</summary>
    public Duration Mixing => Duration.FromSeconds(_mixing);

    /// <summary>The way through a pass, by its slip model.</summary>
    /// <param name="profile">The steady state of the pass.</param>
    /// <param name="piping">Time from the feed sample to the pass and from the pass to the separator.</param>
    /// <param name="mixing">Time constant of the separator's water.</param>
    public static SolidsTransport Through(PassProfile profile, Duration piping, Duration mixing)
    {
        Require.NotNull(profile, nameof(profile));
        double spread = VoidFractionModel.All.Select(slip => Delayed(profile, slip)).StandardDeviation();
        return new(Duration.FromSeconds(Delayed(profile, profile.Models.Slip) + Require.NotNegative(piping.Si(), "Time in pipes", Scale.Seconds, nameof(piping))), Duration.FromSeconds(spread), mixing);
    }

    /// <summary>The feed concentration that the sampled water came from, from a history of feed samples.</summary>
    /// <param name="time">Times of the feed samples, not falling.</param>
    /// <param name="feed">Concentrations; NaN for a missing one. Straight between samples; before the first it is taken as it was then, after the last as it is there.</param>
    /// <param name="sampled">When the water was sampled, on the same clock.</param>
    /// <returns>The concentration, and what the uncertainty of the delay makes of it alone.</returns>
    /// <exception cref="ArgumentException">The columns differ in length, times fall, or no sample is a number.</exception>
    public UncertainValue<MassConcentration> FeedBehind(Column<DurationUnit> time, Column<MassConcentrationUnit> feed, Duration sampled)
    {
        TimeCurve curve = TimeCurve.Through(time.Values, time.Unit.ToSi(), feed.Values, feed.Unit.ToSi(), "feed concentration", nameof(feed));
        double at = sampled.Si() - _delay;
        double value = curve.Lagged(at, _mixing), change = (curve.Lagged(at + _delayUncertainty, _mixing) - curve.Lagged(at - _delayUncertainty, _mixing)) / 2;
        return new(MassConcentration.FromKilogramsPerCubicMeter(value), MassConcentration.FromKilogramsPerCubicMeter(Math.Abs(change)));
    }

    private static double Delayed(PassProfile profile, VoidFractionModel slip)
    {
        double seconds = 0;
        foreach (NodePanel panel in new NodePanels(profile.Nodes))
            seconds += profile.Pass.Ducts[panel.Duct].Area * panel.Integral((in PassNode node) => PerVolume(node, slip)) / profile.Conditions.RawFeedFlow;
        return seconds;
    }

    // Liquid that stands in a volume over the share of the flow that is liquid [kg/m³]; nothing where no liquid flows.
    private static double PerVolume(in PassNode node, VoidFractionModel slip)
    {
        double x = node.Flow.Quality;
        return x >= 1 ? 0 : x <= 0 ? node.Flow.LiquidDensity : (1 - slip.VoidFractionCore(node.Flow)) * node.Flow.LiquidDensity / (1 - x);
    }

    internal object ToDump() => ToString();

    /// <summary>The times in a line, invariant culture.</summary>
    public override string ToString() => FormattableString.Invariant($"delay {_delay:F0} ± {_delayUncertainty:F0} s (k = 1), then mixed over {_mixing:F0} s");
}
