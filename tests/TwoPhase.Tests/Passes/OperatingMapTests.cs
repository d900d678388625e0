using TwoPhase.Numerics;
using TwoPhase.Passes;
using UnitsNet;

namespace TwoPhase.Tests.Passes;

public class OperatingMapTests
{
    private static readonly Pass Pass = ExamplePass.Pass.WithHeatAtFullFiring(Power.FromMegawatts(10));

    private static OperatingGrid Grid { get; } = OperatingGrid.OfFiring(Pass, Flows(4, 4.8, 5.6), [Ratio.FromPercent(70), Ratio.FromPercent(82)], [Temperature.FromDegreesCelsius(160), Temperature.FromDegreesCelsius(172)]);

    [Fact]
    public void Of_EveryCell_IsTheSteadyStateThere()
    {
        OperatingMap<MassFraction> map = OperatingMap.Of(Pass, ExamplePass.Conditions, Grid, static profile => profile.OutletQuality);
        Assert.Equal(12, map.Count);
        for (int t = 0; t < 2; t++)
        {
            for (int q = 0; q < 2; q++)
            {
                for (int m = 0; m < 3; m++)
                {
                    OperatingCell<MassFraction> cell = map[m, q, t];
                    PassConditions at = ExamplePass.Conditions.WithFeedFlow(Grid.Flows[m]).WithAbsorbedHeat(Power.FromMegawatts(q == 0 ? 7.0 : 8.2)).WithFeedTemperature(Grid.FeedTemperatures[t]);
                    Assert.True(cell.HasFigure);
                    Approx.Relative((double)at.AbsorbedHeat.Watts, (double)cell.Conditions.AbsorbedHeat.Watts, 1e-12);
                    Approx.Absolute(SteadyState.Solve(Pass, at).OutletQuality.DecimalFractions, cell.Figure.DecimalFractions, 1e-12);
                    Assert.Equal(cell, map[(((t * 2) + q) * 3) + m]);
                }
            }
        }
    }

    [Fact]
    public void Of_OneProcessorOrAll_IsTheSame()
    {
        static double Drop(PassProfile profile) => profile.PressureDrop.Total.Pascals;
        Assert.Equal(OperatingMap.Of(Pass, ExamplePass.Conditions, Grid, Drop, processors: 1), OperatingMap.Of(Pass, ExamplePass.Conditions, Grid, Drop));
    }

    [Fact]
    public void Of_CellWithoutASteadyState_KeepsTheReason()
    {
        var grid = new OperatingGrid(Flows(0.5, 4.8), [Power.FromMegawatts(8.2)], [Temperature.FromDegreesCelsius(172)]);
        OperatingMap<MassFraction> map = OperatingMap.Of(Pass, ExamplePass.Conditions, grid, static profile => profile.OutletQuality);
        Assert.False(map[0].HasFigure);
        Assert.Contains("outside the steam formulation", map[0].Fault!, StringComparison.Ordinal);
        Assert.True(map[1].HasFigure);
        Assert.Null(map[1].Fault);
        Assert.False(default(OperatingCell<double>).HasFigure);
    }

    [Fact]
    public void Of_FigureThatThrows_FailsForWhatIsNotOfThePass()
    {
        Assert.Contains("none here", OperatingMap.Of<double>(Pass, ExamplePass.Conditions, Grid, static _ => throw new ConvergenceException("none here"))[0].Fault!, StringComparison.Ordinal);
        Assert.IsType<InvalidOperationException>(Assert.Throws<AggregateException>(() => OperatingMap.Of<double>(Pass, ExamplePass.Conditions, Grid, static _ => throw new InvalidOperationException("a defect"))).InnerException);
    }

    [Fact]
    public void Of_Progress_RisesToOne()
    {
        var told = new Listener();
        OperatingMap.Of(Pass, ExamplePass.Conditions, Grid, static profile => profile.OutletQuality, progress: told);
        Assert.Equal(12, told.Shares.Count);
        Assert.Equal(told.Shares.Order(), told.Shares);
        Assert.Equal(1, told.Shares[^1]);
    }

    [Fact]
    public void Of_Cancelled_EndsBetweenCells()
    {
        using var cancellation = new CancellationTokenSource();
        var told = new Listener { Heard = _ => cancellation.Cancel() };
        Assert.ThrowsAny<OperationCanceledException>(() => OperatingMap.Of(Pass, ExamplePass.Conditions, Grid, static profile => profile.OutletQuality, progress: told, processors: 1, cancellation: cancellation.Token));
        Assert.Single(told.Shares);
    }

    [Fact]
    public void Grid_MeaninglessAxes_ThrowNamingThem()
    {
        Assert.Contains("no feed flows", Assert.Throws<ArgumentException>(() => new OperatingGrid([], [Power.Zero], [Temperature.FromDegreesCelsius(100)])).Message, StringComparison.Ordinal);
        Assert.Contains("Feed flow = 0 kg/s", Assert.Throws<ArgumentOutOfRangeException>(() => new OperatingGrid(Flows(0), [Power.Zero], [Temperature.FromDegreesCelsius(100)])).Message, StringComparison.Ordinal);
        Assert.Contains("Absorbed heat = -1 MW", Assert.Throws<ArgumentOutOfRangeException>(() => new OperatingGrid(Flows(1), [Power.FromMegawatts(-1)], [Temperature.FromDegreesCelsius(100)])).Message, StringComparison.Ordinal);
        Assert.Contains("heat at full firing of pass '1' is not known", Assert.Throws<ArgumentException>(() => OperatingGrid.OfFiring(ExamplePass.Pass, Flows(1), [Ratio.FromPercent(50)], [Temperature.FromDegreesCelsius(100)])).Message, StringComparison.Ordinal);
        Assert.Contains("Processors = 0", Assert.Throws<ArgumentOutOfRangeException>(() => OperatingMap.Of(Pass, ExamplePass.Conditions, Grid, static profile => profile.Count, processors: 0)).Message, StringComparison.Ordinal);
        Assert.Throws<ArgumentNullException>(() => OperatingMap.Of<int>(Pass, ExamplePass.Conditions, Grid, null!));
    }

    private static IEnumerable<MassFlow> Flows(params double[] kilograms) => kilograms.Select(value => MassFlow.FromKilogramsPerSecond(value));

    private sealed class Listener : IProgress<double>
    {
        public List<double> Shares { get; } = [];

        public Action<double>? Heard { get; init; }

        public void Report(double value)
        {
            Shares.Add(value);
            Heard?.Invoke(value);
        }
    }
}
