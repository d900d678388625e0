namespace Backfill.Tests;

/// <summary>What cannot be gone about at all is one line and an exit code, before anything is written.</summary>
public sealed class RefusalTests : IDisposable
{
    private readonly string _folder = Directory.CreateTempSubdirectory("backfill").FullName;

    public void Dispose() => Directory.Delete(_folder, recursive: true);

    [Theory]
    [InlineData("day=2031-03-04/pass=9", "history: there is a pass '9', and the generator has '1', '2', '3', '4', '5', '6'")]
    [InlineData("day=2031-3-4/pass=1", "day=2031-3-4: this is no day written yyyy-MM-dd")]
    [InlineData("2031-03-04/1", "history: there is nothing in it that is laid out as day=2031-03-04/pass=1")]
    public async Task Run_HistoryThatCannotBeIt_IsRefused(string laid, string expected)
    {
        await SiteAsync();
        Directory.CreateDirectory(Path.Combine(_folder, "history", laid));
        await IsRefusedAsync(expected);
    }

    [Fact]
    public async Task Run_WithoutFiles_IsRefused()
    {
        await IsRefusedAsync("generator.json: there is no such file");
        await SiteAsync();
        await IsRefusedAsync("history: there is no such folder");
        await SiteAsync(static json => json.Replace("\"outlet_pressure_MPa_abs [MPa(a)]\"", "\"outlet_pressure_MPa_abs [MPa]\"", StringComparison.Ordinal));
        await IsRefusedAsync("generator.json: $.passes[0].tags.outletPressure: ");
        await SiteAsync(static json => json.Replace("\"differential\": ", "\"inletPressure\": ", StringComparison.Ordinal).Replace("[kPa]", "[kPa(a)]", StringComparison.Ordinal));
        await IsRefusedAsync("generator.json: Pass '1' has no tag for its Differential, nor has the generator.");
        Assert.False(Directory.Exists(Path.Combine(_folder, "estimates")));
    }

    [Fact]
    public async Task Run_OverEstimatesMadeOtherwise_IsRefused()
    {
        await SiteAsync();
        Directory.CreateDirectory(Path.Combine(_folder, "history", "day=2031-03-04", "pass=1"));
        Assert.Equal(0, (await Support.RunAsync("run", _folder)).Code);
        await IsRefusedAsync("estimates: what stands in it was made with another generator file or other chains", "--chain-days", "7");
        await SiteAsync(static json => json.Replace("8.3 MW", "8.4 MW", StringComparison.Ordinal));
        await IsRefusedAsync("estimates: what stands in it was made with another generator file or other chains");
    }

    [Fact]
    public async Task Run_WhileAnotherIsAtIt_IsRefused()
    {
        await SiteAsync();
        Directory.CreateDirectory(Path.Combine(_folder, "history", "day=2031-03-04", "pass=1"));
        Directory.CreateDirectory(Path.Combine(_folder, "estimates"));
        using var other = new FileStream(Path.Combine(_folder, "estimates", "_lock-1-of-1"), FileMode.Create, FileAccess.ReadWrite, FileShare.None);
        await IsRefusedAsync("estimates: another process is at share 1/1 of it");
    }

    [Theory]
    [InlineData("--share 3/2", "--share '3/2' must be written 2/5")]
    [InlineData("--threads 0", "--threads 0 must be at least 1.")]
    [InlineData("--chain-days -1", "--chain-days -1 must be at least 0.")]
    public async Task Run_OptionOutsideItsLimits_SaysValueAndLimit(string options, string expected)
    {
        (int code, _, string error) = await Support.RunAsync(["run", _folder, .. options.Split(' ')]);
        Assert.NotEqual(0, code);
        Assert.Contains(expected, error, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("--start 4.3.2031", "--start '4.3.2031' must be a day written 2031-03-04.")]
    [InlineData("--passes 7", "--passes 7 must lie between 1 and 6.")]
    public async Task Generate_OptionOutsideItsLimits_SaysValueAndLimit(string options, string expected)
    {
        (int code, _, string error) = await Support.RunAsync(["generate", _folder, .. options.Split(' ')]);
        Assert.NotEqual(0, code);
        Assert.Contains(expected, error, StringComparison.Ordinal);
    }

    private async Task SiteAsync(Func<string, string>? change = null)
    {
        await using Stream stream = typeof(Program).Assembly.GetManifestResourceStream("generator.json")!;
        using var reader = new StreamReader(stream);
        string json = await reader.ReadToEndAsync();
        await File.WriteAllTextAsync(Path.Combine(_folder, "generator.json"), change?.Invoke(json) ?? json);
    }

    private async Task IsRefusedAsync(string expected, params string[] options)
    {
        (int code, _, string error) = await Support.RunAsync(["run", _folder, .. options]);
        Assert.Equal(2, code);
        Assert.StartsWith(expected, Assert.Single(error.TrimEnd().Split('\n')), StringComparison.Ordinal);
    }
}
