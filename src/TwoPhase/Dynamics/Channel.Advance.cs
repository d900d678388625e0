namespace TwoPhase.Dynamics;

// Inner steps that follow the fastest cell.
internal sealed partial class Channel<TFluid>
{
    // Below 1 with room for a wave that quickens within a step.
    private const double Courant = 0.7;

    // No change outside is looked at more coarsely than this [s]; losses and films are renewed once a stretch.
    private const double LongestStep = 0.5, Stretch = 1;

    // What moves the outflow at once by more than this share of the feed is a jump: steps behind it are no longer than a tenth of the time since, and of this [s].
    private const double Abrupt = 0.02, Settling = 1, TimesFiner = 10;

    // Times nearer to each other than this are the same [s]; sums of steps miss their end by round-off.
    private const double Instant = 1e-7;

    private double _feedFlow, _heat, _lastStep, _lastHeat, _outletRate, _lastJump;

    /// <summary>Lag of the pressure profile behind the flow [s]; 0 for none.</summary>
    public double HeadLag { get; set; } = 10;

    /// <summary>Time since the state of rest [s].</summary>
    public double Time { get; private set; }

    /// <summary>Pressure imposed at the outlet now [Pa]: behind the non-return valve where there is one.</summary>
    public double OutletPressure { get; private set; }

    /// <summary>The cell behind whose outlet face the meter stands; the last one unless set.</summary>
    public int MeteredCell { get; set; }

    /// <summary>Mass flow at the meter now [kg/s], and the enthalpy that it carries [J/kg].</summary>
    public double MeteredFlow { get; private set; }

    public double MeteredEnthalpy { get; private set; }

    /// <summary>
    /// Moves on with feed and heat held, and the outlet pressure going evenly to its new value. Returns false when a cell
    /// stagnates: what follows is outside the model.
    /// </summary>
    /// <remarks>Goes by whole seconds of the run, each in equal steps, so that it matters little in which portions a caller asks for them.</remarks>
    public bool Advance(double duration, double feedFlow, double outletPressure)
    {
        double start = Time, end = start + duration, from = OutletPressure, rate = (outletPressure - from) / duration;
        if (Math.Abs(rate - _outletRate) * _stores > Abrupt * feedFlow) _lastJump = start;
        _outletRate = rate;
        bool jumps = feedFlow != _lastFeed || Heat != _lastHeat;
        _lastHeat = Heat;
        while (end - Time > Instant)
        {
            double next = Math.Min(end, Stretch * (Math.Floor((Time + Instant) / Stretch) + 1));
            Absorb(next - Time);
            AimPressure(EndPressure);
            FindStores();
            RenewFilms();
            while (next - Time > Instant)
            {
                double left = next - Time, step = left / Math.Max(1, Math.Ceiling((left / LongestAllowed(feedFlow)) - 1e-9));
                Time += step;
                OutletPressure = from + ((outletPressure - from) * ((Time - start) / duration));
                double flow = _cells[MeteredCell].Outflow, enthalpy = _cells[MeteredCell].OutEnthalpy;
                StepBehindValve(step, feedFlow, OutletPressure);
                if (Stagnant >= 0) return false;
                Book(step, feedFlow);
                ReadMeter(step, flow, enthalpy, jumps);
                jumps = false;
            }
        }

        return true;
    }

    // What a step finds is the mean over it, which stands for its middle: at its end everything has moved on by as much again as since the middle of the
    // step before, in the share of half a step to the distance of both; unless feed or heat have jumped in between.
    private void ReadMeter(double step, double flowBefore, double enthalpyBefore, bool jumps)
    {
        ref readonly Cell cell = ref _cells[MeteredCell];
        double reach = jumps ? 0 : step / (step + _lastStep), flow = cell.Outflow + (reach * (cell.Outflow - flowBefore));
        MeteredFlow = flow > 0 ? flow : cell.Outflow;
        MeteredEnthalpy = cell.OutEnthalpy + (reach * (cell.OutEnthalpy - enthalpyBefore));
        _lastStep = step;
    }

    // A step of feed or heat drives the flow up everywhere at once, and by no more than it rises itself.
    private double LongestAllowed(double feedFlow)
    {
        double feed = feedFlow / _feedFlow, heat = (_heat > 0 ? AbsorbedHeat / _heat : 1) * _shift;
        (_feedFlow, _heat, _shift) = (feedFlow, AbsorbedHeat, 1);
        if (Math.Max(Math.Abs(feed - 1), Math.Abs(heat - 1)) > Abrupt) _lastJump = Time;
        return Math.Min(Math.Min(LongestStep, (Settling + Time - _lastJump) / TimesFiner), Courant / (CourantRate * Math.Max(1, Math.Max(feed, heat))));
    }
}
