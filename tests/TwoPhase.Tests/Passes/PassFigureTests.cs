using TwoPhase.Passes;
using TwoPhase.Steam;
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
            Saturation steam = Saturation.FromPressure(point.Pressure);
            double vapour = point.VoidFraction.DecimalFractions * steam.Vapour.Density.KilogramsPerCubicMeter * point.VapourVelocity!.Value.MetersPerSecond;
            double liquid = (1 - point.VoidFraction.DecimalFractions) * steam.Liquid.Density.KilogramsPerCubicMeter * point.LiquidVelocity!.Value.MetersPerSecond;
            Approx.Relative(flux, vapour + liquid, 1e-6);
            Approx.Relative(point.EquilibriumQuality.DecimalFractions, vapour / flux, 1e-6);
        }
    }

    // Where the tube widens, the mixture of one velocity gives its momentum back: p + G²v/2 stays.
    [Fact]
    public void Solve_WiderLine_KeepsPressureAndVelocityHead()
    {
        Pass pass = new("step", [ExamplePass.Tubes("tubes", 500), TubeSection.Crossover("line", Length.FromMillimeters(110), Length.FromMillimeters(125), Length.FromMeters(3))]);
        PassProfile profile = SteadyState.Solve(pass, ExamplePass.Conditions);
        ProfilePoint line = profile.First(point => point.Section == "line"), tubes = profile.Last(point => point.Section == "tubes");
        Saturation steam = Saturation.FromPressure(line.Pressure);
        double x = line.EquilibriumQuality.DecimalFractions, volume = (x * steam.Vapour.SpecificVolume.CubicMetersPerKilogram) + ((1 - x) * steam.Liquid.SpecificVolume.CubicMetersPerKilogram);
        double gained = (Square(tubes) - Square(line)) / 2 * volume;
        Assert.True(gained > 1000);
        Approx.Relative(gained, line.Pressure.Pascals - tubes.Pressure.Pascals, 1e-6);
        double Square(ProfilePoint point) => Math.Pow(point.MassFlux.KilogramsPerSecondPerSquareMeter, 2);
    }

    [Fact]
    public void Solve_LevelPassWithoutGravity_IsTheSame()
    {
        PassProfile all = SteadyState.Solve(ExamplePass.Pass, ExamplePass.Conditions), level = SteadyState.Solve(ExamplePass.Pass, ExamplePass.Conditions, null, SteadyOptions.Default.WithoutGravity());
        Approx.Relative(all.Inlet.Pressure.Pascals, level.Inlet.Pressure.Pascals, 1e-12);
    }

    // Bayley and Hammersley (1946): n readings of lag-one correlation r count as n (1 - r)/(1 + r).
    [Fact]
    public void Series_OfCorrelatedReadings_CountsFewer()
    {
        var normal = new MathNet.Numerics.Distributions.Normal(0, 1, new Random(7));
        double[] values = new double[4000];
        for (int i = 1; i < values.Length; i++) values[i] = (0.8 * values[i - 1]) + normal.Sample();
        Assert.InRange(new Series(values).Effective, 0.85 * 4000 / 9, 1.15 * 4000 / 9);
    }

    [Fact]
    public void Parts_WithoutSense_AreRefusedByName()
    {
        TubeSection tubes = ExamplePass.Tubes("bank", 100);
        Assert.Contains("two sections", Assert.Throws<ArgumentException>(() => new Pass("1", [tubes, tubes])).Message, StringComparison.Ordinal);
        Assert.Contains("needs a name", Assert.Throws<ArgumentException>(() => new SteamGenerator(" ", [ExamplePass.Pass])).Message, StringComparison.Ordinal);
        Assert.Contains("Return bends", Assert.Throws<ArgumentOutOfRangeException>(() => tubes.WithReturnBends(-1, Length.FromMeters(0.2), 0.3)).Message, StringComparison.Ordinal);
        Assert.True(double.IsNaN(default(SteamFluid).LiquidEnthalpy(10e6, 270)) && double.IsNaN(default(SteamFluid).LiquidEnthalpy(10e6, 640)));
    }
}
