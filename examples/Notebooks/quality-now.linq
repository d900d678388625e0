<Query Kind="Statements">
  <NuGetReference>TwoPhase</NuGetReference>
  <Namespace>TwoPhase.Metering</Namespace>
  <Namespace>UnitsNet</Namespace>
</Query>

// What is the quality now, how well is it known, and what do other wet-steam models make of the same reading? The numbers are invented.
var venturi = new ClassicalVenturi(Length.FromMillimeters(77.9), Length.FromMillimeters(49), ConvergentFinish.Machined);
var meter = new QualityMeter(venturi, WetSteamModel.Homogeneous);
var flow = MassFlow.FromKilogramsPerSecond(4.8);
var pressure = Pressure.FromMegapascals(9.6);
var differential = Pressure.FromKilopascals(41.6);

meter.Quality(flow, pressure, differential).Dump("the reading");
meter.QualityWithUncertainty(flow, pressure, differential, new MeteringUncertainty(flow: Ratio.FromPercent(0.8), differential: Pressure.FromKilopascals(0.25), pressure: Pressure.FromKilopascals(20)))
    .Dump("with its uncertainty: which instrument to improve");
meter.CompareModels(flow, pressure, differential).Dump("the same differential by every model that applies: look at the spread before you act");
