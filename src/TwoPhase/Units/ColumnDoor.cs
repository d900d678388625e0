using UnitsNet;
using UnitsNet.Units;

namespace TwoPhase.Units;

/// <summary>
/// The way in for columns: the line from a column's unit to coherent SI, drawn once per call through two points of
/// <see cref="SiDoor"/>, so that a sample of a column and a single quantity agree. No entry means that no column of that unit is taken.
/// </summary>
internal static class ColumnDoor
{
    public static LinearMap ToSi(this PressureUnit unit) =>
        LinearMap.Through(new Pressure(0, unit).Si(), new Pressure(LinearMap.Far, unit).Si());

    public static LinearMap ToSi(this TemperatureUnit unit) =>
        LinearMap.Through(new Temperature(0, unit).Si(), new Temperature(LinearMap.Far, unit).Si());

    public static LinearMap ToSi(this MassFlowUnit unit) =>
        LinearMap.Through(new MassFlow(0, unit).Si(), new MassFlow(LinearMap.Far, unit).Si());

    public static LinearMap ToSi(this SpecificEnergyUnit unit) =>
        LinearMap.Through(new SpecificEnergy(0, unit).Si(), new SpecificEnergy(LinearMap.Far, unit).Si());

    public static LinearMap ToSi(this SpecificVolumeUnit unit) =>
        LinearMap.Through(new SpecificVolume(0, unit).Si(), new SpecificVolume(LinearMap.Far, unit).Si());

    public static LinearMap ToSi(this DensityUnit unit) =>
        LinearMap.Through(new Density(0, unit).Si(), new Density(LinearMap.Far, unit).Si());

    public static LinearMap ToSi(this MassFractionUnit unit) =>
        LinearMap.Through(new MassFraction(0, unit).Si(), new MassFraction(LinearMap.Far, unit).Si());

    public static LinearMap ToSi(this RatioUnit unit) =>
        LinearMap.Through(new Ratio(0, unit).Si(), new Ratio(LinearMap.Far, unit).Si());

    public static LinearMap ToSi(this LengthUnit unit) =>
        LinearMap.Through(new Length(0, unit).Si(), new Length(LinearMap.Far, unit).Si());

    public static LinearMap ToSi(this DurationUnit unit) =>
        LinearMap.Through(new Duration(0, unit).Si(), new Duration(LinearMap.Far, unit).Si());

    public static LinearMap ToSi(this VolumeFlowUnit unit) =>
        LinearMap.Through(new VolumeFlow(0, unit).Si(), new VolumeFlow(LinearMap.Far, unit).Si());

    public static LinearMap ToSi(this PowerUnit unit) =>
        LinearMap.Through(new Power(0, unit).Si(), new Power(LinearMap.Far, unit).Si());
}
