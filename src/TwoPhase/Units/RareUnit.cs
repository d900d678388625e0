using System.Runtime.CompilerServices;
using UnitsNet;
using UnitsNet.Units;

namespace TwoPhase.Units;

/// <summary>
/// Units that <see cref="SiDoor"/> has no factor for, read through UnitsNet. Apart from the door, since whoever compiles a use of a
/// quantity loads its type, for a millisecond each in a fresh process.
/// </summary>
internal static class RareUnit
{
    [MethodImpl(MethodImplOptions.NoInlining)]
    public static double Si(double value, PressureUnit unit) => new Pressure(value, Known(unit)).As(PressureUnit.Pascal);

    [MethodImpl(MethodImplOptions.NoInlining)]
    public static double Si(double value, TemperatureUnit unit) => new Temperature(value, Known(unit)).As(TemperatureUnit.Kelvin);

    [MethodImpl(MethodImplOptions.NoInlining)]
    public static double Si(double value, MassFlowUnit unit) => new MassFlow(value, Known(unit)).As(MassFlowUnit.KilogramPerSecond);

    [MethodImpl(MethodImplOptions.NoInlining)]
    public static double Si(double value, VolumeFlowUnit unit) => new VolumeFlow(value, Known(unit)).As(VolumeFlowUnit.CubicMeterPerSecond);

    [MethodImpl(MethodImplOptions.NoInlining)]
    public static double Si(double value, LengthUnit unit) => new Length(value, Known(unit)).As(LengthUnit.Meter);

    [MethodImpl(MethodImplOptions.NoInlining)]
    public static double Si(double value, SpecificEnergyUnit unit) => new SpecificEnergy(value, Known(unit)).As(SpecificEnergyUnit.JoulePerKilogram);

    [MethodImpl(MethodImplOptions.NoInlining)]
    public static double Si(double value, DensityUnit unit) => new Density(value, Known(unit)).As(DensityUnit.KilogramPerCubicMeter);

    [MethodImpl(MethodImplOptions.NoInlining)]
    public static double Si(double value, MassFractionUnit unit) => new MassFraction(value, Known(unit)).As(MassFractionUnit.DecimalFraction);

    [MethodImpl(MethodImplOptions.NoInlining)]
    public static double Si(double value, RatioUnit unit) => new Ratio(value, Known(unit)).As(RatioUnit.DecimalFraction);

    [MethodImpl(MethodImplOptions.NoInlining)]
    public static double Si(double value, DurationUnit unit) => new Duration(value, Known(unit)).As(DurationUnit.Second);

    [MethodImpl(MethodImplOptions.NoInlining)]
    public static double Si(double value, SpecificVolumeUnit unit) => new SpecificVolume(value, Known(unit)).As(SpecificVolumeUnit.CubicMeterPerKilogram);

    /// <summary>The unit, if it is one: UnitsNet ends the process where a number is none.</summary>
    public static TUnit Known<TUnit>(TUnit unit)
        where TUnit : struct, Enum
    {
#if NET
        bool isDefined = Enum.IsDefined(unit);
#else
        bool isDefined = Enum.IsDefined(typeof(TUnit), unit);
#endif
        return isDefined ? unit : throw new ArgumentOutOfRangeException(nameof(unit), $"{unit} is no member of {typeof(TUnit).Name}.");
    }
}
