using System.Text.RegularExpressions;

namespace TwoPhase.Tests.House;

public partial class ReadmeTests
{
    [Fact]
    public void Examples_CompiledAndRun_PrintWhatTheReadmeShows()
    {
        MatchCollection blocks = Blocks().Matches(Repository.Read("README.md"));
        Assert.NotEmpty(blocks);
        Assert.All(blocks, block => Assert.Equal(block.Groups["output"].Value.TrimEnd(), Compiler.Run(block.Groups["code"].Value)));
    }

    [GeneratedRegex(@"```csharp\n(?<code>.*?)```\n```text\n(?<output>.*?)```", RegexOptions.Singleline)]
    private static partial Regex Blocks();
}
