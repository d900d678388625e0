using TwoPhase.Flow;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.HeatTransfer;

/// <summary>The inside film between tube wall and boiling flow: a flow-boiling or post-dryout correlation.</summary>
/// <remarks>
/// <para>h = q / (Tw − Ts), with h film coefficient [W/(m²·K)], q heat flux at the inside surface [W/m²], Tw temperature of that
/// surface [K], Ts saturation temperature [K]. A model published in terms of Tw − Ts solves for it.</para>
/// <para>A model of your own derives from this class and overrides <see cref="CoefficientCore"/>.</para>
/// </remarks>
public abstract partial class FilmModel
{
    /// <summary>The name of the model, as the trade cites it.</summary>
    public abstract string Name { get; }

    /// <summary>True when the model is for a wall that has dried out, false when liquid wets the wall.</summary>
    public virtual bool IsForDryWall => false;

    /// <summary>h, the film coefficient between the inside surface and saturation temperature.</summary>
    /// <param name="flow">The flow.</param>
    /// <param name="heatFlux">Heat flux q at the inside surface, into the flow; zero or more.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="heatFlux"/> is negative.</exception>
    public HeatTransferCoefficient Coefficient(in TwoPhaseFlow flow, HeatFlux heatFlux) =>
        HeatTransferCoefficient.FromWattsPerSquareMeterKelvin(CoefficientCore(flow.State, CheckedFlux(heatFlux)));

    /// <summary>Tw, temperature of the wetted inside surface: Ts + q/h.</summary>
    /// <param name="flow">The flow.</param>
    /// <param name="heatFlux">Heat flux q at the inside surface, into the flow; zero or more.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="heatFlux"/> is negative.</exception>
    public Temperature SurfaceTemperature(in TwoPhaseFlow flow, HeatFlux heatFlux)
    {
        FlowState state = flow.State;
        double q = CheckedFlux(heatFlux);
        return Temperature.FromKelvins(state.SaturationTemperature + (q / CoefficientCore(state, q)));
    }

    /// <summary>Whether flow and heat flux lie inside the published range of the model.</summary>
    /// <param name="flow">The flow.</param>
    /// <param name="heatFlux">Heat flux q at the inside surface, into the flow; zero or more.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="heatFlux"/> is negative.</exception>
    public Applicability Check(in TwoPhaseFlow flow, HeatFlux heatFlux) => CheckCore(flow.State, CheckedFlux(heatFlux));

    /// <summary>h [W/(m²·K)] for a raw flow; SI in, arguments trusted, no allocation, greater than zero.</summary>
    /// <param name="flow">The flow in SI units.</param>
    /// <param name="heatFlux">q, heat flux at the inside surface [W/m²], zero or more.</param>
    protected internal abstract double CoefficientCore(in FlowState flow, double heatFlux);

    /// <summary>Applicability for a raw flow. A model without published limits keeps this default: inside.</summary>
    /// <param name="flow">The flow in SI units.</param>
    /// <param name="heatFlux">q, heat flux at the inside surface [W/m²], zero or more.</param>
    protected internal virtual Applicability CheckCore(in FlowState flow, double heatFlux) => Applicability.Inside;

    /// <summary>The name.</summary>
    public override string ToString() => Name;

    private static double CheckedFlux(HeatFlux heatFlux) => InsideHeatFlux.NotNegative(heatFlux, nameof(heatFlux));
}
