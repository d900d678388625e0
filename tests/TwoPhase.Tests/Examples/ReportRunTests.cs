using System.Globalization;
using PassReport;

namespace TwoPhase.Tests.Examples;

/// <summary>The example as a user runs it, on small files.</summary>
public sealed class ReportRunTests : IDisposable
{
    private const string Generator = """
        {
          "name": "Two",
          "site": { "atmosphericPressure": "93 kPa(a)" },
          "history": { "time": "time", "zone": "Europe/Berlin", "badValues": ["Broken"] },
          "passes": [
            { "name": "A", "meter": { "kind": "classicalVenturi", "pipe": "77.9 mm", "throat": "49 mm", "finish": "machined" }, "tags": { "feedFlow": "FA", "outletPressure": "PA", "differential": "DA" } },
            { "name": "B", "meter": { "kind": "classicalVenturi", "pipe": "77.9 mm", "throat": "49 mm", "finish": "machined" }, "tags": { "feedFlow": "FB", "outletPressure": "PA", "differential": "DB" } }
          ]
        }
        """;

    private const string Heading = "time,FA [t/h],PA [kPa(g)],DA [kPa],FB [lb/h],DB [inH2O at 60 degF]";

    private const string LongGenerator = """
        { "name": "Long", "history": { "holdSeconds": 30 },
          "passes": [ { "name": "A", "meter": { "kind": "siteConstant", "k": "2872 mm2" }, "tags": { "feedFlow": "FA [kg/s]", "outletPressure": "PA [MPa(a)]", "differential": "DA [kPa]" } } ] }
        """;

    private readonly string _folder = Directory.CreateTempSubdirectory("passreport").FullName;

    public void Dispose() => Directory.Delete(_folder, recursive: true);

    [Fact]
    public void Run_SimulatedFiringStep_ShowsTheFalseReading() => Culture.Run("de-DE", () =>
    {
        (int code, string output, string error) = Run(Data("one-pass.json"), Data("firing-step.csv"));
        Assert.Equal(("", 0), (error, code));
        Assert.Contains("The reading was false while inputs moved", output, StringComparison.Ordinal);
        Assert.Contains("after a move of the firing", output, StringComparison.Ordinal);
        Assert.DoesNotContain("\u001b", output, StringComparison.Ordinal);
        string[] move = File.ReadAllLines(Out("moves.csv"))[1].Split(',');
        Assert.InRange(double.Parse(move[6], CultureInfo.InvariantCulture), 0.02, 0.12);
        Assert.Contains("By the estimate", output, StringComparison.Ordinal);
        string[][] rows = [.. File.ReadAllLines(Out("quality.csv")).Select(line => line.Replace(", inputs moving", "", StringComparison.Ordinal).Split(','))];
        int read = Array.IndexOf(rows[0], "Pass quality [kg/kg]"), estimated = Array.IndexOf(rows[0], "Pass estimated [kg/kg]"), trust = Array.IndexOf(rows[0], "Pass trust");
        Assert.Contains(rows, row => row[trust] == "ReadsHigh");
        Assert.InRange(rows.Skip(100).Max(row => double.Parse(row[read], CultureInfo.InvariantCulture) - double.Parse(row[estimated], CultureInfo.InvariantCulture)), 0.04, 0.15);
        Assert.Contains("Boils from", output, StringComparison.Ordinal);
        Assert.Contains("never a substitute for tube-skin thermocouples or trips", output, StringComparison.Ordinal);
        Assert.Contains("It is for you to confirm", output, StringComparison.Ordinal);
        string[] limits = File.ReadAllLines(Out("limits.csv"));
        Assert.StartsWith("pass,limit,status,", limits[0], StringComparison.Ordinal);
        Assert.Contains(limits, line => line.Contains("critical quality", StringComparison.Ordinal) && line.Contains("Indicator", StringComparison.Ordinal));
        Assert.Contains(limits, line => line.Contains("metal temperature", StringComparison.Ordinal) && line.Contains("no limit of metal temperature is given", StringComparison.Ordinal));
        string[] heading = File.ReadAllLines(Out("passes.csv"))[0].Split(','), row = File.ReadAllLines(Out("passes.csv"))[1].Split(',');

        // What the model that made the readings holds at the end: 1550.68 kg.
        Assert.InRange(double.Parse(row[Array.IndexOf(heading, "water_held_kg")], CultureInfo.InvariantCulture), 1550.68 * 0.9, 1550.68 * 1.1);
        foreach (string name in new[] { "quality", "inputs", "models", "profile", "walls", "characteristic", "map" })
        {
            Assert.True(new FileInfo(Out(name + ".png")).Length > 5000);
            Assert.StartsWith("<?xml", File.ReadAllText(Out(name + ".svg")), StringComparison.Ordinal);
        }
    });

