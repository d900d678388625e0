using System.Reflection;
using System.Text.Json;
using System.Text.Json.Nodes;
using System.Text.RegularExpressions;
using TwoPhase.Json;
using TwoPhase.Metering;
using TwoPhase.Passes;
using TwoPhase.Tests.House;

namespace TwoPhase.Tests.Json;

/// <summary>The page that describes the document says what the code does.</summary>
public partial class SchemaPageTests
{
    private static readonly string Page = Repository.Read("src/TwoPhase/Json/SCHEMA.md").Replace("\r\n", "\n", StringComparison.Ordinal);

    private static readonly string Example = Page.Split("```json\n")[1].Split("```")[0];

    [Fact]
    public void Page_Members_AreThoseOfTheDocuments()
    {
        SortedSet<string> documents = [], page = [.. Documented().Select(member => $"{member.Place}.{member.Name}")];
        Collect(typeof(GeneratorDocument), "$", documents);
        Assert.Equal(documents, page);
        Assert.Equal(page.Count, Documented().Count);
    }

    [Fact]
    public void Page_Names_AreAllThere()
    {
        string[] names = [.. Members<HeatZone>(), .. Members<ConvergentFinish>(), .. Members<OrificeTappings>(), .. Members<PassSignal>(), .. Members<GeneratorSignal>(), .. Members<GasComponent>(), .. Members<HeatingBasis>()];
        foreach (string name in names) Assert.Contains($"`{name}`", Page, StringComparison.Ordinal);
        foreach (WetSteamModel model in WetSteamModel.All) Assert.Contains(model.Name, Page, StringComparison.Ordinal);
    }

    [Fact]
    public void Page_Example_ReadsAndWritesBack()
    {
        string written = GeneratorJson.Write(GeneratorJson.Read(Example));
        Assert.Equal(written, GeneratorJson.Write(GeneratorJson.Read(written)));
    }

    [Fact]
    public void Page_NeededMembers_AreMissedWithTheirPath()
    {
        foreach ((string place, string name, string leftOut) in Documented())
        {
            if (!leftOut.StartsWith("needed", StringComparison.Ordinal)) continue;
            JsonObject[] without = [.. Nodes(place).Where(node => node.ContainsKey(name))];
            Assert.True(without.Length > 0, $"the example shows no {place}.{name}");
            foreach (JsonObject node in without)
            {
                string path = $"{node.GetPath()}.{name}";
                node.Remove(name);
                DocumentException error = Assert.Throws<DocumentException>(() => GeneratorJson.Read(node.Root.ToJsonString()));
                Assert.Equal(path, error.Path);
                Assert.Contains("is missing", error.Message, StringComparison.Ordinal);
            }
        }
    }

    /// <summary>The places of the example that a path such as <c>$.passes[].meter</c> means, each in a copy of its own.</summary>
    private static IEnumerable<JsonObject> Nodes(string place)
    {
        int count = Follow(Parsed(), place).Count();
        return Enumerable.Range(0, count).Select(i => Follow(Parsed(), place).ElementAt(i));
    }

    private static IEnumerable<JsonObject> Follow(JsonNode root, string place)
    {
        IEnumerable<JsonNode> nodes = [root];
        foreach (string step in place.Split('.').Skip(1))
        {
            bool isList = step.EndsWith("[]", StringComparison.Ordinal);
            nodes = nodes.Select(node => node[isList ? step[..^2] : step]).OfType<JsonNode>();
            if (isList) nodes = nodes.SelectMany(node => node.AsArray()).OfType<JsonNode>();
        }

        return nodes.Select(node => node.AsObject());
    }

    private static JsonNode Parsed() => JsonNode.Parse(Example)!;

    private static List<(string Place, string Name, string LeftOut)> Documented()
    {
        List<(string, string, string)> members = [];
        string place = "";
        foreach (string line in Page.Split('\n'))
        {
            if (Heading().Match(line) is { Success: true } heading) place = heading.Groups[1].Value;
            else if (Row().Match(line) is { Success: true } row) members.Add((place, row.Groups[1].Value, row.Groups[2].Value));
        }

        return members;
    }

    private static void Collect(Type document, string place, SortedSet<string> members)
    {
        foreach (PropertyInfo property in document.GetProperties(BindingFlags.Public | BindingFlags.Instance))
        {
            string member = $"{place}.{JsonNamingPolicy.CamelCase.ConvertName(property.Name)}";
            members.Add(member);
            bool isList = property.PropertyType.IsGenericType && property.PropertyType.GetGenericTypeDefinition() == typeof(List<>);
            Type inner = isList ? property.PropertyType.GetGenericArguments()[0] : property.PropertyType;
            if (inner.Namespace == typeof(GeneratorDocument).Namespace) Collect(inner, isList ? member + "[]" : member, members);
        }
    }

    private static IEnumerable<string> Members<TEnum>()
        where TEnum : struct, Enum => Enum.GetNames<TEnum>().Where(name => name != "None").Select(JsonNamingPolicy.CamelCase.ConvertName);

    [GeneratedRegex(@"^## `(\S+)`$")]
    private static partial Regex Heading();

    [GeneratedRegex(@"^\| `(\w+)` \| .* \| (.*) \|$")]
    private static partial Regex Row();
}
