using TwoPhase.Metering;
using TwoPhase.Passes;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Json;

/// <summary>A pass: its name, its tubes and how they are heated, its outlet meter with the wet-steam model, and its tags.</summary>
internal sealed class PassDocument
{
    public string? Name { get; set; }

    public string? HeatAtFullFiring { get; set; }

    public List<SectionDocument>? Sections { get; set; }

    /// <summary>How the heat is spread; even over the heated surface when left out.</summary>
    public List<HeatDocument>? Heat { get; set; }

    public OutletLineDocument? OutletLine { get; set; }

    public InterchangerDocument? Interchanger { get; set; }

    public MeterDocument? Meter { get; set; }

    public string? WetModel { get; set; }

    /// <summary>Relative standard uncertainty of the differential by the wet model; 0.03, unfitted, when left out.</summary>
    public double? WetModelUncertainty { get; set; }

    public Dictionary<string, string>? Tags { get; set; }

    public static PassDocument Of(Pass pass) => new()
    {
        Name = pass.Name,
        HeatAtFullFiring = pass.HeatAtFullFiring is { } heat ? QuantityText.Write(heat.Si(), "MW", UnitKind.Power, "W") : null,
        Sections = pass.Sections.Count == 0 ? null : [.. pass.Sections.Select(SectionDocument.Of)],
        Heat = HeatDocument.Of(pass.Heat),
        OutletLine = OutletLineDocument.Of(pass.OutletLine),
        Interchanger = InterchangerDocument.Of(pass.Interchanger),
        Meter = pass.Meter is { } meter ? MeterDocument.Of(meter.Meter) : null,
        WetModel = pass.Meter?.Model.Name,
        WetModelUncertainty = pass.Meter?.ModelUncertainty.Si() is { } uncertainty && uncertainty != QualityMeter.UnfittedModelUncertainty ? uncertainty : null,
        Tags = Names.Of(pass.Tags),
    };

    public Pass Read(Place place, UnitBasis basis)
    {
        string name = place.Member("name").Required(Name);
        TubeSection[] sections = [.. (Sections ?? []).Select((section, i) => place.Member("sections").Item(i).Required(section).Read(place.Member("sections").Item(i)))];
        Power? heat = HeatAtFullFiring is null ? null : Power.FromWatts(place.Member("heatAtFullFiring").Quantity(HeatAtFullFiring, UnitKind.Power));
        Pass pass = new Change<Pass>(place, place.Make(() => new Pass(name, sections, heat)))
            .With("heat", Heat, (it, profile, at) => it.WithHeat(HeatDocument.Read(profile, at)))
            .With("outletLine", OutletLine, (it, line, at) => it.WithOutletLine(line.Read(at)))
            .With("interchanger", Interchanger, (it, exchanger, at) => it.WithInterchanger(exchanger.Read(at)))
            .Made
            .WithTags(Names.Tags(Tags, TagSet.OfPass, basis, place.Member("tags")));
        return Meter is null ? pass : Metered(pass, Meter, place);
    }

    private Pass Metered(Pass pass, MeterDocument document, Place place)
    {
        DifferentialPressureMeter meter = document.Read(place.Member("meter"));
        WetSteamModel model = WetModel is null ? WetSteamModel.Homogeneous : Names.WetModel(WetModel, place.Member("wetModel"));
        return pass.WithMeter(new Change<QualityMeter>(place, place.Member("wetModel").Make(() => new QualityMeter(meter, model)))
            .With("wetModelUncertainty", WetModelUncertainty, (it, uncertainty, _) => it.WithModelUncertainty(Ratio.FromDecimalFractions(uncertainty!.Value)))
            .Made);
    }
}
