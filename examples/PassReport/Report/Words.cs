using System.Globalization;

namespace PassReport.Report;

/// <summary>Numbers as the report writes them, the same in every culture.</summary>
internal static class Words
{
    public static string Number(double value, string format) => double.IsFinite(value) ? value.ToString(format, CultureInfo.InvariantCulture) : "–";

    /// <summary>Points of quality: hundredths, with their sign.</summary>
    public static string Points(double difference) => double.IsFinite(difference) ? (100 * difference).ToString("+0.0;−0.0;0.0", CultureInfo.InvariantCulture) : "–";

    public static string Size(double difference) => Number(100 * Math.Abs(difference), "0.0");

    public static string Share(double share) => Number(100 * share, share is > 0 and < 0.1 ? "0.0" : "0") + " %";

    public static string Time(DateTimeOffset time) => time.ToString("yyyy-MM-dd HH:mm zzz", CultureInfo.InvariantCulture);

    public static string Length(TimeSpan span) => span.TotalHours >= 48 ? Number(span.TotalDays, "0.#") + " days" : span.TotalHours >= 2 ? Number(span.TotalHours, "0.#") + " h" : Number(span.TotalMinutes, "0.#") + " min";

    public static string Count(int number, string one, string many) => $"{number.ToString(CultureInfo.InvariantCulture)} {(number == 1 ? one : many)}";

    public static string Listed(IEnumerable<string> names)
    {
        string[] all = [.. names];
        return all.Length < 2 ? string.Concat(all) : string.Join(", ", all[..^1]) + " and " + all[^1];
    }
}
