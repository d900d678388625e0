using System.Collections;

namespace TwoPhase.Passes;

/// <summary>A figure in every cell of a grid: a list of cells, feed temperature running slowest and flow fastest.</summary>
/// <typeparam name="T">The figure.</typeparam>
public sealed class OperatingMap<T> : IReadOnlyList<OperatingCell<T>>
{
    private readonly OperatingCell<T>[] _cells;

    internal OperatingMap(OperatingGrid grid, OperatingCell<T>[] cells) => (Grid, _cells) = (grid, cells);

    /// <summary>The grid.</summary>
    public OperatingGrid Grid { get; }

    /// <summary>Number of cells.</summary>
    public int Count => _cells.Length;

    /// <summary>A cell.</summary>
    /// <param name="index">Position in the list.</param>
    public OperatingCell<T> this[int index] => _cells[index];

    /// <summary>A cell by its place in the grid.</summary>
    /// <param name="flow">Index of the flow.</param>
    /// <param name="heat">Index of the heat.</param>
    /// <param name="feedTemperature">Index of the feed temperature.</param>
    public OperatingCell<T> this[int flow, int heat, int feedTemperature] =>
        flow >= 0 && flow < Grid.Flows.Count && heat >= 0 && heat < Grid.Heats.Count
            ? _cells[(((feedTemperature * Grid.Heats.Count) + heat) * Grid.Flows.Count) + flow]
            : throw new ArgumentOutOfRangeException(flow < 0 || flow >= Grid.Flows.Count ? nameof(flow) : nameof(heat));

    /// <summary>The cells.</summary>
    public IEnumerator<OperatingCell<T>> GetEnumerator() => ((IEnumerable<OperatingCell<T>>)_cells).GetEnumerator();

    IEnumerator IEnumerable.GetEnumerator() => GetEnumerator();

    internal static PassConditions At(in PassConditions conditions, OperatingGrid grid, int index)
    {
        int flow = index % grid.Flows.Count, rest = index / grid.Flows.Count;
        return conditions.WithFeedFlow(grid.Flows[flow]).WithAbsorbedHeat(grid.Heats[rest % grid.Heats.Count]).WithFeedTemperature(grid.FeedTemperatures[rest / grid.Heats.Count]);
    }
}
