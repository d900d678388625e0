using TwoPhase.Numerics;

namespace TwoPhase.Tests.Numerics;

public class GoldenSectionTests
{
    [Theory]
    [InlineData(0.3, 0.3)]
    [InlineData(-1, 0)]     // falls all the way to the lower end
    [InlineData(2, 1)]      // and to the upper
    public void Minimum_Parabola_IsFoundInsideTheBracket(double valley, double expected)
    {
        double lowest = 1, highest = 0;
        double found = GoldenSection.Minimum(
            x =>
            {
                lowest = Math.Min(lowest, x);
                highest = Math.Max(highest, x);
                return (x - valley) * (x - valley);
            },
            0,
            1,
            1e-9);
        Approx.Absolute(expected, found, 1e-8);
        Assert.True(lowest >= 0 && highest <= 1);
    }
}
