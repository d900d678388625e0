using TwoPhase.Dynamics;
using TwoPhase.Metering;
using TwoPhase.Passes;
using TwoPhase.Tests.Support;
using UnitsNet;
using UnitsNet.Units;
using static TwoPhase.Tests.Dynamics.Simulations;

namespace TwoPhase.Tests.Dynamics;

/// <summary>The header pressure as boundary, a meter before or behind the line to it, and a non-return valve.</summary>
public class OutletLineTests
{
    private static readonly OutletLine Line = new(Length.FromMillimeters(77.9), 6, Volume.FromLiters(60));

    private static readonly Pass Plain = MeteredPass.WithOutletLine(Line), Guarded = MeteredPass.WithOutletLine(Line.WithNonReturnValve()), AtTubeEnd = MeteredPass.WithOutletLine(Line.WithMeterAtTubeEnd());

    private static readonly PassConditions Behind = SteadyState.FindHeat(Plain, Start, MassFraction.FromPercent(78)).Conditions;

    [Fact]
    public void Run_MeterBehindTheLine_ReadsTrueAtRest()
    {
        PassInstant row = new PassSimulator(Plain, Behind).Now;
        Approx.Absolute(0.78, row.TrueQuality.DecimalFractions, 1e-6);
        Approx.Absolute(0.78, row.IndicatedQuality!.Value.DecimalFractions, 1e-6);
    }

    // The steady solver knows the pressure at the tube end; what the meter makes of it is worked out here by hand.
    [Fact]
    public void Run_MeterAtTubeEnd_IsReadWithThePressureOfTheHeader()
    {
        PassInstant row = new PassSimulator(AtTubeEnd, Behind).Now;
        PassProfile profile = SteadyState.Solve(AtTubeEnd, Behind);
        ProfilePoint end = profile.Last(point => point.Section == "coil");
        Assert.True(end.Pressure.Pascals - Behind.OutletPressure.Pascals > 20e3);
        Pressure differential = Venturi.Differential(Behind.FeedFlow, end.Pressure, end.EquilibriumQuality);
        Approx.Absolute(end.EquilibriumQuality.DecimalFractions, row.TrueQuality.DecimalFractions, 1e-4);
        Approx.Relative(differential.Pascals, row.Differential!.Value.Pascals, 2e-4);
        Approx.Absolute(Venturi.Quality(Behind.FeedFlow, Behind.OutletPressure, differential).Quality.DecimalFractions, row.IndicatedQuality!.Value.DecimalFractions, 2e-4);

        // The trade's rule: 0.1 MPa too low, one point of quality too low.
        double points = -100 * (row.IndicatedQuality.Value.DecimalFractions - row.TrueQuality.DecimalFractions), tenths = (end.Pressure.Pascals - Behind.OutletPressure.Pascals) / 1e5;
        Assert.InRange(points / tenths, 0.8, 1.2);
    }

    [Fact]
    public void Run_ValveThatNeverShuts_ChangesNothing()
    {
        OperatingSchedule ramp = new OperatingSchedule(Behind).RampOutletPressure(Seconds(10), Seconds(60), Pressure.FromMegapascals(9.9));
        PassHistory plain = Run(ramp, 200, pass: Plain), guarded = Run(ramp, 200, pass: Guarded);
        Assert.Equal(plain.ToList(), guarded.ToList());
        Assert.All(guarded, row => Assert.Equal(0, row.ValveShut.DecimalFractions));
    }

    // The header goes up by a megapascal in five seconds: without a valve it would drive the flow back, and the run ends. With one the feed
    // must fill and compress the pass until it is above the header again.
    [Fact]
    public void Run_HeaderJumpsUp_ShutsTheValveUntilThePassHasCaughtUp()
    {
        OperatingSchedule jump = new OperatingSchedule(Behind).RampOutletPressure(Seconds(10), Seconds(5), Pressure.FromMegapascals(10.6));
        Assert.Equal(SimulationEnd.FlowStagnated, Run(jump, 200, pass: Plain).End);
        PassHistory history = Run(jump, 900, pass: Guarded);
        Assert.Equal(SimulationEnd.Completed, history.End);
        double[] shut = history.Values(nameof(PassInstant.ValveShut), RatioUnit.DecimalFraction);
        int first = Array.FindIndex(shut, share => share > 0), last = Array.FindLastIndex(shut, share => share > 0);
        Assert.InRange(first, 10, 13);
        Assert.InRange(last - first, 3, 60);
        Assert.Contains(1.0, shut);
        Assert.All(history, row => Assert.True(row.OutletFlow.KilogramsPerSecond > 0));
        Assert.All(history.Where(row => row.ValveShut.DecimalFractions == 1), row => Assert.True(row.OutletFlow.KilogramsPerSecond < 0.02 * Behind.FeedFlow.KilogramsPerSecond));
        Assert.All(history, row => Approx.Absolute(0, row.MassResidual, 1e-9));
        Assert.All(history, row => Approx.Absolute(0, row.EnergyResidual, 1e-9));

        // What came in while it was shut is held.
        double held = history[last - 1].Holdup.Kilograms - history[first].Holdup.Kilograms;
        Approx.Relative(Behind.FeedFlow.KilogramsPerSecond * (last - 1 - first), held, 0.05);
        PassInstant rest = new PassSimulator(Guarded, Behind.WithOutletPressure(Pressure.FromMegapascals(10.6))).Now;
        Approx.Relative(rest.Holdup.Kilograms, history[^1].Holdup.Kilograms, 2e-3);
    }

    [Fact]
    public void Advance_BehindAValve_AllocatesNothing()
    {
        var simulator = new PassSimulator(Guarded, Behind);
        PassConditions up = Behind.WithOutletPressure(Pressure.FromMegapascals(9.9));
        bool turn = false;
        Assert.Equal(0, AllocationProbe.Bytes(() => simulator.Advance((turn = !turn) ? up : Behind, Seconds(4))));
    }
}
