using System.Text.Json;
using System.Text.Json.Serialization;

namespace TwoPhase.Json;

/// <summary>The documents' readers and writers, generated at compile time so that trimmed and native programs can use them.</summary>
[JsonSourceGenerationOptions(
    PropertyNamingPolicy = JsonKnownNamingPolicy.CamelCase,
    UnmappedMemberHandling = JsonUnmappedMemberHandling.Disallow,
    DefaultIgnoreCondition = JsonIgnoreCondition.WhenWritingNull,
    ReadCommentHandling = JsonCommentHandling.Skip,
    AllowTrailingCommas = true,
    WriteIndented = true)]
[JsonSerializable(typeof(GeneratorDocument))]
internal sealed partial class DocumentContext : JsonSerializerContext;
