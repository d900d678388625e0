using System.CommandLine;
using System.Globalization;

namespace Backfill.Commands;

/// <summary>The options of <c>generate</c> and <c>demo</c>.</summary>
internal static class MakingOptions
{
    public static Command Command(string name, string description, Func<MakingSettings, CancellationToken, Task<int>> action)
    {
        Argument<DirectoryInfo> folder = new("folder") { Description = "Folder to make it in." };
        Option<string> start = new("--start") { Description = "First day, UTC.", DefaultValueFactory = static _ => "2031-03-04" };
        start.Validators.Add(static result =>
        {
            if (Day(result.GetValueOrDefault<string>()) is null) result.AddError($"--start '{result.GetValueOrDefault<string>()}' must be a day written 2031-03-04.");
        });
        Option<int> days = RunOptions.Number("--days", "How many days.", 1, 1, 3660), passes = RunOptions.Number("--passes", "How many of the six passes.", 6, 1, 6);
        Option<int> every = RunOptions.Number("--every", "Seconds from row to row.", 1, 1, 60);
        Option<int> minutes = RunOptions.Number("--minutes", "Only so many minutes after and before each midnight; 720 for all.", 720, 1, 720);
        Option<int> seed = RunOptions.Number("--seed", "Another year for another number.", 1, 0);
        Option<bool> csv = new("--csv") { Description = "Readings as CSV in place of Parquet." };
        Option<int> threads = RunOptions.Number("--threads", "Partitions at a time.", Environment.ProcessorCount, 1);
        Command command = new(name, description) { folder, start, days, passes, every, minutes, seed, csv, threads };
        command.SetAction((parsed, token) => action(
            new(new(parsed.GetValue(folder)!.FullName), Day(parsed.GetValue(start))!.Value, parsed.GetValue(days), parsed.GetValue(passes), parsed.GetValue(every), parsed.GetValue(minutes), parsed.GetValue(seed), parsed.GetValue(csv), parsed.GetValue(threads)),
            token));
        return command;
    }

    private static DateOnly? Day(string? text) =>
        DateOnly.TryParseExact(text, "yyyy-MM-dd", CultureInfo.InvariantCulture, DateTimeStyles.None, out DateOnly day) ? day : null;
}
