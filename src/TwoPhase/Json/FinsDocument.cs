using TwoPhase.Passes;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Json;

/// <summary>Fins of a section, all tubes together: <c>{ "surface": "350 m2", "metal": "900 kg" }</c>.</summary>
internal sealed class FinsDocument
{
    public string? Surface { get; set; }

    public string? Metal { get; set; }

    public static FinsDocument? Of(TubeSection section)
    {
        double surface = section.FinSurface.Si(), metal = section.FinMetal.Si();
        return surface == 0 && metal == 0 ? null : new()
        {
            Surface = QuantityText.Write(surface, "m2", UnitKind.Area, "m2"),
            Metal = QuantityText.Write(metal, "kg", UnitKind.Mass, "kg"),
        };
    }

    public TubeSection Add(TubeSection section, Place place) => section.WithFins(
        Area.FromSquareMeters(place.Member("surface").Quantity(Surface, UnitKind.Area)),
        Mass.FromKilograms(place.Member("metal").Quantity(Metal, UnitKind.Mass)));
}
