using Spectre.Console;
using TwoPhase.Dynamics;
using TwoPhase.Passes;
using UnitsNet;

namespace LargeMoves;

/// <summary>Light-off at two header pressures, a trip of the firing, and a loss of feed flow.</summary>
internal sealed class Courses
{
    private readonly LightOffReport _low, _high;
    private readonly FiringTripReport _trip;
    private readonly FlowLossReport _loss;

    public Courses()
    {
        (_low, _high) = (LightOff(2), LightOff(9.6));
        PassConditions running = Plant.Running(9.6);
        _trip = new FiringTrip(running, Duration.FromMinutes(14), Plant.Transmitter(running)).Run(Plant.Pass);
        _loss = new FlowLoss(running, Ratio.FromPercent(50), Duration.FromSeconds(20), transmitter: Plant.Transmitter(running)).Run(Plant.Pass);
    }

    public IEnumerable<string> Cautions => new CourseReport[] { _low, _trip, _loss }.SelectMany(report => report.Cautions).Distinct();

    public void Print()
    {
        Table table = Figures.New("light-off of a warm pass", "2 MPa", "9.6 MPa");
        Row("first boiling", report => Figures.Minutes(report.FirstBoiling));
        Row("largest outlet flow", report => Figures.Number(report.PeakOutletFlow.KilogramsPerSecond, "F1") + " kg/s at " + Figures.Minutes(report.TimeOfPeak));
        Row("downstream half boils", report => Figures.Minutes(report.DownstreamHalfBoils));
        Row("surge over", report => Figures.Minutes(report.SurgeOver));
        Row("surge, mass", report => Figures.Number(report.MassSurge.Kilograms, "F0") + " kg");
        Row("surge, volume", report => Figures.Number(report.VolumeSurge.CubicMeters, "F2") + " m³");
        Row("largest flow of liquid", report => Figures.Number(report.PeakLiquidFlow.CubicMetersPerHour, "F0") + " m³/h");
        Row("transmitter at its ceiling", report => report.AtCeiling.Count == 0 ? "not reached" : Figures.Minutes(Duration.FromSeconds(report.AtCeiling.Sum(span => (span.To - span.From).Seconds))));
        Row("reading serves from", report => Figures.Minutes(report.ReadingServes));
        Row("steady", report => Figures.Minutes(report.Steady));
        AnsiConsole.Write(table);

        table = Figures.New("at 9.6 MPa", "trip of the firing", "half the feed lost in 20 s");
        table.AddRow("outlet flow", $"down to {Figures.Number(_trip.LowestOutletFlow.KilogramsPerSecond, "F2")} kg/s", $"up to {Figures.Number(_loss.PeakOutletFlow.KilogramsPerSecond, "F2")} kg/s");
        table.AddRow("water", $"{Figures.Number(_trip.Refilled.Kilograms, "F0")} kg taken up", $"{Figures.Number(_loss.BoiledOut.Kilograms, "F0")} kg boiled out");
        table.AddRow("ends", $"quenched after {After(_trip.Quenched, _trip.Course.FireOut)}", $"dryout after {After(_loss.DryoutReached, _loss.Course.FlowFalls)}");
        table.AddRow("metal", $"cools by {Figures.Number(_trip.MetalCooling.DegreesCelsiusPerMinute, "F0")} K/min", "not told beyond dryout");
        table.AddRow("reading", $"off by {Figures.Number(_trip.Figures.PeakError!.Value.DecimalFractions, "F2")}", $"off by +{Figures.Number(_loss.Figures.PeakError!.Value.DecimalFractions, "F2")}");
        AnsiConsole.Write(table);

        void Row(string what, Func<LightOffReport, string> figure) => table.AddRow(what, figure(_low), figure(_high));
    }

    public IEnumerable<string> Draw(string folder)
    {
        yield return new Strips([Column(_low, "2 MPa"), Column(_high, "9.6 MPa")]).Heat().Flow().Holdup().Quality(-0.4, 1.2).Write(folder, "light-off");
        yield return new Strips(
        [
            new("Fire out, feed on: the pass fills and is quenched", _trip.History, 15, (_trip.Course.FireOut.Minutes, "fire out"), (_trip.Quenched!.Value.Minutes, "quenched")),
            new("Half the feed lost, fire on: stopped at dryout", _loss.History, 4, (_loss.Course.FlowFalls.Minutes, "feed falls"), (_loss.DryoutReached!.Value.Minutes, "dryout")),
        ]).Flow().Holdup().Quality(-0.6, 1.6).Temperatures().Write(folder, "trip-and-flow-loss");
    }

    private static LightOffReport LightOff(double megapascals)
    {
        PassConditions running = Plant.Running(megapascals);
        return new LightOff(running, Ratio.FromPercent(15), Duration.FromMinutes(10), Duration.FromMinutes(20)).WithTransmitter(Plant.Transmitter(running)).Run(Plant.Pass);
    }

    private static Strips.Column Column(LightOffReport report, string header) => new(
        $"Light-off at {header}: {Figures.Number(report.MassSurge.Kilograms / 1000, "F1")} t of water thrown out",
        report.History,
        45,
        (report.FirstBoiling!.Value.Minutes, "first boiling"),
        (report.SurgeOver!.Value.Minutes, "surge over"));

    private static string After(Duration? time, Duration since) => time is { } at ? Figures.Minutes(at - since) : "never";
}
