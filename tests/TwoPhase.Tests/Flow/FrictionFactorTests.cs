using FsCheck;
using FsCheck.Xunit;
using TwoPhase.Flow;
using UnitsNet;

namespace TwoPhase.Tests.Flow;

public class FrictionFactorTests
{
    private static readonly ReferenceTable Table = ReferenceTable.Load("Flow/Data/friction-factor.csv");

    [Fact]
    public void Formulas_ReferenceRows_MatchPrintedDigits()
    {
        foreach (ReferenceTable.Row row in Table.Rows)
        {
            double re = row["Re"], roughness = row["rel_roughness"];
            Approx.Relative(row["f_colebrook"], FrictionFactor.Colebrook(re, roughness), 1e-9, $"Colebrook {row}");
            Approx.Relative(row["f_haaland"], FrictionFactor.Haaland(re, roughness), 1e-9, $"Haaland {row}");
            Approx.Relative(row["f_churchill1977"], FrictionFactor.Churchill(re, roughness), 1e-9, $"Churchill {row}");
            Approx.Relative(row["f_laminar"], FrictionFactor.Laminar(re), 1e-9, $"laminar {row}");
        }
    }

    [Property]
    public bool Colebrook_AnyTurbulentFlow_SolvesItsEquationToRoundOff(NormalFloat a, NormalFloat b)
    {
        double re = Math.Pow(10, 3.4 + (4.6 * Unit(a.Get))), roughness = 0.05 * Unit(b.Get);
        double s = 1 / Math.Sqrt(FrictionFactor.Colebrook(re, roughness));
        double right = -2 * Math.Log10((roughness / 3.7) + (2.51 / re * s));
        return Math.Abs((s / right) - 1) < 4e-15;
    }

    /// <summary>The two solutions of Colebrook's equation, one by one and both phases at once, through laminar flow of either.</summary>
    [Property]
    public void GradientPair_AnyFlow_IsThatOfEitherPhaseAlone(NormalFloat a, NormalFloat b, NormalFloat c)
    {
        const double bore = 0.078;
        FlowState flow = FlowStates.At(6e6, 0.3, 3, bore, 0);
        double massFlux = 3 * Math.Pow(10, 4 * Unit(a.Get));
        flow = flow with { MassFlux = massFlux, VapourViscosity = flow.VapourViscosity * Math.Pow(10, 3 * Unit(b.Get)) };
        double roughness = Unit(c.Get) < 0.1 ? 0 : bore * Math.Pow(10, (6.5 * Unit(c.Get)) - 7);

        (double liquid, double vapour) = FrictionFactor.GradientPair(flow, roughness);

        Approx.Relative(FrictionFactor.GradientCore(massFlux, bore, flow.LiquidDensity, flow.LiquidViscosity, roughness), liquid, 1e-14, $"liquid at {massFlux}");
        Approx.Relative(FrictionFactor.GradientCore(massFlux, bore, flow.VapourDensity, flow.VapourViscosity, roughness), vapour, 1e-14, $"vapour at {massFlux}");
    }

    [Theory]
    [InlineData(2040, 64.0 / 2040)]
    [InlineData(1, 64.0)]
    public void Of_UpToTransition_IsLaminar(double reynolds, double expected) =>
        Approx.Relative(expected, FrictionFactor.Of(reynolds, 0.001), 1e-15);

    [Fact]
    public void Of_AboveTransition_IsColebrook() =>
        Assert.Equal(FrictionFactor.Colebrook(2041, 0.001), FrictionFactor.Of(2041, 0.001));

    [Fact]
    public void Churchill_ThroughTransition_HasNoStep()
    {
        for (double re = 1000; re < 6000; re *= 1.01)
            Assert.InRange(FrictionFactor.Churchill(re * 1.01, 1e-4) / FrictionFactor.Churchill(re, 1e-4), 0.98, 1.04);
    }

    [Fact]
    public void Gradient_WaterInASteelTube_IsDarcysFormula()
    {
        PressureGradient gradient = FrictionFactor.Gradient(
            MassFlux.FromKilogramsPerSecondPerSquareMeter(1000), Length.FromMillimeters(80), Density.FromKilogramsPerCubicMeter(700),
            DynamicViscosity.FromPascalSeconds(8e-5), Length.FromMicrometers(46));

        double f = FrictionFactor.Of(1000 * 0.08 / 8e-5, 46e-6 / 0.08);
        Approx.Relative(f * 1000 * 1000 / (2 * 0.08 * 700), gradient.PascalsPerMetre, 1e-12);
    }

    [Fact]
    public void Gradient_NoFlow_IsZero() => Assert.Equal(
        0,
        FrictionFactor.Gradient(
            MassFlux.FromKilogramsPerSecondPerSquareMeter(0), Length.FromMillimeters(80), Density.FromKilogramsPerCubicMeter(700),
            DynamicViscosity.FromPascalSeconds(8e-5), Length.Zero).PascalsPerMetre);

    [Theory]
    [InlineData(0, 0, "Reynolds number = 0 must be greater than zero")]
    [InlineData(double.NaN, 0, "Reynolds number = NaN must be greater than zero")]
    [InlineData(1e5, -1e-3, "Relative roughness = -0.001 must not be negative")]
    [InlineData(1e5, 0.5, "Relative roughness = 0.5 must be below 0.5")]
    public void Of_BadArgument_ThrowsNamingTheValue(double reynolds, double roughness, string message) =>
        Assert.StartsWith(message, Assert.Throws<ArgumentOutOfRangeException>(() => FrictionFactor.Of(reynolds, roughness)).Message, StringComparison.Ordinal);

    /// <summary>Any finite number folded into 0..1.</summary>
    private static double Unit(double value) => 0.5 + (Math.Atan(value) / Math.PI);
}
