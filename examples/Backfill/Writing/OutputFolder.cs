using Backfill.Plan;
using TwoPhase.Advisory;

namespace Backfill.Writing;

/// <summary>
/// The output, laid out as the history is. A partition is a folder that appears whole, by one renaming: estimates, and the estimator's state at its
/// end. What a killed run leaves behind has another name, and is swept away when the partition is begun again.
/// </summary>
internal sealed class OutputFolder(string root)
{
    public const string EstimatesFile = "estimates.parquet";

    private const string StateFile = "_state.txt", GapFile = "_gap.txt";

    public string Root { get; } = root;

    public bool IsDone(Partition partition) => Directory.Exists(Final(partition));

    /// <summary>What the estimator knew at the end of a partition; null where it knew nothing yet.</summary>
    public EstimatorState? StateAfter(Partition partition)
    {
        string file = Path.Combine(Final(partition), StateFile);
        try
        {
            return File.Exists(file) ? EstimatorState.Parse(File.ReadAllText(file)) : null;
        }
        catch (FormatException)
        {
            throw new InvalidDataException($"{partition}/{StateFile} is no state of an estimator. Remove the folders of the pass from that day on.");
        }
    }

    /// <summary>Why a partition has no estimates; null where it has.</summary>
    public string? GapOf(Partition partition)
    {
        string file = Path.Combine(Final(partition), GapFile);
        return File.Exists(file) ? File.ReadAllText(file).TrimEnd('\n') : null;
    }

    /// <summary>Begins a partition: where to write until it is whole.</summary>
    public string Begin(Partition partition)
    {
        string aside = Aside(partition);
        if (Directory.Exists(aside)) Directory.Delete(aside, recursive: true);
        return Directory.CreateDirectory(aside).FullName;
    }

    /// <summary>Puts a partition in its place.</summary>
    public void Complete(Partition partition, EstimatorState? state, string? gap)
    {
        if (state is not null) Write(Path.Combine(Aside(partition), StateFile), state.ToString() + "\n");
        if (gap is not null) Write(Path.Combine(Aside(partition), GapFile), gap + "\n");
        Directory.Move(Aside(partition), Final(partition));
    }

    /// <summary>Takes a partition away, whole or not.</summary>
    public void Forget(Partition partition)
    {
        if (!IsDone(partition)) return;
        Begin(partition);
        Directory.Delete(Aside(partition));
        Directory.Move(Final(partition), Aside(partition));
        Directory.Delete(Aside(partition), recursive: true);
    }

    private static void Write(string file, string text)
    {
        using var stream = File.Create(file);
        stream.Write(System.Text.Encoding.UTF8.GetBytes(text));
        stream.Flush(flushToDisk: true);
    }

    private string Final(Partition partition) => Path.Combine(Root, partition.Folder);

    private string Aside(Partition partition) => Path.Combine(Root, partition.DayFolder, $"_{partition.PassFolder}.partial");
}
