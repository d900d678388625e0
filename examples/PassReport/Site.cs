using System.Text.Json;
using PassReport.History;
using TwoPhase.Json;
using TwoPhase.Metering;
using TwoPhase.Passes;
using TwoPhase.Units;

namespace PassReport;

/// <summary>The user's generator file: the generator itself, which the library reads, and how its history is written.</summary>
internal sealed class Site
{
    private static readonly JsonSerializerOptions Options = new(JsonSerializerDefaults.Web) { UnmappedMemberHandling = System.Text.Json.Serialization.JsonUnmappedMemberHandling.Disallow };

    private Site(SteamGenerator generator, HistorySettings history) => (Generator, History) = (generator, history);

    public SteamGenerator Generator { get; }

    public HistorySettings History { get; }

    /// <summary>Every tag that the report reads, once.</summary>
    public IReadOnlyList<Tag> Tags =>
        [.. Generator.Passes.SelectMany(pass => pass.Tags.Select(tag => tag.Value)).Concat(Generator.Tags.Select(tag => tag.Value)).DistinctBy(tag => tag.Name)];

    public static Site Read(string file)
    {
        try
        {
            return Parse(File.ReadAllText(file), file);
        }
        catch (Exception error) when (error is IOException or UnauthorizedAccessException)
        {
            throw new FileFault(file, "", error is FileNotFoundException or DirectoryNotFoundException ? "there is no such file" : error.Message);
        }
    }

    public static Site Parse(string json, string file)
    {
        if (string.IsNullOrWhiteSpace(json)) throw new FileFault(file, "", "the file is empty");
        SteamGenerator generator;
        try
        {
            generator = GeneratorJson.Read(json);
        }
        catch (DocumentException error)
        {
            throw new FileFault(file, "", error.Message);
        }

        for (int i = 0; i < generator.Passes.Count; i++) CheckPass(generator, i, file);
        return new Site(generator, Settings(json, file));
    }

    private static void CheckPass(SteamGenerator generator, int index, string file)
    {
        Pass pass = generator.Passes[index];
        if (pass.Meter is null) throw new FileFault(file, $"$.passes[{index}].meter", $"pass '{pass.Name}' has no meter");
        Need(pass.Tags[PassSignal.FeedFlow], "feedFlow");
        Need(pass.Tags[PassSignal.Differential], "differential");
        Need(pass.Tags[PassSignal.OutletPressure] ?? generator.Tags[GeneratorSignal.HeaderPressure], "outletPressure");

        void Need(Tag? tag, string name)
        {
            if (tag is null) throw new FileFault(file, $"$.passes[{index}].tags.{name}", $"pass '{pass.Name}' has no such tag{(name == "outletPressure" ? ", nor the generator a headerPressure" : "")}");
        }
    }

    private static HistorySettings Settings(string json, string file)
    {
        using var document = JsonDocument.Parse(json, new() { CommentHandling = JsonCommentHandling.Skip, AllowTrailingCommas = true });
        if (!document.RootElement.TryGetProperty("history", out JsonElement history)) return new HistorySettings();
        try
        {
            return history.Deserialize<HistorySettings>(Options) ?? new HistorySettings();
        }
        catch (JsonException error)
        {
            throw new FileFault(file, "$.history" + (error.Path is { Length: > 1 } path ? path[1..] : ""), error.Message.Split(" Path:")[0].TrimEnd('.'));
        }
    }
}
