using System.Globalization;

namespace Backfill.Plan;

/// <summary>One day (UTC) of one pass: what is read, estimated and put in place as a whole.</summary>
internal readonly record struct Partition(DateOnly Day, string Pass)
{
    private const string DayKey = "day=", PassKey = "pass=", DayFormat = "yyyy-MM-dd";

    public string DayFolder => DayKey + Day.ToString(DayFormat, CultureInfo.InvariantCulture);

    public string PassFolder => PassKey + Uri.EscapeDataString(Pass);

    public string Folder => Path.Combine(DayFolder, PassFolder);

    /// <summary>The folder as one finds it where names are not escaped.</summary>
    public string PlainFolder => Path.Combine(DayFolder, PassKey + Pass);

    public DateTime Start => Day.ToDateTime(TimeOnly.MinValue, DateTimeKind.Utc);

    public override string ToString() => $"{DayFolder}/{PassFolder}";

    /// <summary>The day that a folder is of; null for a folder of something else.</summary>
    public static DateOnly? DayOf(string folder)
    {
        string name = Path.GetFileName(folder);
        if (!name.StartsWith(DayKey, StringComparison.Ordinal)) return null;
        return DateOnly.TryParseExact(name[DayKey.Length..], DayFormat, CultureInfo.InvariantCulture, DateTimeStyles.None, out DateOnly day)
            ? day
            : throw new FileFault(folder, $"this is no day written {DayFormat}");
    }

    /// <summary>The pass that a folder is of; null for a folder of something else.</summary>
    public static string? PassOf(string folder)
    {
        string name = Path.GetFileName(folder);
        return name.StartsWith(PassKey, StringComparison.Ordinal) ? Uri.UnescapeDataString(name[PassKey.Length..]) : null;
    }
}
