using System.Text.Json;
using TwoPhase.Metering;
using TwoPhase.Passes;
using TwoPhase.Units;

namespace TwoPhase.Json;

/// <summary>A generator: its name, the site's basis, the tags that the passes share, its fire, and the passes.</summary>
internal sealed class GeneratorDocument
{
    public string? Name { get; set; }

    /// <summary>A remark for people; not read.</summary>
    public string? Note { get; set; }

    /// <summary>Settings of a program that reads this generator's histories; not read here.</summary>
    public JsonElement? History { get; set; }

    /// <summary>Limits that a program holds the passes to; not read here.</summary>
    public JsonElement? Limits { get; set; }

    public SiteDocument? Site { get; set; }

    public Dictionary<string, string>? Tags { get; set; }

    public FiringDocument? Firing { get; set; }

    public List<PassDocument>? Passes { get; set; }

    public static GeneratorDocument Of(SteamGenerator generator) => new()
    {
        Name = generator.Name,
        Site = SiteDocument.Of(generator.Basis),
        Tags = Names.Of(generator.Tags),
        Firing = FiringDocument.Of(generator.Firing),
        Passes = [.. generator.Passes.Select(PassDocument.Of)],
    };

    public SteamGenerator Read()
    {
        Place root = Place.Root;
        string name = root.Member("name").Required(Name);
        UnitBasis basis = Site?.Read(root.Member("site")) ?? UnitBasis.None;
        List<PassDocument> documents = root.Member("passes").Required(Passes);
        Pass[] passes = [.. documents.Select((document, i) => root.Member("passes").Item(i).Required(document).Read(root.Member("passes").Item(i), basis))];
        SteamGenerator generator = root.Member("passes").Make(() => new SteamGenerator(name, passes)).WithBasis(basis).WithTags(Names.Tags(Tags, TagSet.OfGenerator, basis, root.Member("tags")));
        return Firing is null ? generator : generator.WithFiring(Firing.Read(root.Member("firing")));
    }
}
