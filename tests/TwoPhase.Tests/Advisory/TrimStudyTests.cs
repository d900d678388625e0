using TwoPhase.Advisory;
using TwoPhase.Dynamics;
using TwoPhase.Tests.Support;
using UnitsNet;
using Xunit;
using static TwoPhase.Tests.Dynamics.Simulations;

namespace TwoPhase.Tests.Advisory;

public sealed class TrimStudyTests
{
    private static readonly TrimDisturbance[] Disturbances =
    [
        new("nothing", Still),
        new("firing +3 %", Still.StepFiring(Seconds(60), Ratio.FromPercent(103))),
        new("convective share +2 points", Still.RampConvectiveShare(Seconds(60), Seconds(300), Ratio.FromPercent(43))),
    ];

    [Fact]
    public void Of_SeveralDisturbances_IsTheLoopsOneByOne()
    {
        TrimStudy study = TrimStudy.Of(MeteredPass, Disturbances, Seconds(900));
        foreach (TrimSource source in new[] { TrimSource.None, TrimSource.Raw, TrimSource.Corrected, TrimSource.Blended })
        {
            TrimHistory alone = new TrimLoop(MeteredPass, Start, source).Run(Disturbances[2].Schedule, Seconds(900));
            Assert.Equal(alone.PeakDeviation, study[2, source].PeakDeviation);
            Approx.Absolute(0, study[0, source].PeakDeviation.DecimalFractions, 1e-6);
        }
    }

    [Fact]
    public void ToString_Table_CarriesTheCaution()
    {
        string text = TrimStudy.Of(MeteredPass, Disturbances, Seconds(300)).ToString();
        Assert.Contains("raw", text);
        Assert.Contains("convective share +2 points", text);
        Assert.EndsWith(TrimStudy.Caution, text);
        Assert.Contains("needs a fallback", TrimStudy.Caution);
    }

    [Fact]
    public void Of_NoDisturbance_SaysSo() => Assert.Throws<ArgumentException>(() => TrimStudy.Of(MeteredPass, [], Seconds(10)));
}
