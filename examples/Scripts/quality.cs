#:project ../../src/TwoPhase/TwoPhase.csproj
#:property RestorePackagesWithLockFile=false
#:property RestoreLockedMode=false

// Quality of one reading:   dotnet run examples/Scripts/quality.cs -- 4.8 kg/s 9.6 MPa 41.6 kPa
// The pressure is absolute. The meter is invented: a machined venturi of 77.9 mm with a throat of 49 mm. Put yours in its place. Advisory only.
using System.Globalization;
using TwoPhase.Metering;
using UnitsNet;

if (args.Length is not (0 or 6)) throw new ArgumentException("Six words are wanted: flow, unit, absolute pressure, unit, differential, unit.");
string[] words = args.Length == 6 ? args : ["4.8", "kg/s", "9.6", "MPa", "41.6", "kPa"];
var flow = MassFlow.Parse($"{words[0]} {words[1]}", CultureInfo.InvariantCulture);
var pressure = Pressure.Parse($"{words[2]} {words[3]}", CultureInfo.InvariantCulture);
var differential = Pressure.Parse($"{words[4]} {words[5]}", CultureInfo.InvariantCulture);

var meter = new QualityMeter(new ClassicalVenturi(Length.FromMillimeters(77.9), Length.FromMillimeters(49), ConvergentFinish.Machined), WetSteamModel.Homogeneous);
Console.WriteLine(meter.Quality(flow, pressure, differential));
Console.WriteLine(meter.CompareModels(flow, pressure, differential));
