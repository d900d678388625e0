using TwoPhase.Numerics;

namespace TwoPhase.Advisory;

/// <summary>Tells what a pass is doing from firing, feed and the quality that firing and feed would give, with hysteresis.</summary>
internal struct OperatingStateFinder
{
    // Shares of full firing, mass fluxes [kg/(m²·s)] and qualities; each with its way down and its way up. Common practice, no source.
    private static readonly Hysteresis Fire = new(0.02, 0.05), LowFire = new(0.25, 0.30), Half = new(0.45, 0.55), Feed = new(20, 40), Wet = new(0.15, 0.30);

    private bool _fire, _aboveLow, _aboveHalf, _feed, _wet;

    public OperatingState State { get; private set; }

    public OperatingState Next(double firing, double massFlux, double restingQuality)
    {
        Fire.Follow(ref _fire, firing);
        LowFire.Follow(ref _aboveLow, firing);
        Half.Follow(ref _aboveHalf, firing);
        Feed.Follow(ref _feed, massFlux);
        Wet.Follow(ref _wet, restingQuality);
        return State = (_fire, _feed) switch
        {
            (true, true) when _wet => _aboveHalf ? OperatingState.Running : OperatingState.Turndown,
            (true, true) => _aboveLow ? OperatingState.LightOff : OperatingState.LowFireHold,
            (true, false) => OperatingState.Trip,
            (false, true) => State is OperatingState.Running or OperatingState.Turndown or OperatingState.LightOff or OperatingState.LowFireHold or OperatingState.Trip ? OperatingState.Trip : OperatingState.Filling,
            _ => State is OperatingState.Unknown or OperatingState.Off or OperatingState.Filling ? OperatingState.Off : OperatingState.Draining,
        };
    }

    public void List(StateFields state)
    {
        state.Flag("fire", ref _fire);
        state.Flag("above low", ref _aboveLow);
        state.Flag("above half", ref _aboveHalf);
        state.Flag("feed", ref _feed);
        state.Flag("wet", ref _wet);
        int now = (int)State;
        state.Number("state", ref now);
        State = (OperatingState)now;
    }

    private readonly struct Hysteresis(double low, double high)
    {
        public void Follow(ref bool state, double value) => state = state ? !(value < low) : value > high;
    }
}
