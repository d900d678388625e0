using System.Globalization;
using UnitsNet;

namespace TwoPhase.Stability;

/// <summary>A range of flows over which the pressure drop of a pass falls as flow rises: between headers of constant pressure no flow in it holds.</summary>
public readonly record struct FlowExcursion
{
    private readonly double _from, _to;

    internal FlowExcursion(double from, double to, bool isOpen) => (_from, _to, IsOpen) = (from, to, isOpen);

    /// <summary>Lowest such flow: a pass that comes from below leaps from here to a greater flow.</summary>
    public MassFlow From => MassFlow.FromKilogramsPerSecond(_from);

    /// <summary>Highest such flow: a pass that comes from above falls from here to a smaller flow.</summary>
    public MassFlow To => MassFlow.FromKilogramsPerSecond(_to);

    /// <summary>True when the range runs into an end of the curve, so that it may be wider.</summary>
    public bool IsOpen { get; }

    internal object ToDump() => ToString();

    /// <summary>The range, invariant culture.</summary>
    public override string ToString() => string.Format(CultureInfo.InvariantCulture, "{0:F3} to {1:F3} kg/s{2}", _from, _to, IsOpen ? ", or beyond" : "");
}
