Imports System
Imports TwoPhase.Metering
Imports UnitsNet

Module Program
    Sub Main()
        Dim venturi As New ClassicalVenturi(Length.FromMillimeters(77.9), Length.FromMillimeters(49), ConvergentFinish.Machined)
        Dim meter As New QualityMeter(venturi, WetSteamModel.Homogeneous)
        Dim flow As MassFlow = MassFlow.FromKilogramsPerSecond(4.8)
        Dim pressure As Pressure = Pressure.FromMegapascals(9.6)

        Dim reading As QualityReading = meter.Quality(flow, pressure, Pressure.FromKilopascals(41.6))
        Dim differential As Pressure = meter.Differential(flow, pressure, reading.Quality)
        Console.WriteLine("{0} by {1}, {2} back", reading, meter.Model.Name, differential)
    End Sub
End Module
