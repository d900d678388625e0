namespace TwoPhase.Units;

/// <summary>What a unit text may stand for; each kind has one coherent SI unit behind it.</summary>
internal enum UnitKind
{
    None,
    AbsolutePressure,           // Pa
    PressureDifference,         // Pa
    Temperature,                // K
    TemperatureDifference,      // K
    MassFlow,                   // kg/s; a volume flow becomes one with its base density
    StandardGasFlow,            // m³/s at 15 °C and 101.325 kPa
    Ratio,                      // 1
    Length,                     // m
    Area,                       // m²
    Volume,                     // m³
    Mass,                       // kg
    Duration,                   // s
    Angle,                      // rad
    Energy,                     // J
    Power,                      // W
    Density,                    // kg/m³, mass concentration too
    SpecificEnergy,             // J/kg
    SpecificHeat,               // J/(kg·K)
    ThermalConductivity,        // W/(m·K)
    HeatTransferCoefficient,    // W/(m²·K)
    ThermalConductance,         // W/K
    EnergyPerStandardVolume,    // J/m³ of gas at 15 °C and 101.325 kPa
    StandardGasVolume,          // m³ at 15 °C and 101.325 kPa
    VolumeFlow,                 // m³/s of liquid water
}