    [Fact]
    public void Run_EndsWhileInputsMove_ShowsNoInterior()
    {
        // A row every 5 s: the history stops two minutes after the firing has reached 106 %.
        string[] lines = File.ReadAllLines(Data("firing-step.csv"));
        string[] begun = lines[..(Array.FindIndex(lines, line => line.Split(',')[3] == "106.00") + 24)];
        (int code, string output, string error) = Run(Data("one-pass.json"), Write("h.csv", begun));
        Assert.Equal(("", 0), (error, code));
        Assert.Contains("is left out: still moving", output, StringComparison.Ordinal);
        Assert.DoesNotContain("Boils from", output, StringComparison.Ordinal);
    }

    [Fact]
    public void Run_FaultySamples_AreCountedWithRowAndColumnAndSkipped()
    {
        string history = Write("h.csv", Heading,
            "2031-05-14T12:00:00,17.28,9507,41.6,38096,167.2",
            "2031-05-14T12:00:10,Broken,9507,41.6,38096,167.2",
            "2031-05-14T12:00:20,,9507,what,38096,167.2",
            "2031-05-14T12:00:15,17.28,9507,41.6,38096,167.2",
            "14/05/2031 12:00,17.28,9507,41.6,38096,167.2",
            "2031-05-14T12:00:30,-17.28,9507,41.6,38096",
            "2031-05-14T12:00:40,17.28,9507,NaN,1e999,167.2");
        (int code, string output, string error) = Run(Write("g.json", Generator), history);
        Assert.Equal(("", 0), (error, code));
        string[] faults = File.ReadAllLines(Out("faults.csv"));
        foreach (string expected in new[] { "3,FA,a bad-value word,Broken", "4,FA,blank,", "4,DA,not a number,what", "5,time,time going backwards,2031-05-14T12:00:15", "6,time,time not readable,14/05/2031 12:00", "7,DB,row too short,", "7,FA,out of range,-17.28", "8,DA,not a number,NaN", "8,FB,not a number,1e999" }) Assert.Contains(expected, faults);
        Assert.Contains("9 samples were skipped", output, StringComparison.Ordinal);
        string[] quality = File.ReadAllLines(Out("quality.csv"));
        Assert.Equal(6, quality.Length);
        Assert.StartsWith("2031-05-14T12:00:00+02:00,0.7", quality[1], StringComparison.Ordinal);
    }

    [Fact]
    public void Run_PressureAndDifferentialSwapped_CountsEachSample()
    {
        string history = Write("h.csv", Heading, "2031-05-14T12:00:00,17.28,41.6,9507,38096,167.2", "2031-05-14T12:00:10,0,9507,41.6,38096,167.2");
        (int code, string output, _) = Run(Write("g.json", Generator), history);
        Assert.Equal(0, code);
        string[] faults = File.ReadAllLines(Out("faults.csv"));
        Assert.Contains("2,DA,out of range,9507", faults);
        Assert.Contains("3,FA,out of range,0", faults);
        Assert.Contains("Advisory only", output, StringComparison.Ordinal);
    }

    [Fact]
    public void Run_RepeatedAndMissingHour_AreToldApart()
    {
        string rows = ",17.28,9507,41.6,38096,167.2";
        string history = Write("h.csv", Heading, "2031-03-30T01:59:50" + rows, "2031-03-30T02:30:00" + rows, "2031-03-30T03:00:00" + rows,
            "2031-10-26T02:59:50" + rows, "2031-10-26T02:00:00" + rows, "2031-10-26T03:00:00" + rows);
        Assert.Equal(0, Run(Write("g.json", Generator), history).Code);
        Assert.Contains("3,time,time that the clock skipped,2031-03-30T02:30:00", File.ReadAllLines(Out("faults.csv")));
        string[] times = [.. File.ReadAllLines(Out("quality.csv")).Skip(1).Select(line => line.Split(',')[0])];
        Assert.Equal(["2031-03-30T01:59:50+01:00", "2031-03-30T03:00:00+02:00", "2031-10-26T02:59:50+02:00", "2031-10-26T02:00:00+01:00", "2031-10-26T03:00:00+01:00"], times);
    }

