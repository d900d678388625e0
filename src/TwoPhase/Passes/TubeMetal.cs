using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Passes;

/// <summary>The metal of a tube: what it stores and how it conducts heat.</summary>
public sealed class TubeMetal
{
    /// <summary>A metal of your own.</summary>
    /// <param name="name">Its name or grade.</param>
    /// <param name="density">ρ, greater than zero.</param>
    /// <param name="heatCapacity">c, specific heat capacity at working temperature, greater than zero.</param>
    /// <param name="conductivity">λ at working temperature, greater than zero.</param>
    /// <exception cref="ArgumentOutOfRangeException">A value is not greater than zero.</exception>
    public TubeMetal(string name, Density density, SpecificEntropy heatCapacity, ThermalConductivity conductivity)
    {
        Name = Require.NotNull(name, nameof(name));
        RawDensity = Require.Positive(density.Si(), "Density of the metal", Scale.KilogramsPerCubicMetre, nameof(density));
        RawHeatCapacity = Require.Positive(heatCapacity.Si(), "Heat capacity of the metal", Scale.KilojoulesPerKilogramKelvin, nameof(heatCapacity));
        RawConductivity = Require.Positive(conductivity.Si(), "Conductivity of the metal", WattsPerMetreKelvin, nameof(conductivity));
    }

    /// <summary>Carbon steel at 300 °C: 7850 kg/m³, 565 J/(kg·K), 44 W/(m·K).</summary>
    /// <remarks>Source: EN 1993-1-2:2005, clauses 3.2.2 and 3.4.1, evaluated at 300 °C.</remarks>
    public static TubeMetal CarbonSteel { get; } = new("carbon steel", UnitsNet.Density.FromKilogramsPerCubicMeter(7850), SpecificEntropy.FromJoulesPerKilogramKelvin(565), ThermalConductivity.FromWattsPerMeterKelvin(44));

    /// <summary>The name or grade.</summary>
    public string Name { get; }

    /// <summary>ρ.</summary>
    public Density Density => UnitsNet.Density.FromKilogramsPerCubicMeter(RawDensity);

    /// <summary>c, specific heat capacity (UnitsNet has no type of its own for it).</summary>
    public SpecificEntropy HeatCapacity => SpecificEntropy.FromJoulesPerKilogramKelvin(RawHeatCapacity);

    /// <summary>λ.</summary>
    public ThermalConductivity Conductivity => ThermalConductivity.FromWattsPerMeterKelvin(RawConductivity);

    internal double RawDensity { get; }

    internal double RawHeatCapacity { get; }

    internal double RawConductivity { get; }

    internal static Scale WattsPerMetreKelvin { get; } = new("W/(m·K)", 1);

    internal object ToDump() => ToString();

    /// <summary>The name.</summary>
    public override string ToString() => Name;
}
