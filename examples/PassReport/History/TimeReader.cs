using System.Globalization;

namespace PassReport.History;

/// <summary>
/// Reads time stamps: ISO 8601 or the format that is given, with an offset or as local time of a zone; or seconds counted from a start.
/// One reader per stream of samples, since the repeated hour of a clock change can only be told apart by the order of the samples.
/// </summary>
internal sealed class TimeReader(TimeZoneInfo? zone, DateTimeOffset? start, string? format, NumberFormatInfo numbers)
{
    // Ticks of year 1 and of year 9999 overflow as soon as an offset is applied.
    private static readonly DateTime Earliest = new(1900, 1, 1), Latest = new(2200, 1, 1);

    private DateTimeOffset _last = DateTimeOffset.MinValue;

    /// <summary>The time, or the fault that it has.</summary>
    public SampleFault? Read(string text, out DateTimeOffset time)
    {
        SampleFault? fault = start is { } zero ? Elapsed(text, zero, out time) : Stamp(text.Trim(), out time);
        if (fault is not null) return fault;
        if (time < _last) return SampleFault.TimeBackwards;
        _last = time;
        return null;
    }

    private SampleFault? Elapsed(string text, DateTimeOffset zero, out DateTimeOffset time)
    {
        time = zero;
        if (!double.TryParse(text, NumberStyles.Float, numbers, out double seconds) || !(Math.Abs(seconds) < 1e10)) return SampleFault.TimeUnreadable;
        time = zero.AddTicks((long)Math.Round(seconds * TimeSpan.TicksPerSecond));
        return null;
    }

    private SampleFault? Stamp(string text, out DateTimeOffset time)
    {
        time = default;
        if (!TryParse(text, out DateTime stamp) || stamp < Earliest || stamp > Latest) return SampleFault.TimeUnreadable;
        if (stamp.Kind != DateTimeKind.Unspecified)
        {
            time = format is null ? DateTimeOffset.Parse(text, CultureInfo.InvariantCulture) : DateTimeOffset.ParseExact(text, format, CultureInfo.InvariantCulture, DateTimeStyles.AllowWhiteSpaces);
            return null;
        }

        if (zone is null) return SampleFault.TimeWithoutZone;
        if (zone.IsInvalidTime(stamp)) return SampleFault.TimeSkippedByClock;
        time = zone.IsAmbiguousTime(stamp) ? Repeated(stamp, zone) : new DateTimeOffset(stamp, zone.GetUtcOffset(stamp));
        return null;
    }

    private bool TryParse(string text, out DateTime stamp) => format is null
        ? DateTime.TryParse(text, CultureInfo.InvariantCulture, DateTimeStyles.RoundtripKind, out stamp) && LooksLikeIso(text)
        : DateTime.TryParseExact(text, format, CultureInfo.InvariantCulture, DateTimeStyles.AllowWhiteSpaces, out stamp);

    /// <summary>The first of the two possible times that is not before the sample before it.</summary>
    private DateTimeOffset Repeated(DateTime stamp, TimeZoneInfo local)
    {
        TimeSpan[] offsets = [.. local.GetAmbiguousTimeOffsets(stamp).OrderDescending()];
        var first = new DateTimeOffset(stamp, offsets[0]);
        return first >= _last ? first : new DateTimeOffset(stamp, offsets[^1]);
    }

    // The parser also takes 3/4/2031, which is April to some and March to others.
    private static bool LooksLikeIso(string text) => text.Length >= 16 && text[4] == '-' && text[7] == '-' && text[10] is 'T' or ' ' && char.IsAsciiDigit(text[0]);
}
