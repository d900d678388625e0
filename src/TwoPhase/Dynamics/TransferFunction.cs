using System.Globalization;
using System.Numerics;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Dynamics;

/// <summary>A transfer function of low order: two paths side by side, each with a gain, a dead time and a lag. The first is the lead, the second comes later.</summary>
/// <remarks>
/// <para>G(s) = K1 e^(−θ1 s)/(1 + T1 s) + K2 e^(−θ2 s)/(1 + T2 s); K gains in units of output per unit of input, θ dead times [s], T lags [s].</para>
/// <para>Without dead times that is K (1 + Tz s)/((1 + T1 s)(1 + T2 s)) with K = K1 + K2 and lead time Tz = (K1 T2 + K2 T1)/K.</para>
/// <para>Two paths because a pass has two: what flow and heat do to the volume at once, and what travels through it.</para>
/// </remarks>
public readonly record struct TransferFunction
{
    internal TransferFunction(double firstGain, double firstDelay, double firstLag, double secondGain, double secondDelay, double secondLag) =>
        (FirstGain, RawFirstDelay, RawFirstLag, SecondGain, RawSecondDelay, RawSecondLag) = (firstGain, firstDelay, firstLag, secondGain, secondDelay, secondLag);

    /// <summary>K1.</summary>
    public double FirstGain { get; }

    /// <summary>θ1.</summary>
    public Duration FirstDelay => Duration.FromSeconds(RawFirstDelay);

    /// <summary>T1.</summary>
    public Duration FirstLag => Duration.FromSeconds(RawFirstLag);

    /// <summary>K2.</summary>
    public double SecondGain { get; }

    /// <summary>θ2.</summary>
    public Duration SecondDelay => Duration.FromSeconds(RawSecondDelay);

    /// <summary>T2.</summary>
    public Duration SecondLag => Duration.FromSeconds(RawSecondLag);

    /// <summary>K1 + K2, what a lasting unit of input ends in.</summary>
    public double Gain => FirstGain + SecondGain;

    internal double RawFirstDelay { get; }

    internal double RawFirstLag { get; }

    internal double RawSecondDelay { get; }

    internal double RawSecondLag { get; }

    /// <summary>The answer to a unit step, at a time behind it.</summary>
    /// <param name="time">Time since the step, zero or more.</param>
    /// <exception cref="ArgumentOutOfRangeException">The time is negative.</exception>
    public double Step(Duration time) => StepCore(Require.NotNegative(time.Si(), "Time", Scale.Seconds, nameof(time)));

    /// <summary>G(iω): gain and phase for an input that swings.</summary>
    /// <param name="period">Period of the swing, greater than zero.</param>
    /// <exception cref="ArgumentOutOfRangeException">The period is not greater than zero.</exception>
    public Complex Response(Duration period)
    {
        double omega = 2 * Math.PI / Require.Positive(period.Si(), "Period", Scale.Seconds, nameof(period));
        return Path(FirstGain, RawFirstDelay, RawFirstLag) + Path(SecondGain, RawSecondDelay, RawSecondLag);

        Complex Path(double gain, double delay, double lag) => gain * Complex.FromPolarCoordinates(1, -omega * delay) / new Complex(1, omega * lag);
    }

    internal double StepCore(double time) => (FirstGain * Rise(time, RawFirstDelay, RawFirstLag)) + (SecondGain * Rise(time, RawSecondDelay, RawSecondLag));

    internal static double Rise(double time, double delay, double lag) => time <= delay ? 0 : lag > 0 ? 1 - Math.Exp((delay - time) / lag) : 1;

    internal object ToDump() => ToString();

    /// <summary>The function as one writes it, invariant culture.</summary>
    public override string ToString() => $"{Text(FirstGain, RawFirstDelay, RawFirstLag)} {(SecondGain < 0 ? '-' : '+')} {Text(Math.Abs(SecondGain), RawSecondDelay, RawSecondLag)}";

    private static string Text(double gain, double delay, double lag) => string.Format(CultureInfo.InvariantCulture, "{0:G3} e^(-{1:F0} s)/(1 + {2:F0} s)", gain, delay, lag);
}
