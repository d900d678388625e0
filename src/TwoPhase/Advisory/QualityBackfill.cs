using TwoPhase.Passes;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Advisory;

/// <summary>Estimates a history after the fact, all passes side by side: to the last bit what the live estimators would have said sample by sample.</summary>
/// <remarks>No estimate knows what came after it, so that a history shows what the operator could have known.</remarks>
public static class QualityBackfill
{
    // Between two looks at the progress and at the wish to stop.
    private const int Block = 1024;

    /// <summary>Estimates the history of the passes of a generator.</summary>
    /// <param name="generator">The generator; each pass with its meter.</param>
    /// <param name="history">Columns of each pass, in the order of the generator; they may differ in length.</param>
    /// <param name="options">How; null for the defaults.</param>
    /// <param name="startStates">Where the estimators stood before, in the same order; null to begin anew.</param>
    /// <param name="progress">Told the share that is done, now and then, from several threads.</param>
    /// <param name="cancellation">To stop it.</param>
    /// <returns>The estimates of each pass.</returns>
    /// <exception cref="ArgumentException">The numbers of passes differ, or a pass has no meter or no heated section.</exception>
    /// <exception cref="FormatException">A state is of another pass.</exception>
    /// <exception cref="OperationCanceledException">It was stopped.</exception>
    public static IReadOnlyList<EstimateColumns> Run(
        SteamGenerator generator, IReadOnlyList<PassColumns> history, EstimatorOptions? options = null, IReadOnlyList<EstimatorState>? startStates = null, IProgress<Ratio>? progress = null, CancellationToken cancellation = default)
    {
        int passes = Require.NotNull(generator, nameof(generator)).Passes.Count;
        if (Require.NotNull(history, nameof(history)).Count != passes) throw new ArgumentException($"There are columns of {history.Count} passes for a generator of {passes}.", nameof(history));
        if (startStates is not null && startStates.Count != passes) throw new ArgumentException($"There are {startStates.Count} states for a generator of {passes} passes.", nameof(startStates));
        QualityEstimator[] estimators = [.. new GeneratorEstimator(generator, options).Estimators];
        for (int i = 0; i < passes && startStates is not null; i++) estimators[i].Restore(startStates[i]);

        var results = new EstimateColumns[passes];
        long done = 0, all = Math.Max(1, history.Sum(static columns => (long)columns.Count));
        try
        {
            Parallel.For(0, passes, new ParallelOptions { CancellationToken = cancellation }, pass => results[pass] = Estimate(estimators[pass], history[pass], Count));
        }
        catch (AggregateException fault) when (fault.InnerException is OperationCanceledException stopped)
        {
            throw new OperationCanceledException(stopped.Message, stopped, cancellation);
        }

        return results;

        void Count(int samples)
        {
            cancellation.ThrowIfCancellationRequested();
            progress?.Report(Ratio.FromDecimalFractions(Interlocked.Add(ref done, samples) / (double)all));
        }
    }

    private static EstimateColumns Estimate(QualityEstimator estimator, PassColumns columns, Action<int> count)
    {
        var results = new EstimateColumns(columns.Count);
        for (int i = 0; i < columns.Count; i++)
        {
            if (i % Block == 0) count(i == 0 ? 0 : Block);
            results.Set(i, estimator.Update(columns[i]));
        }

        count(columns.Count == 0 ? 0 : ((columns.Count - 1) % Block) + 1);
        results.EndState = estimator.Save();
        return results;
    }
}
