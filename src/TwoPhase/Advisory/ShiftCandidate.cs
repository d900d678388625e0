using System.Globalization;
using UnitsNet;

namespace TwoPhase.Advisory;

/// <summary>One cause that a shift may have, and what it would mean.</summary>
public sealed class ShiftCandidate
{
    private readonly double _quality, _flow;

    internal ShiftCandidate(ShiftCause cause, double quality, double flow, double likelihood) => (Cause, _quality, _flow, RelativeLikelihood) = (cause, quality, flow, likelihood);

    /// <summary>The cause.</summary>
    public ShiftCause Cause { get; }

    /// <summary>The true quality if it is this.</summary>
    public MassFraction Quality => MassFraction.FromDecimalFractions(_quality);

    /// <summary>The true flow at the outlet if it is this.</summary>
    public MassFlow OutletFlow => MassFlow.FromKilogramsPerSecond(_flow);

    /// <summary>How well it explains the witnesses against the best, 0 to 1; 1 for all where there is no witness.</summary>
    public double RelativeLikelihood { get; }

    internal double RawQuality => _quality;

    internal double RawFlow => _flow;

    internal object ToDump() => ToString();

    /// <summary>Cause, quality and likelihood, invariant culture.</summary>
    public override string ToString() => string.Format(CultureInfo.InvariantCulture, "{0}: quality {1:F3}, outlet {2:F2} kg/s, likelihood {3:G2}", Cause, _quality, _flow, RelativeLikelihood);
}
