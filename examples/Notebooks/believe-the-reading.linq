<Query Kind="Statements">
  <NuGetReference>TwoPhase</NuGetReference>
  <Namespace>TwoPhase.Advisory</Namespace>
  <Namespace>TwoPhase.Dynamics</Namespace>
  <Namespace>TwoPhase.Metering</Namespace>
  <Namespace>TwoPhase.Passes</Namespace>
  <Namespace>UnitsNet</Namespace>
</Query>

// Can the reading be believed, and if not, what is the real quality? A simulated, invented pass raises its firing from 90 to 95 % after 15 minutes.
// Its flow has some noise, as every plant's has: one that stands still to the last digit for ten minutes is called frozen.
// Advisory only: no trip, no limit and no test is replaced.
var meter = new QualityMeter(new ClassicalVenturi(Length.FromMillimeters(77.9), Length.FromMillimeters(48), ConvergentFinish.Machined), WetSteamModel.Homogeneous);
var pass = new Pass("1", [Tubes("bank").AsConvective(), Tubes("coil")]).WithConvectiveShare(Ratio.FromPercent(42)).WithMeter(meter);
var rest = new PassConditions(MassFlow.FromKilogramsPerSecond(4.6), Temperature.FromDegreesCelsius(168), Pressure.FromMegapascals(9.2), Power.FromMegawatts(8));
var plant = new PassSimulator(pass, rest);
var estimator = new QualityEstimator(pass, meter);
var random = new Random(1);
var start = new DateTimeOffset(2031, 3, 9, 8, 0, 0, TimeSpan.Zero);

var lines = new List<object>();
for (int second = 1; second <= 1800; second++)
{
    double firing = second > 900 ? 0.95 : 0.90;
    PassInstant now = plant.Advance(rest.WithAbsorbedHeat(rest.AbsorbedHeat * (decimal)(firing / 0.90)), Duration.FromSeconds(1));
    var reading = new PassReading(start.AddSeconds(second), now.FeedFlow * Noisy(), now.Differential).WithOutletPressure(now.OutletPressure).WithFeedTemperature(rest.FeedTemperature).WithFiring(Ratio.FromDecimalFractions(firing));
    QualityEstimate estimate = estimator.Update(reading);
    if (second >= 840 && second % 60 == 0) lines.Add(new { Estimate = estimate.ToString(), True = Math.Round(now.TrueQuality.DecimalFractions, 3) });
}

lines.Dump("what it reads, what it is, and the truth of the simulation");

double Noisy() => 1 + (0.002 * (random.NextDouble() - 0.5));
static TubeSection Tubes(string name) => new(name, Length.FromMillimeters(77.9), Length.FromMillimeters(88.9), Length.FromMeters(330));
