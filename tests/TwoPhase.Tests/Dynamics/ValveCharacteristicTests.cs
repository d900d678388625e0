using TwoPhase.Dynamics;
using TwoPhase.Tests.Support;
using UnitsNet;

namespace TwoPhase.Tests.Dynamics;

public class ValveCharacteristicTests
{
    // Half open, a valve of rangeability 50 passes 1/√50, some 14 % (IEC 61297's table of ideal trims gives 14 % ± 3; read in a public summary).
    [Theory]
    [InlineData(100, 1), InlineData(50, 0.141421356), InlineData(0, 0.02)]
    public void EqualPercentage_RangeabilityOfFifty_IsAsKnown(double opening, double flow) =>
        Approx.Relative(flow, ValveCharacteristic.EqualPercentage().RelativeFlow(Ratio.FromPercent(opening)), 1e-8);

    // The same travel adds the same share anywhere: what its name says.
    [Fact]
    public void EqualPercentage_SameTravel_SameShare()
    {
        ValveCharacteristic valve = ValveCharacteristic.EqualPercentage(30);
        double Gain(double from) => valve.RelativeFlow(Ratio.FromPercent(from + 10)) / valve.RelativeFlow(Ratio.FromPercent(from));
        Approx.Relative(Gain(10), Gain(80), 1e-12);
    }

    [Fact]
    public void Linear_AnyOpening_IsTheOpening() => Assert.Equal(0.3, ValveCharacteristic.Linear.RelativeFlow(Ratio.FromPercent(30)), 1e-12);

    [Fact]
    public void RelativeFlow_OutsideTravel_Throws()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => ValveCharacteristic.Linear.RelativeFlow(Ratio.FromPercent(101)));
        Assert.Throws<ArgumentOutOfRangeException>(() => ValveCharacteristic.EqualPercentage(1));
    }
}
