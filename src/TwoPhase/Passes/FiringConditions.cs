using System.Globalization;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Passes;

/// <summary>How a generator is fired: fuel, and what the stack shows.</summary>
public readonly record struct FiringConditions
{
    /// <summary>Conditions with dry air.</summary>
    /// <param name="fuelFlow">Fuel gas, counted at 15 °C and 101.325 kPa; zero or more.</param>
    /// <param name="excessOxygen">Oxygen in the flue gas by dry volume, from zero to below that of air.</param>
    /// <param name="stackTemperature">Flue gas behind the last surface that heats water, 200 K to 1000 K.</param>
    /// <param name="airTemperature">Air before anything heats it but the fire's own waste heat, 200 K to 1000 K.</param>
    /// <exception cref="ArgumentOutOfRangeException">A value is outside its limits.</exception>
    public FiringConditions(VolumeFlow fuelFlow, Ratio excessOxygen, Temperature stackTemperature, Temperature airTemperature)
    {
        RawFuelFlow = Fuel(fuelFlow);
        RawExcessOxygen = Oxygen(excessOxygen);
        RawStackTemperature = Gas(stackTemperature, "Stack temperature", nameof(stackTemperature));
        RawAirTemperature = Gas(airTemperature, "Air temperature", nameof(airTemperature));
    }

    /// <summary>Fuel gas, counted at 15 °C and 101.325 kPa.</summary>
    public VolumeFlow FuelFlow => VolumeFlow.FromCubicMetersPerSecond(RawFuelFlow);

    /// <summary>Oxygen in the flue gas, by dry volume.</summary>
    public Ratio ExcessOxygen => Ratio.FromDecimalFractions(RawExcessOxygen);

    /// <summary>Flue gas behind the last surface that heats water.</summary>
    public Temperature StackTemperature => Temperature.FromKelvins(RawStackTemperature);

    /// <summary>Air as it comes.</summary>
    public Temperature AirTemperature => Temperature.FromKelvins(RawAirTemperature);

    /// <summary>Mass of water vapour with a unit mass of dry air.</summary>
    public Ratio AirHumidity => Ratio.FromDecimalFractions(RawAirHumidity);

    internal double RawFuelFlow { get; init; }

    internal double RawExcessOxygen { get; init; }

    internal double RawStackTemperature { get; init; }

    internal double RawAirTemperature { get; init; }

    internal double RawAirHumidity { get; init; }

    /// <summary>The same with other fuel.</summary>
    /// <param name="fuelFlow">Fuel gas, counted at 15 °C and 101.325 kPa; zero or more.</param>
    public FiringConditions WithFuelFlow(VolumeFlow fuelFlow) => this with { RawFuelFlow = Fuel(fuelFlow) };

    /// <summary>The same with other oxygen.</summary>
    /// <param name="excessOxygen">Oxygen in the flue gas by dry volume.</param>
    public FiringConditions WithExcessOxygen(Ratio excessOxygen) => this with { RawExcessOxygen = Oxygen(excessOxygen) };

    /// <summary>The same with another stack.</summary>
    /// <param name="stackTemperature">Flue gas behind the last surface that heats water, 200 K to 1000 K.</param>
    public FiringConditions WithStackTemperature(Temperature stackTemperature) => this with { RawStackTemperature = Gas(stackTemperature, "Stack temperature", nameof(stackTemperature)) };

    /// <summary>The same with other air.</summary>
    /// <param name="airTemperature">Air as it comes, 200 K to 1000 K.</param>
    public FiringConditions WithAirTemperature(Temperature airTemperature) => this with { RawAirTemperature = Gas(airTemperature, "Air temperature", nameof(airTemperature)) };

    /// <summary>The same with moist air.</summary>
    /// <param name="humidity">Mass of water vapour with a unit mass of dry air, 0 to 0.2.</param>
    public FiringConditions WithAirHumidity(Ratio humidity) => this with { RawAirHumidity = Require.Within(humidity.Si(), 0, 0.2, "Air humidity", Scale.None, nameof(humidity)) };

    internal object ToDump() => ToString();

    /// <summary>The conditions in engineering units, invariant culture.</summary>
    public override string ToString() => string.Format(CultureInfo.InvariantCulture, "{0:G5} Sm³/h, {1:G4} % O2, stack {2:G4} °C, air {3:G4} °C", RawFuelFlow * 3600, RawExcessOxygen * 100, RawStackTemperature - 273.15, RawAirTemperature - 273.15);

    private static double Fuel(VolumeFlow flow) => Require.NotNegative(flow.Si(), "Fuel flow", Scale.CubicMetresPerSecond, "fuelFlow");

    private static double Oxygen(Ratio share) =>
        Require.Below(Require.NotNegative(share.Si(), "Excess oxygen", Scale.None, "excessOxygen"), FlueGas.OxygenInAir, "Excess oxygen", Scale.None, "excessOxygen");

    private static double Gas(Temperature temperature, string quantity, string parameter) =>
        Require.Within(temperature.Si(), IdealGas.Lowest, IdealGas.Highest, quantity, Scale.Celsius, parameter);
}
