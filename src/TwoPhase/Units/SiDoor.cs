using UnitsNet;
using UnitsNet.Units;

namespace TwoPhase.Units;

/// <summary>
/// The one way in: a quantity becomes a coherent SI double. Units that plants use are converted with factors of our own,
/// since reading t/h or psi through UnitsNet allocates; any other unit goes through UnitsNet.
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

    public static double Si(this Pressure quantity) => quantity.Unit switch
    {
        PressureUnit.Pascal => quantity.Value,
        PressureUnit.Kilopascal => quantity.Value * 1e3,
        PressureUnit.Megapascal => quantity.Value * 1e6,
        PressureUnit.Bar => quantity.Value * 1e5,
        PressureUnit.Millibar or PressureUnit.Hectopascal => quantity.Value * 100,
        PressureUnit.PoundForcePerSquareInch => quantity.Value * PascalsPerPsi,
        PressureUnit.KilogramForcePerSquareCentimeter => quantity.Value * (StandardGravity * 1e4),
        _ => quantity.As(PressureUnit.Pascal),
    };

    public static double Si(this Temperature quantity) => quantity.Unit switch
    {
        TemperatureUnit.Kelvin => quantity.Value,
        TemperatureUnit.DegreeCelsius => quantity.Value + 273.15,
        TemperatureUnit.DegreeFahrenheit => (quantity.Value + 459.67) / 1.8,
        _ => quantity.As(TemperatureUnit.Kelvin),
    };

    public static double Si(this TemperatureDelta quantity) => quantity.Unit switch
    {
        TemperatureDeltaUnit.Kelvin or TemperatureDeltaUnit.DegreeCelsius => quantity.Value,
        TemperatureDeltaUnit.DegreeFahrenheit => quantity.Value / 1.8,
        _ => quantity.As(TemperatureDeltaUnit.Kelvin),
    };

    public static double Si(this MassFlow quantity) => quantity.Unit switch
    {
        MassFlowUnit.KilogramPerSecond => quantity.Value,
        MassFlowUnit.GramPerSecond => quantity.Value * 1e-3,
        MassFlowUnit.KilogramPerHour => quantity.Value / 3600,
        MassFlowUnit.TonnePerHour => quantity.Value / 3.6,
        MassFlowUnit.TonnePerDay => quantity.Value / 86.4,
        MassFlowUnit.PoundPerHour => quantity.Value * (KilogramsPerPound / 3600),
        MassFlowUnit.PoundPerSecond => quantity.Value * KilogramsPerPound,
        _ => quantity.As(MassFlowUnit.KilogramPerSecond),
    };

    public static double Si(this VolumeFlow quantity) => quantity.Unit switch
    {
        VolumeFlowUnit.CubicMeterPerSecond => quantity.Value,
        VolumeFlowUnit.CubicMeterPerHour => quantity.Value / 3600,
        VolumeFlowUnit.CubicMeterPerDay => quantity.Value / 86400,
        _ => quantity.As(VolumeFlowUnit.CubicMeterPerSecond),
    };

    public static double Si(this Length quantity) => quantity.Unit switch
    {
        LengthUnit.Meter => quantity.Value,
        LengthUnit.Millimeter => quantity.Value * 1e-3,
        LengthUnit.Centimeter => quantity.Value * 1e-2,
        LengthUnit.Micrometer => quantity.Value * 1e-6,
        LengthUnit.Inch => quantity.Value * MetresPerInch,
        LengthUnit.Foot => quantity.Value * MetresPerFoot,
        _ => quantity.As(LengthUnit.Meter),
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

    public static double Si(this SpecificEnergy quantity) => quantity.Unit switch
    {
        SpecificEnergyUnit.JoulePerKilogram => quantity.Value,
        SpecificEnergyUnit.KilojoulePerKilogram => quantity.Value * 1e3,
        SpecificEnergyUnit.MegajoulePerKilogram => quantity.Value * 1e6,
        SpecificEnergyUnit.BtuPerPound => quantity.Value * 2326,
        _ => quantity.As(SpecificEnergyUnit.JoulePerKilogram),
    };

    public static double Si(this SpecificEntropy quantity) => quantity.Unit switch
    {
        SpecificEntropyUnit.JoulePerKilogramKelvin => quantity.Value,
        SpecificEntropyUnit.KilojoulePerKilogramKelvin => quantity.Value * 1e3,
        SpecificEntropyUnit.BtuPerPoundFahrenheit => quantity.Value * 4186.8,
        _ => quantity.As(SpecificEntropyUnit.JoulePerKilogramKelvin),
    };

    public static double Si(this Density quantity) => quantity.Unit switch
    {
        DensityUnit.KilogramPerCubicMeter => quantity.Value,
        DensityUnit.GramPerCubicCentimeter => quantity.Value * 1e3,
        DensityUnit.PoundPerCubicFoot => quantity.Value * (KilogramsPerPound / (MetresPerFoot * MetresPerFoot * MetresPerFoot)),
        _ => quantity.As(DensityUnit.KilogramPerCubicMeter),
    };

    public static double Si(this MassFraction quantity) => quantity.Unit switch
    {
        MassFractionUnit.DecimalFraction => quantity.Value,
        MassFractionUnit.Percent => quantity.Value / 100,
        _ => quantity.As(MassFractionUnit.DecimalFraction),
    };

    public static double Si(this Ratio quantity) => quantity.Unit switch
    {
        RatioUnit.DecimalFraction => quantity.Value,
        RatioUnit.Percent => quantity.Value / 100,
        _ => quantity.As(RatioUnit.DecimalFraction),
    };

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

    public static double Si(this Duration quantity) => quantity.Unit switch
    {
        DurationUnit.Second => quantity.Value,
        DurationUnit.Minute => quantity.Value * 60,
        DurationUnit.Hour => quantity.Value * 3600,
        DurationUnit.Day => quantity.Value * 86400,
        _ => quantity.As(DurationUnit.Second),
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

    public static double Si(this SpecificVolume quantity) => quantity.As(SpecificVolumeUnit.CubicMeterPerKilogram);
}
