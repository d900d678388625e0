using MathNet.Numerics;
using MathNet.Numerics.LinearAlgebra;
using MathNet.Numerics.Optimization;

namespace TwoPhase.Dynamics;

/// <summary>Finds the two paths of a <see cref="TransferFunction"/> that come nearest to a sampled step, the final gain being known.</summary>
/// <remarks>Dead times and lags by the simplex of Nelder and Mead, Computer J. 7, 308-313 (1965), from several starts; the split of the gain is linear and solved for each.</remarks>
internal sealed class TwoPathFit
{
    private const int Samples = 250, MostIterations = 2000;
    private const double Noticeable = 0.05, Tolerance = 1e-9;

    // Where the descents begin: dead time of the first path over when the answer stirs, its lag and the later dead time over how long it takes to settle.
    private static readonly double[] Begins = [0, 1], Lags = [0.02, 0.5], Laters = [0.2, 0.5, 0.8];

    private readonly SampledStep _step;
    private readonly double[] _times, _values;
    private readonly double _scale;

    private TwoPathFit(SampledStep step)
    {
        _step = step;
        double end = (step.Values.Length - 1) * step.Sampling;
        _times = Generate.LinearSpaced(Samples, 0, end);

        // What jumps has no dead time: only the sample right behind the step tells.
        _times[1] = step.Sampling;
        _values = Array.ConvertAll(_times, time => step.Values[(int)Math.Round(time / step.Sampling)]);
        for (int i = 0; i < Samples; i++) _times[i] = Math.Round(_times[i] / step.Sampling) * step.Sampling;
        _scale = end;
    }

    /// <summary>The function, and the root of the mean squared deviation over the largest excursion.</summary>
    public static (TransferFunction Function, double Error) Of(SampledStep step)
    {
        if (!(step.Peak > 0)) return (default, 0);
        var fit = new TwoPathFit(step);
        TransferFunction best = default;
        double least = double.PositiveInfinity;
        foreach (double[] start in fit.Starts())
        {
            double[] found = fit.Descend(start);
            double error = fit.Error(found, out TransferFunction function);
            if (error < least) (best, least) = (function, error);
        }

        return (best, least);
    }

    // Where the answer first stirs and last settles; the later path begins somewhere between.
    private IEnumerable<double[]> Starts()
    {
        double noticed = Noticeable * _step.Peak;
        double first = _times[Math.Max(0, Array.FindIndex(_values, value => Math.Abs(value) > noticed))];
        double last = Math.Max(first + (0.01 * _scale), _times[Math.Max(0, Array.FindLastIndex(_values, value => Math.Abs(value - _step.Final) > noticed))]);
        double span = last - first;
        return from begin in Begins
               from lag in Lags
               from later in Laters
               select new[] { Root(begin * first), Root(lag * span), Root(first + (later * span)), Root(0.15 * span) };
    }

    // Squares keep dead times and lags from falling below zero.
    private double Root(double seconds) => Math.Sqrt(seconds / _scale);

    private double[] Descend(double[] start)
    {
        var simplex = new NelderMeadSimplex(Tolerance, MostIterations);
        try
        {
            return simplex.FindMinimum(ObjectiveFunction.Value(point => Error(point.AsArray(), out _)), Vector<double>.Build.Dense(start)).MinimizingPoint.AsArray();
        }
        catch (MaximumIterationsException)
        {
            return start;   // the other starts remain
        }
    }

    private double Error(double[] roots, out TransferFunction function)
    {
        double delay = roots[0] * roots[0] * _scale, lag = roots[1] * roots[1] * _scale, laterDelay = roots[2] * roots[2] * _scale, laterLag = roots[3] * roots[3] * _scale;
        double products = 0, squares = 0;
        for (int i = 0; i < Samples; i++)
        {
            double later = TransferFunction.Rise(_times[i], laterDelay, laterLag), apart = TransferFunction.Rise(_times[i], delay, lag) - later;
            products += apart * (_values[i] - (_step.Final * later));
            squares += apart * apart;
        }

        double gain = squares > 0 ? products / squares : 0;
        function = delay <= laterDelay ? new(gain, delay, lag, _step.Final - gain, laterDelay, laterLag) : new(_step.Final - gain, laterDelay, laterLag, gain, delay, lag);
        double sum = 0;
        for (int i = 0; i < Samples; i++)
        {
            double off = function.StepCore(_times[i]) - _values[i];
            sum += off * off;
        }

        return Math.Sqrt(sum / Samples) / _step.Peak;
    }
}
