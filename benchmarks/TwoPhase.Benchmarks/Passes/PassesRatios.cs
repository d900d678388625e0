using TwoPhase.Benchmarks.Ratios;
using TwoPhase.Passes;
using UnitsNet;

namespace TwoPhase.Benchmarks.Passes;

/// <summary>The steady state of one pass, per node of its profile.</summary>
internal sealed class PassesRatios : IRatioSuite
{
    private static readonly Pass Bare = new Pass("1", [Tubes("bank", 335.5).AsConvective(), Tubes("coil", 335.5)]).WithConvectiveShare(Ratio.FromPercent(41));
    private static readonly Pass Whole = new Pass("2",
    [
        Tubes("bank", 16.8, 20).AsConvective().WithReturnBends(19, Length.FromMillimeters(114), 0.3).WithRise(Length.FromMeters(-2.4)),
        Tubes("crossover", 6).AsUnheated().WithLossCoefficient(0.9),
        Tubes("coil", 16.8, 20).WithReturnBends(19, Length.FromMillimeters(114), 0.3),
    ]).WithConvectiveShare(Ratio.FromPercent(41)).WithOutletLine(new(Length.FromMillimeters(73.7), 3, Volume.FromLiters(60)));

    private static readonly PassConditions Conditions = new(MassFlow.FromKilogramsPerSecond(4.8), Temperature.FromDegreesCelsius(171.85), Pressure.FromMegapascals(9.6), Power.FromMegawatts(8.2));

    public string Name => "Passes";

    public IEnumerable<RatioCase> Cases()
    {
        yield return Solved("two bare sections, outlet wet", 60, () => SteadyState.Solve(Bare, Conditions));
        yield return Solved("the whole geometry, outlet wet", 60, () => SteadyState.Solve(Whole, Conditions));
        yield return Solved("two bare sections, outlet superheated", null, () => SteadyState.Solve(Bare, Conditions.WithAbsorbedHeat(Power.FromMegawatts(13))));
        yield return Solved("two bare sections, heat found for a quality", null, () => SteadyState.FindHeat(Bare, Conditions, MassFraction.FromPercent(78)));
    }

    private static TubeSection Tubes(string name, double metres, int inSeries = 1) =>
        new TubeSection(name, Length.FromMillimeters(77.9), Length.FromMillimeters(88.9), Length.FromMeters(metres), inSeries).WithRoughness(Length.FromMicrometers(46));

    private static RatioCase Solved(string what, double? target, Func<PassProfile> solve)
    {
        int nodes = solve().Count;
        return new($"{what}: {nodes} nodes, per node", nodes, () => solve().Inlet.Pressure.Pascals) { Yardstick = Yardsticks.P, Target = target };
    }
}
