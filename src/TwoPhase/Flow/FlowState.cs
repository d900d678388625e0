namespace TwoPhase.Flow;

/// <summary>
/// Liquid and vapour flowing together in a tube, in raw coherent SI units: what a correlation works on. One of the two raw
/// types of the library that are public, so that a model of your own runs in the same loops as the built-in ones.
/// </summary>
/// <remarks>
/// <para>Built by <see cref="TwoPhaseFlow"/> from quantities, or by the solvers. Both phases are saturated at <see cref="Pressure"/>.</para>
/// <para>The values are trusted: whoever builds a state checks them at the public door.</para>
/// </remarks>
public readonly record struct FlowState
{
    /// <summary>p, absolute pressure [Pa].</summary>
    public double Pressure { get; init; }

    /// <summary>Ts, saturation temperature [K].</summary>
    public double SaturationTemperature { get; init; }

    /// <summary>ρl, density of the saturated liquid [kg/m³].</summary>
    public double LiquidDensity { get; init; }

    /// <summary>ρg, density of the saturated vapour [kg/m³].</summary>
    public double VapourDensity { get; init; }

    /// <summary>μl, dynamic viscosity of the saturated liquid [Pa·s].</summary>
    public double LiquidViscosity { get; init; }

    /// <summary>μg, dynamic viscosity of the saturated vapour [Pa·s].</summary>
    public double VapourViscosity { get; init; }

    /// <summary>kl, thermal conductivity of the saturated liquid [W/(m·K)].</summary>
    public double LiquidConductivity { get; init; }

    /// <summary>kg, thermal conductivity of the saturated vapour [W/(m·K)].</summary>
    public double VapourConductivity { get; init; }

    /// <summary>cp,l, isobaric heat capacity of the saturated liquid [J/(kg·K)].</summary>
    public double LiquidHeatCapacity { get; init; }

    /// <summary>cp,g, isobaric heat capacity of the saturated vapour [J/(kg·K)].</summary>
    public double VapourHeatCapacity { get; init; }

    /// <summary>hfg, latent heat [J/kg].</summary>
    public double LatentHeat { get; init; }

    /// <summary>σ, surface tension [N/m].</summary>
    public double SurfaceTension { get; init; }

    /// <summary>x, flowing steam quality: vapour mass flow over total mass flow [kg/kg], 0 to 1.</summary>
    public double Quality { get; init; }

    /// <summary>G, mass flux: total mass flow over flow area [kg/(m²·s)].</summary>
    public double MassFlux { get; init; }

    /// <summary>D, bore of the tube [m].</summary>
    public double Bore { get; init; }

    /// <summary>θ, inclination of the flow direction against the horizontal [rad]; positive upwards, π/2 vertical upflow.</summary>
    public double Inclination { get; init; }
}
