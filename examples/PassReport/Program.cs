using System.CommandLine;
using PassReport;
using Spectre.Console;

namespace PassReport;

/// <summary>The command line: what to read and where to write; faults of files become one line and an exit code.</summary>
internal static class Program
{
    private const int Done = 0, BadFile = 2;

    public static int Main(string[] args) => Run(args, Console.Out, Console.Error, !Console.IsOutputRedirected);

    /// <summary>The program as a function, so that tests run it as a user does.</summary>
    public static int Run(string[] args, TextWriter output, TextWriter error, bool isTerminal)
    {
        Option<FileInfo?> generator = new("--generator") { Description = "JSON file of the generator; the invented one when left out." };
        Option<FileInfo?> history = new("--history") { Description = "CSV file of its history; an invented day when left out." };
        Option<DirectoryInfo> folder = new("--out") { Description = "Folder for figures and pictures.", DefaultValueFactory = _ => new DirectoryInfo("out") };
        RootCommand command = new("Turns a history of flow, pressure and differential into the quality of every pass of a steam generator. Advisory only: no safety function.") { generator, history, folder };
        command.SetAction(parsed => Report(parsed.GetValue(generator)?.FullName, parsed.GetValue(history)?.FullName, parsed.GetValue(folder)!.FullName, output, error, isTerminal));
        return command.Parse(args).Invoke(new InvocationConfiguration { Output = output, Error = error });
    }

    private static int Report(string? generator, string? history, string folder, TextWriter output, TextWriter error, bool isTerminal)
    {
        try
        {
            new Run(generator, history, folder).Do(output, isTerminal);
            return Done;
        }
        catch (FileFault fault)
        {
            error.WriteLine(fault.Message);
            return BadFile;
        }
        catch (Exception fault) when (fault is IOException or UnauthorizedAccessException)
        {
            error.WriteLine(fault.Message);
            return BadFile;
        }
    }
}
