using System.Text.Json.Serialization;

namespace TwoPhase.Json;

/// <summary>Reader and writer of saved states: compact, since nobody reads their thousands of numbers.</summary>
[JsonSourceGenerationOptions(
    PropertyNamingPolicy = JsonKnownNamingPolicy.CamelCase,
    UnmappedMemberHandling = JsonUnmappedMemberHandling.Disallow,
    NumberHandling = JsonNumberHandling.AllowNamedFloatingPointLiterals)]
[JsonSerializable(typeof(EstimatorDocument))]
internal sealed partial class EstimatorContext : JsonSerializerContext;
