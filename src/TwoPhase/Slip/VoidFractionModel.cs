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
        FlowState inside = InsideTheEnds(flow, 1e-9);
        double x = inside.Quality, alpha = VoidFractionCore(inside);
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

    // At an end one phase vanishes and the slip ratio is 0/0: a little inside it has its limit. Not at x = 1 where the model leaves
    // liquid standing: that liquid does not move, and the ratio is infinite. Half the digits of 1 − α remain at 1e-7.
    private FlowState InsideTheEnds(in FlowState flow, double nearLiquid)
    {
        const double nearVapour = 1e-7;
        if (flow.Quality < nearLiquid) return flow with { Quality = nearLiquid };
        return flow.Quality > 1 - nearVapour && VoidFractionCore(flow with { Quality = 1 }) >= 1 ? flow with { Quality = 1 - nearVapour } : flow;
    }

    /// <summary>The name.</summary>
    public override string ToString() => Name;
}
