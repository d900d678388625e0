using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Steam;

/// <summary>One phase of water: the saturated liquid or the saturated vapour of a <see cref="Saturation"/>.</summary>
/// <remarks>
/// <para>Holds SI doubles; a property builds its quantity when it is read, and the transport properties are computed then.</para>
/// <para>Range: 273.15 K to the critical point, 647.096 K and 22.064 MPa.</para>
/// <para>Source: IAPWS R7-97(2012); viscosity R12-08, thermal conductivity R15-11, both in their form for industrial use.</para>
/// </remarks>
public readonly record struct PhaseState
{
    private readonly PhaseCore _core;

    internal PhaseState(in PhaseCore core) => _core = core;

    /// <summary>The raw values.</summary>
    internal PhaseCore Core => _core;

    /// <summary>p, absolute pressure.</summary>
    public Pressure Pressure => Pressure.FromPascals(_core.Pressure);

    /// <summary>T, temperature.</summary>
    public Temperature Temperature => Temperature.FromKelvins(_core.Temperature);

    /// <summary>ρ, density.</summary>
    public Density Density => Density.FromKilogramsPerCubicMeter(_core.Density);

    /// <summary>v, specific volume.</summary>
    public SpecificVolume SpecificVolume => SpecificVolume.FromCubicMetersPerKilogram(_core.SpecificVolume);

    /// <summary>h, specific enthalpy; zero is the internal energy of liquid at the triple point plus p·v.</summary>
    public SpecificEnergy SpecificEnthalpy => SpecificEnergy.FromJoulesPerKilogram(_core.Enthalpy);

    /// <summary>u, specific internal energy; zero in the liquid at the triple point.</summary>
    public SpecificEnergy SpecificInternalEnergy => SpecificEnergy.FromJoulesPerKilogram(_core.InternalEnergy);

    /// <summary>s, specific entropy; zero in the liquid at the triple point.</summary>
    public SpecificEntropy SpecificEntropy => SpecificEntropy.FromJoulesPerKilogramKelvin(_core.Entropy);

    /// <summary>cp, isobaric heat capacity.</summary>
    public SpecificEntropy IsobaricHeatCapacity => SpecificEntropy.FromJoulesPerKilogramKelvin(_core.IsobaricHeatCapacity);

    /// <summary>cv, isochoric heat capacity.</summary>
    public SpecificEntropy IsochoricHeatCapacity => SpecificEntropy.FromJoulesPerKilogramKelvin(_core.IsochoricHeatCapacity);

    /// <summary>w, speed of sound.</summary>
    public Speed SpeedOfSound => Speed.FromMetersPerSecond(_core.SpeedOfSound);

    /// <summary>κ = w² / (p v), isentropic exponent [-].</summary>
    public double IsentropicExponent => _core.IsentropicExponent;

    /// <summary>μ, dynamic viscosity.</summary>
    public DynamicViscosity DynamicViscosity => DynamicViscosity.FromPascalSeconds(Transport.Viscosity(_core.Density, _core.Temperature));

    /// <summary>k, thermal conductivity.</summary>
    public ThermalConductivity ThermalConductivity => ThermalConductivity.FromWattsPerMeterKelvin(Transport.Conductivity(_core));

    internal object ToDump() => ToString();

    /// <summary>Pressure, temperature, density and enthalpy, invariant culture.</summary>
    public override string ToString() =>
        $"{Scale.Megapascals.Text(_core.Pressure)}, {Scale.Celsius.Text(_core.Temperature)}, {Scale.KilogramsPerCubicMetre.Text(_core.Density)}, {Scale.KilojoulesPerKilogram.Text(_core.Enthalpy)}";
}
