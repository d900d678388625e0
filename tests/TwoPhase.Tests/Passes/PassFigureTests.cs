using TwoPhase.Passes;
using UnitsNet;

namespace TwoPhase.Tests.Passes;

/// <summary>Surfaces, masses and balances of a pass by hand.</summary>
public class PassFigureTests
{
    // 671 m of 77.9 mm bore and 88.9 mm outside, all of it heated, steel of 7850 kg/m³; geometry alone.
    [Fact]
    public void Pass_Tubes_HaveTheirSurfacesAndMass()
    {
        Approx.Relative(Math.PI * 0.0779 * 671, ExamplePass.Pass.InsideSurface.SquareMeters, 1e-12);
        Approx.Relative(Math.PI * 0.0889 * 671, ExamplePass.Pass.HeatedSurface.SquareMeters, 1e-12);
        Approx.Relative(Math.PI / 4 * ((0.0889 * 0.0889) - (0.0779 * 0.0779)) * 671 * 7850, ExamplePass.Pass.MetalMass.Kilograms, 1e-12);
        Pass half = new("half", [ExamplePass.Tubes("bank", 335.5), ExamplePass.Tubes("riser", 335.5).AsUnheated()]);
        Approx.Relative(Math.PI * 0.0889 * 335.5, half.HeatedSurface.SquareMeters, 1e-12);
    }

    // First law: what leaves carries what came in and the heat.
    [Fact]
    public void Audit_OfASteadyState_ClosesInItsOwnFigures()
    {
        PassAudit audit = SteadyState.Solve(ExamplePass.Pass, ExamplePass.Conditions).Audit;
        Approx.Relative(4.8, audit.MassFlow.KilogramsPerSecond, 1e-12);
        Approx.Relative(8.2, (double)audit.Heat.Megawatts, 1e-12);
        Approx.Relative((double)audit.EnthalpyOut.Megawatts, (double)(audit.EnthalpyIn.Megawatts + audit.Heat.Megawatts), 1e-9);
    }

    // Continuity: each phase alone carries its share of the mass, G x = α ρg ug and G (1 - x) = (1 - α) ρl ul.
    [Fact]
    public void Point_TwoPhases_CarryTheMassFlux()
    {
        PassProfile profile = SteadyState.Solve(ExamplePass.Pass, ExamplePass.Conditions);
        double flux = 4.8 / (Math.PI / 4 * 0.0779 * 0.0779);
        foreach (ProfilePoint point in profile.Where(point => point.EquilibriumQuality.DecimalFractions is > 0.05 and < 0.95))
        {
            TwoPhase.Steam.Saturation steam = TwoPhase.Steam.Saturation.FromPressure(point.Pressure);
            double vapour = point.VoidFraction.DecimalFractions * steam.Vapour.Density.KilogramsPerCubicMeter * point.VapourVelocity!.Value.MetersPerSecond;
            double liquid = (1 - point.VoidFraction.DecimalFractions) * steam.Liquid.Density.KilogramsPerCubicMeter * point.LiquidVelocity!.Value.MetersPerSecond;
            Approx.Relative(flux, vapour + liquid, 1e-6);
            Approx.Relative(point.EquilibriumQuality.DecimalFractions, vapour / flux, 1e-6);
        }
    }
}
