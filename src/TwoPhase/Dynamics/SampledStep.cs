using System.Numerics;

namespace TwoPhase.Dynamics;

/// <summary>The answer to a unit step as it was sampled: straight between samples, at its final value behind the last. SI.</summary>
internal sealed class SampledStep(double[] values, double sampling, double final)
{
    public double[] Values => values;

    public double Sampling => sampling;

    public double Final => final;

    /// <summary>Largest excursion, from where it began.</summary>
    public double Peak { get; } = Math.Max(Math.Abs(final), values.Max(Math.Abs));

    /// <summary>What is still to come behind the last sample, over the largest excursion.</summary>
    public double Rest => Peak > 0 ? Math.Abs(final - values[^1]) / Peak : 0;

    /// <summary>
    /// G(iω) of the system that answers so: each stretch of constant slope is a rectangle of the impulse response, with
    /// transform Δy sinc(ω Δt/2) at its middle.
    /// </summary>
    public Complex Response(double angularFrequency)
    {
        double half = angularFrequency * sampling / 2, shape = half == 0 ? 1 : Math.Sin(half) / half;
        Complex sum = Complex.Zero;
        for (int i = 1; i < values.Length; i++) sum += (values[i] - values[i - 1]) * shape * Complex.FromPolarCoordinates(1, -angularFrequency * (i - 0.5) * sampling);
        return values[0] + sum + ((final - values[^1]) * Complex.FromPolarCoordinates(1, -angularFrequency * (values.Length - 1) * sampling));
    }
}
