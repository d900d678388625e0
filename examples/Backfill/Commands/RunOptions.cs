using System.CommandLine;
using Backfill.Plan;

namespace Backfill.Commands;

/// <summary>The options of <c>run</c>.</summary>
internal static class RunOptions
{
    private const int WarmUpDays = 1;

    /// <summary>What is done when nothing is said but the folder.</summary>
    public static RunSettings Defaults(DemoFolder folder, int threads) =>
        new(folder.Generator, folder.History, folder.Estimates, threads, new(0, WarmUpDays), Share.All);

    public static Command Command(Func<RunSettings, CancellationToken, Task<int>> action)
    {
        Argument<DirectoryInfo> folder = new("folder") { Description = "Folder with generator.json and history/; estimates/ is made in it." };
        Option<FileInfo?> generator = new("--generator") { Description = "Another generator file." };
        Option<DirectoryInfo?> history = new("--history") { Description = "Another folder of history: day=2031-03-04/pass=1/ with one Parquet or CSV file each." };
        Option<DirectoryInfo?> output = new("--out") { Description = "Another folder of estimates; where it has some, the run goes on." };
        Option<int> threads = Number("--threads", "Partitions at a time.", Environment.ProcessorCount, 1);
        Option<int> chainDays = Number("--chain-days", "Days of one pass that one worker after the other goes through; 0 for all.", 0, 0);
        Option<int> warmUp = Number("--warm-up-days", "Days read before a chain that begins in the middle.", WarmUpDays, 0);
        Option<string> share = new("--share") { Description = "Part of the chains that this process does: 2/5 for the second of five.", DefaultValueFactory = _ => Share.All.ToString() };
        share.Validators.Add(static result =>
        {
            if (Share.TryParse(result.GetValueOrDefault<string>() ?? "") is null) result.AddError($"--share '{result.GetValueOrDefault<string>()}' must be written 2/5, for the second of five.");
        });
        Command command = new("run", "Estimates a history, or goes on where a run was stopped.") { folder, generator, history, output, threads, chainDays, warmUp, share };
        command.SetAction((parsed, token) =>
        {
            RunSettings usual = Defaults(new(parsed.GetValue(folder)!.FullName), parsed.GetValue(threads));
            return action(
                usual with
                {
                    Generator = parsed.GetValue(generator)?.FullName ?? usual.Generator,
                    History = parsed.GetValue(history)?.FullName ?? usual.History,
                    Output = parsed.GetValue(output)?.FullName ?? usual.Output,
                    Plan = new(parsed.GetValue(chainDays), parsed.GetValue(warmUp)),
                    Share = Share.TryParse(parsed.GetValue(share)!)!.Value,
                },
                token);
        });
        return command;
    }

    public static Option<int> Number(string name, string description, int usual, int least, int most = int.MaxValue)
    {
        Option<int> option = new(name) { Description = description, DefaultValueFactory = _ => usual };
        option.Validators.Add(result =>
        {
            if (result.GetValueOrDefault<int>() is var value && (value < least || value > most))
                result.AddError(FormattableString.Invariant($"{name} {value} must {(most == int.MaxValue ? $"be at least {least}" : $"lie between {least} and {most}")}."));
        });
        return option;
    }
}
