<Query Kind="Statements">
  <NuGetReference>TwoPhase</NuGetReference>
  <Namespace>TwoPhase.Boiling</Namespace>
  <Namespace>TwoPhase.Holdup</Namespace>
  <Namespace>TwoPhase.Passes</Namespace>
  <Namespace>UnitsNet</Namespace>
</Query>

// Where does boiling start, how much water stands in the pass, what does the pass cost in pressure? An invented pass.
var pass = new Pass("1", [Tubes("bank").AsConvective(), Tubes("coil")]).WithConvectiveShare(Ratio.FromPercent(42));
var conditions = new PassConditions(MassFlow.FromKilogramsPerSecond(4.6), Temperature.FromDegreesCelsius(168), Pressure.FromMegapascals(9.2), Power.FromMegawatts(8));
PassProfile profile = SteadyState.Solve(pass, conditions);

profile.ToString().Dump("the pass at rest");
profile.PressureDrop.Dump("pressure drop by its causes");
BoilingOnset.Of(profile).Dump("where boiling begins");
WaterHoldup.Of(profile).Dump("water and steam in the pass");
WaterHoldup.OfEveryModel(profile)
    .Select(holdup => new { Slip = holdup.Slip.Name, Kilograms = Math.Round(holdup.Total.Kilograms, 1) })
    .Dump("the same by every slip model: they do not agree");

static TubeSection Tubes(string name) => new(name, Length.FromMillimeters(77.9), Length.FromMillimeters(88.9), Length.FromMeters(330));
