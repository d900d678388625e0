using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Steam;

/// <summary>A full equilibrium state of water or steam.</summary>
/// <remarks>
/// <para>Holds SI doubles; a property builds its quantity when it is read, and the transport properties are computed then.</para>
/// <para>Range: 273.15 K to 1073.15 K up to 100 MPa; to 2273.15 K up to 50 MPa. Thermal conductivity and viscosity are stated
/// by their releases to 1173.15 K and extrapolate reasonably above.</para>
/// <para>Source: IAPWS R7-97(2012); viscosity R12-08, thermal conductivity R15-11, both in their form for industrial use.</para>
/// </remarks>
public readonly partial record struct SteamState
{
    private readonly WaterCore _core;

    private SteamState(in WaterCore core) => _core = core;

    /// <summary>The raw values.</summary>
    internal WaterCore Core => _core;

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
    public SpecificEnergy SpecificInternalEnergy => SpecificEnergy.FromJoulesPerKilogram(_core.Phase.InternalEnergy);

    /// <summary>s, specific entropy; zero in the liquid at the triple point.</summary>
    public SpecificEntropy SpecificEntropy => SpecificEntropy.FromJoulesPerKilogramKelvin(_core.Entropy);

    /// <summary>Region of the formulation: 1 liquid, 2 vapour, 3 dense fluid, 4 wet steam, 5 above 1073.15 K; 0 in a default state.</summary>
    public int Region => _core.Region;

    /// <summary>What the state is.</summary>
    public SteamPhase Phase => _core.SteamPhase;

    /// <summary>x, steam quality, 0 to 1; null outside the dome.</summary>
    public MassFraction? Quality => _core.IsWet ? MassFraction.FromDecimalFractions(_core.Quality) : null;

    /// <summary>
    /// (h − h′) / (h″ − h′) at the pressure of the state: the quality in the dome, below 0 in subcooled liquid, above 1 in
    /// superheated vapour; null where no saturation exists, below 611.213 Pa and from 22.064 MPa up.
    /// </summary>
    public MassFraction? EquilibriumQuality => Water.EquilibriumQuality(_core) is var x && double.IsNaN(x) ? null : MassFraction.FromDecimalFractions(x);

    /// <summary>cp, isobaric heat capacity; null in the dome.</summary>
    public SpecificEntropy? IsobaricHeatCapacity => _core.IsWet ? null : SpecificEntropy.FromJoulesPerKilogramKelvin(_core.Phase.IsobaricHeatCapacity);

    /// <summary>cv, isochoric heat capacity; null in the dome.</summary>
    public SpecificEntropy? IsochoricHeatCapacity => _core.IsWet ? null : SpecificEntropy.FromJoulesPerKilogramKelvin(_core.Phase.IsochoricHeatCapacity);

    /// <summary>w, speed of sound; null in the dome.</summary>
    public Speed? SpeedOfSound => _core.IsWet ? null : Speed.FromMetersPerSecond(_core.Phase.SpeedOfSound);

    /// <summary>κ = w² / (p v), isentropic exponent [-]; null in the dome.</summary>
    public double? IsentropicExponent => _core.IsWet ? null : _core.Phase.IsentropicExponent;

    /// <summary>μ, dynamic viscosity; null in the dome.</summary>
    public DynamicViscosity? DynamicViscosity => _core.IsWet ? null
        : UnitsNet.DynamicViscosity.FromPascalSeconds(Transport.Viscosity(_core.Density, _core.Temperature));

    /// <summary>k, thermal conductivity; null in the dome.</summary>
    public ThermalConductivity? ThermalConductivity => _core.IsWet ? null
        : UnitsNet.ThermalConductivity.FromWattsPerMeterKelvin(Transport.Conductivity(_core.Phase));

    internal object ToDump() => ToString();

    /// <summary>The state in engineering units, invariant culture.</summary>
    public override string ToString() => Region == 0 ? "no state"
        : $"{Phase}{(_core.IsWet ? $" x = {Scale.None.Text(_core.Quality)}" : "")}, {Scale.Megapascals.Text(_core.Pressure)}, {Scale.Celsius.Text(_core.Temperature)}, "
        + $"{Scale.KilogramsPerCubicMetre.Text(_core.Density)}, {Scale.KilojoulesPerKilogram.Text(_core.Enthalpy)}";
}
