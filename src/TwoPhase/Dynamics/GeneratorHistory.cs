using System.Collections;
using System.Globalization;
using TwoPhase.Passes;
using TwoPhase.Units;

namespace TwoPhase.Dynamics;

/// <summary>What a simulated generator did: the history of each pass, and a row of totals for every instant that all of them have reached.</summary>
/// <remarks>Immutable and safe to share between threads.</remarks>
public sealed class GeneratorHistory : IReadOnlyList<GeneratorInstant>
{
    private static readonly (string Heading, Func<GeneratorInstant, double> Raw)[] Columns =
    [
        ("time_s", static row => row.RawTime),
        ("feed_flow_kg_s", static row => row.RawFeedFlow),
        ("outlet_flow_kg_s", static row => row.RawOutletFlow),
        ("steam_flow_kg_s", static row => row.RawSteamFlow),
        ("true_quality", static row => row.RawTrueQuality),
        ("indicated_quality", static row => row.RawIndicatedQuality),
        ("lowest_quality", static row => row.RawLowest),
        ("highest_quality", static row => row.RawHighest),
        ("holdup_kg", static row => row.RawHoldup),
        ("feed_pressure_Pa_abs", static row => row.RawFeedPressure),
    ];

    private readonly PassHistory[] _passes;
    private readonly GeneratorInstant[] _rows;

    internal GeneratorHistory(SteamGenerator generator, PassHistory[] passes, List<double> feedPressures)
    {
        Generator = generator;
        _passes = passes;
        _rows = [.. Enumerable.Range(0, passes.Min(pass => pass.Count)).Select(i => GeneratorInstant.Of([.. passes.Select(pass => pass[i])], feedPressures[i]))];
    }

    /// <summary>The generator.</summary>
    public SteamGenerator Generator { get; }

    /// <summary>The histories of the passes in their order. One whose flow stagnated ends early and says so; the others go on.</summary>
    public IReadOnlyList<PassHistory> Passes => _passes;

    /// <summary>Whether every pass ran to the end.</summary>
    public bool IsComplete => Array.TrueForAll(_passes, pass => pass.End == SimulationEnd.Completed);

    /// <summary>Number of rows of totals; the first is the start.</summary>
    public int Count => _rows.Length;

    /// <summary>A row of totals.</summary>
    /// <param name="index">0 at the start.</param>
    public GeneratorInstant this[int index] => _rows[index];

    /// <summary>The history of a pass.</summary>
    /// <param name="pass">Name of the pass.</param>
    /// <exception cref="ArgumentException">There is no such pass.</exception>
    public PassHistory Of(string pass)
    {
        Pass found = Generator.Find(pass) ?? throw new ArgumentException($"Generator '{Generator.Name}' has no pass '{pass}'.", nameof(pass));
        return _passes[Array.IndexOf([.. Generator.Passes], found)];
    }

    /// <summary>The rows of totals in order of time.</summary>
    public IEnumerator<GeneratorInstant> GetEnumerator() => ((IEnumerable<GeneratorInstant>)_rows).GetEnumerator();

    IEnumerator IEnumerable.GetEnumerator() => GetEnumerator();

    /// <summary>Writes the totals as comma-separated values, SI units in the headings, invariant culture; an empty cell where there is no value.</summary>
    /// <param name="writer">Where to.</param>
    public void WriteCsv(TextWriter writer)
    {
        Require.NotNull(writer, nameof(writer)).WriteLine(string.Join(",", Columns.Select(static column => column.Heading)));
        foreach (GeneratorInstant row in _rows) writer.WriteLine(string.Join(",", Columns.Select(column => PassHistory.Cell(column.Raw(row)))));
    }
}
