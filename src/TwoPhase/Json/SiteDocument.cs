using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Json;

/// <summary>What the site's unit texts leave unsaid.</summary>
internal sealed class SiteDocument
{
    public string? AtmosphericPressure { get; set; }

    public string? BaseDensity { get; set; }

    public string? BaseTemperature { get; set; }

    public string? WaterColumnTemperature { get; set; }

    public static SiteDocument? Of(UnitBasis basis) => basis.Equals(UnitBasis.None) ? null : new()
    {
        AtmosphericPressure = Text(basis.Atmosphere, "kPa(a)", UnitKind.AbsolutePressure, "Pa(a)"),
        BaseDensity = Text(basis.WaterDensity, "kg/m3", UnitKind.Density, "kg/m3"),
        WaterColumnTemperature = Text(basis.ColumnTemperature, "degC", UnitKind.Temperature, "K"),
    };

    public UnitBasis Read(Place place)
    {
        UnitBasis basis = UnitBasis.None;
        basis = With(basis, AtmosphericPressure, place.Member("atmosphericPressure"), UnitKind.AbsolutePressure, (b, si) => b.WithAtmosphericPressure(Pressure.FromPascals(si)));
        basis = With(basis, BaseDensity, place.Member("baseDensity"), UnitKind.Density, (b, si) => b.WithBaseDensity(Density.FromKilogramsPerCubicMeter(si)));
        if (BaseDensity is not null && BaseTemperature is not null) throw place.Member("baseTemperature").Fault("the base density is given already");
        basis = With(basis, BaseTemperature, place.Member("baseTemperature"), UnitKind.Temperature, (b, si) => b.WithBaseTemperature(Temperature.FromKelvins(si)));
        return With(basis, WaterColumnTemperature, place.Member("waterColumnTemperature"), UnitKind.Temperature, (b, si) => b.WithWaterColumnTemperature(Temperature.FromKelvins(si)));
    }

    private static string? Text(double? si, string unit, UnitKind kind, string siUnit) => si is { } value ? QuantityText.Write(value, unit, kind, siUnit) : null;

    private static UnitBasis With(UnitBasis basis, string? text, Place place, UnitKind kind, Func<UnitBasis, double, UnitBasis> with) =>
        text is null ? basis : place.Make(() => with(basis, place.Quantity(text, kind)));
}
