using TwoPhase.Metering;
using UnitsNet;

namespace TwoPhase.Tests.Metering;

public class SquareRootCheckTests
{
    private const double Span = 60e3;

    private static readonly QualityMeter Meter = new(new ClassicalVenturi(Length.FromMillimeters(77.9), Length.FromMillimeters(49), ConvergentFinish.Machined), WetSteamModel.Homogeneous);

    // Invented stretch: flow between the given shares of 4.8 kg/s, quality by a heat balance that is two points off, noise of 1 % on the differential.
    private static SquareRootCheck Stretch(double power, double lowFlow, int count = 12)
    {
        Random random = new(11);
        return SquareRootCheck.Of(Meter, Enumerable.Range(0, count).Select(i =>
        {
            MassFlow flow = MassFlow.FromKilogramsPerSecond(4.8 * (lowFlow + ((1 - lowFlow) * i / Math.Max(count - 1, 1))));
            Pressure pressure = Pressure.FromMegapascals(9.5 + (0.04 * i));
            double x = 0.76 + (0.03 * random.NextDouble());
            double share = Meter.Differential(flow, pressure, MassFraction.FromDecimalFractions(x)).Pascals / Span;
            return new ReferenceReading(flow, pressure, Pressure.FromPascals(Span * Math.Pow(share, power) * (0.99 + (0.02 * random.NextDouble()))), MassFraction.FromDecimalFractions(x + 0.02));
        }));
    }

    [Theory]
    [InlineData(1, SquareRootFinding.Once)]
    [InlineData(0.5, SquareRootFinding.Twice)]
    [InlineData(2, SquareRootFinding.Missing)]
    public void Of_LoadThatMoves_FindsTheNumberOfRoots(double power, SquareRootFinding finding)
    {
        SquareRootCheck check = Stretch(power, 0.75);
        Assert.Equal(finding, check.Finding);
        Approx.Absolute(power, check.Power, 4 * check.StandardUncertainty);
    }

    [Fact]
    public void Of_LoadThatStands_IsUndecided()
    {
        Assert.Equal(SquareRootFinding.Undecided, Stretch(1, 0.99).Finding);
        Assert.Equal(SquareRootFinding.Undecided, Stretch(1, 0.75, count: 4).Finding);
        Assert.Equal(SquareRootFinding.Undecided, Stretch(1.5, 0.6).Finding);     // neither: something else is wrong
        Assert.Contains("Undecided", SquareRootCheck.Of(Meter, []).ToString(), StringComparison.Ordinal);
    }
}
