using TwoPhase.Flow;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.HeatTransfer;

/// <summary>The quality at which the wall dries out at a given heat flux: a dryout correlation.</summary>
/// <remarks>
/// <para>The quality of the flow itself is not used: the result is compared with it.</para>
/// <para>Most evaporator tubes are wider than the tubes that these correlations rest on; <see cref="CriticalQuality.IsIndicatorOnly"/>
/// then says so. An indicator may rank tubes and show trends. It is never a reason for an alarm, still less for a trip.</para>
/// <para>A model of your own derives from this class and overrides <see cref="MeanCore"/>, and <see cref="SpreadCore"/> if it
/// tells the top of the tube from the bottom.</para>
/// </remarks>
public abstract partial class CriticalQualityModel
{
    /// <summary>The name of the model, as the trade cites it.</summary>
    public abstract string Name { get; }

    /// <summary>The critical quality of a flow at a heat flux: mean, and for the top and the bottom of the tube.</summary>
    /// <param name="flow">The flow.</param>
    /// <param name="heatFlux">Heat flux q at the inside surface, into the flow; greater than zero.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="heatFlux"/> is not greater than zero.</exception>
    public CriticalQuality Critical(in TwoPhaseFlow flow, HeatFlux heatFlux)
    {
        FlowState state = flow.State;
        double q = CheckedFlux(heatFlux);
        double mean = MeanCore(state, q);
        return new(mean, SpreadCore(state, mean), CheckCore(state, q));
    }

    /// <summary>Whether flow and heat flux lie inside the published range of the model.</summary>
    /// <param name="flow">The flow.</param>
    /// <param name="heatFlux">Heat flux q at the inside surface, into the flow; greater than zero.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="heatFlux"/> is not greater than zero.</exception>
    public Applicability Check(in TwoPhaseFlow flow, HeatFlux heatFlux) => CheckCore(flow.State, CheckedFlux(heatFlux));

    /// <summary>
    /// Mean critical quality [kg/kg] of the perimeter for a raw flow; SI in, arguments trusted, no allocation. Above 1 when the
    /// wall stays wet up to dry steam; infinite at zero heat flux.
    /// </summary>
    /// <param name="flow">The flow in SI units.</param>
    /// <param name="heatFlux">q, heat flux at the inside surface [W/m²], zero or more.</param>
    protected internal abstract double MeanCore(in FlowState flow, double heatFlux);

    /// <summary>Critical quality at the bottom less that at the top [kg/kg] for a raw flow; zero by default, as in a vertical tube.</summary>
    /// <param name="flow">The flow in SI units.</param>
    /// <param name="mean">Mean critical quality [kg/kg], from <see cref="MeanCore"/>.</param>
    protected internal virtual double SpreadCore(in FlowState flow, double mean) => 0;

    /// <summary>Applicability for a raw flow. A model without published limits keeps this default: inside.</summary>
    /// <param name="flow">The flow in SI units.</param>
    /// <param name="heatFlux">q, heat flux at the inside surface [W/m²], zero or more.</param>
    protected internal virtual Applicability CheckCore(in FlowState flow, double heatFlux) => Applicability.Inside;

    /// <summary>The name.</summary>
    public override string ToString() => Name;

    private static double CheckedFlux(HeatFlux heatFlux) => InsideHeatFlux.Positive(heatFlux, nameof(heatFlux));
}
