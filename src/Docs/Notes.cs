using System.Reflection;
using System.Xml.Linq;

namespace Docs;

/// <summary>What stands beside a formula in the sources.</summary>
internal sealed record Notes(string Summary, string Range, string Accuracy, string Source)
{
    private static readonly Dictionary<string, XElement> Members = XDocument.Load(Path.ChangeExtension(typeof(TwoPhase.Passes.Pass).Assembly.Location, ".xml"))
        .Descendants("member").ToDictionary(static member => member.Attribute("name")!.Value);

    public static Notes Of(PropertyInfo model)
    {
        XElement member = Members[$"P:{model.DeclaringType!.FullName}.{model.Name}"];
        string[] paragraphs = [.. member.Descendants("para").Select(static paragraph => Line(paragraph))];
        return new(Line(member.Element("summary")!), After("Range:"), After("Accuracy:"), After("Source:"));

        string After(string word) => paragraphs.FirstOrDefault(paragraph => paragraph.StartsWith(word, StringComparison.Ordinal))?[word.Length..].Trim() ?? "";
    }

    private static string Line(XElement element) => string.Join(' ', Text(element).Split((char[]?)null, StringSplitOptions.RemoveEmptyEntries));

    // A reference inside a sentence reads as the name it ends in.
    private static string Text(XElement element) => string.Concat(element.Nodes().Select(static node => node switch
    {
        XText text => text.Value,
        XElement { Name.LocalName: "see" or "paramref" or "typeparamref" } reference => (reference.Attribute("cref") ?? reference.Attribute("name") ?? reference.Attribute("langword"))?.Value.Split('(')[0].Split('.', ':')[^1] ?? "",
        XElement inner => Text(inner),
        _ => "",
    }));
}
