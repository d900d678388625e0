using MathNet.Numerics.Distributions;
using TwoPhase.Uncertainty;

namespace TwoPhase.Tests.Uncertainty;

public class MeasurementFunctionPropagationTests
{
    // JCGM 100:2008, H.1, end gauge by comparison, in nm. Printed: l = 50.000 838 mm, u = 32 nm, ν = 16, t99 = 2.92, U99 = 93 nm (values from memory;
    // the sum of squares 25² + 9.7² + 2.9² + 16.6² = 31.7² is recomputed in the test).
    private static MeasurementFunction EndGauge() => new(
        v => v["ls"] + v["d"] - (v["ls"] * ((v["δα"] * v["θ"]) + (v["αs"] * v["δθ"]))),
        new UncertainInput("ls", 50_000_623, 25).WithDegreesOfFreedom(18).WithUnit("nm"),
        new UncertainInput("d", 215, 9.7).WithDegreesOfFreedom(25.6),
        UncertainInput.FromBounds("δα", -1e-6, 1e-6).WithDegreesOfFreedom(50),
        new UncertainInput("θ", -0.1, 0.41),
        UncertainInput.FromBounds("αs", 9.5e-6, 13.5e-6),
        UncertainInput.FromBounds("δθ", -0.05, 0.05).WithDegreesOfFreedom(2));

    [Fact]
    public void Propagate_EndGaugeOfGumH1_GivesThePrintedBudget()
    {
        UncertaintyBudget budget = EndGauge().Propagate();

        Approx.Absolute(50_000_838, budget.Value, 1e-6);
        Approx.Absolute(31.7, budget.StandardUncertainty, 0.05);
        Assert.Equal(16, Math.Floor(budget.EffectiveDegreesOfFreedom));
        Assert.InRange(budget.CoverageFactor(0.99), StudentT.InvCDF(0, 1, 17, 0.995), StudentT.InvCDF(0, 1, 16, 0.995));   // printed 2.92 is for ν cut to 16
        Approx.Absolute(2.92, StudentT.InvCDF(0, 1, 16, 0.995), 0.005);
        Approx.Absolute(93, 2.92 * budget.StandardUncertainty, 0.6);
        Approx.Relative(budget.CoverageFactor(0.99) * budget.StandardUncertainty, budget.ExpandedUncertainty(0.99), 1e-15);
        Assert.Equal(["ls", "δθ", "d", "δα", "θ", "αs"], budget.Lines.Select(line => line.Input.Name));
        Approx.Absolute(-16.6, budget.Lines[1].Contribution, 0.05);
        Approx.Absolute(2.9, budget.Lines[3].Contribution, 0.05);
        Approx.Absolute(0, budget.Lines[4].Contribution, 1e-6);
    }

    // JCGM 100:2008, H.2, simultaneous resistance and reactance (values from memory): V, I, φ with r = −0.36, 0.86, −0.65;
    // printed R = 127.732 Ω u 0.071, X = 219.847 Ω u 0.295, Z = 254.260 Ω u 0.236. The printed r are rounded to two digits, hence 1 in the last place.
    [Theory]
    [InlineData("R", 127.732, 0.071)]
    [InlineData("X", 219.847, 0.295)]
    [InlineData("Z", 254.260, 0.236)]
    public void Propagate_CorrelatedInputsOfGumH2_GivesThePrintedUncertainty(string what, double value, double uncertainty)
    {
        MeasurementFunction impedance = new(
            v => v["V"] / v["I"] * (what switch { "R" => Math.Cos(v["φ"]), "X" => Math.Sin(v["φ"]), _ => 1 }),
            new UncertainInput("V", 4.9990, 0.0032),
            new UncertainInput("I", 19.6610e-3, 0.0095e-3),
            new UncertainInput("φ", 1.04446, 0.00075));
        UncertaintyBudget budget = impedance.WithCorrelation("V", "I", -0.36).WithCorrelation("V", "φ", 0.86).WithCorrelation("φ", "I", -0.65).Propagate();

        Approx.Absolute(value, budget.Value, 0.005);
        Approx.Absolute(uncertainty, budget.StandardUncertainty, 0.0015);
        Approx.Absolute(1, budget.Lines.Sum(line => line.ShareOfVariance), 1e-12);
    }

    // ISO 5167-1:2003, 8.2.2 (form from memory): (δq/q)² = δC² + (2β⁴/(1−β⁴))² δD² + (2/(1−β⁴))² δd² + ¼ δΔp² + ¼ δρ².
    [Fact]
    public void Propagate_PressureDifferenceDevice_GivesThePracticalFormulaOfIso5167()
    {
        const double beta = 0.629, pipe = 0.0779;
        MeasurementFunction flow = new(
            v => v["C"] / Math.Sqrt(1 - Math.Pow(v["d"] / v["D"], 4)) * Math.PI / 4 * v["d"] * v["d"] * Math.Sqrt(2 * v["Δp"] * v["ρ"]),
            new UncertainInput("C", 0.995, 0.01 * 0.995),
            new UncertainInput("D", pipe, 0.004 * pipe),
            new UncertainInput("d", beta * pipe, 0.001 * beta * pipe),
            new UncertainInput("Δp", 40e3, 0.005 * 40e3),
            new UncertainInput("ρ", 69.0, 0.005 * 69.0));
        UncertaintyBudget budget = flow.Propagate();

        double b4 = Math.Pow(beta, 4);
        double byHand = Math.Sqrt(1 + Math.Pow(2 * b4 / (1 - b4) * 0.4, 2) + Math.Pow(2 / (1 - b4) * 0.1, 2) + (0.25 * 0.25) + (0.25 * 0.25));
        Approx.Relative(byHand, 100 * budget.StandardUncertainty / budget.Value, 1e-8);
    }

