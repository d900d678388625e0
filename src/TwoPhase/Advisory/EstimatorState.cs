using System.Globalization;
using System.Text;
using System.Text.Json;
using TwoPhase.Units;

namespace TwoPhase.Advisory;

/// <summary>Everything that an estimator needs to go on where it stood, after a restart or on another machine: named numbers, as a JSON document.</summary>
/// <remarks>
/// <para><c>{"version":2,"fields":{"clock.now":[63902822400],"heat.factor":[0.0123]}}</c>, to the last bit; NaN and infinities as texts.</para>
/// <para>Good for the same pass, meter and options in the same version of the library.</para>
/// </remarks>
public sealed class EstimatorState
{
    // Changes with every change of what is saved.
    private const int Version = 2;

    internal EstimatorState(IEnumerable<KeyValuePair<string, double[]>> fields) => Fields = [.. fields];

    /// <summary>The fields in the order in which they were listed.</summary>
    internal IReadOnlyList<KeyValuePair<string, double[]>> Fields { get; }

    internal object ToDump() => ToString();

    /// <summary>The JSON document, in one line.</summary>
    public override string ToString()
    {
        using MemoryStream text = new();
        using (Utf8JsonWriter json = new(text))
        {
            json.WriteStartObject();
            json.WriteNumber("version", Version);
            json.WriteStartObject("fields");
            foreach (KeyValuePair<string, double[]> field in Fields)
            {
                json.WriteStartArray(field.Key);
                foreach (double number in field.Value) Write(json, number);
                json.WriteEndArray();
            }

            json.WriteEndObject();
            json.WriteEndObject();
        }

        return Encoding.UTF8.GetString(text.ToArray());
    }

    /// <summary>A state from its document.</summary>
    /// <param name="text">What <see cref="ToString"/> wrote.</param>
    /// <exception cref="FormatException">The text is no such document, or of another version of the library; the message says which.</exception>
    public static EstimatorState Parse(string text)
    {
        Require.NotNull(text, nameof(text));
        try
        {
            using JsonDocument document = JsonDocument.Parse(text);
            JsonElement root = document.RootElement;
            if (root.GetProperty("version").GetInt32() is int version && version != Version)
                throw new FormatException(FormattableString.Invariant($"A saved state of version {version} is not of this library, which writes version {Version}."));
            return new([.. root.GetProperty("fields").EnumerateObject().Select(static field => new KeyValuePair<string, double[]>(field.Name, [.. field.Value.EnumerateArray().Select(Read)]))]);
        }
        catch (Exception fault) when (fault is JsonException or KeyNotFoundException or InvalidOperationException)
        {
            throw new FormatException($"This is no saved state: {fault.Message}", fault);
        }
    }

    private static void Write(Utf8JsonWriter json, double number)
    {
        if (Numerics.Fast.IsFinite(number)) json.WriteNumberValue(number);
        else json.WriteStringValue(number.ToString(CultureInfo.InvariantCulture));
    }

    private static double Read(JsonElement number) =>
        number.ValueKind == JsonValueKind.String ? double.Parse(number.GetString()!, CultureInfo.InvariantCulture) : number.GetDouble();
}
