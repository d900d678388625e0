using TwoPhase.Dynamics;
using TwoPhase.Metering;
using TwoPhase.Passes;
using TwoPhase.Slip;
using TwoPhase.Tests.Passes;
using UnitsNet;

namespace TwoPhase.Tests.Dynamics;

/// <summary>The invented pass with a venturi at its outlet, at 78 % quality.</summary>
internal static class Simulations
{
    public static QualityMeter Venturi { get; } = new(new ClassicalVenturi(Length.FromMillimeters(77.9), Length.FromMillimeters(49), ConvergentFinish.Machined), WetSteamModel.Homogeneous);

    public static Pass MeteredPass { get; } = ExamplePass.Pass.WithMeter(Venturi);

    /// <summary>The pass with the straight lines of flux that suit both recorded transients best: rising to boiling, falling towards the outlet.</summary>
    public static Pass FittedPass { get; } = MeteredPass.WithHeat(new(
        new SectionHeat("bank", Ratio.FromPercent(42), new FluxPoint(Ratio.Zero, 1), new FluxPoint(Ratio.FromPercent(100), 2)),
        new SectionHeat("coil", Ratio.FromPercent(58), new FluxPoint(Ratio.Zero, 3), new FluxPoint(Ratio.FromPercent(100), 1))));

    public static PassConditions Start { get; } = SteadyState.FindHeat(MeteredPass, ExamplePass.Conditions, MassFraction.FromPercent(78)).Conditions;

    public static SimulatorOptions Homogeneous { get; } = SimulatorOptions.Default.WithModels(new(VoidFractionModel.Homogeneous));

    public static OperatingSchedule Still => new(Start);

    public static Duration Seconds(double seconds) => Duration.FromSeconds(seconds);

    public static PassHistory Run(OperatingSchedule schedule, double seconds, SimulatorOptions? options = null, Pass? pass = null) =>
        new PassSimulator(pass ?? MeteredPass, schedule.At(Duration.Zero), options).Run(schedule, Seconds(seconds));
}
