using TwoPhase.Metering;
using TwoPhase.Units;

namespace TwoPhase.Dynamics;

public sealed partial class PassHistory
{
    /// <summary>When a transmitter over the meter would be at its ceiling: what it then shows is no longer the differential, and the reading too low.</summary>
    /// <param name="transmitter">The transmitter as it is set up.</param>
    /// <returns>The stretches in order of time; none without a meter.</returns>
    public IReadOnlyList<HistorySpan> AtCeiling(DifferentialPressureTransmitter transmitter)
    {
        Require.NotNull(transmitter, nameof(transmitter));
        return Spans(row => row.Differential is { } differential && transmitter.Read(transmitter.Current(differential)).Status == TransmitterStatus.AtCeiling);
    }

    /// <summary>The stretches of rows that have something in common.</summary>
    internal IReadOnlyList<HistorySpan> Spans(Predicate<PassInstant> has)
    {
        List<HistorySpan> spans = [];
        for (int i = 0; i < _rows.Length; i++)
        {
            if (!has(_rows[i])) continue;
            int first = i;
            while (i + 1 < _rows.Length && has(_rows[i + 1])) i++;
            spans.Add(new(_rows[first].RawTime, _rows[i].RawTime));
        }

        return spans;
    }

    /// <summary>Index of the first row with a property; −1 for none.</summary>
    internal int FirstRow(Predicate<PassInstant> has) => Array.FindIndex(_rows, has);

    /// <summary>Index of the first row from which on a property stays; −1 when the last row has it not.</summary>
    internal int FirstForGood(Predicate<PassInstant> has)
    {
        int last = Array.FindLastIndex(_rows, row => !has(row));
        return last == _rows.Length - 1 ? -1 : last + 1;
    }
}
