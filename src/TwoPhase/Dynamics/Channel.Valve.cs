namespace TwoPhase.Dynamics;

// The non-return valve between the end of the pass and the header.
internal sealed partial class Channel<TFluid>
{
    // What a valve that counts as shut still lets through, over the feed flow, since slip at no flow at all has no meaning; up to half as much again is near enough.
    private const double Trickle = 0.005, Enough = 1.5;

    private const int GreatestTrials = 40;

    private Cell[] _kept = [];

    /// <summary>Whether nothing can flow back into the pass.</summary>
    public bool HasNonReturnValve { get; set; }

    /// <summary>Time for which the valve has been shut [s].</summary>
    public double TimeShut { get; private set; }

    /// <summary>Pressure at the end of the pass [Pa]: that of the header, or less while the valve is shut.</summary>
    public double EndPressure { get; private set; }

    // An inner step against the pressure of the header. Where that would drive the flow back, the valve shuts, and the pass itself makes the pressure at which nothing leaves.
    private void StepBehindValve(double step, double feedFlow, double headerPressure)
    {
        if (!HasNonReturnValve)
        {
            Step(step, feedFlow, headerPressure);
            return;
        }

        Keep(out Remains before);
        Step(step, feedFlow, headerPressure);
        double least = Trickle * feedFlow, high = headerPressure, low = Math.Min(before.EndPressure, headerPressure), reach = Math.Max(high - low, Probe * high);
        if (Stagnant < 0 && Outlet.Outflow >= least) return;
        TimeShut += step;
        bool bracketed = false;
        for (int i = 0; i < GreatestTrials; i++)
        {
            double pressure = bracketed ? (low + high) / 2 : low;
            Restore(before);
            Step(step, feedFlow, pressure);
            if (Stagnant >= 0 || Outlet.Outflow < least)
            {
                high = pressure;
                if (bracketed) continue;
                low -= reach;
                reach *= 2;
            }
            else if (Outlet.Outflow < Enough * least)
            {
                return;
            }
            else
            {
                low = pressure;
                bracketed = true;
            }
        }
    }

    private void Keep(out Remains before)
    {
        if (_kept.Length == 0) _kept = new Cell[_cells.Length];
        _cells.CopyTo(_kept, 0);
        before = new(EndPressure, _lastFeed, _beyond, CourantRate, _decayStep);
    }

    private void Restore(in Remains before)
    {
        _kept.CopyTo(_cells, 0);
        (EndPressure, _lastFeed, _beyond, CourantRate, _decayStep) = before;
    }

    private readonly record struct Remains(double EndPressure, double LastFeed, double Beyond, double CourantRate, double DecayStep);
}
