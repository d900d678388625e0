using TwoPhase.Flow;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Friction;

/// <summary>The frictional loss of pressure along a straight tube: a two-phase friction correlation.</summary>
/// <remarks>
/// <para>Friction factors are Darcy's: dp/dz = f G² / (2 D ρ).</para>
/// <para>A model of your own derives from this class and overrides <see cref="GradientCore"/>.</para>
/// </remarks>
public abstract partial class FrictionModel
{
    /// <summary>The name of the model, as the trade cites it.</summary>
    public abstract string Name { get; }

    /// <summary>The frictional pressure gradient, positive where pressure falls in the direction of flow.</summary>
    /// <param name="flow">The flow.</param>
    /// <param name="roughness">Roughness of the bore, zero for a smooth tube.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="roughness"/> is negative or not less than half the bore.</exception>
    public PressureGradient Gradient(in TwoPhaseFlow flow, Length roughness)
    {
        FlowState state = flow.State;
        double k = Require.NotNegative(roughness.Si(), "Roughness", Scale.Millimetres, nameof(roughness));
        Require.Below(k, state.Bore / 2, "Roughness", Scale.Millimetres, nameof(roughness));
        return PressureGradient.FromPascalsPerMetre(GradientCore(state, k));
    }

    /// <summary>Whether the flow lies inside the published range of the model.</summary>
    /// <param name="flow">The flow.</param>
    public Applicability Check(in TwoPhaseFlow flow) => CheckCore(flow.State);

    /// <summary>Frictional gradient [Pa/m] of a raw flow; SI in, arguments trusted, no allocation.</summary>
    /// <param name="flow">The flow in SI units.</param>
    /// <param name="roughness">Roughness of the bore [m].</param>
    protected internal abstract double GradientCore(in FlowState flow, double roughness);

    /// <summary>Applicability for a raw flow. A model without published limits keeps this default: inside.</summary>
    /// <param name="flow">The flow in SI units.</param>
    protected internal virtual Applicability CheckCore(in FlowState flow) => Applicability.Inside;

    /// <summary>Gradient of the whole flow as if it were saturated liquid [Pa/m].</summary>
    /// <param name="flow">The flow in SI units.</param>
    /// <param name="roughness">Roughness of the bore [m].</param>
    protected static double LiquidOnly(in FlowState flow, double roughness) =>
        FrictionFactor.GradientCore(flow.MassFlux, flow.Bore, flow.LiquidDensity, flow.LiquidViscosity, roughness);

    /// <summary>Gradient of the whole flow as if it were saturated vapour [Pa/m].</summary>
    /// <param name="flow">The flow in SI units.</param>
    /// <param name="roughness">Roughness of the bore [m].</param>
    protected static double VapourOnly(in FlowState flow, double roughness) =>
        FrictionFactor.GradientCore(flow.MassFlux, flow.Bore, flow.VapourDensity, flow.VapourViscosity, roughness);

    /// <summary>The name.</summary>
    public override string ToString() => Name;
}