    [Fact]
    public void Run_LongForm_HoldsValuesAndHonoursStatus()
    {
        string history = Write("h.csv", "time,tag,value,status",
            "2031-05-14T12:00:00Z,FA,4.8,Good", "2031-05-14T12:00:00Z,PA,9.6,Good", "2031-05-14T12:00:01Z,DA,41.6,Good",
            "2031-05-14T12:00:10Z,DA,41.6,Uncertain", "2031-05-14T12:00:20Z,DA,41.7,Good", "2031-05-14T12:01:00Z,DA,41.8,Good", "2031-05-14T12:01:00Z,OTHER,1,Good");
        (int code, _, string error) = Run(Write("g.json", LongGenerator), history);
        Assert.Equal(("", 0), (error, code));
        Assert.Contains("5,DA,flagged by its status,Uncertain", File.ReadAllLines(Out("faults.csv")));
        string[] status = [.. File.ReadAllLines(Out("quality.csv")).Skip(1).Select(line => line.Split(',')[2])];
        Assert.Equal(["Missing", "WetSteam", "Missing", "WetSteam", "Missing"], status);
    }

    // A spreadsheet's export: semicolons, decimal commas, days before months, units in round brackets. The same numbers as written the ISO way.
    [Fact]
    public void Run_SpreadsheetExport_ReadsAsTheIsoFileDoes()
    {
        string[] rows = ["17.28,9507,41.6,38096,167.2", "17.31,9508,41.7,38100,167.4"];
        string iso = Write("iso.csv", Heading, "2031-05-14T12:00:00," + rows[0], "2031-05-14T12:00:10," + rows[1]);
        Assert.Equal(0, Run(Write("g.json", Generator), iso).Code);
        string expected = File.ReadAllText(Out("quality.csv"));
        string sheet = Write("sheet.csv", "time;FA (t/h);PA (kPa(g));DA (kPa);FB (lb/h);DB (inH2O at 60 degF)",
            "14.05.2031 12:00:00;" + rows[0].Replace(',', ';').Replace('.', ','), "14.05.2031 12:00:10;" + rows[1].Replace(',', ';').Replace('.', ','));
        string settings = Generator.Replace("\"time\": \"time\",", "\"timeFormat\": \"dd.MM.yyyy HH:mm:ss\", \"decimalComma\": true,", StringComparison.Ordinal);
        (int code, _, string error) = Run(Write("s.json", settings), sheet);
        Assert.Equal(("", 0), (error, code));
        Assert.Equal(expected, File.ReadAllText(Out("quality.csv")));
    }

