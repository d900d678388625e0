using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.CSharp;
using Microsoft.CodeAnalysis.CSharp.Syntax;

namespace TwoPhase.Tests.House;

/// <summary>Imports run downwards only: each folder of the library may use what stands below it, never beside or above.</summary>
public class FloorTests
{
    // The house of the design, in half floors. Units, Numerics and Uncertainty stand beside it and know nothing of it.
    private static readonly Dictionary<string, int> Floors = new()
    {
        ["Steam"] = 0,
        ["Flow"] = 1,
        ["Metering"] = 2,
        ["Slip"] = 2,
        ["Friction"] = 2,
        ["HeatTransfer"] = 2,
        ["Passes"] = 4,
        ["Boiling"] = 6,
        ["Holdup"] = 6,
        ["Limits"] = 6,
        ["Stability"] = 6,
        ["Dynamics"] = 8,
        ["Advisory"] = 10,
        ["Json"] = 12,
    };

    private static readonly Dictionary<string, string[]> Beside = new()
    {
        ["Units"] = ["Numerics"],
        ["Numerics"] = [],
        ["Uncertainty"] = ["Units", "Numerics"],
    };

    [Fact]
    public void Library_EveryImport_RunsDownwards()
    {
        string[] wrong = [.. Uses().Where(use => !Allowed(use.From, use.To)).Select(use => $"{use.From} uses {use.To} in {use.Where}").Distinct().Order()];
        Assert.True(wrong.Length == 0, string.Join(Environment.NewLine, wrong));
    }

    [Fact]
    public void Library_EveryFolder_HasItsFloor()
    {
        string[] folders = [.. Repository.LibrarySources().Select(Folder).Distinct()];
        Assert.All(folders, folder => Assert.True(Floors.ContainsKey(folder) || Beside.ContainsKey(folder), $"The design gives '{folder}' no floor."));
        Assert.Contains("Slip", folders);
    }

    private static bool Allowed(string from, string to) =>
        from == to
        || (Beside.TryGetValue(from, out string[]? friends) ? friends.Contains(to)
        : Beside.ContainsKey(to) || Floors[to] < Floors[from]);

    private static IEnumerable<(string From, string To, string Where)> Uses()
    {
        foreach (SyntaxTree tree in Compiler.Library.SyntaxTrees.Where(tree => tree.FilePath.Length > 0))
        {
            SemanticModel model = Compiler.Library.GetSemanticModel(tree);
            string from = Folder(tree.FilePath);
            foreach (SimpleNameSyntax name in tree.GetRoot().DescendantNodes().OfType<SimpleNameSyntax>())
            {
                if (model.GetSymbolInfo(name).Symbol is not (INamedTypeSymbol or IMethodSymbol or IPropertySymbol or IFieldSymbol)) continue;
                ISymbol symbol = model.GetSymbolInfo(name).Symbol!;
                string? space = symbol.ContainingNamespace?.ToDisplayString();
                if (space is null || !space.StartsWith("TwoPhase.", StringComparison.Ordinal)) continue;
                yield return (from, space.Split('.')[1], $"{Path.GetFileName(tree.FilePath)}:{name.GetLocation().GetLineSpan().StartLinePosition.Line + 1}");
            }
        }
    }

    private static string Folder(string path) => Path.GetRelativePath(Path.Combine(Repository.Root, "src", "TwoPhase"), path).Split(Path.DirectorySeparatorChar)[0];
}
