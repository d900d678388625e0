using System.Text.RegularExpressions;

namespace TwoPhase.Tests.House;

/// <summary>The pages of the documentation: every block of code compiles, runs, and prints what the page shows below it.</summary>
public partial class DocsTests
{
    private static readonly string Folder = Path.Combine("src", "Docs");

    public static TheoryData<string> Pages => [.. Directory.EnumerateFiles(Path.Combine(Repository.Root, Folder), "*.md", SearchOption.AllDirectories)
        .Select(static path => Path.GetRelativePath(Path.Combine(Repository.Root, Folder), path))
        .Where(static path => !path.StartsWith("generated", StringComparison.Ordinal))];

    [Theory]
    [MemberData(nameof(Pages))]
    public void Code_CompiledAndRun_PrintsWhatThePageShows(string page)
    {
        string text = Repository.Read(Path.Combine(Folder, page));
        MatchCollection blocks = Blocks().Matches(text);
        Assert.Equal(text.Split("```csharp").Length - 1, blocks.Count);
        Assert.All(blocks, block => Assert.Equal(block.Groups["output"].Value.TrimEnd(), Compiler.Run(block.Groups["code"].Value).TrimEnd()));
    }

    [GeneratedRegex(@"```csharp\n(?<code>.*?)```\n```text\n(?<output>.*?)```", RegexOptions.Singleline)]
    private static partial Regex Blocks();
}
