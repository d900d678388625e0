using LargeMoves;
using Spectre.Console;

string folder = args.Length > 0 ? args[0] : "out";
Directory.CreateDirectory(folder);

// A pipe has no width of its own.
if (Console.IsOutputRedirected) AnsiConsole.Profile.Width = 150;
Console.WriteLine("An invented pass, simulated: what large and small moves do to it, to its meter, and to what stands downstream");
var courses = new Courses();
courses.Print();
string[] pictures = [.. courses.Draw(folder), .. Atlas.Write(folder)];
Console.WriteLine("Everything here is invented. Times from the start of each run, steps from the step.");
foreach (string caution in courses.Cautions) Console.WriteLine(caution);
foreach (string picture in pictures) Console.WriteLine($"wrote {picture}");
