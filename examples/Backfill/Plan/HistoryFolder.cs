namespace Backfill.Plan;

/// <summary>The folder of the history: day=…/pass=…/ with one file each, Parquet or CSV.</summary>
internal sealed class HistoryFolder
{
    private HistoryFolder(string root, string[] passes, DateOnly first, DateOnly last) => (Root, Passes, First, Last) = (root, passes, first, last);

    public string Root { get; }

    /// <summary>The passes that have a file on any day, in the order of the generator.</summary>
    public IReadOnlyList<string> Passes { get; }

    public DateOnly First { get; }

    public DateOnly Last { get; }

    public static HistoryFolder Scan(string root, IReadOnlyList<string> known)
    {
        if (!Directory.Exists(root)) throw new FileFault(root, "there is no such folder");
        DateOnly first = DateOnly.MaxValue, last = DateOnly.MinValue;
        HashSet<string> found = [];
        foreach (string folder in Directory.EnumerateDirectories(root))
        {
            if (Partition.DayOf(folder) is not { } day) continue;
            (first, last) = (day < first ? day : first, day > last ? day : last);
            found.UnionWith(Directory.EnumerateDirectories(folder).Select(Partition.PassOf).OfType<string>());
        }

        if (found.Count == 0) throw new FileFault(root, "there is nothing in it that is laid out as day=2031-03-04/pass=1");
        string? strange = found.Except(known).Order(StringComparer.Ordinal).FirstOrDefault();
        if (strange is not null) throw new FileFault(root, $"there is a pass '{strange}', and the generator has {string.Join(", ", known.Select(static name => $"'{name}'"))}");
        return new(root, [.. known.Where(found.Contains)], first, last);
    }

    /// <summary>The file of a partition; null where there is none.</summary>
    public string? FileOf(Partition partition)
    {
        string folder = Path.Combine(Root, partition.Folder);
        if (!Directory.Exists(folder)) folder = Path.Combine(Root, partition.PlainFolder);
        if (!Directory.Exists(folder)) return null;
        string[] files = [.. Directory.EnumerateFiles(folder).Where(IsReadings)];
        return files.Length <= 1 ? files.FirstOrDefault() : throw new FileFault(folder, $"there are {files.Length} files, and which is the history?");
    }

    // What begins with a dot or an underscore belongs to whoever wrote the folder.
    private static bool IsReadings(string file) =>
        Path.GetFileName(file)[0] is not ('.' or '_') && Path.GetExtension(file).ToUpperInvariant() is ".PARQUET" or ".CSV";
}
