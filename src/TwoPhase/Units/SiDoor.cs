using UnitsNet;
using UnitsNet.Units;

namespace TwoPhase.Units;

/// <summary>
/// The one way in: a quantity becomes a coherent SI double. Units that plants use are converted with factors of our own,
/// since reading t/h or psi through UnitsNet allocates; any other unit goes through UnitsNet (<see cref="RareUnit"/>).
/// A number with its unit is for columns.
/// </summary>
internal static class SiDoor
{
    // Exact by definition (international yard and pound, 1959; standard gravity, 1901).
    public const double KilogramsPerPound = 0.45359237;
    public const double MetresPerInch = 0.0254;
    public const double MetresPerFoot = 0.3048;
    public const double StandardGravity = 9.80665;
    public const double PascalsPerPsi = KilogramsPerPound * StandardGravity / (MetresPerInch * MetresPerInch);

    /// <summary>IT British thermal unit; exact by the definition Btu/lb = 2.326 kJ/kg.</summary>
    public const double JoulesPerBtu = 2326 * KilogramsPerPound;

    public static double Si(this Pressure quantity) => Si(quantity.Value, quantity.Unit);

    public static double Si(double value, PressureUnit unit) => unit switch
    {
        PressureUnit.Pascal => value,
        PressureUnit.Kilopascal => value * 1e3,
        PressureUnit.Megapascal => value * 1e6,
        PressureUnit.Bar => value * 1e5,
        PressureUnit.Millibar or PressureUnit.Hectopascal => value * 100,
        PressureUnit.PoundForcePerSquareInch => value * PascalsPerPsi,
        PressureUnit.KilogramForcePerSquareCentimeter => value * (StandardGravity * 1e4),
        _ => RareUnit.Si(value, unit),
    };

    public static double Si(this Temperature quantity) => Si(quantity.Value, quantity.Unit);

    public static double Si(double value, TemperatureUnit unit) => unit switch
    {
        TemperatureUnit.Kelvin => value,
        TemperatureUnit.DegreeCelsius => value + 273.15,
        TemperatureUnit.DegreeFahrenheit => (value + 459.67) / 1.8,
        _ => RareUnit.Si(value, unit),
    };

    public static double Si(this TemperatureDelta quantity) => quantity.Unit switch
    {
        TemperatureDeltaUnit.Kelvin or TemperatureDeltaUnit.DegreeCelsius => quantity.Value,
        TemperatureDeltaUnit.DegreeFahrenheit => quantity.Value / 1.8,
        _ => quantity.As(TemperatureDeltaUnit.Kelvin),
    };

    public static double Si(this MassFlow quantity) => Si(quantity.Value, quantity.Unit);

    public static double Si(double value, MassFlowUnit unit) => unit switch
    {
        MassFlowUnit.KilogramPerSecond => value,
        MassFlowUnit.GramPerSecond => value * 1e-3,
        MassFlowUnit.KilogramPerHour => value / 3600,
        MassFlowUnit.TonnePerHour => value / 3.6,
        MassFlowUnit.TonnePerDay => value / 86.4,
        MassFlowUnit.PoundPerHour => value * (KilogramsPerPound / 3600),
        MassFlowUnit.PoundPerSecond => value * KilogramsPerPound,
        _ => RareUnit.Si(value, unit),
    };

    public static double Si(this VolumeFlow quantity) => Si(quantity.Value, quantity.Unit);

    public static double Si(double value, VolumeFlowUnit unit) => unit switch
    {
        VolumeFlowUnit.CubicMeterPerSecond => value,
        VolumeFlowUnit.CubicMeterPerHour => value / 3600,
        VolumeFlowUnit.CubicMeterPerDay => value / 86400,
        _ => RareUnit.Si(value, unit),
    };

    public static double Si(this Length quantity) => Si(quantity.Value, quantity.Unit);

    public static double Si(double value, LengthUnit unit) => unit switch
    {
        LengthUnit.Meter => value,
        LengthUnit.Millimeter => value * 1e-3,
        LengthUnit.Centimeter => value * 1e-2,
        LengthUnit.Micrometer => value * 1e-6,
        LengthUnit.Inch => value * MetresPerInch,
        LengthUnit.Foot => value * MetresPerFoot,
        _ => RareUnit.Si(value, unit),
    };

    public static double Si(this Area quantity) => quantity.Unit switch
    {
        AreaUnit.SquareMeter => quantity.Value,
        AreaUnit.SquareMillimeter => quantity.Value * 1e-6,
        AreaUnit.SquareCentimeter => quantity.Value * 1e-4,
        AreaUnit.SquareInch => quantity.Value * (MetresPerInch * MetresPerInch),
        AreaUnit.SquareFoot => quantity.Value * (MetresPerFoot * MetresPerFoot),
        _ => quantity.As(AreaUnit.SquareMeter),
    };

    public static double Si(this Volume quantity) => quantity.Unit switch
    {
        VolumeUnit.CubicMeter => quantity.Value,
        VolumeUnit.Liter => quantity.Value * 1e-3,
        _ => quantity.As(VolumeUnit.CubicMeter),
    };

    public static double Si(this SpecificEnergy quantity) => Si(quantity.Value, quantity.Unit);

