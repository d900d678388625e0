using System.Globalization;
using Spectre.Console;
using TrueQuality;

string folder = args.Length > 0 ? args[0] : "out";
Directory.CreateDirectory(folder);
Outcome[] outcomes = [.. Trial.All.AsParallel().AsOrdered().Select(Outcome.Of)];

// A pipe has no width of its own.
if (Console.IsOutputRedirected) AnsiConsole.Profile.Width = 120;
Console.WriteLine("Quality of an invented pass: how far the reading, and the estimate, are from the truth");
var table = new Table().MinimalBorder();
foreach (string column in (string[])["what happens", "reading rms", "worst", "estimate rms", "worst", "within 2 u", "called false", "disagree from"]) table.AddColumn(column);
foreach (Outcome outcome in outcomes)
{
    table.AddRow(
        outcome.Trial.Name,
        Number(outcome.ReadingRms, "F4"),
        Number(outcome.ReadingWorst, "F3"),
        Number(outcome.EstimateRms, "F4"),
        Number(outcome.EstimateWorst, "F3"),
        Number(100 * outcome.Covered, "F0") + " %",
        outcome.CalledFalse == 0 ? "" : $"{outcome.CalledFalse} s",
        outcome.DisagreesFrom is { } second ? $"{second} s" : "");
}

AnsiConsole.Write(table);
Console.WriteLine("From 300 s on. Everything here is invented: the plant is a simulation whose slip, bore and heat split are not those that the estimator is told.");
Console.WriteLine("A drift of the meter and one of the heat look the same from one pass: the estimate then stands between both ends and says so.");
Console.WriteLine("Advisory only: no trip, no limit and no test is replaced by it; those follow the plant's codes and licensed operators.");
foreach (Outcome outcome in outcomes) Console.WriteLine($"wrote {Picture.Write(outcome, folder)}");

static string Number(double value, string format) => value.ToString(format, CultureInfo.InvariantCulture);
