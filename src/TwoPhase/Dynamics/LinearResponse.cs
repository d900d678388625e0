using System.Globalization;
using System.Numerics;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Dynamics;

/// <summary>How one output answers one input near an operating point: gain, sampled step, frequency response, and a transfer function of low order.</summary>
public sealed class LinearResponse
{
    private readonly SampledStep _step;
    private readonly Lazy<(TransferFunction Function, double Error)> _fit;

    internal LinearResponse(LinearInput input, LinearOutput output, SampledStep step, double asymmetry)
    {
        (Input, Output, _step, Asymmetry) = (input, output, step, asymmetry);
        _fit = new(() => TwoPathFit.Of(step));
    }

    /// <summary>What was stepped.</summary>
    public LinearInput Input { get; }

    /// <summary>What was looked at.</summary>
    public LinearOutput Output { get; }

    /// <summary>What a lasting unit of the input ends in: SI unit of the output per unit of the input (1 % or 1 K).</summary>
    public double Gain => _step.Final;

    /// <summary>The answer to a lasting unit of the input, a value for every <see cref="Sampling"/> from its start on.</summary>
    public IReadOnlyList<double> Step => _step.Values;

    /// <summary>Time between the values of <see cref="Step"/>.</summary>
    public Duration Sampling => Duration.FromSeconds(_step.Sampling);

    /// <summary>By how much steps up and down of the size used are no mirror images, over the largest excursion: what the linear view leaves out.</summary>
    public double Asymmetry { get; }

    /// <summary>What was still to come at the end of the run, over the largest excursion.</summary>
    public double Unsettled => _step.Rest;

    /// <summary>The transfer function of low order; the first call fits it.</summary>
    public TransferFunction Fit => _fit.Value.Function;

    /// <summary>Root mean square of what the fit misses of the sampled step, over the largest excursion.</summary>
    public double FitError => _fit.Value.Error;

    /// <summary>G(iω) from the sampled step itself: gain and phase for an input that swings. Periods below some ten samples are not resolved.</summary>
    /// <param name="period">Period of the swing, at least two samples.</param>
    /// <exception cref="ArgumentOutOfRangeException">The period is shorter than two samples.</exception>
    public Complex Response(Duration period)
    {
        double seconds = Require.Within(period.Si(), 2 * _step.Sampling, double.MaxValue, "Period", Scale.Seconds, nameof(period));
        return _step.Response(2 * Math.PI / seconds);
    }

    internal object ToDump() => ToString();

    /// <summary>Gain, function and its error, invariant culture.</summary>
    public override string ToString() => string.Format(
        CultureInfo.InvariantCulture,
        "{0} by {1}: {2:G4}{3} per {4}, {5}, fit within {6:P1}",
        Output,
        Input,
        Gain,
        Output switch { LinearOutput.Holdup => " kg", LinearOutput.OutletFlow => " kg/s", _ => "" },
        Input == LinearInput.FeedTemperature ? "K" : "%",
        Fit,
        FitError);
}
