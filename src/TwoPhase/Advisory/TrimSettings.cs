using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Advisory;

/// <summary>How a quality trim moves the feed flow of a pass. Immutable; each <c>With…</c> method returns a changed copy.</summary>
/// <remarks>
/// <para>ṁ = ṁff + u; Δu = ṁ0 K [Δx + (Δt/Ti) (x − x set)]; ṁff = ṁ0 [1 + f (Q/Q0 − 1)] [1 + g ((h out − h0)/(h out − h) − 1)].</para>
/// <para>ṁ feed flow, ṁ0 that at the start, u trim [kg/s]; x value trimmed by [kg/kg], K gain [-], Ti integral time and Δt interval [s]; Q heat that the fire asks
/// for [W], h feed enthalpy behind its lag and h out the outlet's at the start [J/kg], 0 their values at the start; f and g shares of the feed-forward.</para>
/// <para>PI in velocity form: it begins without a bump, and at a limit of the flow it moves no further out, so that nothing winds up (Åström and
/// Hägglund, PID Controllers, 2nd ed. (1995), sections 3.5 and 3.6).</para>
/// <para>The defaults are numbers to begin a study with, no recommendation. To find others by a rule, for instance Skogestad, J. Process Control 13, 291-309 (2003), see
/// <see cref="Dynamics.LinearView"/>.</para>
/// </remarks>
public sealed class TrimSettings
{
    /// <summary>The defaults: gain 0.2, integral time 5 min, every 5 s, full feed-forward, that of the feed temperature behind 5 min, 70 to 130 % of the flow at the start, half raw where blended.</summary>
    public static TrimSettings Default { get; } = new();

    /// <summary>K, relative change of the feed flow for a change of the quality by 1: 0.2 is a fifth of a per cent for a point.</summary>
    /// <remarks>The raw value answers a move of the flow at once, by some 2 (x + v′/(v″ − v′)) for its logarithm: a gain near the inverse of that swings from move to move.</remarks>
    public double Gain { get; private set; } = 0.2;

    /// <summary>Ti: a lasting deviation moves the flow once more by its proportional part in this time.</summary>
    public Duration IntegralTime => Duration.FromSeconds(RawIntegralTime);

    /// <summary>Δt between two moves.</summary>
    public Duration Interval => Duration.FromSeconds(RawInterval);

    /// <summary>f, share of a change of the firing that the flow follows at once.</summary>
    public Ratio FiringFeedForward => Ratio.FromDecimalFractions(RawFiringShare);

    /// <summary>g, share of a change of the feed temperature that the flow follows, behind <see cref="FeedTemperatureLag"/>.</summary>
    public Ratio FeedTemperatureFeedForward => Ratio.FromDecimalFractions(RawTemperatureShare);

    /// <summary>First-order lag with which the flow follows the feed temperature: that has the way to where the water boils before it.</summary>
    /// <remarks>As a front of colder water reaches where it boils, the quality rises before it falls, and a feed-forward, which balances rest alone, adds to that.</remarks>
    public Duration FeedTemperatureLag => Duration.FromSeconds(RawTemperatureLag);

    /// <summary>Lowest feed flow, over that at the start.</summary>
    public Ratio LowestFlow => Ratio.FromDecimalFractions(RawLowest);

    /// <summary>Highest feed flow, over that at the start.</summary>
    public Ratio HighestFlow => Ratio.FromDecimalFractions(RawHighest);

    /// <summary>Weight of the raw value where it is blended with the corrected one.</summary>
    public Ratio RawShare => Ratio.FromDecimalFractions(RawRawShare);

    /// <summary>What the value is trimmed to; null for what it is when the loop closes.</summary>
    public MassFraction? SetPoint => double.IsNaN(RawSetPoint) ? null : MassFraction.FromDecimalFractions(RawSetPoint);

    internal double RawIntegralTime { get; private set; } = 300;

    internal double RawInterval { get; private set; } = 5;

    internal double RawFiringShare { get; private set; } = 1;

    internal double RawTemperatureShare { get; private set; } = 1;

    internal double RawTemperatureLag { get; private set; } = 300;

    internal double RawLowest { get; private set; } = 0.7;

    internal double RawHighest { get; private set; } = 1.3;

