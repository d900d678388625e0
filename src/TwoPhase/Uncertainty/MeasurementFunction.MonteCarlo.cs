using System.Runtime.ExceptionServices;
using TwoPhase.Units;

namespace TwoPhase.Uncertainty;

public sealed partial class MeasurementFunction
{
    private const int BlockLength = 10_000;   // also the least block of JCGM 101:2008, 7.9.4

    /// <summary>The distribution of the result, by drawing the inputs many times.</summary>
    /// <remarks>
    /// <para>The same seed gives the same result on every machine, whether <paramref name="parallel"/> or not. Each input draws from a stream of its
    /// own, so that one more input does not disturb the others.</para>
    /// <para>Range: inputs that are correlated must be normal (joint normal distribution, JCGM 101:2008, 6.4.8).</para>
    /// <para>Accuracy: the standard uncertainty to about 1/√(2·trials); the ends of a 95 % interval to some 2/√trials of it.</para>
    /// <para>Source: JCGM 101:2008 (GUM Supplement 1), clause 7.</para>
    /// </remarks>
    /// <param name="trials">Number of draws, at least 100; 200,000 by default. JCGM 101, 7.2 asks for 10⁴/(1 − p), so 200,000 for p = 0.95.</param>
    /// <param name="seed">Start of the random streams.</param>
    /// <param name="parallel">Whether trials run on several threads; the function must then be safe for that.</param>
    /// <exception cref="ArgumentException">Correlated inputs are not normal.</exception>
    /// <exception cref="ArithmeticException">The function gives no finite number for some trial.</exception>
    public MonteCarloResult Simulate(int trials = 200_000, int seed = 1, bool parallel = false)
    {
        Require.Within(trials, 100, int.MaxValue, "Number of trials", Scale.None, nameof(trials));
        InputSampler sampler = new(_inputs, _correlation, seed);
        double[] results = new double[trials];
        for (int done = 0; done < trials; done += BlockLength)
            Fill(sampler, results, done, Math.Min(BlockLength, trials - done), parallel);
        return new(results, trials);
    }

    /// <summary>As <see cref="Simulate"/>, with as many trials as it takes for the result, its uncertainty and the ends of its interval to settle.</summary>
    /// <remarks>
    /// <para>Range: as <see cref="Simulate"/>.</para>
    /// <para>Accuracy: stops when twice the standard deviation of each of the four, over blocks of trials, is below half of the last significant digit of u(y).</para>
    /// <para>Source: JCGM 101:2008, 7.9 (adaptive procedure) and 7.9.2 (numerical tolerance δ).</para>
    /// </remarks>
    /// <param name="significantDigits">Digits of u(y) that shall be right, 1 to 3.</param>
    /// <param name="coverageProbability">p of the interval that is watched; 0.95 by default.</param>
    /// <param name="seed">Start of the random streams.</param>
    /// <param name="mostTrials">Where to stop at the latest; <see cref="MonteCarloResult.Settled"/> is then false.</param>
    /// <param name="parallel">Whether trials run on several threads; the function must then be safe for that.</param>
    public MonteCarloResult SimulateUntilSettled(int significantDigits = 2, double coverageProbability = 0.95, int seed = 1, int mostTrials = 10_000_000, bool parallel = false)
    {
        Require.Within(significantDigits, 1, 3, "Number of significant digits", Scale.None, nameof(significantDigits));
        int block = Math.Max(BlockLength, (int)Math.Ceiling(100 / (1 - CoverageInterval.Probability(coverageProbability))));
        Require.Within(mostTrials, 2 * block, int.MaxValue, "Most trials", Scale.None, nameof(mostTrials));

        InputSampler sampler = new(_inputs, _correlation, seed);
        List<double> results = [];
        SettlingTest settling = new(significantDigits);
        bool settled = false;
        while (!settled && results.Count + block <= mostTrials)
        {
            double[] next = new double[block];
            for (int done = 0; done < block; done += BlockLength)
                Fill(sampler, next, done, Math.Min(BlockLength, block - done), parallel);
            results.AddRange(next);
            MonteCarloResult one = new(next, block);
            CoverageInterval interval = one.SymmetricInterval(coverageProbability);
            settled = settling.Add(one.Mean, one.StandardUncertainty, interval.Low, interval.High);
        }

        return new([.. results], results.Count, settled);
    }

    private void Fill(InputSampler sampler, double[] results, int start, int count, bool parallel)
    {
        double[][] draws = sampler.Draw(count);
        if (parallel)
        {
            try
            {
                Parallel.For(0, count, () => new double[_inputs.Length], (trial, _, values) => Trial(trial, values), _ => { });
            }
            catch (AggregateException several)
            {
                ExceptionDispatchInfo.Capture(several.InnerExceptions[0]).Throw();   // the same as without threads
            }
        }
        else
        {
            double[] values = new double[_inputs.Length];
            for (int trial = 0; trial < count; trial++) Trial(trial, values);
        }

        double[] Trial(int trial, double[] values)
        {
            for (int i = 0; i < values.Length; i++) values[i] = draws[i][trial];
            results[start + trial] = Evaluate(values);
            return values;
        }
    }
}
