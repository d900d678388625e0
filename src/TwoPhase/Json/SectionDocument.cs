using TwoPhase.Passes;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Json;

/// <summary>A section of tube: <c>{ "name": "radiant", "bore": "77.9 mm", "outsideDiameter": "88.9 mm", "tubeLength": "18 m", "tubesInSeries": 20 }</c>.</summary>
internal sealed class SectionDocument
{
    public string? Name { get; set; }

    public string? Bore { get; set; }

    public string? OutsideDiameter { get; set; }

    public string? TubeLength { get; set; }

    public int? TubesInSeries { get; set; }

    public string? Zone { get; set; }

    public static SectionDocument Of(TubeSection section) => new()
    {
        Name = section.Name,
        Bore = Metres(section.Bore, "mm"),
        OutsideDiameter = Metres(section.OutsideDiameter, "mm"),
        TubeLength = Metres(section.TubeLength, "m"),
        TubesInSeries = section.TubesInSeries == 1 ? null : section.TubesInSeries,
        Zone = section.Zone == HeatZone.Radiant ? null : Names.Of(section.Zone),
    };

    public TubeSection Read(Place place)
    {
        string name = place.Member("name").Required(Name);
        Length bore = place.Member("bore").Length(Bore), outside = place.Member("outsideDiameter").Length(OutsideDiameter), length = place.Member("tubeLength").Length(TubeLength);
        TubeSection section = place.Make(() => new TubeSection(name, bore, outside, length, TubesInSeries ?? 1));
        return Zone is null ? section : Names.Read<HeatZone>(Zone, place.Member("zone")) switch
        {
            HeatZone.Convective => section.AsConvective(),
            HeatZone.Unheated => section.AsUnheated(),
            _ => section,
        };
    }

    private static string Metres(Length length, string unit) => QuantityText.Write(length.Si(), unit, UnitKind.Length, "m");
}
