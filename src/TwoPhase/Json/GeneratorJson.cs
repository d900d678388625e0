using System.Text.Encodings.Web;
using System.Text.Json;
using TwoPhase.Passes;
using TwoPhase.Units;

namespace TwoPhase.Json;

/// <summary>
/// Generators as JSON documents. Quantities are texts with their unit, <c>"77.9 mm"</c>, in invariant culture; tags are
/// <c>"FT-101 [m3/d at 15 degC]"</c>. Comments and trailing commas are allowed; a member that is not known is an error.
/// </summary>
public static class GeneratorJson
{
    // Units read °C and m³ in the file as they do on the drawing; the text is never put into a web page unescaped.
    private static readonly DocumentContext Context = new(new JsonSerializerOptions(DocumentContext.Default.Options) { Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping, NewLine = "\n" });

    /// <summary>Reads a generator.</summary>
    /// <param name="json">The document.</param>
    /// <exception cref="DocumentException">The text is no JSON, or a member is missing, unknown or wrong; the message has the JSON path.</exception>
    public static SteamGenerator Read(string json)
    {
        Require.NotNull(json, nameof(json));
        try
        {
            return (JsonSerializer.Deserialize(json, Context.GeneratorDocument) ?? throw new DocumentException("$", "the document is null", null)).Read();
        }
        catch (JsonException error)
        {
            throw DocumentException.Of(error);
        }
    }

    /// <summary>Writes a generator so that <see cref="Read"/> gives it back.</summary>
    /// <param name="generator">The generator.</param>
    public static string Write(SteamGenerator generator) =>
        JsonSerializer.Serialize(GeneratorDocument.Of(Require.NotNull(generator, nameof(generator))), Context.GeneratorDocument);
}
