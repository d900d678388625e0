using System;
using TwoPhase.Metering;
using UnitsNet;

namespace Consumers.CSharp73
{
    internal static class Program
    {
        private static void Main()
        {
            var venturi = new ClassicalVenturi(Length.FromMillimeters(77.9), Length.FromMillimeters(49), ConvergentFinish.Machined);
            var meter = new QualityMeter(venturi, WetSteamModel.Homogeneous);
            MassFlow flow = MassFlow.FromKilogramsPerSecond(4.8);
            Pressure pressure = Pressure.FromMegapascals(9.6);

            QualityReading reading = meter.Quality(flow, pressure, Pressure.FromKilopascals(41.6));
            Pressure differential = meter.Differential(flow, pressure, reading.Quality);
            Console.WriteLine("{0} by {1}, {2} back", reading, meter.Model.Name, differential);
        }
    }
}
