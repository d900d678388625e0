using System.Text.Json;
using Microsoft.DotNet.Interactive;
using Microsoft.DotNet.Interactive.Commands;
using Microsoft.DotNet.Interactive.CSharp;
using Microsoft.DotNet.Interactive.Events;

namespace Notebook.Tests;

/// <summary>The .NET notebook, run cell by cell in the kernel that such notebooks use; its packages are those of this build.</summary>
public class NotebookTests
{
    [Fact]
    public async Task FalseReading_EveryCell_RunsAndShowsItsPictures()
    {
        using var document = JsonDocument.Parse(await File.ReadAllTextAsync(Path.Combine(AppContext.BaseDirectory, "false-reading.ipynb")));
        using var kernel = new CSharpKernel();
        int pictures = 0, lines = 0;
        foreach (JsonElement cell in document.RootElement.GetProperty("cells").EnumerateArray())
        {
            if (cell.GetProperty("cell_type").GetString() != "code") continue;
            string code = string.Concat(cell.GetProperty("source").EnumerateArray().Select(static line => line.GetString()));
            KernelCommandResult result = await kernel.SendAsync(new SubmitCode(Here(code)));
            CommandFailed? failure = result.Events.OfType<CommandFailed>().FirstOrDefault();
            Assert.True(failure is null, $"{failure?.Message}\n{code}");
            pictures += result.Events.OfType<ReturnValueProduced>().SelectMany(static shown => shown.FormattedValues).Count(static value => value.MimeType == "text/html" && value.Value.Contains("image/png;base64", StringComparison.Ordinal));
            lines += result.Events.OfType<StandardOutputValueProduced>().Count();
        }

        Assert.Equal(2, pictures);
        Assert.True(lines >= 4, $"{lines} lines were printed");
    }

    // The packages of the notebook are those beside this test.
    private static string Here(string code) => code
        .Replace("#r \"nuget: TwoPhase\"", $"#r \"{typeof(TwoPhase.Passes.Pass).Assembly.Location}\"\n#r \"{typeof(UnitsNet.Length).Assembly.Location}\"", StringComparison.Ordinal)
        .Replace("#r \"nuget: ScottPlot\"", $"#r \"{typeof(ScottPlot.Plot).Assembly.Location}\"", StringComparison.Ordinal);
}
