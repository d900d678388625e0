using System.Buffers;
using System.Buffers.Text;
using System.Globalization;
using System.Text;
using System.Text.Json;

namespace LivePasses.Tags;

/// <summary>One value of a tag as it travels: a JSON object, or a bare number.</summary>
/// <param name="Value">The value in the unit of the tag; NaN where the plant calls it bad or has none.</param>
/// <param name="Time">When it was measured; null where the message does not say.</param>
/// <param name="Unit">Unit that the message names; null where it names none.</param>
internal readonly record struct TagMessage(double Value, DateTimeOffset? Time, string? Unit)
{
    /// <summary>Longer messages are refused unread.</summary>
    public const int LongestPayload = 1024;

    // Years that a plant's clock can have; anything else is no time.
    private static readonly DateTimeOffset Earliest = new(1990, 1, 1, 0, 0, 0, TimeSpan.Zero), Latest = new(2200, 1, 1, 0, 0, 0, TimeSpan.Zero);

    /// <summary>Reads a payload. Never throws.</summary>
    /// <param name="payload">The payload.</param>
    /// <param name="message">What it says.</param>
    /// <param name="fault">Why it cannot be read; empty where it can.</param>
    public static bool TryRead(in ReadOnlySequence<byte> payload, out TagMessage message, out string fault)
    {
        message = default;
        fault = payload.Length > LongestPayload ? $"longer than {LongestPayload} bytes" : "";
        if (fault.Length > 0) return false;
        Span<byte> text = stackalloc byte[(int)payload.Length];
        payload.CopyTo(text);
        if (Utf8Parser.TryParse(text, out double bare, out int used) && used == text.Length && double.IsFinite(bare))
        {
            message = new(bare, null, null);
            return true;
        }

        try
        {
            var reader = new Utf8JsonReader(text);
            return TryRead(ref reader, out message, out fault);
        }
        catch (Exception error) when (error is JsonException or InvalidOperationException or FormatException)
        {
            fault = "no JSON object and no number";
            return false;
        }
    }

    /// <summary>The payload of a value.</summary>
    public static byte[] Payload(double value, string unit, DateTimeOffset time)
    {
        string number = double.IsFinite(value) ? value.ToString("R", CultureInfo.InvariantCulture) : "null";
        return Encoding.UTF8.GetBytes($"{{\"value\":{number},\"unit\":\"{JsonEncodedText.Encode(unit)}\",\"time\":\"{time.UtcDateTime:yyyy-MM-ddTHH:mm:ss.fffZ}\",\"status\":\"{(double.IsFinite(value) ? "good" : "bad")}\"}}");
    }

    private static bool TryRead(ref Utf8JsonReader reader, out TagMessage message, out string fault)
    {
        double? value = null;
        DateTimeOffset? time = null;
        string? unit = null;
        bool good = true, hasValue = false;
        (message, fault) = (default, "");
        if (!reader.Read() || reader.TokenType != JsonTokenType.StartObject) return Refuse(out fault, "no JSON object and no number");
        while (reader.Read() && reader.TokenType == JsonTokenType.PropertyName)
        {
            if (reader.ValueTextEquals("value"u8))
            {
                reader.Read();
                hasValue = true;
                value = reader.TokenType == JsonTokenType.Null ? null : reader.GetDouble();
            }
            else if (reader.ValueTextEquals("time"u8))
            {
                reader.Read();
                if (reader.TryGetDateTime(out DateTime plain) && plain.Kind == DateTimeKind.Unspecified) return Refuse(out fault, "its time has no offset");
                if (!reader.TryGetDateTimeOffset(out DateTimeOffset when) || when < Earliest || when > Latest) return Refuse(out fault, "its time is none of a plant");
                time = when;
            }
            else if (reader.ValueTextEquals("unit"u8))
            {
                reader.Read();
                unit = reader.GetString();
            }
            else if (reader.ValueTextEquals("status"u8))
            {
                reader.Read();
                good = reader.ValueTextEquals("good"u8);
            }
            else
            {
                reader.Skip();
            }
        }

        if (!hasValue) return Refuse(out fault, "it has no value");
        message = new(good && value is { } number && double.IsFinite(number) ? number : double.NaN, time, unit);
        return true;
    }

    private static bool Refuse(out string fault, string why)
    {
        fault = why;
        return false;
    }
}
