namespace TwoPhase.Dynamics;

// Inner steps that follow the fastest cell.
internal sealed partial class Channel<TFluid>
{
    // Below 1 with room for a wave that quickens within a step.
    private const double Courant = 0.7;

    // No change outside is looked at more coarsely than this [s]; losses and films are renewed once a stretch.
    private const double LongestStep = 0.5, Stretch = 1;

    // Times nearer to each other than this are the same [s]; sums of steps miss their end by round-off.
    private const double Instant = 1e-7;

    private double _feedFlow, _heat;

    /// <summary>Lag of the pressure profile behind the flow [s]; 0 for none.</summary>
    public double HeadLag { get; set; } = 10;

    /// <summary>Time since the state of rest [s].</summary>
    public double Time { get; private set; }

    /// <summary>Pressure imposed at the outlet now [Pa]: behind the non-return valve where there is one.</summary>
    public double OutletPressure { get; private set; }

    /// <summary>
    /// Moves on with feed and heat held, and the outlet pressure going evenly to its new value. Returns false when a cell
    /// stagnates: what follows is outside the model.
    /// </summary>
    /// <remarks>Goes by whole seconds of the run, each in equal steps, so that it matters little in which portions a caller asks for them.</remarks>
    public bool Advance(double duration, double feedFlow, double outletPressure)
    {
        double start = Time, end = start + duration, from = OutletPressure;
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
                StepBehindValve(step, feedFlow, OutletPressure);
                if (Stagnant >= 0) return false;
                Book(step, feedFlow);
            }
        }

        return true;
    }

    // A step of feed or heat drives the flow up everywhere at once, and by no more than it rises itself.
    private double LongestAllowed(double feedFlow)
    {
        double quickening = Math.Max(1, Math.Max(feedFlow / _feedFlow, (_heat > 0 ? AbsorbedHeat / _heat : 1) * _shift));
        (_feedFlow, _heat, _shift) = (feedFlow, AbsorbedHeat, 1);
        return Math.Min(LongestStep, Courant / (CourantRate * quickening));
    }
}
