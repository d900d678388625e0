using TwoPhase.Flow;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.HeatTransfer;

/// <summary>The wall superheat at which the first bubbles form: a correlation for the onset of nucleate boiling.</summary>
/// <remarks>
/// <para>ΔT = Tw − Ts, with Tw temperature of the wetted inside surface and Ts saturation temperature [K].</para>
/// <para>A model of your own derives from this class and overrides <see cref="SuperheatCore"/>.</para>
/// </remarks>
public abstract partial class OnsetModel
{
    /// <summary>The name of the model, as the trade cites it.</summary>
    public abstract string Name { get; }

    /// <summary>ΔT, wall superheat at which bubbles begin to form at a heat flux.</summary>
    /// <param name="flow">The flow; of it only the saturated properties are used.</param>
    /// <param name="heatFlux">Heat flux q at the inside surface, into the flow; zero or more.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="heatFlux"/> is negative.</exception>
    public TemperatureDelta Superheat(in TwoPhaseFlow flow, HeatFlux heatFlux) =>
        TemperatureDelta.FromKelvins(SuperheatCore(flow.State, CheckedFlux(heatFlux)));

    /// <summary>Tb = Ts + ΔT − q/h, temperature of the bulk liquid at which bubbles begin to form on the wall.</summary>
    /// <param name="flow">The flow; of it only the saturated properties are used.</param>
    /// <param name="heatFlux">Heat flux q at the inside surface, into the flow; zero or more.</param>
    /// <param name="film">h, film coefficient of the liquid, for example by <see cref="SinglePhaseFilm.Gnielinski"/>; greater than zero.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="heatFlux"/> is negative or <paramref name="film"/> not greater than zero.</exception>
    public Temperature BulkTemperature(in TwoPhaseFlow flow, HeatFlux heatFlux, HeatTransferCoefficient film)
    {
        FlowState state = flow.State;
        double q = CheckedFlux(heatFlux), h = Require.Positive(film.Si(), "Film coefficient h", Scale.WattsPerSquareMetreKelvin, nameof(film));
        return Temperature.FromKelvins(state.SaturationTemperature + SuperheatCore(state, q) - (q / h));
    }

    /// <summary>Whether flow and heat flux lie inside the published range of the model.</summary>
    /// <param name="flow">The flow.</param>
    /// <param name="heatFlux">Heat flux q at the inside surface, into the flow; zero or more.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="heatFlux"/> is negative.</exception>
    public Applicability Check(in TwoPhaseFlow flow, HeatFlux heatFlux) => CheckCore(flow.State, CheckedFlux(heatFlux));

    /// <summary>ΔT [K] for a raw flow; SI in, arguments trusted, no allocation.</summary>
    /// <param name="flow">The flow in SI units.</param>
    /// <param name="heatFlux">q, heat flux at the inside surface [W/m²], zero or more.</param>
    protected internal abstract double SuperheatCore(in FlowState flow, double heatFlux);

    /// <summary>Applicability for a raw flow. A model without published limits keeps this default: inside.</summary>
    /// <param name="flow">The flow in SI units.</param>
    /// <param name="heatFlux">q, heat flux at the inside surface [W/m²], zero or more.</param>
    protected internal virtual Applicability CheckCore(in FlowState flow, double heatFlux) => Applicability.Inside;

    /// <summary>The name.</summary>
    public override string ToString() => Name;

    private static double CheckedFlux(HeatFlux heatFlux) => InsideHeatFlux.NotNegative(heatFlux, nameof(heatFlux));
}
