using System.Reflection;
using System.Text.RegularExpressions;
using System.Xml.Linq;
using TwoPhase.Tests.House;

namespace TwoPhase.Tests.Examples;

/// <summary>The notebook samples that the package carries: each is compiled and run as a notebook would, with a plain-text stand-in for its display.</summary>
public partial class NotebookTests
{
    private const string Display = """

        internal static class Display
        {
            public static T Dump<T>(this T shown, string title = "")
            {
                Console.WriteLine("== " + title);
                Show(shown);
                return shown;
            }

            private static void Show(object? shown)
            {
                System.Reflection.MethodInfo? convention = shown?.GetType().GetMethod("ToDump", System.Reflection.BindingFlags.Instance | System.Reflection.BindingFlags.Public | System.Reflection.BindingFlags.NonPublic, Type.EmptyTypes);
                if (convention is not null) Console.WriteLine(convention.Invoke(shown, null));
                else if (shown is System.Collections.IEnumerable rows and not string) foreach (object row in rows) Show(row);
                else Console.WriteLine(shown);
            }
        }
        """;

    public static TheoryData<string> Samples => [.. Directory.GetFiles(Path.Combine(Repository.Root, "examples", "Notebooks"), "*.linq").Select(static file => Path.GetFileName(file)!)];

    [Theory]
    [MemberData(nameof(Samples))]
    public void Sample_CompiledAndRun_ShowsEngineeringUnits(string name)
    {
        string text = Repository.Read(Path.Combine("examples", "Notebooks", name));
        int end = text.IndexOf("</Query>", StringComparison.Ordinal) + "</Query>".Length;
        var query = XElement.Parse(text[..end]);
        Assert.Equal("Statements", query.Attribute("Kind")!.Value);
        Assert.Equal("TwoPhase", query.Element("NuGetReference")!.Value);
        string usings = string.Concat(query.Elements("Namespace").Select(static element => $"using {element.Value};\n"));
        string shown = Compiler.Run(usings + text[end..] + Display);
        Assert.StartsWith("== ", shown, StringComparison.Ordinal);
        Assert.DoesNotContain("UnitsNet.", shown, StringComparison.Ordinal);
        Assert.DoesNotContain("TwoPhase.", shown, StringComparison.Ordinal);
        Assert.Matches(Unit(), shown);
    }

    [Fact]
    public void Samples_AnswerTheSixQuestionsAndMore() => Assert.InRange(Samples.Count, 5, 8);

    [Fact]
    public void Results_WithWordsOfTheirOwn_ShowThemInNotebooks()
    {
        Type[] silent = [.. typeof(TwoPhase.Passes.Pass).Assembly.GetExportedTypes()
            .Where(static type => !type.IsAbstract && !type.IsEnum && !typeof(Exception).IsAssignableFrom(type))
            .Where(static type => !typeof(System.Collections.IEnumerable).IsAssignableFrom(type))   // a notebook shows their rows
            .Where(static type => type.GetMethod("ToString", Type.EmptyTypes)!.DeclaringType == type && !IsGenerated(type))
            .Where(static type => type.GetMethod("ToDump", BindingFlags.Instance | BindingFlags.NonPublic, Type.EmptyTypes)?.ReturnType != typeof(object))];
        Assert.Empty(silent);
    }

    // A record's own ToString lists its members; there is nothing to add.
    private static bool IsGenerated(Type type) => type.GetMethod("ToString", Type.EmptyTypes)!.GetCustomAttribute<System.Runtime.CompilerServices.CompilerGeneratedAttribute>() is not null;

    [GeneratedRegex(@"kg/s|kg/m³|MPa|kPa|°C|\d %|±")]
    private static partial Regex Unit();
}
