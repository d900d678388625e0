using TwoPhase.Passes;
using UnitsNet;

namespace TwoPhase.Json;

/// <summary>The heat of one section: <c>{ "section": "radiant", "share": 0.59, "shape": [{ "at": 0, "flux": 1 }, { "at": 1, "flux": 0.6 }] }</c>; shares of a pass sum to 1.</summary>
internal sealed class HeatDocument
{
    public string? Section { get; set; }

    public double? Share { get; set; }

    public List<FluxDocument>? Shape { get; set; }

    public static List<HeatDocument>? Of(HeatProfile? heat) => heat is null ? null : [.. heat.Sections.Select(Of)];

    public static HeatProfile Read(List<HeatDocument> documents, Place place) =>
        place.Make(() => new HeatProfile([.. documents.Select((document, i) => place.Item(i).Required(document).Read(place.Item(i)))]));

    private static HeatDocument Of(SectionHeat heat) => new()
    {
        Section = heat.Section,
        Share = heat.RawShare,
        Shape = heat.Shape.Count == 0 ? null : [.. heat.Shape.Select(point => new FluxDocument { At = point.RawPosition, Flux = point.RelativeFlux })],
    };

    private SectionHeat Read(Place place)
    {
        string section = place.Member("section").Required(Section);
        double share = place.Member("share").Required(Share);
        FluxPoint[] shape = [.. (Shape ?? []).Select((point, i) => place.Member("shape").Item(i).Required(point).Read(place.Member("shape").Item(i)))];
        return place.Make(() => new SectionHeat(section, Ratio.FromDecimalFractions(share), shape));
    }
}

/// <summary>One point of a flux shape: place along the section, 0 to 1, and flux relative to the other points.</summary>
internal sealed class FluxDocument
{
    public double? At { get; set; }

    public double? Flux { get; set; }

    public FluxPoint Read(Place place)
    {
        double at = place.Member("at").Required(At), flux = place.Member("flux").Required(Flux);
        return place.Make(() => new FluxPoint(Ratio.FromDecimalFractions(at), flux));
    }
}
