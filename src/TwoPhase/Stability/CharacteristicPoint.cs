using System.Globalization;
using UnitsNet;

namespace TwoPhase.Stability;

/// <summary>One point of a pass's pressure drop against its flow.</summary>
public readonly record struct CharacteristicPoint
{
    private readonly double _flow, _drop, _quality;

    internal CharacteristicPoint(double flow, double drop, double slope, double quality) => (_flow, _drop, RawSlope, _quality) = (flow, drop, slope, quality);

    /// <summary>Feed flow.</summary>
    public MassFlow Flow => MassFlow.FromKilogramsPerSecond(_flow);

    /// <summary>Inlet less outlet pressure of the pass.</summary>
    public Pressure PressureDrop => Pressure.FromPascals(_drop);

    /// <summary>Equilibrium quality at the outlet.</summary>
    public MassFraction OutletQuality => MassFraction.FromDecimalFractions(_quality);

    /// <summary>
    /// (dΔp/dṁ) ṁ/|Δp|: the per cent by which the drop rises for one per cent of flow. About 2 for one turbulent phase; below zero the flow of a pass between
    /// headers of constant pressure runs away.
    /// </summary>
    public double RelativeSlope => RawSlope * _flow / Math.Abs(_drop);

    internal double RawFlow => _flow;

    internal double RawDrop => _drop;

    /// <summary>dΔp/dṁ [Pa·s/kg].</summary>
    internal double RawSlope { get; }

    internal object ToDump() => ToString();

    /// <summary>Flow, drop and slope, invariant culture.</summary>
    public override string ToString() => string.Format(CultureInfo.InvariantCulture, "{0:F3} kg/s: {1:F1} kPa, relative slope {2:F3}", _flow, _drop * 1e-3, RelativeSlope);
}
