namespace Backfill.Tests;

/// <summary>One history for all tests that read it.</summary>
[CollectionDefinition(InventedHistory.Name)]
public sealed class SharedHistory : ICollectionFixture<InventedHistory>;

/// <summary>Six days of three passes, some minutes about each midnight, estimated once without interruption on one thread.</summary>
public sealed class InventedHistory : IAsyncLifetime
{
    public const string Name = "invented history";

    public const int Partitions = 18;

    public string Folder { get; } = Directory.CreateTempSubdirectory("backfill").FullName;

    public string History => Path.Combine(Folder, "history");

    public string Estimates => Path.Combine(Folder, "estimates");

    public string Generator => Path.Combine(Folder, "generator.json");

    public static string[] Generate(string folder, params string[] more) => ["generate", folder, "--minutes", "6", .. more];

    /// <summary>A folder of its own for a test.</summary>
    public string Fresh() => Directory.CreateDirectory(Path.Combine(Folder, Path.GetRandomFileName())).FullName;

    public async Task InitializeAsync()
    {
        Assert.Equal(0, (await Support.RunAsync(Generate(Folder, "--passes", "3", "--days", "6"))).Code);
        (int code, string output, string error) = await Support.RunAsync("run", Folder, "--threads", "1");
        Assert.Equal((0, ""), (code, error));
        Assert.Contains($"Partitions: {Partitions} done, 0 stood from before, 0 without a file, 0 with a bad file.", output, StringComparison.Ordinal);
        Assert.Matches(@"raw reading [\d,]+ rows a second, estimator [\d,]+ rows a second", output);
    }

    public Task DisposeAsync()
    {
        Directory.Delete(Folder, recursive: true);
        return Task.CompletedTask;
    }
}
