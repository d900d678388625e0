using Backfill.Plan;

namespace Backfill.Tests;

public sealed class PlanTests : IDisposable
{
    private readonly string _folder = Directory.CreateTempSubdirectory("backfill").FullName;

    public void Dispose() => Directory.Delete(_folder, recursive: true);

    // Whoever has only a part of the history must cut it where the others do.
    [Fact]
    public void Chains_OfAPartOfTheHistory_EndWhereThoseOfTheWholeDo()
    {
        ChainPlan plan = new(7, 2);
        Chain[] whole = [.. plan.Chains(History("whole", 4, 31, "a", "b"), Share.All)], part = [.. plan.Chains(History("part", 13, 31, "a"), Share.All)];
        Assert.Equal(Enumerable.Range(4, 28), whole.Where(static chain => chain.Pass == "a").SelectMany(static chain => Enumerable.Range(chain.First.Day, chain.Days)));
        Assert.All(whole.Where(static chain => chain.First.Day > 4), static chain => Assert.Equal(2, chain.First.DayNumber - chain.WarmUpFrom.DayNumber));
        Assert.Equal(whole[0].First, whole[0].WarmUpFrom);
        Assert.Equal(part.Select(static chain => chain.Last), whole.Where(chain => chain.Pass == "a" && chain.Last.Day >= 13).Select(static chain => chain.Last));
        Assert.Equal([new Chain("a", new(2031, 3, 13), new(2031, 3, 31), new(2031, 3, 13))], new ChainPlan(0, 2).Chains(History("part", 13, 31, "a"), Share.All));
    }

    [Fact]
    public void Shares_Together_AreAllChainsOnce()
    {
        HistoryFolder history = History("shared", 4, 31, "a", "b", "c");
        ChainPlan plan = new(5, 1);
        Assert.Equal(
            plan.Chains(history, Share.All).OrderBy(static chain => (chain.First, chain.Pass)),
            Enumerable.Range(1, 4).SelectMany(i => plan.Chains(history, Share.TryParse($"{i}/4")!.Value)).OrderBy(static chain => (chain.First, chain.Pass)));
    }

    [Theory]
    [InlineData("1"), InlineData("Pass 1"), InlineData("north/2"), InlineData("50 %=half"), InlineData("øst")]
    public void PassOf_TheFolderOfAPass_IsThatPass(string pass)
    {
        Partition partition = new(new(2031, 3, 4), pass);
        Assert.Equal((partition.Day, pass), (Partition.DayOf(partition.DayFolder)!.Value, Partition.PassOf(partition.PassFolder)));
        Assert.Equal(partition.PassFolder, Path.GetFileName(partition.Folder));
    }

    [Fact]
    public void FileOf_TwoFilesOrNone_SaysSo()
    {
        HistoryFolder history = History("files", 4, 5, "a");
        Partition first = new(new(2031, 3, 4), "a");
        Assert.Null(history.FileOf(first));
        string folder = Path.Combine(history.Root, first.Folder);
        foreach (string name in new[] { "_SUCCESS", ".part.parquet.crc", "notes.txt", "part-0.snappy.PARQUET" }) File.WriteAllText(Path.Combine(folder, name), "");
        Assert.EndsWith("part-0.snappy.PARQUET", history.FileOf(first)!, StringComparison.Ordinal);
        File.WriteAllText(Path.Combine(folder, "part-1.csv"), "");
        Assert.Equal("pass=a: there are 2 files, and which is the history?", Assert.Throws<FileFault>(() => history.FileOf(first)).Message);
    }

    private HistoryFolder History(string name, int first, int last, params string[] passes)
    {
        string root = Path.Combine(_folder, name);
        foreach (int day in new[] { first, last })
        {
            foreach (string pass in passes) Directory.CreateDirectory(Path.Combine(root, new Partition(new(2031, 3, day), pass).Folder));
        }

        return HistoryFolder.Scan(root, passes);
    }
}
