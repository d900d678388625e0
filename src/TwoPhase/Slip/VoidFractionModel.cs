using TwoPhase.Flow;
using UnitsNet;

namespace TwoPhase.Slip;

/// <summary>How much of the tube's cross-section the vapour takes up, given the flow: a void-fraction or slip correlation.</summary>
/// <remarks>
/// <para>α = 1 / (1 + S · (1 − x)/x · ρg/ρl), with α void fraction [-], S slip ratio ug/ul [-], x flowing quality [kg/kg].</para>
/// <para>A model of your own derives from this class and overrides <see cref="VoidFractionCore"/>.</para>
/// </remarks>
public abstract partial class VoidFractionModel
{
    // How far inside x = 1 the slip ratio is taken for its limit there: half the digits of 1 − α remain.
    private const double NearEnd = 1e-7;

    /// <summary>The name of the model, as the trade cites it.</summary>
    public abstract string Name { get; }

    /// <summary>α: share of the cross-section that vapour takes up, 0 to 1.</summary>
    /// <param name="flow">The flow.</param>
    public Ratio VoidFraction(in TwoPhaseFlow flow) => Ratio.FromDecimalFractions(VoidFractionCore(flow.State));

    /// <summary>S: vapour velocity over liquid velocity. At x = 0 and x = 1, where one phase is absent, its limit.</summary>
    /// <param name="flow">The flow.</param>
    public double SlipRatio(in TwoPhaseFlow flow) => SlipRatioCore(flow.State);

    /// <summary>How the phases share the tube: velocities, and static, momentum and homogeneous density.</summary>
    /// <param name="flow">The flow.</param>
    public PhaseSplit Split(in TwoPhaseFlow flow) => new(flow.State, VoidFractionCore(flow.State), SlipRatioCore(flow.State));

    /// <summary>Whether the flow lies inside the published range of the model.</summary>
    /// <param name="flow">The flow.</param>
    public Applicability Check(in TwoPhaseFlow flow) => CheckCore(flow.State);

    /// <summary>α for a raw flow; SI in, arguments trusted, no allocation.</summary>
    /// <param name="flow">The flow in SI units.</param>
    protected internal abstract double VoidFractionCore(in FlowState flow);

    /// <summary>S for a raw flow. By default from the void fraction; a model that is published as a slip ratio overrides it.</summary>
    /// <param name="flow">The flow in SI units.</param>
    protected internal virtual double SlipRatioCore(in FlowState flow)
    {
        // One phase vanishes at the ends and 0/0 with it: evaluate a little inside, where the ratio has its limit.
        double x = Math.Min(Math.Max(flow.Quality, 1e-9), 1 - NearEnd);
        double alpha = VoidFractionCore(flow with { Quality = x });
        return x / (1 - x) * (flow.LiquidDensity / flow.VapourDensity) * ((1 - alpha) / alpha);
    }

    /// <summary>Applicability for a raw flow. A model without published limits keeps this default: inside.</summary>
    /// <param name="flow">The flow in SI units.</param>
    protected internal virtual Applicability CheckCore(in FlowState flow) => Applicability.Inside;

    /// <summary>α that a slip ratio implies: α = x / (x + S (1 − x) ρg/ρl).</summary>
    /// <param name="flow">The flow in SI units.</param>
    /// <param name="slip">S, slip ratio [-].</param>
    protected static double VoidFractionFromSlip(in FlowState flow, double slip) =>
        flow.Quality / (flow.Quality + (slip * (1 - flow.Quality) * (flow.VapourDensity / flow.LiquidDensity)));

    /// <summary>The name.</summary>
    public override string ToString() => Name;
}
