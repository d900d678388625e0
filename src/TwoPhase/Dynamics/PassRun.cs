using TwoPhase.Passes;
using TwoPhase.Units;

namespace TwoPhase.Dynamics;

/// <summary>One pass of a generator on its way through a run.</summary>
internal sealed class PassRun
{
    // Less feed than this share of that at the start is none.
    private const double Lost = 1e-3;

    private readonly PassSimulator _simulator;
    private readonly OperatingSchedule _schedule;
    private readonly HeatSplit.Factors _split;
    private readonly FeedValve? _valve;
    private readonly List<PassInstant> _rows;
    private readonly double _coefficient;

    public PassRun(GeneratorSchedule schedule, int index, SimulatorOptions options)
    {
        Pass pass = schedule.Generator.Passes[index];
        _schedule = schedule.Passes[index];
        _simulator = new(pass, _schedule.Start, options);
        _split = _schedule.Split.For(pass, nameof(schedule));
        _rows = [_simulator.Now];
        FeedFlow = _schedule.Start.RawFeedFlow;
        _valve = schedule.Supply?.ValveOf(pass.Name);
        if (_valve is null) return;
        double drop = schedule.Supply!.RawPressure - InletPressure;
        if (!(drop > 0)) throw Require.OutOfRange(schedule.Supply.RawPressure, "Feed pressure", Scale.Megapascals, nameof(schedule), $"must lie above the {Scale.Megapascals.Text(InletPressure)} at the inlet of pass '{pass.Name}'");
        _coefficient = FeedFlow / Math.Sqrt(drop * _simulator.FeedDensity(_schedule.Start, schedule.Supply.RawPressure));
    }

    /// <summary>Whether a valve of the header feeds it, and it still runs.</summary>
    public bool IsOnValve => _valve is not null && _simulator.End == SimulationEnd.None;

    /// <summary>What it was fed last [kg/s]; what its valve passes once the header has settled.</summary>
    public double FeedFlow { get; set; }

    public double InletPressure => _simulator.Now.RawInletPressure;

    /// <summary>Feed over the root of the pressure drop at the valve [kg/(s·√Pa)].</summary>
    public double Conductance(double from, double to, double headerPressure) =>
        _coefficient * _valve!.Passage(from, to) * Math.Sqrt(_simulator.FeedDensity(_schedule.Over(from, to), headerPressure));

    /// <summary>Feed that flow control gives it [kg/s].</summary>
    public double Controlled(double from, double to) => _valve is null && _simulator.End == SimulationEnd.None ? _schedule.Over(from, to).RawFeedFlow : FeedFlow;

    /// <summary>A stretch of rows without a header.</summary>
    public void Go(int first, int end, double sampling, double seconds)
    {
        for (int row = first; row < end; row++)
        {
            Advance(row * sampling, Math.Min(seconds, (row + 1) * sampling));
            Keep();
        }
    }

    public void Advance(double from, double to)
    {
        if (_simulator.End != SimulationEnd.None) return;
        PassConditions conditions = _schedule.Over(from, to);
        if (_valve is not null)
        {
            if (FeedFlow < Lost * _schedule.Start.RawFeedFlow)
            {
                _simulator.StopForLackOfFeed();
                return;
            }

            conditions = conditions with { RawFeedFlow = FeedFlow };
        }

        FeedFlow = conditions.RawFeedFlow;
        _simulator.Advance(conditions, _split, from, to);
    }

    public void Keep()
    {
        if (_simulator.End == SimulationEnd.None) _rows.Add(_simulator.Now);
    }

    public PassHistory History() => new(_rows, _simulator.End == SimulationEnd.None ? SimulationEnd.Completed : _simulator.End, _simulator.EndReason);
}
