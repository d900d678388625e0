using PassReport.Demo;
using PassReport.History;
using PassReport.Report;
using Spectre.Console;

namespace PassReport;

/// <summary>One run: read, infer, report.</summary>
internal sealed class Run(string? generatorFile, string? historyFile, string folder)
{
    private const string DemoGenerator = "generator.json";

    public void Do(TextWriter output, bool isTerminal)
    {
        Directory.CreateDirectory(folder);
        Site site = generatorFile is null ? Site.Parse(Embedded(DemoGenerator), DemoGenerator) : Site.Read(generatorFile);
        if (historyFile is null && generatorFile is not null) throw new FileFault(generatorFile, "", "a generator of your own needs its history: add --history FILE");
        string history = historyFile ?? Demo(site);

        var faults = new SampleFaults();
        IReadOnlyList<PassSummary> passes = [];
        IReadOnlyList<Margins> margins = [];
        IAnsiConsole console = AnsiConsole.Create(new AnsiConsoleSettings { Out = new AnsiConsoleOutput(output), Ansi = isTerminal ? AnsiSupport.Detect : AnsiSupport.No, Interactive = isTerminal ? InteractionSupport.Detect : InteractionSupport.No });
        if (!isTerminal) console.Profile.Width = 150;
        WithProgress(console, isTerminal, (reading, inferring, estimating, drawing) =>
        {
            HistoryTable table = HistoryReader.Read(history, site.History, site.Tags, faults, reading);
            PassSeries[] series = PassSeries.From(site.Generator, table, faults, history, inferring);
            Estimates.Find(site.Generator.Name, series, estimating);
            passes = Comparison.Of(series);
            drawing?.Report(0.3);
            margins = Margins.Of(passes, site.Limits);
            Figures.Write(folder, passes, margins, faults);
            drawing?.Report(0.6);
            Pictures.Write(folder, site.Generator.Name, passes);
            if (margins.Count == 0) return;
            Margins calmest = margins[^1];
            ProfilePicture.Write(folder, calmest.Pass);
            WallPicture.Write(folder, calmest);
            CharacteristicPicture.Write(folder, calmest);
            drawing?.Report(0.7);
            MapPicture.Write(folder, calmest);
        });
        if (generatorFile is null) console.WriteLine("Demonstration: generator, tags and history are invented.");
        Screen.Write(console, site.Generator.Name, passes, margins, faults, folder);
    }

    private string Demo(Site site)
    {
        string file = Path.Combine(folder, "invented-history.csv");
        DemoHistory.Write(site.Generator, file);
        return file;
    }

    private static void WithProgress(IAnsiConsole console, bool isTerminal, Action<IProgress<double>?, IProgress<double>?, IProgress<double>?, IProgress<double>?> work)
    {
        if (!isTerminal)
        {
            work(null, null, null, null);
            return;
        }

        console.Progress().AutoClear(true).Start(context =>
        {
            var tasks = new[] { "Reading the history", "Inferring quality", "Estimating what left the passes", "Drawing" }.Select(name => new Bar(context.AddTask(name, maxValue: 1))).ToArray();
            work(tasks[0], tasks[1], tasks[2], tasks[3]);
        });
    }

    private static string Embedded(string name)
    {
        using Stream stream = typeof(Run).Assembly.GetManifestResourceStream(name)!;
        using var reader = new StreamReader(stream);
        return reader.ReadToEnd();
    }

    private sealed class Bar(ProgressTask task) : IProgress<double>
    {
        public void Report(double value) => task.Value = value;
    }
}
