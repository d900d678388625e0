Imports System
Imports TwoPhase.Slip

Module Program
    Sub Main()
        For Each model In VoidFractionModel.All
            Console.WriteLine(model.Name)
        Next
    End Sub
End Module
