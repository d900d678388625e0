using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Dynamics;

/// <summary>First-order lags of the instruments that the indicated quality is read from. <c>default</c>: none.</summary>
public readonly record struct SensorLags
{
    /// <summary>Lags of the instruments.</summary>
    /// <param name="feedFlow">Time constant of the feed-flow signal, zero or more.</param>
    /// <param name="differential">Time constant of the differential-pressure signal, zero or more.</param>
    /// <param name="outletPressure">Time constant of the outlet-pressure signal, zero or more; zero unless given.</param>
    /// <exception cref="ArgumentOutOfRangeException">A lag is negative.</exception>
    public SensorLags(Duration feedFlow, Duration differential, Duration outletPressure = default)
    {
        RawFeedFlow = Require.NotNegative(feedFlow.Si(), "Lag of the feed flow", Scale.Seconds, nameof(feedFlow));
        RawDifferential = Require.NotNegative(differential.Si(), "Lag of the differential", Scale.Seconds, nameof(differential));
        RawOutletPressure = Require.NotNegative(outletPressure.Si(), "Lag of the outlet pressure", Scale.Seconds, nameof(outletPressure));
    }

    /// <summary>Time constant of the feed-flow signal.</summary>
    public Duration FeedFlow => Duration.FromSeconds(RawFeedFlow);

    /// <summary>Time constant of the differential-pressure signal.</summary>
    public Duration Differential => Duration.FromSeconds(RawDifferential);

    /// <summary>Time constant of the outlet-pressure signal.</summary>
    public Duration OutletPressure => Duration.FromSeconds(RawOutletPressure);

    internal double RawFeedFlow { get; }

    internal double RawDifferential { get; }

    internal double RawOutletPressure { get; }
}
