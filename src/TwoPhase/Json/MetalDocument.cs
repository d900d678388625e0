using TwoPhase.Passes;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Json;

/// <summary>A tube metal other than carbon steel: <c>{ "name": "T22", "density": "7800 kg/m3", "heatCapacity": "560 J/(kg.K)", "conductivity": "36 W/(m.K)" }</c>.</summary>
internal sealed class MetalDocument
{
    public string? Name { get; set; }

    public string? Density { get; set; }

    public string? HeatCapacity { get; set; }

    public string? Conductivity { get; set; }

    public static MetalDocument Of(TubeMetal metal) => new()
    {
        Name = metal.Name,
        Density = QuantityText.Write(metal.RawDensity, "kg/m3", UnitKind.Density, "kg/m3"),
        HeatCapacity = QuantityText.Write(metal.RawHeatCapacity, "J/(kg.K)", UnitKind.SpecificHeat, "J/(kg.K)"),
        Conductivity = QuantityText.Write(metal.RawConductivity, "W/(m.K)", UnitKind.ThermalConductivity, "W/(m.K)"),
    };

    public TubeMetal Read(Place place) => new(
        place.Member("name").Required(Name),
        UnitsNet.Density.FromKilogramsPerCubicMeter(place.Member("density").Quantity(Density, UnitKind.Density)),
        SpecificEntropy.FromJoulesPerKilogramKelvin(place.Member("heatCapacity").Quantity(HeatCapacity, UnitKind.SpecificHeat)),
        ThermalConductivity.FromWattsPerMeterKelvin(place.Member("conductivity").Quantity(Conductivity, UnitKind.ThermalConductivity)));
}