    public static double Si(double value, SpecificEnergyUnit unit) => unit switch
    {
        SpecificEnergyUnit.JoulePerKilogram => value,
        SpecificEnergyUnit.KilojoulePerKilogram => value * 1e3,
        SpecificEnergyUnit.MegajoulePerKilogram => value * 1e6,
        SpecificEnergyUnit.BtuPerPound => value * 2326,
        _ => RareUnit.Si(value, unit),
    };

    public static double Si(this EnergyDensity quantity) => quantity.As(EnergyDensityUnit.JoulePerCubicMeter);

    public static double Si(this SpecificEntropy quantity) => quantity.Unit switch
    {
        SpecificEntropyUnit.JoulePerKilogramKelvin => quantity.Value,
        SpecificEntropyUnit.KilojoulePerKilogramKelvin => quantity.Value * 1e3,
        SpecificEntropyUnit.BtuPerPoundFahrenheit => quantity.Value * 4186.8,
        _ => quantity.As(SpecificEntropyUnit.JoulePerKilogramKelvin),
    };

    public static double Si(this Density quantity) => Si(quantity.Value, quantity.Unit);

    public static double Si(double value, DensityUnit unit) => unit switch
    {
        DensityUnit.KilogramPerCubicMeter => value,
        DensityUnit.GramPerCubicCentimeter => value * 1e3,
        DensityUnit.PoundPerCubicFoot => value * (KilogramsPerPound / (MetresPerFoot * MetresPerFoot * MetresPerFoot)),
        _ => RareUnit.Si(value, unit),
    };

    public static double Si(this MassFraction quantity) => Si(quantity.Value, quantity.Unit);

    public static double Si(double value, MassFractionUnit unit) => unit switch
    {
        MassFractionUnit.DecimalFraction => value,
        MassFractionUnit.Percent => value / 100,
        _ => RareUnit.Si(value, unit),
    };

    public static double Si(this Ratio quantity) => Si(quantity.Value, quantity.Unit);

    public static double Si(double value, RatioUnit unit) => unit switch
    {
        RatioUnit.DecimalFraction => value,
        RatioUnit.Percent => value / 100,
        _ => RareUnit.Si(value, unit),
    };

    public static double Si(this MassConcentration quantity) => quantity.As(MassConcentrationUnit.KilogramPerCubicMeter);

    public static double Si(this MassFlux quantity) => quantity.Unit switch
    {
        MassFluxUnit.KilogramPerSecondPerSquareMeter => quantity.Value,
        _ => quantity.As(MassFluxUnit.KilogramPerSecondPerSquareMeter),
    };

    // Power holds a decimal inside: cast once, here.
    public static double Si(this Power quantity) => quantity.Unit switch
    {
        PowerUnit.Watt => (double)quantity.Value,
        PowerUnit.Kilowatt => (double)quantity.Value * 1e3,
        PowerUnit.Megawatt => (double)quantity.Value * 1e6,
        PowerUnit.BritishThermalUnitPerHour => (double)quantity.Value * (JoulesPerBtu / 3600),
        PowerUnit.MegabritishThermalUnitPerHour => (double)quantity.Value * (1e6 * JoulesPerBtu / 3600),
        _ => (double)quantity.As(PowerUnit.Watt),
    };

    public static double Si(this Duration quantity) => Si(quantity.Value, quantity.Unit);

    public static double Si(double value, DurationUnit unit) => unit switch
    {
        DurationUnit.Second => value,
        DurationUnit.Minute => value * 60,
        DurationUnit.Hour => value * 3600,
        DurationUnit.Day => value * 86400,
        _ => RareUnit.Si(value, unit),
    };

    public static double Si(this Mass quantity) => quantity.Unit switch
    {
        MassUnit.Kilogram => quantity.Value,
        MassUnit.Tonne => quantity.Value * 1e3,
        MassUnit.Pound => quantity.Value * KilogramsPerPound,
        _ => quantity.As(MassUnit.Kilogram),
    };

    public static double Si(this Angle quantity) => quantity.Unit switch
    {
        AngleUnit.Radian => quantity.Value,
        AngleUnit.Degree => quantity.Value * (Math.PI / 180),
        _ => quantity.As(AngleUnit.Radian),
    };

    public static double Si(this HeatFlux quantity) => quantity.Unit switch
    {
        HeatFluxUnit.WattPerSquareMeter => quantity.Value,
        HeatFluxUnit.KilowattPerSquareMeter => quantity.Value * 1e3,
        _ => quantity.As(HeatFluxUnit.WattPerSquareMeter),
    };

    public static double Si(this Speed quantity) => quantity.Unit switch
    {
        SpeedUnit.MeterPerSecond => quantity.Value,
        _ => quantity.As(SpeedUnit.MeterPerSecond),
    };

    public static double Si(this HeatTransferCoefficient quantity) => quantity.As(HeatTransferCoefficientUnit.WattPerSquareMeterKelvin);

    public static double Si(this ThermalConductivity quantity) => quantity.As(ThermalConductivityUnit.WattPerMeterKelvin);

    public static double Si(this DynamicViscosity quantity) => quantity.As(DynamicViscosityUnit.PascalSecond);

    public static double Si(this ForcePerLength quantity) => quantity.As(ForcePerLengthUnit.NewtonPerMeter);

    public static double Si(this SpecificVolume quantity) => Si(quantity.Value, quantity.Unit);

    public static double Si(double value, SpecificVolumeUnit unit) => unit switch
    {
        SpecificVolumeUnit.CubicMeterPerKilogram => value,
        _ => RareUnit.Si(value, unit),
    };
}
