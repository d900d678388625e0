using System.Globalization;
using TwoPhase.Flow;
using UnitsNet;

namespace TwoPhase.Slip;

/// <summary>How liquid and vapour share a tube, by one void-fraction model: velocities and the three densities of the mixture.</summary>
/// <remarks>Made by <see cref="VoidFractionModel.Split"/>. Equality is over the SI values.</remarks>
public readonly record struct PhaseSplit
{
    private readonly double _voidFraction;
    private readonly double _vapourVelocity;   // m/s
    private readonly double _liquidVelocity;   // m/s
    private readonly double _staticDensity;    // kg/m³
    private readonly double _momentumVolume;   // m³/kg
    private readonly double _homogeneousVolume; // m³/kg

    internal PhaseSplit(in FlowState flow, double voidFraction, double slip)
    {
        _voidFraction = voidFraction;
        SlipRatio = slip;
        _staticDensity = Mixture.StaticDensity(flow, voidFraction);
        _momentumVolume = Mixture.MomentumVolume(flow, voidFraction);
        _homogeneousVolume = Mixture.HomogeneousVolume(flow);

        // The velocity of the phase that is plentiful comes from its own flow; the other's, 0/0 at an end, from the slip.
        if (flow.Quality < 0.5)
        {
            _liquidVelocity = (1 - flow.Quality) * flow.MassFlux / ((1 - voidFraction) * flow.LiquidDensity);
            _vapourVelocity = slip * _liquidVelocity;
        }
        else
        {
            _vapourVelocity = flow.Quality * flow.MassFlux / (voidFraction * flow.VapourDensity);
            _liquidVelocity = _vapourVelocity / slip;
        }
    }

    /// <summary>α: share of the cross-section that vapour takes up, 0 to 1.</summary>
    public Ratio VoidFraction => Ratio.FromDecimalFractions(_voidFraction);

    /// <summary>S: vapour velocity over liquid velocity [-].</summary>
    public double SlipRatio { get; }

    /// <summary>ug = x G / (α ρg), or its limit where there is no vapour.</summary>
    public Speed VapourVelocity => Speed.FromMetersPerSecond(_vapourVelocity);

    /// <summary>ul = (1 − x) G / [(1 − α) ρl], or its limit where there is no liquid.</summary>
    public Speed LiquidVelocity => Speed.FromMetersPerSecond(_liquidVelocity);

    /// <summary>Mass per volume of tube, α ρg + (1 − α) ρl: what stands in the tube and what a column weighs.</summary>
    public Density StaticDensity => Density.FromKilogramsPerCubicMeter(_staticDensity);

    /// <summary>G² over the momentum flux, 1 / {x²/(α ρg) + (1 − x)²/[(1 − α) ρl]}: what acceleration costs.</summary>
    public Density MomentumDensity => Density.FromKilogramsPerCubicMeter(1 / _momentumVolume);

    /// <summary>Density at equal velocities, 1 / [x/ρg + (1 − x)/ρl]; the model plays no part in it.</summary>
    public Density HomogeneousDensity => Density.FromKilogramsPerCubicMeter(1 / _homogeneousVolume);

    internal object ToDump() => ToString();

    /// <summary>The main values with units, invariant culture.</summary>
    public override string ToString() => string.Format(
        CultureInfo.InvariantCulture,
        "α = {0:F4}, S = {1:F3}, ug = {2:G4} m/s, ul = {3:G4} m/s, ρ = {4:G5} kg/m³",
        _voidFraction,
        SlipRatio,
        _vapourVelocity,
        _liquidVelocity,
        _staticDensity);
}