    [Theory]
    [InlineData("\"timeFormat\": \"MM/dd/yyyy HH:mm zzz\",", "05/14/2031 12:00 -07:00", "2031-05-14T12:00:00-07:00")]
    [InlineData("\"timeFormat\": \"M/d/yyyy h:mm:ss tt\",", "5/14/2031 1:02:03 PM", "2031-05-14T13:02:03+02:00")]
    public void Run_TimeFormat_TellsMonthFromDay(string setting, string stamp, string expected)
    {
        string settings = Generator.Replace("\"time\": \"time\",", setting, StringComparison.Ordinal);
        (int code, _, string error) = Run(Write("g.json", settings), Write("h.csv", Heading, stamp + ",17.28,9507,41.6,38096,167.2"));
        Assert.Equal(("", 0), (error, code));
        Assert.StartsWith(expected + ",", File.ReadAllLines(Out("quality.csv"))[1], StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("", "05/14/2031 12:00", "h.csv, row 2: no row has a time that can be read; '05/14/2031 12:00' is not ISO 8601")]
    [InlineData("\"timeFormat\": \"dd.MM.yyyy\",", "05/14/2031 12:00", "is not written as \"dd.MM.yyyy\"")]
    [InlineData("no zone", "2031-05-14T12:00:00", "has no offset; name its zone")]
    public void Run_UnreadableTimes_AreShownWithTheWayOut(string setting, string stamp, string expected)
    {
        string settings = setting == "no zone" ? Generator.Replace("\"zone\": \"Europe/Berlin\", ", "", StringComparison.Ordinal) : Generator.Replace("\"time\": \"time\",", setting, StringComparison.Ordinal);
        IsOneLine(Run(Write("g.json", settings), Write("h.csv", Heading, stamp + ",17.28,9507,41.6,38096,167.2")), expected);
    }

    [Theory]
    [InlineData("FA [t/h]", "FX [t/h]", "h.csv, row 1: there is no column 'FA'")]
    [InlineData("FA [t/h]", "FA [furlong]", "Tag 'FA': unit 'furlong'")]
    [InlineData("FA [t/h]", "FA [m3/h]", "Tag 'FA': unit 'm3/h' is a volume flow and its base density is not given")]
    [InlineData("FA [t/h]", "FA", "Tag 'FA': has no unit")]
    [InlineData("PA [kPa(g)]", "PA [kPa]", "Tag 'PA': unit 'kPa' does not say whether it is gauge or absolute")]
    [InlineData("DA [kPa]", "DA [kPa(g)]", "Tag 'DA'")]
    [InlineData("DA [kPa]", "FA [kPa]", "h.csv, row 1: ")]
    public void Run_FaultyHeading_IsOneLineAndAnExitCode(string right, string wrong, string expected)
    {
        string history = Write("h.csv", Heading.Replace(right, wrong, StringComparison.Ordinal), "2031-05-14T12:00:00,17.28,9507,41.6,38096,167.2");
        IsOneLine(Run(Write("g.json", Generator), history), expected);
    }

    [Theory]
    [InlineData("\"throat\": \"49 mm\"", "\"throat\": \"90 mm\"", "g.json: $.passes[0].meter.throat: ")]
    [InlineData("\"name\": \"Two\",", "\"name\": \"Two\", \"limits\": { \"outletQuality\": 80 },", "g.json, $.limits: Limit of outlet quality = 80 must lie between 0 and 1")]
    [InlineData("\"name\": \"Two\",", "\"name\": \"Two\", \"limits\": { \"quality\": 0.8 },", "g.json, $.limits")]
    [InlineData("\"name\": \"Two\",", "\"name\": \"Two\", \"limits\": { \"solids\": [{ \"name\": \"silica\", \"feed\": -1, \"outlet\": 3 }] },", "Feed concentration of 'silica' = -1 mg/L")]
    [InlineData("\"name\": \"Two\",", "\"name\": \"Two\"", "g.json: line 3, column ")]
    [InlineData("\"zone\": \"Europe/Berlin\"", "\"zone\": \"Nowhere/Town\"", "time zone 'Nowhere/Town'")]
    [InlineData("\"zone\"", "\"zoom\"", "g.json, $.history")]
    [InlineData("\"feedFlow\": \"FA\", ", "", "g.json, $.passes[0].tags.feedFlow")]
    [InlineData("\"feedFlow\": \"FA\"", "\"feedFlow\": \"FA [lb/h]\"", "which is it?")]
    public void Run_FaultyGenerator_IsOneLineAndAnExitCode(string right, string wrong, string expected)
    {
        int at = Generator.IndexOf(right, StringComparison.Ordinal);
        string json = Generator[..at] + wrong + Generator[(at + right.Length)..];
        IsOneLine(Run(Write("g.json", json), Write("h.csv", Heading, "2031-05-14T12:00:00,17.28,9507,41.6,38096,167.2")), expected);
    }

    [Fact]
    public void Run_EmptyOrAbsentFiles_AreOneLineAndAnExitCode()
    {
        string good = Write("g.json", Generator);
        IsOneLine(Run(good, Write("e.csv")), "e.csv: the file is empty");
        IsOneLine(Run(good, Write("o.csv", Heading)), "o.csv: no row has a time that can be read");
        IsOneLine(Run(good, Path.Combine(_folder, "absent.csv")), "absent.csv: there is no such file");
        IsOneLine(Run(Write("e.json"), good), "e.json: the file is empty");
        IsOneLine(Run(Write("b.json", "not json"), good), "b.json: line 1, column ");
    }

    private static void IsOneLine((int Code, string Output, string Error) run, string expected)
    {
        Assert.NotEqual(0, run.Code);
        Assert.Equal("", run.Output);
        Assert.Contains(expected, run.Error, StringComparison.Ordinal);
        Assert.Single(run.Error.TrimEnd().Split('\n'));
    }

    private (int Code, string Output, string Error) Run(string generator, string history)
    {
        using var output = new StringWriter();
        using var error = new StringWriter();
        int code = Program.Run(["--generator", generator, "--history", history, "--out", Path.Combine(_folder, "out")], output, error, isTerminal: false);
        // The table wraps sentences to the width of the page.
        return (code, string.Join(" ", output.ToString().Split([' ', '\n', '\r'], StringSplitOptions.RemoveEmptyEntries)), error.ToString());
    }

    private static string Data(string name) => Path.Combine(AppContext.BaseDirectory, "Examples", "Data", name);

    private string Out(string name) => Path.Combine(_folder, "out", name);

    private string Write(string name, params string[] lines)
    {
        string file = Path.Combine(_folder, name);
        File.WriteAllLines(file, lines);
        return file;
    }
}
