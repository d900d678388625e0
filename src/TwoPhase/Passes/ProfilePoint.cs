using System.Globalization;
using UnitsNet;

namespace TwoPhase.Passes;

/// <summary>One row of a profile: the flow at one place of the pass.</summary>
public readonly record struct ProfilePoint
{
    private readonly PassNode _node;
    private readonly Pass _pass;

    internal ProfilePoint(in PassNode node, Pass pass)
    {
        _node = node;
        _pass = pass;
    }

    /// <summary>Name of the section.</summary>
    public string Section => Duct.Name;

    /// <summary>Distance from the inlet of the pass along the flow path.</summary>
    public Length Position => Length.FromMeters(_node.Position);

    /// <summary>Water-side volume of the pass up to here.</summary>
    public Volume WaterVolume => Volume.FromCubicMeters(_node.Volume);

    /// <summary>p, absolute.</summary>
    public Pressure Pressure => Pressure.FromPascals(_node.Pressure);

    /// <summary>h of the flow.</summary>
    public SpecificEnergy Enthalpy => SpecificEnergy.FromJoulesPerKilogram(_node.Enthalpy);

    /// <summary>T.</summary>
    public Temperature Temperature => Temperature.FromKelvins(_node.Temperature);

    /// <summary>xe = (h − h′)/(h″ − h′): below 0 in subcooled liquid, above 1 in superheated steam.</summary>
    public MassFraction EquilibriumQuality => MassFraction.FromDecimalFractions(_node.EquilibriumQuality);

    /// <summary>x: vapour flow over total flow, 0 to 1.</summary>
    public MassFraction Quality => MassFraction.FromDecimalFractions(_node.Flow.Quality);

    /// <summary>α: share of the cross-section that vapour takes up.</summary>
    public Ratio VoidFraction => Ratio.FromDecimalFractions(_node.VoidFraction);

    /// <summary>ρ = α ρg + (1 − α) ρl: mass standing in the tube per volume.</summary>
    public Density Density => Density.FromKilogramsPerCubicMeter(_node.Density);

    /// <summary>G.</summary>
    public MassFlux MassFlux => MassFlux.FromKilogramsPerSecondPerSquareMeter(_node.Flow.MassFlux);

    /// <summary>ul = G (1 − x)/((1 − α) ρl); null where there is no liquid.</summary>
    public Speed? LiquidVelocity => _node.VoidFraction < 1 ? Speed.FromMetersPerSecond(_node.Flow.MassFlux * (1 - _node.Flow.Quality) / ((1 - _node.VoidFraction) * _node.Flow.LiquidDensity)) : null;

    /// <summary>ug = G x/(α ρg); null where there is no vapour.</summary>
    public Speed? VapourVelocity => _node.VoidFraction > 0 ? Speed.FromMetersPerSecond(_node.Flow.MassFlux * _node.Flow.Quality / (_node.VoidFraction * _node.Flow.VapourDensity)) : null;

    /// <summary>q at the inside surface, mean around the tube; of fire and interchanger together.</summary>
    public HeatFlux HeatFlux => HeatFlux.FromWattsPerSquareMeter(_node.LinearHeat / Duct.Perimeter);

    /// <summary>Pressure lost to friction, per length.</summary>
    public Flow.PressureGradient FrictionGradient => Flow.PressureGradient.FromPascalsPerMetre(_node.Friction);

    private ref readonly Duct Duct => ref _pass.Ducts[_node.Duct];

    internal object ToDump() => ToString();

    /// <summary>The row in engineering units, invariant culture.</summary>
    public override string ToString() => string.Format(CultureInfo.InvariantCulture, "{0} at {1:F2} m: {2:F4} MPa, {3:F2} kJ/kg, xe {4:F4}, void {5:F4}",
        Section, _node.Position, _node.Pressure * 1e-6, _node.Enthalpy * 1e-3, _node.EquilibriumQuality, _node.VoidFraction);
}
