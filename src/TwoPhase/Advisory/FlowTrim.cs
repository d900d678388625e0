using TwoPhase.Numerics;

namespace TwoPhase.Advisory;

/// <summary>The controller of a quality trim: a feed-forward, and PI in velocity form around it, within the limits of the flow. SI.</summary>
internal struct FlowTrim(TrimSettings settings, double startFlow)
{
    private double _trim, _last = double.NaN;

    /// <summary>The value trimmed to; NaN before the loop has closed.</summary>
    public double SetPoint { get; private set; } = settings.RawSetPoint;

    /// <summary>The feed flow of the next interval [kg/s].</summary>
    /// <param name="value">Value to trim by; NaN for none.</param>
    /// <param name="feedForward">Flow that the feed-forward wants [kg/s].</param>
    /// <param name="status">What the trim did.</param>
    public double Next(double value, double feedForward, out TrimStatus status)
    {
        double low = settings.RawLowest * startFlow, high = settings.RawHighest * startFlow, move = Move(value), wanted = feedForward + _trim + move;
        _last = value;

        // As far as to a limit and no further; but a trim that the feed-forward has pushed beyond stays what it is, for when that comes back.
        if (move > 0) _trim = Math.Max(_trim, Math.Min(_trim + move, high - feedForward));
        if (move < 0) _trim = Math.Min(_trim, Math.Max(_trim + move, low - feedForward));
        status = wanted < low || wanted > high ? TrimStatus.AtLimit : double.IsNaN(value) ? TrimStatus.Holding : TrimStatus.Trimming;
        return Fast.Clamp(feedForward + _trim, low, high);
    }

    private double Move(double value)
    {
        if (double.IsNaN(value)) return 0;
        if (double.IsNaN(SetPoint)) SetPoint = value;
        double change = double.IsNaN(_last) ? 0 : value - _last;   // behind a gap there is nothing to differ from
        return startFlow * settings.Gain * (change + (settings.RawInterval / settings.RawIntegralTime * (value - SetPoint)));
    }
}
