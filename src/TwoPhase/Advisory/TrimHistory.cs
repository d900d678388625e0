using System.Collections;
using System.Globalization;
using TwoPhase.Dynamics;
using UnitsNet;

namespace TwoPhase.Advisory;

/// <summary>What a pass did under a quality trim: a row for every interval, and how far the true quality went from where it was.</summary>
/// <remarks>Immutable and safe to share between threads.</remarks>
public sealed class TrimHistory : IReadOnlyList<TrimInstant>
{
    private readonly TrimInstant[] _rows;

    internal TrimHistory(IEnumerable<TrimInstant> rows, SimulationEnd end, string endReason)
    {
        _rows = [.. rows];
        (End, EndReason) = (end, endReason);
        TrimInstant peak = _rows.OrderByDescending(row => Math.Abs(Deviation(row))).First();
        (RawPeak, RawTimeOfPeak) = (Deviation(peak), peak.Pass.RawTime - _rows[0].Pass.RawTime);
        for (int i = 1; i < _rows.Length; i++)
        {
            double elapsed = _rows[i].Pass.RawTime - _rows[i - 1].Pass.RawTime;
            AbsoluteArea += elapsed * (Math.Abs(Deviation(_rows[i - 1])) + Math.Abs(Deviation(_rows[i]))) / 2;
            if (_rows[i].Status == TrimStatus.Holding) RawHeld += elapsed;
        }
    }

    /// <summary>How the run ended.</summary>
    public SimulationEnd End { get; }

    /// <summary>Why it ended before its time; empty when it ran to its end.</summary>
    public string EndReason { get; }

    /// <summary>Largest deviation of the true quality from that at the start, with its sign.</summary>
    public MassFraction PeakDeviation => MassFraction.FromDecimalFractions(RawPeak);

    /// <summary>When that was, from the start of the run.</summary>
    public Duration TimeOfPeak => Duration.FromSeconds(RawTimeOfPeak);

    /// <summary>Deviation of the true quality at the end.</summary>
    public MassFraction LastDeviation => MassFraction.FromDecimalFractions(RawLast);

    /// <summary>∫ |deviation of the true quality| dt [s].</summary>
    public double AbsoluteArea { get; }

    /// <summary>For how long the trim had no value to be believed.</summary>
    public Duration Held => Duration.FromSeconds(RawHeld);

    /// <summary>Number of rows; the first is the start.</summary>
    public int Count => _rows.Length;

    internal double RawPeak { get; }

    internal double RawTimeOfPeak { get; }

    internal double RawLast => Deviation(_rows[^1]);

    internal double RawHeld { get; }

    /// <summary>A row.</summary>
    /// <param name="index">0 at the start.</param>
    public TrimInstant this[int index] => _rows[index];

    /// <summary>The rows in order of time.</summary>
    public IEnumerator<TrimInstant> GetEnumerator() => ((IEnumerable<TrimInstant>)_rows).GetEnumerator();

    IEnumerator IEnumerable.GetEnumerator() => GetEnumerator();

    /// <summary>The figures in engineering units, invariant culture.</summary>
    public override string ToString() => string.Format(
        CultureInfo.InvariantCulture, "true quality off by up to {0:+0.0000;-0.0000} at {1:F0} s, {2:+0.0000;-0.0000} at the end, held for {3:F0} s", RawPeak, RawTimeOfPeak, RawLast, RawHeld);

    private double Deviation(in TrimInstant row) => row.Pass.RawTrueQuality - _rows[0].Pass.RawTrueQuality;
}