    [Theory]
    [InlineData(0)]       // at zero, where a relative step would vanish
    [InlineData(1e-9)]
    [InlineData(2.5)]
    public void Propagate_SmoothFunction_FindsTheDerivative(double at)
    {
        BudgetLine line = new MeasurementFunction(v => Math.Exp(v[0]), new UncertainInput("x", at, 0.01)).Propagate().Lines[0];
        Approx.Relative(Math.Exp(at), line.Sensitivity, 1e-10);
    }

    [Fact]
    public void Propagate_CancellingCorrelation_LeavesNothing()
    {
        MeasurementFunction difference = new(v => v["a"] - v["b"], new UncertainInput("a", 3, 0.1), new UncertainInput("b", 2, 0.1));
        Approx.Absolute(0, difference.WithCorrelation("a", "b", 1).WithSensitivity("a", 1).WithSensitivity("b", -1).Propagate().StandardUncertainty, 1e-12);
        Approx.Relative(0.2, difference.WithCorrelation("a", "b", -1).Propagate().StandardUncertainty, 1e-9);
    }

    [Fact]
    public void Propagate_CorrelatedInputsOfFewObservations_TakesTheLeastDegreesOfFreedom()
    {
        MeasurementFunction sum = new(v => v[0] + v[1], new UncertainInput("a", 1, 0.1).WithDegreesOfFreedom(4), new UncertainInput("b", 1, 0.1).WithDegreesOfFreedom(9));
        Approx.Relative(4 / ((1 / 4.0) + (1 / 9.0)), sum.Propagate().EffectiveDegreesOfFreedom, 1e-9);
        Assert.Equal(4, sum.WithCorrelation("a", "b", 0.5).Propagate().EffectiveDegreesOfFreedom);
    }

    [Fact]
    public void CoverageFactor_KnownUncertainties_IsThatOfTheNormalDistribution()
    {
        UncertaintyBudget budget = new MeasurementFunction(v => v[0], new UncertainInput("x", 1, 0.1)).Propagate();
        Approx.Absolute(1.959964, budget.CoverageFactor(), 1e-6);     // JCGM 100:2008, table G.1 gives 1.960
        Approx.Absolute(2.575829, budget.CoverageFactor(0.99), 1e-6);
        Assert.True(budget.Interval().Contains(1.19) && !budget.Interval().Contains(1.2));
    }

    [Fact]
    public void FromObservations_GumTable_GivesMeanAndItsDeviation()
    {
        // Mean 5, s² = 2.5, by hand.
        UncertainInput input = UncertainInput.FromObservations("t", [3, 4, 5, 6, 7]);
        Assert.Equal(5, input.Estimate);
        Approx.Relative(Math.Sqrt(2.5 / 5), input.StandardUncertainty, 1e-15);
        Assert.Equal(4, input.DegreesOfFreedom);
    }

    [Fact]
    public void Input_Impossible_ThrowsNamingTheValue()
    {
        Assert.Contains("-0.1", Assert.Throws<ArgumentOutOfRangeException>(() => new UncertainInput("x", 1, -0.1)).Message, StringComparison.Ordinal);
        Assert.Throws<ArgumentOutOfRangeException>(() => new UncertainInput("x", double.NaN, 0.1));
        Assert.Throws<ArgumentException>(() => new UncertainInput(" ", 1, 0.1));
        Assert.Throws<ArgumentOutOfRangeException>(() => UncertainInput.FromBounds("x", 2, 1));
        Assert.Throws<ArgumentOutOfRangeException>(() => new UncertainInput("x", 1, 1).WithDegreesOfFreedom(0));
        Assert.Throws<ArgumentException>(() => UncertainInput.FromObservations("x", [1]));
        Assert.Contains("Cauchy", Assert.Throws<ArgumentException>(() => UncertainInput.FromDistribution("x", new Cauchy())).Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Function_Impossible_ThrowsNamingTheInput()
    {
        UncertainInput x = new("x", 1, 0.1), y = new("y", 2, 0.1), z = new("z", 3, 0.1);
        MeasurementFunction sum = new(v => v["x"] + v["y"] + v["z"], x, y, z);
        Assert.Throws<ArgumentException>(() => new MeasurementFunction(v => v[0]));
        Assert.Contains("'x'", Assert.Throws<ArgumentException>(() => new MeasurementFunction(v => v[0], x, x)).Message, StringComparison.Ordinal);
        Assert.Contains("x, y, z", Assert.Throws<ArgumentException>(() => sum.WithCorrelation("x", "w", 0.1)).Message, StringComparison.Ordinal);
        Assert.Throws<ArgumentOutOfRangeException>(() => sum.WithCorrelation("x", "y", 1.5));
        Assert.Throws<ArgumentException>(() => sum.WithCorrelation("x", "x", 1));
        Assert.Contains("contradict", Assert.Throws<ArgumentException>(() => sum.WithCorrelation("x", "y", 1).WithCorrelation("y", "z", 1).WithCorrelation("x", "z", -1)).Message, StringComparison.Ordinal);
        Assert.Contains("x = 1", Assert.Throws<ArithmeticException>(() => new MeasurementFunction(v => Math.Log(-v["x"]), x).Propagate()).Message, StringComparison.Ordinal);
        Assert.Throws<ArgumentOutOfRangeException>(() => sum.Propagate().CoverageFactor(1));
    }
}