    internal double RawRawShare { get; private set; } = 0.5;

    internal double RawSetPoint { get; private set; } = double.NaN;

    /// <summary>With another gain and integral time.</summary>
    /// <param name="gain">K, zero or more.</param>
    /// <param name="integralTime">Ti, greater than zero.</param>
    /// <exception cref="ArgumentOutOfRangeException">A value is outside its limits.</exception>
    public TrimSettings WithTuning(double gain, Duration integralTime)
    {
        Require.NotNegative(gain, "Gain", Scale.None, nameof(gain));
        double seconds = Require.Positive(integralTime.Si(), "Integral time", Scale.Seconds, nameof(integralTime));
        return Changed(copy => (copy.Gain, copy.RawIntegralTime) = (gain, seconds));
    }

    /// <summary>With another time between two moves.</summary>
    /// <param name="interval">Greater than zero.</param>
    /// <exception cref="ArgumentOutOfRangeException">The time is not greater than zero.</exception>
    public TrimSettings WithInterval(Duration interval)
    {
        double seconds = Require.Positive(interval.Si(), "Interval", Scale.Seconds, nameof(interval));
        return Changed(copy => copy.RawInterval = seconds);
    }

    /// <summary>With another feed-forward.</summary>
    /// <param name="firing">Share of a change of the firing, 0 to 1.</param>
    /// <param name="feedTemperature">Share of a change of the feed temperature, 0 to 1.</param>
    /// <param name="feedTemperatureLag">Lag behind the feed temperature, zero or more.</param>
    /// <exception cref="ArgumentOutOfRangeException">A share is outside 0 to 1, or the lag is negative.</exception>
    public TrimSettings WithFeedForward(Ratio firing, Ratio feedTemperature, Duration feedTemperatureLag)
    {
        double fire = Require.Within(firing.Si(), 0, 1, "Share of the firing", Scale.None, nameof(firing));
        double feed = Require.Within(feedTemperature.Si(), 0, 1, "Share of the feed temperature", Scale.None, nameof(feedTemperature));
        double lag = Require.NotNegative(feedTemperatureLag.Si(), "Lag of the feed-forward", Scale.Seconds, nameof(feedTemperatureLag));
        return Changed(copy => (copy.RawFiringShare, copy.RawTemperatureShare, copy.RawTemperatureLag) = (fire, feed, lag));
    }

    /// <summary>With other limits of the feed flow.</summary>
    /// <param name="lowest">Over the flow at the start, greater than 0 and at most 1.</param>
    /// <param name="highest">Over the flow at the start, 1 or more.</param>
    /// <exception cref="ArgumentOutOfRangeException">A limit is outside its own.</exception>
    public TrimSettings WithFlowLimits(Ratio lowest, Ratio highest)
    {
        double low = Require.Within(Require.Positive(lowest.Si(), "Lowest flow", Scale.None, nameof(lowest)), 0, 1, "Lowest flow", Scale.None, nameof(lowest));
        double high = Require.Within(highest.Si(), 1, double.MaxValue, "Highest flow", Scale.None, nameof(highest));
        return Changed(copy => (copy.RawLowest, copy.RawHighest) = (low, high));
    }

    /// <summary>With another weight of the raw value where it is blended.</summary>
    /// <param name="share">0 to 1.</param>
    /// <exception cref="ArgumentOutOfRangeException">The share is outside 0 to 1.</exception>
    public TrimSettings WithRawShare(Ratio share)
    {
        double value = Require.Within(share.Si(), 0, 1, "Weight of the raw value", Scale.None, nameof(share));
        return Changed(copy => copy.RawRawShare = value);
    }

    /// <summary>With a value to trim to.</summary>
    /// <param name="setPoint">0 to 1.</param>
    /// <exception cref="ArgumentOutOfRangeException">The set point is outside 0 to 1.</exception>
    public TrimSettings WithSetPoint(MassFraction setPoint)
    {
        double value = Require.Within(setPoint.Si(), 0, 1, "Set point", Scale.None, nameof(setPoint));
        return Changed(copy => copy.RawSetPoint = value);
    }

    private TrimSettings Changed(Action<TrimSettings> change)
    {
        var copy = (TrimSettings)MemberwiseClone();
        change(copy);
        return copy;
    }
}
