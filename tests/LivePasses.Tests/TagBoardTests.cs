using LivePasses.Tags;
using TwoPhase.Metering;

namespace LivePasses.Tests;

public class TagBoardTests
{
    private const string Flow = "marten-2/tags/MT-P1-FEED", Pressure = "marten-2/tags/MT-P1-PRES", Differential = "marten-2/tags/MT-P1-DIFF", Firing = "marten-2/tags/MT-FIRING";
    private static readonly DateTimeOffset Noon = new(2031, 3, 9, 12, 0, 0, TimeSpan.Zero);

    private readonly TagBoard _board = new(Rig.Usual(0));
    private readonly List<GeneratorReading> _readings = [];

    [Fact]
    public void Take_TwoTagsBeyondASecond_EndIt()
    {
        Give(Flow, 16, 0.2);
        Give(Differential, 60, 0.4);
        Give(Flow, 17, 1.1);
        Assert.Empty(_readings);
        Give(Differential, 61, 1.3);
        GeneratorReading reading = Assert.Single(_readings);
        Assert.Equal(Noon.AddSeconds(1), reading.Time);
        Assert.Equal(16, reading.Passes[0].FeedFlow!.Value.TonnesPerHour, 9);
        Assert.Equal(45, reading.Passes[0].Differential!.Value.Kilopascals, 9);   // 60 % of 75 kPa
    }

    [Fact]
    public void Take_SharedTag_ReachesEveryPass()
    {
        Give(Firing, 92, 0.1);
        Give(Flow, 16, 1.1);
        Give(Firing, 92, 1.1);
        Assert.All(Assert.Single(_readings).Passes, pass => Assert.Equal(0.92, pass.Firing!.Value.DecimalFractions, 9));
    }

    [Fact]
    public void Take_OneTagWithAFalseClock_MovesNothingAndComesBack()
    {
        Give(Flow, 16, 0);
        Give(Pressure, 9507, 1e6);
        for (int second = 0; second < 20; second++)
        {
            Give(Flow, 16, second);
            Give(Differential, 60, second);
            Give(Pressure, 9507, second);
        }

        Assert.Equal(19, _readings.Count);
        Assert.Equal(Noon.AddSeconds(19), _readings[^1].Time);
        Assert.Equal(9.6, _readings[^1].Passes[0].OutletPressure!.Value.Megapascals, 6);   // 9507 kPa over 93 kPa
    }

    [Fact]
    public void Take_FalseClockBeforeAnyOther_DoesNotHoldUpTheRest()
    {
        Give(Pressure, 9507, 1e6);
        for (int second = 0; second < 20; second++)
        {
            Give(Flow, 16, second);
            Give(Differential, 60, second);
        }

        Assert.Equal(19, _readings.Count);
        Assert.Equal(16, _readings[0].Passes[0].FeedFlow!.Value.TonnesPerHour, 9);
    }

    [Fact]
    public void Take_ValueOfTheNextSecond_DoesNotEnterThisOne()
    {
        Give(Flow, 16, 0);
        Give(Flow, 99, 1);
        Give(Differential, 60, 1);
        Assert.Equal(16, Assert.Single(_readings).Passes[0].FeedFlow!.Value.TonnesPerHour, 9);
    }

    [Fact]
    public void Take_SilentTag_IsMissingAfterAWhile()
    {
        Give(Flow, 16, 0);
        for (int second = 1; second < 30; second++)
        {
            Give(Differential, 60, second);
            Give(Pressure, 9507, second);
        }

        Assert.NotNull(_readings[3].Passes[0].FeedFlow);
        Assert.Equal(SignalStatus.Missing, _readings[^1].Passes[0].Status(PassSignal.FeedFlow));
    }

    [Fact]
    public void Take_ClockSetBack_StartsOver()
    {
        for (int second = 3600; second < 3620; second++) Both(second);
        for (int second = 0; second < 20; second++) Both(second);
        Assert.Equal(Noon.AddSeconds(19), _readings[^1].Time);

        void Both(int second)
        {
            Give(Flow, 16, second);
            Give(Differential, 60, second);
        }
    }

    [Fact]
    public void Take_OlderValue_IsLeftOut()
    {
        Give(Flow, 16, 0.8);
        Give(Flow, 12, 0.3);
        Give(Flow, 16, 1);
        Give(Differential, 60, 1);
        Assert.Equal(16, Assert.Single(_readings).Passes[0].FeedFlow!.Value.TonnesPerHour, 9);
    }

    [Fact]
    public void Take_OtherUnitThanTheTags_IsRefused()
    {
        Assert.Null(_board.Take(Flow, new(16, Noon, "kg/s"), Noon, out string fault));
        Assert.Contains("kg/s", fault, StringComparison.Ordinal);
        Assert.Contains("t/h", fault, StringComparison.Ordinal);
    }

    [Fact]
    public void Take_TagOfAnotherPlant_IsRefused()
    {
        Assert.Null(_board.Take("elsewhere", new(16, Noon, null), Noon, out string fault));
        Assert.NotEmpty(fault);
    }

    private void Give(string topic, double value, double second)
    {
        if (_board.Take(topic, new(value, Noon.AddSeconds(second), null), Noon, out string fault) is { } reading) _readings.Add(reading);
        Assert.Empty(fault);
    }
}
