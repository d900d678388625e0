using UnitsNet;
using UnitsNet.Units;

namespace TwoPhase.Units;

/// <summary>
/// The way in for columns: the line from a column's unit to coherent SI, drawn once per call through two points of
/// <see cref="SiDoor"/>, so that a sample of a column and a single quantity agree. By number and unit, not by quantity: in a fresh
/// process UnitsNet takes 10 ms to wake a kind of quantity. No entry means that no column of that unit is taken.
/// </summary>
internal static class ColumnDoor
{
    public static LinearMap ToSi(this PressureUnit unit) =>
        LinearMap.Through(SiDoor.Si(0, unit), SiDoor.Si(LinearMap.Far, unit));

    public static LinearMap ToSi(this TemperatureUnit unit) =>
        LinearMap.Through(SiDoor.Si(0, unit), SiDoor.Si(LinearMap.Far, unit));

    public static LinearMap ToSi(this MassFlowUnit unit) =>
        LinearMap.Through(SiDoor.Si(0, unit), SiDoor.Si(LinearMap.Far, unit));

    public static LinearMap ToSi(this SpecificEnergyUnit unit) =>
        LinearMap.Through(SiDoor.Si(0, unit), SiDoor.Si(LinearMap.Far, unit));

    public static LinearMap ToSi(this SpecificVolumeUnit unit) =>
        LinearMap.Through(SiDoor.Si(0, unit), SiDoor.Si(LinearMap.Far, unit));

    public static LinearMap ToSi(this DensityUnit unit) =>
        LinearMap.Through(SiDoor.Si(0, unit), SiDoor.Si(LinearMap.Far, unit));

    public static LinearMap ToSi(this MassFractionUnit unit) =>
        LinearMap.Through(SiDoor.Si(0, unit), SiDoor.Si(LinearMap.Far, unit));

    public static LinearMap ToSi(this RatioUnit unit) =>
        LinearMap.Through(SiDoor.Si(0, unit), SiDoor.Si(LinearMap.Far, unit));

    public static LinearMap ToSi(this LengthUnit unit) =>
        LinearMap.Through(SiDoor.Si(0, unit), SiDoor.Si(LinearMap.Far, unit));

    public static LinearMap ToSi(this DurationUnit unit) =>
        LinearMap.Through(SiDoor.Si(0, unit), SiDoor.Si(LinearMap.Far, unit));

    public static LinearMap ToSi(this VolumeFlowUnit unit) =>
        LinearMap.Through(SiDoor.Si(0, unit), SiDoor.Si(LinearMap.Far, unit));

    public static LinearMap ToSi(this PowerUnit unit) =>
        LinearMap.Through(new Power(0, RareUnit.Known(unit)).Si(), new Power(LinearMap.Far, unit).Si());

    public static LinearMap ToSi(this MassUnit unit) =>
        LinearMap.Through(new Mass(0, RareUnit.Known(unit)).Si(), new Mass(LinearMap.Far, unit).Si());

    public static LinearMap ToSi(this MassConcentrationUnit unit) =>
        LinearMap.Through(new MassConcentration(0, RareUnit.Known(unit)).Si(), new MassConcentration(LinearMap.Far, unit).Si());
}
