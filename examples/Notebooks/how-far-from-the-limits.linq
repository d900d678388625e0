<Query Kind="Statements">
  <NuGetReference>TwoPhase</NuGetReference>
  <Namespace>TwoPhase.Limits</Namespace>
  <Namespace>TwoPhase.Passes</Namespace>
  <Namespace>TwoPhase.Stability</Namespace>
  <Namespace>UnitsNet</Namespace>
</Query>

// How far is the pass from dryout, from its solids limit, from flow instability? An invented pass; the limits are the site's to confirm.
var pass = new Pass("1", [Tubes("bank").AsConvective(), Tubes("coil")]).WithConvectiveShare(Ratio.FromPercent(42));
var conditions = new PassConditions(MassFlow.FromKilogramsPerSecond(4.6), Temperature.FromDegreesCelsius(168), Pressure.FromMegapascals(9.2), Power.FromMegawatts(8));
PassProfile profile = SteadyState.Solve(pass, conditions);

PassLimits.Of(profile).Select(limit => limit.ToString()).Dump("the site's own limit of quality first");
DensityWave.Of(profile, Pressure.FromKilopascals(200)).Dump("density waves, with 200 kPa across the feed valve");
FlowCharacteristic.Of(pass, conditions, MassFlow.FromKilogramsPerSecond(2.5), MassFlow.FromKilogramsPerSecond(7), 10)
    .Select(point => point.ToString())
    .Dump("pressure drop against flow: a falling branch would invite an excursion");

static TubeSection Tubes(string name) => new(name, Length.FromMillimeters(77.9), Length.FromMillimeters(88.9), Length.FromMeters(330));
