using System;
using TwoPhase.Advisory;
using TwoPhase.Dynamics;
using TwoPhase.Json;
using TwoPhase.Metering;
using TwoPhase.Passes;
using TwoPhase.Steam;
using UnitsNet;

namespace Packed
{
    // One call of every room, printed the same by every runtime.
    internal static class Program
    {
        private static void Main()
        {
            ClassicalVenturi venturi = new ClassicalVenturi(Length.FromMillimeters(77.9), Length.FromMillimeters(49.0), ConvergentFinish.Machined);
            QualityMeter meter = new QualityMeter(venturi, WetSteamModel.Homogeneous);
            MeteringUncertainty instruments = new MeteringUncertainty(Ratio.FromPercent(0.8), Pressure.FromKilopascals(0.25), Pressure.FromKilopascals(20));
            UncertainQuality reading = meter.QualityWithUncertainty(MassFlow.FromKilogramsPerSecond(4.80), Pressure.FromMegapascals(9.60), Pressure.FromKilopascals(41.6), instruments);
            Console.WriteLine(reading.Reading);
            Console.WriteLine(reading);

            Console.WriteLine(SteamState.FromPressureTemperature(Pressure.FromMegapascals(9.6), Temperature.FromDegreesCelsius(170)));
            Pass pass = new Pass("1", new[] { Tubes("bank").AsConvective(), Tubes("coil") }).WithConvectiveShare(Ratio.FromPercent(42)).WithMeter(meter);
            PassConditions conditions = new PassConditions(MassFlow.FromKilogramsPerSecond(4.6), Temperature.FromDegreesCelsius(168), Pressure.FromMegapascals(9.2), Power.FromMegawatts(8));
            Console.WriteLine(SteadyState.Solve(pass, conditions));

            PassSimulator simulator = new PassSimulator(pass, conditions);
            QualityEstimator estimator = new QualityEstimator(pass, meter);
            DateTimeOffset noon = new DateTimeOffset(2031, 3, 9, 12, 0, 0, TimeSpan.Zero);
            QualityEstimate estimate = default(QualityEstimate);
            for (int second = 1; second <= 600; second++)
            {
                PassInstant instant = simulator.Advance(conditions, Duration.FromSeconds(1));
                estimate = estimator.Update(new PassReading(noon.AddSeconds(second), instant.FeedFlow, instant.Differential).WithOutletPressure(conditions.OutletPressure).WithFeedTemperature(conditions.FeedTemperature).WithFiring(Ratio.FromPercent(90)));
            }

            Console.WriteLine(simulator.Now);
            Console.WriteLine(estimate);
            Console.WriteLine(GeneratorJson.Read(GeneratorJson.Write(new SteamGenerator("invented", new[] { pass }))).Passes[0].FlowLength);
        }

        private static TubeSection Tubes(string name)
        {
            return new TubeSection(name, Length.FromMillimeters(77.9), Length.FromMillimeters(88.9), Length.FromMeters(330));
        }
    }
}
