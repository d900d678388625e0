using TwoPhase.Advisory;
using TwoPhase.Metering;
using UnitsNet;

namespace Backfill.Writing;

/// <summary>The rows of a row group of the output. Qualities in kg/kg.</summary>
internal sealed class EstimateTable
{
    /// <summary>Rows of a row group, whatever those of the history are: six hours of a row a second.</summary>
    public const int Capacity = 21_600;

    private static readonly string[] TrustWords = Enum.GetNames<Trust>(), StatusWords = Enum.GetNames<ReadingStatus>(), SignalWords = Enum.GetNames<PassSignal>();

    private readonly TimeColumn _time = new("time", Capacity);
    private readonly NumberColumn<float> _read = Number("quality_read"), _estimated = Number("quality_estimated"), _motion = Number("u_motion"), _absolute = Number("u_absolute"),
        _ifMeter = Number("quality_if_meter_is_right"), _ifHeat = Number("quality_if_heat_is_right"), _wait = Number("wait_s");

    private readonly WordColumn _status = Word("read_status"), _trust = Word("trust"), _fault = Word("input_fault"), _gap = Word("gap");

    public EstimateTable() => Columns = [_time, _read, _status, _estimated, _motion, _absolute, _trust, _wait, _fault, _ifMeter, _ifHeat, _gap];

    public IReadOnlyList<TableColumn> Columns { get; }

    public int Count { get; private set; }

    public int Room => Capacity - Count;

    public void Clear() => Count = 0;

    public void Add(DateTime time, double read, ReadingStatus status, in QualityEstimate estimate)
    {
        int row = Count++;
        bool apart = estimate.Trust == Trust.Disagreement;
        _time.Values[row] = time;
        _read.Values[row] = double.IsNaN(read) ? null : (float)read;
        _status.Values[row] = StatusWords[(int)status];
        _estimated.Values[row] = Value(estimate.Quality);
        _motion.Values[row] = Value(estimate.Motion);
        _absolute.Values[row] = Value(estimate.Absolute);
        _trust.Values[row] = TrustWords[(int)estimate.Trust];
        _wait.Values[row] = (float?)estimate.ExpectedWait?.Seconds;
        _fault.Values[row] = estimate.Fault == PassSignal.None ? null : SignalWords[(int)estimate.Fault];
        _ifMeter.Values[row] = apart ? Value(estimate.QualityIfMeterIsRight) : null;
        _ifHeat.Values[row] = apart ? Value(estimate.QualityIfHeatIsRight) : null;
        _gap.Values[row] = null;
    }

    /// <summary>The one row of a partition whose readings are not to be had.</summary>
    public void AddGap(DateTime start, string reason)
    {
        Add(start, double.NaN, ReadingStatus.Missing, default);
        int row = Count - 1;
        (_estimated.Values[row], _motion.Values[row], _absolute.Values[row], _wait.Values[row]) = (null, null, null, null);
        _gap.Values[row] = reason;
    }

    private static NumberColumn<float> Number(string name) => new(name, Capacity);

    private static WordColumn Word(string name) => new(name, Capacity);

    private static float? Value(MassFraction? quality) => (float?)quality?.DecimalFractions;
}
