using System.Text.Json;
using TwoPhase.Advisory;
using TwoPhase.Units;

namespace TwoPhase.Json;

/// <summary>Saved states of estimators as JSON documents: named numbers, in full.</summary>
public static class EstimatorJson
{
    /// <summary>Writes a state so that <see cref="Read"/> gives it back to the last bit.</summary>
    /// <param name="state">The state.</param>
    public static string Write(EstimatorState state) => JsonSerializer.Serialize(EstimatorDocument.Of(Require.NotNull(state, nameof(state))), EstimatorContext.Default.EstimatorDocument);

    /// <summary>Reads a state.</summary>
    /// <param name="json">The document.</param>
    /// <exception cref="DocumentException">The text is no such document, or of another version of the library.</exception>
    public static EstimatorState Read(string json)
    {
        Require.NotNull(json, nameof(json));
        try
        {
            return (JsonSerializer.Deserialize(json, EstimatorContext.Default.EstimatorDocument) ?? throw new DocumentException("$", "the document is null", null)).Read();
        }
        catch (JsonException error)
        {
            throw DocumentException.Of(error);
        }
    }
}
