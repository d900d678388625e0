using TwoPhase.Flow;
using TwoPhase.Friction;
using UnitsNet;

namespace TwoPhase.Tests.Friction;

public class FrictionWorkedExampleTests
{
    // Air and water in a textbook: Ghiaasiaan, Two-Phase Flow, Boiling and Condensation (2007), Example 4 of its chapter on pressure drop, as
    // quoted in the documentation of python3-fluids.
    private static FlowState Textbook { get; } = new()
    {
        Pressure = 0.2e6,
        LiquidDensity = 915,
        VapourDensity = 2.67,
        LiquidViscosity = 180e-6,
        VapourViscosity = 14e-6,
        SurfaceTension = 0.0487,
        Quality = 0.1,
        MassFlux = 0.6 / (Math.PI / 4 * 0.05 * 0.05),
        Bore = 0.05,
    };

    // The book prints 730 Pa/m, with Blasius's factor and a multiplier of 38.64; Colebrook's factor gives 1.2 % more.
    [Fact]
    public void Friedel_TextbookExample_IsWithinTheFrictionFactorsOfTheBook() =>
        Approx.Relative(730, FrictionModel.Friedel.GradientCore(Textbook, 0), 0.015);

    // python3-fluids 1.0.22, documented examples of Friedel, Muller_Steinhagen_Heck, Lockhart_Martinelli, Chisholm and Gronnerud on the same flow.
    [Fact]
    public void Gradients_TextbookFlow_MatchDocumentedExamplesOfALibrary()
    {
        Approx.Relative(738.6500525002241, FrictionModel.Friedel.GradientCore(Textbook, 0), 1e-12);
        Approx.Relative(793.4465457435081, FrictionModel.MullerSteinhagenHeck.GradientCore(Textbook, 0), 1e-12);
        Approx.Relative(716.4695654888484, FrictionModel.LockhartMartinelli.GradientCore(Textbook, 0), 1e-12);
        Approx.Relative(1084.1489922923738, FrictionModel.ChisholmB.GradientCore(Textbook, 0), 1e-12);
        Approx.Relative(384.12541144474085, FrictionModel.Gronnerud.GradientCore(Textbook, 0), 1e-12);
    }

    [Fact]
    public void Gradients_ReferencePoint_MatchPrintedDigits()
    {
        foreach (ReferenceTable.Row row in ReferenceTable.Load("Friction/Data/reference-point.csv").Rows)
        {
            FlowState flow = ReferencePoint.At(row["x"]);
            Approx.Relative(row["friedel"], FrictionModel.Friedel.GradientCore(flow, row["roughness_m"]), 5e-6, $"Friedel {row}");
            Approx.Relative(row["muller_steinhagen_heck"], FrictionModel.MullerSteinhagenHeck.GradientCore(flow, row["roughness_m"]), 5e-6, $"Müller-Steinhagen-Heck {row}");
            if (row.Text("chisholm_b").Length > 0) Approx.Relative(row["chisholm_b"], FrictionModel.ChisholmB.GradientCore(flow, row["roughness_m"]), 5e-6, $"Chisholm B {row}");
        }
    }

    // B jumps at Y = 9.5, as published: from 4.8 down to 520/(Y √G) at low mass flux, from 55/√G up to 21/Y at high.
    [Theory]
    [InlineData(300, 0.60, 0.75)]
    [InlineData(2500, 1.7, 2.1)]
    public void ChisholmB_AcrossItsBorder_JumpsAsPublished(double massFlux, double low, double high)
    {
        FlowState flow = Textbook with { MassFlux = massFlux };
        double border = VapourDensityAt(9.5, flow);
        double before = FrictionModel.ChisholmB.GradientCore(flow with { VapourDensity = border * 1.0001 }, 0);
        double after = FrictionModel.ChisholmB.GradientCore(flow with { VapourDensity = border * 0.9999 }, 0);
        Assert.InRange(after / before, low, high);
    }

    // python3-fluids 1.0.22, documented example of two_phase_dP_acceleration.
    [Fact]
    public void AccelerationLoss_DocumentedExampleOfALibrary_MatchesPrintedDigits()
    {
        var inlet = new FlowState { LiquidDensity = 827.1, VapourDensity = 3.919, Quality = 0.372, MassFlux = 1 / (Math.PI / 4 * 0.01), Bore = 0.1 };
        Pressure loss = AccelerationLoss.Difference(
            new TwoPhaseFlow(inlet), Ratio.FromDecimalFractions(0.992), new TwoPhaseFlow(inlet with { Quality = 0.557 }), Ratio.FromDecimalFractions(0.996));
        Approx.Relative(706.8560377214725, loss.Pascals, 1e-12);
    }

    // Y² = g/l; g goes as 1/ρg, since the vapour's friction factor does not depend on its density.
    private static double VapourDensityAt(double y, FlowState flow)
    {
        double l = FrictionFactor.GradientCore(flow.MassFlux, flow.Bore, flow.LiquidDensity, flow.LiquidViscosity, 0);
        double g = FrictionFactor.GradientCore(flow.MassFlux, flow.Bore, flow.VapourDensity, flow.VapourViscosity, 0);
        return flow.VapourDensity * g / l / (y * y);
    }
}
