using TwoPhase.Passes;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Json;

/// <summary>Scale on the water side: <c>{ "thickness": "0.5 mm", "conductivity": "1.5 W/(m.K)" }</c>.</summary>
internal sealed class ScaleDocument
{
    public string? Thickness { get; set; }

    public string? Conductivity { get; set; }

    public static ScaleDocument? Of(TubeSection section) => section.RawScale == 0 ? null : new()
    {
        Thickness = QuantityText.Millimetres(section.RawScale),
        Conductivity = QuantityText.Write(section.RawScaleConductivity, "W/(m.K)", UnitKind.ThermalConductivity, "W/(m.K)"),
    };

    public TubeSection Add(TubeSection section, Place place) => section.WithScale(
        place.Member("thickness").Length(Thickness),
        ThermalConductivity.FromWattsPerMeterKelvin(place.Member("conductivity").Quantity(Conductivity, UnitKind.ThermalConductivity)));
}
