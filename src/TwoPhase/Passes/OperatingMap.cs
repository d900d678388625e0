using TwoPhase.Numerics;
using TwoPhase.Units;

namespace TwoPhase.Passes;

/// <summary>Any figure of a profile over a grid of flow, heat or firing, and feed temperature.</summary>
public static class OperatingMap
{
    /// <summary>Solves the pass in every cell of a grid, on all processors, and keeps one figure of each profile.</summary>
    /// <remarks>A cell without a steady state, or for which the figure throws an argument or convergence exception, keeps the message instead. Cells do not depend on the number of processors.</remarks>
    /// <typeparam name="T">The figure: a quantity, or several in a value of your own.</typeparam>
    /// <param name="pass">The pass.</param>
    /// <param name="conditions">The outlet pressure; flow, heat and feed temperature come from the grid.</param>
    /// <param name="grid">The grid.</param>
    /// <param name="figure">The figure of a profile; called from several threads.</param>
    /// <param name="models">Slip and friction; null for the defaults.</param>
    /// <param name="options">What counts, and how finely; null for everything.</param>
    /// <param name="progress">Told the share of cells that are done, rising from above 0 to 1, on whatever thread is at work.</param>
    /// <param name="processors">At most so many at once; null for all.</param>
    /// <param name="cancellation">Ends the work between cells.</param>
    /// <exception cref="ArgumentNullException">Pass, grid or figure is null.</exception>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="processors"/> is below 1.</exception>
    /// <exception cref="OperationCanceledException">It was cancelled.</exception>
    /// <exception cref="AggregateException">The figure threw another exception.</exception>
    public static OperatingMap<T> Of<T>(
        Pass pass,
        PassConditions conditions,
        OperatingGrid grid,
        Func<PassProfile, T> figure,
        PassModels? models = null,
        SteadyOptions? options = null,
        IProgress<double>? progress = null,
        int? processors = null,
        CancellationToken cancellation = default)
    {
        Require.NotNull(pass, nameof(pass));
        Require.NotNull(grid, nameof(grid));
        Require.NotNull(figure, nameof(figure));
        if (processors is { } count) Require.Within(count, 1, int.MaxValue, "Processors", Scale.None, nameof(processors));
        var cells = new OperatingCell<T>[grid.Count];
        var told = new Told(progress, cells.Length);
        Parallel.For(0, cells.Length, new ParallelOptions { CancellationToken = cancellation, MaxDegreeOfParallelism = processors ?? -1 }, i =>
        {
            cells[i] = Cell(pass, OperatingMap<T>.At(conditions, grid, i), figure, models, options);
            told.One();
        });
        return new(grid, cells);
    }

    private static OperatingCell<T> Cell<T>(Pass pass, in PassConditions conditions, Func<PassProfile, T> figure, PassModels? models, SteadyOptions? options)
    {
        try
        {
            return new(conditions, figure(SteadyState.Solve(pass, conditions, models, options)), null);
        }
        catch (Exception error) when (error is ArgumentException or ConvergenceException)
        {
            return new(conditions, default, error.Message);
        }
    }

    /// <summary>Counts cells and tells the share, one after the other, so that it never falls.</summary>
    private sealed class Told(IProgress<double>? progress, int cells)
    {
        private readonly object _lock = new();
        private int _done;

        public void One()
        {
            if (progress is null) return;
            lock (_lock) progress.Report(++_done / (double)cells);
        }
    }
}
