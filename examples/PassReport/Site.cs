using System.Text.Json;
using PassReport.History;
using TwoPhase.Json;
using TwoPhase.Limits;
using TwoPhase.Metering;
using TwoPhase.Passes;
using TwoPhase.Units;

namespace PassReport;

/// <summary>The user's generator file: the generator itself, which the library reads, and how its history is written.</summary>
internal sealed class Site
{
    private static readonly JsonSerializerOptions Options = new(JsonSerializerDefaults.Web) { UnmappedMemberHandling = System.Text.Json.Serialization.JsonUnmappedMemberHandling.Disallow };

    private Site(SteamGenerator generator, HistorySettings history, SiteLimits limits) => (Generator, History, Limits) = (generator, history, limits);

    public SteamGenerator Generator { get; }

    public HistorySettings History { get; }

    public SiteLimits Limits { get; }

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
        return new Site(generator, Settings<HistorySettings>(json, file, "history"), ToLimits(Settings<LimitSettings>(json, file, "limits"), file));
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

    private static SiteLimits ToLimits(LimitSettings settings, string file)
    {
        try
        {
            return settings.ToLimits();
        }
        catch (ArgumentException error)
        {
            throw new FileFault(file, "$.limits", error.Message);
        }
    }

    private static T Settings<T>(string json, string file, string member)
        where T : class, new()
    {
        using var document = JsonDocument.Parse(json, new() { CommentHandling = JsonCommentHandling.Skip, AllowTrailingCommas = true });
        if (!document.RootElement.TryGetProperty(member, out JsonElement settings)) return new T();
        try
        {
            return settings.Deserialize<T>(Options) ?? new T();
        }
        catch (JsonException error)
        {
            throw new FileFault(file, "$." + member + (error.Path is { Length: > 1 } path ? path[1..] : ""), error.Message.Split(" Path:")[0].TrimEnd('.'));
        }
    }
}
