namespace TwoPhase.Dynamics;

// The heat that reaches the pass: what the fire asks for, behind its lags, split by the shares of the cells.
internal sealed partial class Channel<TFluid>
{
    private double _gas, _refractory, _shift = 1;

    /// <summary>Lags of the heat behind the fire.</summary>
    public HeatLags HeatLags { get; set; }

    /// <summary>Heat that the pass takes up now, mean over the last stretch [W].</summary>
    public double AbsorbedHeat { get; private set; }

    /// <summary>Splits the heat anew: each duct's own share times its factor.</summary>
    public void Split(ReadOnlySpan<double> factors)
    {
        foreach (ref Cell cell in _cells.AsSpan())
        {
            double share = cell.OwnShare * factors[cell.Duct];
            if (cell.HeatShare > 0) _shift = Math.Max(_shift, share / cell.HeatShare);
            cell.HeatShare = share;
        }
    }

    private void RestHeat() => AbsorbedHeat = _gas = _refractory = Heat;

    private void Absorb(double duration)
    {
        double share = HeatLags.RawShare;
        AbsorbedHeat = ((1 - share) * Follow(ref _gas, Heat, HeatLags.RawGas, duration)) + (share * Follow(ref _refractory, Heat, HeatLags.RawRefractory, duration));
    }

    // Mean over the time in which a lag follows an input that is held.
    private static double Follow(ref double state, double input, double lag, double duration)
    {
        double off = state - input, left = lag > 0 ? off * Math.Exp(-duration / lag) : 0;
        state = input + left;
        return input + (lag / duration * (off - left));
    }
}
