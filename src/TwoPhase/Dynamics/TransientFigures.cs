using System.Globalization;
using UnitsNet;

namespace TwoPhase.Dynamics;

/// <summary>The figures of a transient that matter to those who must live through it.</summary>
public readonly record struct TransientFigures
{
    /// <summary>Largest error of the reading, indicated minus true quality, with its sign; null where nothing was indicated.</summary>
    public MassFraction? PeakError => double.IsNaN(RawPeakError) ? null : MassFraction.FromDecimalFractions(RawPeakError);

    /// <summary>When that was; null where nothing was indicated.</summary>
    public Duration? TimeOfPeakError => double.IsNaN(RawPeakError) ? null : Duration.FromSeconds(RawTimeOfPeak);

    /// <summary>For how long the reading was further from the truth than the tolerance.</summary>
    public Duration TimeFalse => Duration.FromSeconds(RawTimeFalse);

    /// <summary>From when on the reading stays within the tolerance; null when it does not by the end.</summary>
    public Duration? Settled => double.IsNaN(RawSettled) ? null : Duration.FromSeconds(RawSettled);

    /// <summary>Water that left over what came in, from start to end; negative when the pass has filled.</summary>
    public Mass WaterPushedOut => Mass.FromKilograms(RawPushedOut);

    /// <summary>The most water that was out at any time, over the holdup at the start.</summary>
    public Mass MostPushedOut => Mass.FromKilograms(RawMostPushedOut);

    /// <summary>Largest outlet flow.</summary>
    public MassFlow PeakOutletFlow => MassFlow.FromKilogramsPerSecond(RawPeakOutletFlow);

    /// <summary>Largest outlet flow over the feed flow at the end, which is what leaves at rest.</summary>
    public double PeakOutletRatio { get; internal init; }

    /// <summary>Lowest and highest true quality.</summary>
    public (MassFraction Lowest, MassFraction Highest) TrueQuality => (MassFraction.FromDecimalFractions(RawLowest), MassFraction.FromDecimalFractions(RawHighest));

    /// <summary>∫ (indicated − true quality) dt [s].</summary>
    public double AreaUnderError { get; internal init; }

    /// <summary>∫ W ((ṁout/ṁin)² − 1) dt [s], W = v/(v″ − v′): what the area must be for a homogeneous meter without lags.</summary>
    public double AreaByOutletFlow { get; internal init; }

    /// <summary>2 W ΔM/ṁin [s] with the means over the run: the area from the water pushed out alone, a rule of thumb good to some 10 %.</summary>
    public double AreaByHoldup { get; internal init; }

    internal double RawPeakError { get; init; }

    internal double RawTimeOfPeak { get; init; }

    internal double RawTimeFalse { get; init; }

    internal double RawSettled { get; init; }

    internal double RawPushedOut { get; init; }

    internal double RawMostPushedOut { get; init; }

    internal double RawPeakOutletFlow { get; init; }

    internal double RawLowest { get; init; }

    internal double RawHighest { get; init; }

    internal object ToDump() => ToString();

    /// <summary>The figures in engineering units, invariant culture.</summary>
    public override string ToString() => string.Format(
        CultureInfo.InvariantCulture,
        "reading off by {0:+0.000;-0.000} at {1:F0} s, false for {2:F0} s; {3:F1} kg pushed out, outlet flow up to {4:F3} kg/s",
        RawPeakError,
        RawTimeOfPeak,
        RawTimeFalse,
        RawPushedOut,
        RawPeakOutletFlow);
}
