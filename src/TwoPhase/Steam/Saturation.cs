using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Steam;

/// <summary>Saturated liquid and saturated vapour in equilibrium at one pressure or one temperature.</summary>
/// <remarks>
/// <para>Range: 273.15 K to the critical point, 611.213 Pa to 22.064 MPa. Both phases come from the forward equations, regions 1 and 2
/// up to 623.15 K and region 3 above; the formulation itself has a seam there, 3e-5 in v′ and 1e-4 in v″.</para>
/// <para>Source: IAPWS R7-97(2012), section 8; surface tension R1-76(2014).</para>
/// </remarks>
public readonly partial record struct Saturation
{
    private readonly SaturationCore _core;

    internal Saturation(in SaturationCore core) => _core = core;

    /// <summary>Both phases at a pressure.</summary>
    /// <param name="pressure">p, absolute pressure, 611.213 Pa to 22.064 MPa.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="pressure"/> lies outside the saturation line.</exception>
    public static Saturation FromPressure(Pressure pressure) =>
        new(SaturationLine.AtPressure(Domain.SaturationPressure(pressure, nameof(pressure))));

    /// <summary>Both phases at a temperature.</summary>
    /// <param name="temperature">T, 273.15 K to 647.096 K.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="temperature"/> lies outside the saturation line.</exception>
    public static Saturation FromTemperature(Temperature temperature) =>
        new(SaturationLine.AtTemperature(Domain.SaturationTemperature(temperature, nameof(temperature))));

    /// <summary>The raw values.</summary>
    internal SaturationCore Core => _core;

    /// <summary>p, absolute pressure.</summary>
    public Pressure Pressure => Pressure.FromPascals(_core.Pressure);

    /// <summary>Ts, saturation temperature.</summary>
    public Temperature Temperature => Temperature.FromKelvins(_core.Temperature);

    /// <summary>h″ − h′, latent heat; zero at the critical point.</summary>
    public SpecificEnergy LatentHeat => SpecificEnergy.FromJoulesPerKilogram(_core.LatentHeat);

    /// <summary>σ, surface tension between the phases; zero at the critical point.</summary>
    public ForcePerLength SurfaceTension => ForcePerLength.FromNewtonsPerMeter(Transport.SurfaceTension(_core.Temperature));

    /// <summary>The saturated liquid.</summary>
    public PhaseState Liquid => new(_core.Liquid);

    /// <summary>The saturated vapour.</summary>
    public PhaseState Vapour => new(_core.Vapour);

    internal object ToDump() => ToString();

    /// <summary>Pressure and temperature, invariant culture.</summary>
    public override string ToString() => $"saturation at {Scale.Megapascals.Text(_core.Pressure)}, {Scale.Celsius.Text(_core.Temperature)}";
}
