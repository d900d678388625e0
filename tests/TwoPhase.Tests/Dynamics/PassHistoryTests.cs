using System.Globalization;
using TwoPhase.Dynamics;
using TwoPhase.Tests.Support;
using UnitsNet;
using UnitsNet.Units;
using static TwoPhase.Tests.Dynamics.Simulations;

namespace TwoPhase.Tests.Dynamics;

public class PassHistoryTests
{
    private static readonly PassHistory History = Run(Still.StepFiring(Seconds(5), Ratio.FromPercent(103)), 60);

    [Fact]
    public void Values_ByNameAndUnit_AreThoseOfTheRows()
    {
        double[] flow = History.Values(nameof(PassInstant.OutletFlow), MassFlowUnit.TonnePerHour), metal = History.Values(nameof(PassInstant.HottestMetal), TemperatureUnit.DegreeCelsius);
        Approx.Relative(History[40].OutletFlow.TonnesPerHour, flow[40], 1e-12);
        Approx.Relative(History[40].HottestMetal.DegreesCelsius, metal[40], 1e-12);
        Approx.Relative(History[40].Holdup.Kilograms / 1000, History.Values(nameof(PassInstant.Holdup), MassUnit.Tonne)[40], 1e-12);
        Approx.Relative(History[40].IndicatedQuality!.Value.Percent, History.Values(nameof(PassInstant.IndicatedQuality), MassFractionUnit.Percent)[40], 1e-12);
    }

    // Every column is a property of the row, under its own name, so that names cannot drift apart.
    [Fact]
    public void ColumnNames_All_AreProperties() => Assert.All(PassHistory.ColumnNames, name => Assert.NotNull(typeof(PassInstant).GetProperty(name)));

    [Fact]
    public void Values_WrongNameOrUnit_ThrowsWithTheRightOnes()
    {
        Assert.Contains("OutletFlow", Assert.Throws<ArgumentException>(() => History.Values("Outflow", MassFlowUnit.KilogramPerSecond)).Message, StringComparison.Ordinal);
        Assert.Contains("MassFlowUnit", Assert.Throws<ArgumentException>(() => History.Values(nameof(PassInstant.OutletFlow), PressureUnit.Pascal)).Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Resample_FinerAndCoarser_RunsStraightBetweenRows()
    {
        PassHistory half = History.Resample(Seconds(0.5)), seventh = History.Resample(Seconds(7));
        Assert.Equal(121, half.Count);
        Assert.Equal(9, seventh.Count);
        Assert.Equal(History[56], seventh[8]);
        Approx.Relative((History[30].Holdup.Kilograms + History[31].Holdup.Kilograms) / 2, half[61].Holdup.Kilograms, 1e-12);
        Assert.Equal(30.5, half[61].Time.Seconds, 1e-12);
    }

    [Theory]
    [InlineData("de-DE"), InlineData("en-US")]
    public void WriteCsv_AnyCulture_ReadsBack(string culture)
    {
        string text = "";
        Culture.Run(culture, () =>
        {
            using var writer = new StringWriter();
            History.WriteCsv(writer);
            text = writer.ToString();
        });
        string[] lines = text.Split(["\r\n", "\n"], StringSplitOptions.RemoveEmptyEntries);
        Assert.Equal(History.Count + 1, lines.Length);
        Assert.StartsWith("time_s,feed_flow_kg_s,outlet_flow_kg_s,true_quality", lines[0], StringComparison.Ordinal);
        double[] row = [.. lines[21].Split(',').Select(cell => double.Parse(cell, CultureInfo.InvariantCulture))];
        Assert.Equal(20, row[0]);
        Approx.Relative(History[20].OutletFlow.KilogramsPerSecond, row[2], 1e-8);
    }

    [Fact]
    public void Figures_NothingHappens_AreZero()
    {
        TransientFigures figures = Run(Still, 30).Figures(MassFraction.FromPercent(1));
        Approx.Absolute(0, figures.PeakError!.Value.DecimalFractions, 1e-9);
        Assert.Equal(0, figures.TimeFalse.Seconds);
        Assert.Equal(0, figures.Settled!.Value.Seconds);
        Approx.Absolute(0, figures.WaterPushedOut.Kilograms, 1e-6);
        Approx.Absolute(1, figures.PeakOutletRatio, 1e-9);
        Assert.Throws<ArgumentOutOfRangeException>(() => Run(Still, 1).Figures(MassFraction.Zero));
    }

    [Fact]
    public void Figures_NotSettledByTheEnd_SaysSo() => Assert.Null(History.Figures(MassFraction.FromPercent(0.1)).Settled);

    [Fact]
    public void ToString_Row_IsInvariant() => Culture.Run("de-DE", () => Assert.StartsWith("0 s: 4.8000 kg/s in", History[0].ToString(), StringComparison.Ordinal));
}
