using System.Text.Json;

namespace LivePasses;

/// <summary>How everything that is published is written.</summary>
internal static class LiveJson
{
    public static JsonSerializerOptions Options { get; } = new(JsonSerializerDefaults.Web);
}
