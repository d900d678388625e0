using TwoPhase.Passes;
using UnitsNet;

namespace TwoPhase.Tests.Passes;

/// <summary>An invented pass of the usual size: 671 m of 3 inch tube, half convection bank, half radiant coil.</summary>
internal static class ExamplePass
{
    public static Pass Pass { get; } = new Pass("1", [Tubes("bank", 335.5).AsConvective(), Tubes("coil", 335.5)]).WithConvectiveShare(Ratio.FromPercent(41));

    public static PassConditions Conditions { get; } = new(MassFlow.FromKilogramsPerSecond(4.8), Temperature.FromDegreesCelsius(171.85), Pressure.FromMegapascals(9.6), Power.FromMegawatts(8.2));

    public static TubeSection Tubes(string name, double metres) =>
        new TubeSection(name, Length.FromMillimeters(77.9), Length.FromMillimeters(88.9), Length.FromMeters(metres)).WithRoughness(Length.FromMicrometers(46));
}
