using TwoPhase.Metering;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Json;

/// <summary>Diameters measured cold: <c>{ "at": "20 degC", "pipeExpansionPerKelvin": 12e-6, "throatExpansionPerKelvin": 16e-6 }</c>.</summary>
internal sealed class ColdDocument
{
    public string? At { get; set; }

    public double? PipeExpansionPerKelvin { get; set; }

    public double? ThroatExpansionPerKelvin { get; set; }

    public static ColdDocument? Of(PrimaryElement element) => element.Growth is not { } growth ? null : new()
    {
        At = QuantityText.Write(growth.Reference, "degC", UnitKind.Temperature, "K"),
        PipeExpansionPerKelvin = growth.PipeCoefficient,
        ThroatExpansionPerKelvin = growth.ThroatCoefficient,
    };

    public PrimaryElement Add(PrimaryElement element, Place place) => element.MeasuredCold(
        CoefficientOfThermalExpansion.FromPerKelvin(place.Member("pipeExpansionPerKelvin").Required(PipeExpansionPerKelvin)),
        CoefficientOfThermalExpansion.FromPerKelvin(place.Member("throatExpansionPerKelvin").Required(ThroatExpansionPerKelvin)),
        Temperature.FromKelvins(place.Member("at").Quantity(At, UnitKind.Temperature)));
}
