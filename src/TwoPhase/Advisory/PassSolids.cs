using System.Globalization;
using TwoPhase.Uncertainty;
using UnitsNet;

namespace TwoPhase.Advisory;

/// <summary>How concentrated the outlet water of a pass is.</summary>
public readonly record struct PassSolids
{
    private readonly double _concentration, _uncertainty;   // kg/m³

    internal PassSolids(UncertaintyBudget factor, UncertaintyBudget concentration, double perKilogram)
    {
        Factor = factor.Value;
        FactorUncertainty = factor.StandardUncertainty;
        _concentration = concentration.Value / perKilogram;
        _uncertainty = concentration.StandardUncertainty / perKilogram;
    }

    /// <summary>How many times what enters the pass is concentrated in its outlet water: 1/(1 − x) without carry-over.</summary>
    public double Factor { get; }

    /// <summary>Standard uncertainty of the factor, k = 1.</summary>
    public double FactorUncertainty { get; }

    /// <summary>Concentration of the outlet water, cooled.</summary>
    public UncertainValue<MassConcentration> Concentration => new(MassConcentration.FromKilogramsPerCubicMeter(_concentration), MassConcentration.FromKilogramsPerCubicMeter(_uncertainty));

    internal object ToDump() => ToString();

    /// <summary>Factor and concentration, invariant culture.</summary>
    public override string ToString() => string.Format(CultureInfo.InvariantCulture, "concentrated {0:F2} ± {1:F2} times, {2:F0} ± {3:F0} mg/L (k = 1)", Factor, FactorUncertainty, 1e3 * _concentration, 1e3 * _uncertainty);
}
