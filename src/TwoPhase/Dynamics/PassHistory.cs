using System.Collections;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Dynamics;

/// <summary>What a simulated pass did: a row for every instant, columns by name and unit, and the figures that matter.</summary>
/// <remarks>Immutable and safe to share between threads.</remarks>
public sealed partial class PassHistory : IReadOnlyList<PassInstant>
{
    private readonly PassInstant[] _rows;

    internal PassHistory(IEnumerable<PassInstant> rows, SimulationEnd end, string endReason)
    {
        _rows = [.. rows];
        End = end;
        EndReason = endReason;
    }

    /// <summary>How the run ended.</summary>
    public SimulationEnd End { get; }

    /// <summary>Why it ended before its time, with place and time; empty when it ran to its end.</summary>
    public string EndReason { get; }

    /// <summary>Number of rows; the first is the start.</summary>
    public int Count => _rows.Length;

    /// <summary>A row.</summary>
    /// <param name="index">0 at the start.</param>
    public PassInstant this[int index] => _rows[index];

    /// <summary>The rows in order of time.</summary>
    public IEnumerator<PassInstant> GetEnumerator() => ((IEnumerable<PassInstant>)_rows).GetEnumerator();

    /// <summary>Length, end and last row in a line, invariant culture.</summary>
    public override string ToString() => string.Format(System.Globalization.CultureInfo.InvariantCulture, "{0} rows, {1}{2}; last {3}", Count, End, EndReason.Length > 0 ? ": " + EndReason : "", _rows[^1]);

    IEnumerator IEnumerable.GetEnumerator() => GetEnumerator();

    /// <summary>The history at other times: straight between its rows.</summary>
    /// <param name="interval">Time between the new rows, greater than zero.</param>
    /// <returns>From the first row on, as far as whole intervals reach.</returns>
    /// <exception cref="ArgumentOutOfRangeException">The interval is not greater than zero.</exception>
    public PassHistory Resample(Duration interval)
    {
        double step = Require.Positive(interval.Si(), "Interval", Scale.Seconds, nameof(interval)), start = _rows[0].RawTime;
        int count = (int)Math.Floor(((_rows[^1].RawTime - start) / step) + 1e-9) + 1;
        var rows = new PassInstant[count];
        int after = 0;
        for (int i = 0; i < count; i++)
        {
            double time = start + (i * step);
            while (after < _rows.Length - 1 && _rows[after].RawTime < time) after++;
            rows[i] = after == 0 ? _rows[0] : Between(_rows[after - 1], _rows[after], time);
        }

        return new(rows, End, EndReason);
    }

    // NaN on either side stays NaN: nothing is made up across the edge of a gap.
    private static PassInstant Between(in PassInstant before, in PassInstant after, double time)
    {
        double share = Math.Min(1, (time - before.RawTime) / (after.RawTime - before.RawTime));
        if (share == 1) return after;
        var values = new double[HistoryColumn.All.Length];
        for (int i = 0; i < values.Length; i++)
        {
            double from = HistoryColumn.All[i].Raw(before), to = HistoryColumn.All[i].Raw(after);
            values[i] = from + (share * (to - from));
        }

        return HistoryColumn.Row(values) with { MassResidual = after.MassResidual, EnergyResidual = after.EnergyResidual };
    }
}
