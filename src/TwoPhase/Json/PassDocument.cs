using TwoPhase.Metering;
using TwoPhase.Passes;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Json;

/// <summary>A pass: its name, its tubes, its outlet meter with the wet-steam model, and its tags.</summary>
internal sealed class PassDocument
{
    public string? Name { get; set; }

    public string? HeatAtFullFiring { get; set; }

    public List<SectionDocument>? Sections { get; set; }

    public MeterDocument? Meter { get; set; }

    public string? WetModel { get; set; }

    public Dictionary<string, string>? Tags { get; set; }

    public static PassDocument Of(Pass pass) => new()
    {
        Name = pass.Name,
        HeatAtFullFiring = pass.HeatAtFullFiring is { } heat ? QuantityText.Write(heat.Si(), "MW", UnitKind.Power, "W") : null,
        Sections = pass.Sections.Count == 0 ? null : [.. pass.Sections.Select(SectionDocument.Of)],
        Meter = pass.Meter is { } meter ? MeterDocument.Of(meter.Meter) : null,
        WetModel = pass.Meter?.Model.Name,
        Tags = Names.Of(pass.Tags),
    };

    public Pass Read(Place place, UnitBasis basis)
    {
        string name = place.Member("name").Required(Name);
        TubeSection[] sections = [.. (Sections ?? []).Select((section, i) => place.Member("sections").Item(i).Required(section).Read(place.Member("sections").Item(i)))];
        Power? heat = HeatAtFullFiring is null ? null : Power.FromWatts(place.Member("heatAtFullFiring").Quantity(HeatAtFullFiring, UnitKind.Power));
        Pass pass = place.Make(() => new Pass(name, sections, heat))
            .WithTags(Names.Tags(Tags, TagSet.OfPass, basis, place.Member("tags")));
        return Meter is null ? pass : Metered(pass, Meter, place);
    }

    private Pass Metered(Pass pass, MeterDocument document, Place place)
    {
        DifferentialPressureMeter meter = document.Read(place.Member("meter"));
        WetSteamModel model = WetModel is null ? WetSteamModel.Homogeneous : Names.WetModel(WetModel, place.Member("wetModel"));
        return pass.WithMeter(place.Member("wetModel").Make(() => new QualityMeter(meter, model)));
    }
}
