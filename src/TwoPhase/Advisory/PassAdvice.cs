using System.Globalization;
using TwoPhase.Limits;
using UnitsNet;

namespace TwoPhase.Advisory;

/// <summary>What would bring one pass to its set-point, and how far its limits are.</summary>
/// <remarks>
/// Advisory only. The set-point is for the upper value: it keeps the true quality, and not the reading, below the limit. Nothing is advised while the reading cannot be believed;
/// the pass is then held as the plant's own procedure has it.
/// </remarks>
public sealed class PassAdvice
{
    /// <summary>No move is larger than this, whatever is missing: 3 %.</summary>
    internal const double LargestMove = 0.03;

    private readonly double _setPoint, _flow, _firing, _wait;

    internal PassAdvice(string pass, AdviceReason reason, double setPoint, double flow, double wait, PassLimits? limits)
    {
        (Pass, Reason, Limits, _setPoint, _wait) = (pass, reason, limits, setPoint, wait);
        IsCapped = Math.Abs(flow) > LargestMove;
        (_flow, _firing) = (Capped(flow), Capped((1 / (1 + flow)) - 1));
    }

    /// <summary>Name of the pass.</summary>
    public string Pass { get; }

    /// <summary>Why it is moved, or not.</summary>
    public AdviceReason Reason { get; }

    /// <summary>Quality to go to: the target, or below it so far below the limits that the uncertainty of this pass leaves the same margin in standard uncertainties as of any other; null while it is not known.</summary>
    public MassFraction? SetPoint => double.IsNaN(_setPoint) ? null : MassFraction.FromDecimalFractions(_setPoint);

    /// <summary>Change of the feed flow that would do it at the same firing, 3 % at most; null when it is not the turn of this pass.</summary>
    public Ratio? FlowTrim => Trim(_flow);

    /// <summary>Change of the firing that would do it for this pass at the same flow, 3 % at most: instead of the flow, never with it. All passes get it.</summary>
    public Ratio? FiringTrim => Trim(_firing);

    /// <summary>Whether more than one move is needed: the trims stand at their cap.</summary>
    public bool IsCapped { get; }

    /// <summary>How long after the move the meter's reading must not be trusted, by the water's way through the pass; null when nothing is moved.</summary>
    public Duration? Wait => Reason == AdviceReason.Move ? Duration.FromSeconds(_wait) : null;

    /// <summary>How far solids, dryout and the other limits are, by the estimated state at rest; null while the state is not known.</summary>
    public PassLimits? Limits { get; }

    private static double Capped(double move) => Math.Max(-LargestMove, Math.Min(LargestMove, move));

    private Ratio? Trim(double value) => Reason == AdviceReason.Move ? Ratio.FromDecimalFractions(value) : null;

    internal object ToDump() => ToString();

    /// <summary>The advice in a line, invariant culture.</summary>
    public override string ToString() => Reason == AdviceReason.Move
        ? string.Format(CultureInfo.InvariantCulture, "pass '{0}': flow {1:+0.0%;-0.0%} or firing {2:+0.0%;-0.0%} towards {3:F3}, then wait {4:F0} s", Pass, _flow, _firing, _setPoint, _wait)
        : $"pass '{Pass}': {Reason}";
}
