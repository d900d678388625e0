namespace TwoPhase.Flow;

/// <summary>The published limits that a calculation has gone beyond, or what else its result must be read with.</summary>
/// <remarks>The unit in parentheses is the unit of <see cref="Applicability.FirstValue"/> and its limits.</remarks>
[Flags]
public enum ApplicabilityLimits
{
    /// <summary>No limit exceeded.</summary>
    None = 0,

    /// <summary>Pressure (Pa).</summary>
    Pressure = 1 << 0,

    /// <summary>Temperature (K).</summary>
    Temperature = 1 << 1,

    /// <summary>Steam quality (kg/kg).</summary>
    Quality = 1 << 2,

    /// <summary>Mass flux (kg/(m²·s)).</summary>
    MassFlux = 1 << 3,

    /// <summary>Bore of tube or pipe (m).</summary>
    Bore = 1 << 4,

    /// <summary>Inclination of the tube against the horizontal (rad).</summary>
    Inclination = 1 << 5,

    /// <summary>Reynolds number (-).</summary>
    Reynolds = 1 << 6,

    /// <summary>Prandtl number (-).</summary>
    Prandtl = 1 << 7,

    /// <summary>Diameter ratio of a primary element (-).</summary>
    DiameterRatio = 1 << 8,

    /// <summary>Throat or orifice diameter (m).</summary>
    ThroatDiameter = 1 << 9,

    /// <summary>Ratio of the pressure behind to the pressure before a primary element (-).</summary>
    PressureRatio = 1 << 10,

    /// <summary>Ratio of vapour to liquid density (-).</summary>
    DensityRatio = 1 << 11,

    /// <summary>Ratio of liquid to vapour viscosity (-).</summary>
    ViscosityRatio = 1 << 12,

    /// <summary>Lockhart-Martinelli parameter (-).</summary>
    LockhartMartinelli = 1 << 13,

    /// <summary>Froude number, as the model defines it (-).</summary>
    Froude = 1 << 14,

    /// <summary>Heat flux (W/m²).</summary>
    HeatFlux = 1 << 15,

    /// <summary>Roughness relative to the diameter (-).</summary>
    Roughness = 1 << 16,

    /// <summary>Two qualities fit the reading; the lower one is returned (value: the other quality, kg/kg).</summary>
    SecondRoot = 1 << 17,

    /// <summary>The distribution parameter does not go to 1 as quality goes to 1 (value: its limit, -).</summary>
    DistributionParameter = 1 << 18,

    /// <summary>The correlation is for a plain bore and the tube is ribbed.</summary>
    RibbedBore = 1 << 19,
}
