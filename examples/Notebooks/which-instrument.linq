<Query Kind="Statements">
  <NuGetReference>TwoPhase</NuGetReference>
  <Namespace>TwoPhase.Advisory</Namespace>
  <Namespace>TwoPhase.Passes</Namespace>
  <Namespace>TwoPhase.Metering</Namespace>
  <Namespace>UnitsNet</Namespace>
</Query>

// Which instrument disagrees with the others? Three invented passes, a separator and the absorbed heat; the differential of the second pass reads 8 % low.
var meter = new QualityMeter(new ClassicalVenturi(Length.FromMillimeters(77.9), Length.FromMillimeters(48), ConvergentFinish.Machined), WetSteamModel.Homogeneous);
var generator = new SteamGenerator("invented", Enumerable.Range(1, 3).Select(i => new Pass($"Pass {i}", []).WithMeter(meter)));
var pressure = Pressure.FromMegapascals(9.2);
var flow = MassFlow.FromKilogramsPerSecond(4.6);
var differential = meter.Differential(flow, pressure, MassFraction.FromPercent(78));

var readings = new GeneratorMeasurements(generator)
    .WithHeaderPressure(pressure, Pressure.FromKilopascals(20))
    .WithFeedTemperature(Temperature.FromDegreesCelsius(168), TemperatureDelta.FromKelvins(0.5))
    .WithTotalFeed(flow * 3, flow * 0.015)
    .WithSeparatorSteam(flow * (3 * 0.78), flow * 0.03)
    .WithSeparatorWater(flow * (3 * 0.22), flow * 0.01);
for (int i = 0; i < 3; i++)
{
    readings = readings
        .WithFeedFlow(i, flow, flow * 0.005)
        .WithDifferential(i, differential * (i == 1 ? 0.92 : 1), differential * 0.01)
        .WithAbsorbedHeat(i, Power.FromMegawatts(7.93), Power.FromMegawatts(0.08));
}

ReconciledGenerator result = GeneratorReconciliation.Solve(readings);
result.Dump("reconciled");
result.Faults.Select(fault => fault.ToString()).Dump("the most likely fault, or the set that cannot be told apart");
