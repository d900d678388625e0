using TwoPhase.Numerics;
using TwoPhase.Steam;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Metering;

public sealed partial class QualityMeter
{
    // Superheat of a hundred kelvins at 10 MPa would read as 1.4; what lies above 2 is a quality given in per cent.
    private const double HighestQuality = 2;

    private static double CheckedFlow(MassFlow flow, string parameter) =>
        Require.Positive(flow.Si(), "Mass flow", Scale.KilogramsPerSecond, parameter);

    private static double CheckedPressure(Pressure pressure, string parameter) =>
        Require.Within(pressure.Si(), SaturationLine.LowestPressure, Water97.CriticalPressure, "Absolute pressure", Scale.Megapascals, parameter);

    private static double CheckedDifferential(Pressure differential, double pressure, string parameter)
    {
        double dp = Require.Positive(differential.Si(), "Differential pressure", Scale.Kilopascals, parameter);
        return dp < pressure ? dp : throw MeterArguments.Swapped(pressure, dp);
    }

    private static double CheckedQuality(MassFraction quality, string parameter)
    {
        double x = Require.Finite(quality.Si(), "Quality", Scale.None, parameter);
        return x <= HighestQuality ? x : throw Require.OutOfRange(x, "Quality", Scale.None, parameter, "must not be above 2: is it given in per cent?");
    }

    // Fails on NaN.
    private static bool IsSound(double flow, double pressure, double differential) =>
        flow > 0 && flow < double.PositiveInfinity && differential > 0 && differential < pressure;

    private static ReadingStatus StatusOf(double flow, double pressure, double differential) =>
        double.IsNaN(flow + pressure + differential) && (double.IsNaN(flow) || double.IsNaN(pressure) || double.IsNaN(differential)) ? ReadingStatus.Missing
        : !(flow > 0 && flow < double.PositiveInfinity) ? ReadingStatus.FlowOutOfRange
        : !(pressure >= SaturationLine.LowestPressure && pressure <= Water97.CriticalPressure) ? ReadingStatus.PressureOutOfRange
        : !(differential > 0 && differential < pressure) ? ReadingStatus.DifferentialOutOfRange
        : ReadingStatus.None;

    private static ReadingStatus StatusOf(double quality) =>
        quality < 0 ? ReadingStatus.SubcooledOutlet
        : quality <= 1 ? ReadingStatus.WetSteam
        : quality > 1 ? ReadingStatus.SuperheatedOutlet
        : ReadingStatus.NotSolved;

    private ConvergenceException NotSolved(string wanted, double flow, double pressure, double differential) => new(
        $"No {wanted} was found with the model '{Model.Name}' for flow {Scale.KilogramsPerSecond.Text(flow)}, pressure {Scale.Megapascals.Text(pressure)}, differential {Scale.Kilopascals.Text(differential)}: the model gives no finite density there.");
}
