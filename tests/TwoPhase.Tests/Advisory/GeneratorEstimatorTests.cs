using TwoPhase.Advisory;
using TwoPhase.Metering;
using TwoPhase.Passes;
using UnitsNet;
using static TwoPhase.Tests.Advisory.Plants;

namespace TwoPhase.Tests.Advisory;

public class GeneratorEstimatorTests
{
    private const int Passes = 6, Seconds = 2700;

    // Twins: the heating value falls by 5 % in 40 min, or one pass's differential drifts by 7 %. One pass alone says the same of both.
    [Fact]
    public void Update_HeatingValueFalls_IsCommonAndAccusesNobody()
    {
        GeneratorEstimator estimator = Run((pass, t) => 1 - (0.05 * Drift(t)), (pass, t) => 1, out _);
        Assert.True(estimator.IsCommonShiftFar);
        Assert.All(estimator.Shifts, shift => Assert.Equal(ShiftOrigin.Common, shift.Origin));
        Assert.InRange(estimator.CommonShift!.Value.DecimalFractions, -0.055, -0.035);
        Assert.All(estimator.Estimates, estimate => Assert.Equal(Trust.Disagreement, estimate.Trust));
    }

    [Fact]
    public void Update_OneDifferentialDrifts_NamesThatPassBeforeFourPerCent()
    {
        GeneratorEstimator estimator = Run((pass, t) => 1, (pass, t) => pass == 2 ? 1 - (0.07 * Drift(t)) : 1, out double called);
        Assert.False(estimator.IsCommonShiftFar);
        Assert.Equal(ShiftOrigin.ThisPass, estimator.Shifts[2].Origin);
        Assert.All(estimator.Shifts.Where((_, i) => i != 2), shift => Assert.Equal(ShiftOrigin.None, shift.Origin));
        Assert.InRange(estimator.Shifts[2].AsDifferential!.Value.DecimalFractions, -0.09, -0.05);
        Assert.True(0.07 * Drift(called) < 0.04, $"called at {called} s, {0.07 * Drift(called):P1}");
        Assert.Equal(Trust.Disagreement, estimator.Estimates[2].Trust);
        Assert.Equal(Trust.Believable, estimator.Estimates[0].Trust);
    }

    [Fact]
    public void Update_TwoPassesOnly_IsNotSeparable()
    {
        var estimator = new GeneratorEstimator(new SteamGenerator("pair", [Named("a"), Named("b")]));
        (PassReading Reading, double Truth)[][] readings = [[.. Readings(Still, 1500, 1, meter: t => 1 - (0.08 * Math.Min(1, Math.Max(0, (t - 400) / 600))))], [.. Readings(Still, 1500, 2)]];
        for (int t = 0; t < 1500; t++) estimator.Update(new GeneratorReading(readings[0][t].Reading.Time, [readings[0][t].Reading, readings[1][t].Reading]));
        Assert.Null(estimator.CommonShift);
        Assert.Equal(ShiftOrigin.NotSeparable, estimator.Shifts[0].Origin);
        Assert.Equal(ShiftOrigin.None, estimator.Shifts[1].Origin);
        Assert.Throws<ArgumentException>(() => estimator.Update(new GeneratorReading(Midnight, [])));
    }

    [Fact]
    public void Restore_InADrift_GoesOnWithoutABump()
    {
        static GeneratorEstimator New() => new(new SteamGenerator("three", [Named("a"), Named("b"), Named("c")]), EstimatorOptions.Default.WithCells(30));
        GeneratorReading[] readings = [.. Enumerable.Range(0, 3).Select(i => Readings(Still, 1300, i, meter: t => i == 0 ? 1 - (0.08 * Math.Min(1, Math.Max(0, (t - 400) / 600))) : 1).ToArray()).Aggregate(
            Enumerable.Range(0, 1300).Select(t => new List<PassReading>()).ToArray(),
            (rows, pass) =>
            {
                for (int t = 0; t < rows.Length; t++) rows[t].Add(pass[t].Reading);
                return rows;
            }).Select(row => new GeneratorReading(row[0].Time, row))];
        GeneratorEstimator whole = New(), second = New();
        foreach (GeneratorReading reading in readings.Take(1000)) whole.Update(reading);
        Assert.Equal(ShiftOrigin.ThisPass, whole.Shifts[0].Origin);
        second.Restore(EstimatorState.Parse(whole.Save().ToString()));
        foreach (GeneratorReading reading in readings.Skip(1000))
        {
            whole.Update(reading);
            second.Update(reading);
            Assert.Equal(whole.Estimates, second.Estimates);
            Assert.Equal(whole.Shifts, second.Shifts);
        }

        Assert.Contains("no 'common is far'", Assert.Throws<FormatException>(() => New().Restore(whole.Estimators[0].Save())).Message, StringComparison.Ordinal);
    }

    private static double Drift(double t) => Math.Min(1, Math.Max(0, (t - 600) / 2400));

    private static GeneratorEstimator Run(Func<int, double, double> heat, Func<int, double, double> meter, out double called)
    {
        var estimator = new GeneratorEstimator(new SteamGenerator("six", Enumerable.Range(0, Passes).Select(i => Named($"{i + 1}"))), EstimatorOptions.Default.WithCells(30));
        List<IEnumerator<(PassReading Reading, double Truth)>> plants = [.. Enumerable.Range(0, Passes).Select(i => Readings(Still, Seconds, 10 + i, heat: t => heat(i, t), meter: t => meter(i, t)).GetEnumerator())];
        called = double.NaN;
        for (int t = 0; t < Seconds; t++)
        {
            plants.ForEach(plant => plant.MoveNext());
            estimator.Update(new GeneratorReading(Midnight.AddSeconds(t), plants.Select(plant => plant.Current.Reading)));
            if (double.IsNaN(called) && estimator.Shifts.Any(shift => shift.Origin == ShiftOrigin.ThisPass)) called = t;
        }

        return estimator;
    }
}
