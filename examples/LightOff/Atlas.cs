using Spectre.Console;
using TwoPhase.Dynamics;
using TwoPhase.Passes;
using UnitsNet;

namespace LargeMoves;

/// <summary>Small steps of everything that moves a pass, down and up.</summary>
internal static class Atlas
{
    private const double At = 60, Length = 15 * 60;

    public static (string File, string Down, string Up, Func<OperatingSchedule, double, OperatingSchedule> Step)[] All { get; } =
    [
        ("firing", "Firing -5 %", "Firing +5 %", (still, sign) => still.StepFiring(Time, Ratio.FromPercent(100 + (5 * sign)))),
        ("feed-flow", "Feed flow -5 %", "Feed flow +5 %", (still, sign) => still.StepFeedFlow(Time, still.Start.FeedFlow * (1 + (0.05 * sign)))),
        ("feed-temperature", "Feed 10 K colder", "Feed 10 K warmer", (still, sign) => still.StepFeedTemperature(Time, still.Start.FeedTemperature!.Value + TemperatureDelta.FromKelvins(10 * sign))),
        ("header-pressure", "Header -0.1 MPa", "Header +0.1 MPa", (still, sign) => still.RampOutletPressure(Time, Duration.FromSeconds(10), still.Start.OutletPressure + Pressure.FromMegapascals(0.1 * sign))),
        ("convective-share", "Convection -2 points", "Convection +2 points", (still, sign) => still.StepConvectiveShare(Time, Ratio.FromPercent(42 + (2 * sign)))),
    ];

    private static Duration Time => Duration.FromSeconds(At);

    public static IEnumerable<string> Write(string folder)
    {
        PassConditions running = Plant.Running(9.6);
        Table table = Figures.New("step at 9.6 MPa", "true ends", "reading off by", "at", "by over 0.01 for", "pushed out", "outlet flow up to", "error area", "by outlet flow", "by holdup");
        var pictures = new List<string>();
        foreach ((string file, string down, string up, Func<OperatingSchedule, double, OperatingSchedule> step) in All)
        {
            PassHistory[] histories = [.. new[] { -1.0, 1 }.AsParallel().AsOrdered().Select(sign => Run(step(new(running), sign)))];
            Row(table, down, histories[0]);
            Row(table, up, histories[1]);
            pictures.Add(new Strips([Column(down, histories[0]), Column(up, histories[1])]).Quality().Flow().Holdup().Onset().Write(folder, "step-" + file));
        }

        AnsiConsole.Write(table);
        return pictures;
    }

    private static PassHistory Run(OperatingSchedule schedule) => new PassSimulator(Plant.Pass, schedule.Start).Run(schedule, Duration.FromSeconds(Length));

    private static Strips.Column Column(string step, PassHistory history)
    {
        TransientFigures figures = history.Figures(MassFraction.FromPercent(1));
        double error = figures.PeakError!.Value.DecimalFractions;
        return new($"{step}: reads up to {Figures.Number(Math.Abs(error), "F2")} too {(error > 0 ? "high" : "low")}, false for {Figures.Minutes(figures.TimeFalse)}", history, Length / 60, (At / 60, "step"));
    }

    private static void Row(Table table, string name, PassHistory history)
    {
        TransientFigures figures = history.Figures(MassFraction.FromPercent(1));
        table.AddRow(
            name,
            Figures.Signed(history[^1].TrueQuality.DecimalFractions - history[0].TrueQuality.DecimalFractions, 3),
            Figures.Signed(figures.PeakError!.Value.DecimalFractions, 3),
            Figures.Minutes(figures.TimeOfPeakError - Time),
            Figures.Minutes(figures.TimeFalse),
            Figures.Signed(figures.WaterPushedOut.Kilograms, 1) + " kg",
            Figures.Signed(100 * (figures.PeakOutletRatio - 1), 1) + " %",
            Figures.Signed(figures.AreaUnderError, 1) + " s",
            Figures.Signed(figures.AreaByOutletFlow, 1) + " s",
            Figures.Signed(figures.AreaByHoldup, 1) + " s");
    }
}
