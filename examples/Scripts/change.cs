#:project ../../src/TwoPhase/TwoPhase.csproj
#:property RestorePackagesWithLockFile=false
#:property RestoreLockedMode=false

// What a change of firing does to an invented pass, as CSV:   dotnet run examples/Scripts/change.cs -- 105 > change.csv
// Put your pass in its place. It shows physics and is no operating procedure.
using System.Globalization;
using TwoPhase.Dynamics;
using TwoPhase.Metering;
using TwoPhase.Passes;
using UnitsNet;

double percent = args.Length > 0 ? double.Parse(args[0], CultureInfo.InvariantCulture) : 105;
var meter = new QualityMeter(new ClassicalVenturi(Length.FromMillimeters(77.9), Length.FromMillimeters(48), ConvergentFinish.Machined), WetSteamModel.Homogeneous);
var pass = new Pass("1", [Tubes("bank").AsConvective(), Tubes("coil")]).WithConvectiveShare(Ratio.FromPercent(42)).WithMeter(meter);
var rest = new PassConditions(MassFlow.FromKilogramsPerSecond(4.6), Temperature.FromDegreesCelsius(168), Pressure.FromMegapascals(9.2), Power.FromMegawatts(8));
OperatingSchedule schedule = new OperatingSchedule(rest).StepFiring(Duration.FromMinutes(1), Ratio.FromPercent(percent));

PassHistory history = new PassSimulator(pass, rest).Run(schedule, Duration.FromMinutes(25));
Console.Error.WriteLine(history.Figures(MassFraction.FromPercent(1)));
history.Resample(Duration.FromSeconds(10)).WriteCsv(Console.Out);

static TubeSection Tubes(string name) => new(name, Length.FromMillimeters(77.9), Length.FromMillimeters(88.9), Length.FromMeters(330));
