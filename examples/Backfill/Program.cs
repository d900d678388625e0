using System.CommandLine;
using Backfill.Commands;
using Backfill.Work;
using Spectre.Console;

namespace Backfill;

/// <summary>The command line; what is wrong with files becomes a line and an exit code.</summary>
internal static class Program
{
    private const int Done = 0, Refused = 2, Gaps = 3, Stopped = 130;

    public static Task<int> Main(string[] args) => RunAsync(args, Console.Out, Console.Error, !Console.IsOutputRedirected);

    /// <summary>The program as a function, so that tests run it as a user does.</summary>
    public static Task<int> RunAsync(string[] args, TextWriter output, TextWriter error, bool isTerminal)
    {
        IAnsiConsole console = AnsiConsole.Create(new AnsiConsoleSettings { Out = new AnsiConsoleOutput(output), Ansi = isTerminal ? AnsiSupport.Detect : AnsiSupport.No, Interactive = isTerminal ? InteractionSupport.Detect : InteractionSupport.No });
        if (!isTerminal) console.Profile.Width = 160;
        RootCommand command = new("Estimates the true outlet quality of every pass over a history of years. Advisory only: no safety function.")
        {
            RunOptions.Command((settings, token) => Guard(error, () => EstimateAsync(settings, console, error, isTerminal, token))),
            MakingOptions.Command("generate", "Makes a part of an invented year: six passes, a row a second, its truth apart.", (settings, token) => Guard(error, async () =>
            {
                await new HistoryMaking(settings, console, isTerminal).DoAsync(token);
                return Done;
            })),
            MakingOptions.Command("demo", "Makes a part of the invented year, estimates it and compares with its truth.", (settings, token) => Guard(error, async () =>
            {
                await new HistoryMaking(settings, console, isTerminal).DoAsync(token);
                int code = await EstimateAsync(RunOptions.Defaults(settings.Folder, settings.Threads), console, error, isTerminal, token);
                await new Comparison(settings.Folder, console).DoAsync(token);
                return code;
            })),
            CompareCommand((folder, token) => Guard(error, async () =>
            {
                await new Comparison(folder, console).DoAsync(token);
                return Done;
            })),
        };
        return command.Parse(args).InvokeAsync(new InvocationConfiguration { Output = output, Error = error });
    }

    private static async Task<int> EstimateAsync(RunSettings settings, IAnsiConsole console, TextWriter error, bool isTerminal, CancellationToken cancellation)
    {
        Tally tally = await new BackfillRun(settings, console, isTerminal).DoAsync(cancellation);
        foreach ((string partition, string reason) in tally.Bad) await error.WriteLineAsync($"{partition}: {reason}");
        return tally.Bad.Count > 0 ? Gaps : Done;
    }

    private static Command CompareCommand(Func<DemoFolder, CancellationToken, Task<int>> action)
    {
        Argument<DirectoryInfo> folder = new("folder") { Description = "Folder that 'generate' made and 'run' estimated." };
        Command command = new("compare", "Says how far reading and estimate are from the truth of an invented history.") { folder };
        command.SetAction((parsed, token) => action(new(parsed.GetValue(folder)!.FullName), token));
        return command;
    }

    private static async Task<int> Guard(TextWriter error, Func<Task<int>> work)
    {
        try
        {
            return await work();
        }
        catch (Exception fault) when (fault is FileFault or IOException or InvalidDataException or UnauthorizedAccessException)
        {
            await error.WriteLineAsync(fault.Message);
            return Refused;
        }
        catch (OperationCanceledException)
        {
            await error.WriteLineAsync("Stopped; the same command goes on from here.");
            return Stopped;
        }
    }
}
