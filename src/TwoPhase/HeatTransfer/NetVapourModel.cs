using TwoPhase.Flow;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.HeatTransfer;

/// <summary>Where vapour first stays in a liquid that is still subcooled in the mean: a correlation for net vapour generation.</summary>
/// <remarks>
/// <para>Between this point and the end of subcooling, equilibrium quality is negative although vapour flows;
/// <see cref="TrueQuality"/> gives how much. In an evaporator pass it moves the water held by less than 1 %.</para>
/// <para>A model of your own derives from this class and overrides <see cref="SubcoolingCore"/>.</para>
/// </remarks>
public abstract partial class NetVapourModel
{
    /// <summary>The name of the model, as the trade cites it.</summary>
    public abstract string Name { get; }

    /// <summary>h′ − hd, subcooling in enthalpy at which vapour first stays; zero or more.</summary>
    /// <param name="flow">The flow; of it saturated properties, mass flux and bore are used.</param>
    /// <param name="heatFlux">Heat flux q at the inside surface, into the flow; zero or more.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="heatFlux"/> is negative.</exception>
    public SpecificEnergy Subcooling(in TwoPhaseFlow flow, HeatFlux heatFlux) =>
        SpecificEnergy.FromJoulesPerKilogram(SubcoolingCore(flow.State, CheckedFlux(heatFlux)));

    /// <summary>xd = −(h′ − hd)/hfg, equilibrium quality at which vapour first stays; zero or less.</summary>
    /// <param name="flow">The flow; of it saturated properties, mass flux and bore are used.</param>
    /// <param name="heatFlux">Heat flux q at the inside surface, into the flow; zero or more.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="heatFlux"/> is negative.</exception>
    public MassFraction DepartureQuality(in TwoPhaseFlow flow, HeatFlux heatFlux) =>
        MassFraction.FromDecimalFractions(DepartureCore(flow.State, CheckedFlux(heatFlux)));

    /// <summary>x, the flowing quality in truth, by Levy's profile fit: 0 up to departure, equilibrium quality well beyond it.</summary>
    /// <remarks>
    /// <para>x = xe − xd exp(xe/xd − 1) for xe &gt; xd, else 0.</para>
    /// <para>xe equilibrium quality, xd the same at departure (negative).</para>
    /// <para>Range: xe from subcooled to low quality; a profile fitted so that x and its slope start at zero.</para>
    /// <para>Accuracy: none stated; that of xd.</para>
    /// <para>Source: Levy, Int. J. Heat Mass Transfer 10(7), 951-965 (1967); Collier and Thome, Convective Boiling and Condensation,
    /// 3rd ed. (1994), section 6.4; the same form in open course notes on two-phase heat transfer. Some codes divide it by
    /// 1 − xd exp(xe/xd − 1), which takes at most −xd of x itself (1 % of x where xd = −0.01).</para>
    /// </remarks>
    /// <param name="flow">The flow; of it saturated properties, mass flux and bore are used.</param>
    /// <param name="heatFlux">Heat flux q at the inside surface, into the flow; zero or more.</param>
    /// <param name="equilibrium">xe, equilibrium quality; may be negative.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="heatFlux"/> is negative.</exception>
    public MassFraction TrueQuality(in TwoPhaseFlow flow, HeatFlux heatFlux, MassFraction equilibrium) =>
        MassFraction.FromDecimalFractions(LevyTrueQuality(equilibrium.Si(), DepartureCore(flow.State, CheckedFlux(heatFlux))));

    /// <summary>Whether flow and heat flux lie inside the published range of the model.</summary>
    /// <param name="flow">The flow.</param>
    /// <param name="heatFlux">Heat flux q at the inside surface, into the flow; zero or more.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="heatFlux"/> is negative.</exception>
    public Applicability Check(in TwoPhaseFlow flow, HeatFlux heatFlux) => CheckCore(flow.State, CheckedFlux(heatFlux));

    /// <summary>h′ − hd [J/kg] for a raw flow; SI in, arguments trusted, no allocation, zero or more.</summary>
    /// <param name="flow">The flow in SI units.</param>
    /// <param name="heatFlux">q, heat flux at the inside surface [W/m²], zero or more.</param>
    protected internal abstract double SubcoolingCore(in FlowState flow, double heatFlux);

    /// <summary>Applicability for a raw flow. A model without published limits keeps this default: inside.</summary>
    /// <param name="flow">The flow in SI units.</param>
    /// <param name="heatFlux">q, heat flux at the inside surface [W/m²], zero or more.</param>
    protected internal virtual Applicability CheckCore(in FlowState flow, double heatFlux) => Applicability.Inside;

    /// <summary>The name.</summary>
    public override string ToString() => Name;

    internal double DepartureCore(in FlowState flow, double heatFlux) => -SubcoolingCore(flow, heatFlux) / flow.LatentHeat;

    internal static double LevyTrueQuality(double equilibrium, double departure) =>
        equilibrium <= departure ? 0
        : departure < 0 ? equilibrium - (departure * Math.Exp((equilibrium / departure) - 1))
        : equilibrium;

    private static double CheckedFlux(HeatFlux heatFlux) => InsideHeatFlux.NotNegative(heatFlux, nameof(heatFlux));
}
