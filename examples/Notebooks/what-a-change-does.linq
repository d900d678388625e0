<Query Kind="Statements">
  <NuGetReference>TwoPhase</NuGetReference>
  <Namespace>TwoPhase.Dynamics</Namespace>
  <Namespace>TwoPhase.Metering</Namespace>
  <Namespace>TwoPhase.Passes</Namespace>
  <Namespace>UnitsNet</Namespace>
</Query>

// What will a change do: to the real quality, to the reading, to the water pushed out, and for how long? An invented pass, five changes.
var meter = new QualityMeter(new ClassicalVenturi(Length.FromMillimeters(77.9), Length.FromMillimeters(48), ConvergentFinish.Machined), WetSteamModel.Homogeneous);
var pass = new Pass("1", [Tubes("bank").AsConvective(), Tubes("coil")]).WithConvectiveShare(Ratio.FromPercent(42)).WithMeter(meter);
var rest = new PassConditions(MassFlow.FromKilogramsPerSecond(4.6), Temperature.FromDegreesCelsius(168), Pressure.FromMegapascals(9.2), Power.FromMegawatts(8));
var still = new OperatingSchedule(rest);
var minute = Duration.FromMinutes(1);

new Dictionary<string, OperatingSchedule>
{
    ["firing +5 %"] = still.StepFiring(minute, Ratio.FromPercent(105)),
    ["feed flow -5 %"] = still.StepFeedFlow(minute, rest.FeedFlow * 0.95),
    ["feed 10 K warmer"] = still.StepFeedTemperature(minute, rest.FeedTemperature!.Value + TemperatureDelta.FromKelvins(10)),
    ["header -0.1 MPa in 1 min"] = still.RampOutletPressure(minute, minute, rest.OutletPressure - Pressure.FromMegapascals(0.1)),
    ["convective share +2 points in 5 min"] = still.RampConvectiveShare(minute, 5 * minute, Ratio.FromPercent(44)),
}
.Select(change => new { Change = change.Key, Figures = new PassSimulator(pass, rest).Run(change.Value, Duration.FromMinutes(25)).Figures(MassFraction.FromPercent(1)).ToString() })
.Dump("the figures that matter; a reading is called false beyond one point");

static TubeSection Tubes(string name) => new(name, Length.FromMillimeters(77.9), Length.FromMillimeters(88.9), Length.FromMeters(330));
