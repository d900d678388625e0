using UnitsNet;

namespace TwoPhase.Units;

/// <summary>What a site leaves unsaid in its unit texts: the pressure gauges start from, and the water its volume flows are counted in.</summary>
/// <remarks>A text that says it itself wins: <c>psig at 93 kPa(a)</c>, <c>m3/d at 15 degC</c>, <c>bpd at 998.2 kg/m3</c>.</remarks>
public sealed class UnitBasis
{
    private UnitBasis(double? atmosphere, double? density, double? column) =>
        (Atmosphere, WaterDensity, ColumnTemperature) = (atmosphere, density, column);

    /// <summary>Nothing agreed: each text must say its own basis.</summary>
    public static UnitBasis None { get; } = new(null, null, null);

    /// <summary>Absolute pressure of the site's atmosphere, where gauge pressure is zero; null when not given.</summary>
    public Pressure? AtmosphericPressure => Atmosphere is { } si ? Pressure.FromPascals(si) : null;

    /// <summary>Density at which a volume flow of water is counted; null when not given.</summary>
    public Density? BaseDensity => WaterDensity is { } si ? Density.FromKilogramsPerCubicMeter(si) : null;

    /// <summary>Temperature of the water in an inch of water; null for the conventional inch of 1000 kg/m³.</summary>
    public Temperature? WaterColumnTemperature => ColumnTemperature is { } si ? Temperature.FromKelvins(si) : null;

    internal double? Atmosphere { get; }

    internal double? WaterDensity { get; }

    internal double? ColumnTemperature { get; }

    /// <summary>This basis with the site's atmospheric pressure.</summary>
    /// <param name="atmosphere">Absolute pressure of the atmosphere, 50 kPa to 110 kPa.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="atmosphere"/> is no atmospheric pressure.</exception>
    public UnitBasis WithAtmosphericPressure(Pressure atmosphere) => new(GaugePressure.CheckAtmosphere(atmosphere.Si(), nameof(atmosphere)), WaterDensity, ColumnTemperature);

    /// <summary>This basis with the density at which volume flows of water are counted.</summary>
    /// <param name="density">Base density, 600 kg/m³ to 1200 kg/m³.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="density"/> is no density of liquid water.</exception>
    public UnitBasis WithBaseDensity(Density density) => new(Atmosphere, CheckDensity(density.Si(), nameof(density)), ColumnTemperature);

    /// <summary>This basis with volume flows counted as cold water of one temperature at atmospheric pressure.</summary>
    /// <param name="temperature">Base temperature, 0 °C to 40 °C.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="temperature"/> is outside 0 °C to 40 °C; give the base density instead.</exception>
    public UnitBasis WithBaseTemperature(Temperature temperature) => new(Atmosphere, ColdWater.Density(CheckCold(temperature.Si(), nameof(temperature))), ColumnTemperature);

    /// <summary>This basis with inches of water counted at one temperature.</summary>
    /// <param name="temperature">Temperature of the water column, 0 °C to 40 °C; 4 °C, 60 °F, 20 °C and 68 °F are the usual ones.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="temperature"/> is outside 0 °C to 40 °C.</exception>
    public UnitBasis WithWaterColumnTemperature(Temperature temperature) => new(Atmosphere, WaterDensity, CheckCold(temperature.Si(), nameof(temperature)));

    internal static double CheckDensity(double density, string parameter) =>
        Require.Within(density, 600, 1200, "Base density of a water flow", Scale.KilogramsPerCubicMetre, parameter);

    internal static double CheckCold(double kelvins, string parameter) =>
        Require.Within(kelvins, ColdWater.LowestKelvins, ColdWater.HighestKelvins, "Base temperature of cold water", Scale.Celsius, parameter);
}
