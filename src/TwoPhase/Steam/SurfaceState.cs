using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Steam;

/// <summary>What a <see cref="SteamSurface"/> gives at one pressure and enthalpy.</summary>
public readonly record struct SurfaceState
{
    private readonly SurfacePoint _point;

    internal SurfaceState(in SurfacePoint point) => _point = point;

    /// <summary>T, temperature.</summary>
    public Temperature Temperature => Temperature.FromKelvins(_point.Temperature);

    /// <summary>v, specific volume.</summary>
    public SpecificVolume SpecificVolume => SpecificVolume.FromCubicMetersPerKilogram(_point.SpecificVolume);

    /// <summary>ρ, density.</summary>
    public Density Density => Density.FromKilogramsPerCubicMeter(1 / _point.SpecificVolume);

    /// <summary>x = (h − h′)/(h″ − h′): 0 to 1 in wet steam, below 0 in liquid, above 1 in vapour.</summary>
    public MassFraction EquilibriumQuality => MassFraction.FromDecimalFractions(_point.Quality);

    /// <summary>(∂ρ/∂h)p in (kg/m³)/(J/kg), for solvers; there is no unit type for it.</summary>
    public double DensityByEnthalpy => _point.DensityByEnthalpy;

    /// <summary>(∂ρ/∂p)h in (kg/m³)/Pa, for solvers; there is no unit type for it.</summary>
    public double DensityByPressure => _point.DensityByPressure;

    internal object ToDump() => ToString();

    /// <summary>Temperature, density and quality, invariant culture.</summary>
    public override string ToString() =>
        $"{Scale.Celsius.Text(_point.Temperature)}, {Scale.KilogramsPerCubicMetre.Text(1 / _point.SpecificVolume)}, x = {Scale.None.Text(_point.Quality)}";
}
