using TwoPhase.Dynamics;
using TwoPhase.Passes;
using TwoPhase.Slip;
using UnitsNet;
using UnitsNet.Units;

namespace LivePasses.Plant;

/// <summary>One pass of the invented plant: the library's simulation, with a slip and a share of the heat that the estimator is not told.</summary>
internal sealed class PlantPass
{
    private const double FeedFlow = 4.42, Quality = 0.72;
    private static readonly SimulatorOptions Options = SimulatorOptions.Default.WithModels(PassModels.Default.WithSlip(VoidFractionModel.Zivi));

    private readonly int _index;
    private readonly double _fullHeat;
    private readonly PassSimulator _simulator;

    public PlantPass(Pass pass, int index)
    {
        _index = index;
        var start = new PassConditions(MassFlow.FromKilogramsPerSecond(FeedFlow), FeedTemperature(0), HeaderPressure(0), Power.FromMegawatts(8));
        PassConditions rest = SteadyState.FindHeat(pass, start, MassFraction.FromDecimalFractions(Quality + (0.004 * (index % 3))), Options.Models).Conditions;
        _fullHeat = (double)rest.AbsorbedHeat.As(PowerUnit.Watt) / Story.FiringAt(0);
        _simulator = new(pass, rest, Options);
    }

    /// <summary>Lets time pass.</summary>
    /// <param name="time">Seconds since the plant began, at the end of it.</param>
    /// <param name="seconds">How much.</param>
    public PassInstant Advance(double time, double seconds) => _simulator.Advance(
        new(MassFlow.FromKilogramsPerSecond(FeedFlow * Story.FeedShare(_index, time)), FeedTemperature(time), HeaderPressure(time), Power.FromWatts(_fullHeat * Story.FiringAt(time))),
        Duration.FromSeconds(seconds));

    private static Temperature FeedTemperature(double time) => Temperature.FromKelvins(Story.FeedTemperatureAt(time));

    private static Pressure HeaderPressure(double time) => Pressure.FromPascals(Story.HeaderPressureAt(time));
}
