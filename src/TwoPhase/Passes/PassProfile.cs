using System.Collections;
using TwoPhase.Flow;
using UnitsNet;

namespace TwoPhase.Passes;

/// <summary>The steady state along one pass, from inlet to outlet: a list of rows, and what follows from them.</summary>
/// <remarks>
/// Rows stand at every section border (one for each side), where boiling begins and ends, and closer together where the flow
/// changes faster. Immutable and safe to share between threads.
/// </remarks>
public sealed partial class PassProfile : IReadOnlyList<ProfilePoint>
{
    private readonly PassNode[] _nodes;

    internal PassProfile(Pass pass, in PassConditions conditions, PassModels models, SteadyOptions options, PassNode[] nodes, double exchanged, double pressureError, double massError)
    {
        _nodes = nodes;
        Pass = pass;
        Conditions = conditions;
        Models = models;
        Options = options;
        Exchanged = exchanged;
        (PressureDrop, Audit) = Summed(pressureError, massError);
    }

    /// <summary>The pass.</summary>
    public Pass Pass { get; }

    /// <summary>What is imposed on it, with the flow or heat found where it was looked for.</summary>
    public PassConditions Conditions { get; }

    /// <summary>The correlations used.</summary>
    public PassModels Models { get; }

    /// <summary>What was taken into account.</summary>
    public SteadyOptions Options { get; }

    /// <summary>Heat that the feed interchanger moves; zero without one.</summary>
    public Power InterchangerHeat => Power.FromWatts(Exchanged);

    /// <summary>Inlet pressure minus outlet pressure, in its parts.</summary>
    public PressureDrop PressureDrop { get; }

    /// <summary>What came in, what went out, and how fine the grid was.</summary>
    public PassAudit Audit { get; }

    /// <summary>The first row: the inlet of the pass.</summary>
    public ProfilePoint Inlet => this[0];

    /// <summary>The last row: where the outlet pressure is measured.</summary>
    public ProfilePoint Outlet => this[Count - 1];

    /// <summary>Equilibrium quality where the outlet pressure is measured: below 0 for a subcooled outlet, above 1 for a superheated one.</summary>
    public MassFraction OutletQuality => Outlet.EquilibriumQuality;

    /// <summary>Number of rows.</summary>
    public int Count => _nodes.Length;

    internal ReadOnlySpan<PassNode> Nodes => _nodes;

    internal double Exchanged { get; }

    /// <summary>A row.</summary>
    /// <param name="index">0 at the inlet.</param>
    public ProfilePoint this[int index] => new(_nodes[index], Pass);

    /// <summary>The flow at a row with all properties of both phases, to run any correlation on.</summary>
    /// <param name="index">0 at the inlet.</param>
    /// <remarks>Both phases saturated at the pressure of the row.</remarks>
    public TwoPhaseFlow FlowAt(int index)
    {
        FlowState flow = _nodes[index].Flow;
        return new(FlowStates.At(flow.Pressure, flow.Quality, flow.MassFlux, flow.Bore, flow.Inclination));
    }

    /// <summary>The rows from inlet to outlet.</summary>
    public IEnumerator<ProfilePoint> GetEnumerator()
    {
        for (int i = 0; i < Count; i++) yield return this[i];
    }

    /// <summary>The pass from end to end in a line, invariant culture.</summary>
    public override string ToString() => string.Format(
        System.Globalization.CultureInfo.InvariantCulture,
        "pass {0}: {1:F3} kg/s from {2:F1} °C and {3:F3} MPa to quality {4:F4} at {5:F3} MPa, {6:F3} MW absorbed",
        Pass.Name,
        Conditions.RawFeedFlow,
        _nodes[0].Temperature - 273.15,
        _nodes[0].Pressure * 1e-6,
        _nodes[^1].EquilibriumQuality,
        _nodes[^1].Pressure * 1e-6,
        Conditions.RawAbsorbedHeat * 1e-6);

    IEnumerator IEnumerable.GetEnumerator() => GetEnumerator();

    private (PressureDrop Drop, PassAudit Audit) Summed(double pressureError, double massError)
    {
        double friction = 0, fittings = 0, gravity = 0, heat = 0, mass = 0, residual = 0;
        foreach (NodePanel panel in new NodePanels(_nodes))
        {
            friction += panel.Integral(static (in PassNode node) => node.Friction);
            fittings += panel.Integral(static (in PassNode node) => node.Fittings);
            gravity += panel.Integral(static (in PassNode node) => node.Gravity);
            heat += panel.Integral(static (in PassNode node) => node.LinearHeat);
            mass += panel.Integral(static (in PassNode node) => node.Density) * Pass.Ducts[panel.Duct].Area;
        }

        foreach (ref readonly PassNode node in Nodes) residual = Math.Max(residual, MassResidual(node));
        PassNode inlet = _nodes[0], outlet = _nodes[^1];
        double flow = Conditions.RawFeedFlow, total = inlet.Pressure - outlet.Pressure;
        return (new(friction, fittings, gravity, total - friction - fittings - gravity),
            new(flow, heat, flow * inlet.Enthalpy, flow * outlet.Enthalpy, residual, Math.Max(pressureError / outlet.Pressure, massError / mass)));
    }

    private double MassResidual(in PassNode node)
    {
        double x = node.Flow.Quality, alpha = node.VoidFraction, flux = node.Flow.MassFlux;
        double vapour = alpha > 0 ? alpha * node.Flow.VapourDensity * (flux * x / (alpha * node.Flow.VapourDensity)) : 0;
        double liquid = alpha < 1 ? (1 - alpha) * node.Flow.LiquidDensity * (flux * (1 - x) / ((1 - alpha) * node.Flow.LiquidDensity)) : 0;
        ref readonly Duct duct = ref Pass.Ducts[node.Duct];
        return Math.Abs(((vapour + liquid) * duct.Area / (Conditions.RawFeedFlow * duct.FlowShare)) - 1);
    }
}
