using TwoPhase.Passes;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Json;

/// <summary>A section of tube: <c>{ "name": "radiant", "bore": "77.9 mm", "outsideDiameter": "88.9 mm", "tubeLength": "18 m", "tubesInSeries": 20 }</c>; the rest where it applies.</summary>
internal sealed class SectionDocument
{
    public string? Name { get; set; }

    public string? Bore { get; set; }

    public string? OutsideDiameter { get; set; }

    public string? TubeLength { get; set; }

    public int? TubesInSeries { get; set; }

    public int? ParallelTubes { get; set; }

    public string? Zone { get; set; }

    public BendsDocument? ReturnBends { get; set; }

    public string? Inclination { get; set; }

    public string? Rise { get; set; }

    public string? Roughness { get; set; }

    public ScaleDocument? Scale { get; set; }

    public FinsDocument? Fins { get; set; }

    /// <summary>Friction of a ribbed bore over that of a plain one; its presence makes the bore ribbed.</summary>
    public double? RibFrictionMultiplier { get; set; }

    /// <summary>Friction over that of the formula for a plain bore, from a fit; stands over that of the ribs.</summary>
    public double? FrictionFactor { get; set; }

    public double? LossCoefficient { get; set; }

    public MetalDocument? Metal { get; set; }

    public string? MetalMass { get; set; }

    public static SectionDocument Of(TubeSection section) => new()
    {
        Name = section.Name,
        Bore = QuantityText.Millimetres(section.RawBore),
        OutsideDiameter = QuantityText.Millimetres(section.RawOutsideDiameter),
        TubeLength = QuantityText.Metres(section.TubeLength.Si()),
        TubesInSeries = section.TubesInSeries == 1 ? null : section.TubesInSeries,
        ParallelTubes = section.ParallelTubes == 1 ? null : section.ParallelTubes,
        Zone = section.Zone == HeatZone.Radiant ? null : Names.Of(section.Zone),
        ReturnBends = BendsDocument.Of(section),
        Inclination = section.RawInclination == 0 ? null : QuantityText.Write(section.RawInclination, "deg", UnitKind.Angle, "rad"),
        Rise = section.GivenRise is { } rise ? QuantityText.Metres(rise) : null,
        Roughness = section.RawRoughness == 0 ? null : QuantityText.Millimetres(section.RawRoughness),
        Scale = ScaleDocument.Of(section),
        Fins = FinsDocument.Of(section),
        // A fit may find a ribbed bore smoother than ribs can be declared; the factor then stands over them.
        RibFrictionMultiplier = section.IsRibbed ? Math.Max(section.FrictionMultiplier, 1) : null,
        FrictionFactor = section.FrictionMultiplier == 1 || (section.IsRibbed && section.FrictionMultiplier > 1) ? null : section.FrictionMultiplier,
        LossCoefficient = section.LossCoefficient == 0 ? null : section.LossCoefficient,
        Metal = section.Metal == TubeMetal.CarbonSteel ? null : MetalDocument.Of(section.Metal),
        MetalMass = section.GivenMetalMass is { } mass ? QuantityText.Write(mass, "kg", UnitKind.Mass, "kg") : null,
    };

    public TubeSection Read(Place place)
    {
        string name = place.Member("name").Required(Name);
        Length bore = place.Member("bore").Length(Bore), outside = place.Member("outsideDiameter").Length(OutsideDiameter), length = place.Member("tubeLength").Length(TubeLength);
        var section = new Change<TubeSection>(place, place.Make(() => new TubeSection(name, bore, outside, length, TubesInSeries ?? 1)));
        return section
            .With("zone", Zone, (it, zone, at) => In(it, Names.Read<HeatZone>(zone, at)))
            .With("parallelTubes", ParallelTubes, (it, count, _) => it.WithParallelTubes(count!.Value))
            .With("returnBends", ReturnBends, (it, bends, at) => bends.Add(it, at))
            .With("inclination", Inclination, (it, angle, at) => it.WithInclination(Angle.FromRadians(at.Quantity(angle, UnitKind.Angle))))
            .With("rise", Rise, (it, rise, at) => it.WithRise(at.Length(rise)))
            .With("scale", Scale, (it, scale, at) => scale.Add(it, at))
            .With("roughness", Roughness, (it, roughness, at) => it.WithRoughness(at.Length(roughness)))
            .With("fins", Fins, (it, fins, at) => fins.Add(it, at))
            .With("ribFrictionMultiplier", RibFrictionMultiplier, (it, factor, _) => it.WithRibs(factor!.Value))
            .With("frictionFactor", FrictionFactor, (it, factor, _) => it.WithFrictionFactor(factor!.Value))
            .With("lossCoefficient", LossCoefficient, (it, loss, _) => it.WithLossCoefficient(loss!.Value))
            .With("metal", Metal, (it, metal, at) => it.WithMetal(metal.Read(at)))
            .With("metalMass", MetalMass, (it, mass, at) => it.WithMetalMass(Mass.FromKilograms(at.Quantity(mass, UnitKind.Mass))))
            .Made;
    }

    private static TubeSection In(TubeSection section, HeatZone zone) => zone switch
    {
        HeatZone.Convective => section.AsConvective(),
        HeatZone.Unheated => section.AsUnheated(),
        _ => section,
    };
}
