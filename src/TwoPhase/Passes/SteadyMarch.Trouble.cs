using TwoPhase.Numerics;
using TwoPhase.Units;

namespace TwoPhase.Passes;

// Where there is no solution: why, and in which section.
internal partial struct SteadyMarch<TFluid>
{
    private const string Choked = "the flow chokes: no pressure upstream carries this mass flux through the section";
    private const string Critical = "pressure upstream rises to the critical pressure";
    private const string Vacuum = "pressure upstream falls to nothing";
    private const string Endless = "the grid would need more than 100 000 rows";
    private const string Beyond = "the enthalpy lies outside the steam formulation";

    // With vM ~ 1/p the flow chokes where G² vM reaches p.
    private static bool IsChoked(double momentum, double pressure) => momentum >= 0.9 * pressure;

    private readonly string? Outside(double pressure) =>
        !(pressure < _fluid.HighestPressure) ? Critical : pressure > 0 ? null : Vacuum;

    private static string? Trouble(in PassNode node) =>
        node.Temperature > 0 && node.Flow.LiquidDensity > 0 && node.Flow.VapourDensity > 0 && !double.IsInfinity(node.Flow.LiquidDensity) && !double.IsInfinity(node.Flow.VapourDensity) ? null : Beyond;

    private readonly ConvergenceException NoSolution(int duct, double position, string reason) => new(
        $"No steady state in section '{_ducts[duct].Name}', {Scale.Metres.Text(position)} from the inlet of the pass: {reason}. "
        + $"Flow {Scale.KilogramsPerSecond.Text(Flow)}, heat {Scale.Megawatts.Text(Heat)}, outlet pressure {Scale.Megapascals.Text(OutletPressure)}.");
}
