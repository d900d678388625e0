using System.Globalization;
using TwoPhase.Passes;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Holdup;

/// <summary>What a pass takes up or gives off between two steady states, and what that does to an outlet meter meanwhile.</summary>
/// <remarks>
/// <para>While the holdup changes by ΔM in a time Δt, ṁout = ṁin − ΔM/Δt in the mean. A homogeneous meter that is fed with ṁin then reads
/// x_indicated − x_true = W ((ṁout/ṁin)² − 1), with W = v/(v″ − v′) at the outlet, v of both phases moving at one velocity.</para>
/// <para>Derivation: Δp = ṁ² v/(2 K²) with v = v′ + x (v″ − v′), solved for x at ṁin instead of ṁout.</para>
/// </remarks>
public readonly record struct HoldupChange
{
    private readonly double _total, _upstream, _flow, _weight;

    internal HoldupChange(WaterHoldup earlier, WaterHoldup later)
    {
        _total = later.RawTotal - earlier.RawTotal;
        _upstream = later.UpstreamOfOnset.Kilograms - earlier.UpstreamOfOnset.Kilograms;
        _flow = later.Profile.Conditions.RawFeedFlow;
        _weight = (Weight(earlier.Profile) + Weight(later.Profile)) / 2;
    }

    /// <summary>ΔM, what the pass takes up; negative when it pushes water out.</summary>
    public Mass Total => Mass.FromKilograms(_total);

    /// <summary>The part upstream of the boiling onset.</summary>
    public Mass UpstreamOfOnset => Mass.FromKilograms(_upstream);

    /// <summary>The part downstream of the boiling onset.</summary>
    public Mass DownstreamOfOnset => Mass.FromKilograms(_total - _upstream);

    /// <summary>Indicated minus true quality if the change spreads evenly over a time, feed flow as in the later state.</summary>
    /// <param name="time">The time that the change takes, greater than zero.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="time"/> is not greater than zero, or so short that flow would reverse.</exception>
    public MassFraction ReadingError(Duration time)
    {
        double seconds = Require.Positive(time.Si(), "Time of the change", Scale.Seconds, nameof(time)), ratio = 1 - (_total / seconds / _flow);
        return ratio > 0
            ? MassFraction.FromDecimalFractions(_weight * ((ratio * ratio) - 1))
            : throw Require.OutOfRange(seconds, "Time of the change", Scale.Seconds, nameof(time), $"must exceed {Scale.Seconds.Text(_total / _flow)}, or the outlet flow would reverse");
    }

    private static double Weight(PassProfile profile)
    {
        PassNode outlet = profile.Nodes[profile.Count - 1];
        double vapour = 1 / outlet.Flow.VapourDensity, liquid = 1 / outlet.Flow.LiquidDensity;
        return outlet.HomogeneousVolume / (vapour - liquid);
    }

    internal object ToDump() => ToString();

    /// <summary>The change in a line, invariant culture.</summary>
    public override string ToString() => string.Format(CultureInfo.InvariantCulture, "{0:+0.0;-0.0} kg, {1:+0.0;-0.0} kg of it upstream of boiling", _total, _upstream);
}
